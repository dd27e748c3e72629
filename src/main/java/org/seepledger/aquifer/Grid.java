package org.seepledger.aquifer;

/**
 * The grid in plan: columns along x, rows along y, turned counter-clockwise about the corner (first x edge, first y
 * edge).
 *
 * <p><i>Map</i> coordinates are those of the CRS, in its plan unit. <i>Local</i> coordinates have their origin at the
 * corner and their axes along the grid, in plan units too; the engine works in them. Cell sizes and areas are given in
 * the set's length unit.
 *
 * @param x the column edges
 * @param y the row edges, from south to north
 * @param rotation degrees counter-clockwise
 * @param planUnit how many length units a plan unit has
 * @param near how near two places count as one, in cells: a billionth, or the rounding of map coordinates where that is
 *     more
 */
public record Grid(Axis x, Axis y, double rotation, double planUnit, double near) {

    /** By how many steps of the number format turning a map coordinate may be off. */
    private static final int ROUNDING = 4;

    /**
     * Makes a grid.
     *
     * @param x the column edges
     * @param y the row edges, from south to north
     * @param rotation degrees counter-clockwise
     * @param planUnit how many length units a plan unit has
     */
    public Grid(Axis x, Axis y, double rotation, double planUnit) {
        this(x, y, rotation, planUnit, nearness(x, y));
    }

    /**
     * {@return the number of columns}
     */
    public int columns() {
        return x.count();
    }

    /**
     * {@return the number of rows}
     */
    public int rows() {
        return y.count();
    }

    /**
     * {@return the place of a row on the y axis, which runs from south to north while rows run from north to south;
     * the inverse too}
     *
     * @param row the row, from 0, or the y-axis cell
     */
    public int flipped(int row) {
        return rows() - 1 - row;
    }

    /**
     * {@return the size of a column's cells along x, in length units}
     *
     * @param column the column, from 0
     */
    public double width(int column) {
        return x.size(column) * planUnit;
    }

    /**
     * {@return the size of a row's cells along y, in length units}
     *
     * @param row the row, from 0 in the north
     */
    public double height(int row) {
        return y.size(flipped(row)) * planUnit;
    }

    /**
     * {@return a cell's plan area, in length units squared}
     *
     * @param row the row, from 0 in the north
     * @param column the column, from 0
     */
    public double area(int row, int column) {
        return width(column) * height(row);
    }

    /**
     * {@return the local x of a place, in plan units}
     *
     * @param mapX its map x
     * @param mapY its map y
     */
    public double localX(double mapX, double mapY) {
        return (mapX - x.origin()) * cosine() + (mapY - y.origin()) * sine();
    }

    /**
     * {@return the local y of a place, in plan units}
     *
     * @param mapX its map x
     * @param mapY its map y
     */
    public double localY(double mapX, double mapY) {
        return (mapY - y.origin()) * cosine() - (mapX - x.origin()) * sine();
    }

    /**
     * {@return the map x of a place}
     *
     * @param localX its local x, in plan units
     * @param localY its local y, in plan units
     */
    public double mapX(double localX, double localY) {
        return x.origin() + localX * cosine() - localY * sine();
    }

    /**
     * {@return the map y of a place}
     *
     * @param localX its local x, in plan units
     * @param localY its local y, in plan units
     */
    public double mapY(double localX, double localY) {
        return y.origin() + localX * sine() + localY * cosine();
    }

    /**
     * {@return whether a place lies on the grid, its edges included, to a billionth of a cell and the rounding of map
     * coordinates}
     *
     * @param mapX its map x
     * @param mapY its map y
     */
    public boolean holds(double mapX, double mapY) {
        return x.holds(localX(mapX, mapY), near) && y.holds(localY(mapX, mapY), near);
    }

    /**
     * {@return the local x of a place, put on a grid line where it lies near one}
     *
     * @param mapX its map x
     * @param mapY its map y
     */
    public double snappedX(double mapX, double mapY) {
        return x.snapped(localX(mapX, mapY), near);
    }

    /**
     * {@return the local y of a place, put on a grid line where it lies near one}
     *
     * @param mapX its map x
     * @param mapY its map y
     */
    public double snappedY(double mapX, double mapY) {
        return y.snapped(localY(mapX, mapY), near);
    }

    private static double nearness(Axis x, Axis y) {
        double size = Math.min(x.smallest(), y.smallest());
        double reach = x.edge(x.count()) + y.edge(y.count());
        double farthest = Math.max(Math.abs(x.origin()), Math.abs(y.origin())) + reach;
        return Math.max(Axis.SNAP, ROUNDING * Math.ulp(farthest) / size);
    }

    /**
     * {@return the cosine of the rotation, exact at quarter turns}
     */
    public double cosine() {
        return quarterTurns(90);
    }

    /**
     * {@return the sine of the rotation, exact at quarter turns}
     */
    public double sine() {
        return quarterTurns(0);
    }

    /** The sine of (rotation + phase), with multiples of 90 degrees exact. */
    private double quarterTurns(double phase) {
        double angle = (rotation % 360 + 360 + phase) % 360;
        if (angle % 90 == 0) {
            return new double[] {0, 1, 0, -1}[(int) (angle / 90)];
        }
        return Math.sin(Math.toRadians(angle));
    }

    /**
     * {@return a block of the whole grid}
     */
    public Window window() {
        return new Window(0, 0, rows(), columns());
    }
}
