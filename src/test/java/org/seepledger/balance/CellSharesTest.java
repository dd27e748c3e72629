package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Coverage;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.Side;

/** Shares of cells against intersections that JTS 1.20.0 makes cell by cell, and against the shoelace formula. */
class CellSharesTest {

    private static final GeometryFactory FACTORY = new GeometryFactory();

    @Property(tries = 150)
    void agreeWithTheIntersectionsThatJtsMakes(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Prism prism = random.prism("a");
        Grid grid = random.grid;
        Coverage coverage = PrismCut.of(prism, grid).coverage();
        Geometry shape = local(prism, grid);
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                Polygon cell = cell(grid, row, column);
                double expected = shape.intersection(cell).getArea() / cell.getArea();
                assertThat(coverage.share(row, column)).isEqualTo(expected, within(1e-8));
                if (!coverage.isCut(row, column)) {
                    assertThat(coverage.share(row, column)).isIn(0.0, 1.0);
                }
            }
        }
    }

    @Property(tries = 300)
    void addUpToTheShoelaceArea(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Grid grid = random.grid;
        Prism prism = random.prism("a");
        Coverage coverage = PrismCut.of(prism, grid).coverage();
        double covered = 0;
        double touched = 0;
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                double share = coverage.share(row, column);
                covered += share * grid.area(row, column);
                touched += share == 0 ? 0 : grid.area(row, column);
            }
        }
        assertThat(covered).isEqualTo(shoelace(prism, grid), within(1e-12 * touched));
    }

    @Test
    void aMillionCellsAddUpToo() {
        Grid grid = new Grid(Axis.even(0, 100 / 3.0, 1000), Axis.even(0, 0.7, 1000), 0, 1);
        double width = grid.x().edge(1000);
        double height = grid.y().edge(1000);
        PrismCut cut = PrismCut.of(Prisms.of("all", 0, 0, Shapes.box(0, 0, width, height)), grid);
        assertThat(cut.area()).isCloseTo(width * height, within(1e-12 * width * height));
        assertThat(cut.coverage().share(999, 0)).isEqualTo(1);
        double[] round = Shapes.round(width / 2, height / 2, height / 2, 5000);
        assertThat(PrismCut.of(Prisms.of("round", 0, 0, round), grid).pieces().count())
                .isGreaterThan(5000);
    }

    @Test
    void anIslandIsTakenOutAndPartsStandApart() {
        Grid grid = new Grid(Axis.even(0, 1, 8), Axis.even(0, 1, 8), 0, 1);
        List<Ring> rings = List.of(
                Prisms.ring(1, 0, Shapes.box(0, 0, 4, 4)),
                Prisms.ring(1, 1, Shapes.reversed(Shapes.box(1.5, 1, 3, 3))),
                Prisms.ring(2, 0, Shapes.box(6, 6.25, 8, 8)));
        Coverage coverage = PrismCut.of(Prisms.of("a", 0, 0, rings), grid).coverage();
        // Row 6 is y from 1 to 2: whole, half, none, whole.
        assertThat(shares(coverage, 6)).containsExactly(1, 0.5, 0, 1, 0, 0, 0, 0);
        assertThat(shares(coverage, 4)).containsExactly(1, 1, 1, 1, 0, 0, 0, 0);
        assertThat(shares(coverage, 2)).containsOnly(0);
        assertThat(shares(coverage, 1)).containsExactly(0, 0, 0, 0, 0, 0, 0.75, 0.75);
        assertThat(coverage.window().row()).isZero();
        assertThat(coverage.window().rowEnd()).isEqualTo(8);
        assertThat(coverage.window().column()).isZero();
        assertThat(coverage.window().columnEnd()).isEqualTo(8);
        assertThat(coverage.firstColumn(1)).isEqualTo(6);
        assertThat(coverage.columnEnd(1)).isEqualTo(8);
        assertThat(coverage.columnEnd(3)).isEqualTo(coverage.firstColumn(3));
        assertThat(coverage.isCut(6, 1)).isTrue();
        assertThat(coverage.isCut(6, 5)).isFalse();
    }

    @Test
    void outsideItsWindowThereIsNothing() {
        Grid grid = new Grid(Axis.even(0, 1, 8), Axis.even(0, 1, 8), 0, 1);
        Coverage coverage =
                PrismCut.of(Prisms.of("a", 0, 0, Shapes.box(2, 2, 4, 5)), grid).coverage();
        assertThat(coverage.window()).isEqualTo(new Window(3, 2, 3, 2));
        assertThat(coverage.share(2, 2)).isZero();
        assertThat(coverage.share(6, 2)).isZero();
        assertThat(coverage.share(3, 1)).isZero();
        assertThat(coverage.share(3, 4)).isZero();
        assertThat(coverage.share(3, 3)).isEqualTo(1);
        assertThat(coverage.isCut(2, 2)).isFalse();
        assertThat(coverage.isCut(3, 4)).isFalse();
    }

    @Test
    void aSideOnAGridLineTakesTheCellOnTheInside() {
        Grid grid = new Grid(Axis.even(0, 1, 4), Axis.even(0, 1, 4), 0, 1);
        PrismCut cut = PrismCut.of(Prisms.of("a", 0, 0, Shapes.box(1, 1, 3, 3)), grid);
        assertThat(cut.pieces().count()).isEqualTo(8);
        for (int piece = 0; piece < 8; piece++) {
            assertThat(cut.pieces().row(piece)).isBetween(1, 2);
            assertThat(cut.pieces().column(piece)).isBetween(1, 2);
        }
    }

    private static double[] shares(Coverage coverage, int row) {
        double[] shares = new double[8];
        for (int column = 0; column < 8; column++) {
            shares[column] = coverage.share(row, column);
        }
        return shares;
    }

    private static double shoelace(Prism prism, Grid grid) {
        double doubled = 0;
        for (Ring ring : prism.rings()) {
            Coordinate[] vertices = closed(ring, grid);
            for (int i = 1; i < vertices.length; i++) {
                doubled += (vertices[i - 1].x - vertices[0].x) * (vertices[i].y - vertices[0].y)
                        - (vertices[i].x - vertices[0].x) * (vertices[i - 1].y - vertices[0].y);
            }
        }
        return 0.5 * doubled;
    }

    private static Coordinate[] closed(Ring ring, Grid grid) {
        List<Coordinate> vertices = new ArrayList<>();
        for (Side side : ring.sides()) {
            vertices.add(new Coordinate(grid.snappedX(side.x(), side.y()), grid.snappedY(side.x(), side.y())));
        }
        vertices.add(vertices.get(0).copy());
        return vertices.toArray(Coordinate[]::new);
    }

    private static Geometry local(Prism prism, Grid grid) {
        List<Ring> rings = prism.rings();
        Geometry shape = FACTORY.createPolygon();
        for (int i = 0; i < rings.size(); i++) {
            if (rings.get(i).island() == 0) {
                boolean island = i + 1 < rings.size() && rings.get(i + 1).island() > 0;
                LinearRing[] islands = island
                        ? new LinearRing[] {FACTORY.createLinearRing(closed(rings.get(i + 1), grid))}
                        : new LinearRing[0];
                LinearRing outer = FACTORY.createLinearRing(closed(rings.get(i), grid));
                shape = shape.union(FACTORY.createPolygon(outer, islands));
            }
        }
        return shape;
    }

    private static Polygon cell(Grid grid, int row, int column) {
        double west = grid.x().edge(column);
        double east = grid.x().edge(column + 1);
        double south = grid.y().edge(grid.flipped(row));
        double north = grid.y().edge(grid.flipped(row) + 1);
        return (Polygon) FACTORY.toGeometry(new Envelope(west, east, south, north));
    }
}
