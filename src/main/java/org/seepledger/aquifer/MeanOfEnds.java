package org.seepledger.aquifer;

import java.util.List;
import java.util.stream.Stream;

/**
 * Snapshots at instants, read as intervals: the mean of an interval's two ends.
 *
 * @param snapshots values at instants
 */
record MeanOfEnds(GriddedValues snapshots) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        double[] end = new double[window.size()];
        snapshots.read(layer, step, window, target, offset);
        snapshots.read(layer, step + 1, window, end, 0);
        for (int i = 0; i < end.length; i++) {
            target[offset + i] = 0.5 * (target[offset + i] + end[i]);
        }
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        return Stream.of(step, step + 1)
                .flatMap(instant -> snapshots.stored(layer, instant, window).stream())
                .map(part -> part.times(0.5))
                .toList();
    }

    @Override
    public boolean changes() {
        return true;
    }

    @Override
    public boolean layered() {
        return snapshots.layered();
    }
}
