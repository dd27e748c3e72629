package org.seepledger.review.change;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

/** What a difference is made of. */
class SplitTest {

    @Property(tries = 200)
    void partsAddToTheDifference(
            @ForAll @Size(8) double @DoubleRange(min = -1e6, max = 1e6) [] values,
            @ForAll @DoubleRange(min = -1e6, max = 1e6) double second) {
        double largest = Math.max(Math.abs(second), DoubleStream.of(values).map(Math::abs).max().orElse(0));
        assertThat(Split.of(values, second).sum()).isCloseTo(second - values[0], within(1e-14 * largest + 1e-300));
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
