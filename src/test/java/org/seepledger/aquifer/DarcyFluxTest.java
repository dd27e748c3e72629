package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Three columns 2, 4 and 6 wide, two rows 1 (south) and 3 (north) high, one layer 10 thick; faces worked out by hand. */
class DarcyFluxTest {

    private static final Grid GRID = new Grid(Axis.of(0, 2, 6, 12), Axis.of(0, 1, 4), 0, 1);
    private static final double NONE = Double.NaN;
    private static final OuterFaces OPEN = new OuterFaces(true, true, true);
    private static final OuterFaces CLOSED = new OuterFaces(false, false, false);

    private static ArrayValues values(double... north) {
        return ArrayValues.steady(3, north);
    }

    private static FaceFlows flows(GriddedValues x, GriddedValues y, OuterFaces outer) {
        return flows(AquiferDraft.on(GRID), x, y, outer);
    }

    private static FaceFlows flows(AquiferDraft draft, GriddedValues x, GriddedValues y, OuterFaces outer) {
        return AquiferDraft.state(
                        draft.flow(new DarcyFlux(x, y, Optional.empty(), false, outer))
                                .done(),
                        0)
                .flows();
    }

    private static double[] xRow(FaceFlows flows, int row) {
        double[] faces = new double[4];
        for (int i = 0; i < 4; i++) {
            faces[i] = flows.x()[flows.block().xFace(0, row, i)];
        }
        return faces;
    }

    private static double[] yColumn(FaceFlows flows, int column) {
        double[] faces = new double[3];
        for (int i = 0; i < 3; i++) {
            faces[i] = flows.y()[flows.block().yFace(0, i, column)];
        }
        return faces;
    }

