package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;

/**
 * A sum of figures and how far rounding may have moved it.
 *
 * @param value the sum
 * @param half the sum of what rounding may have moved each
 */
record Sum(double value, double half) {

    static final Sum NOTHING = new Sum(0, 0);

    static Sum of(List<Figure> figures, Rounding rounding, ToDoubleFunction<Figure> counted) {
        double value = 0;
        double half = 0;
        for (Figure figure : figures) {
            value += counted.applyAsDouble(figure);
            half += rounding.half(figure);
        }
        return new Sum(value, half);
    }

    Sum minus(Sum other) {
        return new Sum(value - other.value, half + other.half);
    }

    /** Whether the two are the same but for rounding. */
    boolean agrees(Sum other) {
        double rounding = half + other.half + 1e-9 * (Math.abs(value) + Math.abs(other.value));
        return Math.abs(value - other.value) <= rounding;
    }

    /**
     * What a total may be made of: all terms, or without storage, without those of other compartments, without those that
     * nobody knows. Tables differ in that; the first list has all of them but storage.
     */
    static List<List<Figure>> choices(List<Figure> parts) {
        List<List<Figure>> choices = new ArrayList<>();
        for (int left = 0; left < 8; left++) {
            boolean storage = (left & 1) != 0;
            boolean noOutside = (left & 2) != 0;
            boolean noUntied = (left & 4) != 0;
            List<Figure> kept = parts.stream()
                    .filter(figure -> storage || !figure.tie().storage())
                    .filter(figure -> !noOutside || figure.tie().kind() != Kind.OUTSIDE)
                    .filter(figure -> !noUntied || figure.tie().kind() != Kind.UNTIED)
                    .toList();
            if (!choices.contains(kept)) {
                choices.add(kept);
            }
        }
        return choices;
    }
}
