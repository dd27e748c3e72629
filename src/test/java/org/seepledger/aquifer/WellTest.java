package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.fault.DataFault;

/** Wells on a grid of 4 by 3 cells of 10 by 20, three layers from 30 to 20, 5 and 0. */
class WellTest {

    private static final Grid GRID = new Grid(Axis.even(100, 10, 4), Axis.even(200, 20, 3), 0, 1);
    private static final double ALWAYS = Double.POSITIVE_INFINITY;

    private static PointRate line(String name, double x, double y, Screen screen, double from, double to, double rate) {
        return new PointRate(name, "pumping", x, y, screen, from, to, rate, "wells.csv, line 2");
    }

    private static Well well(double x, double y, Screen screen, double rate) {
        return Well.of(List.of(line("W", x, y, screen, -ALWAYS, ALWAYS, rate))).get(0);
    }

    private static Well scheduled(double... fromToRate) {
        List<PointRate> lines = new ArrayList<>();
        for (int i = 0; i < fromToRate.length; i += 3) {
            lines.add(line("W", 105, 205, new Screen.InLayer(0), fromToRate[i], fromToRate[i + 1], fromToRate[i + 2]));
        }
        return Well.of(lines).get(0);
    }

    @Test
    void linesForTheSameTimeAreTold() {
        assertThat(scheduled(0, 10, 5, 10, 20, 6).overlapping()).isEmpty();
        assertThat(scheduled(10, 20, 6, 0, 10, 5).overlapping()).isEmpty();
        assertThat(scheduled(0, 11, 5, 10, 20, 6).overlapping())
                .map(PointRate::from)
                .contains(10.0);
        assertThat(scheduled(0, 30, 5, 1, 2, 6, 20, 40, 7).overlapping())
                .map(PointRate::from)
                .contains(1.0);
        assertThat(scheduled(-ALWAYS, ALWAYS, 5, -ALWAYS, ALWAYS, 6).overlapping())
                .isPresent();
    }

    private static List<WellRate> rates(AquiferDraft draft, Well well) {
        Aquifer aquifer =
                draft.source(new Source.Points("pumping", List.of(well))).done();
        return AquiferDraft.state(aquifer, 0).wells();
    }

    private static AquiferDraft draft() {
        return AquiferDraft.on(GRID).layers(30, 20, 5, 0);
    }

    @Test
    void linesOfOneNamePlaceScreenAndCategoryAreOneWell() {
        Screen screen = new Screen.InLayer(1);
        List<Well> wells = Well.of(List.of(
                line("A", 1, 2, screen, 0, 1, -5),
                line("B", 1, 2, screen, 0, 1, -7),
                line("A", 1, 2, new Screen.InLayer(1), 1, 2, -6),
                line("A", 1, 3, screen, 1, 2, -6)));
        assertThat(wells).extracting(Well::name).containsExactly("A", "B", "A");
        assertThat(wells.get(0).schedule()).extracting(PointRate::rate).containsExactly(-5.0, -6.0);
        assertThat(wells.get(0).screen()).isEqualTo(screen);
    }

    @Test
    void aWellActiveForPartOfAnIntervalCountsWithItsMean() {
        Well well = scheduled(1, 3, -12);
        assertThat(well.meanRate(0, 4)).isEqualTo(-6);
        assertThat(well.meanRate(2, 4)).isEqualTo(-6);
        assertThat(well.meanRate(1, 3)).isEqualTo(-12);
        assertThat(well.meanRate(1.5, 2.5)).isEqualTo(-12);
        assertThat(well.meanRate(3, 4)).isZero();
        assertThat(well.meanRate(0, 1)).isZero();
        assertThat(well.meanRate(5, 6)).isZero();
        assertThat(scheduled(2, ALWAYS, 8).meanRate(0, 8)).isEqualTo(6);
    }

    @Test
    void linesThatOverlapAdd() {
        Well well = scheduled(0, 2, -1, 1, 3, -10);
        assertThat(well.meanRate(0, 2)).isEqualTo(-6);
        assertThat(scheduled(-ALWAYS, ALWAYS, 0.1, -ALWAYS, ALWAYS, 0.2).meanRate(0, 7))
                .isEqualTo(0.1 + 0.2);
    }

