package org.seepledger.job;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.fault.UsageFault;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;

/**
 * A row of a solute's budget as a sum over the nets of accounts, which are linear in concentrations; gross flows are not, since
 * what disperses may turn.
 *
 * @param name the row's name
 * @param accounts the accounts, in the order of rows
 * @param row how often the net of each counts
 */
record TracedNets(String name, List<Account> accounts, double[] row) {

    static TracedNets of(BudgetRow row, List<Account> accounts) {
        BudgetRow.Item item = row.item();
        double[] times = item.total()
                .map(total -> ofTotal(row, total, accounts))
                .orElseGet(() -> counted(accounts, account -> is(account, item), 1));
        if (Arrays.stream(times).allMatch(time -> time == 0)) {
            throw new UsageFault("\"" + row.shortName()
                    + "\" has no number: it is empty in the budget, whose warnings say why. Trace another row.");
        }
        return new TracedNets(row.shortName(), accounts, times);
    }

    private static boolean is(Account account, BudgetRow.Item item) {
        return account.group() == item.group()
                && account.item().equals(item.name())
                && (item.layer().equals("*") || item.layer().equals(String.valueOf(account.layer() + 1)));
    }

    private static double[] ofTotal(BudgetRow row, Total total, List<Account> accounts) {
        Predicate<Account> storage = account -> account.group() == Group.STORAGE;
        return switch (total) {
            case STORAGE_CHANGE -> counted(accounts, storage, -1);
            case RESIDUAL -> counted(accounts, account -> true, 1);
            case UNEXPLAINED -> counted(accounts, storage.negate(), 1);
            case INFLOW, OUTFLOW ->
                throw refused(
                        row.shortName(),
                        "adds gross flows, which are not linear in concentrations where dispersion may turn",
                        "its sides, lids and sources");
            case CLOSURE_ERROR, NET_CLOSURE_ERROR ->
                throw refused(row.shortName(), "is a ratio of sums and has no weights", "\"residual/*\"");
        };
    }

    private static double[] counted(List<Account> accounts, Predicate<Account> which, double times) {
        return accounts.stream()
                .mapToDouble(account -> account.quantified() && which.test(account) ? times : 0)
                .toArray();
    }

    private static UsageFault refused(String row, String why, String instead) {
        return new UsageFault("\"" + row + "\" " + why + ". Trace " + instead + " of the same prism and period.");
    }

    /** Refuses a row that rests on sorbed mass where the isotherm is no straight line. */
    void mustBeLinear(Solute solute, Optional<Solute> parent) {
        boolean ownMass = rests(group -> group == Group.STORAGE || group == Group.DECAY) && isCurved(solute);
        boolean parents = rests(group -> group == Group.PRODUCTION)
                && parent.filter(TracedNets::isCurved).isPresent();
        if (ownMass || parents) {
            String whose = ownMass ? solute.name() : parent.orElseThrow().name();
            throw refused(
                    name,
                    "rests on sorbed mass of " + whose
                            + ", whose isotherm is not linear: concentrations have no weights in it",
                    "a side, lid or source");
        }
    }

    private boolean rests(Predicate<Group> on) {
        for (int i = 0; i < row.length; i++) {
            if (row[i] != 0 && on.test(accounts.get(i).group())) {
                return true;
            }
        }
        return false;
    }

    private static boolean isCurved(Solute solute) {
        return solute.sorption()
                .filter(given -> !(given instanceof Sorption.Linear))
                .isPresent();
    }

    /** What the row comes to in a period, kg. */
    double net(PeriodBudget budget) {
        return sum(budget, (entry, times) -> times * entry.net());
    }

    /** The gross flow that its rounding is measured against, kg. */
    double gross(PeriodBudget budget) {
        return sum(budget, (entry, times) -> Math.abs(times) * (entry.inflow() + entry.outflow()));
    }

    private interface Amount {
        double of(Entry entry, double times);
    }

    private double sum(PeriodBudget budget, Amount amount) {
        double sum = 0;
        for (int i = 0; i < row.length; i++) {
            sum += row[i] == 0 ? 0 : amount.of(budget.entries().get(i), row[i]);
        }
        return sum;
    }
}
