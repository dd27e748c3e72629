package org.seepledger.intake;

import java.util.Arrays;
import java.util.Optional;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/**
 * Works a grid out from the centres of its cells: their turn from the nearest neighbours, their rows and columns from the
 * different distances along both axes, their edges from the distances between centres.
 *
 * <p>Edges are not told by centres alone: one width is free, and each further one follows from it. It is chosen so that
 * widths change least from cell to cell (least sum of absolute changes), which finds again all grids whose widths are
 * constant over stretches.
 */
final class CellCentres {

    /** Centres nearer to each other than this share of the widest distance between lines are in one line. */
    private static final double SAME = 0.005;

    /** How far a distance between lines may be from a multiple of the least one, in shares of it. */
    private static final double MULTIPLE = 0.02;

    /** A grid of more cells than this for each centre is none. */
    private static final double MOST_EMPTY = 40;

    /** A turn below this, in degrees, is rounding. */
    private static final double LEAST_TURN = 1e-4;

    private CellCentres() {}

    /** {@return the grid; empty if the places are not those of a grid's cells} */
    static Optional<Grid> grid(double[] x, double[] y) {
        if (x.length < 4) {
            return Optional.empty();
        }
        Turned best = Turned.of(x, y, Math.toDegrees(turn(x, y)));
        for (int decimals = 4; decimals >= 0; decimals--) {
            Turned rounder = Turned.of(x, y, rounded(best.degrees, decimals));
            best = rounder.fitsLike(best) ? rounder : best;
        }
        boolean filled = (double) best.columns.places.length * best.rows.places.length <= MOST_EMPTY * x.length;
        if (best.columns.places.length < 2 || best.rows.places.length < 2 || !filled) {
            return Optional.empty();
        }
        Turned found = best;
        return edges(filled(found.columns.places))
                .flatMap(edgesX ->
                        edges(filled(found.rows.places)).map(edgesY -> found.grid(edgesX, edgesY, x[0], y[0])));
    }

    private static double rounded(double value, int decimals) {
        double unit = Math.pow(10, decimals);
        return Math.rint(value * unit) / unit;
    }

    /** Centres seen along both axes of a grid that is turned by some degrees. */
    private record Turned(double degrees, Lines columns, Lines rows) {

        static Turned of(double[] x, double[] y, double degrees) {
            double cosine = Math.cos(Math.toRadians(degrees));
            double sine = Math.sin(Math.toRadians(degrees));
            double[] along = new double[x.length];
            double[] across = new double[x.length];
            for (int i = 0; i < x.length; i++) {
                along[i] = (x[i] - x[0]) * cosine + (y[i] - y[0]) * sine;
                across[i] = (y[i] - y[0]) * cosine - (x[i] - x[0]) * sine;
            }
            return new Turned(degrees, Lines.of(along), Lines.of(across));
        }

        /** Whether the centres lie in lines as well as with another turn: that they are written with few digits is allowed. */
        boolean fitsLike(Turned other) {
            return columns.places.length == other.columns.places.length
                    && rows.places.length == other.rows.places.length
                    && Math.max(columns.spread, rows.spread) <= 2 * Math.max(other.columns.spread, other.rows.spread);
        }

        Grid grid(double[] edgesX, double[] edgesY, double x, double y) {
            double cosine = Math.cos(Math.toRadians(degrees));
            double sine = Math.sin(Math.toRadians(degrees));
            double cornerX = x + edgesX[0] * cosine - edgesY[0] * sine;
            double cornerY = y + edgesX[0] * sine + edgesY[0] * cosine;
            double near = 3 * Math.max(columns.spread, rows.spread);
            return new Grid(axis(cornerX, edgesX, near), axis(cornerY, edgesY, near), degrees, 1);
        }
    }

    /** Edges from a corner on: evenly spaced where the widths differ by rounding alone. */
    private static Axis axis(double corner, double[] edges, double near) {
        int count = edges.length - 1;
        double step = (edges[count] - edges[0]) / count;
        boolean even = true;
        double[] placed = new double[edges.length];
        for (int i = 0; i <= count; i++) {
            placed[i] = corner + edges[i] - edges[0];
            even &= i == 0 || Math.abs(edges[i] - edges[i - 1] - step) <= 1e-3 * step;
        }
        return even
                ? Axis.even(round(near + 1e-7 * step, corner)[0], round(near / count + 1e-9 * step, step)[0], count)
                : Axis.of(round(near + 1e-7 * step, placed));
    }

    /** {@return numbers with as few decimals as leave each near to what it was} */
    private static double[] round(double near, double... values) {
        for (int decimals = 0; decimals < 9; decimals++) {
            int kept = decimals;
            double[] rounder =
                    Arrays.stream(values).map(value -> rounded(value, kept)).toArray();
            boolean fits = true;
            for (int i = 0; i < values.length; i++) {
                fits &= Math.abs(rounder[i] - values[i]) <= near;
            }
            if (fits) {
                return rounder;
            }
        }
        return Arrays.stream(values).map(Numbers::clean).toArray();
    }

