package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;

class SpreadTest {

    @Property(tries = 200)
    void noTwoAreTooCloseAndAllLieBetweenTheEnds(@ForAll long seed, @ForAll @IntRange(min = 0, max = 10) int count) {
        double[] wanted = new Random(seed).doubles(count, -20, 220).sorted().toArray();
        double[] places = Spread.out(wanted, 20, 10, 190);
        for (int i = 0; i < count; i++) {
            assertThat(places[i]).isBetween(10 - 1e-9, 190 + 1e-9);
            if (i > 0) {
                assertThat(places[i] - places[i - 1]).isGreaterThanOrEqualTo(20 - 1e-9);
            }
        }
    }

    @Test
    void whatHasRoomStaysAndNeighboursShareTheMove() {
        assertThat(Spread.out(new double[] {30, 60, 120}, 20, 0, 200)).containsExactly(30, 60, 120);
        assertThat(Spread.out(new double[] {100, 100}, 20, 0, 200)).containsExactly(90, 110);
        assertThat(Spread.out(new double[] {100, 101, 102}, 20, 0, 200)[1]).isCloseTo(101, within(1e-9));
    }
}
