package org.seepledger.report;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.Whereabouts;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.PeriodBudget;

/**
 * What a run came to for one prism.
 *
 * @param prism its name
 * @param storage whether its change in storage can be given
 * @param record its budget over the whole record
 * @param periods its budgets by period
 * @param exchange what it gives to other prisms and the outside, and takes from them
 * @param whereabouts where it does not close
 */
public record PrismResult(
        String prism,
        StorageKnowledge storage,
        PeriodBudget record,
        List<PeriodBudget> periods,
        List<ExchangeFlow> exchange,
        Whereabouts whereabouts) {

    /** Below this, in percent, a closure error is rounding and nothing else. */
    static final double ROUNDING_PERCENT = 1e-9;

    /** Imbalances that add up to less than this share of throughput change no figure of the budget. */
    private static final double LOCATED = 1e-8;

    /** Copies the lists. */
    public PrismResult {
        periods = List.copyOf(periods);
        exchange = List.copyOf(exchange);
    }

    /**
     * {@return what a run came to for one prism}
     *
     * @param aquifer the aquifer
     * @param balance the run's result
     * @param budgets the budgets by period, one for each prism
     * @param prism the prism, from 0
     */
    public static PrismResult of(Aquifer aquifer, Balance balance, List<PrismBudget> budgets, int prism) {
        Ledger ledger = balance.ledgers().get(prism);
        String name = ledger.prism();
        return new PrismResult(
                name,
                aquifer.storageKnowledge(),
                ledger.budget(new Periods(aquifer.times()).record()),
                budgets.get(prism).periods(),
                balance.exchange().stream()
                        .filter(flow ->
                                flow.giver().equals(name) || flow.receiver().equals(name))
                        .toList(),
                balance.whereabouts().get(prism));
    }

    /** {@return whether there are cells whose imbalance is more than rounding, and storage that would excuse it is known} */
    public boolean isWorthLocating() {
        double throughput = record.totals().throughput() / record.period().duration();
        return storageKnown() && !whereabouts.largest().isEmpty() && whereabouts.magnitude() > LOCATED * throughput;
    }

    /** {@return whether change in storage can be given, and with it a residual} */
    public boolean storageKnown() {
        return !Double.isNaN(record.totals().storageChange());
    }

    /** {@return whether the residual over the record is rounding and nothing else; false where there is none} */
    public boolean closesToRounding() {
        return closesToRounding(record);
    }

    /** {@return whether the residual of a budget is rounding and nothing else; false where there is none} */
    static boolean closesToRounding(PeriodBudget budget) {
        return !Double.isNaN(budget.totals().storageChange())
                && (budget.totals().throughput() == 0
                        || Math.abs(budget.totals().closureError()) < ROUNDING_PERCENT);
    }

    /** {@return the period with the largest closure error, where there is more than one period} */
    public Optional<PeriodBudget> worstPeriod() {
        return periods.size() < 2
                ? Optional.empty()
                : periods.stream()
                        .filter(budget -> !Double.isNaN(budget.totals().closureError()))
                        .max(Comparator.comparingDouble(
                                budget -> Math.abs(budget.totals().closureError())));
    }

    /** {@return the terms over the record, in the order of rows} */
    public List<Term> terms() {
        return Term.of(record);
    }
}
