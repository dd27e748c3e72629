package org.seepledger.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;

/**
 * What adds to a budget and what takes from it, storage apart, each item over all its layers.
 *
 * @param gains the largest first
 * @param losses the largest first
 * @param unknown the names of items that cannot be given
 */
record Slices(List<Slice> gains, List<Slice> losses, List<String> unknown) {

    static Slices of(PeriodBudget budget, BudgetBlocks.Flows flows, UnitShown unit) {
        Map<String, double[]> items = new LinkedHashMap<>();
        for (Entry entry : budget.entries()) {
            if (entry.account().group() != Group.STORAGE) {
                add(items.computeIfAbsent(entry.account().name(), name -> new double[4]), entry);
            }
        }
        List<Slice> gains = new ArrayList<>();
        List<Slice> losses = new ArrayList<>();
        List<String> unknown = new ArrayList<>();
        items.forEach((name, sums) -> {
            double inflow = unit.of(sums[0], budget.period());
            double outflow = unit.of(sums[1], budget.period());
            double common = flows == BudgetBlocks.Flows.NET ? Math.min(inflow, outflow) : 0;
            if (sums[3] > 0 || !Double.isFinite(inflow + outflow)) {
                unknown.add(sums[2] > 0 ? name + " (in part)" : name);
            }
            addUnlessNothing(gains, name, inflow - common);
            addUnlessNothing(losses, name, outflow - common);
        });
        Comparator<Slice> largestFirst = Comparator.comparingDouble(slice -> -slice.amount());
        gains.sort(largestFirst);
        losses.sort(largestFirst);
        return new Slices(gains, losses, unknown);
    }

    /** Counts in the third place how many entries can be given, and in the fourth how many cannot. */
    private static void add(double[] sums, Entry entry) {
        if (entry.account().quantified()) {
            sums[0] += entry.inflow();
            sums[1] += entry.outflow();
            sums[2]++;
        } else {
            sums[3]++;
        }
    }

    private static void addUnlessNothing(List<Slice> slices, String name, double amount) {
        if (amount > 0 && Double.isFinite(amount)) {
            slices.add(new Slice(name, amount));
        }
    }

    static double sum(List<Slice> slices) {
        return slices.stream().mapToDouble(Slice::amount).sum();
    }

    /**
     * {@return the slices, with the small ones in one}
     *
     * @param slices the largest first
     * @param least the least amount of a slice of its own
     * @param most how many there may be
     */
    static List<Slice> merged(List<Slice> slices, double least, int most) {
        int kept = 0;
        while (kept < slices.size() && slices.get(kept).amount() >= least) {
            kept++;
        }
        kept = Math.min(kept, slices.size() > most ? most - 1 : most);
        List<Slice> rest = slices.subList(kept, slices.size());
        if (rest.size() < 2) {
            return slices;
        }
        List<Slice> merged = new ArrayList<>(slices.subList(0, kept));
        merged.add(new Slice(rest.size() + " smaller terms", sum(rest)));
        return merged;
    }
}
