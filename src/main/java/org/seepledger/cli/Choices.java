package org.seepledger.cli;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import org.seepledger.fault.UsageFault;
import org.seepledger.unit.Measure;

/** What the values of options may be. */
final class Choices {

    private Choices() {}

    /** A number of threads. */
    static int threads(int threads) {
        if (threads < 1) {
            throw new UsageFault("--threads is " + threads + "; give 1 or more.");
        }
        return threads;
    }

    /** One of the words of an enumeration. */
    static <E extends Enum<E>> E choice(String option, String text, Class<E> choices) {
        for (E choice : choices.getEnumConstants()) {
            if (choice.name().equals(text.toUpperCase(Locale.ROOT).replace('-', '_'))) {
                return choice;
            }
        }
        String known = String.join(
                ", ",
                Arrays.stream(choices.getEnumConstants())
                        .map(choice -> choice.name().toLowerCase(Locale.ROOT).replace('_', '-'))
                        .toList());
        throw new UsageFault(option + " is \"" + text + "\"; give one of " + known + ".");
    }

    /** A unit that measures the same as another. */
    static Optional<Measure> measure(String option, String text, String like) {
        if (text == null) {
            return Optional.empty();
        }
        try {
            Measure measure = Measure.of(text);
            if (measure.isCompatible(Measure.of(like))) {
                return Optional.of(measure);
            }
            throw new UsageFault(
                    option + " is \"" + text + "\", which measures something else; give a unit as " + like + ".");
        } catch (IllegalArgumentException e) {
            throw new UsageFault(option + ": " + e.getMessage() + ".");
        }
    }
}
