package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.review.check.KnownRatios.Ratio;
import org.seepledger.review.check.Recomputed.Aspect;
import org.seepledger.review.check.Recomputed.Variant;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Sense;
import org.seepledger.unit.Figures;

/** Why the terms of one area differ from the recomputed ones: first what explains all of them, then each by itself. */
final class Diagnosis {

    private static final double MOST = 0.8;

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
        if (!bad().isEmpty()) {
            allowVariant(Aspect.WHOLE_CELLS, Code.WHOLE_CELLS);
            allowVariant(Aspect.WELLS_SPREAD, Code.WELLS_SPREAD);
        }
        noteNet();
        if (bad().isEmpty()) {
            missing(bad());
            return;
        }
        if (units() || variant(Aspect.PERIOD, Code.PERIOD) || variant(Aspect.AREA, Code.AREA)) {
            return;
        }
        Set<Series> left = new LinkedHashSet<>(bad());
        left.removeAll(thickness());
        left.removeAll(exchanged(left));
        left.removeIf(one -> slips.of(one).map(findings::add).isPresent());
        left.removeAll(missing(List.copyOf(left)));
        rest(List.copyOf(left));
    }

    private List<Series> bad() {
        return series.stream().filter(one -> !one.agrees(tolerance)).toList();
    }

    private static List<Series> bad(List<Series> among, double tolerance) {
        return among.stream().filter(one -> !one.agrees(tolerance)).toList();
    }

    /** Another way of working that others hold for sound, if it fits better. */
    private void allowVariant(Aspect aspect, Code code) {
        for (String words : words(aspect)) {
            List<Series> moved = moved(aspect, words);
            boolean better =
                    moved.size() == series.size() && bad(moved, tolerance).size() < bad().size();
            if (better) {
                series = moved;
                findings.add(Finding.of(
                        Severity.NOTE,
                        code,
                        prism,
                        Finding.SEVERAL,
                        Finding.SEVERAL,
                        "The figures agree better if " + words + "; they were held against that."));
                return;
            }
        }
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
                .filter(one -> one.way() != Selection.Way.GROSS && one.agrees(tolerance))
                .filter(one -> !one.counted(Selection.Way.GROSS).agrees(tolerance))
                .map(Series::quoted)
                .toList();
        if (!netted.isEmpty()) {
            findings.add(Finding.of(
                    Severity.NOTE,
                    Code.NET,
                    prism,
                    Finding.SEVERAL,
                    Finding.SEVERAL,
                    String.join(", ", netted) + " agree as net flow; what flows both ways through a face is larger."));
        }
    }

    /** One factor for all terms. */
    private boolean units() {
        List<Point> points =
                series.stream().flatMap(one -> one.points().stream()).toList();
        Series first = series.get(0);
        Series all = new Series(
                prism, List.of("all terms"), first.selection(), first.sense(), first.amount(), first.way(), points);
        Optional<Ratio> ratio = slips.ratio(all, point -> 1)
                .or(() -> slips.ratio(all, point -> point.source().days()))
                .or(() -> slips.ratio(all, point -> 1 / point.source().days()));
        long telling = series.stream().filter(one -> !one.agrees(tolerance)).count();
        if (ratio.isEmpty() || telling < Math.max(2, MOST * significant())) {
            return false;
        }
        Finding found = slips.finding(
                Severity.FAULT,
                Code.UNITS,
                all,
                "All terms are off by the same factor, "
                        + Figures.shown(ratio.get().value()) + ": that is the ratio of "
                        + ratio.get().words() + ".");
        findings.add(new Finding(
                found.severity(),
                found.code(),
                prism,
                found.period(),
                Finding.SEVERAL,
                found.submitted(),
                found.recomputed(),
                found.unit(),
                found.message()));
        return true;
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
        for (String words : words(aspect)) {
            List<Series> moved = moved(aspect, words);
            long were = moved.stream()
                    .filter(one -> series.stream()
                            .anyMatch(own -> own.terms().equals(one.terms())
                                    && own.sense() == one.sense()
                                    && !own.agrees(tolerance)))
                    .count();
            boolean most = moved.size() >= 2 && moved.size() >= 0.5 * series.size();
            if (most && were >= 2 && bad(moved, tolerance).isEmpty()) {
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
        List<Series> bad = bad(sides, tolerance);
        for (String words : words(Aspect.FULL_LAYERS)) {
            boolean all = !bad.isEmpty()
                    && sides.stream()
                            .allMatch(one -> one.against(Aspect.FULL_LAYERS, words)
                                    .filter(moved -> moved.agrees(tolerance))
                                    .isPresent())
                    && bad.stream()
                            .anyMatch(one -> fitsBetter(
                                    one, one.against(Aspect.FULL_LAYERS, words).orElseThrow()));
            if (all) {
                bad.forEach(
                        one -> findings.add(
                                slips.finding(
                                        slips.weight(one),
                                        Code.THICKNESS,
                                        one,
                                        one.quoted()
                                                + " is what flows through layers that are full; where there is a water table, only the saturated part counts.")));
                return bad;
            }
        }
        return List.of();
    }

    /** In and out of a term that have each other's numbers. */
    private Set<Series> exchanged(Set<Series> left) {
        Set<Series> found = new LinkedHashSet<>();
        for (Series in : left) {
            for (Series out : left) {
                boolean pair = in.sense() == Sense.IN
                        && out.sense() == Sense.OUT
                        && in.selection().equals(out.selection())
                        && in.points().size() == out.points().size();
                if (pair && in.hasThatOf(out, tolerance) && out.hasThatOf(in, tolerance)) {
                    Code code = in.storage() ? Code.STORAGE_TURNED : Code.SIGN;
                    String words = in.storage()
                            ? ": release and uptake are exchanged."
                            : ": inflow and outflow are exchanged.";
                    findings.add(slips.finding(Severity.FAULT, code, in, in.quoted() + words));
                    found.add(in);
                    found.add(out);
                }
            }
        }
        return found;
    }

    private boolean fitsBetter(Series own, Series moved) {
        return moved.worstShare() < 0.3 * own.worstShare();
    }

    /** Items that no term stands for; a term that agrees once it takes one in was grouped. */
    private List<Series> missing(List<Series> unexplained) {
        List<Series> explained = new ArrayList<>();
        Set<String> absent = uncovered();
        if (absent.isEmpty() || series.size() < 2) {
            return explained;
        }
        for (Series one : unexplained) {
            Optional<Series> found = takingIn(one, absent);
            if (found.isPresent()) {
                Set<String> taken = new TreeSet<>(found.get().selection().items());
                taken.removeAll(one.selection().items());
                absent.removeAll(taken);
                explained.add(one);
                findings.add(grouped(one, taken));
            }
        }
        absent.forEach(this::reportMissing);
        return explained;
    }

    /** A term with one of the absent items, or all of them, if it then agrees. */
    private Optional<Series> takingIn(Series one, Set<String> absent) {
        Selection all = one.selection();
        for (String key : absent) {
            all = all.and(key);
        }
        Stream<Selection> each = absent.stream().map(one.selection()::and);
        return Stream.concat(each, Stream.of(all))
                .map(one::with)
                .filter(with -> with.agrees(tolerance))
                .findFirst();
    }

    private Finding grouped(Series one, Set<String> taken) {
        String group = one.selection().items().iterator().next().replaceFirst("/.*", "");
        boolean alike = taken.stream().allMatch(key -> key.startsWith(group));
        String words = one.quoted() + " agrees if it includes " + String.join(", ", names(taken)) + ".";
        return slips.finding(alike ? Severity.NOTE : Severity.DOUBT, Code.GROUPED, one, words);
    }

    private static List<String> names(Set<String> keys) {
        return keys.stream()
                .map(key -> "\"" + key.replaceFirst("^[a-z]+/", "") + "\"")
                .toList();
    }

    /** Items with something in them that no term of the table stands for. */
    private Set<String> uncovered() {
        Set<String> absent = new TreeSet<>();
        for (Point point : series.stream().flatMap(one -> one.points().stream()).toList()) {
            for (Entry entry : point.basis().entries()) {
                boolean covered = !entry.account().quantified()
                        || series.stream().anyMatch(one -> one.selection().takes(entry.account()));
                if (!covered && share(point, Selection.key(entry.account())) > tolerance) {
                    absent.add(Selection.key(entry.account()));
                }
            }
        }
        return absent;
    }

    private static double share(Point point, String key) {
        Selection selection = new Selection(Set.of(key), Set.of(), -1);
        double in = selection.of(point.basis(), Selection.Way.GROSS, Sense.IN);
        double out = selection.of(point.basis(), Selection.Way.GROSS, Sense.OUT);
        return Math.max(in, out) * point.source().cubicMetres() / Math.max(point.throughput(), 1e-300);
    }

    private void reportMissing(String key) {
        Selection selection = new Selection(Set.of(key), Set.of(), -1);
        Point most = series.stream()
                .flatMap(one -> one.points().stream())
                .max(java.util.Comparator.comparingDouble(point -> share(point, key)))
                .orElseThrow();
        double net = selection.of(most.basis(), Selection.Way.NET, Sense.NET)
                * most.source().cubicMetres()
                / most.unit();
        boolean partly =
                key.startsWith(Group.SIDE.toString()) && series.stream().noneMatch(Series::faces);
        Severity severity = partly || share(most, key) <= 5 * tolerance ? Severity.DOUBT : Severity.FAULT;
        String name = key.replaceFirst("^[a-z]+/", "");
        findings.add(new Finding(
                severity,
                Code.MISSING,
                prism,
                most.when().label(),
                name,
                Double.NaN,
                net,
                most.figures().get(0).unit(),
                "No term of the table is tied to \"" + name + "\", " + Figures.percent(100 * share(most, key))
                        + " of throughput in " + most.when().label() + "."));
    }

    /** What no slip explains. */
    private void rest(List<Series> left) {
        if (left.isEmpty()) {
            return;
        }
        boolean closes = closes();
        if (closes && oneTerm(left) && !recomputedCloses()) {
            findings.add(
                    slips.finding(
                            slips.weight(left.get(0)),
                            Code.RESIDUAL_BOOKED,
                            left.get(0),
                            left.get(0).quoted()
                                    + " alone differs, and the budget then closes, though the recomputed one does not: the residual may be booked into it."));
            return;
        }
        if (left.size() > 1 && cancel(left)) {
            Severity weight = left.stream()
                    .map(slips::weight)
                    .min(java.util.Comparator.naturalOrder())
                    .orElseThrow();
            findings.add(
                    slips.finding(
                            weight,
                            Code.COMPENSATING,
                            joined(left),
                            String.join(", ", left.stream().map(Series::quoted).toList())
                                    + " differ by amounts that cancel: the budget closes all the same, and closure tells nothing of them."));
            return;
        }
        left.forEach(one -> findings.add(slips.area(one)
                .orElseGet(() -> slips.finding(
                        slips.weight(one),
                        Code.DIFFERENCE,
                        one,
                        one.quoted() + " differs by up to " + Figures.percent(100 * one.worstShare())
                                + " of throughput."))));
    }

    private static Series joined(List<Series> left) {
        Series first = left.get(0);
        List<String> terms =
                left.stream().flatMap(one -> one.terms().stream()).distinct().toList();
        return new Series(
                first.prism(), terms, first.selection(), first.sense(), first.amount(), first.way(), first.points());
    }

    /** One series, or in and out of the same term. */
    private static boolean oneTerm(List<Series> left) {
        return left.stream().map(Series::selection).distinct().count() == 1;
    }

    private static double signed(Series one, double value) {
        return one.sense() == Sense.OUT || one.sense() == Sense.LOSS ? -value : value;
    }

    private boolean closes() {
        return periods().allMatch(index -> {
            double sum = 0;
            double half = 0;
            for (Series one : counted()) {
                sum += signed(one, one.points().get(index).submitted());
                half += one.points().get(index).half();
            }
            return Math.abs(sum) <= half + 0.1 * tolerance * throughput(index);
        });
    }

    private boolean recomputedCloses() {
        return periods().allMatch(index -> {
            Point point = series.get(0).points().get(index);
            double residual = point.basis().totals().residual() * point.source().cubicMetres();
            return Math.abs(residual) <= 0.5 * tolerance * point.throughput();
        });
    }

    private boolean cancel(List<Series> left) {
        List<Series> terms =
                left.stream().filter(one -> counted().contains(one)).toList();
        return terms.size() > 1
                && periods().allMatch(index -> {
                    double sum = 0;
                    double size = 0;
                    for (Series one : terms) {
                        sum += signed(one, one.points().get(index).off());
                        size += Math.abs(one.points().get(index).off());
                    }
                    return Math.abs(sum) <= Math.max(0.2 * size, tolerance * throughput(index));
                });
    }

    /** The terms to add up: in and out where a term has both, else net; only where all have the same periods. */
    private List<Series> counted() {
        return series.stream()
                .filter(one -> one.sense() == Sense.IN
                        || one.sense() == Sense.OUT
                        || series.stream()
                                .noneMatch(other -> other != one
                                        && other.selection().equals(one.selection())
                                        && (other.sense() == Sense.IN || other.sense() == Sense.OUT)))
                .toList();
    }

    private double throughput(int index) {
        return series.get(0).points().get(index).throughput();
    }

    /** The periods, where all terms have the same number of them; else just none. */
    private java.util.stream.IntStream periods() {
        int count = series.get(0).points().size();
        boolean same = series.stream().allMatch(one -> one.points().size() == count);
        return java.util.stream.IntStream.range(0, same ? count : 1);
    }
}
