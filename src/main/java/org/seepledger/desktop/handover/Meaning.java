package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.List;
import java.util.function.Function;
import java.util.function.Supplier;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.PlumeRequest;
import org.seepledger.job.ReportRequest;
import org.seepledger.unit.Measure;

/** What texts mean that are typed into entries. */
final class Meaning {

    private Meaning() {}

    /** A unit that measures the same as another. */
    static Function<String, Measure> unit(String like) {
        return text -> {
            Measure unit = Measure.of(text);
            if (!unit.isCompatible(Measure.of(like))) {
                throw new IllegalArgumentException(Words.of("handover.unit.other", text, like));
            }
            return unit;
        };
    }

    /** A percentage, 0 or more. */
    static Double percent(String text) {
        return number(text, "handover.percent.form");
    }

    private static double number(String text, String form) {
        return or(form, () -> {
            double number = Double.parseDouble(text);
            if (!(number >= 0) || Double.isInfinite(number)) {
                throw new NumberFormatException();
            }
            return number;
        });
    }

    /** A concentration with its unit. */
    static PlumeRequest.Threshold concentration(String text) {
        String[] words = text.split("\\s+", 2);
        if (words.length < 2) {
            throw new IllegalArgumentException(Words.of("handover.above.form"));
        }
        return new PlumeRequest.Threshold(
                number(words[0], "handover.above.form"), unit("mg/L").apply(words[1]));
    }

    /** A day. */
    static LocalDate date(String text) {
        return or("handover.date.form", () -> LocalDate.parse(text));
    }

    /** A path. */
    static Path path(String text) {
        return or("handover.path.form", () -> Path.of(text).toAbsolutePath().normalize());
    }

    /** One line of a report. */
    static String line(String text) {
        if (text.length() > ReportRequest.LONGEST || text.chars().anyMatch(Character::isISOControl)) {
            throw new IllegalArgumentException(Words.of("handover.line.form", ReportRequest.LONGEST));
        }
        return text;
    }

    /** The lines of a letterhead; a bar between them would be taken for a line's end. */
    static List<String> letterhead(String text) {
        List<String> lines = text.lines()
                .map(String::strip)
                .filter(line -> !line.isEmpty())
                .map(Meaning::line)
                .toList();
        if (lines.size() > ReportRequest.MOST_LINES || text.contains("|")) {
            throw new IllegalArgumentException(Words.of("handover.letterhead.form", ReportRequest.MOST_LINES));
        }
        return lines;
    }

    private static <T> T or(String form, Supplier<T> meaning) {
        try {
            return meaning.get();
        } catch (IllegalArgumentException | DateTimeParseException e) {
            throw new IllegalArgumentException(Words.of(form), e);
        }
    }
}
