package org.seepledger.intake;

import org.seepledger.unit.Figures;

/** Names and numbers as sentences have them. */
final class Wording {

    private Wording() {}

    /** {@return the name that a source, solute or item of storage gets as long as nobody gives it another} */
    static String name(Role role, String from) {
        String words = String.join(" ", Vocabulary.words(from));
        return switch (role) {
            case SUPPLIED -> "supplied storage";
            case AREAL -> words.isEmpty() ? "recharge" : words;
            case CELLS -> words.isEmpty() ? "exchange" : words;
            case POINTS -> words.isEmpty() ? "pumping" : words;
            default -> words.isEmpty() ? "solute" : words;
        };
    }

    static String range(double least, double greatest) {
        if (Double.isNaN(least)) {
            return "there are no values";
        }
        return least == greatest
                ? "all values are " + Figures.shown(least)
                : "values go from " + Figures.shown(least) + " to " + Figures.shown(greatest);
    }

    static String count(long number, String one, String more) {
        return number + " " + (number == 1 ? one : more);
    }
}
