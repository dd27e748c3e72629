package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.aquifer.Window;
import org.seepledger.job.MapQuantity.Kind;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** What a map shows: known fields come out as what they are. */
class LayerReadingTest {

    private static final Grid GRID = new Grid(Axis.even(1000, 20, 7), Axis.even(500, 10, 5), 0, 1);
    private static final Offset<Double> ROUNDING = within(1e-12);

    private static GridLayer read(Aquifer aquifer, Kind kind, int layer, int interval, int stride) {
        MapQuantity quantity = new LayerReading(aquifer, List.of(), Progress.NONE)
                .quantities().stream()
                        .filter(each -> each.kind() == kind)
                        .findFirst()
                        .orElseThrow();
        Window all = aquifer.grid().window();
        return new LayerReading(aquifer, List.of(), Progress.NONE).layer(quantity, layer, interval, all, stride);
    }

    private static GriddedValues constant(double value) {
        return GriddedValues.constant(value);
    }

    private static DarcyFlux flux(double x, double y, double z, boolean map) {
        return new DarcyFlux(
                constant(x), constant(y), Optional.of(constant(z)), map, new OuterFaces(true, false, false));
    }

    private static Well well(double x, double y, double rate) {
        return Well.of(List.of(new PointRate("w", "pumping", x, y, new Screen.InLayer(0), 0, 1, rate, "line 2")))
                .get(0);
    }

    @Test
    void headIsThatAtTheIntervalsEndAndADryCellHasNone() {
        FormulaValues head =
                new FormulaValues(GRID, 3, (step, layer, x, y) -> x > 1100 ? Double.NEGATIVE_INFINITY : 5 + step);
        Aquifer aquifer = AquiferDraft.on(GRID).times(0, 1, 2).head(head).done();
        GridLayer read = read(aquifer, Kind.HEAD, 0, 1, 1);
        assertThat(read.rows()).isEqualTo(5);
        assertThat(read.columns()).isEqualTo(7);
        assertThat(read.at(0, 0)).isEqualTo(7);
        assertThat(read.at(4, 5)).isNaN();
    }

    @Test
    void thicknessesAreToldApart() {
        Aquifer aquifer = AquiferDraft.on(GRID)
                .waterTableLayers(30, 18, 0)
                .head(FormulaValues.steady(GRID, (x, y) -> 25))
                .done();
        assertThat(read(aquifer, Kind.THICKNESS, 0, 0, 1).values()).containsOnly(12);
        assertThat(read(aquifer, Kind.SATURATED_THICKNESS, 0, 0, 1).values()).containsOnly(7);
        assertThat(read(aquifer, Kind.SATURATED_THICKNESS, 1, 0, 1).values()).containsOnly(18);
    }

    @Test
    void givenFluxIsShownAsGiven() {
        Aquifer aquifer = AquiferDraft.on(GRID).flow(flux(3, -4, 12, false)).done();
        for (double value : read(aquifer, Kind.FLUX, 0, 0, 1).values()) {
            assertThat(value).isCloseTo(13, ROUNDING);
        }
    }

    @Test
    void fluxFromFacesIsTheFlowOverTheSaturatedSection() {
        GivenFaceFlow flow = new GivenFaceFlow(
                constant(300),
                constant(-800),
                Optional.of(constant(2400)),
                Optional.of(constant(300)),
                Optional.of(constant(-800)),
                Optional.of(constant(2400)));
        Aquifer aquifer = AquiferDraft.on(GRID).layers(10, 0).flow(flow).done();
        // 300 / (10 × 10), 800 / (20 × 10), 2400 / (20 × 10)
        for (double value : read(aquifer, Kind.FLUX, 0, 0, 1).values()) {
            assertThat(value).isCloseTo(13, ROUNDING);
        }
    }

