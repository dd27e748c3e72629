package org.seepledger.cli;

import java.time.Clock;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.seepledger.fault.UsageFault;
import org.seepledger.job.ReportRequest;
import org.seepledger.report.page.Amounts;
import picocli.CommandLine.Option;

/** The options that say what the report looks like. */
final class ReportOptions {

    @Option(
            names = "--report-title",
            paramLabel = "TEXT",
            description = "Title of report.html (default: one that names the aquifer).")
    private String title;

    @Option(names = "--report-author", paramLabel = "TEXT", description = "Who answers for the report.")
    private String author;

    @Option(names = "--report-reference", paramLabel = "TEXT", description = "The client's reference, or your own.")
    private String reference;

    @Option(
            names = "--report-letterhead",
            paramLabel = "TEXT",
            description = "Lines at the head of the report, with | between them.")
    private String letterhead;

    @Option(names = "--report-date", paramLabel = "DATE", description = "Its date, as 2024-05-31 (default: today).")
    private String date;

    @Option(
            names = "--report-periods",
            paramLabel = "WHICH",
            description = "What gets a table of all its rows: record (default), worst (the period with the largest"
                    + " closure error), all, or the name of a period. Give it again for more.")
    private List<String> periods = new ArrayList<>();

    @Option(
            names = "--report-amounts",
            paramLabel = "WHICH",
            description = "Whether its tables give each rate (default) or volume (of a solute: mass).")
    private String amounts = "rate";

    /** What the report is to look like. */
    ReportRequest request(Clock clock) {
        return new ReportRequest(
                line("--report-title", title),
                line("--report-author", author),
                line("--report-reference", reference),
                lines(),
                date(clock),
                periods.isEmpty() ? List.of(ReportRequest.RECORD) : periods,
                Choices.choice("--report-amounts", amounts, Amounts.class));
    }

    private static Optional<String> line(String option, String text) {
        if (text == null) {
            return Optional.empty();
        }
        String line = text.strip();
        if (line.isEmpty()
                || line.length() > ReportRequest.LONGEST
                || line.chars().anyMatch(Character::isISOControl)) {
            throw new UsageFault(option + " must be one line of 1 to " + ReportRequest.LONGEST + " letters.");
        }
        return Optional.of(line);
    }

    private List<String> lines() {
        if (letterhead == null) {
            return List.of();
        }
        List<String> lines = Arrays.stream(letterhead.split("\\||\\R"))
                .map(text ->
                        line("--report-letterhead, each part between |,", text).orElseThrow())
                .toList();
        if (lines.size() > ReportRequest.MOST_LINES) {
            throw new UsageFault("--report-letterhead has " + lines.size() + " lines; give " + ReportRequest.MOST_LINES
                    + " at the most.");
        }
        return lines;
    }

    private LocalDate date(Clock clock) {
        try {
            return date == null ? LocalDate.now(clock) : LocalDate.parse(date);
        } catch (DateTimeParseException e) {
            throw new UsageFault("--report-date is \"" + date + "\"; give a date as 2024-05-31.");
        }
    }
}
