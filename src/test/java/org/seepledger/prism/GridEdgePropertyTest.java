package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.util.PolygonExtracter;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Random polygons against the intersection that JTS 1.20.0 (OverlayNG) finds by another way. */
class GridEdgePropertyTest {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    @Property(tries = 400)
    void starsWithIslands(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        double rotation = seed % 3 == 0 ? 0 : random.nextDouble() * 360;
        Grid grid = new Grid(Axis.even(500_000, 10, 12), Axis.even(5_200_000, 8, 10), rotation, 1);
        double x = random.nextDouble() * 160 - 20;
        double y = random.nextDouble() * 120 - 20;
        Coordinate outer = new Coordinate(grid.mapX(x, y), grid.mapY(x, y));
        Polygon star = FACTORY.createPolygon(
                ring(star(outer, 30, 90, random)), new LinearRing[] {ring(star(outer, 4, 20, random))});
        assertClip(star, grid);
    }

    @Property(tries = 400)
    void shapesOfWholeCellsWhoseSidesLieAlongTheEdge(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Grid grid = new Grid(Axis.even(1_000, 1, 4), Axis.even(2_000, 1, 3), 0, 1);
        List<Geometry> squares = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            for (int j = 0; j < 7; j++) {
                if (random.nextInt(100) < 62) {
                    squares.add(square(998 + i, 1_998 + j));
                }
            }
        }
        Geometry union = FACTORY.buildGeometry(squares).union();
        for (int i = 0; i < union.getNumGeometries(); i++) {
            assertClip((Polygon) union.getGeometryN(i), grid);
        }
    }

    private static void assertClip(Polygon polygon, Grid grid) {
        Prism whole = prism(polygon);
        GridEdge edge = GridEdge.of(grid);
        Prism left = edge.clip(whole);
        Geometry common = OverlayNGRobust.overlay(polygon, rectangle(grid), OverlayNG.INTERSECTION);
        Geometry expected = FACTORY.buildGeometry(PolygonExtracter.getPolygons(common));
        assertThat(polygon.isValid()).isTrue();
        double gridArea = rectangle(grid).getArea();
        assertThat(Footprint.area(left)).isEqualTo(expected.getArea(), within(1e-9 * gridArea));
        assertThat(edge.holds(left)).isTrue();
        Geometry apart = OverlayNGRobust.overlay(Footprint.of(left).buffer(0), expected, OverlayNG.SYMDIFFERENCE);
        assertThat(apart.getArea()).isLessThan(1e-6 * gridArea);
        left.rings().forEach(ring -> assertSides(ring, whole, grid));
        if (edge.holds(whole)) {
            assertThat(left).isEqualTo(whole);
        }
    }

    private static void assertSides(Ring ring, Prism whole, Grid grid) {
        Set<Coordinate> vertices = new HashSet<>();
        whole.rings().forEach(given -> vertices.addAll(List.of(Footprint.closed(given))));
        LinearRing boundary =
                FACTORY.createLinearRing(rectangle(grid).getExteriorRing().getCoordinates());
        for (int i = 0; i < ring.sides().size(); i++) {
            Side side = ring.sides().get(i);
            Coordinate from = new Coordinate(side.x(), side.y());
            Coordinate to = new Coordinate(ring.after(i).x(), ring.after(i).y());
            boolean onEdge = boundary.distance(FACTORY.createPoint(from)) < 1e-8;
            assertThat(onEdge || vertices.contains(from)).isTrue();
            if (side.name().equals(Prism.GRID_EDGE)) {
                assertThat(boundary.distance(FACTORY.createPoint(to))).isLessThan(1e-8);
                assertThat(side.item()).isEqualTo(Prism.GRID_EDGE);
            } else {
                assertOn(whole, side.name(), from, to);
            }
        }
    }

    private static void assertOn(Prism whole, String name, Coordinate from, Coordinate to) {
        for (Ring ring : whole.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Side side = ring.sides().get(i);
                if (side.name().equals(name)) {
                    Coordinate begin = new Coordinate(side.x(), side.y());
                    Coordinate end =
                            new Coordinate(ring.after(i).x(), ring.after(i).y());
                    assertThat(Distance.pointToSegment(from, begin, end)).isLessThan(1e-8);
                    assertThat(Distance.pointToSegment(to, begin, end)).isLessThan(1e-8);
                    assertThat(begin.distance(from)).isLessThanOrEqualTo(begin.distance(to));
                    return;
                }
            }
        }
        throw new AssertionError("no side " + name);
    }

    private static Prism prism(Polygon polygon) {
        SideNumbering numbering = new SideNumbering(false);
        List<Ring> rings = new ArrayList<>();
        rings.add(numbering.number(1, 0, polygon.getExteriorRing().getCoordinates()));
        for (int i = 0; i < polygon.getNumInteriorRing(); i++) {
            rings.add(numbering.number(1, i + 1, polygon.getInteriorRingN(i).getCoordinates()));
        }
        return new Prism("A", rings, new VerticalRange.Layers(0, 0));
    }

    private static Polygon rectangle(Grid grid) {
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        double[][] corners = {{0, 0}, {width, 0}, {width, height}, {0, height}, {0, 0}};
        Coordinate[] closed = new Coordinate[5];
        for (int i = 0; i < 5; i++) {
            closed[i] =
                    new Coordinate(grid.mapX(corners[i][0], corners[i][1]), grid.mapY(corners[i][0], corners[i][1]));
        }
        return FACTORY.createPolygon(closed);
    }

    private static Polygon square(double x, double y) {
        return (Polygon) FACTORY.toGeometry(new Envelope(x, x + 1, y, y + 1));
    }

    private static LinearRing ring(Coordinate[] closed) {
        return FACTORY.createLinearRing(closed);
    }

    /** A ring that goes once round a centre at random distances. */
    private static Coordinate[] star(Coordinate centre, double nearest, double farthest, Random random) {
        int count = 8 + random.nextInt(12);
        Coordinate[] closed = new Coordinate[count + 1];
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * (i + 0.8 * random.nextDouble()) / count;
            double distance = nearest + random.nextDouble() * (farthest - nearest);
            closed[i] = new Coordinate(centre.x + distance * Math.cos(angle), centre.y + distance * Math.sin(angle));
        }
        closed[count] = closed[0];
        return closed;
    }
}
