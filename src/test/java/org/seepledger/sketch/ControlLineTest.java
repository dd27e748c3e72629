package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

class ControlLineTest {

    private static final Place A = new Place(0, 0);
    private static final Place B = new Place(10, 0);
    private static final Place C = new Place(10, 10);
    private static final ControlLine LINE = new ControlLine("fence", List.of(A, B, C));

    @Test
    void isEditedVertexByVertex() {
        assertThat(LINE.move(1, C).places()).containsExactly(A, C);
        assertThat(LINE.insert(0, C).places()).containsExactly(A, C, B, C);
        assertThat(LINE.delete(0).places()).containsExactly(B, C);
        assertThatThrownBy(() -> LINE.delete(0).delete(0))
                .isInstanceOf(Refusal.class)
                .hasMessageContaining("two");
        assertThatThrownBy(() -> LINE.named(" ")).isInstanceOf(Refusal.class).hasMessageContaining("name");
        assertThat(ControlLine.of(LINE.transect())).isEqualTo(LINE);
    }

    @Test
    void staysOnTheGrid() {
        Grid turned = new Grid(Axis.even(100, 10, 3), Axis.even(200, 10, 2), 30, 1);
        Place inside = new Place(turned.mapX(7, 3), turned.mapY(7, 3));
        assertThat(ControlLine.within(turned, inside)).isSameAs(inside);
        for (double[] local : new double[][] {{-5, 10}, {35, 25}, {12, -1}, {31, -40}}) {
            Place outside = new Place(turned.mapX(local[0], local[1]), turned.mapY(local[0], local[1]));
            Place held = ControlLine.within(turned, outside);
            assertThat(turned.holds(held.x(), held.y())).isTrue();
            double x = Math.max(0, Math.min(30, local[0]));
            double y = Math.max(0, Math.min(20, local[1]));
            assertThat(held.distance(new Place(turned.mapX(x, y), turned.mapY(x, y))))
                    .isLessThan(1e-9);
        }
    }

    @Test
    void aVertexIsHitBeforeASegment() {
        Nearness near = Nearness.ofPixel(0.2);
        assertThat(LineHit.at(List.of(LINE), new Place(9.5, 0.5), near).orElseThrow())
                .isEqualTo(new LineHit("fence", true, 1, B));
        assertThat(LineHit.at(List.of(LINE), new Place(5, 0.9), near).orElseThrow())
                .isEqualTo(new LineHit("fence", false, 0, new Place(5, 0)));
        assertThat(LineHit.at(List.of(LINE), new Place(5, 3), near)).isEmpty();
    }

    @Test
    void aDrawingKeepsThemWhileItsPrismsChange() {
        Drawing drawing = Drawing.EMPTY.with(LINE).with(LINE);
        assertThat(drawing.lines()).extracting(ControlLine::name).containsExactly("fence", "fence 2");
        Outline outline = Outline.through(List.of(A, B, C));
        Drawing more =
                drawing.with(Shape.of("prism", outline)).rename("prism", "zone").without("zone");
        assertThat(more.lines()).isEqualTo(drawing.lines());
        assertThatThrownBy(() -> more.editLine("fence 2", line -> line.named("fence")))
                .isInstanceOf(Refusal.class)
                .hasMessageContaining("already");
        assertThat(more.withoutLine("fence").lines()).hasSize(1);
    }
}
