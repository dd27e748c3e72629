package org.seepledger.balance;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** A budget over the whole record, read item by item, for tests; volumes, which in a record of one day are rates. */
record BudgetReading(PeriodBudget budget) {

    static BudgetReading of(Aquifer aquifer, Prism prism) {
        return of(aquifer, WellRule.POINT, prism).get(0);
    }

    static List<BudgetReading> of(Aquifer aquifer, WellRule rule, Prism... prisms) {
        return of(aquifer, WaterBalance.of(aquifer, List.of(prisms), rule, 1, Progress.NONE));
    }

    static List<BudgetReading> of(Aquifer aquifer, Balance balance) {
        Periods periods = new Periods(aquifer.times());
        List<BudgetReading> readings = new ArrayList<>();
        balance.ledgers().forEach(ledger -> readings.add(new BudgetReading(ledger.budget(periods.record()))));
        return readings;
    }

    /** What came in under an item, all layers together. */
    double in(String item) {
        return entries(item).stream().mapToDouble(Entry::inflow).sum();
    }

    double out(String item) {
        return entries(item).stream().mapToDouble(Entry::outflow).sum();
    }

    double net(String item) {
        return entries(item).stream().mapToDouble(Entry::net).sum();
    }

    Entry entry(String item, int layer) {
        return entries(item).stream()
                .filter(entry -> entry.account().layer() == layer)
                .findFirst()
                .orElseThrow();
    }

    List<Entry> entries(String item) {
        List<Entry> entries = budget.entries().stream()
                .filter(entry -> entry.account().item().equals(item))
                .toList();
        if (entries.isEmpty()) {
            throw new AssertionError("no item " + item);
        }
        return entries;
    }

    Totals totals() {
        return budget.totals();
    }
}
