package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.seepledger.sketch.Drawn.box;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.sketch.Snap.Kind;

class SnappingTest {

    /** A pixel is a map unit. */
    private static final Nearness NEARNESS = Nearness.ofPixel(1);

    private static final Set<Kind> ALL = EnumSet.allOf(Kind.class);
    private static final Drawing DRAWING = Drawing.EMPTY.with(Shape.of("a", box(1003, 1004, 1150, 1160)));
    private static final Grid GRID = new Grid(Axis.of(1000, 1100, 1250), Axis.of(1000, 1100, 1300), 0, 1);

    private static Optional<Snap> snap(Drawing drawing, double x, double y) {
        return Snapping.to(drawing, Optional.of(GRID)).at(new Place(x, y), NEARNESS, ALL, Optional.empty());
    }

    private static void assertSnap(Optional<Snap> snap, Kind kind, double x, double y) {
        assertThat(snap).map(Snap::kind).contains(kind);
        assertThat(snap).map(Snap::place).contains(new Place(x, y));
    }

    @Test
    void aVertexComesBeforeACornerAndThatBeforeASideAndThatBeforeAGridLine() {
        assertSnap(snap(DRAWING, 999, 1000), Kind.VERTEX, 1003, 1004);
        assertSnap(snap(DRAWING, 1104, 1007), Kind.EDGE, 1104, 1004);
        assertSnap(snap(DRAWING, 1105, 1005), Kind.GRID_CORNER, 1100, 1000);
        assertSnap(snap(DRAWING, 1104, 1050), Kind.GRID_LINE, 1100, 1050);
        assertSnap(snap(DRAWING, 1050, 1001), Kind.EDGE, 1050, 1004);
        assertThat(snap(DRAWING, 1050, 1050)).isEmpty();
    }

    @Test
    void onlyTheKindsThatAreAskedFor() {
        Snapping snapping = Snapping.to(DRAWING, Optional.of(GRID));
        Place pointer = new Place(1003, 1004);
        Optional<Snap> vertex = snapping.at(pointer, NEARNESS, ALL, Optional.empty());
        assertThat(snapping.at(pointer, NEARNESS, Set.of(), vertex)).isEmpty();
        assertSnap(snapping.at(pointer, NEARNESS, Set.of(Kind.GRID_LINE), vertex), Kind.GRID_LINE, 1000, 1004);
        assertThat(Snapping.to(DRAWING, Optional.empty()).at(new Place(1250, 1300), NEARNESS, ALL, Optional.empty()))
                .isEmpty();
    }

    @Test
    void holdsOnUntilThePointerIsBeyondRelease() {
        Snapping snapping = Snapping.to(DRAWING, Optional.empty());
        Place corner = new Place(1150, 1160);
        assertThat(snapping.at(corner.moved(9, 0), NEARNESS, ALL, Optional.empty()))
                .isEmpty();
        Optional<Snap> held = snapping.at(corner.moved(8, 0), NEARNESS, ALL, Optional.empty());
        assertSnap(held, Kind.VERTEX, 1150, 1160);
        assertSnap(snapping.at(corner.moved(12, 0), NEARNESS, ALL, held), Kind.VERTEX, 1150, 1160);
        assertThat(snapping.at(corner.moved(12.1, 0), NEARNESS, ALL, held)).isEmpty();
    }

    @Test
    void slidesAlongASideThatHolds() {
        Snapping snapping = Snapping.to(DRAWING, Optional.of(GRID));
        Optional<Snap> held = snapping.at(new Place(1155, 1050), NEARNESS, ALL, Optional.empty());
        assertSnap(held, Kind.EDGE, 1150, 1050);
        Optional<Snap> slid = snapping.at(new Place(1161, 1070), NEARNESS, ALL, held);
        assertSnap(slid, Kind.EDGE, 1150, 1070);
        assertSnap(snapping.at(new Place(1153, 1156), NEARNESS, ALL, slid), Kind.VERTEX, 1150, 1160);
        assertThat(snapping.at(new Place(1163, 1070), NEARNESS, ALL, slid)).isEmpty();
    }

    @Test
    void aStrongerKindTakesOverAndAWeakerDoesNot() {
        Snapping snapping = Snapping.to(DRAWING, Optional.of(GRID));
        Optional<Snap> line = snapping.at(new Place(1104, 1050), NEARNESS, ALL, Optional.empty());
        assertSnap(snapping.at(new Place(1104, 1095), NEARNESS, ALL, line), Kind.GRID_CORNER, 1100, 1100);
        Optional<Snap> vertex = snapping.at(new Place(1150, 1160), NEARNESS, ALL, Optional.empty());
        assertSnap(snapping.at(new Place(1150, 1149), NEARNESS, ALL, vertex), Kind.VERTEX, 1150, 1160);
    }

