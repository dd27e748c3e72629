package org.seepledger.desktop.map;

import org.seepledger.picture.Box;
import org.seepledger.picture.MapFrame;

/**
 * Which part of the map is seen, north up.
 *
 * @param width of the view, in logical pixels
 * @param height of the view
 * @param centreX the map x in its middle
 * @param centreY the map y in its middle
 * @param scale logical pixels per plan unit
 */
public record Camera(double width, double height, double centreX, double centreY, double scale) {

    /**
     * {@return the x on the screen of a map x}
     *
     * @param mapX in plan units
     */
    public double x(double mapX) {
        return width / 2 + (mapX - centreX) * scale;
    }

    /**
     * {@return the y on the screen of a map y}
     *
     * @param mapY in plan units
     */
    public double y(double mapY) {
        return height / 2 - (mapY - centreY) * scale;
    }

    /**
     * {@return the map x of an x on the screen}
     *
     * @param x in logical pixels
     */
    public double mapX(double x) {
        return centreX + (x - width / 2) / scale;
    }

    /**
     * {@return the map y of a y on the screen}
     *
     * @param y in logical pixels
     */
    public double mapY(double y) {
        return centreY - (y - height / 2) / scale;
    }

    /**
     * {@return the view from nearer or farther; what lies under a place on the screen stays there}
     *
     * @param x the place
     * @param y the place
     * @param factor how much larger things become
     * @param limits how near and far one may go
     */
    Camera zoomedAbout(double x, double y, double factor, Limits limits) {
        double zoomed = limits.within(scale * factor);
        double shrink = 1 / scale - 1 / zoomed;
        return new Camera(
                width, height, centreX + (x - width / 2) * shrink, centreY - (y - height / 2) * shrink, zoomed);
    }

    /** {@return the view after the map was dragged by some pixels} */
    Camera dragged(double x, double y) {
        return new Camera(width, height, centreX - x / scale, centreY + y / scale, scale);
    }

    /** {@return the same in a view of another size, with the same middle} */
    Camera resized(double newWidth, double newHeight) {
        return new Camera(newWidth, newHeight, centreX, centreY, scale);
    }

    /** {@return the view that shows a part of the map as large as it will go, but for a margin} */
    Camera showing(Extent extent, double margin, Limits limits) {
        double across = Math.max(1, width - 2 * margin) / Math.max(extent.width(), 1e-12);
        double up = Math.max(1, height - 2 * margin) / Math.max(extent.height(), 1e-12);
        return new Camera(width, height, extent.middleX(), extent.middleY(), limits.within(Math.min(across, up)));
    }

    /** {@return the same as pictures know it} */
    public MapFrame frame() {
        return new MapFrame(new Box(0, 0, width, height), mapX(0), mapY(0), scale);
    }

    /**
     * How near and far one may go.
     *
     * @param least the least scale
     * @param most the greatest
     */
    record Limits(double least, double most) {

        double within(double scale) {
            return Math.max(least, Math.min(most, scale));
        }
    }
}
