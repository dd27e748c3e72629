package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class TicksTest {

    private static List<String> labels(double from, double to, int most) {
        Ticks ticks = Ticks.within(from, to, most);
        return IntStream.range(0, ticks.count()).mapToObj(ticks::label).toList();
    }

    @Test
    void areOneTwoOrFiveTimesAPowerOfTenApart() {
        assertThat(labels(0, 10, 6)).containsExactly("0", "2", "4", "6", "8", "10");
        assertThat(labels(-0.3, 0.31, 7)).containsExactly("−0.3", "−0.2", "−0.1", "0.0", "0.1", "0.2", "0.3");
        assertThat(labels(1203, 9810, 5)).containsExactly("2\u202f000", "4\u202f000", "6\u202f000", "8\u202f000");
        assertThat(labels(97.2, 98.4, 4)).containsExactly("97.5", "98.0");
    }

    @Test
    void farAwayFromZeroTheyAreStillRound() {
        assertThat(labels(5_200_010, 5_200_420, 5))
                .containsExactly(
                        "5\u202f200\u202f100", "5\u202f200\u202f200", "5\u202f200\u202f300", "5\u202f200\u202f400");
    }

    @Test
    void veryLargeAndVerySmallOnesAreWrittenInPowersOfTen() {
        assertThat(labels(0, 3e9, 4)).containsExactly("0", "1.0e+09", "2.0e+09", "3.0e+09");
    }

    @Test
    void inPowersOfTenTheyStillDiffer() {
        assertThat(labels(1.21e10, 1.24e10, 4)).containsExactly("1.21e+10", "1.22e+10", "1.23e+10", "1.24e+10");
    }

    @Test
    void anEmptyRangeHasNone() {
        assertThatIllegalArgumentException().isThrownBy(() -> Ticks.within(1, 1, 5));
    }

    @Property
    void lieWithinTheRangeAndAreNotTooManyNorNone(@ForAll long seed) {
        Random random = new Random(seed);
        double from = 1e6 * random.nextGaussian();
        double to = from + Math.pow(10, 9 * random.nextDouble() - 3);
        int most = 2 + random.nextInt(18);
        List<Double> values = Ticks.within(from, to, most).values();
        assertThat(values).hasSizeBetween(most >= 4 ? 1 : 0, most);
        assertThat(values).allSatisfy(value -> assertThat(value).isBetween(Math.nextDown(from), Math.nextUp(to)));
        for (int i = 2; i < values.size(); i++) {
            assertThat(values.get(i) - values.get(i - 1))
                    .isCloseTo(values.get(1) - values.get(0), within(1e-6 * (to - from)));
        }
    }
}
