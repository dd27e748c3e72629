package org.seepledger.intake;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.unit.Measure;

/** Finds the unit that a name or heading carries, in the many ways in which people write one. */
final class UnitGuess {

    private static final Pattern BRACKETS = Pattern.compile(".*[\\[(]\\s*([^\\[\\]()]+?)\\s*[\\])]\\s*");
    private static final Map<String, String> SPOKEN = Map.ofEntries(
            Map.entry("metres", "m"),
            Map.entry("meters", "m"),
            Map.entry("metre", "m"),
            Map.entry("meter", "m"),
            Map.entry("feet", "ft"),
            Map.entry("foot", "ft"),
            Map.entry("day", "d"),
            Map.entry("days", "d"),
            Map.entry("year", "yr"),
            Map.entry("years", "yr"),
            Map.entry("a", "yr"),
            Map.entry("y", "yr"),
            Map.entry("sec", "s"),
            Map.entry("second", "s"),
            Map.entry("hour", "h"),
            Map.entry("hr", "h"),
            Map.entry("l", "L"),
            Map.entry("litre", "L"),
            Map.entry("ml", "ML"),
            Map.entry("cbm", "m3"));

    private UnitGuess() {}

    /**
     * {@return the unit in a text, as the project writes it, if it is one of an amount}
     *
     * @param text a heading or the name of a file, without its ending
     * @param amount what it must measure
     */
    static Optional<String> of(String text, Role.Amount amount) {
        if (amount.like().isEmpty()) {
            return Optional.empty();
        }
        Matcher brackets = BRACKETS.matcher(text);
        if (brackets.matches()) {
            return read(brackets.group(1), amount);
        }
        String[] parts = text.split("[_\\s-]+");
        int last = parts.length - 1;
        if (last >= 2) {
            Optional<String> two = read(parts[last - 1] + "/" + parts[last], amount);
            if (two.isPresent()) {
                return two;
            }
        }
        return last >= 1 ? read(parts[last], amount) : Optional.empty();
    }

    /** {@return a unit as it is written here, if a text names one of an amount} */
    static Optional<String> read(String text, Role.Amount amount) {
        String plain = text.strip()
                .replace("²", "2")
                .replace("³", "3")
                .replace("^", "")
                .replace("**", "")
                .replaceAll("\\s+per\\s+", "/")
                .replaceAll("[·*]", "");
        Matcher power = Pattern.compile("(.+?)[ ]?(\\p{L}+)-1").matcher(plain);
        if (power.matches()) {
            plain = power.group(1) + "/" + power.group(2);
        }
        if (plain.equals("-") || plain.equals("%") || amount.like().isEmpty()) {
            return Optional.empty();
        }
        Measure like = Measure.of(amount.like());
        for (String way : List.of(plain, spoken(plain), spoken(plain.toLowerCase(Locale.ROOT)))) {
            try {
                Measure measure = Measure.of(way);
                if (measure.isCompatible(like)) {
                    return Optional.of(measure.toString());
                }
            } catch (IllegalArgumentException e) {
                // The next way may be a unit.
            }
        }
        return Optional.empty();
    }

    private static String spoken(String text) {
        String[] terms = text.split("/", -1);
        for (int i = 0; i < terms.length; i++) {
            terms[i] = SPOKEN.getOrDefault(terms[i].strip(), terms[i].strip());
        }
        return String.join("/", terms);
    }

    /**
     * {@return the unit that a rate over the area is in, by its size alone: no climate brings metres a day, and a soil
     * seldom less than a millimetre a year}
     *
     * @param greatest the greatest size of a value
     * @param lengthUnit the set's length unit
     */
    static Optional<String> ofRain(double greatest, String lengthUnit) {
        boolean metric = !lengthUnit.startsWith("ft");
        if (greatest > (metric ? 15 : 1)) {
            return Optional.of(metric ? "mm/yr" : "in/yr");
        }
        return metric && greatest > 0.2 ? Optional.of("mm/d") : Optional.empty();
    }
}
