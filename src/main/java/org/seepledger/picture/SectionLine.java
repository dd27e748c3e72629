package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import org.locationtech.jts.algorithm.InteriorPoint;
import org.locationtech.jts.algorithm.MinimumDiameter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.seepledger.aquifer.Grid;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;

/**
 * The line that a vertical section follows: one leg or several, from A to A′. Distances along it are in plan units.
 *
 * @param places where it begins, bends and ends, none the same as the one before
 */
public record SectionLine(List<Place> places) {

    private static final double BEYOND = 0.12;
    private static final GeometryFactory FACTORY = new GeometryFactory();

    /**
     * Drops places that repeat the one before.
     *
     * @throws Refusal if fewer than two are left
     */
    public SectionLine {
        List<Place> kept = new ArrayList<>();
        for (Place place : places) {
            if (kept.isEmpty() || !kept.get(kept.size() - 1).equals(place)) {
                kept.add(place);
            }
        }
        if (kept.size() < 2) {
            throw new Refusal("A section line begins at one place and ends at another.");
        }
        places = List.copyOf(kept);
    }

    /**
     * A straight part of the line.
     *
     * @param begin how far along the line it begins
     * @param from where it begins
     * @param to where it ends
     */
    record Leg(double begin, Place from, Place to) {

        double length() {
            return from.distance(to);
        }

        Place at(double share) {
            return new Place(from.x() + share * (to.x() - from.x()), from.y() + share * (to.y() - from.y()));
        }

        double nearest(Place place) {
            return begin + from.distance(place.nearestOn(from, to));
        }
    }

    /**
     * {@return the straight line along the longer side of the smallest rectangle round a prism's first part, through a place inside
     * it, from west to east, a little beyond the prism as far as the grid reaches}
     *
     * @param prism the prism
     * @param grid the grid
     */
    public static SectionLine through(Prism prism, Grid grid) {
        Polygon part = polygon(prism);
        Coordinate inside = InteriorPoint.getInteriorPoint(part);
        Coordinate[] box = MinimumDiameter.getMinimumRectangle(part).getCoordinates();
        int longer = box[0].distance(box[1]) >= box[1].distance(box[2]) ? 0 : 1;
        double length = box[longer].distance(box[longer + 1]);
        double sign = Math.signum(box[longer + 1].x - box[longer].x + 1e-12 * length);
        double alongX = sign * (box[longer + 1].x - box[longer].x) / length;
        double alongY = sign * (box[longer + 1].y - box[longer].y) / length;
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        for (Coordinate vertex : part.getExteriorRing().getCoordinates()) {
            double along = (vertex.x - inside.x) * alongX + (vertex.y - inside.y) * alongY;
            least = Math.min(least, along);
            greatest = Math.max(greatest, along);
        }
        double more = BEYOND * (greatest - least);
        Place from = new Place(inside.x + (least - more) * alongX, inside.y + (least - more) * alongY);
        Place to = new Place(inside.x + (greatest + more) * alongX, inside.y + (greatest + more) * alongY);
        return within(grid, new Leg(0, from, to));
    }

    private static Polygon polygon(Prism prism) {
        LinearRing[] rings =
                prism.parts().get(0).stream().map(SectionLine::line).toArray(LinearRing[]::new);
        return FACTORY.createPolygon(rings[0], Arrays.copyOfRange(rings, 1, rings.length));
    }

    private static LinearRing line(Ring ring) {
        Coordinate[] closed = new Coordinate[ring.sides().size() + 1];
        for (int i = 0; i < closed.length; i++) {
            closed[i] = new Coordinate(
                    ring.sides().get(i % ring.sides().size()).x(),
                    ring.sides().get(i % ring.sides().size()).y());
        }
        return FACTORY.createLinearRing(closed);
    }

    /** {@return how long it is} */
    public double length() {
        return legs().stream().mapToDouble(Leg::length).sum();
    }

    /**
     * {@return a place on it; its ends beyond them}
     *
     * @param along how far along the line
     */
    public Place at(double along) {
        Leg leg = legs().get(0);
        for (Leg next : legs()) {
            leg = next.begin() <= along ? next : leg;
        }
        return leg.at(Math.max(0, Math.min(1, (along - leg.begin()) / leg.length())));
    }

    /**
     * {@return how far along the line a place is nearest to it}
     *
     * @param place the place
     */
    public double nearest(Place place) {
        double nearest = 0;
        for (Leg leg : legs()) {
            double along = leg.nearest(place);
            nearest = at(along).distance(place) < at(nearest).distance(place) ? along : nearest;
        }
        return nearest;
    }

    /** {@return the same line from its end to its beginning} */
    public SectionLine turned() {
        List<Place> back = new ArrayList<>(places);
        Collections.reverse(back);
        return new SectionLine(back);
    }

    List<Leg> legs() {
        List<Leg> legs = new ArrayList<>();
        double begin = 0;
        for (int i = 0; i + 1 < places.size(); i++) {
            Leg leg = new Leg(begin, places.get(i), places.get(i + 1));
            legs.add(leg);
            begin += leg.length();
        }
        return legs;
    }

    /** The part of a leg that lies on the grid; all of it where none does. */
    private static SectionLine within(Grid grid, Leg leg) {
        double[] span = {0, 1};
        double startX = grid.localX(leg.from().x(), leg.from().y());
        double startY = grid.localY(leg.from().x(), leg.from().y());
        clip(
                span,
                startX,
                grid.localX(leg.to().x(), leg.to().y()) - startX,
                grid.x().edge(grid.columns()));
        clip(
                span,
                startY,
                grid.localY(leg.to().x(), leg.to().y()) - startY,
                grid.y().edge(grid.rows()));
        return span[0] < span[1]
                ? new SectionLine(List.of(leg.at(span[0]), leg.at(span[1])))
                : new SectionLine(List.of(leg.from(), leg.to()));
    }

    private static void clip(double[] span, double start, double way, double end) {
        if (way != 0) {
            span[0] = Math.max(span[0], Math.min(-start / way, (end - start) / way));
            span[1] = Math.min(span[1], Math.max(-start / way, (end - start) / way));
        }
    }
}
