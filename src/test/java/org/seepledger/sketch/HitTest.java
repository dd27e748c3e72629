package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.sketch.Drawn.box;

import java.util.Optional;
import org.junit.jupiter.api.Test;

class HitTest {

    /** A pixel is a map unit. */
    private static final Nearness NEARNESS = Nearness.ofPixel(1);

    private static final Drawing DRAWING = Drawing.EMPTY
            .with(Shape.of("west", box(0, 0, 100, 100)).with(box(40, 40, 60, 60)))
            .with(Shape.of("east", box(100, 0, 200, 100)));

    private static Optional<Hit> at(double x, double y) {
        return Hit.at(DRAWING, new Place(x, y), NEARNESS, Optional.empty());
    }

    @Test
    void aVertexComesBeforeASideAndASideBeforeTheBody() {
        assertThat(at(6, 3)).contains(new Hit.Vertex(RingAt.outer("west"), 0));
        assertThat(at(8, 3)).contains(new Hit.Side(RingAt.outer("west"), 0, new Place(8, 0)));
        assertThat(at(8, 6)).contains(new Hit.Body("west", 1));
        assertThat(at(-6, 50)).isEmpty();
    }

    @Test
    void reachesAsFarAsItsRadius() {
        assertThat(at(-7, 0)).containsInstanceOf(Hit.Vertex.class);
        assertThat(at(-7.01, 0)).isEmpty();
        assertThat(at(-5, 50)).containsInstanceOf(Hit.Side.class);
        assertThat(at(-5.01, 50)).isEmpty();
    }

    @Test
    void ofSeveralItIsTheNearest() {
        Drawing close = Drawing.EMPTY.with(Drawn.shape("a", 0, 0, 4, 0, 4, 50));
        assertThat(Hit.at(close, new Place(3, -1), NEARNESS, Optional.empty()))
                .contains(new Hit.Vertex(RingAt.outer("a"), 1));
    }

    @Test
    void ofEquallyNearItIsThePreferredElseTheOneOnTop() {
        assertThat(at(100, 0)).contains(new Hit.Vertex(RingAt.outer("east"), 0));
        assertThat(Hit.at(DRAWING, new Place(100, 0), NEARNESS, Optional.of("west")))
                .contains(new Hit.Vertex(RingAt.outer("west"), 1));
        Drawing over = DRAWING.with(Shape.of("over", box(50, 20, 150, 80)));
        assertThat(Hit.at(over, new Place(80, 50), NEARNESS, Optional.empty())).contains(new Hit.Body("over", 1));
        assertThat(Hit.at(over, new Place(80, 50), NEARNESS, Optional.of("west")))
                .contains(new Hit.Body("west", 1));
    }

    @Test
    void findsIslandsAndLeavesThemOut() {
        assertThat(at(41, 42)).contains(new Hit.Vertex(new RingAt("west", 1, 1), 0));
        assertThat(at(50, 50)).isEmpty();
        assertThat(at(50, 42)).map(Hit::shape).contains("west");
        assertThat(at(1, 2).orElseThrow().shape()).isEqualTo("west");
    }

    @Test
    void aDragStartsAfterThreePixels() {
        assertThat(NEARNESS.isDrag(new Place(0, 0), new Place(3, 0))).isFalse();
        assertThat(NEARNESS.isDrag(new Place(0, 0), new Place(3, 0.1))).isTrue();
        assertThat(Nearness.ofPixel(0.5)).isEqualTo(new Nearness(3.5, 2.5, 4, 6, 1.5));
        assertThatThrownBy(() -> new Nearness(1, 1, 2, 1, 1)).isInstanceOf(IllegalArgumentException.class);
    }
}
