package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.lifecycle.AfterProperty;
import org.assertj.core.data.Offset;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** Stored values times their weights add up to the row, whichever row, whatever was given. */
class TraceTest {

    /** Rounding of sums of some thousand terms, against the sum of their magnitudes. */
    private static final double ROUNDING = 1e-13;

    private static int rows;

    @AfterProperty
    void someRowsWereTraced() {
        assertThat(rows).isPositive();
    }

    @Property(tries = 8)
    void addsUpWhereFaceFlowsAreGiven(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0.1, 0.2, 0);
        checkAllRows(aquifer, random.prism("a"), WellRule.POINT);
    }

    @Property(tries = 8)
    void addsUpWithWells(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0, 0, 12);
        checkAllRows(aquifer, random.prism("a"), seed % 2 == 0 ? WellRule.POINT : WellRule.SPREAD);
    }

    @Property(tries = 8)
    void addsUpWhereFluxIsGiven(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        DarcyFlux flux = new DarcyFlux(
                random.quantity(0.05),
                random.quantity(0.05),
                Optional.of(random.quantity(0)),
                random.random.nextBoolean(),
                new OuterFaces(random.random.nextBoolean(), random.random.nextBoolean(), random.random.nextBoolean()));
        List<Source> sources = List.of(
                new Source.Areal("recharge", GriddedValues.constant(0.25)),
                new Source.Points("pumping", List.of(well(random))));
        try {
            checkAllRows(random.aquifer(flux, random.stack(0), sources), random.prism("a"), WellRule.POINT);
        } catch (DataFault unlucky) {
            passOver(unlucky);
        }
    }

    private static Well well(RandomCase random) {
        double x = random.place(random.grid.x());
        double y = random.place(random.grid.y());
        return Well.of(List.of(new PointRate(
                        "w",
                        "pumping",
                        random.grid.mapX(x, y),
                        random.grid.mapY(x, y),
                        new Screen.Between(0, -1000),
                        0.25,
                        0.75,
                        -20,
                        "wells.csv, line 2")))
                .get(0);
    }

    @Property(tries = 8)
    void addsUpWithHeadsAndStorageBetweenElevations(@ForAll long seed) {
        try {
            TransientCase transientCase = new TransientCase(seed);
            WellRule rule = seed % 2 == 0 ? WellRule.POINT : WellRule.SPREAD;
            checkAllRows(transientCase.aquifer, transientCase.prism("a"), rule);
        } catch (DataFault unlucky) {
            passOver(unlucky);
        }
    }

    /** Passes over a random case whose prism misses the grid, or whose well stands in an inactive cell. */
    private static void passOver(DataFault unlucky) {
        Assume.that(!unlucky.getMessage().contains("no layer lies")
                && !unlucky.getMessage().contains("no active cell"));
        throw unlucky;
    }

    private static void checkAllRows(Aquifer aquifer, Prism prism, WellRule rule) {
        Ledger ledger = WaterBalance.of(aquifer, List.of(prism), rule, 1, Progress.NONE)
                .ledgers()
                .get(0);
        Periods periods = new Periods(aquifer.times());
        List<Period> all =
                new ArrayList<>(periods.every(Periods.Every.INTERVAL, 10).subList(0, 1));
        all.add(periods.record());
        for (Period period : all) {
            PeriodBudget budget = ledger.budget(period);
            List<Account> accounts = ledger.accounts();
            for (int i = 0; i < accounts.size(); i++) {
                Entry entry = budget.entries().get(i);
                if (entry.account().quantified()) {
                    check(
                            aquifer,
                            prism,
                            rule,
                            TracedRow.of(List.of(i), accounts),
                            period,
                            entry.net(),
                            accounts.get(i));
                }
            }
            for (Total total : Total.rows(ledger.storageKnown())) {
                double volume = budget.totals().get(total);
                if (!total.isPercentage() && !Double.isNaN(volume)) {
                    TracedRow row = TracedRow.of(total, accounts).orElseThrow();
                    check(aquifer, prism, rule, row, period, volume, total);
                }
            }
        }
    }

    private static void check(
            Aquifer aquifer, Prism prism, WellRule rule, TracedRow row, Period period, double volume, Object what) {
        double[] sum = new double[1];
        Trace.Lines lines = (file, place, value, weight) -> sum[0] += value * weight;
        Trace.Sum traced = Trace.of(aquifer, prism, rule, row, period, 1, lines, Progress.NONE);
        double rate = volume / period.duration();
        Offset<Double> rounding = Offset.offset(ROUNDING * (1 + traced.magnitude()));
        assertThat(sum[0]).as("lines of %s in %s", what, period.name()).isCloseTo(rate, rounding);
        assertThat(traced.value()).isCloseTo(rate, rounding);
        rows++;
    }
}