    @Test
    void anotherOfItsKindTakesOverWhenItIsNearerByFourPixels() {
        Drawing close = Drawing.EMPTY.with(Drawn.shape("a", 0, 0, 10, 0, 10, 300));
        Snapping snapping = Snapping.to(close, Optional.empty());
        Optional<Snap> held = snapping.at(new Place(0, 0), NEARNESS, ALL, Optional.empty());
        assertSnap(snapping.at(new Place(6, 0), NEARNESS, ALL, held), Kind.VERTEX, 0, 0);
        assertSnap(snapping.at(new Place(7, 0), NEARNESS, ALL, held), Kind.VERTEX, 10, 0);
    }

    @Test
    void aMovedVertexIsNotHeldByItselfAndItsSides() {
        Drawing two = DRAWING.with(Shape.of("b", box(1150, 1160, 1200, 1200)));
        Snapping snapping = Snapping.toOthersThan(two, RingAt.outer("a"), 2, Optional.empty());
        assertThat(snapping.at(new Place(1100, 1160), NEARNESS, ALL, Optional.empty()))
                .isEmpty();
        assertThat(snapping.at(new Place(1150, 1100), NEARNESS, ALL, Optional.empty()))
                .isEmpty();
        assertSnap(snapping.at(new Place(1003, 1100), NEARNESS, ALL, Optional.empty()), Kind.EDGE, 1003, 1100);
        assertSnap(snapping.at(new Place(1149, 1158), NEARNESS, ALL, Optional.empty()), Kind.VERTEX, 1150, 1160);
        Snapping alone = Snapping.toOthersThan(DRAWING, RingAt.outer("a"), 0, Optional.empty());
        assertThat(alone.at(new Place(1003, 1004), NEARNESS, ALL, Optional.empty()))
                .isEmpty();
    }

    @Test
    void theGridsEdgeHoldsFromOutside() {
        assertSnap(snap(Drawing.EMPTY, 993, 1050), Kind.GRID_LINE, 1000, 1050);
        assertSnap(snap(Drawing.EMPTY, 1256, 1304), Kind.GRID_CORNER, 1250, 1300);
        assertThat(snap(Drawing.EMPTY, 991, 1050)).isEmpty();
    }

    @Property(tries = 300)
    void cornersAndLinesOfTurnedUnevenGridsAreTheGridsOwn(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        double rotation = List.of(0.0, 90.0, 30.0 + random.nextInt(300)).get(random.nextInt(3));
        Grid grid = new Grid(axis(random, 500_000), axis(random, 5_200_000), rotation, 1);
        int column = random.nextInt(grid.columns() + 1);
        int row = random.nextInt(grid.rows() + 1);
        double x = grid.x().edge(column);
        double y = grid.y().edge(row);
        Snapping snapping = Snapping.to(Drawing.EMPTY, Optional.of(grid));
        Place corner = new Place(grid.mapX(x, y), grid.mapY(x, y));
        Place near = corner.moved(random.nextDouble() * 4, random.nextDouble() * 4);
        assertThat(snapping.at(near, NEARNESS, ALL, Optional.empty()))
                .map(Snap::place)
                .contains(corner);

        Place along = new Place(grid.mapX(x + 1, y + 20), grid.mapY(x + 1, y + 20));
        Place line = snapping.at(along, NEARNESS, Set.of(Kind.GRID_LINE), Optional.empty())
                .map(Snap::place)
                .orElse(along);
        if (row < grid.rows()) {
            assertThat(grid.localX(line.x(), line.y())).isEqualTo(x, within(1e-8));
            assertThat(grid.snappedX(line.x(), line.y())).isEqualTo(x);
            if (rotation == 0) {
                assertThat(line).isEqualTo(new Place(grid.mapX(x, 0), along.y()));
            }
        }
    }

    private static Axis axis(Random random, double from) {
        double[] edges = new double[6];
        edges[0] = from + random.nextDouble();
        for (int i = 1; i < edges.length; i++) {
            edges[i] = edges[i - 1] + 40 + 100 * random.nextDouble();
        }
        return Axis.of(edges);
    }

    @Property(tries = 300)
    void aVertexGivesItsOwnCoordinates(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        Shape star = Drawn.starShape(random, "star");
        Outline outline = star.parts().get(0).outer();
        Place vertex = outline.place(random.nextInt(outline.size()));
        double pixel = 0.01;
        Snap snap = Snapping.to(Drawing.EMPTY.with(star), Optional.empty())
                .at(vertex.moved(5 * pixel, -5 * pixel), Nearness.ofPixel(pixel), ALL, Optional.empty())
                .orElseThrow();
        assertThat(snap.kind()).isEqualTo(Kind.VERTEX);
        assertThat(star.touches(snap.place())).isTrue();
    }
}
