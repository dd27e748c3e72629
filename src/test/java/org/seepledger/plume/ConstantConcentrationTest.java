package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.balance.Periods;
import org.seepledger.balance.RandomCase;
import org.seepledger.balance.TransientCase;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** With one concentration everywhere and always, the solute budget is that concentration × the water budget. */
class ConstantConcentrationTest {

    private static final double C = 0.0137;

    private static Solute everywhere(Aquifer aquifer) {
        SoluteDraft draft = SoluteDraft.of("salt", GriddedValues.constant(C))
                .porosity(GriddedValues.constant(0.3))
                .sorption(new Sorption.Freundlich(
                        GriddedValues.constant(1700), GriddedValues.constant(0.4), GriddedValues.constant(0.7), 1000))
                .dispersion(10, 1, 0.1, 1e-4);
        IntStream.range(0, aquifer.sources().size()).forEach(source -> draft.source(source, GriddedValues.constant(C)));
        return draft.done();
    }

    @Property(tries = 150)
    void eachRowOfASteadySetIsTheWaters(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0.05, 0.1, 4);
        compare(aquifer, random.prism("a"), 0);
    }

    @Property(tries = 150)
    void eachRowOfATransientSetIsTheWatersAndStorageIsInSum(@ForAll long seed) {
        TransientCase transientCase = Luck.orPassOver(() -> new TransientCase(seed));
        compare(transientCase.aquifer, transientCase.prism("a"), 3);
    }

    private static void compare(Aquifer aquifer, Prism prism, int intervals) {
        List<Plume> plumes =
                Luck.orPassOver(() -> SoluteDraft.balance(aquifer, true, List.of(prism), everywhere(aquifer)));
        PeriodBudget water = WaterBalance.of(aquifer, List.of(prism), WellRule.POINT, 1, Progress.NONE)
                .ledgers()
                .get(0)
                .budget(new Periods(aquifer.times()).record());
        PeriodBudget mass = plumes.get(0).ledger().budget(new Periods(aquifer.times()).record());
        double gross = water.totals().throughput()
                + water.entries().stream()
                        .mapToDouble(entry -> entry.inflow() + entry.outflow())
                        .filter(value -> !Double.isNaN(value))
                        .sum();
        Offset<Double> rounding = Offset.offset(1e-12 * C * (gross + 1e-300));
        for (Entry entry : water.entries()) {
            if (entry.account().group() != Group.STORAGE && entry.account().quantified()) {
                Entry own = find(mass, entry.account());
                assertThat(own.inflow()).as("%s", entry.account()).isCloseTo(C * entry.inflow(), rounding);
                assertThat(own.outflow()).as("%s", entry.account()).isCloseTo(C * entry.outflow(), rounding);
            }
        }
        double held = plumes.get(0).whole(intervals == 0 ? 1 : intervals).total(NonDetects.HALF)
                + plumes.get(0).whole(0).total(NonDetects.HALF);
        Offset<Double> ofMass = Offset.offset(1e-12 * (C * gross + held));
        assertThat(mass.totals().storageChange()).isCloseTo(C * water.totals().storageChange(), ofMass);
        assertThat(mass.totals().residual()).isCloseTo(C * water.totals().residual(), ofMass);
        assertThat(mass.entries())
                .filteredOn(entry -> entry.account().group() == Group.DISPERSION)
                .allSatisfy(entry -> assertThat(Math.abs(entry.inflow()) + Math.abs(entry.outflow()))
                        .isIn(0.0, Double.NaN));
        Stock last = plumes.get(0).whole(intervals == 0 ? 1 : intervals);
        assertThat(last.dissolved(NonDetects.HALF))
                .isCloseTo(C * last.water(), Offset.offset(1e-12 * C * last.water()));
    }

    private static Entry find(PeriodBudget budget, Account account) {
        return budget.entries().stream()
                .filter(entry -> entry.account().equals(account))
                .findFirst()
                .orElseThrow();
    }
}
