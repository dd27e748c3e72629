package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.WellRule;
import org.seepledger.progress.Progress;

/** A grid of several bands: the result depends neither on the number of threads nor on where bands end. */
class SoluteThreadsTest {

    private static final int ROWS = 140_000;

    private static Plume plume(int threads) {
        Aquifer aquifer = SmallPlumes.uniform(1, ROWS, 1, 1, new double[] {0, 0.1, 0}, 0, 1);
        Solute solute = SoluteDraft.of(
                        "salt", FormulaValues.steady(aquifer.grid(), (x, y) -> 1 + Math.sin(y / 1000) + y / ROWS))
                .retardation(2)
                .decay(0.1)
                .dispersion(3, 0.3, 0.3, 1e-3)
                .done();
        return SoluteBalance.of(
                        aquifer,
                        List.of(solute),
                        List.of(SmallPlumes.box("strip", 0, 0, 0, 10, 1, ROWS - 10)),
                        new SoluteBalance.Options(WellRule.POINT, true, OptionalDouble.of(1.5), threads),
                        Progress.NONE)
                .get(0);
    }

    @Test
    void isTheSameWithAnyNumberOfThreads() {
        Plume one = plume(1);
        Plume four = plume(4);
        assertThat(four.ledger().outflow(0)).isEqualTo(one.ledger().outflow(0));
        assertThat(four.whole(1).total(NonDetects.HALF)).isEqualTo(one.whole(1).total(NonDetects.HALF));
        assertThat(four.whole(1).spread()).isEqualTo(one.whole(1).spread());
        // No band counts twice, and none is left out.
        assertThat(one.whole(1).rock()).isCloseTo(10.0 * (ROWS - 20), within(1e-3));
        assertThat(one.whole(1).detects()).isEqualTo(ROWS - 20);
    }
}
