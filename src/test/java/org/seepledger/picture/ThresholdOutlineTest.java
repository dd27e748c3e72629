package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** The outline of cells above a threshold encloses these cells and no others. */
class ThresholdOutlineTest {

    private static final Grid EVEN = new Grid(Axis.even(100, 10, 4), Axis.even(200, 10, 4), 0, 1);

    private static Drape drape(Grid grid, double... values) {
        return Drape.of(grid, grid.window(), 100, row -> {
            double[] line = new double[grid.columns()];
            System.arraycopy(values, row * grid.columns(), line, 0, line.length);
            return line;
        });
    }

    /** Shoelace, positive clockwise with north up. */
    private static double area(double[] ring) {
        double twice = 0;
        for (int i = 0; i < ring.length; i += 2) {
            int next = (i + 2) % ring.length;
            twice += ring[next] * ring[i + 1] - ring[i] * ring[next + 1];
        }
        return twice / 2;
    }

    private static double area(List<double[]> rings) {
        return rings.stream().mapToDouble(ThresholdOutlineTest::area).sum();
    }

    @Test
    void aHoleAndACornerAreRingsOfTheirOwn() {
        Drape drape = drape(EVEN, 9, 9, 9, 0, 9, 0, 9, 0, 9, 9, 9, 0, 0, 0, Double.NaN, 9);
        List<double[]> rings = ThresholdOutline.of(drape, 5).rings();
        assertThat(rings).extracting(ThresholdOutlineTest::area).containsExactlyInAnyOrder(900.0, -100.0, 100.0);
        assertThat(rings).allMatch(ring -> ring.length == 8);
    }

    @Test
    void whatEqualsTheThresholdIsNotAboveIt() {
        assertThat(ThresholdOutline.of(drape(EVEN, new double[16]), 0).rings()).isEmpty();
    }

    @Property(tries = 50)
    void theEnclosedAreaIsThatOfTheCellsAbove(@ForAll @IntRange(max = 65535) int pattern) {
        Axis x = Axis.of(new double[] {0, 1, 3, 7, 15});
        Axis y = Axis.of(new double[] {0, 2, 3, 10, 11});
        Grid grid = new Grid(x, y, 30, 1);
        double[] values = new double[16];
        double expected = 0;
        for (int cell = 0; cell < 16; cell++) {
            values[cell] = pattern >> cell & 1;
            expected += values[cell] * grid.area(cell / 4, cell % 4);
        }
        List<double[]> rings = ThresholdOutline.of(drape(grid, values), 0.5).rings();
        assertThat(area(rings)).isCloseTo(expected, within(1e-10));
    }
}
