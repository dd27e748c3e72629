package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** One column of 2 by 3; layers of different thickness; interfaces worked out by hand. */
class VerticalFlowTest {

    private static final Grid GRID = new Grid(Axis.even(0, 2, 1), Axis.even(0, 3, 1), 0, 1);
    private static final double NONE = Double.NaN;
    private static final OuterFaces OPEN = new OuterFaces(true, true, true);

    private static ArrayValues layers(double... values) {
        double[][] layers = new double[values.length][];
        for (int i = 0; i < values.length; i++) {
            layers[i] = new double[] {values[i]};
        }
        return ArrayValues.steady(1, layers);
    }

    private static double[] interfaces(Flow flow, double... elevations) {
        Aquifer aquifer = AquiferDraft.on(GRID).layers(elevations).flow(flow).done();
        return AquiferDraft.state(aquifer, 0).flows().z();
    }

    private static Flow upward(OuterFaces outer, double... q) {
        GriddedValues none = GriddedValues.constant(0);
        return new DarcyFlux(none, none, Optional.of(layers(q)), false, outer);
    }

    private static Flow given(double[] up, Optional<GriddedValues> down) {
        GriddedValues none = GriddedValues.constant(0);
        return new GivenFaceFlow(none, none, Optional.of(layers(up)), Optional.empty(), Optional.empty(), down);
    }

    @Test
    void interpolatesBetweenLayerCentresAndExtrapolatesAtOpenTopAndBottom() {
        // Centres at 11, 8 and 3; q = their elevation; area 6.
        assertThat(interfaces(upward(OPEN, 11, 8, 3), 12, 10, 6, 0))
                .containsExactly(new double[] {72, 60, 36, 0}, within(1e-12));
    }

    @Test
    void topAndBottomOpenApart() {
        assertThat(interfaces(upward(new OuterFaces(true, false, false), 11, 8, 3), 12, 10, 6, 0))
                .containsExactly(new double[] {0, 60, 36, 0}, within(1e-12));
        assertThat(interfaces(upward(new OuterFaces(true, true, false), 11, 8, 5), 12, 10, 6, 0))
                .containsExactly(new double[] {72, 60, 6 * 6.8, 0}, within(1e-12));
        assertThat(interfaces(upward(new OuterFaces(true, false, true), 11, 8, 5), 12, 10, 6, 0))
                .containsExactly(new double[] {0, 60, 6 * 6.8, 6 * 3.2}, within(1e-12));
    }

    @Test
    void oneLayerTakesItsCentresValue() {
        assertThat(interfaces(upward(OPEN, 4), 10, 0)).containsExactly(24, 24);
    }

    @Test
    void aPinchedOutLayerIsPassedThrough() {
        // Without layer 2 the centres are 11 and 5 with 2 and 10 thick: q = elevation again.
        assertThat(interfaces(upward(OPEN, 11, 99, 5), 12, 10, 10, 0))
                .containsExactly(new double[] {72, 60, 60, 0}, within(1e-12));
        assertThat(interfaces(upward(OPEN, 11, NONE, 5), 12, 10, 10, 0))
                .containsExactly(new double[] {72, 60, 60, 0}, within(1e-12));
    }

    @Test
    void outerLayersThatPinchOutHandTheOuterFaceOn() {
        assertThat(interfaces(upward(OPEN, 99, 11, 5), 12, 12, 10, 0))
                .containsExactly(new double[] {72, 72, 60, 0}, within(1e-12));
        assertThat(interfaces(upward(OPEN, 11, 5, 99), 12, 10, 0, 0))
                .containsExactly(new double[] {72, 60, 0, 0}, within(1e-12));
        assertThat(interfaces(upward(OPEN, 1, 2), 12, 12, 12)).containsOnly(0);
    }

    @Test
    void anInactiveLayerCutsTheColumn() {
        assertThat(interfaces(upward(OPEN, 11, NONE, 3), 12, 10, 6, 0)).containsExactly(66, 0, 0, 18);
        assertThat(interfaces(upward(OPEN, NONE, 8, 3), 12, 10, 6, 0))
                .containsExactly(new double[] {0, 0, 36, 0}, within(1e-12));
        assertThat(interfaces(upward(OPEN, 11, 8, NONE), 12, 10, 6, 0))
                .containsExactly(new double[] {72, 60, 0, 0}, within(1e-12));
    }

    @Test
    void aColumnWithoutAnUpperSurfaceIsInactive() {
        Layer upper = new Layer("upper", Optional.of(layers(12)), layers(NONE), false);
        Layer lower = new Layer("lower", Optional.empty(), layers(0), false);
        Aquifer aquifer = AquiferDraft.on(GRID)
                .layers(List.of(upper, lower))
                .flow(upward(OPEN, 1, 1))
                .done();
        assertThat(AquiferDraft.state(aquifer, 0).flows().active()).containsOnly(false);
        assertThat(AquiferDraft.state(aquifer, 0).flows().z()).containsOnly(0);
    }

    @Test
    void givenUpwardFlowStandsAtTheTopOfItsCell() {
        assertThat(interfaces(given(new double[] {7, -2, 3}, Optional.of(layers(1, 2, 5))), 12, 10, 6, 0))
                .containsExactly(7, -2, 3, 5);
        assertThat(interfaces(given(new double[] {7, -2, 3}, Optional.empty()), 12, 10, 6, 0))
                .containsExactly(7, -2, 3, 0);
        assertThat(interfaces(given(new double[] {7, -2, 3}, Optional.of(layers(1, 2, NONE))), 12, 10, 6, 0))
                .containsExactly(7, -2, 3, 0);
    }

    @Test
    void theUpwardFlowOfTheLowerNeighbourHoldsAcrossAPinchedOutLayer() {
        assertThat(interfaces(given(new double[] {7, 99, 3}, Optional.empty()), 12, 10, 10, 0))
                .containsExactly(7, 3, 3, 0);
        assertThat(interfaces(given(new double[] {99, 7, 3}, Optional.empty()), 12, 12, 10, 0))
                .containsExactly(7, 7, 3, 0);
        assertThat(interfaces(given(new double[] {7, 3, 99}, Optional.of(layers(1, 2, 5))), 12, 10, 0, 0))
                .containsExactly(7, 3, 2, 2);
    }

    @Test
    void givenFlowDoesNotPassAnInactiveLayer() {
        assertThat(interfaces(given(new double[] {7, NONE, 3}, Optional.of(layers(1, 2, 5))), 12, 10, 6, 0))
                .containsExactly(7, 0, 0, 5);
    }

    @Test
    void disagreementOfUpAndDownIsFoundAcrossAPinchedOutLayer() {
        Flow flow = given(new double[] {7, 99, 3}, Optional.of(layers(4.5, 50, 0)));
        Aquifer aquifer = AquiferDraft.on(GRID).layers(12, 10, 10, 0).flow(flow).done();
        assertThat(AquiferDraft.state(aquifer, 0).flows().mismatch()).contains(new FaceMismatch(1.5, "up", 2, 0, 0));
    }
}
