package org.seepledger.report;

import java.util.List;
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
        return budget().storageKnown();
    }

    /** {@return its budget over the record and by period} */
    public BudgetCourse budget() {
        return new BudgetCourse(record, periods);
    }
}
