package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * The lines and dots of a texture, cut to the area that they fill. They lie on one raster for the whole picture, so that
 * neighbouring areas match. Drawn as lines they stay sharp in print, where a tiled pattern would become an image.
 */
public final class Hatch {

    /** From one line to the next along either axis, and from dot to dot, in logical pixels. */
    private static final double STEP = 7;

    private final List<double[]> rings;
    private final List<double[]> segments = new ArrayList<>();

    private Hatch(List<double[]> rings) {
        this.rings = rings;
    }

    /**
     * {@return the texture of an area: the ends x, y, x, y of each line; those of a dot are one place}
     *
     * @param rings x and y in turn, filled by the even-odd rule
     * @param texture the texture; plain has none
     */
    public static List<double[]> of(List<double[]> rings, Mark.Texture texture) {
        Hatch hatch = new Hatch(rings);
        switch (texture) {
            case PLAIN -> {}
            case RISING -> hatch.addLines(1);
            case FALLING -> hatch.addLines(-1);
            case CROSSED -> {
                hatch.addLines(1);
                hatch.addLines(-1);
            }
            case DOTS -> hatch.addDots();
        }
        return hatch.segments;
    }

    /** Lines on which x + slope × y is a multiple of the step; y is down. */
    private void addLines(int slope) {
        for (Crossing crossing : crossings(1, slope)) {
            double[] along = crossing.along();
            for (int i = 0; i + 1 < along.length; i += 2) {
                segments.add(new double[] {
                    (crossing.level() + along[i]) / 2,
                    slope * (crossing.level() - along[i]) / 2,
                    (crossing.level() + along[i + 1]) / 2,
                    slope * (crossing.level() - along[i + 1]) / 2
                });
            }
        }
    }

    /** Dots in rows, every other row shifted by half a step. */
    private void addDots() {
        for (Crossing row : crossings(0, 1)) {
            double shift = Math.floorMod(Math.round(row.level() / STEP), 2) * STEP / 2;
            for (int i = 0; i + 1 < row.along().length; i += 2) {
                double first = Math.ceil((row.along()[i] - shift) / STEP) * STEP + shift;
                for (double x = first; x < row.along()[i + 1]; x += STEP) {
                    segments.add(new double[] {x, row.level(), x, row.level()});
                }
            }
        }
    }

    /**
     * Where a line meets the rings.
     *
     * @param level its level
     * @param along how far along it the meetings are, in order
     */
    private record Crossing(double level, double[] along) {}

    /** The lines on which xFactor × x + yFactor × y is a multiple of the step; along them counts xFactor × x − yFactor × y, or x. */
    private List<Crossing> crossings(int xFactor, int yFactor) {
        double least = levels(xFactor, yFactor).min().orElse(0);
        double greatest = levels(xFactor, yFactor).max().orElse(0);
        List<Crossing> crossings = new ArrayList<>();
        for (double level = (Math.floor(least / STEP) + 1) * STEP; level < greatest; level += STEP) {
            double at = level;
            crossings.add(new Crossing(
                    at,
                    rings.stream()
                            .flatMapToDouble(ring -> meetings(ring, xFactor, yFactor, at))
                            .sorted()
                            .toArray()));
        }
        return crossings;
    }

    private DoubleStream levels(int xFactor, int yFactor) {
        return rings.stream().flatMapToDouble(ring -> {
            double[] levels = new double[ring.length / 2];
            Arrays.setAll(levels, i -> xFactor * ring[2 * i] + yFactor * ring[2 * i + 1]);
            return Arrays.stream(levels);
        });
    }

    private static DoubleStream meetings(double[] ring, int xFactor, int yFactor, double level) {
        DoubleStream.Builder meetings = DoubleStream.builder();
        for (int i = 0; i < ring.length; i += 2) {
            int j = (i + 2) % ring.length;
            double from = xFactor * ring[i] + yFactor * ring[i + 1];
            double to = xFactor * ring[j] + yFactor * ring[j + 1];
            if (from > level != to > level) {
                double share = (level - from) / (to - from);
                double begin = along(ring, i, xFactor, yFactor);
                meetings.add(begin + share * (along(ring, j, xFactor, yFactor) - begin));
            }
        }
        return meetings.build();
    }

    private static double along(double[] ring, int i, int xFactor, int yFactor) {
        return xFactor == 0 ? ring[i] : ring[i] - yFactor * ring[i + 1];
    }
}
