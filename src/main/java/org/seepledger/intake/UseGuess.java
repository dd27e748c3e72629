package org.seepledger.intake;

import java.util.Optional;
import java.util.Set;

/** Guesses unit, name and sign of values whose role is guessed. */
final class UseGuess {

    private static final Set<String> TAKING = Set.of(
            "evapotranspiration",
            "evaporation",
            "transpiration",
            "et",
            "pumping",
            "abstraction",
            "abstractions",
            "extraction",
            "withdrawal",
            "withdrawals",
            "pumpage",
            "outflow");

    private UseGuess() {}

    static Use of(
            int column,
            String part,
            String text,
            Guess guess,
            double least,
            double greatest,
            Optional<String> unitText) {
        Role role = guess.role();
        Optional<String> unit = unitText.flatMap(written -> UnitGuess.read(written, role.amount()))
                .or(() -> UnitGuess.of(text, role.amount()));
        String reason = guess.reason();
        boolean bySize = false;
        if (unit.isEmpty() && role == Role.AREAL) {
            unit = UnitGuess.ofRain(Math.max(Math.abs(least), Math.abs(greatest)), "m");
            bySize = unit.isPresent();
            reason += unit.map(found -> " By their size they are in " + found + ": check it.")
                    .orElse("");
        }
        boolean turned = role.isSource() && takes(text) && least >= 0 && greatest > 0;
        if (turned) {
            reason += " What takes water is negative in a budget, so the sign is turned.";
        }
        String name = role.isNamed() ? Wording.name(role, spoken(text)) : "";
        Guess.Confidence confidence = bySize ? Guess.Confidence.LOW : guess.confidence();
        return new Use(column, part, role, name, unit.orElse(""), 0, turned, new Guess(role, confidence, reason));
    }

    /** {@return whether words say that water is taken} */
    static boolean takes(String text) {
        return Vocabulary.words(text).stream().anyMatch(TAKING::contains);
    }

    private static String spoken(String text) {
        String plain = Vocabulary.withoutUnit(text);
        return Vocabulary.of(plain).map(Vocabulary.Said::phrase).orElse(plain);
    }
}
