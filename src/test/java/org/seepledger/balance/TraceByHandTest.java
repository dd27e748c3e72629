package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Well;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Total;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;

/** Weights of stored values, worked by hand, or held against what a row grows by when a value does. */
class TraceByHandTest {

    private static final double EXACT = 1e-12;

    private static Map<String, Double> weights(
            Aquifer aquifer, Prism prism, WellRule rule, TracedRow row, Period period) {
        Map<String, Double> weights = new TreeMap<>();
        Trace.Lines lines = (file, place, value, weight) -> weights.merge(place, weight, Double::sum);
        Trace.of(aquifer, prism, rule, row, period, 1, lines, Progress.NONE);
        weights.values().removeIf(weight -> Math.abs(weight) < 1e-15);
        return weights;
    }

    private static Ledger ledger(Aquifer aquifer, Prism prism, WellRule rule) {
        return WaterBalance.of(aquifer, List.of(prism), rule, 1, Progress.NONE)
                .ledgers()
                .get(0);
    }

    private static int account(List<Account> accounts, String item, int layer) {
        for (int i = 0; i < accounts.size(); i++) {
            if (accounts.get(i).item().equals(item) && accounts.get(i).layer() == layer) {
                return i;
            }
        }
        throw new AssertionError("no " + item);
    }

    private static void assertWeights(Map<String, Double> found, Map<String, Double> expected) {
        assertThat(found.keySet()).isEqualTo(expected.keySet());
        expected.forEach(
                (place, weight) -> assertThat(found.get(place)).as(place).isCloseTo(weight, within(EXACT)));
    }

    private static final Grid ROW = new Grid(Axis.even(0, 10, 3), Axis.even(0, 10, 1), 0, 1);
    private static final Prism REACH = Prisms.of("reach", 0, 0, Shapes.box(5, 0, 17, 10));

    /** Flow to the east of 4, 2 and 0, a rise of 0.5 through each bottom, 3 in the west; and recharge. */
    private static Aquifer row(Source... sources) {
        double[] east = {4, 2, 0};
        AquiferDraft draft = AquiferDraft.on(ROW)
                .layers(10, 0)
                .flow(new GivenFaceFlow(
                        FormulaValues.steady(ROW, (x, y) -> east[(int) (x / 10)]),
                        GriddedValues.constant(0),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.of(FormulaValues.steady(ROW, (x, y) -> 0.5))));
        for (Source source : sources) {
            draft.source(source);
        }
        return draft.done();
    }

    private static Map<String, Double> ofRow(Aquifer aquifer, Prism prism, WellRule rule, String item) {
        List<Account> accounts = Trace.accounts(aquifer, prism);
        TracedRow row = TracedRow.of(List.of(account(accounts, item, 0)), accounts);
        return weights(aquifer, prism, rule, row, new Periods(aquifer.times()).record());
    }

    /** At x = 17, in the second cell, flow is three tenths of the first cell's eastern face and seven of the second's. */
    @Test
    void aSideInACellRestsOnTheFacesOnEitherHandOfIt() {
        Map<String, Double> east = ofRow(row(), REACH, WellRule.POINT, "side 2");
        assertWeights(east, Map.of("layer 1, row 1, col 1", -0.3, "layer 1, row 1, col 2", -0.7));
        Map<String, Double> west = ofRow(row(), REACH, WellRule.POINT, "side 4");
        assertWeights(west, Map.of("layer 1, row 1, col 1", 0.5));
    }

    @Test
    void aLidRestsOnTheInterfacesByTheSharesCovered() {
        Map<String, Double> bottom = ofRow(row(), REACH, WellRule.POINT, "bottom");
        assertWeights(bottom, Map.of("layer 1, row 1, col 1", 0.5, "layer 1, row 1, col 2", 0.7));
    }

