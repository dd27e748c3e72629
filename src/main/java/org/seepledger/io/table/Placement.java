package org.seepledger.io.table;

import java.util.OptionalInt;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Which cell in plan a line is for. */
interface Placement {

    /** {@return how many places there are} */
    long count();

    /**
     * {@return the place of the current line; row-major, row 0 northernmost}
     *
     * @param line the table
     * @throws org.seepledger.fault.DataFault if it is not on the grid
     */
    long index(TableReader line);

    /**
     * {@return a place in words, for messages}
     *
     * @param index the place
     */
    String describe(long index);

    /**
     * {@return the placement that a header asks for}
     *
     * @param header the header
     * @param frame the grid
     * @throws org.seepledger.fault.DataFault if half of a pair is missing, or both pairs are there
     */
    static Placement of(Header header, Frame frame) {
        OptionalInt x = paired(header, "x", "y");
        OptionalInt row = paired(header, "row", "col");
        if (x.isPresent() && row.isPresent()) {
            throw header.fault("both x, y and row, col", "one of the pairs", "Take one of them out.");
        }
        if (x.isPresent()) {
            return new AtCentre(frame, x.getAsInt(), header.required("y"));
        }
        return row.isPresent()
                ? new InRowAndColumn(frame.grid(), row.getAsInt(), header.required("col"))
                : new WholeGrid();
    }

    private static String describe(Grid grid, long index) {
        return "row " + (index / grid.columns() + 1) + ", column " + (index % grid.columns() + 1);
    }

    private static OptionalInt paired(Header header, String first, String second) {
        OptionalInt column = header.known(first);
        if (column.isPresent() != header.known(second).isPresent()) {
            String there = column.isPresent() ? first : second;
            String missing = column.isPresent() ? second : first;
            throw header.fault(
                    "a column \"" + there + "\" and none \"" + missing + "\"",
                    "both or neither",
                    "Add the column, or rename this one where it is not a place.");
        }
        return column;
    }

    /** Every line holds for all cells. */
    record WholeGrid() implements Placement {

        @Override
        public long count() {
            return 1;
        }

        @Override
        public long index(TableReader line) {
            return 0;
        }

        @Override
        public String describe(long index) {
            return "the whole grid";
        }
    }

    /** By row and column numbers. */
    final class InRowAndColumn implements Placement {

        private final Grid grid;
        private final Ordinal row;
        private final Ordinal column;

        InRowAndColumn(Grid grid, int row, int column) {
            this.grid = grid;
            this.row = new Ordinal(row, 1, grid.rows(), "Rows count from 1, the northernmost.");
            this.column = new Ordinal(column, 1, grid.columns(), "Columns count from 1, at the grid's first x edge.");
        }

        @Override
        public long count() {
            return (long) grid.rows() * grid.columns();
        }

        @Override
        public long index(TableReader line) {
            return (long) row.index(line) * grid.columns() + column.index(line);
        }

        @Override
        public String describe(long index) {
            return Placement.describe(grid, index);
        }
    }

    /** By the map coordinates of the cell's centre. */
    record AtCentre(Frame frame, int xColumn, int yColumn) implements Placement {

        /** The part of a cell's size that a centre may be off, as for the georeference of a raster. */
        private static final double TOLERANCE = 0.01;

        private static final String REMEDY = "Give the map coordinates of cell centres, or row and col instead.";

        @Override
        public long count() {
            return (long) frame.grid().rows() * frame.grid().columns();
        }

        @Override
        public long index(TableReader line) {
            Grid grid = frame.grid();
            double mapX = line.required(xColumn, REMEDY);
            double mapY = line.required(yColumn, REMEDY);
            double localX = grid.localX(mapX, mapY);
            double localY = grid.localY(mapX, mapY);
            int column = grid.x().cellAt(localX);
            int fromSouth = grid.y().cellAt(localY);
            if (isOff(grid.x(), column) || isOff(grid.y(), fromSouth)) {
                throw line.fault(found(mapX, mapY), "a place on the grid, " + frame.extent(), REMEDY);
            }
            if (!isCentred(grid.x(), column, localX) || !isCentred(grid.y(), fromSouth, localY)) {
                throw line.fault(found(mapX, mapY), "the centre of a cell; " + nearest(column, fromSouth), REMEDY);
            }
            return (long) grid.flipped(fromSouth) * grid.columns() + column;
        }

        @Override
        public String describe(long index) {
            return Placement.describe(frame.grid(), index);
        }

        private static boolean isOff(Axis axis, int cell) {
            return cell < 0 || cell >= axis.count();
        }

        private static double centre(Axis axis, int cell) {
            return axis.edge(cell) + axis.size(cell) / 2;
        }

        private static boolean isCentred(Axis axis, int cell, double distance) {
            return Math.abs(distance - centre(axis, cell)) <= TOLERANCE * axis.size(cell);
        }

        private static String found(double mapX, double mapY) {
            return "x " + CsvText.number(mapX) + ", y " + CsvText.number(mapY);
        }

        private String nearest(int column, int fromSouth) {
            Grid grid = frame.grid();
            double x = centre(grid.x(), column);
            double y = centre(grid.y(), fromSouth);
            return "the nearest is " + found(grid.mapX(x, y), grid.mapY(x, y)) + ", in row "
                    + (grid.flipped(fromSouth) + 1) + ", column " + (column + 1);
        }
    }
}
