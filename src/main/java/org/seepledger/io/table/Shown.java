package org.seepledger.io.table;

import java.util.List;
import java.util.stream.Collectors;

/** How pieces of a table are shown in messages: in quotation marks, and never long. */
final class Shown {

    private static final int LONGEST = 60;

    private Shown() {}

    static String text(String text) {
        String kept = text.length() <= LONGEST ? text : text.substring(0, LONGEST) + "…";
        return '"' + kept + '"';
    }

    static String cell(String text) {
        return text.isEmpty() ? "an empty cell" : text(text);
    }

    static String list(List<String> names, int most) {
        String shown = names.stream().limit(most).map(Shown::text).collect(Collectors.joining(", "));
        return names.size() <= most ? shown : shown + " and " + (names.size() - most) + " more";
    }

    static String ordinal(int number) {
        boolean teen = number / 10 % 10 == 1;
        return number
                + switch (teen ? 0 : number % 10) {
                    case 1 -> "st";
                    case 2 -> "nd";
                    case 3 -> "rd";
                    default -> "th";
                };
    }
}
