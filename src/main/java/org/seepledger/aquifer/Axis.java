package org.seepledger.aquifer;

import java.util.Arrays;

/**
 * The edges of the columns or rows along one axis, kept as distances from the first edge so that a large coordinate
 * costs no digits.
 */
public final class Axis {

    /** How near an edge, in cells, a place is taken to lie on it. */
    static final double SNAP = 1e-9;

    private final double origin;
    private final double[] edges;
    private final boolean even;

    private Axis(double origin, double[] edges, boolean even) {
        this.origin = origin;
        this.edges = edges;
        this.even = even;
    }

    /**
     * {@return an axis of equal steps}
     *
     * @param from the first edge, in plan coordinates
     * @param step the step, in plan units
     * @param count the number of cells
     * @throws IllegalArgumentException unless the step is positive and finite and the count at least 1
     */
    public static Axis even(double from, double step, int count) {
        if (!(step > 0) || !Double.isFinite(step) || !Double.isFinite(from) || count < 1) {
            throw new IllegalArgumentException("steps must be positive and there must be at least one");
        }
        double[] edges = new double[count + 1];
        for (int i = 0; i <= count; i++) {
            edges[i] = i * step;
        }
        return new Axis(from, edges, true);
    }

    /**
     * {@return an axis of given edges}
     *
     * @param edges at least two strictly increasing plan coordinates
     * @throws IllegalArgumentException unless they are
     */
    public static Axis of(double... edges) {
        if (edges.length < 2) {
            throw new IllegalArgumentException("at least two edges are needed");
        }
        double[] distances = new double[edges.length];
        boolean even = true;
        for (int i = 1; i < edges.length; i++) {
            if (!(edges[i] > edges[i - 1]) || !Double.isFinite(edges[i]) || !Double.isFinite(edges[0])) {
                throw new IllegalArgumentException(
                        "edges must increase strictly; edge " + (i + 1) + " is " + edges[i] + " after " + edges[i - 1]);
            }
            distances[i] = edges[i] - edges[0];
            double step = edges[i] - edges[i - 1];
            even &= Math.abs(step - distances[1]) <= 1e-9 * distances[1];
        }
        return new Axis(edges[0], distances, even);
    }

    /**
     * {@return the plan coordinate of the first edge}
     */
    public double origin() {
        return origin;
    }

    /**
     * {@return the number of cells}
     */
    public int count() {
        return edges.length - 1;
    }

    /**
     * {@return whether all cells have the same size, to a billionth}
     */
    public boolean isEven() {
        return even;
    }

    /**
     * {@return the distance of an edge from the first one, in plan units}
     *
     * @param index the edge, from 0 to {@link #count()}
     */
    public double edge(int index) {
        return edges[index];
    }

    /**
     * {@return the size of a cell in plan units}
     *
     * @param index the cell, from 0
     */
    public double size(int index) {
        return edges[index + 1] - edges[index];
    }

    /**
     * {@return the size of the smallest cell, in plan units}
     */
    public double smallest() {
        double smallest = size(0);
        for (int cell = 1; cell < count(); cell++) {
            smallest = Math.min(smallest, size(cell));
        }
        return smallest;
    }

    /**
     * {@return the cell that holds a distance from the first edge: the last one whose first edge is not beyond it, or
     * -1 or {@link #count()} outside}
     *
     * @param distance in plan units
     */
    public int cellAt(double distance) {
        int found = Arrays.binarySearch(edges, distance);
        int cell = found >= 0 ? found : -found - 2;
        return cell == count() && distance == edges[count()] ? count() - 1 : cell;
    }

    /**
     * {@return the cell that a distance from the origin lies in; beyond the axis, the first or last}
     *
     * @param distance from the origin, in plan units
     */
    public int nearest(double distance) {
        return Math.max(0, Math.min(count() - 1, cellAt(distance)));
    }

    /**
     * {@return a place, put on an edge where it lies near one or beyond the axis}
     *
     * @param distance from the first edge, in plan units; beyond the axis by no more than rounding
     * @param near how near, in cells
     */
    double snapped(double distance, double near) {
        if (distance < 0 || distance > edges[count()]) {
            return distance < 0 ? 0 : edges[count()];
        }
        int cell = nearest(distance);
        for (int line = cell; line <= cell + 1; line++) {
            if (Math.abs(distance - edges[line]) <= near * size(cell)) {
                return edges[line];
            }
        }
        return distance;
    }

    /**
     * {@return whether a place lies on the axis, its ends included}
     *
     * @param distance from the first edge, in plan units
     * @param near how far beyond an end it may lie, in cells
     */
    boolean holds(double distance, double near) {
        return distance >= -near * size(0) && distance <= edges[count()] + near * size(count() - 1);
    }
}
