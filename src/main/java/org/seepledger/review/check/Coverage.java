package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.review.mapping.Sense;
import org.seepledger.unit.Figures;

/** Items of a prism that no term of a table stands for: missing, or in another term. */
final class Coverage {

    private final List<Series> series;
    private final double tolerance;
    private final Slips slips;
    private final Set<String> absent;
    private final List<Finding> findings = new ArrayList<>();
    private final List<Series> explained = new ArrayList<>();

    /**
     * Looks.
     *
     * @param series the terms of the area
     * @param unexplained those of them that differ
     * @param tolerance share of throughput below which an item may be left out
     * @param slips makes findings
     */
    Coverage(List<Series> series, List<Series> unexplained, double tolerance, Slips slips) {
        this.series = series;
        this.tolerance = tolerance;
        this.slips = slips;
        this.absent = series.size() < 2 ? Set.of() : absent();
        unexplained.forEach(this::takeIn);
        absent.forEach(this::report);
    }

    List<Finding> findings() {
        return findings;
    }

    /** The terms that agree once they take in what is absent. */
    List<Series> explained() {
        return explained;
    }

    private Set<String> absent() {
        Set<String> keys = new TreeSet<>();
        for (Point point : points().toList()) {
            for (Entry entry : point.basis().entries()) {
                boolean covered = !entry.account().quantified()
                        || series.stream().anyMatch(one -> one.selection().takes(entry.account()));
                if (!covered && share(point, Selection.key(entry.account())) > tolerance) {
                    keys.add(Selection.key(entry.account()));
                }
            }
        }
        return keys;
    }

    private Stream<Point> points() {
        return series.stream().flatMap(one -> one.points().stream());
    }

    /** What an item brings or takes in all, as a share of throughput. */
    private static double share(Point point, String key) {
        Selection selection = new Selection(Set.of(key), Set.of(), -1);
        double net = selection.of(point.basis(), Selection.Way.NET, Sense.NET);
        return Math.abs(net) * point.source().cubicMetres() / Math.max(point.throughput(), 1e-300);
    }

    private void takeIn(Series one) {
        takingIn(one).ifPresent(with -> {
            Set<String> taken = new TreeSet<>(with.selection().items());
            taken.removeAll(one.selection().items());
            absent.removeAll(taken);
            explained.add(one);
            findings.add(grouped(one, taken));
        });
    }

    /** A term with one of the absent items, or all of them, if it then agrees. */
    private Optional<Series> takingIn(Series one) {
        Selection all = one.selection();
        for (String key : absent) {
            all = all.and(key);
        }
        Stream<Selection> each = absent.stream().map(one.selection()::and);
        return Stream.concat(each, Stream.of(all))
                .map(one::with)
                .filter(Series::agrees)
                .findFirst();
    }

    private Finding grouped(Series one, Set<String> taken) {
        String group = one.selection().items().iterator().next().replaceFirst("/.*", "");
        boolean alike = taken.stream().allMatch(key -> key.startsWith(group));
        String names = String.join(
                ", ", taken.stream().map(key -> "\"" + name(key) + "\"").toList());
        return slips.finding(
                alike ? Severity.NOTE : Severity.DOUBT,
                Code.GROUPED,
                one,
                one.quoted() + " agrees if it includes " + names + ".");
    }

    private static String name(String key) {
        return key.replaceFirst("^[a-z]+/", "");
    }

    private void report(String key) {
        Selection selection = new Selection(Set.of(key), Set.of(), -1);
        Point most = points().max(Comparator.comparingDouble(point -> share(point, key)))
                .orElseThrow();
        double net = selection.of(most.basis(), Selection.Way.NET, Sense.NET)
                * most.source().cubicMetres()
                / most.unit();
        boolean noSides =
                key.startsWith(Group.SIDE.toString()) && series.stream().noneMatch(Series::faces);
        boolean small = noSides || share(most, key) <= 5 * tolerance;
        findings.add(new Finding(
                small ? Severity.DOUBT : Severity.FAULT,
                Code.MISSING,
                series.get(0).prism(),
                most.when().label(),
                name(key),
                Double.NaN,
                net,
                most.figures().get(0).unit(),
                "No term of the table is tied to \"" + name(key) + "\", "
                        + Figures.percent(100 * share(most, key)) + " of throughput in "
                        + most.when().label() + "."));
    }
}
