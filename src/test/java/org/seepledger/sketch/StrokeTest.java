package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class StrokeTest {

    private static final Place WELL = new Place(500_000, 5_200_000);

    @Test
    void aDoubleClickAddsOneVertex() {
        Nearness nearness = Nearness.ofPixel(2);
        Stroke once = Stroke.EMPTY.to(WELL, nearness);
        assertThat(once.places()).containsExactly(WELL);
        assertThat(once.to(WELL.moved(0, 6), nearness)).isSameAs(once);
        assertThat(once.to(WELL.moved(0, 6.1), nearness).places()).hasSize(2);
        assertThat(once.to(WELL.moved(0, 0.1)).places()).hasSize(2);
    }

    @Test
    void aStrokeBecomesAnOutline() {
        Place second = WELL.moved(10, 0);
        Stroke stroke = Stroke.EMPTY.to(WELL).to(second).to(second);
        assertThat(stroke.places()).containsExactly(WELL, second);
        assertThatThrownBy(stroke::closed).isInstanceOf(Refusal.class);
        Stroke three = stroke.to(WELL.moved(0, 10));
        assertThat(three.to(WELL.moved(0, 10)).closed().size()).isEqualTo(3);
        assertThat(three.back()).isEqualTo(stroke);
        assertThat(Stroke.EMPTY.back()).isSameAs(Stroke.EMPTY);
        assertThat(three.to(WELL).closed().size()).isEqualTo(3);
    }
}
