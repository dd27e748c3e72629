package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.box;
import static org.seepledger.sketch.Drawn.outline;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;

class ShapeTest {

    private static final Surfaces NONE = (surface, lid) -> {
        throw new AssertionError("no surface is named");
    };

    private static final Shape FIELD = Shape.of("field", box(0, 0, 100, 100));

    @ParameterizedTest
    @ValueSource(strings = {"", " ", " field", "field ", "two\nlines", "outside"})
    void refusesNames(String name) {
        assertThatThrownBy(() -> FIELD.named(name)).isInstanceOf(Refusal.class).hasMessageContaining("name");
    }

    @Test
    void becomesThePrismThatItShows() {
        Shape shape = FIELD.with(box(20, 20, 40, 40)).reaching(new Reach.Layers(1, 2));
        Prism expected = Prisms.of(
                "field",
                1,
                2,
                List.of(
                        Prisms.ring(1, 0, 0, 0, 100, 0, 100, 100, 0, 100),
                        Prisms.ring(1, 1, 20, 20, 20, 40, 40, 40, 40, 20)));
        assertThat(shape.prism(4, NONE)).isEqualTo(expected);
    }

    @Test
    void comesBackFromNumberedRings() {
        Shape shape = Drawn.ofParts(
                        "a", box(0, 0, 10, 10).under(List.of(1, 2), Optional.of("bank")), box(20, 0, 30, 10))
                .with(box(2, 2, 4, 4));
        Shape back = Shape.of("a", shape.rings(), true, new Reach.Whole());
        assertThat(back.rings()).isEqualTo(shape.rings());
        assertThat(back.parts()).hasSize(2);
        assertThat(back.parts().get(0).islands()).hasSize(1);
        assertThat(Drawn.items(back))
                .startsWith("part 1 side 1", "bank", "bank", "part 1 side 4", "part 1 island 1 side 1");
    }

    @Test
    void sidesThatClippingMadeComeBackAsSidesLikeOthers() {
        Prism clipped = Prisms.of("a", 0, 0, 0, 0, 10, 0, 10, 10);
        List<Side> sides = clipped.rings().get(0).sides();
        Side edge = new Side(Prism.GRID_EDGE, Prism.GRID_EDGE, 10, 0);
        Prism withEdge = Prisms.of("a", 0, 0, List.of(new Ring(1, 0, List.of(sides.get(0), edge, sides.get(2)))));
        assertThat(Drawn.items(Shape.of("a", withEdge.rings(), false, new Reach.Whole())))
                .containsExactly("side 1", "side 2", "side 3");
    }

    @Test
    void reachesAsTyped() {
        assertThat(FIELD.prism(3, NONE).range()).isEqualTo(new VerticalRange.Layers(0, 2));
        assertThatThrownBy(() -> FIELD.reaching(new Reach.Layers(0, 3)).prism(3, NONE))
                .hasMessage("The grid has 3 layers.");
        Reach between = new Reach.Between(
                Optional.of(new Limit.Elevation(12.5)), Optional.of(new Limit.Surface("surfaces/base.tif")));
        Surfaces surfaces = (surface, lid) -> GriddedValues.constant((((Limit.Surface) surface).path() + lid).length());
        VerticalRange.Elevations range = (VerticalRange.Elevations)
                FIELD.reaching(between).prism(3, surfaces).range();
        assertThat(value(range.top().orElseThrow())).isEqualTo(12.5);
        assertThat(value(range.bottom().orElseThrow())).isEqualTo("surfaces/base.tifbottom".length());
    }

    private static double value(GriddedValues surface) {
        double[] values = new double[1];
        surface.read(0, 0, new Window(0, 0, 1, 1), values, 0);
        return values[0];
    }

