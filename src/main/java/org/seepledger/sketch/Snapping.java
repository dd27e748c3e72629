package org.seepledger.sketch;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.seepledger.aquifer.Grid;

/**
 * What the pointer can be held by: vertices and sides of a drawing, lines and corners of a grid.
 *
 * <p>A target takes hold within the capture distance: a vertex before a grid corner, a corner before a side, a side before
 * a grid line, and of one kind the nearest. It holds on until the pointer is farther than the release distance, or a
 * stronger kind comes within capture, or another of its kind that is nearer by as much as release is beyond capture.
 * What was held is given with each move, so that this class keeps no state. To suspend snapping, ask for no kinds.
 *
 * <p>A vertex or corner gives its coordinates to the last bit, as a side gives its ends; along a side the nearest place
 * is off it by no more than rounding. Upright and level grid lines give their coordinate to the last bit.
 */
public final class Snapping {

    private final List<Place> vertices;
    private final List<Link> sides;
    private final Optional<Grid> grid;

    private Snapping(List<Place> vertices, List<Link> sides, Optional<Grid> grid) {
        this.vertices = vertices;
        this.sides = sides;
        this.grid = grid;
    }

    /**
     * {@return the targets of a drawing and a grid}
     *
     * @param drawing the drawing as it is before the gesture
     * @param grid the grid, if its lines and corners are targets
     */
    public static Snapping to(Drawing drawing, Optional<Grid> grid) {
        return of(drawing.outlines(), Optional.empty(), grid);
    }

    /**
     * {@return the targets while a vertex is moved: not itself and its two sides}
     *
     * @param drawing the drawing as it is before the gesture
     * @param ring the vertex's ring
     * @param vertex its number there, from 0
     * @param grid the grid, if its lines and corners are targets
     */
    public static Snapping toOthersThan(Drawing drawing, RingAt ring, int vertex, Optional<Grid> grid) {
        return of(drawing.outlines(), Optional.of(new Hit.Vertex(ring, vertex)), grid);
    }

    private static Snapping of(Map<RingAt, Outline> outlines, Optional<Hit.Vertex> moved, Optional<Grid> grid) {
        List<Place> vertices = outlines.entrySet().stream()
                .flatMap(ring -> IntStream.range(0, ring.getValue().size())
                        .filter(i -> !moved.equals(Optional.of(new Hit.Vertex(ring.getKey(), i))))
                        .mapToObj(ring.getValue()::place))
                .toList();
        List<Link> sides = outlines.entrySet().stream()
                .flatMap(ring -> IntStream.range(0, ring.getValue().size())
                        .filter(i -> moved.filter(vertex -> isEndOf(vertex, ring.getKey(), ring.getValue(), i))
                                .isEmpty())
                        .mapToObj(i -> new Link(
                                ring.getValue().place(i), ring.getValue().place(i + 1), Optional.empty())))
                .toList();
        return new Snapping(vertices, sides, grid);
    }

    private static boolean isEndOf(Hit.Vertex vertex, RingAt ring, Outline outline, int side) {
        return vertex.ring().equals(ring)
                && (vertex.vertex() == side || vertex.vertex() == (side + 1) % outline.size());
    }

    /**
     * {@return what holds the pointer, if anything does}
     *
     * @param pointer the place that it points to
     * @param nearness how near counts
     * @param kinds the kinds of target that may hold it
     * @param held what held it before in the same gesture
     */
    public Optional<Snap> at(Place pointer, Nearness nearness, Set<Snap.Kind> kinds, Optional<Snap> held) {
        Optional<Snap> captured = kinds.stream()
                .sorted()
                .flatMap(kind -> nearest(candidates(kind, pointer), pointer, nearness.capture()).stream())
                .findFirst();
        Optional<Snap> kept = held.filter(snap -> kinds.contains(snap.kind()))
                .flatMap(snap -> nearest(Stream.of(snap.follow(pointer)), pointer, nearness.release()));
        if (kept.isEmpty() || captured.isEmpty()) {
            return kept.or(() -> captured);
        }
        return takesOver(captured.get(), kept.get(), pointer, nearness) ? captured : kept;
    }

    private static boolean takesOver(Snap captured, Snap kept, Place pointer, Nearness nearness) {
        if (captured.kind() != kept.kind()) {
            return captured.kind().compareTo(kept.kind()) < 0;
        }
        double ahead = kept.place().distance(pointer) - captured.place().distance(pointer);
        return ahead >= nearness.release() - nearness.capture() && !captured.hasTargetOf(kept);
    }

    private static Optional<Snap> nearest(Stream<Snap> candidates, Place pointer, double radius) {
        return candidates
                .filter(snap -> snap.place().distance(pointer) <= radius)
                .min(Comparator.comparingDouble(snap -> snap.place().distance(pointer)));
    }

    private Stream<Snap> candidates(Snap.Kind kind, Place pointer) {
        return switch (kind) {
            case VERTEX -> vertices.stream().map(vertex -> Snap.point(kind, vertex));
            case EDGE -> sides.stream().map(side -> Snap.line(kind, pointer, side.from(), side.to()));
            case GRID_CORNER -> grid.stream().flatMap(lines -> new GridSnaps(lines, pointer).corners());
            case GRID_LINE -> grid.stream().flatMap(lines -> new GridSnaps(lines, pointer).lines());
        };
    }
}
