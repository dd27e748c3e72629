package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class SectionFrameTest {

    private static final SectionFrame FRAME = new SectionFrame(new Box(50, 20, 500, 200), 0, 1000, 60, 100);

    @Test
    void exaggerationIsTheRatioOfTheScales() {
        // 0.5 pixels per metre across, 5 up.
        assertThat(FRAME.exaggeration()).isEqualTo(10);
        SectionFrame natural = FRAME.exaggerated(1);
        assertThat(natural.exaggeration()).isCloseTo(1, within(1e-12));
        assertThat(natural.from()).isCloseTo(0, within(1e-9));
        assertThat(natural.lowest() + natural.highest()).isCloseTo(160, within(1e-9));
    }

    @Property(tries = 50)
    void whatLiesUnderTheCursorStaysThere(
            @ForAll @DoubleRange(min = 50, max = 550) double x,
            @ForAll @DoubleRange(min = 20, max = 220) double y,
            @ForAll @DoubleRange(min = 0.1, max = 10) double across,
            @ForAll @DoubleRange(min = 0.1, max = 10) double up) {
        SectionFrame zoomed = FRAME.zoomed(x, y, across, up);
        assertThat(zoomed.along(x)).isCloseTo(FRAME.along(x), within(1e-6));
        assertThat(zoomed.elevation(y)).isCloseTo(FRAME.elevation(y), within(1e-6));
        assertThat(zoomed.exaggeration()).isCloseTo(10 * up / across, within(1e-6));
        assertThat(zoomed.x(zoomed.along(x))).isCloseTo(x, within(1e-6));
        assertThat(zoomed.y(zoomed.elevation(y))).isCloseTo(y, within(1e-6));
    }

    @Test
    void draggingFollowsTheHand() {
        SectionFrame dragged = FRAME.dragged(30, -10);
        assertThat(dragged.x(400)).isCloseTo(FRAME.x(400) + 30, within(1e-9));
        assertThat(dragged.y(80)).isCloseTo(FRAME.y(80) - 10, within(1e-9));
    }

    @Test
    void anotherSizeKeepsDistancesAndExaggeration() {
        SectionFrame wider = FRAME.in(new Box(0, 0, 800, 100));
        assertThat(wider.from()).isEqualTo(0);
        assertThat(wider.to()).isEqualTo(1000);
        assertThat(wider.exaggeration()).isCloseTo(10, within(1e-9));
    }

    @Test
    void nothingToSeeIsRefused() {
        assertThatThrownBy(() -> new SectionFrame(FRAME.box(), 5, 5, 0, 1))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new SectionFrame(new Box(0, 0, 0, 10), 0, 5, 0, 1))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
