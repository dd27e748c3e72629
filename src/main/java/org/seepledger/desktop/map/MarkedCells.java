package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.job.TracedNumber;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Mark;

/** Cells that are lit up, as outlines. */
final class MarkedCells {

    private MarkedCells() {}

    static List<Mark> of(List<TracedNumber.Cell> cells, Grid grid, Camera camera) {
        List<Mark> marks = new ArrayList<>();
        for (TracedNumber.Cell cell : cells) {
            List<double[]> ring = List.of(ring(cell, grid, camera));
            marks.add(new Mark.Area(ring, Optional.empty(), Optional.of(Mark.Stroke.of(Ink.Token.PAPER, 5))));
            marks.add(new Mark.Area(
                    ring,
                    Optional.of(new Mark.Fill(Ink.Token.ACCENT, 0.35, Mark.Texture.PLAIN)),
                    Optional.of(Mark.Stroke.of(Ink.Token.ACCENT, 2))));
        }
        return marks;
    }

    private static double[] ring(TracedNumber.Cell cell, Grid grid, Camera camera) {
        int fromSouth = grid.flipped(cell.row());
        double[] ring = new double[8];
        for (int corner = 0; corner < 4; corner++) {
            double x = grid.x().edge(cell.column() + (corner == 1 || corner == 2 ? 1 : 0));
            double y = grid.y().edge(fromSouth + corner / 2);
            ring[2 * corner] = camera.x(grid.mapX(x, y));
            ring[2 * corner + 1] = camera.y(grid.mapY(x, y));
        }
        return ring;
    }
}
