package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.seepledger.picture.Mark.Stroke;

/**
 * The outline of the cells with more than a threshold: along cell edges, so that what it encloses is the very area that is
 * counted. Cells that meet at a corner alone are apart.
 *
 * @param rings map x and y in turn, each closed without repeating its first place; holes are rings of their own
 */
public record ThresholdOutline(List<double[]> rings) {

    private static final double WIDTH = 1.8;
    private static final double RIM = 4.2;

    /** Copies the list. */
    public ThresholdOutline {
        rings = List.copyOf(rings);
    }

    /**
     * {@return the outline of the cells with more than a threshold}
     *
     * @param drape the values; a cell without one is not above
     * @param threshold the threshold, in the values' unit
     */
    public static ThresholdOutline of(Drape drape, double threshold) {
        return new ThresholdOutline(new Walk(drape, threshold).rings());
    }

    /**
     * {@return the outline as marks, the lowermost first}
     *
     * @param frame where map coordinates come to
     */
    public List<Mark> marks(MapFrame frame) {
        if (rings.isEmpty()) {
            return List.of();
        }
        List<double[]> drawn = rings.stream().map(frame::drawn).toList();
        return List.of(outline(drawn, Stroke.of(Ink.Token.PAPER, RIM)), outline(drawn, stroke()));
    }

    /** {@return how the outline is drawn, for a key} */
    public static Stroke stroke() {
        return Stroke.of(Ink.Token.PLUME, WIDTH);
    }

    private static Mark outline(List<double[]> rings, Stroke stroke) {
        return new Mark.Area(rings, Optional.empty(), Optional.of(stroke));
    }

    /** Walks along the edges between cells above and others, with the cells above on its right, north up. */
    private static final class Walk {

        private static final int EAST = 0;
        private static final int SOUTH = 1;
        private static final int WEST = 2;
        private static final int NORTH = 3;

        private final Drape drape;
        private final double threshold;
        private final boolean[][][] edges;

        Walk(Drape drape, double threshold) {
            this.drape = drape;
            this.threshold = threshold;
            this.edges = new boolean[drape.rows() + 1][drape.columns() + 1][4];
        }

        List<double[]> rings() {
            for (int i = 0; i < drape.rows(); i++) {
                for (int j = 0; j < drape.columns(); j++) {
                    if (above(i, j)) {
                        edges[i][j][EAST] = !above(i - 1, j);
                        edges[i][j + 1][SOUTH] = !above(i, j + 1);
                        edges[i + 1][j + 1][WEST] = !above(i + 1, j);
                        edges[i + 1][j][NORTH] = !above(i, j - 1);
                    }
                }
            }
            // Each ring has an edge eastward, and the first of it in this order begins at a corner.
            List<double[]> rings = new ArrayList<>();
            for (int i = 0; i < edges.length; i++) {
                for (int j = 0; j < edges[i].length; j++) {
                    if (edges[i][j][EAST]) {
                        rings.add(ring(i, j));
                    }
                }
            }
            return rings;
        }

        private boolean above(int i, int j) {
            boolean inside = i >= 0 && j >= 0 && i < drape.rows() && j < drape.columns();
            return inside && drape.value(i, j) > threshold;
        }

        private double[] ring(int startRow, int startColumn) {
            List<double[]> corners = new ArrayList<>();
            int i = startRow;
            int j = startColumn;
            int way = NORTH;
            do {
                int next = turn(edges[i][j], way);
                if (next != way) {
                    corners.add(drape.corner(i, j));
                }
                edges[i][j][next] = false;
                way = next;
                i += way == SOUTH ? 1 : way == NORTH ? -1 : 0;
                j += way == EAST ? 1 : way == WEST ? -1 : 0;
            } while (i != startRow || j != startColumn);
            return corners.stream().flatMapToDouble(Arrays::stream).toArray();
        }

        /** Right where that is possible, which keeps to one cell at a corner where two meet. */
        private static int turn(boolean[] edges, int way) {
            int right = (way + 1) % 4;
            return edges[right] ? right : edges[way] ? way : (way + 3) % 4;
        }
    }
}
