package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

class DrapeTest {

    private static final Box BOX = new Box(10, 20, 400, 300);

    private static Drape numbered(Grid grid, Window window, int most) {
        return Drape.of(grid, window, most, row -> {
            double[] values = new double[window.columns()];
            for (int j = 0; j < values.length; j++) {
                values[j] = 100.0 * row + window.column() + j;
            }
            return values;
        });
    }

    private static Axis axis(Random random) {
        if (random.nextBoolean()) {
            return Axis.even(1000 * random.nextDouble(), 1 + random.nextInt(9), 3 + random.nextInt(9));
        }
        double[] edges = new double[4 + random.nextInt(9)];
        for (int i = 1; i < edges.length; i++) {
            edges[i] = edges[i - 1] + 1 + random.nextInt(9);
        }
        return Axis.of(edges);
    }

    /** Whatever the grid, a cell's middle shows the cell's colour. */
    @Property(tries = 100)
    void theMiddleOfEachCellHasItsColour(@ForAll long seed) {
        Random random = new Random(seed);
        Grid grid = new Grid(axis(random), axis(random), 360 * random.nextDouble(), 1);
        MapFrame frame = MapFrame.fitting(BOX, -100, -100, 1100, 1100);
        Drape drape = numbered(grid, grid.window(), 100);
        ValueScale scale = ValueScale.over(drape.values());
        Mark.Image image = drape.image(frame, scale, 1);
        double[] m = image.placement();
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                double x = frame.x(drape.mapX(row, column)) - m[4];
                double y = frame.y(drape.mapY(row, column)) - m[5];
                double determinant = m[0] * m[3] - m[1] * m[2];
                int across = (int) Math.floor((x * m[3] - y * m[2]) / determinant);
                int down = (int) Math.floor((y * m[0] - x * m[1]) / determinant);
                assertThat(image.argb()[down * image.columns() + across])
                        .isEqualTo(scale.argb(100.0 * row + column, 1));
            }
        }
    }

    @Test
    void tooManyCellsAreThinnedToTheMiddleOnesOfBlocks() {
        Grid grid = new Grid(Axis.even(0, 1, 10), Axis.even(0, 1, 7), 0, 1);
        Drape drape = numbered(grid, new Window(1, 2, 6, 7), 3);
        // Rows 1 to 6 by twos, columns 2 to 8 by threes, the last alone.
        assertThat(drape.values()).containsExactly(103, 106, 108, 303, 306, 308, 503, 506, 508);
    }

    @Test
    void cellsWithoutAValueAreLeftOut() {
        Grid grid = new Grid(Axis.even(0, 1, 2), Axis.even(0, 1, 1), 0, 1);
        Drape drape = Drape.of(grid, grid.window(), 9, row -> new double[] {Double.NaN, Double.NEGATIVE_INFINITY});
        Mark.Image image = drape.image(MapFrame.fitting(BOX, 0, 0, 2, 1), ValueScale.over(drape.values()), 1);
        assertThat(image.argb()).containsOnly(0);
    }

    @Property(tries = 100)
    void theWindowOfAFrameHoldsEveryCellThatItShows(@ForAll long seed) {
        Random random = new Random(seed);
        Grid grid = new Grid(axis(random), axis(random), 360 * random.nextDouble(), 1);
        Drape drape = numbered(grid, grid.window(), 100);
        int row = random.nextInt(grid.rows());
        int column = random.nextInt(grid.columns());
        double x = drape.mapX(row, column);
        double y = drape.mapY(row, column);
        MapFrame frame = MapFrame.fitting(BOX, x - 1 - random.nextInt(20), y - 2, x + 3, y + 1 + random.nextInt(20));
        assertThat(frame.window(grid).contains(row, column)).isTrue();
        assertThat(frame.mapX(frame.x(x))).isCloseTo(x, within(1e-9));
        assertThat(frame.mapY(frame.y(y))).isCloseTo(y, within(1e-9));
    }
}
