package org.seepledger.plume;

import java.util.List;
import org.seepledger.aquifer.Times;
import org.seepledger.balance.Periods;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;

/** A solute budget over the whole record, read item by item, for tests; masses. */
record MassReading(PeriodBudget budget) {

    static MassReading of(Plume plume, Times times) {
        return new MassReading(plume.ledger().budget(new Periods(times).record()));
    }

    double in(Group group, String item) {
        return entries(group, item).stream().mapToDouble(Entry::inflow).sum();
    }

    double out(Group group, String item) {
        return entries(group, item).stream().mapToDouble(Entry::outflow).sum();
    }

    double net(Group group, String item) {
        return entries(group, item).stream().mapToDouble(Entry::net).sum();
    }

    double net(Group group) {
        return budget.entries().stream()
                .filter(entry -> entry.account().group() == group)
                .filter(entry -> entry.account().quantified())
                .mapToDouble(Entry::net)
                .sum();
    }

    private List<Entry> entries(Group group, String item) {
        List<Entry> entries = budget.entries().stream()
                .filter(entry -> entry.account().group() == group
                        && entry.account().item().equals(item))
                .toList();
        if (entries.isEmpty()) {
            throw new AssertionError("no item " + item);
        }
        return entries;
    }
}
