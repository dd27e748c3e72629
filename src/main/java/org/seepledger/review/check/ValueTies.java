package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.Tie;

/** Ties terms that words do not tell by their numbers: to the only item of ours that they agree with in all periods. */
public final class ValueTies {

    private static final double TELLING = 0.02;
    private static final double SAME = 0.01;

    private ValueTies() {}

    /**
     * {@return ties of terms that were tied to nothing, by label}
     *
     * @param figures the figures of a submission
     * @param areas which prisms its areas are, by label
     * @param reference what it is held against
     */
    public static Map<String, Tie> of(List<Figure> figures, Map<String, String> areas, Reference reference) {
        Map<String, Tie> ties = new LinkedHashMap<>();
        Map<String, List<Figure>> untied = new LinkedHashMap<>();
        for (Figure figure : figures) {
            if (figure.tie().kind() == Kind.UNTIED) {
                untied.computeIfAbsent(figure.term(), any -> new ArrayList<>()).add(figure);
            }
        }
        untied.forEach((label, list) -> tie(figures, list, areas, reference).ifPresent(tie -> ties.put(label, tie)));
        return ties;
    }

    private static Optional<Tie> tie(
            List<Figure> all, List<Figure> own, Map<String, String> areas, Reference reference) {
        List<Tie> found = new ArrayList<>();
        for (Catalogue.Known known : reference.catalogue().items()) {
            boolean taken = all.stream().anyMatch(figure -> figure.tie().items().contains(known.key()));
            boolean open = own.stream().allMatch(figure -> figure.sense() == Sense.NET);
            for (Sense sense :
                    open ? List.of(Sense.NET, Sense.LOSS) : List.of(own.get(0).sense())) {
                Tie tie = new Tie(Kind.ITEM, List.of(known.key()), open ? Optional.of(sense) : Optional.empty());
                List<Figure> tied = own.stream()
                        .map(figure -> open ? figure.tied(tie).counting(sense) : figure.tied(tie))
                        .toList();
                if (!taken && agree(tied, areas, reference)) {
                    found.add(tie);
                }
            }
        }
        return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
    }

    private static boolean agree(List<Figure> figures, Map<String, String> areas, Reference reference) {
        List<Series> series = Pairing.of(figures, areas, reference, Rounding.of(figures), SAME);
        return !series.isEmpty() && series.stream().allMatch(ValueTies::agrees);
    }

    private static boolean agrees(Series series) {
        return series.points().stream().allMatch(point -> {
            double size = Math.abs(point.recomputed());
            return size > TELLING * point.throughput() && Math.abs(point.off()) <= point.half() + SAME * size;
        });
    }
}
