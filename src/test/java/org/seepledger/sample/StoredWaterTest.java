package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** A block of 10 m by 7 m with 4 m of gravel above 6 m of a confined layer, worked by hand. */
class StoredWaterTest {

    private static final double AREA = 70;

    private final BlockGrid grid =
            new BlockGrid(new double[] {0, 10}, new double[] {0, 7}, new double[][] {{10}, {6}, {0}});
    private final StoredWater stored =
            new StoredWater(grid, new boolean[] {true, false}, new double[] {0.2, 0.2}, new double[] {0.001, 0.0005});

    /** From 12 m, two above the top, to 7 m: drained over 3 m, with 4 m of water over 2 m of head and 4 to 1 m over 3 m. */
    @Test
    void aCellThatTurnsFromConfinedToUnconfinedIsSplitAtItsTop() {
        double expected = AREA * (0.2 * 3 + 0.001 * (4 * 2 + (4 * 4 - 1) / 2.0));
        assertThat(stored.volume(0, 12) - stored.volume(0, 7)).isCloseTo(expected, within(1e-12));
        assertThat(stored.release(0, 12, 7, 5).flow(7)).isCloseTo(expected / 5, within(1e-12));
    }

    @Test
    void aCellGivesNothingMoreBelowItsBottom() {
        assertThat(stored.volume(0, 6) - stored.volume(0, 1)).isZero();
        assertThat(stored.volume(1, 9) - stored.volume(1, -1)).isCloseTo(AREA * 0.0005 * 6 * 10, within(1e-12));
    }

    @Test
    void perHeadIsTheSlopeOfTheVolume() {
        for (double head : new double[] {6.5, 8, 9.5, 10.5, 13}) {
            for (int cell = 0; cell < 2; cell++) {
                double slope = (stored.volume(cell, head + 1e-4) - stored.volume(cell, head - 1e-4)) / 2e-4;
                assertThat(stored.perHead(cell, head)).as("at %s", head).isCloseTo(slope, within(1e-8));
            }
        }
        assertThat(stored.perHead(0, 3)).isPositive();
    }
}
