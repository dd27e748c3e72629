package org.seepledger.desktop.words;

import java.util.regex.Pattern;

/** Which signs numbers are read with in the window. Files and copies always have a point, and no groups. */
public enum NumberForm {
    /** Point, groups apart by a narrow space. */
    SPACE_POINT("\u202f", "."),
    /** Comma, groups apart by a narrow space. */
    SPACE_COMMA("\u202f", ","),
    /** Point, groups apart by a comma. */
    COMMA_POINT(",", "."),
    /** Comma, groups apart by a point. */
    POINT_COMMA(".", ","),
    /** Point, no groups. */
    NONE_POINT("", "."),
    /** Comma, no groups. */
    NONE_COMMA("", ",");

    private static final Pattern NUMBER = Pattern.compile("(\\d)(?:(\\u202f)(?=\\d{3})|(\\.)(?=\\d))");

    /** A number alone, signed, with a power of ten, with a word before it that says which way, or with a unit after it. */
    private static final Pattern LABEL =
            Pattern.compile("(?:(?:in|out) )?[+−]?\\d[\\d\\u202f]*(?:\\.\\d+)?(?:·10[⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)?"
                    + "(?:[\\u202f\\u00a0 ]?[%\\p{L}][\\p{L}\\d³²/%·-]*)?");

    private final String groups;
    private final String decimals;

    NumberForm(String groups, String decimals) {
        this.groups = groups;
        this.decimals = decimals;
    }

    /**
     * {@return numbers in this form}
     *
     * @param typeset text whose numbers are typeset with a point and narrow spaces, and that holds no names
     */
    public String of(String typeset) {
        return NUMBER.matcher(typeset)
                .replaceAll(found -> found.group(1) + (found.group(2) == null ? decimals : groups));
    }

    /**
     * {@return a label of a map or chart in this form: one that says nothing but a number is changed, names are not}
     *
     * @param words the label
     */
    public String label(String words) {
        return LABEL.matcher(words).matches() ? of(words) : words;
    }

    /**
     * {@return a number as it was typed, with a point and without groups, as parsers take it}
     *
     * @param typed what was typed: a comma counts as the decimal sign, and a true minus as a minus
     */
    public static String plain(String typed) {
        return typed.strip().replace('−', '-').replace(',', '.');
    }
}
