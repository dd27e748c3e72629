package org.seepledger.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

class CellCentresTest {

    private static final Axis UNEVEN = Axis.of(
            2000, 2080, 2160, 2240, 2300, 2360, 2405, 2450, 2485, 2510, 2535, 2560, 2595, 2640, 2700, 2780, 2860);

    /** Centres as a table has them: with three decimals, in any order, some cells absent. */
    private static double[][] centres(Grid grid, double share) {
        Random random = new Random(5);
        double[][] centres = new double[2][grid.rows() * grid.columns()];
        int count = 0;
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                if (random.nextDouble() < share) {
                    double x = (grid.x().edge(column) + grid.x().edge(column + 1)) / 2;
                    double y = (grid.y().edge(row) + grid.y().edge(row + 1)) / 2;
                    centres[0][count] = written(grid.mapX(x, y));
                    centres[1][count++] = written(grid.mapY(x, y));
                }
            }
        }
        return new double[][] {java.util.Arrays.copyOf(centres[0], count), java.util.Arrays.copyOf(centres[1], count)};
    }

    private static double written(double value) {
        return Double.parseDouble(String.format(Locale.ROOT, "%.3f", value));
    }

    private static void assertFound(Grid grid, double share, double near) {
        double[][] centres = centres(grid, share);
        Optional<Grid> found = CellCentres.grid(centres[0], centres[1]);
        assertThat(found).isPresent();
        assertThat(found.get().columns()).isEqualTo(grid.columns());
        assertThat(found.get().rows()).isEqualTo(grid.rows());
        assertThat(found.get().rotation()).isCloseTo(grid.rotation(), within(1e-3));
        assertThat(found.get().x().origin()).isCloseTo(grid.x().origin(), within(near));
        assertThat(found.get().y().origin()).isCloseTo(grid.y().origin(), within(near));
        for (int i = 0; i <= grid.columns(); i++) {
            assertThat(found.get().x().edge(i)).isCloseTo(grid.x().edge(i), within(near));
        }
    }

    @Test
    void anEvenGridIsFoundToTheLastDigit() {
        Grid grid = new Grid(Axis.even(500_000, 50, 60), Axis.even(5_200_000, 40, 48), 0, 1);
        double[][] centres = centres(grid, 1);
        Grid found = CellCentres.grid(centres[0], centres[1]).orElseThrow();
        assertThat(found.x().isEven() && found.y().isEven()).isTrue();
        assertThat(found.x().origin()).isEqualTo(500_000);
        assertThat(found.x().edge(1)).isEqualTo(50);
        assertThat(found.y().origin()).isEqualTo(5_200_000);
        assertThat(found.y().edge(1)).isEqualTo(40);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 28, -13, 44})
    void anEvenGridIsFoundHoweverItIsTurned(double turn) {
        assertFound(new Grid(Axis.even(500_000, 50, 30), Axis.even(5_200_000, 40, 24), turn, 1), 1, 0.02);
        assertFound(new Grid(Axis.even(500_000, 50, 30), Axis.even(5_200_000, 40, 24), turn, 1), 0.7, 0.02);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 28})
    void unevenWidthsAreFound(double turn) {
        assertFound(new Grid(UNEVEN, Axis.even(1000, 45, 20), turn, 1), 1, 0.05);
    }

    @Test
    void aRowWithoutAnyCellIsPutIn() {
        double[] x = {25, 75, 125, 25, 75, 125, 25, 75, 125};
        double[] y = {25, 25, 25, 75, 75, 75, 175, 175, 175};
        Grid found = CellCentres.grid(x, y).orElseThrow();
        assertThat(found.rows()).isEqualTo(4);
        assertThat(found.y().isEven()).isTrue();
    }

    @Test
    void scatteredPlacesAreNoGrid() {
        Random random = new Random(3);
        double[] x = random.doubles(500, 0, 1000).toArray();
        double[] y = random.doubles(500, 0, 1000).toArray();
        assertThat(CellCentres.grid(x, y)).isEmpty();
        assertThat(CellCentres.grid(new double[] {1, 1, 1, 1}, new double[] {2, 2, 2, 2}))
                .isEmpty();
        assertThat(CellCentres.grid(new double[0], new double[0])).isEmpty();
    }
}
