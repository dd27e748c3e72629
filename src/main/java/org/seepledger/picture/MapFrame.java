package org.seepledger.picture;

import java.util.Arrays;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/**
 * Where map coordinates come to in a picture: north up, the same scale along both axes.
 *
 * @param box the part of the picture that the map fills
 * @param west the map x at the box's left edge
 * @param north the map y at its upper edge
 * @param scale logical pixels per plan unit
 */
public record MapFrame(Box box, double west, double north, double scale) {

    /**
     * {@return a frame that shows a part of the map as large as it will go}
     *
     * @param box the part of the picture to fill
     * @param west the least map x to show
     * @param south the least map y
     * @param east the greatest map x
     * @param north the greatest map y
     */
    public static MapFrame fitting(Box box, double west, double south, double east, double north) {
        double scale = Math.min(box.width() / (east - west), box.height() / (north - south));
        double middleX = (west + east) / 2;
        double middleY = (south + north) / 2;
        return new MapFrame(box, middleX - box.width() / 2 / scale, middleY + box.height() / 2 / scale, scale);
    }

    /**
     * {@return the x in the picture of a map x}
     *
     * @param mapX the map x
     */
    public double x(double mapX) {
        return box.x() + (mapX - west) * scale;
    }

    /**
     * {@return the y in the picture of a map y}
     *
     * @param mapY the map y
     */
    public double y(double mapY) {
        return box.y() + (north - mapY) * scale;
    }

    /**
     * {@return places in the picture, x and y in turn}
     *
     * @param mapXy the places' map x and y in turn
     */
    public double[] drawn(double[] mapXy) {
        double[] drawn = new double[mapXy.length];
        for (int i = 0; i < mapXy.length; i += 2) {
            drawn[i] = x(mapXy[i]);
            drawn[i + 1] = y(mapXy[i + 1]);
        }
        return drawn;
    }

    /**
     * {@return the map x of an x in the picture}
     *
     * @param x in logical pixels
     */
    public double mapX(double x) {
        return west + (x - box.x()) / scale;
    }

    /**
     * {@return the map y of a y in the picture}
     *
     * @param y in logical pixels
     */
    public double mapY(double y) {
        return north - (y - box.y()) / scale;
    }

    /**
     * {@return the cells that the frame shows, at least one; cells beyond the frame's corners may be among them}
     *
     * @param grid the grid
     */
    public Window window(Grid grid) {
        double[] x = new double[4];
        double[] y = new double[4];
        for (int corner = 0; corner < 4; corner++) {
            double cornerX = corner % 2 == 0 ? west : east();
            double cornerY = corner < 2 ? south() : north;
            x[corner] = grid.localX(cornerX, cornerY);
            y[corner] = grid.localY(cornerX, cornerY);
        }
        Arrays.sort(x);
        Arrays.sort(y);
        int column = grid.x().nearest(x[0]);
        int row = grid.flipped(grid.y().nearest(y[3]));
        return new Window(
                row,
                column,
                grid.flipped(grid.y().nearest(y[0])) - row + 1,
                grid.x().nearest(x[3]) - column + 1);
    }

    /** {@return the map x at the box's right edge} */
    public double east() {
        return mapX(box.right());
    }

    /** {@return the map y at the box's lower edge} */
    public double south() {
        return mapY(box.bottom());
    }
}
