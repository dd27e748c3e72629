package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.unit.Measure;

/** Ledgers with random names and numbers over many orders of magnitude. */
final class RandomLedger {

    static final UnitShown RATE = new UnitShown("m³/d", 1, true);
    static final UnitShown VOLUME = new UnitShown("m³", 1, false);

    private static final String[] NAMES = {
        "river side", "side 7", "recharge", "a boundary with a very long name of its own", "W", "public supply", "ditch"
    };

    private final Random random;
    private final int intervals;

    RandomLedger(long seed, int intervals) {
        this.random = new Random(seed);
        this.intervals = intervals;
    }

    Ledger ledger(boolean storageKnown, int items) {
        List<Account> accounts = new ArrayList<>();
        for (int i = 0; i < items; i++) {
            String name = NAMES[random.nextInt(NAMES.length)] + " " + i;
            Group group = i == 0 ? Group.LID : i % 3 == 0 ? Group.SOURCE : Group.SIDE;
            accounts.add(new Account(group, name, random.nextInt(3), random.nextInt(8) > 0));
        }
        accounts.add(new Account(Group.STORAGE, "water-table storage", 0, storageKnown));
        return new Ledger("p", accounts, storageKnown, rates(accounts.size()), rates(accounts.size()));
    }

    private double[][] rates(int accounts) {
        double[][] rates = new double[intervals][accounts];
        for (double[] interval : rates) {
            for (int i = 0; i < accounts; i++) {
                interval[i] = random.nextInt(4) == 0 ? 0 : Math.pow(10, 7 * random.nextDouble() - 3);
            }
        }
        return rates;
    }

    /** Periods of uneven length, one per interval, some with time between. */
    List<Period> periods() {
        List<Period> periods = new ArrayList<>();
        double time = 0;
        for (int i = 0; i < intervals; i++) {
            double end = time + 1 + 60 * random.nextDouble();
            periods.add(new Period("period " + (i + 1), time, end, List.of(new Period.Part(i, end - time))));
            time = end + (random.nextInt(5) == 0 ? 10 : 0);
        }
        return periods;
    }

    static Times times(boolean dated) {
        return new Times(
                new double[] {0, 1},
                Measure.of("d"),
                dated ? Optional.of(java.time.LocalDateTime.of(2021, 10, 1, 0, 0)) : Optional.empty());
    }

    /** A budget of a day with one interval: inflow and outflow of some accounts. */
    static PeriodBudget day(boolean storageKnown, List<Account> accounts, double[] inflow, double[] outflow) {
        Ledger ledger = new Ledger("p", accounts, storageKnown, new double[][] {inflow}, new double[][] {outflow});
        return ledger.budget(new Period("a day", 0, 1, List.of(new Period.Part(0, 1))));
    }

    static Account account(Group group, String item) {
        return new Account(group, item, 0, true);
    }
}
