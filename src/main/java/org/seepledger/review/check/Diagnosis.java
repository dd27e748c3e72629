package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.seepledger.review.check.KnownRatios.Ratio;
import org.seepledger.review.check.Recomputed.Aspect;
import org.seepledger.review.check.Recomputed.Variant;
import org.seepledger.review.check.Selection.Way;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Sense;
import org.seepledger.unit.Figures;

/** Why the terms of one area differ from the recomputed ones: first what explains all of them, then each by itself. */
final class Diagnosis {

    private static final double MOST = 0.8;
    private static final double FEW = 0.3;

    private final String prism;
    private final double tolerance;
    private final Slips slips;
    private final List<Finding> findings = new ArrayList<>();
    private List<Series> series;

    private Diagnosis(String prism, List<Series> series, double tolerance, Catalogue catalogue) {
        this.prism = prism;
        this.series = series;
        this.tolerance = tolerance;
        this.slips = new Slips(tolerance, catalogue);
    }

    /**
     * What was found, and the terms beside what they were held against.
     *
     * @param findings the findings
     * @param series the terms
     */
    record Result(List<Finding> findings, List<Series> series) {}

    static Result of(String prism, List<Series> series, double tolerance, Catalogue catalogue) {
        Diagnosis diagnosis = new Diagnosis(prism, series, tolerance, catalogue);
        diagnosis.run();
        return new Result(diagnosis.findings, diagnosis.series);
    }

    private void run() {
        if (!bad(series).isEmpty()) {
            allowVariant(Aspect.WHOLE_CELLS, Code.WHOLE_CELLS);
            allowVariant(Aspect.WELLS_SPREAD, Code.WELLS_SPREAD);
        }
        noteNet();
        boolean explained = !bad(series).isEmpty()
                && (units() || variant(Aspect.PERIOD, Code.PERIOD) || variant(Aspect.AREA, Code.AREA));
        if (!explained) {
            each();
        }
    }

    /** Each term by itself. */
    private void each() {
        Set<Series> left = new LinkedHashSet<>(bad(series));
        left.removeAll(thickness());
        left.removeAll(told(Turned.wholly(left, tolerance, slips)));
        left.removeIf(one -> slips.of(one).map(findings::add).isPresent());
        left.removeAll(told(Turned.partly(left, tolerance, slips)));
        Coverage coverage = new Coverage(series, List.copyOf(left), tolerance, slips);
        findings.addAll(coverage.findings());
        left.removeAll(coverage.explained());
        rest(List.copyOf(left));
    }

    private Set<Series> told(Turned turned) {
        findings.addAll(turned.findings());
        return turned.explained();
    }

    /** The terms that differ; one whose in and out are both too small by the same was netted, and does not. */
    private static List<Series> bad(List<Series> among) {
        return among.stream()
                .filter(one -> !one.agrees() && !netted(one, among))
                .toList();
    }

    private static boolean netted(Series one, List<Series> among) {
        Sense other = one.sense() == Sense.IN ? Sense.OUT : Sense.IN;
        boolean oneWay = one.sense() == Sense.IN || one.sense() == Sense.OUT;
        return oneWay
                && among.stream()
                        .filter(two -> two.sense() == other && two.selection().equals(one.selection()))
                        .anyMatch(one::isNettedWith);
    }

    /** Another way of working that others hold for sound, if it fits better. */
    private void allowVariant(Aspect aspect, Code code) {
        for (String words : words(aspect)) {
            List<Series> moved = moved(aspect, words);
            int left = bad(moved).size();
            boolean fits = moved.size() == series.size() && left <= Math.max(1, FEW * series.size());
            if (fits && left < bad(series).size()) {
                series = moved;
                note(code, "The figures agree better if " + words + "; they were held against that.");
                return;
            }
        }
    }

    private void note(Code code, String words) {
        findings.add(Finding.of(Severity.NOTE, code, prism, Finding.SEVERAL, Finding.SEVERAL, words));
    }

    private Set<String> words(Aspect aspect) {
        Set<String> words = new LinkedHashSet<>();
        series.forEach(one -> one.points()
                .forEach(point -> point.source().variants().stream()
                        .filter(variant -> variant.aspect() == aspect)
                        .map(Variant::words)
                        .forEach(words::add)));
        return words;
    }

    private List<Series> moved(Aspect aspect, String words) {
        return series.stream()
                .map(one -> one.against(aspect, words))
                .flatMap(Optional::stream)
                .toList();
    }

    private void noteNet() {
        List<String> netted = series.stream()
                .filter(one -> one.agrees() && one.way() != Way.GROSS || !one.agrees() && netted(one, series))
                .map(Series::quoted)
                .distinct()
                .toList();
        if (!netted.isEmpty()) {
            note(
                    Code.NET,
                    String.join(", ", netted)
                            + (netted.size() == 1 ? " agrees" : " agree")
                            + " as net flow; what flows both ways through a face is larger.");
        }
    }

