package org.seepledger.desktop.ledger;

import java.util.EnumSet;
import java.util.Set;
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
 * @param net what comes in less what goes out, a total, or what is held
 * @param low the net with non-detects as 0
 * @param high the net with non-detects as their limit
 */
public record LedgerRow(
        Kind kind,
        Group group,
        String item,
        int layer,
        String label,
        double inflow,
        double outflow,
        double net,
        double low,
        double high) {

    private static final Set<Group> FACES = EnumSet.of(Group.SIDE, Group.LID, Group.DISPERSION);

    /** The kinds of rows. */
    public enum Kind {
        /** Begins a section. */
        HEADING,
        /** What is held: one number, a mass. */
        HELD,
        /** What comes in and goes out of one item. */
        ENTRY,
        /** A total: one number. */
        TOTAL,
        /** A total in percent. */
        PERCENTAGE
    }

    static LedgerRow heading(Group group, int layer, String label) {
        return one(Kind.HEADING, group, "", layer, label, Double.NaN);
    }

    /** A row of one number without a bracket. */
    static LedgerRow one(Kind kind, Group group, String item, int layer, String label, double value) {
        return new LedgerRow(kind, group, item, layer, label, Double.NaN, Double.NaN, value, Double.NaN, Double.NaN);
    }

    LedgerRow bracketed(double atZero, double atLimit) {
        return new LedgerRow(kind, group, item, layer, label, inflow, outflow, net, atZero, atLimit);
    }

    /**
     * {@return how one of its numbers is to be read; nothing where a row of its kind has none}
     *
     * @param value the number
     */
    public String text(double value) {
        boolean oneNumber = kind != Kind.ENTRY;
        if (kind == Kind.HEADING || oneNumber && Double.isNaN(value) && !Double.isNaN(net)) {
            return "";
        }
        return kind == Kind.PERCENTAGE ? Figures.typesetPercent(value) : Figures.tabular(value);
    }

    /** {@return whether it is about a face that can be lit up on the map} */
    public boolean isFace() {
        return kind == Kind.ENTRY && !item.isEmpty() && FACES.contains(group);
    }
}
