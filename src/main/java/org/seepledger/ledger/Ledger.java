package org.seepledger.ledger;

import java.util.ArrayList;
import java.util.List;

/**
 * The gross rates of a prism's accounts in each interval.
 *
 * <p>Gross in and out are kept per interval, so that what flows in during one interval and out in the next is in both
 * columns of a period that holds the two.
 */
public final class Ledger {

    private final String prism;
    private final List<Account> accounts;
    private final boolean storageKnown;
    private final double[][] inflow;
    private final double[][] outflow;

    /**
     * Makes a ledger.
     *
     * @param prism the prism's name
     * @param accounts its accounts, in the order of rows
     * @param storageKnown whether change in storage can be given
     * @param inflow length³/time, an array by account for each interval; kept, not copied
     * @param outflow the same
     */
    public Ledger(String prism, List<Account> accounts, boolean storageKnown, double[][] inflow, double[][] outflow) {
        this.prism = prism;
        this.accounts = List.copyOf(accounts);
        this.storageKnown = storageKnown;
        this.inflow = inflow;
        this.outflow = outflow;
    }

    /**
     * {@return the prism's name}
     */
    public String prism() {
        return prism;
    }

    /**
     * {@return the accounts, in the order of rows}
     */
    public List<Account> accounts() {
        return accounts;
    }

    /**
     * {@return whether change in storage can be given}
     */
    public boolean storageKnown() {
        return storageKnown;
    }

    /**
     * {@return gross outflow in an interval by account, a copy}
     *
     * @param interval from 0
     */
    public double[] outflow(int interval) {
        return outflow[interval].clone();
    }

    /**
     * {@return the budget of a period}
     *
     * @param period the period
     */
    public PeriodBudget budget(Period period) {
        List<Entry> entries = new ArrayList<>(accounts.size());
        for (int i = 0; i < accounts.size(); i++) {
            entries.add(
                    accounts.get(i).quantified()
                            ? new Entry(accounts.get(i), volume(inflow, period, i), volume(outflow, period, i))
                            : new Entry(accounts.get(i), Double.NaN, Double.NaN));
        }
        return new PeriodBudget(period, entries, Totals.of(entries, storageKnown));
    }

    private static double volume(double[][] rates, Period period, int account) {
        double volume = 0;
        for (Period.Part part : period.parts()) {
            volume += rates[part.interval()][account] * part.duration();
        }
        return volume;
    }
}
