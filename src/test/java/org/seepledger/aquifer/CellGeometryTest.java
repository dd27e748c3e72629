package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.fault.DataFault;

class CellGeometryTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 3), Axis.even(0, 1, 2), 0, 1);

    private static ArrayValues surface(double... values) {
        return ArrayValues.steady(3, values);
    }

    private static Layer layer(Optional<GriddedValues> top, GriddedValues bottom) {
        return new Layer("layer", top, bottom, false);
    }

    private static CellGeometry of(Layer... layers) {
        return CellGeometry.of(GRID, List.of(layers), GRID.window());
    }

    @Test
    void aLayerEndsWhereTheNextBegins() {
        CellGeometry cells = of(
                layer(Optional.of(surface(9, 9, 9, 8, 8, 8)), surface(5, 5, 9, 5, 5, Double.NaN)),
                layer(Optional.empty(), surface(1, 5, 3, 1, 1, 1)));
        Block block = cells.block();
        int cell = block.cell(1, 1, 0);
        assertThat(cells.top(cell)).isEqualTo(5);
        assertThat(cells.bottom(cell)).isEqualTo(1);
        assertThat(cells.thickness(cell)).isEqualTo(4);
        assertThat(cells.isPresent(cell)).isTrue();
        assertThat(cells.isPinchedOut(cell)).isFalse();
        int pinched = block.cell(1, 0, 1);
        assertThat(cells.isPresent(pinched)).isFalse();
        assertThat(cells.isPinchedOut(pinched)).isTrue();
        int unknown = block.cell(0, 1, 2);
        assertThat(cells.isPresent(unknown)).isFalse();
        assertThat(cells.isPinchedOut(unknown)).isFalse();
        assertThat(cells.thickness(block.cell(1, 1, 2))).isNaN();
    }

    @Test
    void readsARingAroundTheWindow() {
        Grid grid = new Grid(Axis.even(0, 1, 5), Axis.even(0, 1, 5), 0, 1);
        List<Layer> layers = AquiferDraft.flat(false, 10, 0);
        CellGeometry cells = CellGeometry.of(grid, layers, new Window(2, 2, 1, 1));
        assertThat(cells.inner()).isEqualTo(new Window(2, 2, 1, 1));
        assertThat(cells.block().window()).isEqualTo(new Window(1, 1, 3, 3));
        assertThat(cells.grid()).isSameAs(grid);
    }

    @Test
    void refusesSurfacesThatCrossAndSaysWhere() {
        Layer crossing = layer(Optional.of(surface(9, 9, 9, 9, 9, 9)), surface(1, 1, 1, 1, 9.1, 1));
        assertThatThrownBy(() -> of(crossing))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("row 2, column 2")
                .hasMessageContaining("a top of 9.0 below a bottom of 9.1");
        CellGeometry allowed = of(layer(Optional.of(surface(9, 9, 9, 9, 9, 9)), surface(1, 1, 1, 1, 9.000008, 1)));
        assertThat(allowed.isPinchedOut(4)).isTrue();
    }

    @Test
    void refusesLayersThatDoNotTouch() {
        Layer upper = layer(Optional.of(surface(9, 9, 9, 9, 9, 9)), surface(5, 5, 5, 5, 5, 5));
        Layer apart = layer(Optional.of(surface(5, 5, 5.00006, 5, 5, 5)), surface(1, 1, 1, 1, 1, 1));
        assertThatThrownBy(() -> of(upper, apart))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("row 1, column 3")
                .hasMessageContaining("layers that touch");
        Layer touching = layer(Optional.of(surface(5, 5, 5.000004, 5, 5, 5)), surface(1, 1, 1, 1, 1, 1));
        assertThat(of(upper, touching).top(8)).isEqualTo(5.000004);
    }

    @Test
    void arraysStandAsTheConventionsSay() {
        Block block = new Block(new Window(2, 3, 4, 5), 2);
        assertThat(block.size()).isEqualTo(40);
        assertThat(block.cell(1, 3, 4)).isEqualTo(20 + 5 + 1);
        assertThat(block.xFace(1, 3, 4)).isEqualTo(24 + 6 + 1);
        assertThat(block.yFace(1, 3, 4)).isEqualTo(25 + 5 + 1);
        assertThat(block.zFace(2, 2, 3)).isEqualTo(40);
    }

    @Test
    void aConstantHoldsEverywhereAndForAllTime() {
        GriddedValues four = GriddedValues.constant(4);
        double[] target = {1, 1, 1, 1, 1};
        four.read(7, 9, new Window(0, 0, 1, 3), target, 1);
        assertThat(target).containsExactly(1, 4, 4, 4, 1);
        assertThat(four.changes()).isFalse();
        assertThat(four.layered()).isFalse();
    }

    @Test
    void snapshotsReadAsIntervalsAreTheMeanOfBothEnds() {
        GriddedValues snapshots =
                new ArrayValues(2, new double[][][] {{{1, 2}, {0, 0}}, {{3, 8}, {1, 1}}, {{5, 5}, {2, 2}}});
        GriddedValues means = GriddedValues.meanOfEnds(snapshots);
        double[] target = new double[4];
        means.read(0, 0, new Window(0, 0, 1, 2), target, 0);
        means.read(1, 1, new Window(0, 0, 1, 2), target, 2);
        assertThat(target).containsExactly(2, 5, 1.5, 1.5);
        assertThat(means.changes()).isTrue();
        assertThat(means.layered()).isTrue();
        GriddedValues steady = ArrayValues.steady(2, new double[] {1, 2});
        assertThat(GriddedValues.meanOfEnds(steady)).isSameAs(steady);
        assertThat(GriddedValues.meanOfEnds(new ArrayValues(1, new double[][][] {{{1}}, {{1}}}))
                        .layered())
                .isFalse();
    }
}
