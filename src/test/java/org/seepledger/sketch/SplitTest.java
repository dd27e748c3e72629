package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.box;
import static org.seepledger.sketch.Drawn.items;
import static org.seepledger.sketch.Drawn.outline;
import static org.seepledger.sketch.Drawn.places;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class SplitTest {

    private static final double NEAR = 1e-6;
    private static final Drawing FIELD =
            Drawing.EMPTY.with(Shape.of("field", box(0, 0, 100, 60).under(List.of(0, 3), Optional.of("bank")))
                    .noted("loam"));

    private static Drawing split(Drawing drawing, double... line) {
        return drawing.split("field", places(line), NEAR);
    }

    @Test
    void cutsInTwoAndTheLargerPieceKeepsTheName() {
        Drawing cut = split(FIELD, 30, -5, 30, 70);
        assertThat(cut.shapes()).extracting(Shape::name).containsExactly("field", "field 2");
        assertThat(cut.shape("field").parts()).hasSize(1);
        assertThat(cut.outline(RingAt.outer("field")).places()).isEqualTo(places(30, 0, 100, 0, 100, 60, 30, 60));
        assertThat(cut.outline(RingAt.outer("field 2")).places()).isEqualTo(places(0, 0, 30, 0, 30, 60, 0, 60));
        assertThat(cut.shape("field 2").note()).isEqualTo("loam");
        assertThat(items(cut.shape("field"))).containsExactly("bank", "side 2", "side 3", "side 4");
        assertThat(items(cut.shape("field 2"))).containsExactly("bank", "side 2", "side 3", "bank");
    }

    @Test
    void takesALineFromSideToSideAndFromVertexToVertex() {
        Drawing sides = split(FIELD, 30, 0, 40, 30, 30, 60);
        assertThat(sides.outline(RingAt.outer("field 2")).places())
                .isEqualTo(places(0, 0, 30, 0, 40, 30, 30, 60, 0, 60));
        Drawing vertices = split(FIELD, 0, 0, 100, 60);
        assertThat(vertices.shapes()).hasSize(2);
        assertThat(vertices.shape("field").area()).isEqualTo(3000);
    }

    @Test
    void takesALineThatEndsNotQuiteOnASlantingSide() {
        Drawing slanting = Drawing.EMPTY.with(Drawn.shape("field", 0.1, 0.2, 99.3, 33.7, 51.9, 88.8));
        Place begin = new Place(50, 20).nearestOn(new Place(0.1, 0.2), new Place(99.3, 33.7));
        Place end = new Place(20, 50).nearestOn(new Place(51.9, 88.8), new Place(0.1, 0.2));
        Drawing cut = slanting.split("field", List.of(begin, end), NEAR);
        assertThat(cut.shapes()).hasSize(2);
        assertThat(cut.shapes())
                .allSatisfy(shape ->
                        assertThat(shape.parts().get(0).outer().places()).contains(begin, end));
    }

    @Test
    void makesAPrismOfEachPiece() {
        Drawing fork = Drawing.EMPTY
                .with(Drawn.shape("field", 0, 0, 50, 0, 50, 40, 40, 40, 40, 10, 10, 10, 10, 30, 0, 30))
                .with(Drawn.shape("last", 200, 0, 201, 0, 201, 1));
        Drawing cut = split(fork, -1, 20, 60, 20);
        assertThat(cut.shapes()).extracting(Shape::name).containsExactly("field", "field 2", "field 3", "last");
        assertThat(cut.shapes()).extracting(Shape::area).startsWith(700.0, 200.0, 100.0);
    }

    @Test
    void cutsThroughIslandsAndKeepsOthers() {
        Drawing ring =
                FIELD.edit("field", shape -> shape.with(box(20, 20, 40, 40)).with(box(80, 20, 90, 40)));
        Drawing cut = split(ring, 30, -5, 30, 70);
        assertThat(cut.shape("field").area()).isEqualTo(70 * 60 - 10 * 20 - 10 * 20);
        assertThat(cut.shape("field").parts().get(0).islands()).hasSize(1);
        assertThat(cut.shape("field 2").parts().get(0).islands()).isEmpty();
        assertThat(cut.shape("field 2").area()).isEqualTo(30 * 60 - 10 * 20);
    }

    @Test
    void partsThatTheLineMissesStayWithTheLargestPiece() {
        Drawing two = FIELD.edit("field", shape -> shape.with(Part.of(box(200, 0, 210, 10))));
        Drawing cut = split(two, 30, -5, 30, 70);
        assertThat(cut.shape("field").parts()).hasSize(2);
        assertThat(cut.shape("field 2").parts()).hasSize(1);
    }

    @Test
    void aClosedLineCutsAPieceOutOfTheMiddle() {
        Drawing cut = split(FIELD, 20, 20, 40, 20, 40, 40, 20, 20);
        assertThat(cut.shape("field").parts().get(0).islands()).hasSize(1);
        assertThat(cut.shape("field 2").area()).isEqualTo(200);
        assertThat(cut.shape("field").area()).isEqualTo(5800);
    }

    @Test
    void refusesALineThatTurnsBackOnItselfToWithinRounding() {
        for (double aside : new double[] {0, 1e-9}) {
            assertThatThrownBy(() -> split(FIELD, 30, -5, 30, 50, 30 + aside, 20, 90, 20))
                    .hasMessage("A line that splits does not cross or touch itself.");
        }
        assertThatThrownBy(() -> split(FIELD, 30, -5, 30, 70, 30, -5)).hasMessageContaining("touch itself");
    }

    @Test
    void refusesWhatDoesNotCut() {
        String why = "The line does not cut the prism in two: begin and end it outside, or on its sides.";
        assertThatThrownBy(() -> split(FIELD, 30, -5, 30, 50))
                .isInstanceOf(Refusal.class)
                .hasMessage(why);
        assertThatThrownBy(() -> split(FIELD, 200, 0, 200, 60)).hasMessage(why);
        assertThatThrownBy(() -> split(FIELD, -5, 60, 200, 60)).hasMessage(why);
        assertThatThrownBy(() -> split(FIELD, 30, -5, 30, 70, 50, 30, 10, 30))
                .hasMessage("A line that splits does not cross or touch itself.");
        assertThatThrownBy(() -> split(FIELD, 30, -5, 30, -5)).hasMessageContaining("at least two places");
        Drawing crossed = Drawing.EMPTY.with(Shape.of("field", outline(0, 0, 10, 10, 10, 0, 0, 10)));
        assertThatThrownBy(() -> split(crossed, 5, -1, 5, 11)).hasMessageStartingWith("A ring that crosses");
    }
}
