package org.seepledger.desktop.budget;

import java.util.List;
import java.util.Optional;
import org.seepledger.job.IntervalBudget;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;

/**
 * What was last worked out. It may belong to an earlier geometry than the one drawn now.
 *
 * @param now the budget of one prism in one interval
 * @param record the budgets of all prisms over the whole record
 */
public record Known(Optional<IntervalBudget> now, Optional<RecordBudget> record) {

    /** Nothing yet. */
    public static final Known NOTHING = new Known(Optional.empty(), Optional.empty());

    /** Whether the record is that of these prisms. */
    boolean hasRecordOf(List<Prism> prisms) {
        return record.filter(known -> known.prisms().equals(prisms)).isPresent();
    }

    /** Whether the single budget is that of this prism and interval. */
    boolean hasNow(Prism prism, int interval) {
        return now.filter(known -> known.interval() == interval && known.prism().equals(prism))
                .isPresent();
    }

    /**
     * {@return the budget of a prism in a period, of the geometry drawn now if that is known, else of the last one known}
     *
     * @param prism the prism as it is drawn now
     * @param period the period
     */
    public Optional<BudgetShown> budget(Prism prism, Period period) {
        Optional<BudgetShown> fromRecord = record.flatMap(known -> BudgetShown.of(known, prism.name(), period));
        Optional<BudgetShown> fromNow = now.filter(known -> known.prism().name().equals(prism.name()))
                .filter(known -> known.budget().period().equals(period))
                .map(BudgetShown::of);
        boolean recordHolds =
                fromRecord.filter(shown -> shown.prism().equals(prism)).isPresent();
        return recordHolds ? fromRecord : fromNow.or(() -> fromRecord);
    }
}
