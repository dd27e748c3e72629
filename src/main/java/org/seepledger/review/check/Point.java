package org.seepledger.review.check;

import java.util.List;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.When;

/**
 * What was submitted of a term in a period, beside what was recomputed; amounts in m³.
 *
 * @param figures the figures that make up what was submitted
 * @param submitted their sum
 * @param half how far rounding may have moved it
 * @param unit m³ in one of the figures' unit
 * @param source the recomputed budget with its variants
 * @param basis the budget that it is held against
 * @param recomputed what that has of the term
 */
record Point(
        List<Figure> figures,
        double submitted,
        double half,
        double unit,
        Recomputed source,
        PeriodBudget basis,
        double recomputed) {

    When when() {
        return figures.get(0).when();
    }

    double throughput() {
        return source.throughput();
    }

    /** The same beside another budget. */
    Point against(PeriodBudget budget, Selection selection, Selection.Way way, Sense sense) {
        double value = selection.of(budget, way, sense) * source.cubicMetres();
        return new Point(figures, submitted, half, unit, source, budget, value);
    }

    double off() {
        return submitted - recomputed;
    }

    /** Whether the two agree within rounding or a share of throughput. */
    boolean agrees(double tolerance) {
        return Math.abs(off()) <= Math.max(half, tolerance * throughput()) * (1 + 1e-9);
    }
}