    @Test
    void arrowsPointAlongTheMap() {
        Grid turned = new Grid(Axis.even(0, 1, 4), Axis.even(0, 1, 4), 30, 1);
        Window all = turned.window();
        Aquifer alongGrid = AquiferDraft.on(turned).flow(flux(2, 0, 0, false)).done();
        FluxField arrows = new LayerReading(alongGrid, List.of(), Progress.NONE).flux(0, 0, all, 2);
        assertThat(arrows.east().values()).hasSize(4);
        assertThat(arrows.east().at(1, 1)).isCloseTo(Math.sqrt(3), ROUNDING);
        assertThat(arrows.north().at(1, 1)).isCloseTo(1, ROUNDING);
        Aquifer alongMap = AquiferDraft.on(turned).flow(flux(2, 0, 0, true)).done();
        arrows = new LayerReading(alongMap, List.of(), Progress.NONE).flux(0, 0, all, 2);
        assertThat(arrows.east().at(0, 0)).isEqualTo(2);
        assertThat(arrows.north().at(0, 0)).isEqualTo(0);
    }

    @Test
    void aSourceIsShownOverPlanAreaAndASquareIsTheMeanOfItsCells() {
        FormulaValues rain = FormulaValues.steady(GRID, (x, y) -> x < 1040 ? 1 : 3);
        Aquifer aquifer = AquiferDraft.on(GRID)
                .source(new Source.Areal("rain", rain))
                .source(new Source.Cells("ditch", constant(100)))
                .done();
        GridLayer read = read(aquifer, Kind.SOURCE, 0, 0, 3);
        assertThat(read.rows()).isEqualTo(2);
        assertThat(read.columns()).isEqualTo(3);
        assertThat(read.at(0, 0)).isCloseTo(5 / 3.0, ROUNDING);
        assertThat(read.at(1, 2)).isCloseTo(3, ROUNDING);
        List<MapQuantity> quantities = new LayerReading(aquifer, List.of(), Progress.NONE).quantities();
        assertThat(quantities)
                .extracting(MapQuantity::label)
                .containsExactly("flux magnitude", "rain", "ditch", "thickness", "saturated thickness", "imbalance");
        assertThat(quantities).extracting(MapQuantity::unit).containsExactly("m/d", "m/d", "m/d", "m", "m", "m3/d");
    }

    @Test
    void whatNothingAccountsForShowsInItsCellWellsAmongIt() {
        Aquifer aquifer = AquiferDraft.on(GRID)
                .source(new Source.Points("pumping", List.of(well(1050, 535, -7))))
                .done();
        GridLayer read = read(aquifer, Kind.IMBALANCE, 0, 0, 1);
        assertThat(read.at(1, 2)).isEqualTo(-7);
        assertThat(read.at(1, 3)).isZero();
        assertThat(WellPlace.of(aquifer, 0)).containsExactly(new WellPlace("w", "pumping", 1050, 535, "layer 1", -7));
    }

    @Test
    void inactiveCellsHaveNoValueAndDoNotCountInMeans() {
        FormulaValues x = FormulaValues.steady(GRID, (east, north) -> east < 1100 ? 2 : Double.NaN);
        DarcyFlux flow = new DarcyFlux(x, x, Optional.empty(), false, new OuterFaces(true, false, false));
        Aquifer aquifer = AquiferDraft.on(GRID)
                .flow(flow)
                .source(new Source.Areal("rain", constant(1)))
                .done();
        assertThat(read(aquifer, Kind.FLUX, 0, 0, 1).at(0, 6)).isNaN();
        assertThat(read(aquifer, Kind.FLUX, 0, 0, 2).at(0, 2)).isCloseTo(Math.sqrt(8), ROUNDING);
        assertThat(read(aquifer, Kind.SOURCE, 0, 0, 1).at(2, 6)).isNaN();
        assertThat(read(aquifer, Kind.IMBALANCE, 0, 0, 1).at(2, 6)).isNaN();
    }

    @Test
    void canBeStopped() {
        Progress stopping = new Progress() {
            @Override
            public void begin(String what, long steps) {
                throw new Cancelled();
            }

            @Override
            public void step() {}
        };
        LayerReading reading = new LayerReading(AquiferDraft.on(GRID).done(), List.of(), stopping);
        MapQuantity quantity = reading.quantities().get(0);
        assertThatThrownBy(() -> reading.layer(quantity, 0, 0, GRID.window(), 1))
                .isInstanceOf(Cancelled.class);
    }
}
