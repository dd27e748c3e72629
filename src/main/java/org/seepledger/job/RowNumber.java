package org.seepledger.job;

import java.util.Optional;
import org.seepledger.balance.Trace;
import org.seepledger.balance.TracedRow;
import org.seepledger.fault.ProgramFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;

/**
 * What a row of a budget comes to, as its trace must.
 *
 * @param row the row
 * @param traced how it is made of accounts
 * @param net its net rate, in the unit of rates
 * @param gross its gross flow, in the same unit, against which differences are measured
 */
record RowNumber(BudgetRow row, TracedRow traced, double net, double gross) {

    /** How far value × weight may add up to something else than the row, as a share of the row's gross flow. */
    static final double AGREES = 1e-9;

    /** What rounding of the terms may add to that, as a share of the sum of their magnitudes. */
    static final double ROUNDING = 1e-14;

    /**
     * {@return what a row comes to}
     *
     * @param row the row
     * @param ledger its prism's ledger
     * @param units the units of results
     * @throws UsageFault if it has no number, or one that is no sum
     */
    static RowNumber of(BudgetRow row, Ledger ledger, ResultUnits units) {
        TracedRow traced = traced(row, ledger);
        PeriodBudget budget = ledger.budget(row.period());
        double perVolume = units.rateFactor() / row.period().duration();
        Optional<Total> total = row.item().total();
        double net = total.map(budget.totals()::get).orElseGet(() -> net(row, budget));
        double gross = total.map(sum -> budget.totals().throughput()).orElseGet(() -> gross(row, budget));
        if (Double.isNaN(net)) {
            throw new UsageFault("\"" + row.shortName()
                    + "\" has no number: it is empty in the budget, whose warnings say why. Trace another row.");
        }
        return new RowNumber(row, traced, net * perVolume, gross * perVolume);
    }

    private static TracedRow traced(BudgetRow row, Ledger ledger) {
        Optional<Total> total = row.item().total();
        if (total.isEmpty()) {
            return TracedRow.of(row.accounts(), ledger.accounts());
        }
        return TracedRow.of(total.get(), ledger.accounts())
                .orElseThrow(
                        () -> new UsageFault(
                                "\"" + row.shortName()
                                        + "\" is a ratio of sums and has no weights. Trace \"residual/*\" of the same prism and period."));
    }

    private static double net(BudgetRow row, PeriodBudget budget) {
        return row.accounts().isEmpty()
                ? Double.NaN
                : row.accounts().stream()
                        .mapToDouble(account -> budget.entries().get(account).net())
                        .sum();
    }

    private static double gross(BudgetRow row, PeriodBudget budget) {
        return row.accounts().stream()
                .map(budget.entries()::get)
                .mapToDouble(entry -> entry.inflow() + entry.outflow())
                .sum();
    }

    /**
     * Holds it against its trace.
     *
     * @throws ProgramFault if the trace adds up to something else
     */
    void mustBe(Trace.Sum sum) {
        double difference = Math.abs(sum.value() - net);
        if (!(difference <= AGREES * gross + ROUNDING * sum.magnitude())) {
            throw new ProgramFault("The trace of \"" + row.shortName() + "\" adds up to " + sum.value()
                    + ", but the row's net rate is " + net + ".");
        }
    }
}
