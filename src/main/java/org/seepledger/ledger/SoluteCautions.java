package org.seepledger.ledger;

import java.util.List;

/** What stands, beside the disclaimer, with every result about a solute that leaves the program. */
public final class SoluteCautions {

    private static final List<String> SENTENCES = List.of(
            "Concentrations between points of measurement are interpretation: masses and flows of a solute are less certain"
                    + " than those of the water, and may be off several times where few points support them.",
            "These numbers are no finding that water is safe to drink or touch, that a standard is met, or that a site needs no"
                    + " action; that is for the responsible authority and licensed practitioners, under local rules.",
            "Mass that falls in a volume may have left it, sorbed, been diluted below detection or decayed: a falling number"
                    + " alone does not show which.");

    private SoluteCautions() {}

    /**
     * {@return the cautions, sentence by sentence}
     */
    public static List<String> sentences() {
        return SENTENCES;
    }
}