    @Test
    void aRateThatAlwaysHoldsIsNotRoundedByTheIntervalsLength() {
        assertThat(scheduled(-ALWAYS, ALWAYS, 0.1).meanRate(0, 0.3)).isEqualTo(0.1);
    }

    /** A hundred-millionth of a cell east and a billionth north of its place. */
    @ParameterizedTest
    @CsvSource({
        "105, 210, 2, 0, 0.50000001, 0.500000001",
        "110, 220, 1, 1, 0.00000001, 0.000000001",
        "100, 200, 2, 0, 0.00000001, 0.000000001",
        "140, 260, 0, 3, 0.99999999, 0.999999999",
        "139.9999999999, 259.9999999999, 0, 3, 0.99999999, 0.999999999",
        "119.999999999, 239.9999999999, 0, 2, 0.00000001, 0.000000001",
    })
    void isTakenALittleEastAndNorthOfItsPlace(double x, double y, int row, int column, double across, double up) {
        PlacedWell placed = PlacedWell.of(well(x, y, new Screen.InLayer(0), 1), GRID);
        assertThat(placed.row()).isEqualTo(row);
        assertThat(placed.column()).isEqualTo(column);
        assertThat(placed.across()).isEqualTo(across, within(1e-12));
        assertThat(placed.up()).isEqualTo(up, within(1e-12));
    }

    @Test
    void aWellInOneLayerCountsThere() {
        List<WellRate> rates = rates(draft(), well(125, 235, new Screen.InLayer(1), -8));
        assertThat(rates).hasSize(1);
        assertThat(rates.get(0).layer()).isEqualTo(1);
        assertThat(rates.get(0).rate()).isEqualTo(-8);
        assertThat(rates.get(0).well().row()).isEqualTo(1);
        assertThat(rates.get(0).well().column()).isEqualTo(2);
    }

    @Test
    void aScreenOverLayersIsSharedOutByItsLengthInEach() {
        // 4 in layer 1, 15 in layer 2, 1 in layer 3.
        List<WellRate> rates = rates(draft(), well(125, 235, new Screen.Between(24, 4), -100));
        assertThat(rates).extracting(WellRate::layer).containsExactly(0, 1, 2);
        assertThat(rates).extracting(WellRate::rate).containsExactly(-20.0, -75.0, -5.0);
        assertThat(rates(draft(), well(125, 235, new Screen.Between(19, 6), -100)))
                .extracting(WellRate::layer)
                .containsExactly(1);
    }

    @Test
    void inactiveLayersTakeNoShare() {
        double[] fine = new double[12];
        double[] holed = new double[12];
        holed[1 * 4 + 2] = Double.NaN;
        Flow flow = new DarcyFlux(
                ArrayValues.steady(4, fine, holed, fine),
                GriddedValues.constant(0),
                Optional.empty(),
                false,
                new OuterFaces(true, false, false));
        List<WellRate> rates = rates(draft().flow(flow), well(125, 235, new Screen.Between(24, 4), -100));
        assertThat(rates).extracting(WellRate::layer).containsExactly(0, 2);
        assertThat(rates).extracting(WellRate::rate).containsExactly(-80.0, -20.0);
        assertThatThrownBy(() -> rates(draft().flow(flow), well(125, 235, new Screen.InLayer(1), -8)))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("wells.csv, line 2")
                .hasMessageContaining("\"W\"")
                .hasMessageContaining("layer 2, row 2, column 3");
    }

    @Test
    void aScreenOutsideTheLayersIsAFault() {
        assertThatThrownBy(() -> rates(draft(), well(125, 235, new Screen.Between(-1, -5), -8)))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("(row 2, column 3)");
    }

    @Test
    void aWellThatIsOffDoesNotMindAnInactiveCell() {
        assertThat(rates(draft(), well(125, 235, new Screen.Between(-1, -5), 0)))
                .isEmpty();
    }
}
