package org.seepledger.review.check;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.review.check.Selection.Way;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.sheet.Amount;

/**
 * A term of an area through its periods.
 *
 * @param prism the prism
 * @param terms the labels that it has in the table
 * @param selection what it stands for
 * @param sense which way it counts
 * @param amount whether it is given as rates or volumes
 * @param both whether the table gives both ways of it
 * @param tolerance share of throughput within which figures agree
 * @param way how flow both ways is counted
 * @param points its periods
 */
record Series(
        String prism,
        List<String> terms,
        Selection selection,
        Sense sense,
        Amount amount,
        boolean both,
        double tolerance,
        Way way,
        List<Point> points) {

    /** Share of telling points that a slip must explain. */
    private static final double NEARLY_ALL = 0.9;

    String term() {
        return String.join(" + ", terms);
    }

    boolean agrees() {
        return points.stream().allMatch(point -> point.agrees(tolerance));
    }

    boolean storage() {
        return selection.items().stream().allMatch(item -> item.startsWith("storage"));
    }

    boolean sides() {
        return selection.items().stream().allMatch(item -> item.startsWith("side"));
    }

    boolean faces() {
        return selection.items().stream().allMatch(item -> item.startsWith("side") || item.startsWith("lid"));
    }

    /** Whether what was submitted of it is what was recomputed of another one. */
    boolean hasThatOf(Series other) {
        return IntStream.range(0, points.size()).allMatch(i -> {
            Point own = points.get(i);
            double allowed = Math.max(own.half(), 0.5 * tolerance * own.throughput());
            return Math.abs(own.submitted() - other.points().get(i).recomputed()) <= allowed;
        });
    }

    /** Whether it and the other way of the same term are too small by the same. */
    boolean isNettedWith(Series other) {
        boolean same = points.size() == other.points().size();
        return same
                && IntStream.range(0, points.size()).allMatch(i -> {
                    Point own = points.get(i);
                    Point two = other.points().get(i);
                    double allowed = Math.max(own.half() + two.half(), tolerance * own.throughput());
                    return own.off() <= allowed && Math.abs(own.off() - two.off()) <= allowed;
                });
    }

    /** The ways of counting that a table may have gone by. */
    List<Way> ways() {
        if (sense == Sense.NET || sense == Sense.LOSS) {
            return List.of(Way.GROSS);
        }
        return both
                ? List.of(Way.GROSS, Way.NET_BY_ACCOUNT, Way.NET_BY_ITEM)
                : List.of(Way.GROSS, Way.NET_BY_ACCOUNT, Way.NET_BY_ITEM, Way.NET);
    }

    Series counted(Way other) {
        return with(selection, other, Point::basis);
    }

    /** The first way of counting by which all sizes agree, else gross. */
    Series settled() {
        return ways().stream()
                .map(this::counted)
                .filter(Series::sizesAgree)
                .findFirst()
                .orElseGet(() -> counted(Way.GROSS));
    }

    /** Whether it would agree if it counted the other way. */
    boolean agreesTurned() {
        return points.stream().allMatch(point -> {
            double net =
                    selection.of(point.basis(), Way.NET, sense) * point.source().cubicMetres();
            double allowed = Math.max(point.half(), tolerance * point.throughput());
            return Math.abs(point.submitted() + net) <= allowed;
        });
    }

    private boolean sizesAgree() {
        return points.stream().allMatch(point -> {
            double off = Math.abs(point.submitted()) - Math.abs(point.recomputed());
            return Math.abs(off) <= Math.max(point.half(), tolerance * point.throughput());
        });
    }

    Series with(Selection other) {
        return with(other, way, Point::basis).settled();
    }

    private Series with(Selection other, Way counted, Function<Point, PeriodBudget> budget) {
        List<Point> moved = points.stream()
                .map(point -> point.against(budget.apply(point), other, counted, sense))
                .toList();
        return new Series(prism, terms, other, sense, amount, both, tolerance, counted, moved);
    }

    /** The same beside a variant; empty where a period has none, or the term stands for nothing in it. */
    Optional<Series> against(Recomputed.Aspect aspect, String words) {
        boolean all = points.stream()
                .allMatch(point ->
                        variant(point, aspect, words).filter(selection::any).isPresent());
        return all
                ? Optional.of(with(
                                selection,
                                way,
                                point -> variant(point, aspect, words).orElseThrow())
                        .settled())
                : Optional.empty();
    }

    static Optional<PeriodBudget> variant(Point point, Recomputed.Aspect aspect, String words) {
        return point.source().variants().stream()
                .filter(variant -> variant.aspect() == aspect && variant.words().equals(words))
                .map(Recomputed.Variant::budget)
                .findFirst();
    }

    /** The point that is furthest off for its throughput. */
    Point worst() {
        return points.stream()
                .max(Comparator.comparingDouble(point -> Math.abs(point.off()) / Math.max(point.throughput(), 1e-300)))
                .orElseThrow();
    }

    /** The largest difference as a share of throughput. */
    double worstShare() {
        Point worst = worst();
        return Math.abs(worst.off()) / Math.max(worst.throughput(), 1e-300);
    }

    /**
     * Whether what was submitted is what was recomputed times a factor, in nearly all periods that can tell.
     *
     * @param factor the factor of a period
     * @param near how near, as a share
     */
    boolean isTimes(ToDoubleFunction<Point> factor, double near) {
        List<Point> telling = points.stream()
                .filter(point -> tells(point, factor.applyAsDouble(point), tolerance))
                .toList();
        long fitting = telling.stream()
                .filter(point -> fits(point, factor.applyAsDouble(point), near, tolerance))
                .count();
        return !telling.isEmpty() && fitting >= NEARLY_ALL * telling.size();
    }

    static boolean tells(Point point, double factor, double tolerance) {
        double size = Math.max(Math.abs(point.submitted()), Math.abs(factor * point.recomputed()));
        double largest = Math.max(size, Math.abs(point.recomputed()));
        return size > 2 * point.half() && largest > 0.2 * tolerance * point.throughput();
    }

    static boolean fits(Point point, double factor, double near, double tolerance) {
        double made = factor * point.recomputed();
        double size = Math.max(Math.abs(point.submitted()), Math.abs(made));
        double allowed = point.half() + near * size + Math.min(0.1 * tolerance * point.throughput(), 0.05 * size);
        return Math.abs(point.submitted() - made) <= allowed;
    }

    String periods() {
        return points.size() == 1 ? points.get(0).when().label() : Finding.SEVERAL;
    }

    String quoted() {
        return terms.stream().map(term -> "\"" + term + "\"").collect(Collectors.joining(" and "));
    }
}
