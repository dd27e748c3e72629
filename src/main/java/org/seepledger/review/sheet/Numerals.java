package org.seepledger.review.sheet;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads the numbers of a table, which have one decimal sign throughout: thousands kept apart by blanks, apostrophes,
 * points or commas, brackets or any kind of minus for negative ones, a unit or a footnote mark behind.
 */
public final class Numerals {

    private static final Pattern NUMERAL = Pattern.compile(
            "(?<open>\\()? ?(?<about>~|≈|ca\\.?|c\\.)? ?(?<sign>[-+])? ?(?<open2>\\()?"
                    + "(?<digits>\\d{1,3}(?:([ ,.'])\\d{3})(?:\\6\\d{3})*(?:[.,]\\d+)?|\\d+(?:[.,]\\d*)?|[.,]\\d+)"
                    + "(?:[eE](?<power>[-+]?\\d{1,3}))?(?<close>\\))?(?<minus>-)?(?<unit> ?[%\\p{L}].{0,24}?)?[*†‡]*(?<close2>\\))?");

    private static final Set<String> NOT_GIVEN = Set.of(
            "-",
            "--",
            "---",
            "n/a",
            "na",
            "n.a.",
            "nan",
            "n/q",
            "n.q.",
            "nq",
            "nd",
            "n.d.",
            "not quantified",
            "not known",
            "unknown",
            "not available",
            "not determined",
            "..",
            "...",
            "?",
            "tbd");

    private final char decimal;
    private final boolean guessed;

    private Numerals(char decimal, boolean guessed) {
        this.decimal = decimal;
        this.guessed = guessed;
    }

    /**
     * {@return a reader for numbers with a given decimal sign}
     *
     * @param decimal point or comma
     */
    public static Numerals with(char decimal) {
        return new Numerals(decimal, false);
    }

    /**
     * {@return a reader for a table, whose decimal sign is found out from its numbers}
     *
     * <p>Of two signs in a number the last is the decimal one; one that comes twice parts thousands; one that is not
     * followed by three digits, or has a lone 0 before it, is the decimal one. Where no number tells, it is the comma if
     * all numbers have one and three digits behind it, and cells are not parted by commas; else the point.
     *
     * @param sheet the table
     */
    public static Numerals of(Sheet sheet) {
        int[] votes = new int[2];
        int thousandths = 0;
        int whole = 0;
        for (List<String> row : sheet.rows()) {
            for (String cell : row) {
                char sign = decimalOf(cleaned(cell));
                votes[0] += sign == '.' ? 1 : 0;
                votes[1] += sign == ',' ? 1 : 0;
                thousandths += cell.strip().matches("[-(]?\\d{1,3},\\d{3}\\)?") ? 1 : 0;
                whole += cell.strip().matches("[-(]?[1-9]\\d{0,2}\\)?") ? 1 : 0;
            }
        }
        boolean threeDecimals = sheet.commaFree() && votes[0] == votes[1] && thousandths > 0 && whole == 0;
        return new Numerals(votes[1] > votes[0] || threeDecimals ? ',' : '.', threeDecimals);
    }

    /** {@return the decimal sign} */
    public char decimal() {
        return decimal;
    }

    /** {@return whether no number of the table told the decimal sign, though a comma stands in its numbers} */
    public boolean guessed() {
        return guessed;
    }

    /** The decimal sign that a number shows without doubt, or 0. */
    private static char decimalOf(String text) {
        Matcher found = NUMERAL.matcher(text);
        if (!found.matches()) {
            return 0;
        }
        String digits = found.group("digits");
        int point = digits.lastIndexOf('.');
        int comma = digits.lastIndexOf(',');
        if (point < 0 && comma < 0) {
            return 0;
        }
        char last = point > comma ? '.' : ',';
        char other = last == '.' ? ',' : '.';
        int at = Math.max(point, comma);
        if (digits.indexOf(last) != at) {
            return other;
        }
        boolean three = digits.length() - at - 1 == 3;
        boolean sure =
                digits.indexOf(other) >= 0 || digits.indexOf(' ') >= 0 || !three || at > 3 || digits.startsWith("0");
        return sure ? last : 0;
    }

    /** One kind of minus, of blank and of apostrophe; none before or behind. */
    private static String cleaned(String cell) {
        String text = cell.replace('\u00a0', ' ')
                .replace('\u202f', ' ')
                .replace('\u2009', ' ')
                .replace('\u2212', '-')
                .replace('\u2013', '-')
                .replace('\u2014', '-')
                .replace('\u2019', '\'')
                .strip();
        return text.startsWith("'") ? text.substring(1).strip() : text;
    }

    /**
     * {@return the number in a cell; empty where a text or nothing stands}
     *
     * @param cell the cell
     */
    public Optional<Numeral> read(String cell) {
        String text = cleaned(cell);
        if (NOT_GIVEN.contains(text.toLowerCase(Locale.ROOT))) {
            return Optional.of(new Numeral(Double.NaN, 0, ""));
        }
        Matcher found = NUMERAL.matcher(text);
        if (!found.matches()) {
            return Optional.empty();
        }
        String unit = found.group("unit") == null ? "" : found.group("unit").strip();
        if (!unit.isEmpty() && !UnitWords.isUnit(unit)) {
            return Optional.empty();
        }
        String plain = plain(found.group("digits"));
        if (plain.chars().filter(c -> c == '.').count() > 1) {
            return Optional.empty();
        }
        int power = found.group("power") == null ? 0 : Integer.parseInt(found.group("power"));
        double value = Double.parseDouble(plain + "e" + power);
        int point = plain.indexOf('.');
        int decimals = point < 0 ? 0 : plain.length() - point - 1;
        boolean bracketed = found.group("open") != null || found.group("open2") != null;
        boolean negative = bracketed || "-".equals(found.group("sign")) || found.group("minus") != null;
        if (!Double.isFinite(value)) {
            return Optional.empty();
        }
        return Optional.of(new Numeral(negative ? -value : value, 0.5 * Math.pow(10, power - decimals), unit));
    }

    private String plain(String digits) {
        String together = digits.replace(" ", "").replace("'", "");
        return decimal == '.'
                ? together.replace(",", "")
                : together.replace(".", "").replace(',', '.');
    }
}
