package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.box;
import static org.seepledger.sketch.Drawn.items;
import static org.seepledger.sketch.Drawn.places;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class MergeTest {

    private static final double NEAR = 1e-6;
    private static final Shape WEST = Shape.of("west", box(0, 0, 10, 10));

    private static Shape merge(Shape one, Shape other) {
        return Drawing.EMPTY
                .with(one)
                .with(other)
                .merge(one.name(), other.name(), NEAR)
                .shape(one.name());
    }

    @Test
    void takesOutTheSidesBetween() {
        Shape east = Shape.of("east", box(10, 0, 20, 10).under(List.of(1), Optional.of("divide")));
        Drawing merged = Drawing.EMPTY.with(WEST).with(east).merge("west", "east", NEAR);
        assertThat(merged.shapes()).hasSize(1);
        assertThat(merged.outline(RingAt.outer("west")).places())
                .isEqualTo(places(0, 0, 10, 0, 20, 0, 20, 10, 10, 10, 0, 10));
        assertThat(items(merged.shape("west")))
                .containsExactly("side 1", "side 2", "divide", "side 4", "side 5", "side 6");
    }

    @Test
    void takesPartOfASideAndOverlaps() {
        assertThat(merge(WEST, Shape.of("east", box(10, 2, 20, 5))).area()).isEqualTo(130);
        assertThat(merge(WEST, Shape.of("east", box(8, 2, 20, 5))).area()).isEqualTo(130);
        assertThat(merge(WEST, Shape.of("cross", box(-5, 4, 15, 6))).area()).isEqualTo(120);
        assertThat(merge(WEST, Shape.of("inner", box(2, 2, 5, 5))).parts()).isEqualTo(WEST.parts());
        assertThat(merge(WEST, Shape.of("same", box(0, 0, 10, 10))).parts()).isEqualTo(WEST.parts());
        assertThat(merge(WEST, Shape.of("corner", box(0, 0, 4, 4))).area()).isEqualTo(100);
    }

    @Test
    void takesSidesThatMissEachOtherByRounding() {
        Shape east = Shape.of("east", box(10 + 3e-7, -2e-7, 20, 10 - 4e-7));
        assertThat(merge(WEST, east).parts().get(0).outer().places())
                .isEqualTo(places(0, 0, 10, 0, 20, -2e-7, 20, 10 - 4e-7, 10, 10, 0, 10));
        Shape low = Shape.of("low", box(10 - 3e-7, 2, 20, 5));
        assertThat(merge(WEST, low).parts()).hasSize(1);
        assertThat(merge(WEST, low).flaw()).isEmpty();
    }

    @Test
    void aGapBecomesAnIsland() {
        Shape bracket = Drawn.shape("bracket", 10, 0, 20, 0, 20, 10, 10, 10, 10, 8, 15, 8, 15, 2, 10, 2);
        Shape merged = merge(WEST, bracket);
        assertThat(merged.parts()).hasSize(1);
        assertThat(merged.parts().get(0).islands()).hasSize(1);
        assertThat(merged.area()).isEqualTo(170);
    }

    @Test
    void fillsIslandsAndJoinsParts() {
        Shape ring = WEST.with(box(2, 2, 4, 4));
        assertThat(merge(ring, Shape.of("plug", box(2, 2, 4, 4))).parts()).isEqualTo(WEST.parts());
        Shape two = Drawn.ofParts("two", box(20, 0, 30, 10), box(50, 0, 60, 10));
        Shape merged = merge(two, Shape.of("between", box(30, 0, 50, 10)));
        assertThat(merged.parts()).hasSize(1);
        assertThat(merged.area()).isEqualTo(400);
    }

    @Test
    void keepsNotesAndProperties() {
        Shape one = WEST.noted("first").keeping(Map.of("colour", "1", "kept", "2"));
        Shape other = Shape.of("east", box(10, 0, 20, 10)).noted("second").keeping(Map.of("colour", "3", "more", "4"));
        Shape merged = merge(one, other);
        assertThat(merged.note()).isEqualTo("first\nsecond");
        assertThat(merged.others()).isEqualTo(Map.of("colour", "1", "kept", "2", "more", "4"));
        assertThat(merge(WEST, other).note()).isEqualTo("second");
    }

    @Test
    void refusesWhatCannotBeOne() {
        String apart = "The prisms do not touch along a side; only such prisms can be merged.";
        assertThatThrownBy(() -> merge(WEST, Shape.of("far", box(20, 0, 30, 10))))
                .isInstanceOf(Refusal.class)
                .hasMessage(apart);
        assertThatThrownBy(() -> merge(WEST, Shape.of("corner", box(10, 10, 30, 30))))
                .hasMessage(apart);
        Shape deeper = Shape.of("deeper", box(10, 0, 20, 10)).reaching(new Reach.Layers(0, 1));
        assertThatThrownBy(() -> merge(WEST, deeper)).hasMessageContaining("reach differently far");
        assertThatThrownBy(() -> Drawing.EMPTY.with(WEST).merge("west", "west", NEAR))
                .hasMessage("Choose two prisms to merge.");
    }
}
