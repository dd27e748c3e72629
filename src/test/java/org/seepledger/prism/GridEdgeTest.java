package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Cases on a grid of 10 by 8 plan units whose corner is (100, 200), drawn by hand; coordinates are from the corner. */
class GridEdgeTest {

    private static final Grid GRID = new Grid(Axis.even(100, 1, 10), Axis.even(200, 1, 8), 0, 1);
    private static final GridEdge EDGE = GridEdge.of(GRID);

    private static Coordinate[] path(double... xy) {
        Coordinate[] closed = new Coordinate[xy.length / 2 + 1];
        for (int i = 0; i < closed.length; i++) {
            int at = 2 * i % xy.length;
            closed[i] = new Coordinate(100 + xy[at], 200 + xy[at + 1]);
        }
        return closed;
    }

    private static Prism prism(Coordinate[]... rings) {
        SideNumbering numbering = new SideNumbering(false);
        List<Ring> numbered = new ArrayList<>();
        for (Coordinate[] ring : rings) {
            numbered.add(numbering.number(1, numbered.size(), ring));
        }
        return new Prism("A", numbered, new VerticalRange.Layers(0, 0));
    }

    private static List<String> shown(Prism prism) {
        List<String> rings = new ArrayList<>();
        for (Ring ring : prism.rings()) {
            StringBuilder text = new StringBuilder();
            for (Side side : ring.sides()) {
                text.append(side.name().replace("side ", "").replace(Prism.GRID_EDGE, "edge"));
                text.append(String.format(" (%.4g %.4g) ", side.x() - 100, side.y() - 200));
            }
            rings.add(text.toString().strip());
        }
        return rings;
    }

    private static List<String> clipped(Coordinate[]... rings) {
        return shown(EDGE.clip(prism(rings)));
    }

    private static String at(String name, double x, double y) {
        return String.format("%s (%.4g %.4g)", name, x, y);
    }

    private static String ring(String... sides) {
        return String.join(" ", sides);
    }

    @Test
    void holdsWhatLiesWithinOrOnTheEdge() {
        assertThat(EDGE.holds(prism(path(0, 0, 10, 0, 10, 8, 0, 8)))).isTrue();
        assertThat(EDGE.holds(prism(path(0, -0.9e-9, 10 + 0.9e-9, 4, 5, 8)))).isTrue();
        assertThat(EDGE.holds(prism(path(0, 0, 10 + 1e-8, 4, 5, 8)))).isFalse();
        assertThat(EDGE.holds(prism(path(0, -1e-8, 10, 4, 5, 8)))).isFalse();
    }

    @Test
    void aCornerOfThePolygonBeyondTheEdgeIsCutOff() {
        Prism whole = prism(path(6, 2, 14, 4, 6, 6));
        Prism left = EDGE.clip(whole);
        assertThat(shown(left)).containsExactly(ring(at("1", 6, 2), at("edge", 10, 3), at("2", 10, 5), at("3", 6, 6)));
        // The triangle has 16, the tip beyond x = 10 is half as long and half as wide: 4.
        assertThat(EDGE.shareOutside(whole, left)).isEqualTo(0.25, within(1e-12));
        assertThat(left.name()).isEqualTo("A");
    }

    @Test
    void theEdgeIsFollowedRoundCorners() {
        assertThat(clipped(path(5, 4, 20, 4, 20, 20, 5, 20)))
                .containsExactly(ring(at("1", 5, 4), at("edge", 10, 4), at("edge", 10, 8), at("4", 5, 8)));
        assertThat(clipped(path(5, 4, 5, 20, -20, 20, -20, -20, 20, -20, 20, 4)))
                .containsExactly(ring(
                        at("1", 5, 4),
                        at("edge", 5, 8),
                        at("edge", 0, 8),
                        at("edge", 0, 0),
                        at("edge", 10, 0),
                        at("6", 10, 4)));
    }

    @Test
    void sidesThatCrossTheEdgeKeepTheirNames() {
        // The side leaves both ends beyond the grid.
        assertThat(clipped(path(-1, 2, 13, 2, 13, 3, -1, 3)))
                .containsExactly(ring(at("1", 0, 2), at("edge", 10, 2), at("3", 10, 3), at("edge", 0, 3)));
        List<String> rings = clipped(path(1, 2, 13, 2, 13, 3, 1, 3), path(4, 2.2, 12, 2.2, 12, 2.8, 4, 2.8));
        // An island that is open to the east once the grid ends there becomes part of the outer ring.
        assertThat(rings)
                .containsExactly(ring(
                        at("1", 1, 2),
                        at("edge", 10, 2),
                        at("island 1 4", 10, 2.2),
                        at("island 1 1", 4, 2.2),
                        at("island 1 2", 4, 2.8),
                        at("edge", 10, 2.8),
                        at("3", 10, 3),
                        at("4", 1, 3)));
    }

    @Test
    void aPartMayFallIntoSeveralRings() {
        // A U lying on its side whose spine is beyond the east edge.
        assertThat(clipped(path(6, 1, 12, 1, 12, 5, 6, 5, 6, 4, 11, 4, 11, 2, 6, 2)))
                .containsExactly(
                        ring(at("1", 6, 1), at("edge", 10, 1), at("7", 10, 2), at("8", 6, 2)),
                        ring(at("3", 10, 5), at("4", 6, 5), at("5", 6, 4), at("edge", 10, 4)));
    }

