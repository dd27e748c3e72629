package org.seepledger.intake;

import java.util.Optional;
import org.seepledger.intake.Guess.Confidence;

/** Guesses what values are, from words and from their range. */
final class RoleGuess {

    private RoleGuess() {}

    /**
     * {@return what values seem to be}
     *
     * @param text the words that are said of them, the most telling last
     * @param least the least value; NaN if there is none
     * @param greatest the greatest value; NaN if there is none
     */
    static Guess of(String text, double least, double greatest) {
        String range = Wording.range(least, greatest);
        Optional<Vocabulary.Said> said = Vocabulary.of(text);
        if (said.isEmpty()) {
            return new Guess(Role.NONE, Confidence.LOW, "The name says nothing that is known; " + range + ".");
        }
        Role role = said.get().role();
        String name = "The name says \"" + said.get().phrase() + "\"";
        if (Double.isNaN(least)) {
            return new Guess(role, Confidence.LOW, name + ", but " + range + ".");
        }
        String against = against(role, least, greatest);
        if (!against.isEmpty()) {
            return new Guess(role, Confidence.LOW, name + "; " + range + ", " + against + ".");
        }
        Confidence confidence = said.get().phrase().length() > 2 ? Confidence.HIGH : Confidence.FAIR;
        return new Guess(role, confidence, name + "; " + range + ".");
    }

    /** {@return what in a range speaks against a role; empty if nothing does} */
    static String against(Role role, double least, double greatest) {
        return switch (role) {
            case SPECIFIC_YIELD, STORATIVITY, POROSITY, EFFECTIVE_POROSITY ->
                least < 0 || greatest > 1 ? "which no share of a volume can be" : "";
            case CONDUCTIVITY, CONDUCTIVITY_Y, VERTICAL_CONDUCTIVITY, SPECIFIC_STORAGE, BULK_DENSITY, CONCENTRATION ->
                least < 0 ? "and none should be negative" : "";
            case FLUX_X, FLUX_Y, FLUX_Z ->
                Math.max(-least, greatest) > 100 ? "large for a specific discharge: check that it is no velocity" : "";
            case ACTIVE -> greatest - least > 10 ? "more than a mark for yes or no needs" : "";
            default -> "";
        };
    }
}
