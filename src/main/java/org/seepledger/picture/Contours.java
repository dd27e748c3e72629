package org.seepledger.picture;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/**
 * Lines of equal value between the middles of cells.
 *
 * <p>Each square of four neighbouring values is crossed as linear interpolation along its edges says; a saddle is
 * resolved by the mean of the four (marching squares). Where one of the four has no value there is no line. The pieces are
 * joined into lines as long as they go, and rounded by cutting corners twice (Chaikin 1974), which moves no place by more than
 * a quarter of a cell.
 */
public final class Contours {

    private static final int CUTS = 2;

    private final Drape drape;
    private final double level;
    private final Map<Long, List<long[]>> pieces = new HashMap<>();
    private final Map<Long, double[]> places = new HashMap<>();

    private Contours(Drape drape, double level) {
        this.drape = drape;
        this.level = level;
    }

    /**
     * {@return the lines of a level, each as map x and y in turn; a closed one ends where it begins}
     *
     * @param drape the values
     * @param level the level
     */
    public static List<double[]> at(Drape drape, double level) {
        return new Contours(drape, level).lines();
    }

    private List<double[]> lines() {
        for (int i = 0; i + 1 < drape.rows(); i++) {
            for (int j = 0; j + 1 < drape.columns(); j++) {
                cross(i, j);
            }
        }
        List<double[]> lines = new ArrayList<>();
        for (Long start : new TreeSet<>(pieces.keySet())) {
            while (!pieces.getOrDefault(start, List.of()).isEmpty()) {
                lines.add(rounded(follow(start)));
            }
        }
        return lines;
    }

    /** The edge of a square: across from value (i, j) to its right neighbour, or down to its lower one. */
    private long edge(int i, int j, boolean down) {
        return 2L * ((long) i * drape.columns() + j) + (down ? 1 : 0);
    }

    private void cross(int i, int j) {
        double a = drape.value(i, j) - level;
        double b = drape.value(i, j + 1) - level;
        double c = drape.value(i + 1, j + 1) - level;
        double d = drape.value(i + 1, j) - level;
        if (!Double.isFinite(a + b + c + d)) {
            return;
        }
        List<Long> met = new ArrayList<>(4);
        meet(met, a, b, i, j, false);
        meet(met, b, c, i, j + 1, true);
        meet(met, d, c, i + 1, j, false);
        meet(met, a, d, i, j, true);
        if (met.size() == 2) {
            join(met.get(0), met.get(1));
        } else if (met.size() == 4) {
            boolean cornersAlone = a > 0 != a + b + c + d > 0;
            join(met.get(0), met.get(cornersAlone ? 3 : 1));
            join(met.get(2), met.get(cornersAlone ? 1 : 3));
        }
    }

    private void meet(List<Long> met, double from, double to, int i, int j, boolean down) {
        if (from > 0 == to > 0) {
            return;
        }
        double part = from / (from - to);
        double x = drape.localX(j) + (down ? 0 : part * (drape.localX(j + 1) - drape.localX(j)));
        double y = drape.localY(i) + (down ? part * (drape.localY(i + 1) - drape.localY(i)) : 0);
        long edge = edge(i, j, down);
        places.put(edge, new double[] {drape.grid().mapX(x, y), drape.grid().mapY(x, y)});
        met.add(edge);
    }

    private void join(long one, long other) {
        long[] piece = {one, other};
        pieces.computeIfAbsent(one, edge -> new ArrayList<>(2)).add(piece);
        pieces.computeIfAbsent(other, edge -> new ArrayList<>(2)).add(piece);
    }

    /** The line through an edge, both ways from it. */
    private List<Long> follow(long start) {
        Deque<Long> line = new ArrayDeque<>(List.of(start));
        boolean more = true;
        while (more) {
            more = next(line.getLast()).map(line::add).orElse(false);
        }
        more = true;
        while (more) {
            more = next(line.getFirst()).map(line::offerFirst).orElse(false);
        }
        return List.copyOf(line);
    }

    private Optional<Long> next(long edge) {
        List<long[]> left = pieces.get(edge);
        if (left.isEmpty()) {
            return Optional.empty();
        }
        long[] piece = left.get(0);
        long beyond = piece[0] == edge ? piece[1] : piece[0];
        left.remove(piece);
        pieces.get(beyond).remove(piece);
        return Optional.of(beyond);
    }

    private double[] rounded(List<Long> edges) {
        double[] line = new double[2 * edges.size()];
        for (int i = 0; i < edges.size(); i++) {
            System.arraycopy(places.get(edges.get(i)), 0, line, 2 * i, 2);
        }
        boolean closed = edges.size() > 2 && edges.get(0).equals(edges.get(edges.size() - 1));
        for (int cut = 0; cut < CUTS; cut++) {
            line = cut(line, closed);
        }
        return line;
    }

    /** Cuts each corner at a quarter of its two sides; the ends of an open line stay. */
    private static double[] cut(double[] line, boolean closed) {
        int sides = line.length / 2 - 1;
        double[] cut = new double[4 * sides + (closed ? 2 : 4)];
        int at = 0;
        if (!closed) {
            cut[at++] = line[0];
            cut[at++] = line[1];
        }
        for (int side = 0; side < sides; side++) {
            for (double part : new double[] {0.25, 0.75}) {
                cut[at++] = line[2 * side] + part * (line[2 * side + 2] - line[2 * side]);
                cut[at++] = line[2 * side + 1] + part * (line[2 * side + 3] - line[2 * side + 1]);
            }
        }
        cut[at++] = closed ? cut[0] : line[2 * sides];
        cut[at] = closed ? cut[1] : line[2 * sides + 1];
        return cut;
    }
}
