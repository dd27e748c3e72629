package org.seepledger.review.sheet;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.seepledger.unit.Measure;

/** Finds the unit that a heading or a cell names, in any of the ways in which the trade writes it. */
public final class UnitWords {

    private static final Pattern BRACKETED = Pattern.compile("[(\\[]([^()\\[\\]]{1,40})[)\\]]");
    private static final Pattern SPOKEN = Pattern.compile(
            "(?:\\b(?:in|unit|units|as)\\b[: ]+|, *)((?:thousand |million |10\\^?[36] |10[³⁶] |1000 )?[\\p{L}\\-]+[23³²]?(?:(?: ?/ ?| per )[\\p{L}]+| d-1| a-1)?)");
    private static final Pattern BEHIND = Pattern.compile(
            ".+[ ,;:]((?:1000 |thousand )?\\p{L}[\\p{L}\\-]*(?:[23³]|[23³]?/[\\p{L}]+)|ML|GL|AF|AFY|acre-ft|acre-feet|ac-ft)");
    private static final Pattern THOUSANDS =
            Pattern.compile("(thousand |10\\^?3 |10³ |1000 |million |10\\^?6 |10⁶ |1000000 |Mio )(.*)");
    private static final double THOUSAND = 1e3;
    private static final double MILLION = 1e6;
    private static final Map<String, String> WORDS = words();

    private UnitWords() {}

    /**
     * {@return whether a text is a unit, or a percentage}
     *
     * @param text the text
     */
    public static boolean isUnit(String text) {
        return text.equals("%") || of(text).isPresent();
    }

    /**
     * {@return the unit that a heading ends with or has in brackets, as it is written there}
     *
     * @param heading the heading
     */
    public static Optional<String> in(String heading) {
        Matcher bracketed = BRACKETED.matcher(heading);
        while (bracketed.find()) {
            if (isUnit(bracketed.group(1).strip())) {
                return Optional.of(bracketed.group(1).strip());
            }
        }
        Matcher spoken = SPOKEN.matcher(heading);
        while (spoken.find()) {
            if (isUnit(spoken.group(1).strip()) && spoken.group(1).length() > 1) {
                return Optional.of(spoken.group(1).strip());
            }
        }
        Optional<String> behind = behind(heading);
        if (behind.isPresent()) {
            return behind;
        }
        return heading.strip().endsWith("%") ? Optional.of("%") : Optional.empty();
    }

    /** A unit that a heading ends with and that can hardly be anything else. */
    private static Optional<String> behind(String heading) {
        Matcher last = BEHIND.matcher(heading.strip());
        return last.matches() && isUnit(last.group(1)) ? Optional.of(last.group(1)) : Optional.empty();
    }

    /**
     * {@return a heading without its unit in brackets}
     *
     * @param heading the heading
     */
    public static String without(String heading) {
        Matcher bracketed = BRACKETED.matcher(heading);
        StringBuilder rest = new StringBuilder();
        while (bracketed.find()) {
            bracketed.appendReplacement(
                    rest, isUnit(bracketed.group(1).strip()) ? "" : Matcher.quoteReplacement(bracketed.group()));
        }
        bracketed.appendTail(rest);
        String left = rest.toString().replaceAll("\\s+", " ").strip();
        return behind(left)
                .map(unit -> left.substring(0, left.length() - unit.length()).strip())
                .orElse(left);
    }

    /**
     * {@return the unit that a text names; empty if none}
     *
     * @param text the text, as {@code m³/day}, {@code AFY} or {@code 1000 m3}
     */
    public static Optional<WrittenUnit> of(String text) {
        String written = text.strip();
        double times = 1;
        Matcher thousands = THOUSANDS.matcher(written);
        if (thousands.matches()) {
            times = thousands.group(1).matches("thousand |10\\^?3 |10³ |1000 ") ? THOUSAND : MILLION;
            written = thousands.group(2);
        }
        String plain =
                written.replace("³", "3").replace("²", "2").replace("^", "").replace(" per ", "/");
        plain = plain.replaceAll("\\s*/\\s*", "/")
                .replaceAll("\\s*(?:d-1|d⁻¹)$", "/d")
                .replaceAll("\\s*(?:a-1|a⁻¹)$", "/yr");
        boolean perPeriod = false;
        String[] parts = plain.split("/", -1);
        if (parts.length == 2
                && parts[1].toLowerCase(Locale.ROOT).matches("mo|mon|month|months|period|quarter|season")) {
            perPeriod = true;
            plain = parts[0];
            parts = new String[] {parts[0]};
        }
        for (int i = 0; i < parts.length; i++) {
            parts[i] = word(parts[i].strip());
        }
        return measure(String.join("/", parts), times, perPeriod);
    }

    private static Optional<WrittenUnit> measure(String text, double times, boolean perPeriod) {
        try {
            Measure measure = Measure.of(text);
            return text.equals("1") ? Optional.empty() : Optional.of(new WrittenUnit(measure, times, perPeriod));
        } catch (IllegalArgumentException e) {
            return Optional.empty();
        }
    }

    private static String word(String part) {
        return WORDS.getOrDefault(part, WORDS.getOrDefault(part.toLowerCase(Locale.ROOT), part));
    }

    private static Map<String, String> words() {
        Map<String, String> words = new LinkedHashMap<>();
        put(words, "d", "day", "days");
        put(words, "yr", "year", "years", "y", "a", "annum");
        put(words, "h", "hr", "hour", "hours");
        put(words, "s", "sec", "second", "seconds");
        put(words, "min", "minute", "minutes");
        put(words, "m3", "m3", "cubic metres", "cubic meters", "cubic metre", "cubic meter", "cum", "cbm", "kl");
        put(words, "ft3", "cubic feet", "cubic foot", "cu ft", "cuft", "cf");
        put(words, "L", "l", "litre", "litres", "liter", "liters");
        put(words, "ML", "megalitre", "megalitres", "megaliters");
        put(words, "GL", "gigalitres", "gigalitre");
        put(words, "gal", "gallon", "gallons", "us gal", "us gallons");
        put(words, "Mgal", "million gallons", "mgal");
        put(words, "acre-ft", "acre-feet", "acre feet", "ac-ft", "acft", "af", "acre-foot", "acre ft");
        put(words, "acre-ft/yr", "afy");
        put(words, "Mgal/d", "mgd");
        put(words, "ft3/d", "cfd");
        put(words, "ft3/s", "cfs");
        put(words, "gal/min", "gpm");
        put(words, "hm3", "mm3", "mcm");
        return words;
    }

    private static void put(Map<String, String> words, String unit, String... spoken) {
        for (String word : spoken) {
            words.put(word, unit);
        }
    }
}
