package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.locationtech.jts.algorithm.locate.SimplePointInAreaLocator;

/** Looks for what lies under the pointer. */
final class HitSearch {

    private final List<Shape> shapes;
    private final Place pointer;

    private record Found(Hit hit, double distance) {}

    HitSearch(Drawing drawing, Place pointer, Optional<String> preferred) {
        this.shapes = new ArrayList<>(drawing.shapes());
        this.pointer = pointer;
        Collections.reverse(shapes);
        shapes.sort(Comparator.comparing(shape -> !preferred.equals(Optional.of(shape.name()))));
    }

    Optional<Hit> nearest(Nearness nearness) {
        return nearest(shapes.stream().flatMap(this::vertices), nearness.vertex())
                .or(() -> nearest(shapes.stream().flatMap(this::sides), nearness.edge()))
                .or(() -> shapes.stream().flatMap(this::bodies).findFirst());
    }

    /** Of several equally near, the first. */
    private static Optional<Hit> nearest(Stream<Found> all, double radius) {
        return all.filter(found -> found.distance() <= radius)
                .min(Comparator.comparingDouble(Found::distance))
                .map(Found::hit);
    }

    private Stream<Found> vertices(Shape shape) {
        return shape.outlines().entrySet().stream()
                .flatMap(ring -> IntStream.range(0, ring.getValue().size())
                        .mapToObj(i -> new Found(
                                new Hit.Vertex(ring.getKey(), i),
                                ring.getValue().place(i).distance(pointer))));
    }

    private Stream<Found> sides(Shape shape) {
        return shape.outlines().entrySet().stream()
                .flatMap(ring -> IntStream.range(0, ring.getValue().size())
                        .mapToObj(i -> side(ring.getKey(), ring.getValue(), i)));
    }

    private Found side(RingAt ring, Outline outline, int side) {
        Place place = pointer.nearestOn(outline.place(side), outline.place(side + 1));
        return new Found(new Hit.Side(ring, side, place), place.distance(pointer));
    }

    private Stream<Hit> bodies(Shape shape) {
        return IntStream.rangeClosed(1, shape.parts().size())
                .filter(part -> SimplePointInAreaLocator.isContained(
                        pointer.coordinate(), PlanShape.polygon(shape.parts().get(part - 1))))
                .mapToObj(part -> new Hit.Body(shape.name(), part));
    }
}
