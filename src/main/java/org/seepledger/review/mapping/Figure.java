package org.seepledger.review.mapping;

import java.util.Optional;
import org.seepledger.review.sheet.Amount;
import org.seepledger.review.sheet.WrittenUnit;

/**
 * A figure of a submitted budget and all that is said of it.
 *
 * @param area its area, as the table names it; empty if it does not
 * @param when its period
 * @param term its term, as the table names it
 * @param layer its layer, as the table names it; empty if it does not
 * @param tie what the term is tied to
 * @param sense which way it counts
 * @param value the figure; NaN where the table says that it is not known
 * @param half how far rounding may have moved it
 * @param unit its unit as the table writes it; empty if it does not
 * @param written the same, understood
 * @param amount whether it is a rate or a volume; empty if nothing says so
 * @param place where it stands
 */
public record Figure(
        String area,
        When when,
        String term,
        String layer,
        Tie tie,
        Sense sense,
        double value,
        double half,
        String unit,
        Optional<WrittenUnit> written,
        Optional<Amount> amount,
        String place) {

    /** {@return the figure as it adds to in − out} */
    public double net() {
        return sense == Sense.IN || sense == Sense.NET ? value : -value;
    }

    /**
     * {@return the same figure with its number turned}
     */
    Figure turned() {
        return new Figure(area, when, term, layer, tie, sense, -value, half, unit, written, amount, place);
    }

    /**
     * {@return the same figure, tied to something else}
     *
     * @param other what to
     */
    public Figure tied(Tie other) {
        return new Figure(area, when, term, layer, other, sense, value, half, unit, written, amount, place);
    }

    /** The same figure in a period that is better known. */
    Figure in(When better) {
        return new Figure(area, better, term, layer, tie, sense, value, half, unit, written, amount, place);
    }

    /**
     * {@return the same figure, counting another way}
     *
     * @param other which way it counts
     */
    public Figure counting(Sense other) {
        return new Figure(area, when, term, layer, tie, other, value, half, unit, written, amount, place);
    }
}
