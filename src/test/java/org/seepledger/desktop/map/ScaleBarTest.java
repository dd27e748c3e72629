package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class ScaleBarTest {

    @Test
    void lengthsAreRound() {
        assertThat(ScaleBar.round(999)).isEqualTo(500);
        assertThat(ScaleBar.round(1000)).isEqualTo(1000);
        assertThat(ScaleBar.round(0.21)).isEqualTo(0.2);
    }

    @Property(tries = 200)
    void theBarIsNeverShorterThanAThirdOfItsRoom(@ForAll @DoubleRange(min = 0.01, max = 1e9) double most) {
        assertThat(ScaleBar.round(most)).isLessThanOrEqualTo(most * (1 + 1e-12)).isGreaterThan(most / 2.5001);
    }
}
