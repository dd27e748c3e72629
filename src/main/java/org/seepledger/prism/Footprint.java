package org.seepledger.prism;

import java.util.List;
import org.locationtech.jts.algorithm.Area;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.MultiPolygon;
import org.locationtech.jts.geom.Polygon;

/** A prism in plan as the geometry library sees it. */
final class Footprint {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    private Footprint() {}

    /** {@return the plan area in plan units squared, islands taken out} */
    static double area(Prism prism) {
        return prism.rings().stream()
                .mapToDouble(ring -> -Area.ofRingSigned(closed(ring)))
                .sum();
    }

    /** {@return the polygons in map coordinates} */
    static MultiPolygon of(Prism prism) {
        Polygon[] polygons = prism.parts().stream().map(Footprint::polygon).toArray(Polygon[]::new);
        return FACTORY.createMultiPolygon(polygons);
    }

    private static Polygon polygon(List<Ring> part) {
        List<LinearRing> rings = part.stream()
                .map(ring -> FACTORY.createLinearRing(closed(ring)))
                .toList();
        LinearRing[] islands = rings.stream().skip(1).toArray(LinearRing[]::new);
        return FACTORY.createPolygon(rings.get(0), islands);
    }

    /** {@return the vertices in map coordinates, and the first again} */
    static Coordinate[] closed(Ring ring) {
        int count = ring.sides().size();
        Coordinate[] vertices = new Coordinate[count + 1];
        for (int i = 0; i <= count; i++) {
            Side side = ring.sides().get(i % count);
            vertices[i] = new Coordinate(side.x(), side.y());
        }
        return vertices;
    }
}
