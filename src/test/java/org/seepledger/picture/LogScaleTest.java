package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class LogScaleTest {

    private static final ValueScale LINEAR = ValueScale.ofConcentrations(new double[] {0, 0.02, 5});

    @Test
    void equalRatiosTakeEqualParts() {
        ValueScale scale = new ValueScale(Ramp.STAIN, 0.01, 100, true);
        assertThat(scale.share(1)).isCloseTo(0.5, within(1e-12));
        assertThat(scale.at(0.25)).isCloseTo(0.1, within(1e-15));
        assertThat(scale.argb(0, 1)).isEqualTo(0xff000000 | Ramp.STAIN.rgb(0));
        assertThat(scale.argb(-3, 1)).isEqualTo(0xff000000 | Ramp.STAIN.rgb(0));
        assertThat(scale.argb(Double.NaN, 1)).isZero();
        assertThatIllegalArgumentException().isThrownBy(() -> new ValueScale(Ramp.STAIN, 0, 1, true));
    }

    @Test
    void coversWhatThereIsButNoMoreThanFourPowersOfTen() {
        ValueScale found = LINEAR.logarithmicOver(new double[] {0, 0.02, 5, Double.NaN});
        assertThat(found).isEqualTo(new ValueScale(Ramp.STAIN, 0.02, 5, true));
        assertThat(LINEAR.logarithmicOver(new double[] {1e-9, 5}).from()).isEqualTo(5e-4);
        assertThat(LINEAR.logarithmicOver(new double[] {5, 5}).from()).isEqualTo(0.5);
        assertThat(LINEAR.logarithmicOver(new double[] {0, 0})).isSameAs(LINEAR);
    }

    @Test
    void ticksAreRoundAndNoMoreThanAskedFor() {
        RoundValues ticks = new ValueScale(Ramp.STAIN, 0.02, 5, true).ticks(8);
        assertThat(ticks.values()).containsExactly(0.02, 0.05, 0.1, 0.2, 0.5, 1.0, 2.0, 5.0);
        assertThat(LogTicks.within(0.02, 5, 4).values()).containsExactly(0.1, 1.0);
        assertThat(LogTicks.within(1e-6, 1e6, 4).count()).isBetween(2, 4);
        assertThat(LogTicks.within(1e-6, 1, 12).label(0)).isEqualTo("1e−6");
        assertThat(LogTicks.within(0.02, 5, 4).label(0)).isEqualTo("0.1");
    }
}
