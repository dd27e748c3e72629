package org.seepledger.ledger;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Entries of a budget added up.
 *
 * @param group their kind
 * @param item what they are about; empty for all items of the group
 * @param layer the layer, from 0; {@link #ALL_LAYERS} for all
 * @param inflow volume that came in, length³; NaN where it cannot be given
 * @param outflow volume that went out, length³; NaN where it cannot be given
 */
public record Line(Group group, String item, int layer, double inflow, double outflow) {

    /** In place of a layer: all of them. */
    public static final int ALL_LAYERS = -1;

    /**
     * {@return inflow − outflow, length³}
     */
    public double net() {
        return inflow - outflow;
    }

    /**
     * {@return a line for each group and layer, over all items whose numbers can be given}
     *
     * @param entries the entries
     */
    public static List<Line> byLayer(List<Entry> entries) {
        Map<List<Object>, Line> lines = new LinkedHashMap<>();
        for (Entry entry : entries) {
            Account account = entry.account();
            if (account.quantified()) {
                Line line = new Line(account.group(), "", account.layer(), entry.inflow(), entry.outflow());
                lines.merge(List.of(account.group(), account.layer()), line, Line::plus);
            }
        }
        return List.copyOf(lines.values());
    }

    /**
     * {@return a line for each entry}
     *
     * @param entries the entries
     */
    public static List<Line> each(List<Entry> entries) {
        List<Line> lines = new ArrayList<>();
        for (Entry entry : entries) {
            Account account = entry.account();
            lines.add(new Line(account.group(), account.item(), account.layer(), entry.inflow(), entry.outflow()));
        }
        return lines;
    }

    private Line plus(Line other) {
        return new Line(group, item, layer, inflow + other.inflow, outflow + other.outflow);
    }
}
