package org.seepledger.prism;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Grid;

/**
 * The prism that comes of taking each cell whole that a prism covers by half or more, as tools do that know cells alone.
 * Each of its sides counts under the item of the side that it lies nearest to.
 */
public final class WholeCells {

    private static final double HALF = 0.5;
    private static final int[][] CORNERS = {{0, 0}, {1, 0}, {1, 1}, {0, 1}};
    private static final int[][] BEYOND = {{0, -1}, {1, 0}, {0, 1}, {-1, 0}};

    private final PrismCut cut;
    private final Grid grid;

    private WholeCells(PrismCut cut, Grid grid) {
        this.cut = cut;
        this.grid = grid;
    }

    /** A corner of cells: column edge and row edge, the latter from the south. */
    private record Corner(int east, int north) {}

    /** An edge of a cell, the cell on its left; {@code turn} tells its direction, from 0 for east, counter-clockwise. */
    private record Edge(Corner from, Corner to, int turn) {}

    /**
     * {@return the prism of whole cells; empty where no cell is covered by half}
     *
     * @param cut how a prism cuts the grid
     * @param grid the grid
     */
    public static Optional<Prism> of(PrismCut cut, Grid grid) {
        return new WholeCells(cut, grid).prism();
    }

    private Optional<Prism> prism() {
        List<List<Edge>> loops = loops();
        List<List<Edge>> outer = loops.stream().filter(loop -> area(loop) > 0).toList();
        List<List<Edge>> inner = loops.stream().filter(loop -> area(loop) < 0).toList();
        List<Ring> rings = new ArrayList<>();
        for (int part = 1; part <= outer.size(); part++) {
            List<Edge> around = outer.get(part - 1);
            rings.add(ring(part, 0, around));
            int island = 0;
            for (List<Edge> hole : inner) {
                if (holds(around, hole.get(0))) {
                    island++;
                    rings.add(ring(part, island, hole));
                }
            }
        }
        return rings.isEmpty()
                ? Optional.empty()
                : Optional.of(new Prism(cut.prism().name(), rings, cut.prism().range()));
    }

    private boolean taken(int column, int north) {
        int row = grid.rows() - 1 - north;
        return column >= 0
                && column < grid.columns()
                && row >= 0
                && row < grid.rows()
                && cut.coverage().share(row, column) >= HALF;
    }

    private Map<Corner, Deque<Edge>> edges() {
        Map<Corner, Deque<Edge>> edges = new HashMap<>();
        int south = grid.rows() - cut.coverage().window().rowEnd();
        int north = grid.rows() - cut.coverage().window().row();
        for (int up = south; up < north; up++) {
            for (int column = 0; column < grid.columns(); column++) {
                if (taken(column, up)) {
                    addEdges(edges, column, up);
                }
            }
        }
        return edges;
    }

    private void addEdges(Map<Corner, Deque<Edge>> edges, int column, int up) {
        for (int turn = 0; turn < CORNERS.length; turn++) {
            if (!taken(column + BEYOND[turn][0], up + BEYOND[turn][1])) {
                int[] begin = CORNERS[turn];
                int[] end = CORNERS[(turn + 1) % CORNERS.length];
                Corner from = new Corner(column + begin[0], up + begin[1]);
                Corner to = new Corner(column + end[0], up + end[1]);
                edges.computeIfAbsent(from, any -> new ArrayDeque<>()).add(new Edge(from, to, turn));
            }
        }
    }

    private List<List<Edge>> loops() {
        Map<Corner, Deque<Edge>> edges = edges();
        List<List<Edge>> loops = new ArrayList<>();
        for (Corner corner : List.copyOf(edges.keySet()).stream()
                .sorted(java.util.Comparator.comparingInt(Corner::north).thenComparingInt(Corner::east))
                .toList()) {
            while (!edges.get(corner).isEmpty()) {
                loops.add(loop(edges, edges.get(corner).poll()));
            }
        }
        return loops;
    }

    /** Walks on, turning left where cells touch at a corner only, so that they become rings of their own. */
    private static List<Edge> loop(Map<Corner, Deque<Edge>> edges, Edge first) {
        List<Edge> loop = new ArrayList<>(List.of(first));
        Edge at = first;
        while (!at.to().equals(first.from())) {
            int turn = at.turn();
            Deque<Edge> ways = edges.get(at.to());
            Edge next = ways.stream()
                    .filter(way -> way.turn() == (turn + 1) % CORNERS.length)
                    .findFirst()
                    .orElseGet(ways::peek);
            ways.remove(next);
            loop.add(next);
            at = next;
        }
        return loop;
    }

    private static long area(List<Edge> loop) {
        return loop.stream()
                .mapToLong(edge -> (long) edge.from().east() * edge.to().north()
                        - (long) edge.to().east() * edge.from().north())
                .sum();
    }

    /** Whether a loop goes round an edge: a ray to the east from its middle crosses it an odd number of times. */
    private static boolean holds(List<Edge> loop, Edge edge) {
        double east = (edge.from().east() + edge.to().east()) / 2.0;
        double north = (edge.from().north() + edge.to().north()) / 2.0 + 0.25;
        long crossings = loop.stream()
                .filter(other ->
                        other.from().east() == other.to().east() && other.from().east() > east)
                .filter(other -> Math.min(other.from().north(), other.to().north()) < north
                        && north < Math.max(other.from().north(), other.to().north()))
                .count();
        return crossings % 2 == 1;
    }

    /** The ring of a loop; edges in line that count under the same item are one side. */
    private Ring ring(int part, int island, List<Edge> loop) {
        List<Side> sides = new ArrayList<>();
        String before = "";
        int turn = -1;
        for (Edge edge : loop) {
            String item = item(edge);
            if (edge.turn() != turn || !item.equals(before)) {
                String name = "whole cells " + part + " " + island + " " + (sides.size() + 1);
                sides.add(new Side(name, item, x(edge.from()), y(edge.from())));
            }
            before = item;
            turn = edge.turn();
        }
        return new Ring(part, island, sides);
    }

    private double x(Corner corner) {
        return grid.mapX(grid.x().edge(corner.east()), grid.y().edge(corner.north()));
    }

    private double y(Corner corner) {
        return grid.mapY(grid.x().edge(corner.east()), grid.y().edge(corner.north()));
    }

    private String item(Edge edge) {
        double x = (x(edge.from()) + x(edge.to())) / 2;
        double y = (y(edge.from()) + y(edge.to())) / 2;
        String nearest = "";
        double least = Double.POSITIVE_INFINITY;
        for (Ring ring : cut.prism().rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side side = ring.sides().get(i);
                double distance = distance(side, ring.after(i), x, y);
                if (distance < least) {
                    least = distance;
                    nearest = side.item();
                }
            }
        }
        return nearest;
    }

    private static double distance(Side from, Side to, double x, double y) {
        double dx = to.x() - from.x();
        double dy = to.y() - from.y();
        double along = ((x - from.x()) * dx + (y - from.y()) * dy) / (dx * dx + dy * dy);
        double kept = Math.max(0, Math.min(1, along));
        return Math.hypot(from.x() + kept * dx - x, from.y() + kept * dy - y);
    }
}
