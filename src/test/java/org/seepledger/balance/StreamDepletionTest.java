package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/**
 * A well beside a straight stream that keeps its stage. Heads are those of the well and of its image across the stream,
 * which adds as much (Theis 1935 for each). The stream gives the share erfc √(a²S / 4Tt) of what is pumped: Glover and Balmer
 * (1954, Trans. AGU 35, 468–470).
 */
class StreamDepletionTest {

    private static final double RATE = 650;
    private static final double TRANSMISSIVITY = 300;
    private static final double STORATIVITY = 0.01;
    private static final double AWAY = 120;
    private static final double NOW = 0.24;
    /** Beyond five times the way to the stream, what still flows is below 1e-5 of the rate at this time. */
    private static final double FAR = 5 * AWAY;

    private static double u(double distance, double time) {
        return distance * distance * STORATIVITY / (4 * TRANSMISSIVITY * time);
    }

    private static double drawdown(double x, double y, double time) {
        if (time == 0) {
            return 0;
        }
        double own = WellFunction.of(u(Math.hypot(x - AWAY, y), time));
        double image = WellFunction.of(u(Math.hypot(x + AWAY, y), time));
        return RATE / (4 * Math.PI * TRANSMISSIVITY) * (own - image);
    }

    private static double streamShare(double time) {
        return Erf.erfc(Math.sqrt(u(AWAY, time)));
    }

    /** Of the volume pumped: Jenkins (1968, Ground Water 6(2), 37–46), the integral of the share over time. */
    private static double streamVolumeShare(double time) {
        double u = u(AWAY, time);
        return (1 + 2 * u) * Erf.erfc(Math.sqrt(u)) - 2 * Math.sqrt(u / Math.PI) * Math.exp(-u);
    }

    /** From one cell west of the stream on; the well at the corner of four cells. */
    private static Aquifer aquifer(double step, double east, boolean meanHeads, double... instants) {
        int columns = (int) Math.round(east / step) + 2;
        int rows = (int) Math.round(2 * FAR / step) + 2;
        Grid grid = new Grid(Axis.even(-step, step, columns), Axis.even(-FAR - step, step, rows), 0, 1);
        AquiferDraft draft = AquiferDraft.on(grid)
                .layers(25, 0)
                .times(instants)
                .flow(new HeadGradient(
                        GriddedValues.constant(TRANSMISSIVITY / 25), Optional.empty(), Optional.empty(), meanHeads))
                .head(new FormulaValues(
                        grid, instants.length, (instant, layer, x, y) -> 50 - drawdown(x, y, instants[instant])))
                .storage(new Storage(
                        Optional.empty(),
                        Optional.empty(),
                        Optional.of(GriddedValues.constant(STORATIVITY)),
                        List.of()));
        if (east > AWAY) {
            PointRate pump = new PointRate(
                    "P",
                    "pumping",
                    AWAY,
                    0,
                    new Screen.InLayer(0),
                    0,
                    instants[instants.length - 1],
                    -RATE,
                    "wells.csv, line 2");
            draft.source(new Source.Points("pumping", Well.of(List.of(pump))));
        }
        return draft.done();
    }

    private static BudgetReading fromTheStreamTo(double east, Aquifer aquifer) {
        return BudgetReading.of(aquifer, Prisms.of("bank", 0, 0, Shapes.box(0, -FAR, east, FAR)));
    }

    @Test
    void theStreamGivesItsShareAndStorageTheRest() {
        double shortly = 1e-4 * NOW;
        double share = streamShare(NOW);
        assertThat(share).isBetween(0.3, 0.7);
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            double step = AWAY / (3 << level);
            BudgetReading budget = fromTheStreamTo(FAR, aquifer(step, FAR, false, NOW - shortly, NOW));
            assertThat(budget.out("side 4")).isZero();
            assertThat(budget.net("pumping") / shortly).isEqualTo(-RATE, within(1e-9 * RATE));
            // Through the three far sides.
            assertThat(budget.in("side 1") + budget.in("side 2") + budget.in("side 3"))
                    .isEqualTo(0, within(1e-4 * RATE * shortly));
            errors[0][level] = budget.in("side 4") / shortly / RATE - share;
            errors[1][level] = budget.net("elastic storage") / shortly / RATE - (1 - share);
        }
        assertThat(errors[0][2]).isEqualTo(0, within(0.003));
        assertThat(errors[1][2]).isEqualTo(0, within(0.003));
        assertThat(Refinement.order("stream depletion, from the stream", errors[0]))
                .isBetween(1.7, 2.3);
        assertThat(Refinement.order("stream depletion, from storage", errors[1]))
                .isBetween(1.7, 2.3);
    }

    /** The volume from the stream, flow times the intervals' lengths, with heads at their ends and with mean heads. */
    @Test
    void theStreamsVolumeShareIsItsShareIntegratedOverTime() {
        double share = streamVolumeShare(NOW);
        assertThat(share).isBetween(0.1, streamShare(NOW));
        double[][] errors = new double[2][3];
        for (int level = 0; level < 3; level++) {
            double[] instants = new double[(6 << level) + 1];
            for (int i = 0; i < instants.length; i++) {
                instants[i] = NOW * i / (instants.length - 1);
            }
            for (int mean = 0; mean < 2; mean++) {
                double step = AWAY / 80;
                BudgetReading budget = fromTheStreamTo(step, aquifer(step, step, mean == 1, instants));
                errors[mean][level] = budget.in("side 4") / (RATE * NOW) - share;
            }
        }
        assertThat(errors[1][2]).isEqualTo(0, within(0.002 * share));
        assertThat(Refinement.order("stream depletion, volume with heads at the end", errors[0]))
                .isBetween(0.8, 1.2);
        assertThat(Refinement.order("stream depletion, volume with mean heads", errors[1]))
                .isBetween(1.5, 2.5);
    }

    @Test
    void theVolumeShareIsTheIntegralOfTheShare() {
        double sum = 0;
        int parts = 20_000;
        for (int i = 0; i < parts; i++) {
            sum += streamShare(NOW * (i + 0.5) / parts) / parts;
        }
        assertThat(streamVolumeShare(NOW)).isEqualTo(sum, within(1e-8));
    }
}
