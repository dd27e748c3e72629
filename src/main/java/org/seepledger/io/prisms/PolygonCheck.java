package org.seepledger.io.prisms;

import java.util.List;
import java.util.stream.IntStream;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.locationtech.jts.operation.valid.IsValidOp;
import org.locationtech.jts.operation.valid.TopologyValidationError;
import org.seepledger.fault.DataFault;

/**
 * Refuses what is no polygon: first each ring by itself, then the rings of a part against each other, then the parts, so
 * that the message can say which.
 */
final class PolygonCheck {

    private static final GeometryFactory FACTORY = new GeometryFactory();
    private static final String REMEDY = "Correct the polygon there.";

    private final RingNames names;
    private final Spot spot;
    private final String coordinates;

    /**
     * Checks one prism.
     *
     * @param names what its rings are called
     * @param spot where it stands
     * @param coordinates what is said behind a place, if it is not as in the file
     */
    PolygonCheck(RingNames names, Spot spot, String coordinates) {
        this.names = names;
        this.spot = spot;
        this.coordinates = coordinates;
    }

    /**
     * Checks the parts of a shape.
     *
     * @param parts the rings of each part, the outer one first; closed, no vertex repeated
     */
    void check(List<List<Coordinate[]>> parts) {
        Polygon[] polygons = new Polygon[parts.size()];
        for (int part = 1; part <= parts.size(); part++) {
            polygons[part - 1] = part(parts.get(part - 1), part);
        }
        TopologyValidationError error = new IsValidOp(FACTORY.createMultiPolygon(polygons)).getValidationError();
        if (error != null) {
            throw partsFault(polygons, error.getCoordinate());
        }
    }

    private Polygon part(List<Coordinate[]> rings, int part) {
        for (int i = 0; i < rings.size(); i++) {
            ring(rings.get(i), spot.in(names.of(part, i)));
        }
        LinearRing[] islands =
                rings.stream().skip(1).map(FACTORY::createLinearRing).toArray(LinearRing[]::new);
        Polygon polygon = FACTORY.createPolygon(FACTORY.createLinearRing(rings.get(0)), islands);
        TopologyValidationError error = new IsValidOp(polygon).getValidationError();
        if (error != null) {
            throw partFault(error, part);
        }
        return polygon;
    }

    private void ring(Coordinate[] closed, Spot ring) {
        if (isFlat(closed)) {
            throw ring.fault("a ring without area at " + at(closed[0]), "a ring that encloses an area", REMEDY);
        }
        Polygon alone = FACTORY.createPolygon(closed);
        TopologyValidationError error = new IsValidOp(alone).getValidationError();
        if (error != null) {
            throw ring.fault(
                    "a ring that crosses or touches itself at " + at(error.getCoordinate()),
                    "a ring whose sides meet only where one ends and the next begins",
                    "Take out the loop or spike there, or make the loop a part or an island of its own.");
        }
    }

    private static boolean isFlat(Coordinate[] closed) {
        int far = 1;
        for (int i = 2; i < closed.length; i++) {
            if (Orientation.index(closed[0], closed[far], closed[i]) != Orientation.COLLINEAR) {
                return false;
            }
        }
        return true;
    }

    private DataFault partFault(TopologyValidationError error, int part) {
        String where = at(error.getCoordinate());
        String found = switch (error.getErrorType()) {
            case TopologyValidationError.HOLE_OUTSIDE_SHELL -> "an island outside the outer ring at ";
            case TopologyValidationError.NESTED_HOLES -> "an island within another at ";
            case TopologyValidationError.DISCONNECTED_INTERIOR -> "islands that cut the polygon in two at ";
            default -> "rings that cross, or touch along a line, at ";
        };
        String prefix = names.numbering().ring(part, 0);
        return spot.in(prefix)
                .fault(
                        found + where,
                        "islands inside the outer ring and apart from each other, touching at single places at most",
                        REMEDY);
    }

    private DataFault partsFault(Polygon[] parts, Coordinate place) {
        List<Integer> there = IntStream.range(0, parts.length)
                .filter(i -> parts[i].getEnvelopeInternal().intersects(place))
                .boxed()
                .toList();
        for (int i = 0; i < there.size(); i++) {
            for (int j = i + 1; j < there.size(); j++) {
                int one = there.get(i);
                int other = there.get(j);
                Geometry common = OverlayNGRobust.overlay(parts[one], parts[other], OverlayNG.INTERSECTION);
                if (common.getDimension() > 0) {
                    String how = common.getDimension() == 2 ? " that overlap at " : " that touch along a line at ";
                    return apart("parts " + (one + 1) + " and " + (other + 1) + how + at(common.getCoordinate()));
                }
            }
        }
        return apart("parts that cross or touch along a line at " + at(place));
    }

    private DataFault apart(String found) {
        return spot.fault(
                found,
                "parts that are apart or touch at single places",
                "Merge the parts or make them prisms of their own.");
    }

    private String at(Coordinate place) {
        return Spot.point(place.x, place.y) + coordinates;
    }
}
