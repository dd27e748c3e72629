package org.seepledger.review.check;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.seepledger.ledger.Account;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.review.mapping.Sense;

/**
 * Which accounts of a budget a term stands for.
 *
 * @param items groups, as {@code side}, and items, as {@code source/recharge}
 * @param without items that other terms stand for
 * @param layer the layer, from 0; -1 for all
 */
record Selection(Set<String> items, Set<String> without, int layer) {

    /** How flow both ways is counted. */
    enum Way {
        /** Piece by piece. */
        GROSS,
        /** Net of each face and layer. */
        NET_BY_ACCOUNT,
        /** Net of each item over its layers. */
        NET_BY_ITEM,
        /** Net of all of it. */
        NET
    }

    static String key(Account account) {
        return account.group() + "/" + account.item();
    }

    boolean takes(Account account) {
        String key = key(account);
        boolean named = items.contains(key);
        boolean grouped = items.contains(account.group().toString()) && !without.contains(key);
        return (named || grouped) && account.quantified() && (layer < 0 || layer == account.layer());
    }

    /** Whether it stands for anything in a budget. */
    boolean any(PeriodBudget budget) {
        return budget.entries().stream().anyMatch(entry -> takes(entry.account()));
    }

    /** The same with one more item. */
    Selection and(String key) {
        Set<String> more = new TreeSet<>(items);
        more.add(key);
        return new Selection(more, without, layer);
    }

    /**
     * What a budget has of it, in the budget's unit.
     *
     * @param way how flow both ways is counted
     * @param sense which way it counts
     */
    double of(PeriodBudget budget, Way way, Sense sense) {
        List<Entry> entries = budget.entries().stream()
                .filter(entry -> takes(entry.account()))
                .toList();
        double net = entries.stream().mapToDouble(Entry::net).sum();
        return switch (sense) {
            case NET -> net;
            case LOSS -> -net;
            case IN -> oneWay(entries, way, net, 1);
            case OUT -> oneWay(entries, way, net, -1);
        };
    }

    private static double oneWay(List<Entry> entries, Way way, double net, int sign) {
        return switch (way) {
            case GROSS ->
                entries.stream()
                        .mapToDouble(entry -> sign > 0 ? entry.inflow() : entry.outflow())
                        .sum();
            case NET_BY_ACCOUNT ->
                entries.stream()
                        .mapToDouble(entry -> Math.max(0, sign * entry.net()))
                        .sum();
            case NET_BY_ITEM -> {
                Map<String, Double> nets = new LinkedHashMap<>();
                entries.forEach(entry -> nets.merge(key(entry.account()), entry.net(), Double::sum));
                yield nets.values().stream()
                        .mapToDouble(each -> Math.max(0, sign * each))
                        .sum();
            }
            case NET -> sign * net;
        };
    }
}
