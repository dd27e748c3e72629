package org.seepledger.desktop.ledger;

import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.unit.Figures;

/**
 * A row of the ledger. Numbers are in the unit shown; NaN where there is none.
 *
 * @param kind what it is
 * @param group the kind of what it is about
 * @param item what it is about, as the budget calls it; empty for headings and lines of whole groups
 * @param layer the layer, from 0; {@link Line#ALL_LAYERS} for all
 * @param label what it is called here
 * @param inflow what comes in
 * @param outflow what goes out
 * @param net what comes in less what goes out, or a total
 */
public record LedgerRow(
        Kind kind, Group group, String item, int layer, String label, double inflow, double outflow, double net) {

    /** The kinds of rows. */
    public enum Kind {
        /** Begins a section. */
        HEADING,
        /** What comes in and goes out of one item. */
        ENTRY,
        /** A total: one number. */
        TOTAL,
        /** A total in percent. */
        PERCENTAGE
    }

    static LedgerRow heading(Group group, int layer, String label) {
        return new LedgerRow(Kind.HEADING, group, "", layer, label, Double.NaN, Double.NaN, Double.NaN);
    }

    /**
     * {@return how one of its numbers is to be read; nothing where a row of its kind has none}
     *
     * @param value the number
     */
    public String text(double value) {
        boolean oneNumber = kind == Kind.TOTAL || kind == Kind.PERCENTAGE;
        if (kind == Kind.HEADING || oneNumber && Double.compare(value, net) != 0) {
            return "";
        }
        return kind == Kind.PERCENTAGE ? Figures.typesetPercent(value) : Figures.tabular(value);
    }

    /** {@return whether it is about a face that can be lit up on the map} */
    public boolean isFace() {
        return kind == Kind.ENTRY && !item.isEmpty() && (group == Group.SIDE || group == Group.LID);
    }
}
