package org.seepledger.ledger;

import java.util.List;

/** What stands with every result that leaves the program. */
public final class Disclaimer {

    private static final List<String> SENTENCES = List.of(
            "This is a computation from supplied data; it is not a determination of compliance with any permit, licence"
                    + " or regulation.",
            "A budget that closes shows that the arithmetic and the flow field are consistent; it does not show that the"
                    + " inputs are right, and does not remove their uncertainty.",
            "Local rules and the judgement of licensed practitioners govern any use of these numbers; check them before"
                    + " anyone relies on them.");

    private Disclaimer() {}

    /**
     * {@return the standard disclaimer on regulatory use, sentence by sentence}
     */
    public static List<String> sentences() {
        return SENTENCES;
    }

    /**
     * {@return the same as one text}
     */
    public static String text() {
        return String.join(" ", SENTENCES);
    }
}
