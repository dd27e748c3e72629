package org.seepledger.sketch;

import java.util.List;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.MultiPolygon;
import org.locationtech.jts.geom.Polygon;

/** Parts as the geometry library sees them. */
final class PlanShape {

    static final GeometryFactory FACTORY = new GeometryFactory();

    private PlanShape() {}

    static MultiPolygon of(List<Part> parts) {
        return FACTORY.createMultiPolygon(parts.stream().map(PlanShape::polygon).toArray(Polygon[]::new));
    }

    static Polygon polygon(Part part) {
        LinearRing[] islands = part.islands().stream().map(PlanShape::ring).toArray(LinearRing[]::new);
        return FACTORY.createPolygon(ring(part.outer()), islands);
    }

    private static LinearRing ring(Outline outline) {
        return FACTORY.createLinearRing(outline.closed());
    }
}
