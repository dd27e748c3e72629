package org.seepledger.prism;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.seepledger.aquifer.Grid;

/** The plan area that two prisms have in common, as shares of cells. */
public final class PlanOverlap {

    /** Common areas below this share of a cell are rounding. */
    private static final double SLIVER = 1e-9;

    private PlanOverlap() {}

    /**
     * {@return the shares of cells that both prisms cover; empty where they do not overlap}
     *
     * @param one the one
     * @param other the other
     * @param grid the grid that both are cut by
     */
    public static Optional<Coverage> of(PrismCut one, PrismCut other, Grid grid) {
        Geometry common =
                OverlayNGRobust.overlay(Footprint.of(one.prism()), Footprint.of(other.prism()), OverlayNG.INTERSECTION);
        double sliver = SLIVER * (grid.x().smallest() * grid.y().smallest());
        List<Ring> rings = new ArrayList<>();
        for (int i = 0; i < common.getNumGeometries(); i++) {
            if (common.getGeometryN(i) instanceof Polygon polygon && polygon.getArea() > sliver) {
                rings.add(ring(polygon.getExteriorRing(), true));
                for (int island = 0; island < polygon.getNumInteriorRing(); island++) {
                    rings.add(ring(polygon.getInteriorRingN(island), false));
                }
            }
        }
        return rings.isEmpty()
                ? Optional.empty()
                : Optional.of(PrismCut.of(new Prism("common", rings, one.prism().range()), grid)
                        .coverage());
    }

    private static Ring ring(LinearRing line, boolean outer) {
        boolean turned = Orientation.isCCW(line.getCoordinateSequence()) != outer;
        Coordinate[] vertices = (turned ? line.reverse() : line).getCoordinates();
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < vertices.length - 1; i++) {
            sides.add(new Side("", "", vertices[i].x, vertices[i].y));
        }
        return new Ring(1, outer ? 0 : 1, sides);
    }
}
