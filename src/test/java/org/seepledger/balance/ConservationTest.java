package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.progress.Progress;

/**
 * Faces sum to the integral over the volume on any polygon. The engine itself refuses to answer where they do not; here
 * it is given every chance to.
 */
class ConservationTest {

    @Property(tries = 500)
    void facesSumToTheVolumeIntegral(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0, 0, 12);
        Balance balance = WaterBalance.of(aquifer, List.of(random.prism("a")), WellRule.POINT, 1, Progress.NONE);
        assertThat(balance.notes().disagreement()).isLessThan(1e-12);
    }

    @Property(tries = 500)
    void alsoWithInactiveAndPinchedOutCells(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0.1, 0.3, 0);
        Balance balance = WaterBalance.of(aquifer, List.of(random.prism("a")), WellRule.POINT, 1, Progress.NONE);
        assertThat(balance.notes().disagreement()).isLessThan(1e-12);
    }
}
