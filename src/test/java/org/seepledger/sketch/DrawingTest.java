package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.box;

import java.util.List;
import org.junit.jupiter.api.Test;

class DrawingTest {

    private static final Drawing TWO =
            Drawing.EMPTY.with(Shape.of("west", box(0, 0, 10, 10))).with(Shape.of("east", box(10, 0, 20, 10)));

    private static List<String> names(Drawing drawing) {
        return drawing.shapes().stream().map(Shape::name).toList();
    }

    @Test
    void addsRemovesAndReorders() {
        assertThat(names(TWO)).containsExactly("west", "east");
        assertThat(names(TWO.without("west"))).containsExactly("east");
        Drawing three = TWO.with(Shape.of("north", box(0, 10, 20, 20)));
        assertThat(names(three.reorder("north", 0))).containsExactly("north", "west", "east");
        assertThat(names(three.reorder("west", 2))).containsExactly("east", "north", "west");
    }

    @Test
    void keepsNamesApart() {
        assertThatThrownBy(() -> TWO.rename("west", "east")).hasMessage("There is a prism \"east\" already.");
        assertThatThrownBy(() -> TWO.with(TWO.shape("east"))).isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> TWO.rename("south", "a")).hasMessage("There is no prism \"south\".");
        assertThat(names(TWO.rename("west", "left"))).containsExactly("left", "east");
        assertThat(TWO.rename("west", "west")).isEqualTo(TWO);
        assertThat(TWO.freeName("west")).isEqualTo("west 2");
        assertThat(TWO.with(Shape.of("west 2", box(0, 20, 10, 30))).freeName("west"))
                .isEqualTo("west 3");
        assertThat(TWO.freeName("south")).isEqualTo("south");
    }

    @Test
    void changesOneRingAndSharesTheRest() {
        Drawing moved = TWO.edit(RingAt.outer("east"), outline -> outline.move(1, new Place(25, 0)));
        assertThat(moved.outline(RingAt.outer("east")).place(1)).isEqualTo(new Place(25, 0));
        assertThat(moved.shape("west")).isSameAs(TWO.shape("west"));
        assertThat(TWO.outline(RingAt.outer("east")).place(1)).isEqualTo(new Place(20, 0));
    }

    @Test
    void movesWhatPrismsShareTogether() {
        Drawing far = TWO.with(Shape.of("far", box(50, 50, 60, 60)));
        Drawing moved = far.move(new Place(10, 10), new Place(11, 12));
        assertThat(moved.outline(RingAt.outer("west")).place(2)).isEqualTo(new Place(11, 12));
        assertThat(moved.outline(RingAt.outer("east")).place(3)).isEqualTo(new Place(11, 12));
        assertThat(moved.shape("far")).isSameAs(far.shape("far"));
    }

    @Test
    void listsItsRings() {
        Drawing drawing = TWO.edit("west", shape -> shape.with(box(2, 2, 4, 4)));
        assertThat(drawing.outlines().keySet())
                .containsExactly(RingAt.outer("west"), new RingAt("west", 1, 1), RingAt.outer("east"));
        assertThat(drawing.outline(new RingAt("west", 1, 1))).isEqualTo(box(2, 2, 4, 4));
    }
}
