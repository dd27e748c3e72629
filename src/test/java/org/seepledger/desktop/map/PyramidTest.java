package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

class PyramidTest {

    private static Pyramid even(int rows, int columns, double... cells) {
        return Pyramid.of(Lattice.of(new Grid(Axis.even(0, 10, columns), Axis.even(0, 10, rows), 0, 1)), cells);
    }

    @Test
    void aLevelHasTheMeansOfThoseOfFourThatHaveAValue() {
        double nan = Double.NaN;
        Pyramid.Level level =
                even(3, 3, 1, 2, 9, 3, nan, 11, nan, nan, nan).level(0).reduced();
        assertThat(level.rows()).isEqualTo(2);
        assertThat(level.columns()).isEqualTo(2);
        assertThat(level.values()).containsExactly(2f, 10f, Float.NaN, Float.NaN);
    }

    @Test
    void levelsGoUpToOneTile() {
        double[] cells = new double[1000 * 600];
        Arrays.fill(cells, 7);
        Pyramid pyramid = even(1000, 600, cells);
        assertThat(pyramid.levels()).isEqualTo(3);
        assertThat(pyramid.level(2).rows()).isEqualTo(250);
        assertThat(pyramid.level(2).columns()).isEqualTo(150);
        assertThat(pyramid.level(2).at(249, 149)).isEqualTo(7f);
    }

    @Test
    void theLevelIsTheFinestWhoseTexelsAreAtLeastADevicePixel() {
        Pyramid pyramid = even(1000, 600, new double[600_000]);
        assertThat(pyramid.levelFor(0.1)).isZero();
        assertThat(pyramid.levelFor(0.09)).isEqualTo(1);
        assertThat(pyramid.levelFor(0.05)).isEqualTo(1);
        assertThat(pyramid.levelFor(0.049)).isEqualTo(2);
        assertThat(pyramid.levelFor(1e-6)).isEqualTo(2);
        assertThat(pyramid.levelFor(1e6)).isZero();
    }

    @Test
    void anUnevenGridIsShownTrueToScale() {
        Grid grid = new Grid(Axis.of(0, 10, 40), Axis.of(0, 20, 30), 0, 1);
        Pyramid pyramid = Pyramid.of(Lattice.of(grid), new double[] {1, 2, 3, 4});
        assertThat(pyramid.level(0).columns()).isEqualTo(4);
        assertThat(pyramid.level(0).rows()).isEqualTo(3);
        assertThat(pyramid.level(0).values()).containsExactly(1f, 2f, 2f, 2f, 3f, 4f, 4f, 4f, 3f, 4f, 4f, 4f);
        assertThat(pyramid.cells(0)).containsExactly(1, 2);
        assertThat(pyramid.cells(1)).containsExactly(3, 4);
    }

    @Test
    void valuesThatDifferByRoundingAreFlat() {
        double[] same = new double[25];
        for (int i = 0; i < same.length; i++) {
            same[i] = 101.3 + 1e-9 * i;
        }
        assertThat(even(5, 5, same).isFlat()).isTrue();
        same[7] = Double.NaN;
        same[8] = 101.31;
        assertThat(even(5, 5, same).isFlat()).isFalse();
    }
}
