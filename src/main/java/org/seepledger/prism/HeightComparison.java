package org.seepledger.prism;

import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.prep.PreparedGeometry;
import org.locationtech.jts.geom.prep.PreparedGeometryFactory;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/** Compares surfaces in the cells that an area lies in, a row at a time. */
final class HeightComparison {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    private final Grid grid;
    private final PreparedGeometry area;
    private final Window window;

    HeightComparison(Grid grid, Geometry area) {
        this.grid = grid;
        this.area = PreparedGeometryFactory.prepare(area);
        this.window = window(grid, area);
    }

    /** {@return whether, in some cell, each of the tops is above each of the bottoms} */
    boolean meet(List<GriddedValues> tops, List<GriddedValues> bottoms) {
        for (int row = window.row(); row < window.rowEnd(); row++) {
            Window line = new Window(row, window.column(), 1, window.columns());
            double[][] upper = read(tops, line);
            double[][] lower = read(bottoms, line);
            for (int i = 0; i < line.columns(); i++) {
                double lowestTop = Math.min(upper[0][i], upper[1][i]);
                double highestBottom = Math.max(lower[0][i], lower[1][i]);
                if (lowestTop > highestBottom && covers(cell(row, line.column() + i))) {
                    return true;
                }
            }
        }
        return false;
    }

    private boolean covers(Polygon cell) {
        return area.intersects(cell) && !area.touches(cell);
    }

    private static double[][] read(List<GriddedValues> surfaces, Window line) {
        double[][] values = new double[surfaces.size()][line.size()];
        for (int i = 0; i < values.length; i++) {
            surfaces.get(i).read(0, 0, line, values[i], 0);
        }
        return values;
    }

    private Polygon cell(int row, int column) {
        double west = grid.x().edge(column);
        double east = grid.x().edge(column + 1);
        double south = grid.y().edge(grid.flipped(row));
        double north = grid.y().edge(grid.flipped(row) + 1);
        return FACTORY.createPolygon(new Coordinate[] {
            corner(west, south), corner(east, south), corner(east, north), corner(west, north), corner(west, south)
        });
    }

    private Coordinate corner(double localX, double localY) {
        return new Coordinate(grid.mapX(localX, localY), grid.mapY(localX, localY));
    }

    private static Window window(Grid grid, Geometry area) {
        double west = Double.POSITIVE_INFINITY;
        double east = Double.NEGATIVE_INFINITY;
        double south = Double.POSITIVE_INFINITY;
        double north = Double.NEGATIVE_INFINITY;
        for (Coordinate place : area.getCoordinates()) {
            double x = grid.localX(place.x, place.y);
            double y = grid.localY(place.x, place.y);
            west = Math.min(west, x);
            east = Math.max(east, x);
            south = Math.min(south, y);
            north = Math.max(north, y);
        }
        int first = within(grid.x().cellAt(west), grid.columns());
        int last = within(grid.x().cellAt(east), grid.columns());
        int top = within(grid.flipped(grid.y().cellAt(north)), grid.rows());
        int bottom = within(grid.flipped(grid.y().cellAt(south)), grid.rows());
        return new Window(top, first, bottom - top + 1, last - first + 1);
    }

    private static int within(int index, int count) {
        return Math.min(count - 1, Math.max(0, index));
    }
}