    /** One factor for all terms. */
    private boolean units() {
        for (Way way : List.of(Way.GROSS, Way.NET_BY_ACCOUNT, Way.NET_BY_ITEM)) {
            Series all = all(way);
            Optional<Ratio> ratio = slips.ratio(all, point -> 1)
                    .or(() -> slips.ratio(all, point -> point.source().days()))
                    .or(() -> slips.ratio(all, point -> 1 / point.source().days()));
            if (ratio.isPresent() && bad(series).size() >= Math.max(2, MOST * significant())) {
                Finding found = slips.finding(
                        Severity.FAULT,
                        Code.UNITS,
                        all,
                        "All terms are off by the same factor, "
                                + Figures.shown(ratio.get().value()) + ": that is the ratio of "
                                + ratio.get().words() + ".");
                findings.add(found.about(Finding.SEVERAL));
                return true;
            }
        }
        return false;
    }

    /** All terms as if they were one. */
    private Series all(Way way) {
        List<Point> points = series.stream()
                .map(one -> one.counted(way))
                .flatMap(one -> one.points().stream())
                .toList();
        Series first = series.get(0);
        return new Series(
                prism,
                List.of("all terms"),
                first.selection(),
                first.sense(),
                first.amount(),
                first.both(),
                tolerance,
                way,
                points);
    }

    private long significant() {
        return series.stream()
                .filter(one -> one.points().stream()
                        .anyMatch(point -> Math.max(Math.abs(point.recomputed()), Math.abs(point.submitted()))
                                > tolerance * point.throughput()))
                .count();
    }

    /** Numbers of another period or area: all terms agree with them. */
    private boolean variant(Aspect aspect, Code code) {
        Set<String> differing = new LinkedHashSet<>();
        bad(series).forEach(one -> differing.add(one.quoted()));
        for (String words : words(aspect)) {
            List<Series> moved = moved(aspect, words);
            long were = moved.stream()
                    .map(Series::quoted)
                    .distinct()
                    .filter(differing::contains)
                    .count();
            boolean most = moved.size() >= 2 && moved.size() >= 0.5 * series.size();
            if (most && were >= 2 && bad(moved).isEmpty()) {
                findings.add(Finding.of(
                        Severity.FAULT,
                        code,
                        prism,
                        Finding.SEVERAL,
                        Finding.SEVERAL,
                        "The figures agree with those of " + words + "."));
                return true;
            }
        }
        return false;
    }

    /** Flow through sides that agrees, all of it, once layers are full. */
    private List<Series> thickness() {
        List<Series> sides = series.stream().filter(Series::sides).toList();
        List<Series> bad = bad(sides);
        for (String words : words(Aspect.FULL_LAYERS)) {
            List<Series> full = sides.stream()
                    .map(one -> one.against(Aspect.FULL_LAYERS, words))
                    .flatMap(Optional::stream)
                    .toList();
            boolean all =
                    !bad.isEmpty() && full.size() == sides.size() && bad(full).isEmpty();
            if (all && largest(full) < 0.3 * largest(sides)) {
                bad.forEach(one -> findings.add(slips.finding(
                        slips.weight(one),
                        Code.THICKNESS,
                        one,
                        one.quoted() + " is what flows through layers that are full; where there is a water table,"
                                + " only the saturated part counts.")));
                return bad;
            }
        }
        return List.of();
    }

    private static double largest(List<Series> among) {
        return bad(among).stream()
                .mapToDouble(Series::worstShare)
                .max()
                .orElseGet(() -> among.stream()
                        .filter(Series::agrees)
                        .mapToDouble(Series::worstShare)
                        .max()
                        .orElse(0));
    }

    /** What no slip explains. */
    private void rest(List<Series> left) {
        if (left.isEmpty()) {
            return;
        }
        Closing whole = new Closing(series, tolerance);
        boolean oneTerm = left.stream().map(Series::selection).distinct().count() == 1;
        Series first = left.get(0);
        if (oneTerm && whole.closes() && !whole.recomputedCloses()) {
            findings.add(slips.finding(
                    slips.weight(first),
                    Code.RESIDUAL_BOOKED,
                    first,
                    first.quoted() + " alone differs, and the budget then closes, though the recomputed one does not:"
                            + " the residual may be booked into it."));
        } else if (!oneTerm && new Closing(left, tolerance).cancels()) {
            String names = String.join(
                    ", ", left.stream().map(Series::quoted).distinct().toList());
            Series worst = left.stream()
                    .max(Comparator.comparingDouble(Series::worstShare))
                    .orElseThrow();
            findings.add(slips.finding(
                            slips.weight(worst),
                            Code.COMPENSATING,
                            worst,
                            names + " differ by amounts that cancel: the budget closes all the same, and closure tells"
                                    + " nothing of them.")
                    .about(String.join(
                            " + ", left.stream().map(Series::term).distinct().toList())));
        } else {
            left.forEach(one -> findings.add(slips.area(one).orElseGet(() -> slips.difference(one))));
        }
    }
}
