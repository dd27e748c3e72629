package org.seepledger.review.check;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.seepledger.ledger.Entry;
import org.seepledger.review.check.Selection.Way;
import org.seepledger.review.mapping.Sense;

/** Finds, in a term that stands for several items, the one that was counted the wrong way. */
final class TurnedItem {

    private static final double NEAR = 0.01;

    private TurnedItem() {}

    /**
     * The item.
     *
     * @param series a term: in, out, net or several of them, each of them off
     * @param tolerance share of throughput within which figures agree
     */
    static Optional<String> of(List<Series> series, double tolerance) {
        Series first = series.get(0);
        Set<String> keys = first.points().stream()
                .flatMap(point -> point.basis().entries().stream())
                .map(Entry::account)
                .filter(first.selection()::takes)
                .map(Selection::key)
                .collect(Collectors.toSet());
        if (keys.size() < 2) {
            return Optional.empty();
        }
        return keys.stream()
                .filter(key -> series.stream().allMatch(one -> explains(one, key, tolerance)))
                .findFirst()
                .map(key -> key.replaceFirst("^[a-z]+/", ""));
    }

    /** In and out are off by the item's net flow, net by twice that. */
    private static boolean explains(Series series, String key, double tolerance) {
        Selection item = new Selection(Set.of(key), Set.of(), series.selection().layer());
        boolean oneWay = series.sense() == Sense.IN || series.sense() == Sense.OUT;
        Sense sense = oneWay ? Sense.NET : series.sense();
        double times = series.sense() == Sense.OUT ? 1 : oneWay ? -1 : -2;
        return series.points().stream().allMatch(point -> {
            double made = times
                    * item.of(point.basis(), Way.NET, sense)
                    * point.source().cubicMetres();
            double allowed = Math.max(point.half(), tolerance * point.throughput()) + NEAR * Math.abs(made);
            return Math.abs(made) > tolerance * point.throughput() && Math.abs(point.off() - made) <= allowed;
        });
    }
}
