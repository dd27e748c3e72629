package org.seepledger.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.seepledger.unit.Figures;

/**
 * A piece of a block, from one level to another.
 *
 * @param name what it is
 * @param amount in the unit shown, with its sign
 * @param whole what its share is taken of
 * @param from where it begins, in the unit shown
 * @param to where it ends, above or below
 * @param ink its colour
 * @param texture what tells it apart without colour
 */
record Block(String name, double amount, double whole, double from, double to, Ink.Token ink, Mark.Texture texture) {

    /** {@return slices as a stack of pieces, the first uppermost} */
    static List<Block> stack(List<Slice> slices, Ink.Token ink, Mark.Texture texture) {
        double whole = Slices.sum(slices);
        double level = whole;
        List<Block> pieces = new ArrayList<>();
        for (Slice slice : slices) {
            double next = level - slice.amount();
            pieces.add(new Block(slice.name(), slice.amount(), whole, level, next, ink, texture));
            level = next;
        }
        return pieces;
    }

    /** {@return its amount as it is read} */
    String figure() {
        return Figures.typeset(amount);
    }

    /** {@return its share as it is read; nothing where there is no whole} */
    String share() {
        double percent = 100 * Math.abs(amount) / whole;
        if (!Double.isFinite(percent)) {
            return "";
        }
        String format = percent >= 9.95 ? "%.0f %%" : percent >= 0.095 ? "%.1f %%" : amount == 0 ? "0 %%" : "< 0.1 %%";
        return String.format(Locale.ROOT, format, percent).replace(' ', '\u202f');
    }
}