    @Test
    void interpolatesBetweenCentresByDistanceAndExtrapolatesAtOpenFaces() {
        // q = 1, 4, 9 at x = 1, 4, 9: q = x, so each face has its own x; times 3 wide, 10 thick.
        FaceFlows flows = flows(values(1, 4, 9, 0, 0, 0), values(0, 0, 0, 0, 0, 0), OPEN);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {0, 60, 180, 360}, within(1e-12));
        assertThat(xRow(flows, 1)).containsOnly(0);
    }

    @Test
    void extrapolatesFromTheTwoNearestCentresAlone() {
        // 5, 8, 2 at x = 1, 4, 9: slopes 1 and -6/5.
        FaceFlows flows = flows(values(5, 8, 2, 0, 0, 0), values(0, 0, 0, 0, 0, 0), OPEN);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {120, 180, 168, -48}, within(1e-12));
    }

    @Test
    void rowsRunAgainstY() {
        // Centres at y = 2.5 (row 0) and 0.5 (row 1), q = 10 + 2 y; column 1 is 4 wide.
        FaceFlows flows = flows(values(0, 0, 0, 0, 0, 0), values(0, 15, 0, 0, 11, 0), OPEN);
        assertThat(yColumn(flows, 1)).containsExactly(new double[] {18 * 40, 12 * 40, 10 * 40}, within(1e-11));
        assertThat(yColumn(flows, 0)).containsOnly(0);
    }

    @Test
    void closedOuterFacesLetNothingThrough() {
        FaceFlows flows = flows(values(1, 4, 9, 1, 4, 9), values(0, 15, 0, 0, 11, 0), CLOSED);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {0, 60, 180, 0}, within(1e-12));
        assertThat(yColumn(flows, 1)).containsExactly(new double[] {0, 12 * 40, 0}, within(1e-11));
    }

    @Test
    void nothingFlowsThroughTheFacesOfAnInactiveCell() {
        FaceFlows flows = flows(values(5, NONE, 2, 5, 8, 2), values(1, 1, 1, 1, 1, 1), OPEN);
        // Beside it the outer faces have one centre each, whose value they take.
        assertThat(xRow(flows, 0)).containsExactly(new double[] {150, 0, 0, 60}, within(1e-12));
        assertThat(yColumn(flows, 1)).containsExactly(0, 0, 40);
        assertThat(flows.active()).containsExactly(true, false, true, true, true, true);
    }

    @Test
    void aCellIsInactiveWhereAnyComponentIsMissing() {
        FaceFlows flows = flows(values(1, 1, 1, 1, 1, 1), values(1, 1, NONE, 1, 1, 1), OPEN);
        assertThat(flows.active()).containsExactly(true, true, false, true, true, true);
        Flow upward = new DarcyFlux(
                values(1, 1, 1, 1, 1, 1),
                values(1, 1, 1, 1, 1, 1),
                Optional.of(values(NONE, 1, 1, 1, 1, 1)),
                false,
                OPEN);
        assertThat(AquiferDraft.state(AquiferDraft.on(GRID).flow(upward).done(), 0)
                        .flows()
                        .active())
                .containsExactly(false, true, true, true, true, true);
    }

    @Test
    void anOuterInactiveCellHasNoOuterFlow() {
        FaceFlows flows = flows(values(NONE, 4, 9, 1, 1, 1), values(0, 0, 0, 0, 0, 0), OPEN);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {0, 0, 180, 360}, within(1e-12));
    }

    @Test
    void aGridOfOneCellTakesItsCentresValue() {
        Grid one = new Grid(Axis.even(0, 2, 1), Axis.even(0, 3, 1), 0, 1);
        Flow flow =
                new DarcyFlux(GriddedValues.constant(1.5), GriddedValues.constant(-2), Optional.empty(), false, OPEN);
        FaceFlows flows =
                AquiferDraft.state(AquiferDraft.on(one).flow(flow).done(), 0).flows();
        assertThat(flows.x()).containsExactly(45, 45);
        assertThat(flows.y()).containsExactly(-40, -40);
        assertThat(flows.gain(0, 0, 0)).isZero();
        assertThat(flows.gross(0, 0, 0)).isEqualTo(170);
    }

    @Test
    void aFaceIsAsThickAsTheMeanOfTheTwoSaturatedThicknesses() {
        // Heads at the interval's end: 4 and 8 thick, the third above its top, so 10.
        double[][][] heads = {{{9, 9, 9, 9, 9, 9}}, {{4, 8, 30, 0, 0, 0}}};
        FaceFlows flows = flows(
                AquiferDraft.on(GRID).waterTableLayers(10, 0).head(new ArrayValues(3, heads)),
                values(1, 1, 1, 1, 1, 1),
                values(0, 0, 0, 0, 0, 0),
                OPEN);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {12, 18, 27, 30}, within(1e-12));
        assertThat(xRow(flows, 1)).containsOnly(0);
    }

    @Test
    void withoutAWaterTableHeadsDoNotMatterForThickness() {
        double[][][] heads = {{{4, 8, 30, 4, 4, 4}}};
        FaceFlows flows = flows(
                AquiferDraft.on(GRID).head(new ArrayValues(3, heads)),
                values(1, 1, 1, 1, 1, 1),
                values(0, 0, 0, 0, 0, 0),
                OPEN);
        assertThat(xRow(flows, 0)).containsOnly(30);
    }

    @Test
    void aDryCellStaysActiveButCarriesNoThickness() {
        double dry = Double.NEGATIVE_INFINITY;
        double[][][] heads = {{{9, 9, 9, 9, 9, 9}}, {{dry, 8, 8, NONE, 8, 8}}};
        FaceFlows flows = flows(
                AquiferDraft.on(GRID).waterTableLayers(10, 0).head(new ArrayValues(3, heads)),
                values(1, 1, 1, 1, 1, 1),
                values(0, 0, 0, 0, 0, 0),
                OPEN);
        assertThat(flows.active()).containsExactly(true, true, true, false, true, true);
        assertThat(xRow(flows, 0)).containsExactly(new double[] {0, 12, 24, 24}, within(1e-12));
        assertThat(xRow(flows, 1)).containsExactly(new double[] {0, 0, 8, 8}, within(1e-12));
    }

    @Test
    void aCellWithoutHeadAtEitherEndIsInactive() {
        double[][][] heads = {{{NONE, 9, 9, 9, 9, 9}}, {{9, NONE, 9, 9, 9, 9}}};
        FaceFlows flows = flows(
                AquiferDraft.on(GRID).head(new ArrayValues(3, heads)),
                values(1, 1, 1, 1, 1, 1),
                values(0, 0, 0, 0, 0, 0),
                OPEN);
        assertThat(flows.active()).containsExactly(false, false, true, true, true, true);
    }

    @Test
    void mapComponentsAreTurnedIntoTheGrids() {
        Grid turned = new Grid(Axis.even(0, 1, 2), Axis.even(0, 1, 2), 90, 1);
        Flow flow = new DarcyFlux(GriddedValues.constant(3), GriddedValues.constant(5), Optional.empty(), true, OPEN);
        FaceFlows flows =
                AquiferDraft.state(AquiferDraft.on(turned).flow(flow).done(), 0).flows();
        // The grid's x points north, its y west: along x flows the northern component, along y minus the eastern one.
        assertThat(flows.x()).containsOnly(50);
        assertThat(flows.y()).containsOnly(-30);
        Grid oblique = new Grid(Axis.even(0, 1, 2), Axis.even(0, 1, 2), 30, 1);
        FaceFlows others = AquiferDraft.state(
                        AquiferDraft.on(oblique).flow(flow).done(), 0)
                .flows();
        assertThat(others.x()[0]).isEqualTo(10 * (3 * Math.sqrt(0.75) + 2.5), within(1e-13));
        assertThat(others.y()[0]).isEqualTo(10 * (5 * Math.sqrt(0.75) - 1.5), within(1e-13));
    }

    @Test
    void sizesCountInLengthUnits() {
        Grid feet = new Grid(Axis.even(0, 1, 1), Axis.even(0, 1, 1), 0, 0.5);
        Flow flow = new DarcyFlux(GriddedValues.constant(1), GriddedValues.constant(1), Optional.empty(), false, OPEN);
        assertThat(AquiferDraft.state(AquiferDraft.on(feet).flow(flow).done(), 0)
                        .flows()
                        .x())
                .containsOnly(5);
    }

    @Test
    void saysWhenItsSidesAreClosed() {
        GriddedValues one = GriddedValues.constant(1);
        assertThat(new DarcyFlux(one, one, Optional.empty(), false, CLOSED).closedSides())
                .isTrue();
        assertThat(new DarcyFlux(one, one, Optional.empty(), false, new OuterFaces(true, false, false)).closedSides())
                .isFalse();
    }

    @Test
    void aWindowsFacesAreThoseOfTheWholeGrid() {
        Grid grid = new Grid(Axis.of(0, 2, 3, 7, 8, 10), Axis.of(0, 1, 4, 5, 9, 10), 0, 1);
        FormulaValues x = FormulaValues.steady(grid, (east, north) -> east * east - north);
        FormulaValues y = FormulaValues.steady(grid, (east, north) -> east * north);
        Aquifer aquifer = AquiferDraft.on(grid)
                .flow(new DarcyFlux(x, y, Optional.empty(), false, OPEN))
                .done();
        FaceFlows whole = AquiferDraft.state(aquifer, 0).flows();
        for (Window window : new Window[] {
            new Window(0, 0, 1, 1), new Window(4, 4, 1, 1), new Window(1, 0, 2, 3), new Window(2, 2, 1, 1)
        }) {
            FaceFlows part =
                    aquifer.state(0, aquifer.geometry(window), List.of()).flows();
            for (int row = window.row(); row < window.rowEnd(); row++) {
                for (int column = window.column(); column < window.columnEnd(); column++) {
                    assertThat(part.gain(0, row, column)).isEqualTo(whole.gain(0, row, column));
                    assertThat(part.gross(0, row, column)).isEqualTo(whole.gross(0, row, column));
                }
            }
        }
    }
}
