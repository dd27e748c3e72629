package org.seepledger.prism;

import org.seepledger.aquifer.Window;

/**
 * Which share of each cell's plan area a prism covers, by row.
 *
 * <p>Worked out from the pieces as a scan converter does: in each row, going from east to west, a cell's share is the
 * area to the west of the pieces in it plus what the pieces further east cover of the whole cell. A cell that no piece
 * touches is covered wholly or not at all, exactly.
 */
public final class Coverage {

    private final Window window;
    private final int[] firstColumns;
    private final double[][] shares;
    private final double[][] westFaces;
    private final double[][] southFaces;
    private final boolean[][] cut;

    Coverage(Pieces pieces) {
        int north = pieces.row(0);
        int south = pieces.row(pieces.count() - 1);
        firstColumns = new int[south - north + 1];
        shares = new double[firstColumns.length][];
        westFaces = new double[firstColumns.length][];
        southFaces = new double[firstColumns.length][];
        cut = new boolean[firstColumns.length][];
        int west = Integer.MAX_VALUE;
        int east = 0;
        for (int row = north; row <= south; row++) {
            fillRow(pieces, row, row - north);
            if (shares[row - north].length > 0) {
                west = Math.min(west, firstColumns[row - north]);
                east = Math.max(east, firstColumns[row - north] + shares[row - north].length);
            }
        }
        window = new Window(north, west, firstColumns.length, east - west);
        fillSouthFaces(pieces);
    }

    /** Goes from north to south in all columns at once: what lies north of a face and covers it, less what does not. */
    private void fillSouthFaces(Pieces pieces) {
        double[] cover = new double[window.columns()];
        int piece = 0;
        for (int row = window.row(); row < window.rowEnd(); row++) {
            int index = row - window.row();
            while (piece < pieces.count() && pieces.row(piece) == row) {
                cover[pieces.column(piece) - window.column()] -= pieces.across(piece);
                piece++;
            }
            double[] faces = new double[shares[index].length];
            for (int place = 0; place < faces.length; place++) {
                int column = firstColumns[index] + place - window.column();
                cover[column] = cut[index][place] ? cover[column] : Math.rint(cover[column]);
                faces[place] = cover[column];
            }
            southFaces[index] = faces;
        }
    }

    private void fillRow(Pieces pieces, int row, int index) {
        int from = pieces.firstFrom(row);
        int to = pieces.firstFrom(row + 1);
        int west = from < to ? Integer.MAX_VALUE : 0;
        int east = -1;
        for (int piece = from; piece < to; piece++) {
            west = Math.min(west, pieces.column(piece));
            east = Math.max(east, pieces.column(piece));
        }
        double[] toTheWest = new double[east - west + 1];
        double[] rise = new double[toTheWest.length];
        boolean[] touched = new boolean[toTheWest.length];
        for (int piece = from; piece < to; piece++) {
            int place = pieces.column(piece) - west;
            toTheWest[place] += pieces.shareToTheWest(piece);
            rise[place] += pieces.up(piece);
            touched[place] = true;
        }
        double cover = 0;
        for (int place = toTheWest.length - 1; place >= 0; place--) {
            cover = touched[place] ? cover : Math.rint(cover);
            toTheWest[place] += cover;
            cover += rise[place];
            rise[place] = cover;
        }
        firstColumns[index] = west;
        shares[index] = toTheWest;
        westFaces[index] = rise;
        cut[index] = touched;
    }

    /**
     * {@return the smallest window that holds all cells touched}
     */
    public Window window() {
        return window;
    }

    /**
     * {@return the first column touched in a row}
     *
     * @param row a row of the window
     */
    public int firstColumn(int row) {
        return firstColumns[row - window.row()];
    }

    /**
     * {@return the column after the last one touched in a row}
     *
     * @param row a row of the window
     */
    public int columnEnd(int row) {
        return firstColumn(row) + shares[row - window.row()].length;
    }

    /**
     * {@return the share of a cell's plan area that the prism covers, from 0 to 1 within rounding}
     *
     * @param row any row of the grid
     * @param column any column of the grid
     */
    public double share(int row, int column) {
        int place = place(row, column);
        return place < 0 ? 0 : shares[row - window.row()][place];
    }

    /**
     * {@return the share of a cell's west face that lies strictly inside the prism}
     *
     * @param row any row of the grid
     * @param column any column of the grid
     */
    public double westFace(int row, int column) {
        int place = place(row, column);
        return place < 0 ? 0 : westFaces[row - window.row()][place];
    }

    /**
     * {@return the share of a cell's north face that lies strictly inside the prism}
     *
     * @param row any row of the grid
     * @param column any column of the grid
     */
    public double northFace(int row, int column) {
        int place = place(row - 1, column);
        return place < 0 ? 0 : southFaces[row - 1 - window.row()][place];
    }

    /**
     * {@return whether a side runs through a cell or along its faces}
     *
     * @param row any row of the grid
     * @param column any column of the grid
     */
    public boolean isCut(int row, int column) {
        int place = place(row, column);
        return place >= 0 && cut[row - window.row()][place];
    }

    private int place(int row, int column) {
        if (row < window.row() || row >= window.rowEnd()) {
            return -1;
        }
        int place = column - firstColumn(row);
        return place >= 0 && place < shares[row - window.row()].length ? place : -1;
    }
}
