package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.job.FluxField;
import org.seepledger.job.GridLayer;
import org.seepledger.picture.Arrow;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** Arrows of flux; their length grows with the root of the magnitude, so that slow water is seen beside a well. */
final class FluxArrows {

    private static final double SHORTEST = 7;
    private static final double LONGEST = 34;

    private FluxArrows() {}

    static List<Mark> of(Flux flux, Grid grid, Camera camera) {
        FluxField field = flux.field();
        GridLayer east = field.east();
        List<Mark> marks = new ArrayList<>();
        for (int row = 0; row < east.rows() && flux.greatest() > 0; row++) {
            for (int column = 0; column < east.columns(); column++) {
                double alongX = east.at(row, column);
                double alongY = field.north().at(row, column);
                double size = Math.hypot(alongX, alongY);
                double x = x(grid, camera, east, row, column);
                double y = y(grid, camera, east, row, column);
                if (size > 0 && OnScreen.isNear(x, y, camera)) {
                    double share = Math.min(1, size / flux.greatest());
                    double half = (SHORTEST + (LONGEST - SHORTEST) * Math.sqrt(share)) / 2;
                    double dx = alongX / size * half;
                    double dy = -alongY / size * half;
                    marks.add(new Arrow(x - dx, y - dy, x + dx, y + dy, 1.4)
                            .mark(Mark.Fill.of(Ink.Token.TEXT), Mark.Stroke.of(Ink.Token.PAPER, 0.8)));
                }
            }
        }
        return marks;
    }

    private static double x(Grid grid, Camera camera, GridLayer layer, int row, int column) {
        return camera.x(grid.mapX(localX(grid, layer, column), localY(grid, layer, row)));
    }

    private static double y(Grid grid, Camera camera, GridLayer layer, int row, int column) {
        return camera.y(grid.mapY(localX(grid, layer, column), localY(grid, layer, row)));
    }

    private static double localX(Grid grid, GridLayer layer, int column) {
        Axis axis = grid.x();
        int from = layer.window().column() + column * layer.stride();
        int to = Math.min(layer.window().columnEnd(), from + layer.stride());
        return (axis.edge(from) + axis.edge(to)) / 2;
    }

    private static double localY(Grid grid, GridLayer layer, int row) {
        Axis axis = grid.y();
        int from = layer.window().row() + row * layer.stride();
        int to = Math.min(layer.window().rowEnd(), from + layer.stride());
        return (axis.edge(axis.count() - from) + axis.edge(axis.count() - to)) / 2;
    }
}
