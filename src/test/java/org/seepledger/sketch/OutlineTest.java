package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.outline;
import static org.seepledger.sketch.Drawn.places;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.prism.Side;
import org.seepledger.prism.SideNumbering;

class OutlineTest {

    private static final Outline BOX = Drawn.box(0, 0, 10, 10);

    private static List<String> items(Outline outline) {
        return outline.ring(1, 0, new SideNumbering(false)).sides().stream()
                .map(Side::item)
                .toList();
    }

    @Test
    void dropsSidesOfNoLength() {
        assertThat(outline(0, 0, 0, 0, 10, 0, 10, 10, 10, 10, 0, 0).places()).isEqualTo(places(0, 0, 10, 0, 10, 10));
    }

    @Test
    void keepsAtLeastThreeVertices() {
        Outline triangle = outline(0, 0, 10, 0, 10, 10);
        assertThatThrownBy(() -> triangle.delete(1))
                .isInstanceOf(Refusal.class)
                .hasMessage("A ring keeps at least three vertices.");
        assertThatThrownBy(() -> triangle.move(0, new Place(10, 0))).isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> outline(0, 0, 1, 1)).isInstanceOf(Refusal.class);
    }

    @Test
    void movesInsertsAndDeletes() {
        assertThat(BOX.move(2, new Place(11, 12)).places()).isEqualTo(places(0, 0, 10, 0, 11, 12, 0, 10));
        assertThat(BOX.insert(3, new Place(-1, 5)).places()).isEqualTo(places(0, 0, 10, 0, 10, 10, 0, 10, -1, 5));
        assertThat(BOX.insert(0, new Place(5, 0)).places()).startsWith(new Place(0, 0), new Place(5, 0));
        assertThat(BOX.delete(0).places()).isEqualTo(places(10, 0, 10, 10, 0, 10));
        assertThat(BOX.moved(1, 2).places()).isEqualTo(places(1, 2, 11, 2, 11, 12, 1, 12));
    }

    @Test
    void aVertexMovedOntoItsNeighbourBecomesOneWithIt() {
        Outline bank = BOX.under(List.of(1), Optional.of("bank"));
        assertThat(bank.move(1, new Place(10, 10)).places()).isEqualTo(places(0, 0, 10, 10, 0, 10));
        assertThat(items(bank.move(1, new Place(0, 0)))).containsExactly("bank", "side 2", "side 3");
    }

    @Test
    void bothHalvesOfASideStayInItsBoundary() {
        Outline bank = BOX.under(List.of(1, 2), Optional.of("bank"));
        assertThat(items(bank)).containsExactly("side 1", "bank", "bank", "side 4");
        assertThat(items(bank.insert(1, new Place(10, 5)))).containsExactly("side 1", "bank", "bank", "bank", "side 5");
        assertThat(items(bank.insert(0, new Place(5, 0))))
                .containsExactly("side 1", "side 2", "bank", "bank", "side 5");
        assertThat(items(bank.delete(0))).containsExactly("bank", "bank", "side 3");
        assertThat(items(bank.delete(2))).containsExactly("side 1", "bank", "side 3");
        assertThat(items(bank.under(List.of(2), Optional.empty())))
                .containsExactly("side 1", "bank", "side 3", "side 4");
    }

    @Test
    void theBoundaryStaysWithItsSideHoweverTheRingRuns() {
        Outline clockwise = outline(0, 0, 0, 10, 10, 10, 10, 0).under(List.of(0), Optional.of("west"));
        List<Side> sides = clockwise.ring(1, 0, new SideNumbering(false)).sides();
        assertThat(sides)
                .containsExactly(
                        new Side("side 1", "side 1", 0, 0),
                        new Side("side 2", "side 2", 10, 0),
                        new Side("side 3", "side 3", 10, 10),
                        new Side("side 4", "west", 0, 10));
        assertThat(clockwise.ring(2, 1, new SideNumbering(true)).sides().get(0))
                .isEqualTo(new Side("part 2 island 1 side 1", "west", 0, 0));
    }

    @Test
    void refusesNamesThatABudgetHasAlready() {
        for (String name : List.of("", " ", "top", "bottom", "grid edge", "side 3", "island 1 side 2")) {
            assertThatThrownBy(() -> BOX.under(List.of(0), Optional.of(name)))
                    .isInstanceOf(Refusal.class)
                    .hasMessageStartingWith("A boundary's name");
        }
    }

    @Test
    void renamesBoundaries() {
        Outline bank = BOX.under(List.of(1, 2), Optional.of("bank"));
        assertThat(items(bank.renamed("bank", Optional.of("shore"))))
                .containsExactly("side 1", "shore", "shore", "side 4");
        assertThat(items(bank.renamed("bank", Optional.empty())))
                .containsExactly("side 1", "side 2", "side 3", "side 4");
        assertThat(items(bank.renamed("other", Optional.empty()))).contains("bank");
    }
}
