package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.buffer.BufferOp;

/**
 * All that lies within a radius of something, by the buffers of JTS.
 *
 * <p>Round bends are drawn with vertices on the true circle, {@value #PER_QUARTER} steps to a quarter turn, so that the
 * area falls short of the round one by at most 0.2 %. Round a single place, a well, use {@link Figure#circle}, which keeps the
 * area.
 */
public final class Buffer {

    private static final int PER_QUARTER = 16;

    private Buffer() {}

    /**
     * {@return the parts of all that lies within a radius of a line, a river say, or of the only place of one}
     *
     * @param line at least one place
     * @param radius in plan units
     * @throws Refusal if the radius is not positive
     */
    public static List<Part> round(List<Place> line, double radius) {
        Figure.checkRadius(radius);
        if (line.stream().distinct().count() == 1) {
            return List.of(Part.of(Figure.circle(line.get(0), radius, 4 * PER_QUARTER)));
        }
        Coordinate[] places = line.stream().map(Place::coordinate).toArray(Coordinate[]::new);
        return parts(PlanShape.FACTORY.createLineString(places), radius);
    }

    /**
     * {@return the parts of a shape grown by a radius on all sides, or made smaller}
     *
     * @param shape the shape
     * @param radius in plan units; below 0 to make it smaller
     * @throws Refusal if it crosses itself, the radius is 0, or nothing would be left
     */
    public static List<Part> of(Shape shape, double radius) {
        Figure.checkRadius(Math.abs(radius));
        List<Part> parts = parts(PlanShape.of(shape.sound().parts()), radius);
        if (parts.isEmpty()) {
            throw new Refusal("Nothing would be left of the prism; choose a smaller distance.");
        }
        return parts;
    }

    private static List<Part> parts(Geometry geometry, double radius) {
        Geometry buffer = BufferOp.bufferOp(geometry, radius, PER_QUARTER);
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < buffer.getNumGeometries(); i++) {
            if (buffer.getGeometryN(i) instanceof Polygon polygon && !polygon.isEmpty()) {
                List<Outline> islands = IntStream.range(0, polygon.getNumInteriorRing())
                        .mapToObj(polygon::getInteriorRingN)
                        .map(Buffer::outline)
                        .toList();
                parts.add(new Part(outline(polygon.getExteriorRing()), islands));
            }
        }
        return parts;
    }

    private static Outline outline(LinearRing ring) {
        Coordinate[] closed = ring.getCoordinates();
        return Outline.through(IntStream.range(0, closed.length - 1)
                .mapToObj(i -> Place.of(closed[i]))
                .toList());
    }
}
