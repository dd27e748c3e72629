package org.seepledger.review.check;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.seepledger.review.check.Recomputed.WellVolume;
import org.seepledger.review.mapping.Sense;

/**
 * Wells that an author may have counted where the recomputed budget does not, or left out where it does.
 *
 * @param choices the wells
 */
record WellSet(List<Choice> choices) {

    private static final double NEAR = 0.01;

    /**
     * A well.
     *
     * @param well its place among the wells
     * @param more whether the author counted it once more than the recomputed budget, rather than once less
     */
    record Choice(int well, boolean more) {}

    /** All sets of one well, then of two. */
    static Stream<WellSet> upToTwo(int wells) {
        List<Choice> each = IntStream.range(0, wells)
                .boxed()
                .flatMap(well -> Stream.of(new Choice(well, true), new Choice(well, false)))
                .toList();
        Stream<WellSet> pairs = each.stream()
                .flatMap(one -> each.stream()
                        .filter(other -> other.well() > one.well())
                        .map(other -> new WellSet(List.of(one, other))));
        return Stream.concat(each.stream().map(one -> new WellSet(List.of(one))), pairs);
    }

    /** Whether a series is off by them in each period. */
    boolean explains(Series series) {
        boolean any = false;
        for (Point point : series.points()) {
            double made = 0;
            for (Choice choice : choices) {
                WellVolume well = point.source().wells().get(choice.well());
                if (!series.selection().items().contains("source/" + well.category())) {
                    return false;
                }
                boolean out = series.sense() == Sense.OUT || series.sense() == Sense.LOSS;
                made += (choice.more() == out ? -1 : 1) * well.volume();
            }
            double allowed = point.half() + NEAR * Math.abs(made) + 0.1 * series.tolerance() * point.throughput();
            if (Math.abs(point.off() - made) > allowed) {
                return false;
            }
            any |= Math.abs(made) > series.tolerance() * point.throughput();
        }
        return any;
    }

    String words(Series series) {
        return choices.stream()
                .map(choice -> {
                    WellVolume well = series.points().get(0).source().wells().get(choice.well());
                    String where = well.inside() ? "inside the outline" : "outside the outline";
                    return (choice.more() ? "seems to count" : "seems to leave out") + " well \"" + well.name()
                            + "\", which lies " + where
                            + (choice.more() && well.inside()
                                    ? ", and which the recomputed budget does not count here"
                                    : "");
                })
                .collect(Collectors.joining(", and "));
    }
}
