package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The head that drives flow in an interval: that at its end, or the mean of both ends. Where a cell is dry it is the
 * elevation of the cell's bottom.
 *
 * @param head heads at instants
 * @param layers the layers from the top down
 * @param mean whether it is the mean of both ends
 */
record DrivingHead(GriddedValues head, List<Layer> layers, boolean mean) implements GriddedValues {

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        Arrays.fill(target, offset, offset + window.size(), 0);
        for (Stored part : stored(layer, step, window)) {
            for (int i = 0; i < window.size(); i++) {
                double value = part.values()[i];
                target[offset + i] += Double.isNaN(value) ? 0 : value * part.factor();
            }
        }
    }

    @Override
    public boolean changes() {
        return head.changes();
    }

    @Override
    public boolean layered() {
        return true;
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        if (!head.changes()) {
            return at(layer, 0, window);
        }
        if (!mean) {
            return at(layer, step + 1, window);
        }
        List<Stored> both = new ArrayList<>(at(layer, step, window));
        both.addAll(at(layer, step + 1, window));
        return both.stream().map(part -> part.times(0.5)).toList();
    }

    /** Where a cell is dry its stored value counts with factor 0, and its bottom in its place. */
    private List<Stored> at(int layer, int instant, Window window) {
        double[] heads = new double[window.size()];
        head.read(layer, instant, window, heads, 0);
        boolean[] dry = new boolean[heads.length];
        boolean any = false;
        for (int i = 0; i < heads.length; i++) {
            dry[i] = heads[i] == Double.NEGATIVE_INFINITY;
            any |= dry[i];
        }
        List<Stored> given = head.stored(layer, instant, window);
        if (!any) {
            return given;
        }
        List<Stored> parts = new ArrayList<>();
        given.forEach(part -> parts.add(part.where(dry, false)));
        given.stream().limit(1).forEach(part -> parts.add(part.where(dry, true).times(0)));
        layers.get(layer).bottom().stored(layer, 0, window).forEach(part -> parts.add(part.where(dry, true)));
        return parts;
    }
}
