package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class PumpedWellTest {

    private static final int MAY_2022 = 7;
    private static final int JUNE_2022 = 8;

    @Test
    void aMonthPumpedInPartHasItsMean() {
        PumpedWell well = well(PumpedWell.Line.between("2022-05-11", "2022-06-01", -310));
        assertThat(well.rate(MAY_2022)).isCloseTo(-310 * 21 / 31.0, within(1e-12));
        assertThat(well.rate(JUNE_2022)).isZero();
        assertThat(well(PumpedWell.Line.always(-5)).rate(JUNE_2022)).isCloseTo(-5, within(1e-12));
    }

    @Test
    void aVolumeIsSpreadOverItsDays() {
        PumpedWell well = well(PumpedWell.Line.volume("2022-05-22", "2022-06-11", -400));
        assertThat(well.rate(MAY_2022) * 31).isCloseTo(-400 / 2.0, within(1e-12));
        assertThat(well.rate(JUNE_2022) * 30).isCloseTo(-400 / 2.0, within(1e-12));
    }

    /** 3 m of 8 m/d, 1 m of 0.1 m/d, a layer in which nothing flows, and one below the screen. */
    @Test
    void layersShareByConductivityAndScreen() {
        BlockGrid grid =
                new BlockGrid(new double[] {0, 10}, new double[] {0, 10}, new double[][] {{9}, {5}, {4}, {0}, {-5}});
        double[] shares = well(PumpedWell.Line.always(-1)).shares(grid, new double[] {8, 0.1, Double.NaN, 2});
        assertThat(shares).containsExactly(24 / 24.1, 0.1 / 24.1, 0, 0);
    }

    private static PumpedWell well(PumpedWell.Line line) {
        return new PumpedWell("any", "any", 5, 5, 8, 1, List.of(line));
    }
}
