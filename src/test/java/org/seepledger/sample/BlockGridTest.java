package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class BlockGridTest {

    private final BlockGrid grid = new BlockGrid(new double[] {0, 10, 30, 60}, new double[] {0, 5, 20}, new double[][] {
        {9, 9, 9, 9, 9, 9},
        {7, 7, 7, 7, 7, 7},
        {1, 2, 3, 4, 5, 6}
    });

    @Test
    void neighboursShareAFace() {
        int cell = grid.cell(1, 0, 1);
        assertThat(grid.east(cell)).isEqualTo(grid.west(grid.cell(1, 0, 2)));
        assertThat(grid.south(cell)).isEqualTo(grid.north(grid.cell(1, 1, 1)));
        assertThat(grid.top(cell)).isEqualTo(grid.bottom(grid.cell(0, 0, 1)));
        assertThat(grid.behind(grid.south(cell))).isEqualTo(grid.cell(1, 1, 1));
        assertThat(grid.ahead(grid.top(cell))).isEqualTo(grid.cell(0, 0, 1));
    }

    @Test
    void everyFaceIsCountedOnce() {
        // Across x 4 × 2 × 2, across y 3 × 3 × 2, across z 3 × 2 × 3.
        assertThat(grid.faces()).isEqualTo(16 + 18 + 18);
        long outer = IntStream.range(0, grid.faces())
                .filter(face -> grid.behind(face) == BlockGrid.OUTSIDE || grid.ahead(face) == BlockGrid.OUTSIDE)
                .count();
        assertThat(outer).isEqualTo(2 * (2 * 2 + 3 * 2 + 3 * 2));
    }

    @Test
    void rowsRunFromTheNorth() {
        int cell = grid.cell(1, 0, 2);
        assertThat(grid.height(cell)).isEqualTo(15);
        assertThat(grid.width(cell)).isEqualTo(30);
        assertThat(grid.centreX(cell)).isEqualTo(45);
        assertThat(grid.centreY(cell)).isEqualTo(12.5);
        assertThat(grid.thickness(cell)).isEqualTo(4);
        assertThat(grid.cellAt(59, 6)).isEqualTo(2);
        assertThat(grid.cellAt(1, 4)).isEqualTo(3);
    }
}
