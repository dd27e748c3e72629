package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;

/**
 * Heads at the two ends of an interval, and what follows from them: which cells can be active and how thick their water
 * is.
 *
 * <p>A cell is inactive where a surface, or the head at either end of the interval, has no value, or where it has no
 * thickness. The saturated thickness is that at the interval's end in a water-table layer with heads, else the whole. A
 * head of negative infinity stands for a dry cell: its head is at the cell's bottom.
 */
public final class Saturation {

    private final CellGeometry geometry;
    private final List<Layer> layers;
    private final Optional<double[]> start;
    private final Optional<double[]> end;

    private Saturation(CellGeometry geometry, List<Layer> layers, Optional<double[]> start, Optional<double[]> end) {
        this.geometry = geometry;
        this.layers = layers;
        this.start = start;
        this.end = end;
    }

    static Saturation of(CellGeometry geometry, List<Layer> layers, Optional<GriddedValues> head, int interval) {
        Optional<double[]> start = head.map(values -> read(geometry, values, values.changes() ? interval : 0));
        Optional<double[]> end = head.filter(GriddedValues::changes)
                .map(values -> read(geometry, values, interval + 1))
                .or(() -> start);
        return new Saturation(geometry, layers, start, end);
    }

    private static double[] read(CellGeometry geometry, GriddedValues head, int instant) {
        double[] heads = geometry.block().read(head, instant);
        for (int cell = 0; cell < heads.length; cell++) {
            heads[cell] = heads[cell] == Double.NEGATIVE_INFINITY ? geometry.bottom(cell) : heads[cell];
        }
        return heads;
    }

    /** Whether each cell can be active as far as surfaces and heads tell. */
    boolean[] active() {
        boolean[] active = new boolean[geometry.block().size()];
        for (int cell = 0; cell < active.length; cell++) {
            active[cell] = geometry.isPresent(cell)
                    && (start.isEmpty() || !Double.isNaN(start(cell)) && !Double.isNaN(end(cell)));
        }
        return active;
    }

    /** Whether the water table can lie in a cell. */
    boolean isWaterTable(int cell) {
        return layers.get(cell / geometry.block().window().size()).waterTable();
    }

    /** The head at the interval's begin; only where heads are known. */
    double start(int cell) {
        return start.orElseThrow()[cell];
    }

    /** The head at the interval's end; only where heads are known. */
    double end(int cell) {
        return end.orElseThrow()[cell];
    }

    /**
     * {@return a cell's saturated thickness at the interval's end, in length units}
     *
     * @param cell its place in the block
     */
    public double thickness(int cell) {
        return end.isPresent() && isWaterTable(cell)
                ? within(end(cell), geometry.bottom(cell), geometry.top(cell)) - geometry.bottom(cell)
                : geometry.thickness(cell);
    }

    /**
     * {@return a cell's saturated thickness at the interval's begin, in length units}
     *
     * @param cell its place in the block
     */
    public double thicknessBefore(int cell) {
        return start.isPresent() && isWaterTable(cell)
                ? within(start(cell), geometry.bottom(cell), geometry.top(cell)) - geometry.bottom(cell)
                : geometry.thickness(cell);
    }

    /**
     * {@return which part of the cell's release from specific yield comes from below an elevation, from 0 to 1}
     *
     * @param cell its place in the block
     * @param elevation in length units
     */
    public double partReleasedBelow(int cell, double elevation) {
        if (start.isEmpty()) {
            return 1;
        }
        double bottom = geometry.bottom(cell);
        double top = geometry.top(cell);
        double whole = within(start(cell), bottom, top) - within(end(cell), bottom, top);
        double limit = within(elevation, bottom, top);
        double below = within(start(cell), bottom, limit) - within(end(cell), bottom, limit);
        return whole == 0 ? 1 : below / whole;
    }

    private static double within(double value, double low, double high) {
        return Math.min(Math.max(value, low), high);
    }
}
