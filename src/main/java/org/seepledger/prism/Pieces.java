package org.seepledger.prism;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * The pieces that the grid lines cut a prism's sides into, sorted by row, northernmost first, and in the order of the
 * walk within a row.
 *
 * <p>A piece runs from P to Q in one cell; places in a cell go from 0 to 1, across from west to east and up from south
 * to north. The outward normal is on its right. With west, east, south and north the flows through the cell's faces
 * (length³/time, positive toward +x and +y), the outflow through the piece is linear along it, from
 * {@link #outflowAtStart} to {@link #outflowAtEnd} per unit of its parameter: the lowest-order field of Raviart and
 * Thomas (1977).
 */
public final class Pieces {

    private final int[] rows;
    private final int[] columns;
    private final int[] sides;
    private final double[] startAcross;
    private final double[] startUp;
    private final double[] endAcross;
    private final double[] endUp;

    /**
     * One piece, while the pieces are being collected.
     *
     * @param row its cell's row
     * @param column its cell's column
     * @param side which side of the prism, counted through all rings
     * @param startAcross where it begins in the cell
     * @param startUp where it begins
     * @param endAcross where it ends
     * @param endUp where it ends
     */
    record Piece(int row, int column, int side, double startAcross, double startUp, double endAcross, double endUp) {}

    Pieces(List<Piece> walked) {
        Piece[] sorted = walked.toArray(Piece[]::new);
        Arrays.sort(sorted, Comparator.comparingInt(Piece::row));
        rows = Arrays.stream(sorted).mapToInt(Piece::row).toArray();
        columns = Arrays.stream(sorted).mapToInt(Piece::column).toArray();
        sides = Arrays.stream(sorted).mapToInt(Piece::side).toArray();
        startAcross = Arrays.stream(sorted).mapToDouble(Piece::startAcross).toArray();
        startUp = Arrays.stream(sorted).mapToDouble(Piece::startUp).toArray();
        endAcross = Arrays.stream(sorted).mapToDouble(Piece::endAcross).toArray();
        endUp = Arrays.stream(sorted).mapToDouble(Piece::endUp).toArray();
    }

    /**
     * {@return the number of pieces}
     */
    public int count() {
        return rows.length;
    }

    /**
     * {@return the first piece in a row or below it; the number of pieces if there is none}
     *
     * @param row a row of the grid
     */
    public int firstFrom(int row) {
        int low = 0;
        int high = rows.length;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (rows[middle] < row) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /**
     * {@return a piece's row in the grid}
     *
     * @param piece from 0
     */
    public int row(int piece) {
        return rows[piece];
    }

    /**
     * {@return a piece's column in the grid}
     *
     * @param piece from 0
     */
    public int column(int piece) {
        return columns[piece];
    }

    /**
     * {@return which side a piece belongs to, counted through all rings}
     *
     * @param piece from 0
     */
    public int side(int piece) {
        return sides[piece];
    }

    /**
     * {@return how far a piece goes across its cell, from -1 to 1}
     *
     * @param piece from 0
     */
    public double across(int piece) {
        return endAcross[piece] - startAcross[piece];
    }

    /**
     * {@return how far a piece goes up its cell, from -1 to 1}
     *
     * @param piece from 0
     */
    public double up(int piece) {
        return endUp[piece] - startUp[piece];
    }

    /**
     * {@return where the middle of a piece is across its cell, from 0 in the west to 1}
     *
     * @param piece from 0
     */
    public double middleAcross(int piece) {
        return 0.5 * (startAcross[piece] + endAcross[piece]);
    }

    /**
     * {@return where the middle of a piece is up its cell, from 0 in the south to 1}
     *
     * @param piece from 0
     */
    public double middleUp(int piece) {
        return 0.5 * (startUp[piece] + endUp[piece]);
    }

    /**
     * {@return the share of a piece's cell between the piece and the cell's west face}
     *
     * @param piece from 0
     */
    double shareToTheWest(int piece) {
        return middleAcross(piece) * up(piece);
    }

    /**
     * {@return the outflow density where a piece begins, length³/time over its whole length}
     *
     * @param piece from 0
     * @param west flow through the cell's west face
     * @param east through its east face
     * @param south through its south face
     * @param north through its north face
     */
    public double outflowAtStart(int piece, double west, double east, double south, double north) {
        return between(west, east, startAcross[piece]) * up(piece)
                - between(south, north, startUp[piece]) * across(piece);
    }

    /**
     * {@return the outflow density where a piece ends, length³/time over its whole length}
     *
     * @param piece from 0
     * @param west flow through the cell's west face
     * @param east through its east face
     * @param south through its south face
     * @param north through its north face
     */
    public double outflowAtEnd(int piece, double west, double east, double south, double north) {
        return between(west, east, endAcross[piece]) * up(piece) - between(south, north, endUp[piece]) * across(piece);
    }

    /** Flow between two faces, exactly a face's own on it, so that the cells on both sides of a face agree. */
    private static double between(double first, double second, double place) {
        return (1 - place) * first + place * second;
    }

    /**
     * {@return whether a piece lies on an outer side of the grid}
     *
     * @param piece from 0
     * @param lastRow the grid's last row
     * @param lastColumn the grid's last column
     */
    boolean isOnEdge(int piece, int lastRow, int lastColumn) {
        double across = onLineAcross(piece);
        double up = onLineUp(piece);
        return across == 0 && columns[piece] == 0
                || across == 1 && columns[piece] == lastColumn
                || up == 1 && rows[piece] == 0
                || up == 0 && rows[piece] == lastRow;
    }

    /**
     * {@return the row of the cell on a piece's outer side: another than the piece's own where it lies on a cell's north or
     * south face; may lie beyond the grid}
     *
     * @param piece from 0
     */
    public int rowBeyond(int piece) {
        double up = onLineUp(piece);
        return Double.isNaN(up) ? rows[piece] : up == 1 ? rows[piece] - 1 : rows[piece] + 1;
    }

    /**
     * {@return the column of the cell on a piece's outer side: another than the piece's own where it lies on a cell's west
     * or east face; may lie beyond the grid}
     *
     * @param piece from 0
     */
    public int columnBeyond(int piece) {
        double across = onLineAcross(piece);
        return Double.isNaN(across) ? columns[piece] : across == 0 ? columns[piece] - 1 : columns[piece] + 1;
    }

    /**
     * {@return the share of a piece's cell that lies behind the piece, seen from a place in that cell: positive where the
     * place is on the piece's inner side}
     *
     * @param piece from 0
     * @param across the place
     * @param up the place
     */
    double shareBehind(int piece, double across, double up) {
        return new Sector(across, up).behind(startAcross[piece], startUp[piece], endAcross[piece], endUp[piece]);
    }

    double startAcross(int piece) {
        return startAcross[piece];
    }

    double startUp(int piece) {
        return startUp[piece];
    }

    double endAcross(int piece) {
        return endAcross[piece];
    }

    double endUp(int piece) {
        return endUp[piece];
    }

    /** Which line along y the piece lies on, 0 for the west face of its cell, 1 for the east; NaN if on neither. */
    double onLineAcross(int piece) {
        return onLine(startAcross[piece], endAcross[piece]);
    }

    /** Which line along x the piece lies on, 0 for the south face of its cell, 1 for the north; NaN if on neither. */
    double onLineUp(int piece) {
        return onLine(startUp[piece], endUp[piece]);
    }

    private static double onLine(double start, double end) {
        return start == end && (start == 0 || start == 1) ? start : Double.NaN;
    }
}
