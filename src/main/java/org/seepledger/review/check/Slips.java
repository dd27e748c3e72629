package org.seepledger.review.check;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.seepledger.review.check.KnownRatios.Ratio;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Sense;
import org.seepledger.unit.Figures;

/** Slips that one term can have by itself. */
final class Slips {

    private static final double SAME = 0.005;
    private static final double CLOSELY = 0.35;
    private static final double ROUGHLY = 0.7;
    private static final int MOST_WELLS = 80;

    private final double tolerance;
    private final Catalogue catalogue;

    Slips(double tolerance, Catalogue catalogue) {
        this.tolerance = tolerance;
        this.catalogue = catalogue;
    }

    /** The slip with a sure signature that explains a series; empty if none does. */
    Optional<Finding> of(Series series) {
        return Stream.concat(Stream.of(series), series.ways().stream().map(series::counted))
                .map(this::sure)
                .flatMap(Optional::stream)
                .findFirst();
    }

    private Optional<Finding> sure(Series series) {
        return turned(series)
                .or(() -> absent(series))
                .or(() -> twice(series))
                .or(() -> well(series))
                .or(() -> coefficient(series, CLOSELY))
                .or(() -> unit(series))
                .or(() -> coefficient(series, ROUGHLY));
    }

    private Optional<Finding> turned(Series series) {
        if (!series.isTimes(point -> -1, SAME)) {
            return Optional.empty();
        }
        Code code = series.storage() ? Code.STORAGE_TURNED : Code.SIGN;
        String words = series.storage()
                ? " counts the wrong way: release and uptake are exchanged."
                : " has the right size, but counts the wrong way.";
        return Optional.of(finding(Severity.FAULT, code, series, series.quoted() + words));
    }

    private Optional<Finding> absent(Series series) {
        boolean nothing = series.points().stream().allMatch(point -> point.submitted() == 0);
        if (!nothing) {
            return Optional.empty();
        }
        return Optional.of(finding(weight(series), Code.MISSING, series, series.quoted() + " is given as 0."));
    }

    private Optional<Finding> twice(Series series) {
        boolean repeated =
                series.points().stream().allMatch(point -> point.figures().size() > 1);
        if (series.isTimes(point -> 2, SAME)) {
            String words =
                    repeated ? " stands twice in the table." : " is twice what it should be: it may be counted twice.";
            return Optional.of(finding(Severity.FAULT, Code.TWICE, series, series.quoted() + words));
        }
        if (!repeated) {
            return Optional.empty();
        }
        boolean firstAgrees = series.points().stream().allMatch(point -> {
            double first = point.figures().get(0).value() * point.unit();
            return Math.abs(first - point.recomputed()) <= Math.max(point.half(), tolerance * point.throughput());
        });
        return firstAgrees
                ? Optional.of(finding(
                        Severity.FAULT,
                        Code.TWICE,
                        series,
                        series.quoted() + " is there more than once; the first of them agrees by itself."))
                : Optional.empty();
    }

    private Optional<Finding> unit(Series series) {
        return ratio(series, point -> 1)
                .or(() -> ratio(series, point -> point.source().days()))
                .or(() -> ratio(series, point -> 1 / point.source().days()))
                .map(ratio -> finding(
                        Severity.FAULT,
                        Code.UNIT,
                        series,
                        series.quoted() + " is " + Figures.shown(median(series))
                                + " times what was recomputed; that is the ratio of " + ratio.words() + "."));
    }

    /** The known ratio that a series is off by, beside a factor of each period. */
    Optional<Ratio> ratio(Series series, ToDoubleFunction<Point> period) {
        List<Double> ratios = ratios(series, period);
        if (ratios.isEmpty()) {
            return Optional.empty();
        }
        double middle = ratios.get(ratios.size() / 2);
        boolean byPeriod = period.applyAsDouble(series.points().get(0)) != 1;
        Optional<Ratio> known = byPeriod && Math.abs(Math.abs(middle) - 1) <= SAME
                ? Optional.of(new Ratio(1, "an amount a day to one in each period"))
                : byPeriod ? Optional.empty() : KnownRatios.nearest(middle);
        double sign = Math.signum(middle);
        return known.filter(
                ratio -> series.isTimes(point -> sign * ratio.value() * period.applyAsDouble(point), KnownRatios.NEAR));
    }

    private List<Double> ratios(Series series, ToDoubleFunction<Point> period) {
        return series.points().stream()
                .filter(point -> point.recomputed() != 0 && Math.abs(point.submitted()) > 2 * point.half())
                .sorted(Comparator.comparingDouble(point -> -Math.abs(point.recomputed())))
                .limit(1 + series.points().size() / 2)
                .map(point -> point.submitted() / point.recomputed() / period.applyAsDouble(point))
                .sorted()
                .toList();
    }