    /** {@return the turn of the grid in radians, from −45° to 45°} */
    private static double turn(double[] x, double[] y) {
        int nearest = 1;
        for (int i = 1; i < x.length; i++) {
            double distance = distance(x, y, i);
            boolean nearer = distance < distance(x, y, nearest);
            nearest = distance > 0 && (nearer || distance(x, y, nearest) == 0) ? i : nearest;
        }
        double first = quarter(Math.atan2(y[nearest] - y[0], x[nearest] - x[0]));
        double width = distance(x, y, nearest);
        double refined = refined(x, y, first, width);
        return Math.abs(Math.toDegrees(refined)) < LEAST_TURN ? 0 : refined;
    }

    /** The farthest cell of the same row or column tells the turn most exactly. */
    private static double refined(double[] x, double[] y, double turn, double width) {
        double best = turn;
        double farthest = 0;
        for (int pass = 0; pass < 3; pass++) {
            for (int i = 1; i < x.length; i++) {
                double angle = quarter(Math.atan2(y[i] - y[0], x[i] - x[0]));
                double distance = distance(x, y, i);
                double off = Math.abs(quarter(angle - best)) * distance;
                if (distance > farthest && off < width / 4) {
                    farthest = distance;
                    best = angle;
                }
            }
            farthest = 0;
        }
        return best;
    }

    private static double distance(double[] x, double[] y, int i) {
        return Math.hypot(x[i] - x[0], y[i] - y[0]);
    }

    private static double quarter(double angle) {
        double turned = angle % (Math.PI / 2);
        return turned > Math.PI / 4 ? turned - Math.PI / 2 : turned < -Math.PI / 4 ? turned + Math.PI / 2 : turned;
    }

    /**
     * Lines in which centres lie.
     *
     * @param places where, those of one line as their mean
     * @param spread how far a centre lies from its line at most
     */
    private record Lines(double[] places, double spread) {

        static Lines of(double[] distances) {
            double[] sorted = distances.clone();
            Arrays.sort(sorted);
            double gap = widestGap(sorted);
            double[] places = new double[sorted.length];
            double spread = 0;
            int count = 0;
            int begin = 0;
            for (int i = 1; i <= sorted.length; i++) {
                if (i == sorted.length || sorted[i] - sorted[i - 1] > SAME * gap) {
                    double mean = Arrays.stream(sorted, begin, i).sum() / (i - begin);
                    spread = Math.max(spread, Math.max(mean - sorted[begin], sorted[i - 1] - mean));
                    places[count++] = mean;
                    begin = i;
                }
            }
            return new Lines(Arrays.copyOf(places, count), spread);
        }
    }

    private static double widestGap(double[] sorted) {
        double widest = 0;
        for (int i = 1; i < sorted.length; i++) {
            widest = Math.max(widest, sorted[i] - sorted[i - 1]);
        }
        return widest;
    }

    /** Where all distances are multiples of the least one, rows without any cell are put in. */
    private static double[] filled(double[] centres) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 1; i < centres.length; i++) {
            least = Math.min(least, centres[i] - centres[i - 1]);
        }
        double span = centres[centres.length - 1] - centres[0];
        int steps = (int) Math.rint(span / least);
        double step = span / steps;
        for (double centre : centres) {
            double place = (centre - centres[0]) / step;
            if (Math.abs(place - Math.rint(place)) > MULTIPLE) {
                return centres;
            }
        }
        double[] all = new double[steps + 1];
        for (int i = 0; i <= steps; i++) {
            all[i] = centres[0] + i * step;
        }
        return all;
    }

    private static Optional<double[]> edges(double[] centres) {
        int count = centres.length;
        double[] offset = new double[count];
        int[] sign = new int[count];
        sign[0] = 1;
        for (int i = 1; i < count; i++) {
            offset[i] = 2 * (centres[i] - centres[i - 1]) - offset[i - 1];
            sign[i] = -sign[i - 1];
        }
        double[] equal = new double[count - 1];
        for (int i = 0; i < count - 1; i++) {
            equal[i] = sign[i] * (centres[i + 1] - centres[i] - offset[i]);
        }
        Arrays.sort(equal);
        double first = equal[equal.length / 2];
        double[] edges = new double[count + 1];
        edges[0] = centres[0] - first / 2;
        for (int i = 0; i < count; i++) {
            double width = offset[i] + sign[i] * first;
            if (!(width > 0)) {
                return Optional.empty();
            }
            edges[i + 1] = edges[i] + width;
        }
        return Optional.of(edges);
    }
}