    @Test
    void sidesAlongTheEdgeKeepTheirNamesAndOthersAreUntouched() {
        assertThat(clipped(path(0, 0, 10, 0, 10, 8, 5, 9)))
                .containsExactly(ring(at("1", 0, 0), at("2", 10, 0), at("edge", 10, 8), at("4", 40 / 9.0, 8)));
        // The notch (3..5, 0..-1) hangs off the south edge; the side along the edge inside it is off the grid.
        assertThat(clipped(path(3, -1, 5, -1, 5, 0, 7, 0, 7, 2, 1, 2, 1, 0, 3, 0)))
                .containsExactly(ring(
                        at("3", 5, 0), at("4", 7, 0), at("5", 7, 2), at("6", 1, 2), at("7", 1, 0), at("edge", 3, 0)));
    }

    @Test
    void theWholeGridMayLieWithin() {
        String round = ring(at("edge", 0, 0), at("edge", 10, 0), at("edge", 10, 8), at("edge", 0, 8));
        assertThat(clipped(path(-5, -5, 20, -5, 20, 20, -5, 20))).containsExactly(round);
        assertThat(clipped(path(-5, -5, 20, -5, 20, 20, -5, 20), path(2, 2, 2, 3, 3, 3)))
                .containsExactly(round, ring(at("island 1 1", 2, 2), at("island 1 2", 2, 3), at("island 1 3", 3, 3)));
        assertThat(clipped(path(0, 0, 10, 0, 10, 8, 0, 8)))
                .containsExactly(ring(at("1", 0, 0), at("2", 10, 0), at("3", 10, 8), at("4", 0, 8)));
    }

    @Test
    void theGridMayLieInAnIslandOrBesides() {
        assertThat(clipped(path(-5, -5, 20, -5, 20, 20, -5, 20), path(-1, -1, -1, 9, 11, 9, 11, -1)))
                .isEmpty();
        assertThat(clipped(path(-5, -5, 20, -5, 20, 20, -5, 20), path(0, 0, 0, 8, 10, 8, 10, 0)))
                .isEmpty();
        assertThat(clipped(path(11, 1, 12, 1, 12, 2))).isEmpty();
        Prism touching = prism(path(10, 1, 12, 1, 12, 2, 10, 2));
        assertThat(EDGE.clip(touching).rings()).isEmpty();
        assertThat(EDGE.shareOutside(touching, EDGE.clip(touching))).isEqualTo(1);
    }

    @Test
    void islandsGoWithTheRingThatHoldsThem() {
        Prism left = EDGE.clip(prism(
                path(6, 1, 12, 1, 12, 7, 6, 7, 6, 5, 11, 5, 11, 3, 6, 3),
                path(7, 1.5, 7, 2, 8, 2),
                path(7, 5.5, 7, 6, 8, 6)));
        assertThat(left.rings()).extracting(Ring::island).containsExactly(0, 1, 0, 2);
    }

    @Test
    void ringsThatTouchOnTheEdgeAreToldApartByDirection() {
        // The island touches the outer ring at (4, 0); both cross the edge there, and the prism goes on between them.
        assertThat(clipped(path(-4, -2, 2, -2, 4, 0, 2, 6, -4, 6), path(3, -1, 0, -1, 0, 2, 4, 0)))
                .hasSize(1);
        Prism parts = new Prism(
                "B",
                List.of(
                        new SideNumbering(true).number(1, 0, path(1, 3, 5, 0, 4, -1, 1, -1)),
                        new SideNumbering(true).number(2, 0, path(5, 0, 9, 3, 9, -1, 6, -1))),
                new VerticalRange.Layers(0, 0));
        assertThat(EDGE.clip(parts).rings()).extracting(Ring::part).containsExactly(1, 2);
    }

    @ParameterizedTest
    @ValueSource(doubles = {90, 180, 270, 30, -17.5})
    void worksOnATurnedGrid(double rotation) {
        Grid turned = new Grid(Axis.even(500_000, 50, 20), Axis.even(5_200_000, 40, 10), rotation, 1);
        Coordinate[] ring = new Coordinate[5];
        double[][] local = {{-100, 100}, {500, 100}, {500, 300}, {-100, 300}, {-100, 100}};
        for (int i = 0; i < 5; i++) {
            ring[i] = new Coordinate(turned.mapX(local[i][0], local[i][1]), turned.mapY(local[i][0], local[i][1]));
        }
        Prism whole = prism(ring);
        Prism left = GridEdge.of(turned).clip(whole);
        assertThat(GridEdge.of(turned).shareOutside(whole, left)).isEqualTo(1 / 6.0, within(1e-9));
        assertThat(left.rings().get(0).sides())
                .extracting(Side::name)
                .containsExactlyInAnyOrder("side 1", "side 2", "side 3", Prism.GRID_EDGE);
        assertThat(GridEdge.of(turned).holds(left)).isTrue();
    }

    @Test
    void neighboursAreCutAtTheSamePlace() {
        Prism one = EDGE.clip(prism(path(3, 1, 13.7, 4.1, 3, 7)));
        Prism other = EDGE.clip(prism(path(13.7, 4.1, 3, 1, 13, 0.5)));
        Side cut = side(one, Prism.GRID_EDGE);
        Side shared = side(other, "side 1");
        assertThat(new double[] {cut.x(), cut.y()}).containsExactly(shared.x(), shared.y());
    }

    private static Side side(Prism prism, String name) {
        return prism.rings().get(0).sides().stream()
                .filter(side -> side.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void saysSoWhenSidesCannotBeToldApart() {
        // Two parts that lie on each other are no valid shape: their sides leave the grid without coming in by turns.
        SideNumbering numbering = new SideNumbering(false);
        Prism doubled = new Prism(
                "C",
                List.of(
                        numbering.number(1, 0, path(6, 2, 14, 4, 6, 6)),
                        numbering.number(1, 1, path(6, 6, 14, 3, 6, 2, 5, 4))),
                new VerticalRange.Layers(0, 0));
        assertThatThrownBy(() -> EDGE.clip(doubled))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("cannot be told apart near x 110");
    }
}
