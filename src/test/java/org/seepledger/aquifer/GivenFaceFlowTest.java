package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Three columns by two rows; each given value has a number of its own. */
class GivenFaceFlowTest {

    private static final Grid GRID = new Grid(Axis.even(0, 2, 3), Axis.even(0, 5, 2), 0, 1);
    private static final double NONE = Double.NaN;

    private static final ArrayValues EAST = values(1, 2, 3, 4, 5, 6);
    private static final ArrayValues NORTH = values(10, 20, 30, 40, 50, 60);

    private static ArrayValues values(double... north) {
        return ArrayValues.steady(3, north);
    }

    private static FaceFlows flows(
            GriddedValues east, GriddedValues north, Optional<GriddedValues> west, Optional<GriddedValues> south) {
        Flow flow = new GivenFaceFlow(east, north, Optional.empty(), west, south, Optional.empty());
        return AquiferDraft.state(AquiferDraft.on(GRID).flow(flow).done(), 0).flows();
    }

    @Test
    void eastAndNorthStandOnTheirFacesAndOuterWestAndSouthAreZeroUntilGiven() {
        FaceFlows flows = flows(EAST, NORTH, Optional.empty(), Optional.empty());
        assertThat(flows.x()).containsExactly(0, 1, 2, 3, 0, 4, 5, 6);
        assertThat(flows.y()).containsExactly(10, 20, 30, 40, 50, 60, 0, 0, 0);
        assertThat(flows.z()).containsOnly(0);
        assertThat(flows.mismatch()).isEmpty();
        assertThat(flows.gain(0, 1, 0)).isEqualTo(-4 - 40);
        assertThat(flows.gain(0, 0, 2)).isEqualTo(2 - 3 + 60 - 30);
    }

    @Test
    void westAndSouthHoldAtTheOuterFaces() {
        FaceFlows flows = flows(
                EAST, NORTH, Optional.of(values(-7, 1, 2, -8, 4, 5)), Optional.of(values(40, 50, 60, -9, NONE, -11)));
        assertThat(flows.x()).containsExactly(-7, 1, 2, 3, -8, 4, 5, 6);
        assertThat(flows.y()).containsExactly(10, 20, 30, 40, 50, 60, -9, 0, -11);
        assertThat(flows.mismatch()).isEmpty();
    }

    @Test
    void theGreatestDisagreementIsReportedAndTheEasternValueHolds() {
        FaceFlows flows = flows(
                EAST, NORTH, Optional.of(values(0, 1.5, 2, 0, 4, 5)), Optional.of(values(40, 50, 60.25, 0, 0, 0)));
        assertThat(flows.x()).containsExactly(0, 1, 2, 3, 0, 4, 5, 6);
        assertThat(flows.mismatch()).contains(new FaceMismatch(0.5, "east", 0, 0, 0));
        FaceFlows others =
                flows(EAST, NORTH, Optional.of(values(0, 1.5, 2, 0, 4, 5)), Optional.of(values(40, 50, 59, 0, 0, 0)));
        assertThat(others.mismatch()).contains(new FaceMismatch(1, "north", 0, 1, 2));
    }

    @Test
    void theFirstOfEqualDisagreementsIsReported() {
        FaceFlows flows = flows(EAST, NORTH, Optional.of(values(0, 1.5, 2.5, 0, 4, 5)), Optional.empty());
        assertThat(flows.mismatch()).contains(new FaceMismatch(0.5, "east", 0, 0, 0));
    }

    @Test
    void nothingFlowsThroughTheFacesOfAnInactiveCell() {
        FaceFlows flows = flows(
                values(1, NONE, 3, 4, 5, 6),
                NORTH,
                Optional.of(values(-7, 99, 99, -8, 4, 5)),
                Optional.of(values(40, 99, 60, -9, -10, -11)));
        assertThat(flows.active()).containsExactly(true, false, true, true, true, true);
        assertThat(flows.x()).containsExactly(-7, 0, 0, 3, -8, 4, 5, 6);
        assertThat(flows.y()).containsExactly(10, 0, 30, 40, 0, 60, -9, -10, -11);
        assertThat(flows.mismatch()).isEmpty();
        assertThat(flows(EAST, values(10, 20, 30, 40, NONE, 60), Optional.empty(), Optional.empty())
                        .active())
                .containsExactly(true, true, true, true, false, true);
    }

    @Test
    void outerFacesOfInactiveCellsCarryNothing() {
        FaceFlows flows =
                flows(values(NONE, 2, NONE, 4, 5, 6), NORTH, Optional.of(values(-7, 1, 2, -8, 4, 5)), Optional.empty());
        assertThat(flows.x()).containsExactly(0, 0, 0, 0, -8, 4, 5, 6);
        assertThat(flows.y()).containsExactly(0, 20, 0, 0, 50, 0, 0, 0, 0);
    }

    @Test
    void itsOuterSidesAreNeverClosedByDecree() {
        assertThat(new GivenFaceFlow(
                                EAST, NORTH, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty())
                        .closedSides())
                .isFalse();
    }

    @Test
    void aWindowsFacesAreThoseOfTheWholeGrid() {
        Flow flow = new GivenFaceFlow(
                EAST,
                NORTH,
                Optional.empty(),
                Optional.of(values(-7, 1, 2, -8, 4, 5)),
                Optional.of(values(40, 50, 60, -9, -10, -11)),
                Optional.empty());
        Aquifer aquifer = AquiferDraft.on(GRID).flow(flow).done();
        FaceFlows whole = AquiferDraft.state(aquifer, 0).flows();
        for (int row = 0; row < 2; row++) {
            for (int column = 0; column < 3; column++) {
                FaceFlows part = aquifer.state(0, aquifer.geometry(new Window(row, column, 1, 1)), List.of())
                        .flows();
                assertThat(part.gain(0, row, column)).isEqualTo(whole.gain(0, row, column));
            }
        }
    }
}
