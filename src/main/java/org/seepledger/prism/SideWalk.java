package org.seepledger.prism;

import java.util.List;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/**
 * Walks one straight side through the grid and cuts it at grid lines.
 *
 * <p>The walk always goes from the western end (the southern one of a side along y), whichever way the side runs, so that
 * two prisms that share a side cut it into the same pieces, bit for bit. Which cell a piece lies in follows from counting
 * the lines crossed, never from rounded coordinates. A side on a grid line takes the cell on its left, the prism's inner
 * side.
 */
final class SideWalk {

    private final Grid grid;
    private final int side;
    private final boolean reversed;
    private final double x0;
    private final double y0;
    private final double x1;
    private final double y1;
    private final List<Pieces.Piece> target;
    private int column;
    private int fromSouth;
    private double x;
    private double y;

    /** Prepares a side between two places in local coordinates, already put on the grid lines that they lie on. */
    SideWalk(Grid grid, int side, double ax, double ay, double bx, double by, List<Pieces.Piece> target) {
        this.grid = grid;
        this.side = side;
        this.reversed = ax > bx || (ax == bx && ay > by);
        this.x0 = reversed ? bx : ax;
        this.y0 = reversed ? by : ay;
        this.x1 = reversed ? ax : bx;
        this.y1 = reversed ? ay : by;
        this.target = target;
    }

    void walk() {
        column = firstCell(grid.x(), x0, x1, reversed);
        fromSouth = firstCell(grid.y(), y0, y1, !reversed);
        x = x0;
        y = y0;
        boolean north = y1 > y0;
        while (true) {
            double nextX = grid.x().edge(column + 1);
            double nextY = grid.y().edge(north ? fromSouth + 1 : fromSouth);
            double toX = nextX < x1 ? (nextX - x0) / (x1 - x0) : Double.POSITIVE_INFINITY;
            double toY = (north ? nextY < y1 : nextY > y1) ? (nextY - y0) / (y1 - y0) : Double.POSITIVE_INFINITY;
            if (toX == Double.POSITIVE_INFINITY && toY == Double.POSITIVE_INFINITY) {
                add(x1, y1);
                return;
            }
            if (toX <= toY) {
                add(nextX, within(grid.y(), fromSouth, y0 + toX * (y1 - y0)));
                column++;
            } else {
                add(within(grid.x(), column, x0 + toY * (x1 - x0)), nextY);
                fromSouth += north ? 1 : -1;
            }
        }
    }

    /** The cell along one axis where the walk begins; {@code upper} chooses where the whole side lies on a line. */
    private static int firstCell(Axis axis, double from, double to, boolean upper) {
        int cell = Math.min(axis.cellAt(from), axis.count() - 1);
        boolean onLine = from == axis.edge(cell) || from == axis.edge(cell + 1);
        if (!onLine) {
            return cell;
        }
        int line = from == axis.edge(cell) ? cell : cell + 1;
        boolean takeUpper = to > from || (to == from && upper);
        return Math.max(0, Math.min(axis.count() - 1, takeUpper ? line : line - 1));
    }

    private static double within(Axis axis, int cell, double place) {
        return Math.min(Math.max(place, axis.edge(cell)), axis.edge(cell + 1));
    }

    private void add(double nextX, double nextY) {
        double startAcross = (x - grid.x().edge(column)) / grid.x().size(column);
        double startUp = (y - grid.y().edge(fromSouth)) / grid.y().size(fromSouth);
        double endAcross = (nextX - grid.x().edge(column)) / grid.x().size(column);
        double endUp = (nextY - grid.y().edge(fromSouth)) / grid.y().size(fromSouth);
        x = nextX;
        y = nextY;
        if (startAcross == endAcross && startUp == endUp) {
            return;
        }
        int row = grid.flipped(fromSouth);
        target.add(
                reversed
                        ? new Pieces.Piece(row, column, side, endAcross, endUp, startAcross, startUp)
                        : new Pieces.Piece(row, column, side, startAcross, startUp, endAcross, endUp));
    }
}