    private double median(Series series) {
        List<Double> ratios = ratios(series, point -> 1);
        return ratios.isEmpty() ? Double.NaN : ratios.get(ratios.size() / 2);
    }

    /** Specific storage where specific yield belongs, or the other way round: roughly, since both vary in space. */
    private Optional<Finding> coefficient(Series series, double near) {
        if (!series.storage()) {
            return Optional.empty();
        }
        List<Double> ratios = ratios(series, point -> 1);
        Optional<Double> expected = expected(series);
        if (ratios.isEmpty() || expected.isEmpty()) {
            return Optional.empty();
        }
        double log = Math.log(Math.abs(ratios.get(ratios.size() / 2)));
        boolean less = Math.abs(log - Math.log(expected.get())) < near;
        boolean more = Math.abs(log + Math.log(expected.get())) < near;
        if (!less && !more) {
            return Optional.empty();
        }
        String words = less
                ? " is about what the storage of full, confined layers would be: specific yield may be left out where there is a water table."
                : " is about as much too large as specific yield is beside specific storage times thickness: it may be specific yield of a layer that is full.";
        return Optional.of(finding(Severity.FAULT, Code.STORAGE_COEFFICIENT, series, series.quoted() + words));
    }

    /** What full layers would release for what is released; empty where that is not much less. */
    private static Optional<Double> expected(Series series) {
        double full = 0;
        double own = 0;
        for (Point point : series.points()) {
            Optional<org.seepledger.ledger.PeriodBudget> variant = point.source().variants().stream()
                    .filter(one -> one.aspect() == Recomputed.Aspect.FULL_LAYERS)
                    .map(Recomputed.Variant::budget)
                    .findFirst();
            if (variant.isPresent()) {
                Selection all = new Selection(java.util.Set.of("storage"), java.util.Set.of(), -1);
                full += Math.abs(all.of(variant.get(), Selection.Way.NET, Sense.NET));
                own += Math.abs(all.of(point.basis(), Selection.Way.NET, Sense.NET));
            }
        }
        double ratio = full / own;
        return ratio > 0 && ratio < 0.3 ? Optional.of(ratio) : Optional.empty();
    }

    /** Terms over the area that are all off by the same share. */
    Optional<Finding> area(Series series) {
        boolean areal = series.selection().items().stream()
                .allMatch(item -> catalogue.items().stream()
                        .anyMatch(known -> known.key().equals(item) && known.nature() == Catalogue.Nature.AREAL));
        double middle = median(series);
        boolean same = areal && middle > 0.2 && middle < 5 && series.isTimes(point -> middle, SAME);
        if (!same) {
            return Optional.empty();
        }
        return Optional.of(
                finding(
                        weight(series),
                        Code.AREA,
                        series,
                        series.quoted() + " is " + Figures.shown(middle)
                                + " times what was recomputed: the rate may have been taken over an area that is so much larger or smaller."));
    }

    /** A well, or two, counted in or left out. */
    private Optional<Finding> well(Series series) {
        boolean wells = series.selection().items().stream()
                .allMatch(item -> catalogue.items().stream()
                        .anyMatch(known -> known.key().equals(item) && known.nature() == Catalogue.Nature.WELLS));
        int count = series.points().get(0).source().wells().size();
        boolean nothing = series.points().stream().allMatch(point -> point.recomputed() == 0);
        if (!wells || nothing && series.agreesTurned() || count > MOST_WELLS) {
            return Optional.empty();
        }
        return WellSet.upToTwo(count)
                .filter(set -> set.explains(series))
                .findFirst()
                .map(set ->
                        finding(weight(series), Code.WELL, series, series.quoted() + " " + set.words(series) + "."));
    }

    Finding difference(Series series) {
        String words =
                series.quoted() + " differs by up to " + Figures.percent(100 * series.worstShare()) + " of throughput.";
        return finding(weight(series), Code.DIFFERENCE, series, words);
    }

    /** A difference of a few tolerances is a doubt. */
    Severity weight(Series series) {
        return series.worstShare() > 5 * tolerance ? Severity.FAULT : Severity.DOUBT;
    }

    Finding finding(Severity severity, Code code, Series series, String message) {
        Point worst = series.worst();
        return new Finding(
                severity,
                code,
                series.prism(),
                series.periods(),
                series.term(),
                worst.submitted() / worst.unit(),
                worst.recomputed() / worst.unit(),
                worst.figures().get(0).unit(),
                series.points().size() == 1 || worst.when().label().isEmpty()
                        ? message
                        : message + " The numbers are those of " + worst.when().label() + ".");
    }
}
