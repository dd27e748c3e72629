package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seepledger.sketch.Drawn.box;
import static org.seepledger.sketch.Drawn.shape;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.operation.valid.IsSimpleOp;

class CrossingsTest {

    private static List<Place> places(Shape shape) {
        return Crossings.of(shape).stream().map(Crossing::place).toList();
    }

    @Test
    void findsNoneInAPolygon() {
        assertThat(places(Shape.of("a", box(0, 0, 10, 10)).with(box(2, 2, 4, 4))))
                .isEmpty();
        assertThat(places(shape("triangle", 0, 0, 10, 0, 10, 10))).isEmpty();
    }

    @Test
    void tellsWhichSidesCrossAndWhere() {
        RingAt ring = RingAt.outer("bow");
        assertThat(Crossings.of(shape("bow", 0, 0, 10, 10, 10, 0, 0, 10)))
                .containsExactly(new Crossing(ring, 0, ring, 2, new Place(5, 5)));
    }

    @Test
    void findsAVertexOnAnotherSideAndASpike() {
        assertThat(places(shape("touch", 0, 0, 10, 0, 10, 10, 5, 0, 0, 10))).contains(new Place(5, 0));
        assertThat(places(shape("spike", 0, 0, 10, 0, 15, 0, 10, 0, 10, 10))).isNotEmpty();
        assertThat(places(shape("back", 0, 0, 10, 0, 5, 0, 5, 10))).isNotEmpty();
    }

    @Test
    void findsRingsThatCrossOrRunAlongEachOther() {
        Shape crossing = new Shape(
                "a",
                "",
                List.of(new Part(box(0, 0, 10, 10), List.of(box(8, 4, 12, 6)))),
                false,
                new Reach.Whole(),
                Map.of());
        assertThat(places(crossing)).containsExactlyInAnyOrder(new Place(10, 4), new Place(10, 6));
        assertThat(places(Drawn.ofParts("b", box(0, 0, 10, 10), box(10, 2, 20, 8))))
                .isNotEmpty();
    }

    @Test
    void letsRingsTouchAtAPlace() {
        assertThat(places(Drawn.ofParts("b", box(0, 0, 10, 10), box(10, 10, 20, 20))))
                .isEmpty();
        assertThat(places(Shape.of("c", box(0, 0, 10, 10)).with(Drawn.outline(0, 5, 5, 4, 5, 6))))
                .isEmpty();
    }

    /** The simplicity check of JTS 1.20.0 goes another way about it. */
    @Property(tries = 300)
    void agreesWithTheSimplicityOfTheRing(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        List<Place> places = new ArrayList<>();
        int count = 3 + random.nextInt(5);
        for (int i = 0; i < count; i++) {
            places.add(new Place(random.nextInt(7), random.nextInt(7)));
        }
        Outline outline;
        try {
            outline = Outline.through(places);
        } catch (Refusal tooFew) {
            return;
        }
        boolean simple = IsSimpleOp.isSimple(PlanShape.FACTORY.createLinearRing(outline.closed()));
        assertThat(Crossings.of(Shape.of("random", outline)).isEmpty()).isEqualTo(simple);
    }
}
