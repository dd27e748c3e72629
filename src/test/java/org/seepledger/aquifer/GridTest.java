package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Two columns 1 and 2 wide, three rows 4, 5 and 6 high from the south, corner at (10, 20). */
class GridTest {

    private static final Axis X = Axis.of(10, 11, 13);
    private static final Axis Y = Axis.of(20, 24, 29, 35);

    @Test
    void countsRowsFromTheNorth() {
        Grid grid = new Grid(X, Y, 0, 1);
        assertThat(grid.rows()).isEqualTo(3);
        assertThat(grid.columns()).isEqualTo(2);
        assertThat(grid.height(0)).isEqualTo(6);
        assertThat(grid.height(2)).isEqualTo(4);
        assertThat(grid.flipped(0)).isEqualTo(2);
        assertThat(grid.area(1, 1)).isEqualTo(10);
        assertThat(grid.window()).isEqualTo(new Window(0, 0, 3, 2));
    }

    @Test
    void sizesAreInLengthUnitsPlacesInPlanUnits() {
        Grid grid = new Grid(X, Y, 0, 3);
        assertThat(grid.width(1)).isEqualTo(6);
        assertThat(grid.height(0)).isEqualTo(18);
        assertThat(grid.area(0, 1)).isEqualTo(108);
        assertThat(grid.localX(12, 25)).isEqualTo(2);
        assertThat(grid.localY(12, 25)).isEqualTo(5);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 12, 25",
        "90, 5, 22",
        "180, 8, 15",
        "270, 15, 18",
        "-90, 15, 18",
        "450, 5, 22",
        "360, 12, 25",
        "-270, 5, 22"
    })
    void quarterTurnsAboutTheCornerAreExact(double rotation, double mapX, double mapY) {
        Grid grid = new Grid(X, Y, rotation, 1);
        assertThat(grid.mapX(2, 5)).isEqualTo(mapX);
        assertThat(grid.mapY(2, 5)).isEqualTo(mapY);
        assertThat(grid.localX(mapX, mapY)).isEqualTo(2);
        assertThat(grid.localY(mapX, mapY)).isEqualTo(5);
    }

    @Test
    void turnsCounterClockwise() {
        Grid grid = new Grid(X, Y, 30, 1);
        assertThat(grid.mapX(2, 0)).isEqualTo(10 + Math.sqrt(3), within(1e-14));
        assertThat(grid.mapY(2, 0)).isEqualTo(21, within(1e-14));
        assertThat(grid.localX(grid.mapX(1.5, 7), grid.mapY(1.5, 7))).isEqualTo(1.5, within(1e-14));
        assertThat(grid.localY(grid.mapX(1.5, 7), grid.mapY(1.5, 7))).isEqualTo(7, within(1e-14));
    }

    @Test
    void holdsPlacesUpToTheEdgeAndTheRoundingOfTheirCoordinates() {
        Grid grid = new Grid(X, Y, 0, 1);
        assertThat(grid.holds(10, 20)).isTrue();
        assertThat(grid.holds(13, 35)).isTrue();
        assertThat(grid.holds(13.001, 30)).isFalse();
        assertThat(grid.holds(9.999, 30)).isFalse();
        assertThat(grid.holds(12, 35.001)).isFalse();
        assertThat(grid.holds(12, 19.999)).isFalse();
        Grid far = new Grid(Axis.even(1e9, 1, 2), Axis.even(0, 1, 2), 0, 1);
        // A step of the number format there is 1.2e-7, of which four may be lost.
        assertThat(far.holds(1e9 - 2.4e-7, 1)).isTrue();
        assertThat(far.holds(1e9 - 1e-6, 1)).isFalse();
    }

    @Test
    void windowsAreBlocksOfCells() {
        Window window = new Window(2, 3, 4, 5);
        assertThat(window.size()).isEqualTo(20);
        assertThat(window.rowEnd()).isEqualTo(6);
        assertThat(window.columnEnd()).isEqualTo(8);
        assertThat(window.index(3, 4)).isEqualTo(6);
        assertThat(window.contains(2, 3)).isTrue();
        assertThat(window.contains(5, 7)).isTrue();
        assertThat(window.contains(6, 7)).isFalse();
        assertThat(window.contains(5, 8)).isFalse();
        assertThat(window.contains(1, 3)).isFalse();
        assertThat(window.contains(2, 2)).isFalse();
    }

    @Test
    void aRingEndsAtTheGridsEdge() {
        Grid grid = new Grid(Axis.even(0, 1, 10), Axis.even(0, 1, 10), 0, 1);
        assertThat(new Window(3, 4, 2, 2).widened(1, grid)).isEqualTo(new Window(2, 3, 4, 4));
        assertThat(new Window(0, 0, 2, 2).widened(1, grid)).isEqualTo(new Window(0, 0, 3, 3));
        assertThat(new Window(8, 7, 2, 3).widened(2, grid)).isEqualTo(new Window(6, 5, 4, 5));
    }

    @ParameterizedTest
    @CsvSource({"-1, 0, 1, 1", "0, -1, 1, 1", "0, 0, 0, 1", "0, 0, 1, 0"})
    void refusesWhatIsNotABlock(int row, int column, int rows, int columns) {
        assertThatThrownBy(() -> new Window(row, column, rows, columns)).hasMessageContaining("not a block");
    }
}
