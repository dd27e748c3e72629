package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.algorithm.LineIntersector;
import org.locationtech.jts.algorithm.RobustLineIntersector;
import org.locationtech.jts.geom.Coordinate;

/**
 * Finds where a shape crosses itself, quickly enough to be shown while a vertex is dragged.
 *
 * <p>Sides are taken in the order of their least x, and each is held against those that it may still reach. Reported are
 * sides of one ring that meet elsewhere than where one ends and the next begins, and sides of two rings that cross or run
 * along each other. Rings that touch at a single place are let be, as in files; one that passes through another exactly
 * at a vertex, or lies where it should not, is a matter of {@link Shape#flaw()}.
 */
public final class Crossings {

    private final List<Crossing> found = new ArrayList<>();
    private final LineIntersector intersector = new RobustLineIntersector();

    private Crossings() {}

    /**
     * {@return where a shape crosses itself, in no order that means anything}
     *
     * @param shape the shape
     */
    public static List<Crossing> of(Shape shape) {
        Crossings crossings = new Crossings();
        List<Edge> edges = edges(shape);
        edges.sort(Comparator.comparingDouble(Edge::west));
        List<Edge> active = new ArrayList<>();
        for (Edge edge : edges) {
            active.removeIf(other -> other.east() < edge.west());
            active.forEach(other -> crossings.meet(other, edge));
            active.add(edge);
        }
        return List.copyOf(crossings.found);
    }

    private static List<Edge> edges(Shape shape) {
        List<Edge> edges = new ArrayList<>();
        shape.outlines().forEach((ring, outline) -> {
            Coordinate[] closed = outline.closed();
            for (int side = 0; side < outline.size(); side++) {
                edges.add(new Edge(ring, side, outline.size(), closed[side], closed[side + 1]));
            }
        });
        return edges;
    }

    private void meet(Edge one, Edge other) {
        if (one.north() >= other.south() && other.north() >= one.south()) {
            intersector.computeIntersection(one.from(), one.to(), other.from(), other.to());
            fault(one, other)
                    .ifPresent(place -> found.add(
                            new Crossing(one.ring(), one.side(), other.ring(), other.side(), Place.of(place))));
        }
    }

    private Optional<Coordinate> fault(Edge one, Edge other) {
        boolean along = intersector.getIntersectionNum() == 2;
        boolean sameRing = one.ring().equals(other.ring());
        boolean wrong = sameRing
                ? intersector.hasIntersection() && (along || !one.isNextTo(other))
                : along || intersector.isProper();
        return wrong ? Optional.of(intersector.getIntersection(0)) : Optional.empty();
    }

    private record Edge(RingAt ring, int side, int sides, Coordinate from, Coordinate to) {

        double west() {
            return Math.min(from.x, to.x);
        }

        double east() {
            return Math.max(from.x, to.x);
        }

        double south() {
            return Math.min(from.y, to.y);
        }

        double north() {
            return Math.max(from.y, to.y);
        }

        boolean isNextTo(Edge other) {
            return (side + 1) % sides == other.side || (other.side + 1) % sides == side;
        }
    }
}
