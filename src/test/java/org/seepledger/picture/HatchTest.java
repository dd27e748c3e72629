package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class HatchTest {

    private static double length(double[] segment) {
        return Math.hypot(segment[2] - segment[0], segment[3] - segment[1]);
    }

    /** Lines 7 apart along x are 7/√2 apart across, so that their length is the area divided by that. */
    @ParameterizedTest
    @EnumSource(names = {"RISING", "FALLING"})
    void linesAreAsLongAsTheAreaIsLarge(Mark.Texture texture) {
        List<double[]> ringed = List.of(
                new double[] {0, 0, 700, 0, 700, 700, 0, 700}, new double[] {210, 210, 210, 490, 490, 490, 490, 210});
        double drawn = Hatch.of(ringed, texture).stream()
                .mapToDouble(HatchTest::length)
                .sum();
        assertThat(drawn).isCloseTo((490_000 - 78_400) / (7 / Math.sqrt(2)), within(0.01 * 58_000));
    }

    @Property(tries = 50)
    void nothingLiesOutsideTheArea(
            @ForAll @DoubleRange(min = -50, max = 50) double x,
            @ForAll @DoubleRange(min = -50, max = 50) double y,
            @ForAll @DoubleRange(min = 0.5, max = 60) double size) {
        Box box = new Box(x, y, size, 2 * size);
        for (Mark.Texture texture : Mark.Texture.values()) {
            assertThat(Hatch.of(List.of(box.ring()), texture)).allSatisfy(segment -> {
                assertThat(segment[0]).isBetween(x - 1e-9, box.right() + 1e-9);
                assertThat(segment[1]).isBetween(y - 1e-9, box.bottom() + 1e-9);
                assertThat(segment[2]).isBetween(x - 1e-9, box.right() + 1e-9);
                assertThat(segment[3]).isBetween(y - 1e-9, box.bottom() + 1e-9);
            });
        }
    }

    @Test
    void risingLinesRiseAndFallingLinesFall() {
        List<double[]> ring = List.of(new Box(0, 0, 10, 10).ring());
        assertThat(Hatch.of(ring, Mark.Texture.RISING))
                .allMatch(segment -> (segment[2] - segment[0]) * (segment[3] - segment[1]) < 0);
        assertThat(Hatch.of(ring, Mark.Texture.FALLING))
                .allMatch(segment -> (segment[2] - segment[0]) * (segment[3] - segment[1]) > 0);
        assertThat(Hatch.of(ring, Mark.Texture.CROSSED)).hasSize(5);
        assertThat(Hatch.of(ring, Mark.Texture.PLAIN)).isEmpty();
    }

    @Test
    void dotsStandInRowsThatAreShifted() {
        List<double[]> ring = List.of(new Box(1, 1, 13.5, 14).ring());
        assertThat(Hatch.of(ring, Mark.Texture.DOTS))
                .containsExactly(
                        new double[] {3.5, 7, 3.5, 7},
                        new double[] {10.5, 7, 10.5, 7},
                        new double[] {7, 14, 7, 14},
                        new double[] {14, 14, 14, 14});
    }
}
