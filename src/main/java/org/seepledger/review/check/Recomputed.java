package org.seepledger.review.check;

import java.util.List;
import java.util.function.Supplier;
import org.seepledger.ledger.PeriodBudget;

/**
 * A prism's recomputed budget of a period, with what it would be if other things had been done.
 *
 * @param budget the budget
 * @param cubicMetres how many cubic metres its unit of volume is
 * @param days how long the period is
 * @param area the prism's area, m²
 * @param otherwise gives the same budget done otherwise; asked only where something does not agree
 * @param wells what each well takes and adds, counted or not; the same wells in the same order in each period
 */
public record Recomputed(
        PeriodBudget budget,
        double cubicMetres,
        double days,
        double area,
        Supplier<List<Variant>> otherwise,
        List<WellVolume> wells) {

    /** Copies the list. */
    public Recomputed {
        wells = List.copyOf(wells);
    }

    /** {@return the same budget done otherwise} */
    List<Variant> variants() {
        return otherwise.get();
    }

    /** In what respect a budget may be done otherwise. */
    public enum Aspect {
        /** Cells along the outline are taken whole; others do so, and call it sound. */
        WHOLE_CELLS,
        /** Wells in cut cells count by area; others do so, and call it sound. */
        WELLS_SPREAD,
        /** All layers are full: the whole thickness for flow, specific storage for storage. */
        FULL_LAYERS,
        /** Another period. */
        PERIOD,
        /** Another prism. */
        AREA
    }

    /**
     * A budget done otherwise.
     *
     * @param aspect in what respect
     * @param words how, as it stands in a sentence
     * @param budget the budget
     */
    public record Variant(Aspect aspect, String words, PeriodBudget budget) {}

    /**
     * A well in a period.
     *
     * @param name its name
     * @param category its category
     * @param inside whether it lies inside the prism's outline
     * @param volume what it adds, m³; negative where it takes
     */
    public record WellVolume(String name, String category, boolean inside, double volume) {}

    /** The larger of all gains and all losses, m³. */
    double throughput() {
        return budget.totals().throughput() * cubicMetres;
    }
}
