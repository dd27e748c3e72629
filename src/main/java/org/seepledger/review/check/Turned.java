package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.seepledger.review.mapping.Sense;

/** Terms whose in and out are exchanged, as a whole or in one of the items that they stand for. */
final class Turned {

    private final Set<Series> left;
    private final double tolerance;
    private final Slips slips;
    private final List<Finding> findings = new ArrayList<>();
    private final Set<Series> explained = new LinkedHashSet<>();

    private Turned(Set<Series> left, double tolerance, Slips slips) {
        this.left = left;
        this.tolerance = tolerance;
        this.slips = slips;
    }

    /**
     * Terms that are exchanged as a whole.
     *
     * @param left the terms that differ
     * @param tolerance share of throughput within which figures agree
     * @param slips makes findings
     */
    static Turned wholly(Set<Series> left, double tolerance, Slips slips) {
        Turned turned = new Turned(left, tolerance, slips);
        left.stream().filter(one -> one.sense() == Sense.IN).forEach(turned::whole);
        return turned;
    }

    /**
     * Terms one item of which is exchanged.
     *
     * @param left the terms that differ
     * @param tolerance share of throughput within which figures agree
     * @param slips makes findings
     */
    static Turned partly(Set<Series> left, double tolerance, Slips slips) {
        Turned turned = new Turned(left, tolerance, slips);
        left.stream().filter(one -> !one.storage()).forEach(turned::part);
        return turned;
    }

    List<Finding> findings() {
        return findings;
    }

    Set<Series> explained() {
        return explained;
    }

    /** In and out that have each other's numbers. */
    private void whole(Series in) {
        Optional<Series> out = left.stream()
                .filter(one -> one.sense() == Sense.OUT && one.selection().equals(in.selection()))
                .filter(one -> one.points().size() == in.points().size())
                .filter(one -> in.hasThatOf(one) && one.hasThatOf(in))
                .findFirst();
        out.ifPresent(found -> {
            Code code = in.storage() ? Code.STORAGE_TURNED : Code.SIGN;
            String words = in.storage() ? ": release and uptake are exchanged." : ": inflow and outflow are exchanged.";
            findings.add(slips.finding(Severity.FAULT, code, in, in.quoted() + words));
            explained.addAll(Set.of(in, found));
        });
    }

    /** One of several items that counts the wrong way. */
    private void part(Series one) {
        if (explained.contains(one)) {
            return;
        }
        List<Series> same = left.stream()
                .filter(other -> other.selection().equals(one.selection()))
                .toList();
        TurnedItem.of(same, tolerance).ifPresent(item -> {
            String words = " would agree if \"" + item + "\", which is part of it, counted the other way.";
            findings.add(slips.finding(Severity.FAULT, Code.SIGN, one, one.quoted() + words));
            explained.addAll(same);
        });
    }
}
