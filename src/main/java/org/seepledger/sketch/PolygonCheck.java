package org.seepledger.sketch;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.locationtech.jts.operation.valid.IsValidOp;
import org.locationtech.jts.operation.valid.TopologyValidationError;

/**
 * Finds what makes rings no polygon: looks first at each ring by itself, then at the rings of a part against each other,
 * then at the parts, so that the flaw can say which.
 */
public final class PolygonCheck {

    private static final String REMEDY = "Correct the polygon there.";

    private PolygonCheck() {}

    /**
     * {@return the first flaw found, or nothing where the parts are polygons}
     *
     * @param parts the rings of each part, the outer one first; closed, no vertex repeated
     */
    public static Optional<Flaw> first(List<List<Coordinate[]>> parts) {
        Polygon[] polygons = new Polygon[parts.size()];
        for (int part = 1; part <= parts.size(); part++) {
            List<Coordinate[]> rings = parts.get(part - 1);
            for (int island = 0; island < rings.size(); island++) {
                Optional<Flaw> flaw = ofRing(rings.get(island), part, island);
                if (flaw.isPresent()) {
                    return flaw;
                }
            }
            polygons[part - 1] = polygon(rings);
            TopologyValidationError error = new IsValidOp(polygons[part - 1]).getValidationError();
            if (error != null) {
                return Optional.of(ofPart(error, part));
            }
        }
        TopologyValidationError error =
                new IsValidOp(PlanShape.FACTORY.createMultiPolygon(polygons)).getValidationError();
        return Optional.ofNullable(error)
                .map(TopologyValidationError::getCoordinate)
                .map(place -> between(polygons, place));
    }

    private static Polygon polygon(List<Coordinate[]> rings) {
        LinearRing[] islands =
                rings.stream().skip(1).map(PlanShape.FACTORY::createLinearRing).toArray(LinearRing[]::new);
        return PlanShape.FACTORY.createPolygon(PlanShape.FACTORY.createLinearRing(rings.get(0)), islands);
    }

    private static Optional<Flaw> ofRing(Coordinate[] closed, int part, int island) {
        if (isFlat(closed)) {
            return Optional.of(new Flaw(
                    part, island, "a ring without area", Place.of(closed[0]), "a ring that encloses an area", REMEDY));
        }
        TopologyValidationError error = new IsValidOp(PlanShape.FACTORY.createPolygon(closed)).getValidationError();
        return Optional.ofNullable(error)
                .map(found -> new Flaw(
                        part,
                        island,
                        "a ring that crosses or touches itself",
                        Place.of(found.getCoordinate()),
                        "a ring whose sides meet only where one ends and the next begins",
                        "Take out the loop or spike there, or make the loop a part or an island of its own."));
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

    private static Flaw ofPart(TopologyValidationError error, int part) {
        String found = switch (error.getErrorType()) {
            case TopologyValidationError.HOLE_OUTSIDE_SHELL -> "an island outside the outer ring";
            case TopologyValidationError.NESTED_HOLES -> "an island within another";
            case TopologyValidationError.DISCONNECTED_INTERIOR -> "islands that cut the polygon in two";
            default -> "rings that cross, or touch along a line,";
        };
        return new Flaw(
                part,
                Flaw.NO_RING,
                found,
                Place.of(error.getCoordinate()),
                "islands inside the outer ring and apart from each other, touching at single places at most",
                REMEDY);
    }

    private static Flaw between(Polygon[] parts, Coordinate place) {
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
                    String how = common.getDimension() == 2 ? " that overlap" : " that touch along a line";
                    return apart("parts " + (one + 1) + " and " + (other + 1) + how, common.getCoordinate());
                }
            }
        }
        return apart("parts that cross or touch along a line", place);
    }

    private static Flaw apart(String found, Coordinate place) {
        return new Flaw(
                Flaw.NO_PART,
                Flaw.NO_RING,
                found,
                Place.of(place),
                "parts that are apart or touch at single places",
                "Merge the parts or make them prisms of their own.");
    }
}
