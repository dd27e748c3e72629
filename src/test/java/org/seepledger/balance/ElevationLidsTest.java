package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** Prisms between elevations in transient, unconfined, layered aquifers whose cells balance. */
class ElevationLidsTest {

    @Property(tries = 400)
    void closeToRoundingWhereCellsDo(@ForAll long seed) {
        TransientCase transientCase;
        Balance balance;
        try {
            transientCase = new TransientCase(seed);
            WellRule rule = seed % 2 == 0 ? WellRule.POINT : WellRule.SPREAD;
            List<Prism> prisms = List.of(transientCase.prism("a"));
            balance = WaterBalance.of(transientCase.aquifer, prisms, rule, 1, Progress.NONE);
        } catch (DataFault unlucky) {
            Assume.that(!unlucky.getMessage().contains("no layer lies")
                    && !unlucky.getMessage().contains("no active cell"));
            throw unlucky;
        }
        Ledger ledger = balance.ledgers().get(0);
        new Periods(transientCase.aquifer.times())
                .every(Periods.Every.INTERVAL, 10)
                .forEach(period -> {
                    PeriodBudget budget = ledger.budget(period);
                    assertThat(budget.totals().residual())
                            .as("residual of %s", period.name())
                            .isCloseTo(
                                    0,
                                    Offset.offset(1e-11 * (1 + budget.totals().throughput())));
                });
    }
}
