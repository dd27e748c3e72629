package org.seepledger.job;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.seepledger.report.page.Amounts;

/**
 * What the report is to look like.
 *
 * @param title its title; empty for one that names the aquifer
 * @param author who answers for it
 * @param reference the client's reference or the author's own
 * @param letterhead lines at the head of the first page; empty for none
 * @param date the date that it carries
 * @param periods what gets a table of all its rows: {@value #RECORD}, {@value #WORST}, {@value #ALL} or names of periods
 * @param amounts whether tables give rates or volumes
 */
public record ReportRequest(
        Optional<String> title,
        Optional<String> author,
        Optional<String> reference,
        List<String> letterhead,
        LocalDate date,
        List<String> periods,
        Amounts amounts) {

    /** How many letters a line of it may have. */
    public static final int LONGEST = 200;

    /** How many lines a letterhead may have. */
    public static final int MOST_LINES = 8;

    /** The whole record. */
    public static final String RECORD = "record";

    /** The period with the largest closure error. */
    public static final String WORST = "worst";

    /** Every period. */
    public static final String ALL = "all";

    /** Copies the lists. */
    public ReportRequest {
        letterhead = List.copyOf(letterhead);
        periods = List.copyOf(periods);
    }

    /**
     * {@return a report with nothing of its own but a date: a table of the record, in rates}
     *
     * @param date the date
     */
    public static ReportRequest dated(LocalDate date) {
        return new ReportRequest(
                Optional.empty(), Optional.empty(), Optional.empty(), List.of(), date, List.of(RECORD), Amounts.RATE);
    }
}
