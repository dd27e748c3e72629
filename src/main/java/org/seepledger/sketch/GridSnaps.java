package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** The grid lines and corners nearest to a place, in map coordinates as the grid itself gives them. */
final class GridSnaps {

    private final Grid grid;
    private final Place pointer;
    private final double x;
    private final double y;

    GridSnaps(Grid grid, Place pointer) {
        this.grid = grid;
        this.pointer = pointer;
        this.x = within(grid.x(), grid.localX(pointer.x(), pointer.y()));
        this.y = within(grid.y(), grid.localY(pointer.x(), pointer.y()));
    }

    /** {@return the corners of the cell that the place is in, or that is nearest} */
    Stream<Snap> corners() {
        List<Snap> corners = new ArrayList<>();
        for (double column : edges(grid.x(), x)) {
            for (double row : edges(grid.y(), y)) {
                corners.add(Snap.point(Snap.Kind.GRID_CORNER, at(column, row)));
            }
        }
        return corners.stream();
    }

    /** {@return the lines round that cell} */
    Stream<Snap> lines() {
        List<Snap> lines = new ArrayList<>();
        for (double column : edges(grid.x(), x)) {
            lines.add(line(at(column, 0), at(column, end(grid.y()))));
        }
        for (double row : edges(grid.y(), y)) {
            lines.add(line(at(0, row), at(end(grid.x()), row)));
        }
        return lines.stream();
    }

    private Snap line(Place from, Place to) {
        return Snap.line(Snap.Kind.GRID_LINE, pointer, from, to);
    }

    private Place at(double localX, double localY) {
        return new Place(grid.mapX(localX, localY), grid.mapY(localX, localY));
    }

    private static double[] edges(Axis axis, double distance) {
        int cell = Math.max(0, Math.min(axis.count() - 1, axis.cellAt(distance)));
        return new double[] {axis.edge(cell), axis.edge(cell + 1)};
    }

    private static double within(Axis axis, double distance) {
        return Math.max(0, Math.min(end(axis), distance));
    }

    private static double end(Axis axis) {
        return axis.edge(axis.count());
    }
}