    @Test
    void aSourceRestsOnItsRates() {
        Aquifer aquifer = row(
                new Source.Areal("recharge", FormulaValues.steady(ROW, (x, y) -> 0.01)),
                new Source.Cells("drain", FormulaValues.steady(ROW, (x, y) -> -3)));
        Map<String, Double> recharge = ofRow(aquifer, REACH, WellRule.POINT, "recharge");
        assertWeights(recharge, Map.of("layer 1, row 1, col 1", 50.0, "layer 1, row 1, col 2", 70.0));
        Map<String, Double> drain = ofRow(aquifer, REACH, WellRule.POINT, "drain");
        assertWeights(drain, Map.of("layer 1, row 1, col 1", 0.5, "layer 1, row 1, col 2", 0.7));
    }

    private static Source well(double x, double rate) {
        return new Source.Points(
                "pumping",
                Well.of(List.of(new PointRate(
                        "w", "pumping", x, 5, new Screen.InLayer(0), 0, 0.5, rate, "wells.csv, line 2"))));
    }

    /** A well that is there for half of the interval: inside it counts in full, outside not at all, spread by the share. */
    @Test
    void aWellRestsOnItsRateByTheTimeThatItIsActive() {
        assertThat(ofRow(row(well(12, -8)), REACH, WellRule.POINT, "pumping").values())
                .containsExactly(0.5);
        assertThat(ofRow(row(well(19, -8)), REACH, WellRule.POINT, "pumping")).isEmpty();
        assertThat(ofRow(row(well(12, -8)), REACH, WellRule.SPREAD, "pumping").values())
                .singleElement()
                .satisfies(weight -> assertThat(weight).isCloseTo(0.5 * 0.7, within(EXACT)));
    }

    /** The totals take the gross of the accounts: inflow what comes in, outflow what goes out, the residual both. */
    @Test
    void totalsRestOnWhatTheyAddUp() {
        Aquifer aquifer = row(
                new Source.Areal("recharge", FormulaValues.steady(ROW, (x, y) -> 0.01)),
                new Source.Cells("drain", FormulaValues.steady(ROW, (x, y) -> -3)));
        Map<String, Map<Total, Double>> expected = Map.of(
                "layer 1, row 1, col 3", Map.of(Total.INFLOW, 0.0, Total.OUTFLOW, 0.0, Total.RESIDUAL, 0.0),
                // In: 0.5 through the west, 0.5 of a bottom, 50 of recharge. Out: 0.3 through the east, minus 0.5 of
                // the drain.
                "layer 1, row 1, col 1",
                        Map.of(Total.INFLOW, 0.5 + 0.5 + 50, Total.OUTFLOW, 0.3 - 0.5, Total.RESIDUAL, 51 - 0.3 + 0.5),
                "layer 1, row 1, col 2",
                        Map.of(Total.INFLOW, 0.7 + 70, Total.OUTFLOW, 0.7 - 0.7, Total.RESIDUAL, 70.7 - 0.7 + 0.7));
        List<Account> accounts = Trace.accounts(aquifer, REACH);
        Period record = new Periods(aquifer.times()).record();
        expected.forEach((place, totals) -> totals.forEach((total, weight) -> {
            TracedRow row = TracedRow.of(total, accounts).orElseThrow();
            assertThat(weights(aquifer, REACH, WellRule.POINT, row, record).getOrDefault(place, 0.0))
                    .as("%s of %s", total, place)
                    .isCloseTo(weight, within(1e-10));
        }));
        assertThat(TracedRow.of(Total.CLOSURE_ERROR, accounts)).isEmpty();
        assertThat(TracedRow.of(Total.NET_CLOSURE_ERROR, accounts)).isEmpty();
    }

    private static final Grid SQUARE = new Grid(Axis.even(0, 10, 4), Axis.even(0, 8, 3), 0, 1);
    private static final Prism TURNED = Prisms.of("turned", 0, 1, Shapes.turned(Shapes.box(9, 5, 33, 19), 12, 20, 12));

