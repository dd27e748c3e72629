package org.seepledger.desktop.map;

import java.util.stream.DoubleStream;
import org.seepledger.aquifer.Grid;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Side;

/**
 * An upright part of the map.
 *
 * @param west the least map x
 * @param south the least map y
 * @param east the greatest map x
 * @param north the greatest map y
 */
record Extent(double west, double south, double east, double north) {

    static Extent of(Grid grid) {
        double right = grid.x().edge(grid.columns());
        double top = grid.y().edge(grid.rows());
        double[] x = {grid.mapX(0, 0), grid.mapX(right, 0), grid.mapX(0, top), grid.mapX(right, top)};
        double[] y = {grid.mapY(0, 0), grid.mapY(right, 0), grid.mapY(0, top), grid.mapY(right, top)};
        return over(DoubleStream.of(x), DoubleStream.of(y));
    }

    /** What is seen of a grid, in its own coordinates; of a turned one more than that. */
    static Extent inGrid(Grid grid, Camera camera) {
        double[] x = new double[4];
        double[] y = new double[4];
        for (int corner = 0; corner < 4; corner++) {
            double mapX = camera.mapX(corner % 2 * camera.width());
            double mapY = camera.mapY(corner / 2 * camera.height());
            x[corner] = grid.localX(mapX, mapY);
            y[corner] = grid.localY(mapX, mapY);
        }
        return over(DoubleStream.of(x), DoubleStream.of(y));
    }

    static Extent of(Prism prism) {
        var sides =
                prism.rings().stream().flatMap(ring -> ring.sides().stream()).toList();
        return over(sides.stream().mapToDouble(Side::x), sides.stream().mapToDouble(Side::y));
    }

    private static Extent over(DoubleStream x, DoubleStream y) {
        var across = x.summaryStatistics();
        var up = y.summaryStatistics();
        return new Extent(across.getMin(), up.getMin(), across.getMax(), up.getMax());
    }

    double width() {
        return east - west;
    }

    double height() {
        return north - south;
    }

    double middleX() {
        return (west + east) / 2;
    }

    double middleY() {
        return (south + north) / 2;
    }
}
