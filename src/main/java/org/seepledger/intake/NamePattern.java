package org.seepledger.intake;

import java.time.DateTimeException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A file's name taken apart.
 *
 * @param text the name, with a {@code #} for each field
 * @param fields the numbers and dates in it, in their order
 */
public record NamePattern(String text, List<NameField> fields) {

    private static final String YEAR = "(?:1[89]|20|21)\\d\\d";
    private static final String MONTH = "(?:0[1-9]|1[0-2])";
    private static final String DAY = "(?:0[1-9]|[12]\\d|3[01])";
    private static final Pattern FIELD = Pattern.compile("(?<!\\d)(?:(?<day>" + YEAR + "([-_.]?)" + MONTH + "\\2" + DAY
            + ")|(?<month>" + YEAR + "[-_.]?" + MONTH + ")|(?<number>\\d{1,9}))(?!\\d)");
    private static final Pattern LAST_WORD = Pattern.compile("([a-z]+)[^a-z]*$");

    /** Copies the list. */
    public NamePattern {
        fields = List.copyOf(fields);
    }

    /**
     * Takes a name apart.
     *
     * @param shownName the name, with its folders
     * @return its parts
     */
    public static NamePattern of(String shownName) {
        int dot = shownName.lastIndexOf('.');
        String stem = dot > shownName.lastIndexOf('/') ? shownName.substring(0, dot) : shownName;
        List<NameField> fields = new ArrayList<>();
        StringBuilder text = new StringBuilder();
        Matcher found = FIELD.matcher(stem);
        int end = 0;
        while (found.find()) {
            String between = stem.substring(end, found.start());
            text.append(between).append('#');
            fields.add(field(between, found));
            end = found.end();
        }
        text.append(shownName.substring(end));
        return new NamePattern(text.toString(), fields);
    }

    private static NameField field(String between, Matcher found) {
        Matcher word = LAST_WORD.matcher(between.toLowerCase(Locale.ROOT));
        String before = word.find() ? word.group(1) : "";
        NameField.Kind kind = found.group("day") != null
                ? NameField.Kind.DAY
                : found.group("month") != null ? NameField.Kind.MONTH : NameField.Kind.NUMBER;
        NameField field = new NameField(before, kind, found.group());
        return isDate(field) ? field : new NameField(before, NameField.Kind.NUMBER, found.group());
    }

    /** Six or eight digits without a separator may be any number, and 30 February is none of the days. */
    private static boolean isDate(NameField field) {
        try {
            return field.day().isPresent();
        } catch (DateTimeException e) {
            return false;
        }
    }

    /**
     * {@return the name with other texts in the place of its fields}
     *
     * @param texts one for each field
     */
    public String with(List<String> texts) {
        StringBuilder name = new StringBuilder();
        int next = 0;
        for (char c : text.toCharArray()) {
            if (c == '#') {
                name.append(texts.get(next++));
            } else {
                name.append(c);
            }
        }
        return name.toString();
    }
}
