package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class RiverTest {

    /** Two reaches of lengths 50 (30 by 40) and 20, worked by hand. */
    @Test
    void reachesAreCutAtTheEdgesOfCells() {
        BlockGrid grid = new BlockGrid(
                new double[] {0, 18, 100}, new double[] {0, 50, 80}, new double[][] {{9, 9, 9, 9}, {0, 0, 0, 0}});
        River river = new River(new double[] {3, 33, 33}, new double[] {5, 45, 65}, 2, 0.1, 8, 0.01);
        List<River.Piece> pieces = river.pieces(grid);
        assertThat(pieces).extracting(River.Piece::reach).containsExactly(1, 1, 2, 2);
        assertThat(pieces).extracting(piece -> piece.exchange().cell()).containsExactly(2, 3, 3, 1);
        // Half of the first reach lies west of x = 18; the second crosses y = 50 after 5 of its 20 m.
        double[] lengths = {25, 25, 5, 15};
        double[] middles = {12.5, 37.5, 52.5, 62.5};
        for (int i = 0; i < 4; i++) {
            Exchange exchange = pieces.get(i).exchange();
            assertThat(exchange.conductance()).isCloseTo(0.1 * 2 * lengths[i], within(1e-12));
            assertThat(exchange.level()).isCloseTo(8 - 0.01 * middles[i], within(1e-12));
        }
    }
}
