package org.seepledger.prism;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.locationtech.jts.algorithm.Area;
import org.locationtech.jts.algorithm.RayCrossingCounter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Location;
import org.seepledger.aquifer.Grid;

/** Cuts one part of a prism, an outer ring and its islands, at the grid's edge; see {@link GridEdge}. */
final class PartClip {

    /** A side's piece within the edge. */
    private record Cut(Side side, Vertex begin, Vertex end) {}

    private final Grid grid;
    private final Perimeter perimeter;
    private final int part;
    private final List<List<Vertex>> given = new ArrayList<>();
    private final List<Ring> whole = new ArrayList<>();
    private final List<Chain> chains = new ArrayList<>();
    /** The order in which the sides were given, by name. */
    private final Map<String, Integer> order = new HashMap<>();

    PartClip(Grid grid, Perimeter perimeter, int part) {
        this.grid = grid;
        this.perimeter = perimeter;
        this.part = part;
    }

    /** Takes a ring and the places where its sides begin. */
    void add(Ring ring, List<Vertex> vertices) {
        given.add(vertices);
        ring.sides().forEach(side -> order.putIfAbsent(side.name(), order.size()));
        List<Optional<Cut>> cuts = cuts(ring, vertices);
        int count = cuts.size();
        int begin = 0;
        while (begin < count && follows(cuts, vertices, begin)) {
            begin++;
        }
        if (begin == count) {
            whole.add(ring);
            return;
        }
        List<Cut> run = new ArrayList<>();
        for (int i = begin; i < begin + count; i++) {
            if (!follows(cuts, vertices, i % count)) {
                finish(run);
                run = new ArrayList<>();
            }
            cuts.get(i % count).ifPresent(run::add);
        }
        finish(run);
    }

    private List<Optional<Cut>> cuts(Ring ring, List<Vertex> vertices) {
        List<Optional<Cut>> cuts = new ArrayList<>();
        for (int i = 0; i < vertices.size(); i++) {
            Vertex from = vertices.get(i);
            Vertex to = vertices.get((i + 1) % vertices.size());
            Side side = ring.sides().get(i);
            cuts.add(perimeter.piece(from, to).map(piece -> cut(side, from, to, piece)));
        }
        return cuts;
    }

    private Cut cut(Side side, Vertex from, Vertex to, Perimeter.Piece piece) {
        Vertex begin = end(from, piece.fromX(), piece.fromY());
        Vertex end = end(to, piece.toX(), piece.toY());
        return new Cut(new Side(side.name(), side.item(), begin.mapX(), begin.mapY()), begin, end);
    }

    /** An end of a piece: the side's own vertex where that is within the edge. */
    private Vertex end(Vertex own, double x, double y) {
        return own.x() == x && own.y() == y ? own : Vertex.at(x, y, grid);
    }

    /** Whether a side's piece goes on, at the vertex where the side begins, from that of the side before. */
    private static boolean follows(List<Optional<Cut>> cuts, List<Vertex> vertices, int index) {
        Vertex vertex = vertices.get(index);
        Optional<Cut> before = cuts.get((index + cuts.size() - 1) % cuts.size());
        return before.filter(cut -> cut.end().isAt(vertex)).isPresent()
                && cuts.get(index).filter(cut -> cut.begin().isAt(vertex)).isPresent();
    }

    private void finish(List<Cut> run) {
        if (!run.isEmpty()) {
            Cut first = run.get(0);
            Cut last = run.get(run.size() - 1);
            List<Side> sides = run.stream().map(Cut::side).toList();
            chains.add(new Chain(sides, first.begin(), first.end(), last.begin(), last.end()));
        }
    }

    /** {@return the outer rings that are left, each followed by its islands} */
    List<Ring> rings() {
        List<Ring> all = new ArrayList<>(whole);
        EdgeWalk walk = new EdgeWalk(grid, perimeter);
        if (!chains.isEmpty()) {
            walk.link(chains).stream()
                    .map(this::fromFirst)
                    .sorted(Comparator.comparingInt(sides -> rank(sides.get(0))))
                    .forEach(sides -> all.add(new Ring(part, 0, sides)));
        } else if (holdsGrid()) {
            all.add(new Ring(part, 0, walk.round()));
        }
        return nested(all);
    }

    /** The ring turned so that it begins with the side that was given first. */
    private List<Side> fromFirst(List<Side> sides) {
        int first = IntStream.range(0, sides.size())
                .boxed()
                .min(Comparator.comparingInt(i -> rank(sides.get(i))))
                .orElseThrow();
        List<Side> turned = new ArrayList<>(sides);
        Collections.rotate(turned, -first);
        return turned;
    }

    private int rank(Side side) {
        return order.getOrDefault(side.name(), Integer.MAX_VALUE);
    }

    /** Whether the whole grid lies within a part whose sides do not cross the edge: any place on the edge tells. */
    private boolean holdsGrid() {
        double[] across = {0, perimeter.width() / 2, perimeter.width()};
        double[] up = {0, perimeter.height() / 2, perimeter.height()};
        for (int i = 0; i < 9; i++) {
            boolean centre = i == 4;
            int location = centre ? Location.BOUNDARY : locate(new Coordinate(across[i / 3], up[i % 3]));
            if (location != Location.BOUNDARY) {
                return location == Location.INTERIOR;
            }
        }
        return false;
    }

    private int locate(Coordinate place) {
        RayCrossingCounter counter = new RayCrossingCounter(place);
        for (List<Vertex> ring : given) {
            for (int i = 0; i < ring.size(); i++) {
                Vertex next = ring.get((i + 1) % ring.size());
                counter.countSegment(ring.get(i).local(), next.local());
            }
        }
        return counter.getLocation();
    }

    private static List<Ring> nested(List<Ring> rings) {
        List<Ring> outer = new ArrayList<>();
        List<Ring> islands = new ArrayList<>();
        for (Ring ring : rings) {
            boolean clockwise = Area.ofRingSigned(Footprint.closed(ring)) > 0;
            (clockwise ? islands : outer).add(ring);
        }
        List<Ring> nested = new ArrayList<>();
        for (Ring ring : outer) {
            nested.add(ring);
            Coordinate[] boundary = Footprint.closed(ring);
            islands.stream().filter(island -> isIn(island, boundary)).forEach(nested::add);
        }
        return nested;
    }

    private static boolean isIn(Ring island, Coordinate[] outer) {
        for (Side side : island.sides()) {
            int location = RayCrossingCounter.locatePointInRing(new Coordinate(side.x(), side.y()), outer);
            if (location != Location.BOUNDARY) {
                return location == Location.INTERIOR;
            }
        }
        return false;
    }
}
