package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Prisms of whole cells. */
class WholeCellsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 10, 5), Axis.even(0, 10, 5), 0, 1);

    private static Prism prism(double... vertices) {
        List<Side> sides = new java.util.ArrayList<>();
        for (int i = 0; i < vertices.length; i += 2) {
            String name = "side " + (i / 2 + 1);
            sides.add(new Side(name, name, vertices[i], vertices[i + 1]));
        }
        return new Prism("p", List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, 0));
    }

    @Test
    void takesCellsThatAreCoveredByHalfAndNoOthers() {
        Prism whole = WholeCells.of(PrismCut.of(prism(2, 2, 38, 2, 38, 28, 2, 28), GRID), GRID)
                .orElseThrow();
        PrismCut cut = PrismCut.of(whole, GRID);
        assertThat(cut.area()).isCloseTo(4 * 3 * 100, within(1e-9));
        for (int row = 0; row < 5; row++) {
            for (int column = 0; column < 5; column++) {
                assertThat(cut.coverage().share(row, column)).isIn(0.0, 1.0);
            }
        }
        assertThat(cut.items()).containsExactlyInAnyOrder("side 1", "side 2", "side 3", "side 4");
    }

    @Test
    void cellsThatTouchAtACornerBecomeParts() {
        Prism whole = WholeCells.of(
                        PrismCut.of(prism(0, 0, 10, 0, 10.5, 10, 20, 10, 20, 20, 10, 20, 9.5, 10, 0, 10), GRID), GRID)
                .orElseThrow();
        assertThat(whole.parts()).hasSize(2);
        assertThat(PrismCut.of(whole, GRID).area()).isCloseTo(200, within(1e-9));
    }

    @Test
    void ofASliverNothingIsLeft() {
        assertThat(WholeCells.of(PrismCut.of(prism(1, 1, 9, 1, 9, 3), GRID), GRID))
                .isEmpty();
    }
}
