package org.seepledger.io.raster;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/**
 * Where a raster lies: from cell edges, counted from the corner where row 0 and column 0 begin, to map coordinates in the
 * CRS's plan unit.
 *
 * <p>{@code mapX = x + column × columnX + row × rowX}, and {@code mapY} likewise. Row 0 is the northernmost: going from the
 * direction of columns to that of rows is a turn to the right.
 *
 * @param x map x of the corner
 * @param y map y of the corner
 * @param columnX change of map x from one column to the next
 * @param columnY change of map y from one column to the next
 * @param rowX change of map x from one row to the next
 * @param rowY change of map y from one row to the next
 * @param crs the coordinate system as {@code EPSG:n} or WKT, where the file tells it outright
 */
public record Georeference(
        double x, double y, double columnX, double columnY, double rowX, double rowY, Optional<String> crs) {

    /** How far, in cells, a raster may lie from where it should. */
    static final double TOLERANCE = 0.01;

    private static final MathContext SHOWN_DIGITS = new MathContext(12);

    /**
     * {@return where an evenly spaced grid lies}
     *
     * @param grid the grid
     * @param crs its coordinate system
     */
    static Georeference of(Grid grid, Optional<String> crs) {
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        double stepX = width / grid.columns();
        double stepY = height / grid.rows();
        return new Georeference(
                grid.mapX(0, height),
                grid.mapY(0, height),
                stepX * grid.cosine(),
                stepX * grid.sine(),
                stepY * grid.sine(),
                -stepY * grid.cosine(),
                crs);
    }

    /**
     * {@return the map x of a place}
     *
     * @param column in columns from the first edge
     * @param row in rows from the first edge
     */
    public double mapX(double column, double row) {
        return x + column * columnX + row * rowX;
    }

    /**
     * {@return the map y of a place}
     *
     * @param column in columns from the first edge
     * @param row in rows from the first edge
     */
    public double mapY(double column, double row) {
        return y + column * columnY + row * rowY;
    }

    /**
     * {@return how far columns are turned from map x, in degrees counter-clockwise}
     */
    public double rotation() {
        return Math.toDegrees(Math.atan2(columnY, columnX));
    }

    /**
     * {@return the evenly spaced grid of a raster that lies here}
     *
     * @param rows its rows
     * @param columns its columns
     * @param planUnit how many length units a plan unit has
     * @throws IllegalArgumentException if columns and rows are not at right angles, to a hundredth of a cell
     */
    public Grid grid(int rows, int columns, double planUnit) {
        double stepX = Math.hypot(columnX, columnY);
        double stepY = Math.hypot(rowX, rowY);
        double shear = Math.abs(columnX * rowX + columnY * rowY) / (stepX * stepY);
        if (!(shear * Math.max(rows * stepY / stepX, columns * stepX / stepY) <= TOLERANCE)) {
            throw new IllegalArgumentException("rows that are not at right angles to columns");
        }
        return new Grid(
                Axis.even(mapX(0, rows), stepX, columns),
                Axis.even(mapY(0, rows), stepY, rows),
                columnY == 0 && columnX > 0 ? 0 : rotation(),
                planUnit);
    }

    /** The same raster with its last row first. */
    Georeference flipped(int rows) {
        return new Georeference(mapX(0, rows), mapY(0, rows), columnX, columnY, -rowX, -rowY, crs);
    }

    /** As in messages: corner, step and turn. */
    String shown(int rows) {
        String turn = columnY == 0 && rowX == 0 && columnX > 0 ? "" : ", turned by " + plain(rotation()) + "°";
        return "corner (" + plain(mapX(0, rows)) + ", " + plain(mapY(0, rows)) + "), step "
                + plain(Math.hypot(columnX, columnY)) + " × " + plain(Math.hypot(rowX, rowY)) + turn;
    }

    private static String plain(double value) {
        return BigDecimal.valueOf(value)
                .round(SHOWN_DIGITS)
                .stripTrailingZeros()
                .toPlainString();
    }
}
