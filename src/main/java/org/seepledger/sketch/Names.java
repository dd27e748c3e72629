package org.seepledger.sketch;

import java.util.Set;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.prism.Prism;
import org.seepledger.prism.SideSelection;

/** What prisms and boundaries may be called. */
public final class Names {

    private static final Set<String> TAKEN = Set.of("top", "bottom", Prism.GRID_EDGE);

    private Names() {}

    /**
     * {@return whether a text can be a prism's name: not empty, no blanks at its ends, no control characters}
     *
     * @param name the text
     */
    public static boolean isPlain(String name) {
        return !name.isBlank() && name.equals(name.strip()) && !name.matches("(?s).*\\p{Cntrl}.*");
    }

    /**
     * {@return whether a name stands for what is in no prism}
     *
     * @param name the name
     */
    public static boolean isReserved(String name) {
        return name.equals(ExchangeFlow.OUTSIDE);
    }

    /**
     * {@return whether a text can be a boundary's name: not empty, and no item that a budget has already}
     *
     * @param name the text
     */
    public static boolean isBoundary(String name) {
        return !name.isBlank() && !TAKEN.contains(name) && !SideSelection.isSideName(name);
    }

    static void checkPrism(String name) {
        if (!isPlain(name)) {
            throw new Refusal("A prism's name is not empty and has no blanks at its ends.");
        }
        if (isReserved(name)) {
            throw new Refusal("The name \"" + name + "\" stands for all that is in no prism.");
        }
    }

    static void checkBoundary(String name) {
        if (!isBoundary(name)) {
            throw new Refusal(
                    "A boundary's name is not empty, and neither a side's nor top, bottom or " + Prism.GRID_EDGE + ".");
        }
    }
}
