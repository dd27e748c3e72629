package org.seepledger.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;

/**
 * What one item of a budget came to over all its layers, length³.
 *
 * @param group its kind
 * @param item its name
 * @param entries its rows, from the top layer down
 * @param inflow the sum of what came in; NaN where none of its rows can be given
 * @param outflow the sum of what went out; NaN where none of its rows can be given
 */
public record Term(Group group, String item, List<Entry> entries, double inflow, double outflow) {

    /** Copies the list. */
    public Term {
        entries = List.copyOf(entries);
    }

    /**
     * {@return the terms of a budget, in the order of its rows}
     *
     * @param budget the budget
     */
    public static List<Term> of(PeriodBudget budget) {
        Map<String, List<Entry>> items = new LinkedHashMap<>();
        for (Entry entry : budget.entries()) {
            String key = entry.account().group() + "/" + entry.account().item();
            items.computeIfAbsent(key, item -> new ArrayList<>()).add(entry);
        }
        return items.values().stream().map(Term::of).toList();
    }

    private static Term of(List<Entry> entries) {
        List<Entry> given =
                entries.stream().filter(entry -> entry.account().quantified()).toList();
        double none = given.isEmpty() ? Double.NaN : 0;
        Entry first = entries.get(0);
        return new Term(
                first.account().group(),
                first.account().item(),
                entries,
                none + given.stream().mapToDouble(Entry::inflow).sum(),
                none + given.stream().mapToDouble(Entry::outflow).sum());
    }

    /**
     * {@return the terms that can be given, the largest by gross flow first}
     *
     * @param terms the terms
     */
    public static List<Term> bySize(List<Term> terms) {
        return terms.stream()
                .filter(Term::quantified)
                .sorted(Comparator.comparingDouble(term -> -term.gross()))
                .toList();
    }

    /** {@return whether it can be given} */
    public boolean quantified() {
        return !Double.isNaN(inflow);
    }

    /** {@return inflow − outflow, length³} */
    public double net() {
        return inflow - outflow;
    }

    /** {@return the larger of inflow and outflow, length³} */
    public double gross() {
        return Math.max(inflow, outflow);
    }

    /** {@return what it is called in a sentence} */
    public String name() {
        return entries.get(0).account().name();
    }
}
