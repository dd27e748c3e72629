package org.seepledger.io.prisms;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.CoordinateArrays;
import org.seepledger.io.crs.PlanTransform;
import org.seepledger.sketch.Place;

/** Reads the coordinates of polygons to closed rings, as they stand in the file and as they lie on the map. */
final class RingsReader {

    private static final int MOST_VERTICES = 1_000_000;

    private final PlanTransform transform;
    private final String remedyForDegrees;
    private int vertices;

    /**
     * Reads the polygons of one file.
     *
     * @param transform from the file's coordinates to the map's
     * @param remedyForDegrees what to do about longitudes and latitudes that can be none
     */
    RingsReader(PlanTransform transform, String remedyForDegrees) {
        this.transform = transform;
        this.remedyForDegrees = remedyForDegrees;
    }

    /** {@return the rings of a polygon as in the file, the outer one first, repeated vertices dropped} */
    List<Coordinate[]> polygon(JsonNode rings, int part, RingNames names, Spot spot) {
        if (!rings.isArray() || rings.isEmpty()) {
            throw spot.fault(
                    Spot.shown(rings) + " as the rings of a polygon",
                    "an array of rings",
                    "Write the outer ring, then the islands.");
        }
        List<Coordinate[]> read = new ArrayList<>();
        for (int i = 0; i < rings.size(); i++) {
            read.add(ring(rings.get(i), spot.in(names.of(part, i))));
        }
        return read;
    }

    private Coordinate[] ring(JsonNode ring, Spot spot) {
        if (!ring.isArray()) {
            throw spot.fault(Spot.shown(ring) + " as a ring", "an array of vertices", "Correct the coordinates.");
        }
        vertices += ring.size();
        if (vertices > MOST_VERTICES) {
            throw spot.fault(
                    "more than " + MOST_VERTICES + " vertices",
                    "at most so many in a file",
                    "Simplify the polygons or split the file.");
        }
        List<Coordinate> read = new ArrayList<>(ring.size());
        for (int i = 0; i < ring.size(); i++) {
            read.add(vertex(ring.get(i), spot.in("vertex " + (i + 1))));
        }
        Coordinate[] closed = CoordinateArrays.removeRepeatedPoints(read.toArray(Coordinate[]::new));
        return checked(closed, spot);
    }

    private static Coordinate[] checked(Coordinate[] closed, Spot spot) {
        if (closed.length > 0 && !closed[0].equals2D(closed[closed.length - 1])) {
            Coordinate last = closed[closed.length - 1];
            throw spot.fault(
                    "a ring that begins at " + Place.shown(closed[0].x, closed[0].y) + " but ends at "
                            + Place.shown(last.x, last.y),
                    "a closed ring, whose last vertex is the first again",
                    "Add the first vertex at the end.");
        }
        if (closed.length < 4) {
            int distinct = Math.max(0, closed.length - 1);
            throw spot.fault(
                    distinct + " different vertices" + (closed.length == 0 ? "" : " near " + point(closed[0])),
                    "at least three",
                    "Draw the ring again or take it out.");
        }
        return closed;
    }

    private static String point(Coordinate place) {
        return Place.shown(place.x, place.y);
    }

    /** {@return a vertex as it stands in the file} */
    Coordinate vertex(JsonNode vertex, Spot spot) {
        boolean pair = vertex.isArray()
                && vertex.size() >= 2
                && vertex.get(0).isNumber()
                && vertex.get(1).isNumber();
        if (!pair) {
            throw spot.fault(Spot.shown(vertex), "two numbers, x and y", "Correct the coordinates.");
        }
        double x = vertex.get(0).doubleValue();
        double y = vertex.get(1).doubleValue();
        if (!(Math.abs(x) <= Place.FARTHEST) || !(Math.abs(y) <= Place.FARTHEST)) {
            throw spot.fault(Place.shown(x, y), "coordinates within ±" + Place.FARTHEST, "Correct the coordinates.");
        }
        if (transform.isFromDegrees() && (Math.abs(x) > 180 || Math.abs(y) > 90)) {
            throw spot.fault(
                    Place.shown(x, y) + ", which is no longitude and latitude",
                    "longitude within ±180 and latitude within ±90 degrees, in this order",
                    remedyForDegrees);
        }
        return new Coordinate(x, y);
    }

    /** {@return whether the file's coordinates are the map's} */
    boolean keepsPlaces() {
        return transform.isIdentity();
    }

    /** {@return a ring of the file in map coordinates, vertices that fall together there dropped} */
    Coordinate[] onMap(Coordinate[] ring, Spot spot) {
        if (transform.isIdentity()) {
            return ring;
        }
        Coordinate[] mapped = new Coordinate[ring.length];
        for (int i = 0; i < ring.length; i++) {
            double[] place = transform.apply(ring[i].x, ring[i].y);
            if (!(Math.abs(place[0]) <= Place.FARTHEST) || !(Math.abs(place[1]) <= Place.FARTHEST)) {
                throw spot.fault(
                        point(ring[i]) + ", which the aquifer's CRS does not reach",
                        "places in the area that the CRS is made for",
                        "Check the file's coordinates and its CRS.");
            }
            mapped[i] = new Coordinate(place[0], place[1]);
        }
        return checked(CoordinateArrays.removeRepeatedPoints(mapped), spot);
    }
}
