package org.seepledger.picture;

import java.util.Arrays;
import org.locationtech.jts.algorithm.InteriorPoint;
import org.locationtech.jts.algorithm.MinimumDiameter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.seepledger.aquifer.Grid;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;

/**
 * The straight line that a vertical section follows.
 *
 * @param fromX the map x of its beginning
 * @param fromY the map y of its beginning
 * @param toX the map x of its end
 * @param toY the map y of its end
 */
public record SectionLine(double fromX, double fromY, double toX, double toY) {

    private static final double BEYOND = 0.12;
    private static final GeometryFactory FACTORY = new GeometryFactory();

    /**
     * {@return the line along the longer side of the smallest rectangle round a prism's first part, through a place inside
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
        return new SectionLine(
                        inside.x + (least - more) * alongX,
                        inside.y + (least - more) * alongY,
                        inside.x + (greatest + more) * alongX,
                        inside.y + (greatest + more) * alongY)
                .within(grid);
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

    /** {@return the map x at a share of the way, from 0 to 1} */
    double x(double share) {
        return fromX + share * (toX - fromX);
    }

    /** {@return the map y at a share of the way, from 0 to 1} */
    double y(double share) {
        return fromY + share * (toY - fromY);
    }

    /** {@return how long it is, in plan units} */
    double length() {
        return Math.hypot(toX - fromX, toY - fromY);
    }

    /** The part of the line that lies on the grid. */
    private SectionLine within(Grid grid) {
        double[] span = {0, 1};
        double startX = grid.localX(fromX, fromY);
        double startY = grid.localY(fromX, fromY);
        clip(span, startX, grid.localX(toX, toY) - startX, grid.x().edge(grid.columns()));
        clip(span, startY, grid.localY(toX, toY) - startY, grid.y().edge(grid.rows()));
        return new SectionLine(x(span[0]), y(span[0]), x(span[1]), y(span[1]));
    }

    private static void clip(double[] span, double start, double way, double end) {
        if (way != 0) {
            span[0] = Math.max(span[0], Math.min(-start / way, (end - start) / way));
            span[1] = Math.min(span[1], Math.max(-start / way, (end - start) / way));
        }
    }
}
