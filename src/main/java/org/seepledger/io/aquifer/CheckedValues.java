package org.seepledger.io.aquifer;

import java.util.List;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/**
 * Values that must lie within bounds, turned into another unit. What lies outside is an error where it is read.
 *
 * @param values the values
 * @param place where {@code aquifer.json} binds them
 * @param bounds what they may be
 * @param factor by what they are multiplied once checked
 */
record CheckedValues(GriddedValues values, String place, Bounds bounds, double factor) implements GriddedValues {

    /**
     * What a value may be.
     *
     * @param low the least, or what it must exceed
     * @param open whether it must exceed it
     * @param high the greatest
     * @param words the same in words
     */
    record Bounds(double low, boolean open, double high, String words) {

        static final Bounds NOT_NEGATIVE = new Bounds(0, false, Double.POSITIVE_INFINITY, "0 or more");
        static final Bounds POSITIVE = new Bounds(0, true, Double.POSITIVE_INFINITY, "more than 0");
        static final Bounds SHARE = new Bounds(0, true, 1, "more than 0 and at most 1");
        static final Bounds PART = new Bounds(0, false, 1, "from 0 to 1");

        boolean hold(double value) {
            return Double.isNaN(value) || (open ? value > low : value >= low) && value <= high;
        }
    }

    /** Checks a plain number at once. */
    static CheckedValues of(GriddedValues values, String place, Bounds bounds, double factor) {
        CheckedValues checked = new CheckedValues(values, place, bounds, factor);
        if (values instanceof BoundNumber) {
            double[] value = new double[1];
            values.read(0, 0, new Window(0, 0, 1, 1), value, 0);
            if (!bounds.hold(value[0])) {
                throw checked.fault("", value[0]);
            }
        }
        return checked;
    }

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        values.read(layer, step, window, target, offset);
        for (int i = 0; i < window.size(); i++) {
            double value = target[offset + i];
            if (!bounds.hold(value)) {
                throw fault(
                        ", layer " + (layer + 1) + ", row " + (window.row() + i / window.columns() + 1) + ", column "
                                + (window.column() + i % window.columns() + 1),
                        value);
            }
            target[offset + i] = value * factor;
        }
    }

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        return values.stored(layer, step, window).stream()
                .map(part -> part.times(factor))
                .toList();
    }

    private DataFault fault(String cell, double value) {
        return new DataFault(
                AquiferReader.FILE,
                place + cell,
                String.valueOf(value),
                "a value " + bounds.words,
                "Correct the value or its unit, or leave it out where it is not known.");
    }

    @Override
    public boolean changes() {
        return values.changes();
    }

    @Override
    public boolean layered() {
        return values.layered();
    }
}
