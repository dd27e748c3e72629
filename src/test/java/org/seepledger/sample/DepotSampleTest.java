package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.prisms.PrismsReader;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.prism.Prisms;
import org.seepledger.progress.Progress;

/** The files in the source tree are what the generator makes, and budgets on them close as the plume was computed. */
class DepotSampleTest {

    private static final Path COMMITTED = Path.of("sample-aquifers", "depot");
    private static final DepotFlow FLOW = new DepotFlow(Valley.solved());

    @Test
    void regeneratesToTheLastByte() throws IOException {
        for (var file : DepotSample.files().entrySet()) {
            assertThat(Files.readString(COMMITTED.resolve(file.getKey())))
                    .as(file.getKey())
                    .isEqualTo(file.getValue());
        }
    }

    /** Small faces add up to the valley's, small cells balance as its cells do, and no well or river is among them. */
    @Test
    void theFlowIsTheValleys() {
        Valley valley = Valley.solved();
        BlockGrid grid = valley.grid();
        for (int interval = 0; interval < DepotPlume.INTERVALS; interval++) {
            double[] flows = valley.solution(interval).faceFlows();
            for (int row = 0; row < DepotFlow.ROWS; row += DepotFlow.FINER) {
                for (int column = 0; column < DepotFlow.COLUMNS; column += DepotFlow.FINER) {
                    double east = 0;
                    double north = 0;
                    double up = 0;
                    for (int i = 0; i < DepotFlow.FINER; i++) {
                        east += FLOW.east(interval, column + DepotFlow.FINER, row + i);
                        north += FLOW.north(interval, column + i, row + DepotFlow.FINER);
                        for (int j = 0; j < DepotFlow.FINER; j++) {
                            up += FLOW.up(interval, column + i, row + j);
                        }
                    }
                    int large = FLOW.large(column, row);
                    assertThat(east).isCloseTo(flows[grid.east(large)], within(1e-12));
                    assertThat(north).isCloseTo(flows[grid.north(large)], within(1e-12));
                    assertThat(up).isCloseTo(flows[grid.bottom(large)], within(1e-12));
                }
            }
        }
    }

    @Test
    void smallCellsBalance() {
        for (int interval = 0; interval < DepotPlume.INTERVALS; interval++) {
            for (int row = 0; row < DepotFlow.ROWS; row++) {
                for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                    double gain = FLOW.east(interval, column, row)
                            - FLOW.east(interval, column + 1, row)
                            + FLOW.north(interval, column, row)
                            - FLOW.north(interval, column, row + 1)
                            + FLOW.up(interval, column, row)
                            + FLOW.recharge(interval, column, row) / 1000.0 / 365.25 * 100
                            + FLOW.released(interval, column, row);
                    assertThat(gain).isCloseTo(0, within(1e-11));
                }
            }
        }
    }

    /** The generator knows nothing of the engine: with its own concentrations a box along cell faces closes to rounding. */
    @Test
    void theEngineBooksWhatTheGeneratorMoved() {
        List<List<double[]>> solved = new DepotPlume(FLOW).solved();
        try (AquiferFolder folder = AquiferReader.open(COMMITTED)) {
            List<Solute> exact = List.of(
                    withConcentration(folder.solutes().get(0), solved.get(0)),
                    withConcentration(folder.solutes().get(1), solved.get(1)));
            List<Plume> plumes = SoluteBalance.of(
                    folder.aquifer(),
                    exact,
                    List.of(Prisms.of("yard", 0, 0, 20, 20, 120, 20, 120, 110, 20, 110)),
                    new SoluteBalance.Options(WellRule.POINT, true, OptionalDouble.empty(), 1),
                    Progress.NONE);
            for (Plume plume : plumes) {
                double error = plume.ledger()
                        .budget(new Periods(folder.aquifer().times()).record())
                        .totals()
                        .closureError();
                assertThat(error).as(plume.solute().name()).isCloseTo(0, within(1e-9));
            }
        }
    }

    private static Solute withConcentration(Solute like, List<double[]> fromSouth) {
        double[][][] values = new double[fromSouth.size()][1][];
        for (int instant = 0; instant < values.length; instant++) {
            double[] given = fromSouth.get(instant);
            values[instant][0] = new double[given.length];
            for (int cell = 0; cell < given.length; cell++) {
                int row = DepotFlow.ROWS - 1 - cell / DepotFlow.COLUMNS;
                values[instant][0][row * DepotFlow.COLUMNS + cell % DepotFlow.COLUMNS] = 1e-3 * given[cell];
            }
        }
        Concentration concentration = new Concentration(
                new ArrayValues(DepotFlow.COLUMNS, values),
                GriddedValues.constant(Double.NaN),
                Optional.empty(),
                true,
                like.concentration().orElseThrow().unit());
        return new Solute(
                like.name(),
                Optional.of(concentration),
                like.porosity(),
                like.effectivePorosity(),
                like.sorption(),
                like.decay(),
                like.ancestry(),
                like.dispersion(),
                like.boundary(),
                like.ofSources());
    }

    /** Dispersion turned against the grid undershoots, by less than two thousandths of the peak; files say <0.002 there. */
    @Test
    void hardlyUndershoots() {
        for (List<double[]> substance : new DepotPlume(FLOW).solved()) {
            double least =
                    substance.stream().flatMapToDouble(Arrays::stream).min().orElseThrow();
            double peak =
                    substance.stream().flatMapToDouble(Arrays::stream).max().orElseThrow();
            assertThat(least).isGreaterThan(-2e-3 * peak);
        }
    }

    @Test
    void budgetsClose() {
        try (AquiferFolder folder = AquiferReader.open(COMMITTED)) {
            Path file = COMMITTED.resolve("prisms.geojson");
            List<Plume> plumes = SoluteBalance.of(
                    folder.aquifer(),
                    folder.solutes(),
                    new PrismsReader(
                                    folder.crs(),
                                    folder.aquifer().grid(),
                                    folder.aquifer().layers(),
                                    false,
                                    (name, place) -> null,
                                    note -> {},
                                    warning -> {})
                            .read(file, "prisms.geojson"),
                    new SoluteBalance.Options(WellRule.POINT, true, OptionalDouble.empty(), 1),
                    Progress.NONE);
            Periods periods = new Periods(folder.aquifer().times());
            for (Plume plume : plumes) {
                double error = plume.ledger().budget(periods.record()).totals().closureError();
                boolean alongFaces = plume.prism().equals("yard");
                assertThat(error)
                        .as("%s in %s", plume.solute().name(), plume.prism())
                        .isCloseTo(0, within(alongFaces ? 0.1 : 5.0));
                assertThat(plume.whole(1).undetectedShare()).isPositive();
                assertThat(plume.whole(24).undetectedShare()).isLessThan(0.15);
                assertThat(plume.whole(24).total(NonDetects.HALF)).isPositive();
            }
        }
    }
}
