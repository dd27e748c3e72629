package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;

/** Lines of equal value on 40 by 40 cells of one unit. */
class ContoursTest {

    private static final Grid GRID = new Grid(Axis.even(100, 1, 40), Axis.even(200, 1, 40), 0, 1);

    private static Drape field(DoubleBinaryOperator value) {
        return Drape.of(GRID, GRID.window(), 100, row -> {
            double[] values = new double[40];
            for (int column = 0; column < 40; column++) {
                values[column] = value.applyAsDouble(column + 0.5, GRID.flipped(row) + 0.5);
            }
            return values;
        });
    }

    @Test
    void aConeHasCircles() {
        Drape cone = field((x, y) -> Math.hypot(x - 20, y - 20));
        List<double[]> lines = Contours.at(cone, 10.3);
        assertThat(lines).hasSize(1);
        double[] circle = lines.get(0);
        for (int i = 0; i < circle.length; i += 2) {
            assertThat(Math.hypot(circle[i] - 120, circle[i + 1] - 220)).isCloseTo(10.3, within(0.1));
        }
        assertThat(circle[0]).isEqualTo(circle[circle.length - 2]);
        assertThat(circle[1]).isEqualTo(circle[circle.length - 1]);
    }

    @Test
    void aSlopeHasOneStraightLineFromEdgeToEdge() {
        List<double[]> lines = Contours.at(field((x, y) -> 2 * x), 31);
        assertThat(lines).hasSize(1);
        double[] line = lines.get(0);
        for (int i = 0; i < line.length; i += 2) {
            assertThat(line[i]).isCloseTo(115.5, within(1e-12));
        }
        assertThat(Math.abs(line[line.length - 1] - line[1])).isEqualTo(39);
    }

    @Test
    void aGapEndsALine() {
        List<double[]> lines = Contours.at(field((x, y) -> Math.abs(y - 20) < 3 ? Double.NaN : x), 10.2);
        assertThat(lines).hasSize(2);
    }

    @Test
    void aSaddleIsPassedOnTheSideOfItsMean() {
        // Two hills side by side diagonally: below the pass between them they are one, above it two.
        Drape hills = field((x, y) -> -Math.min(Math.hypot(x - 15, y - 15), Math.hypot(x - 25, y - 25)));
        assertThat(Contours.at(hills, -8)).hasSize(1);
        assertThat(Contours.at(hills, -6)).hasSize(2);
    }

    @Test
    void whereNothingHasTheValueThereIsNoLine() {
        assertThat(Contours.at(field((x, y) -> 1), 1)).isEmpty();
        assertThat(Contours.at(field((x, y) -> x), 99)).isEmpty();
    }
}
