package org.seepledger.prism;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Grid;

/**
 * Finds where the boundary of one prism runs along that of another, in the opposite direction, to a billionth of a
 * cell or the rounding of map coordinates; the two may have different vertices.
 */
public final class SharedPieces {

    private final Pieces own;
    private final Pieces others;
    private final double near;
    private final Map<Long, List<Integer>> othersByCell = new HashMap<>();

    /**
     * A part of a piece that another prism shares.
     *
     * @param piece the piece
     * @param from where the part begins, from 0 to 1 along the piece
     * @param to where it ends
     * @param otherRow the row of the cell on the other prism's side
     * @param otherColumn the column of that cell
     */
    public record Part(int piece, double from, double to, int otherRow, int otherColumn) {}

    private SharedPieces(Pieces own, Pieces others, double near) {
        this.near = near;
        this.own = own;
        this.others = others;
        for (int piece = 0; piece < others.count(); piece++) {
            othersByCell
                    .computeIfAbsent(key(others.row(piece), others.column(piece)), cell -> new ArrayList<>())
                    .add(piece);
        }
    }

    /**
     * {@return the parts of one prism's pieces that another shares, in the order of the pieces}
     *
     * @param one the one
     * @param other the other
     * @param grid the grid that both are cut by
     */
    public static List<Part> of(PrismCut one, PrismCut other, Grid grid) {
        SharedPieces shared = new SharedPieces(one.pieces(), other.pieces(), grid.near());
        List<Part> parts = new ArrayList<>();
        for (int piece = 0; piece < shared.own.count(); piece++) {
            shared.addParts(piece, parts);
        }
        return parts;
    }

    private static long key(int row, int column) {
        return (long) row << Integer.SIZE | column;
    }

    /** Looks in the neighbouring cells too, where the other boundary may run along or just beyond a grid line. */
    private void addParts(int piece, List<Part> parts) {
        for (int row = own.row(piece) - 1; row <= own.row(piece) + 1; row++) {
            for (int column = own.column(piece) - 1; column <= own.column(piece) + 1; column++) {
                addParts(piece, row, column, parts);
            }
        }
    }

    private void addParts(int piece, int row, int column, List<Part> parts) {
        for (int other : othersByCell.getOrDefault(key(row, column), List.of())) {
            // Places of the other piece, seen from this piece's cell; rows count from the north.
            double shiftAcross = column - own.column(piece);
            double shiftUp = own.row(piece) - row;
            double begin = along(piece, others.startAcross(other) + shiftAcross, others.startUp(other) + shiftUp);
            double end = along(piece, others.endAcross(other) + shiftAcross, others.endUp(other) + shiftUp);
            double from = Math.max(0, Math.min(begin, end));
            double to = Math.min(1, Math.max(begin, end));
            double length = Math.hypot(own.across(piece), own.up(piece));
            if (begin > end && (to - from) * length > near) {
                parts.add(new Part(piece, from, to, row, column));
            }
        }
    }

    /** Where a place lies along a piece; NaN if it is not on its line. */
    private double along(int piece, double across, double up) {
        double dx = own.across(piece);
        double dy = own.up(piece);
        double x = across - own.startAcross(piece);
        double y = up - own.startUp(piece);
        double length = Math.hypot(dx, dy);
        return Math.abs(x * dy - y * dx) <= near * length ? (x * dx + y * dy) / (length * length) : Double.NaN;
    }
}
