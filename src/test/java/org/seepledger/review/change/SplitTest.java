package org.seepledger.review.change;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** What a difference is made of. */
class SplitTest {

    @Test
    void partsAddToTheDifference() {
        Random random = new Random(7);
        for (int i = 0; i < 200; i++) {
            double[] values = random.doubles(8, -1e6, 1e6).toArray();
            double second = 1e6 * random.nextDouble();
            assertThat(Split.of(values, second).sum()).isCloseTo(second - values[0], within(1e-8));
        }
    }

    /** A rate over an area in a time: (area, period, inputs) = (10, 2, 3) → (20, 4, 3); only what changes has a part. */
    @Test
    void nothingIsDueToWhatDidNotChange() {
        double[] values = new double[8];
        for (int place = 0; place < 8; place++) {
            values[place] = ((place & Split.AREA) != 0 ? 20 : 10) * ((place & Split.PERIOD) != 0 ? 4 : 2) * 3;
        }
        Split split = Split.of(values, 480);
        assertThat(split.inputs()).isZero();
        assertThat(split.area()).isCloseTo(90, within(1e-12));
        assertThat(split.period()).isCloseTo(90, within(1e-12));
        assertThat(split.unit()).isCloseTo(240, within(1e-12));
    }
}