    @Test
    void refusesReachesThatCannotBe() {
        assertThatThrownBy(() -> new Reach.Layers(2, 1)).hasMessageStartingWith("Layers count from 1");
        assertThatThrownBy(() ->
                        new Reach.Between(Optional.of(new Limit.Elevation(3)), Optional.of(new Limit.Elevation(3))))
                .hasMessage("The top lies above the bottom.");
        assertThatThrownBy(() -> new Reach.Between(Optional.empty(), Optional.empty()))
                .hasMessage("Give a top or a bottom, or layers.");
        assertThatThrownBy(() -> new Limit.Elevation(Double.NaN)).hasMessage("An elevation is a number.");
    }

    @Test
    void takesIslandsInTheRightPart() {
        Shape two = Drawn.ofParts("two", box(0, 0, 10, 10), box(20, 0, 30, 10)).with(box(22, 2, 24, 4));
        assertThat(two.parts().get(0).islands()).isEmpty();
        assertThat(two.parts().get(1).islands()).hasSize(1);
        assertThatThrownBy(() -> two.with(box(8, 2, 12, 4))).hasMessage("An island lies inside the prism.");
        assertThatThrownBy(() -> two.with(outline(1, 1, 3, 3, 3, 1, 1, 3)))
                .hasMessageStartingWith("A ring that crosses or touches itself at x 2, y 2.");
    }

    @Test
    void losesRings() {
        Shape shape = FIELD.with(box(20, 20, 40, 40)).with(box(50, 50, 60, 60));
        assertThat(shape.without(new RingAt("field", 1, 1)).parts().get(0).islands())
                .containsExactly(box(50, 50, 60, 60));
        assertThatThrownBy(() -> shape.without(RingAt.outer("field")))
                .hasMessage("A prism keeps at least one ring; delete the prism itself.");
        Shape two = FIELD.with(Part.of(box(200, 0, 210, 10)));
        assertThat(two.byPart()).isTrue();
        assertThat(two.without(RingAt.outer("field")).parts()).containsExactly(Part.of(box(200, 0, 210, 10)));
    }

    @Test
    void movesWholeAndByPart() {
        Shape two = FIELD.with(box(20, 20, 40, 40)).with(Part.of(box(200, 0, 210, 10)));
        assertThat(two.moved(5, -5).parts())
                .containsExactly(
                        new Part(box(5, -5, 105, 95), List.of(box(25, 15, 45, 35))), Part.of(box(205, -5, 215, 5)));
        assertThat(two.moved(2, 1, 1).parts().get(0)).isSameAs(two.parts().get(0));
        assertThat(two.moved(2, 1, 1).parts().get(1)).isEqualTo(Part.of(box(201, 1, 211, 11)));
    }

    @Test
    void keepsNotesAndOthersProperties() {
        Shape shape = FIELD.noted("drawn by ear").keeping(Map.of("colour", "\"red\""));
        assertThat(shape.named("other").noted("again").others()).containsEntry("colour", "\"red\"");
        assertThat(shape.moved(1, 1).note()).isEqualTo("drawn by ear");
    }

    @Test
    void dissolvesBoundariesInAllItsRings() {
        Shape shape = Shape.of("a", box(0, 0, 10, 10).under(List.of(0), Optional.of("bank")))
                .with(box(2, 2, 4, 4).under(List.of(0), Optional.of("bank")));
        assertThat(Drawn.items(shape.boundary("bank", Optional.of("shore"))))
                .contains("shore")
                .doesNotContain("bank");
        assertThat(Drawn.items(shape.boundary("bank", Optional.empty()))).allMatch(item -> item.contains("side"));
    }

    @Test
    void knowsItsAreaAndItsFlaw() {
        assertThat(FIELD.with(box(20, 20, 40, 40)).area()).isEqualTo(9600);
        assertThat(FIELD.flaw()).isEmpty();
        Flaw flaw =
                Drawn.ofParts("a", box(0, 0, 10, 10), box(10, 0, 20, 10)).flaw().orElseThrow();
        assertThat(flaw.sentence())
                .isEqualTo("Parts 1 and 2 that touch along a line at x 10, y 0. Merge the parts or make them prisms of"
                        + " their own.");
    }
}
