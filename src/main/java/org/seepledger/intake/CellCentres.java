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

    /** Centres nearer to each other than this share of the least distance are one; tables are rounded. */
    private static final double SAME = 0.02;

    /** A turn below this, in degrees, is rounding. */
    private static final double LEAST_TURN = 1e-4;

    private CellCentres() {}

    /** {@return the grid; empty if the places are not those of a grid's cells} */
    static Optional<Grid> grid(double[] x, double[] y) {
        if (x.length < 4) {
            return Optional.empty();
        }
        double turn = turn(x, y);
        double cosine = Math.cos(turn);
        double sine = Math.sin(turn);
        double[] along = new double[x.length];
        double[] across = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            along[i] = (x[i] - x[0]) * cosine + (y[i] - y[0]) * sine;
            across[i] = (y[i] - y[0]) * cosine - (x[i] - x[0]) * sine;
        }
        double[] columns = apart(along);
        double[] rows = apart(across);
        boolean filled = (double) columns.length * rows.length <= 40.0 * x.length;
        if (columns.length < 2 || rows.length < 2 || !filled) {
            return Optional.empty();
        }
        Optional<double[]> edgesX = edges(filled(columns));
        Optional<double[]> edgesY = edges(filled(rows));
        return edgesX.isEmpty() || edgesY.isEmpty()
                ? Optional.empty()
                : Optional.of(grid(edgesX.get(), edgesY.get(), x[0], y[0], turn));
    }

    private static Grid grid(double[] edgesX, double[] edgesY, double x, double y, double turn) {
        double cosine = Math.cos(turn);
        double sine = Math.sin(turn);
        double cornerX = x + edgesX[0] * cosine - edgesY[0] * sine;
        double cornerY = y + edgesX[0] * sine + edgesY[0] * cosine;
        double degrees = Math.toDegrees(turn);
        return new Grid(axis(cornerX, edgesX), axis(cornerY, edgesY), Numbers.clean(degrees), 1);
    }

    /** Edges from a corner on: evenly spaced where the widths differ by rounding alone. */
    private static Axis axis(double corner, double[] edges) {
        int count = edges.length - 1;
        double step = (edges[count] - edges[0]) / count;
        boolean even = true;
        for (int i = 0; i < count; i++) {
            even &= Math.abs(edges[i + 1] - edges[i] - step) <= 1e-3 * step;
        }
        double from = tidy(corner, step);
        if (even) {
            return Axis.even(from, tidy(step, step), count);
        }
        double[] placed = new double[edges.length];
        for (int i = 0; i < edges.length; i++) {
            placed[i] = tidy(from + edges[i] - edges[0], step);
        }
        return Axis.of(placed);
    }

    /** Centres are written with few digits, so that edges worked out from them are rounded to a millionth of a step. */
    private static double tidy(double value, double step) {
        double unit = Math.pow(10, Math.floor(Math.log10(step)) - 5);
        return Numbers.clean(Math.rint(value / unit) * unit);
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

    /** {@return the different distances, those of one row or column as their mean} */
    private static double[] apart(double[] distances) {
        double[] sorted = distances.clone();
        Arrays.sort(sorted);
        double span = sorted[sorted.length - 1] - sorted[0];
        double gap = typicalGap(sorted, span);
        double[] different = new double[sorted.length];
        int count = 0;
        int begin = 0;
        for (int i = 1; i <= sorted.length; i++) {
            if (i == sorted.length || sorted[i] - sorted[i - 1] > SAME * gap) {
                different[count++] = Arrays.stream(sorted, begin, i).sum() / (i - begin);
                begin = i;
            }
        }
        return Arrays.copyOf(different, count);
    }

    /** {@return the least distance that is more than rounding} */
    private static double typicalGap(double[] sorted, double span) {
        double[] gaps = new double[sorted.length];
        int count = 0;
        for (int i = 1; i < sorted.length; i++) {
            double gap = sorted[i] - sorted[i - 1];
            if (gap > 1e-5 * span) {
                gaps[count++] = gap;
            }
        }
        return count == 0 ? span : Arrays.stream(gaps, 0, count).max().orElse(span) / 10;
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
            if (Math.abs(place - Math.rint(place)) > SAME) {
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
