package org.seepledger.balance;

import java.util.BitSet;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;

/**
 * The weights of stored numbers while they are being collected.
 *
 * <p>A plane of cells is given out once an interval no longer rests on it, so that memory does not grow with the number
 * of intervals; numbers that belong to no cell are given out at the end.
 */
public final class PartWeights {

    private record Key(String file, String place) {}

    private record NumberKey(String file, String place, double value) {}

    private static final class Plane {
        private final String file;
        private final String place;
        private final double[] weights;
        private final double[] values;
        private final BitSet touched = new BitSet();
        private boolean current;

        private Plane(Stored part) {
            this.file = part.file();
            this.place = part.place();
            this.weights = new double[part.values().length];
            this.values = new double[weights.length];
        }

        private void add(Stored part, double[] more) {
            current = true;
            for (int i = 0; i < more.length; i++) {
                if (more[i] != 0 && !Double.isNaN(part.values()[i])) {
                    values[i] = part.values()[i];
                    weights[i] += more[i] * part.factor();
                    touched.set(i);
                }
            }
        }
    }

    private final Trace.Lines lines;
    private final Map<Key, Plane> planes = new LinkedHashMap<>();
    private final Map<NumberKey, Double> numbers = new LinkedHashMap<>();
    private final Sums sums = new Sums(2);
    private long count;

    /**
     * Begins with none.
     *
     * @param lines takes what is given out
     */
    public PartWeights(Trace.Lines lines) {
        this.lines = lines;
    }

    /**
     * Adds the weights of a quantity's values in a block to those of the parts that it is made of.
     *
     * @param parts what the values are the sum of
     * @param weights by cell of the block's window, row-major
     */
    public void add(List<Stored> parts, double[] weights) {
        for (Stored part : parts) {
            if (part.everywhere()) {
                addNumber(part, weights);
                continue;
            }
            Plane plane = planes.computeIfAbsent(new Key(part.file(), part.place()), key -> new Plane(part));
            plane.add(part, weights);
        }
    }

    private void addNumber(Stored part, double[] weights) {
        double sum = 0;
        double value = Double.NaN;
        for (int i = 0; i < weights.length; i++) {
            if (!Double.isNaN(part.values()[i])) {
                sum += weights[i];
                value = part.values()[i];
            }
        }
        if (sum != 0) {
            numbers.merge(new NumberKey(part.file(), part.place(), value), sum * part.factor(), Double::sum);
        }
    }

    /**
     * Gives out what the interval just done does not rest on.
     *
     * @param window the block's window
     */
    public void giveOutPast(Window window) {
        for (Iterator<Plane> all = planes.values().iterator(); all.hasNext(); ) {
            Plane plane = all.next();
            if (!plane.current) {
                giveOut(plane, window);
                all.remove();
            }
            plane.current = false;
        }
    }

    /**
     * Gives out all planes of a block.
     *
     * @param window the block's window
     */
    public void giveOutPlanes(Window window) {
        planes.values().forEach(plane -> giveOut(plane, window));
        planes.clear();
    }

    private void giveOut(Plane plane, Window window) {
        for (int i = plane.touched.nextSetBit(0); i >= 0; i = plane.touched.nextSetBit(i + 1)) {
            int row = window.row() + i / window.columns() + 1;
            int column = window.column() + i % window.columns() + 1;
            String place = plane.place + ", row " + row + ", col " + column;
            line(plane.file, place, plane.values[i], plane.weights[i]);
        }
    }

    /** Gives out the numbers that belong to no cell. */
    public void giveOutNumbers() {
        numbers.forEach((key, weight) -> line(key.file(), key.place(), key.value(), weight));
    }

    private void line(String file, String place, double value, double weight) {
        lines.line(file, place, value, weight);
        sums.add(0, value * weight);
        sums.add(1, Math.abs(value * weight));
        count++;
    }

    /** {@return what all that was given out comes to} */
    public Trace.Sum sum() {
        return new Trace.Sum(sums.get(0), sums.get(1), count);
    }
}
