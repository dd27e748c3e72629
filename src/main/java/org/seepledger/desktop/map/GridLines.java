package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** The lines between cells, where they are far enough apart to help; on device pixels where the grid is not turned. */
final class GridLines {

    private static final double APART = 22;

    private final Grid grid;
    private final Camera camera;
    private final double outputScale;
    private final List<Mark> marks = new ArrayList<>();

    private GridLines(Grid grid, Camera camera, double outputScale) {
        this.grid = grid;
        this.camera = camera;
        this.outputScale = outputScale;
    }

    static List<Mark> of(Grid grid, Camera camera, double outputScale) {
        GridLines lines = new GridLines(grid, camera, outputScale);
        if (Math.min(grid.x().smallest(), grid.y().smallest()) * camera.scale() >= APART) {
            lines.draw();
        }
        return lines.marks;
    }

    private void draw() {
        double reach = Math.hypot(camera.width(), camera.height()) / 2 / camera.scale();
        double middleX = grid.localX(camera.centreX(), camera.centreY());
        double middleY = grid.localY(camera.centreX(), camera.centreY());
        int[] columns = lines(grid.x(), middleX - reach, middleX + reach);
        int[] rows = lines(grid.y(), middleY - reach, middleY + reach);
        double west = grid.x().edge(columns[0]);
        double east = grid.x().edge(columns[1]);
        double south = grid.y().edge(rows[0]);
        double north = grid.y().edge(rows[1]);
        for (int line = columns[0]; line <= columns[1]; line++) {
            add(grid.x().edge(line), south, grid.x().edge(line), north);
        }
        for (int line = rows[0]; line <= rows[1]; line++) {
            add(west, grid.y().edge(line), east, grid.y().edge(line));
        }
    }

    private static int[] lines(Axis axis, double from, double to) {
        return new int[] {Math.max(0, axis.cellAt(from)), Math.min(axis.count(), axis.cellAt(to) + 1)};
    }

    private void add(double fromX, double fromY, double toX, double toY) {
        double[] xy = {
            camera.x(grid.mapX(fromX, fromY)),
            camera.y(grid.mapY(fromX, fromY)),
            camera.x(grid.mapX(toX, toY)),
            camera.y(grid.mapY(toX, toY))
        };
        if (grid.rotation() % 90 == 0) {
            for (int i = 0; i < xy.length; i++) {
                xy[i] = (Math.floor(xy[i] * outputScale) + 0.5) / outputScale;
            }
        }
        marks.add(new Mark.Line(xy, Mark.Stroke.of(Ink.Token.GUIDE, 1 / outputScale)));
    }
}