    /** Heads of two layers at three instants; one of them is made greater by 1. */
    private static Aquifer confined(int instant, int layer, int cell) {
        double[][][] heads = new double[3][2][12];
        for (int t = 0; t < 3; t++) {
            for (int k = 0; k < 2; k++) {
                for (int i = 0; i < 12; i++) {
                    heads[t][k][i] = 30
                            + 3 * Math.sin(1 + t + 2 * k + 1.7 * i)
                            + (t == instant && k == layer && i == cell ? 1 : 0);
                }
            }
        }
        return AquiferDraft.on(SQUARE)
                .layers(12, 7, 0)
                .times(0, 2, 5)
                .flow(new HeadGradient(
                        new FormulaValues(SQUARE, 1, (step, k, x, y) -> 1 + k + 0.05 * x),
                        Optional.of(new FormulaValues(SQUARE, 1, (step, k, x, y) -> 2 - 0.5 * k + 0.02 * y)),
                        Optional.of(GriddedValues.constant(0.1)),
                        true))
                .head(new ArrayValues(4, heads))
                .storage(new Storage(
                        Optional.empty(), Optional.of(GriddedValues.constant(1e-3)), Optional.empty(), List.of()))
                .done();
    }

    /**
     * In confined layers a row is linear in the heads: its weights are what it grows by when a head does, by a balance of its
     * own for each.
     */
    @Test
    void weightsOfHeadsAreWhatARowGrowsByWithThem() {
        Aquifer plain = confined(-1, -1, -1);
        Ledger before = ledger(plain, TURNED, WellRule.POINT);
        List<Account> accounts = before.accounts();
        for (Period period : List.of(
                new Periods(plain.times()).record(),
                new Periods(plain.times()).every(Periods.Every.INTERVAL, 10).get(1))) {
            double[][] grown = new double[3 * 2 * 12][accounts.size()];
            for (int i = 0; i < grown.length; i++) {
                Ledger after = ledger(confined(i / 24, i / 12 % 2, i % 12), TURNED, WellRule.POINT);
                for (int a = 0; a < accounts.size(); a++) {
                    grown[i][a] = (after.budget(period).entries().get(a).net()
                                    - before.budget(period).entries().get(a).net())
                            / period.duration();
                }
            }
            for (int a = 0; a < accounts.size(); a++) {
                Map<String, Double> weights =
                        weights(plain, TURNED, WellRule.POINT, TracedRow.of(List.of(a), accounts), period);
                for (int i = 0; i < grown.length; i++) {
                    String place = "step " + i / 24 + ", layer " + i / 12 % 2 + ", row " + (i % 12 / 4 + 1) + ", col "
                            + (i % 4 + 1);
                    // Storage rests on its coefficients: heads have weights for flow alone.
                    double expected = accounts.get(a).group() == Group.STORAGE ? 0 : grown[i][a];
                    assertThat(weights.getOrDefault(place, 0.0))
                            .as("%s of %s", place, accounts.get(a))
                            .isCloseTo(expected, within(1e-10));
                }
            }
        }
    }

    /** Sources, wells, water tables, lids that cut cells: values times weights add up to each row. */
    @Test
    void valuesTimesWeightsAddUpToEachRow() {
        TransientCase world = new TransientCase(5);
        Prism plan = world.base.prism("p");
        VerticalRange range = new VerticalRange.Elevations(
                Optional.of(GriddedValues.constant(-1.5)), Optional.of(GriddedValues.constant(-6)));
        for (Prism prism : List.of(plan, new Prism("q", plan.rings(), range))) {
            Ledger ledger = ledger(world.aquifer, prism, WellRule.POINT);
            Period record = new Periods(world.aquifer.times()).record();
            for (int a = 0; a < ledger.accounts().size(); a++) {
                double[] sum = new double[1];
                Trace.Lines lines = (file, place, value, weight) -> sum[0] += value * weight;
                TracedRow row = TracedRow.of(List.of(a), ledger.accounts());
                Trace.Sum traced = Trace.of(world.aquifer, prism, WellRule.POINT, row, record, 2, lines, Progress.NONE);
                double rate = 2 * ledger.budget(record).entries().get(a).net() / record.duration();
                assertThat(sum[0])
                        .as("%s", ledger.accounts().get(a))
                        .isCloseTo(rate, within(1e-12 * (1 + traced.magnitude())));
                assertThat(traced.value()).isCloseTo(sum[0], within(1e-12 * (1 + traced.magnitude())));
            }
        }
    }
}
