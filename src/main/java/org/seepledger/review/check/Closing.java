package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.When;

/** Whether terms of one area add to nothing, period by period. */
final class Closing {

    private final double tolerance;
    private final Map<When, List<Term>> periods = new LinkedHashMap<>();

    /** A term in a period. */
    private record Term(Series series, Point point) {

        double signed(double value) {
            return series.sense() == Sense.OUT || series.sense() == Sense.LOSS ? -value : value;
        }
    }

    /**
     * Prepares terms.
     *
     * @param series the terms; of one that has in, out and net, net is left out
     * @param tolerance share of throughput that counts as nothing
     */
    Closing(List<Series> series, double tolerance) {
        this.tolerance = tolerance;
        for (Series one : series) {
            if (!isRepeated(one, series)) {
                one.points()
                        .forEach(point -> periods.computeIfAbsent(point.when(), any -> new ArrayList<>())
                                .add(new Term(one, point)));
            }
        }
    }

    private static boolean isRepeated(Series one, List<Series> all) {
        boolean net = one.sense() == Sense.NET || one.sense() == Sense.LOSS;
        return net
                && all.stream()
                        .anyMatch(other -> other.selection().equals(one.selection())
                                && (other.sense() == Sense.IN || other.sense() == Sense.OUT));
    }

    /** Whether what was submitted adds to nothing in all periods. */
    boolean closes() {
        return periods.values().stream().allMatch(terms -> {
            double half =
                    terms.stream().mapToDouble(term -> term.point().half()).sum();
            return Math.abs(sum(terms, Point::submitted)) <= half + 0.1 * tolerance * throughput(terms);
        });
    }

    /** Whether the recomputed budget closes, too. */
    boolean recomputedCloses() {
        return periods.values().stream().allMatch(terms -> {
            Point point = terms.get(0).point();
            double residual = point.basis().totals().residual() * point.source().cubicMetres();
            return Math.abs(residual) <= 0.5 * tolerance * point.throughput();
        });
    }

    /** Whether differences of several terms cancel in all periods. */
    boolean cancels() {
        return periods.values().stream().allMatch(terms -> {
            double size = terms.stream()
                    .mapToDouble(term -> Math.abs(term.point().off()))
                    .sum();
            double sum = Math.abs(sum(terms, Point::off));
            return sum <= Math.max(0.2 * size, tolerance * throughput(terms));
        });
    }

    private static double sum(List<Term> terms, ToDoubleFunction<Point> value) {
        return terms.stream()
                .mapToDouble(term -> term.signed(value.applyAsDouble(term.point())))
                .sum();
    }

    private static double throughput(List<Term> terms) {
        return terms.get(0).point().throughput();
    }
}
