package org.seepledger.balance;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Total;

/**
 * A row of a budget as a sum over accounts: so many times the gross inflow of each and so many times its gross outflow.
 */
public final class TracedRow {

    private final double[] inflow;
    private final double[] outflow;

    private TracedRow(int accounts) {
        this.inflow = new double[accounts];
        this.outflow = new double[accounts];
    }

    /**
     * {@return the net of some accounts together}
     *
     * @param which their places among them
     * @param accounts the accounts of a prism
     */
    public static TracedRow of(List<Integer> which, List<Account> accounts) {
        TracedRow row = new TracedRow(accounts.size());
        for (int account : which) {
            row.inflow[account] = 1;
            row.outflow[account] = -1;
        }
        return row;
    }

    /**
     * {@return a total; empty where it is no sum over accounts}
     *
     * @param total the total
     * @param accounts the accounts of a prism
     */
    public static Optional<TracedRow> of(Total total, List<Account> accounts) {
        TracedRow row = new TracedRow(accounts.size());
        Predicate<Account> storage = account -> account.group() == Group.STORAGE;
        switch (total) {
            case INFLOW -> row.add(accounts, storage.negate(), 1, 0);
            case OUTFLOW -> row.add(accounts, storage.negate(), 0, 1);
            case STORAGE_CHANGE -> row.add(accounts, storage, -1, 1);
            case RESIDUAL -> row.add(accounts, account -> true, 1, -1);
            case UNEXPLAINED -> row.add(accounts, storage.negate(), 1, -1);
            case CLOSURE_ERROR, NET_CLOSURE_ERROR -> {
                return Optional.empty();
            }
        }
        return Optional.of(row);
    }

    private void add(List<Account> accounts, Predicate<Account> which, double in, double out) {
        for (int i = 0; i < inflow.length; i++) {
            if (which.test(accounts.get(i)) && accounts.get(i).quantified()) {
                inflow[i] = in;
                outflow[i] = out;
            }
        }
    }

    double inflow(int account) {
        return inflow[account];
    }

    double outflow(int account) {
        return outflow[account];
    }

    /** Whether anything that flows through faces counts. */
    boolean restsOnFlow(List<Account> accounts) {
        for (int i = 0; i < inflow.length; i++) {
            Group group = accounts.get(i).group();
            boolean counts = inflow[i] != 0 || outflow[i] != 0;
            if (counts && (group == Group.SIDE || group == Group.LID)) {
                return true;
            }
        }
        return false;
    }
}
