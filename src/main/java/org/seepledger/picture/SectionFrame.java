package org.seepledger.picture;

import java.util.DoubleSummaryStatistics;
import java.util.stream.DoubleStream;

/**
 * Which part of a section is seen, and where it comes to in a picture.
 *
 * @param box the part of the picture that the section fills
 * @param from the distance along the line at the box's left edge, in length units
 * @param to the distance at its right edge
 * @param lowest the elevation at its lower edge
 * @param highest the elevation at its upper edge
 */
public record SectionFrame(Box box, double from, double to, double lowest, double highest) {

    private static final double MARGIN = 0.08;

    /** More room above, where wells are named. */
    private static final double ABOVE = 2.5;

    /** Refuses what has no extent. */
    public SectionFrame {
        if (!(to > from && highest > lowest && box.width() > 0 && box.height() > 0)) {
            throw new IllegalArgumentException("nothing is seen");
        }
    }

    /**
     * {@return the frame that shows all of a section}
     *
     * @param profile the section
     * @param box the part of the picture to fill
     */
    public static SectionFrame fitting(Profile profile, Box box) {
        DoubleSummaryStatistics heights = elevations(profile).summaryStatistics();
        double least = heights.getCount() == 0 ? 0 : heights.getMin();
        double greatest = heights.getCount() == 0 ? 0 : heights.getMax();
        double margin = Math.max(1e-6 * Math.max(1, Math.abs(greatest)), MARGIN * (greatest - least));
        return new SectionFrame(box, 0, profile.length(), least - margin, greatest + ABOVE * margin);
    }

    /** All elevations that a section must reach. */
    static DoubleStream elevations(Profile profile) {
        return profile.stretches().stream()
                .map(Profile.Stretch::column)
                .flatMapToDouble(column -> DoubleStream.concat(
                        DoubleStream.of(column.surfaces()), DoubleStream.of(column.levelBefore(), column.level())))
                .filter(Double::isFinite);
    }

    /**
     * {@return the x in the picture of a distance along the line}
     *
     * @param along in length units
     */
    public double x(double along) {
        return box.x() + (along - from) / (to - from) * box.width();
    }

    /**
     * {@return the y in the picture of an elevation}
     *
     * @param elevation in length units
     */
    public double y(double elevation) {
        return box.bottom() - (elevation - lowest) / (highest - lowest) * box.height();
    }

    /**
     * {@return the distance along the line of an x in the picture}
     *
     * @param x in logical pixels
     */
    public double along(double x) {
        return from + (x - box.x()) / box.width() * (to - from);
    }

    /**
     * {@return the elevation of a y in the picture}
     *
     * @param y in logical pixels
     */
    public double elevation(double y) {
        return lowest + (box.bottom() - y) / box.height() * (highest - lowest);
    }

    /** {@return how high a logical pixel is, in length units} */
    public double pixel() {
        return (highest - lowest) / box.height();
    }

    /** {@return how many times heights are exaggerated} */
    public double exaggeration() {
        return (to - from) / box.width() / pixel();
    }

    /**
     * {@return the frame from nearer or farther; what lies under a place in the picture stays there}
     *
     * @param x the place
     * @param y the place
     * @param across how much larger distances become
     * @param up how much larger heights become
     */
    public SectionFrame zoomed(double x, double y, double across, double up) {
        double along = along(x);
        double elevation = elevation(y);
        return new SectionFrame(
                box,
                along - (along - from) / across,
                along + (to - along) / across,
                elevation - (elevation - lowest) / up,
                elevation + (highest - elevation) / up);
    }

    /**
     * {@return the frame after what is seen was dragged}
     *
     * @param x by how many pixels to the right
     * @param y by how many pixels down
     */
    public SectionFrame dragged(double x, double y) {
        double back = x / box.width() * (to - from);
        double up = y * pixel();
        return new SectionFrame(box, from - back, to - back, lowest + up, highest + up);
    }

    /**
     * {@return the frame with heights exaggerated otherwise, about its middle}
     *
     * @param times how many times, positive
     */
    public SectionFrame exaggerated(double times) {
        return zoomed(box.middleX(), box.middleY(), 1, times / exaggeration());
    }

    /**
     * {@return the frame in a picture of another size: the same distances and exaggeration, about the same middle}
     *
     * @param other the part of the picture that it fills then
     */
    public SectionFrame in(Box other) {
        return new SectionFrame(other, from, to, lowest, highest).exaggerated(exaggeration());
    }
}
