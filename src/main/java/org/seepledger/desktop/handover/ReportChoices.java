package org.seepledger.desktop.handover;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.job.ReportRequest;
import org.seepledger.report.page.Amounts;

/** What is chosen of the report. */
final class ReportChoices {

    private final Entry<String> title = new Entry<>(Meaning::line);
    private final Entry<String> author = new Entry<>(Meaning::line);
    private final Entry<String> reference = new Entry<>(Meaning::line);
    private final Entry<List<String>> letterhead = new Entry<>(Meaning::letterhead);
    private final Entry<LocalDate> date = new Entry<>(Meaning::date);
    private final ObjectProperty<Tables> tables = new SimpleObjectProperty<>(Tables.RECORD);
    private final ObjectProperty<Amounts> amounts = new SimpleObjectProperty<>(Amounts.RATE);

    /** What gets a table of all its rows. */
    enum Tables {
        /** The whole record. */
        RECORD(ReportRequest.RECORD),
        /** The period that closes worst. */
        WORST(ReportRequest.WORST),
        /** Both. */
        RECORD_AND_WORST(ReportRequest.RECORD, ReportRequest.WORST),
        /** Each period. */
        ALL(ReportRequest.ALL);

        private final List<String> periods;

        Tables(String... periods) {
            this.periods = List.of(periods);
        }
    }

    ReportChoices() {}

    /** {@return its title} */
    Entry<String> title() {
        return title;
    }

    /** {@return who answers for it} */
    Entry<String> author() {
        return author;
    }

    /** {@return the client's reference} */
    Entry<String> reference() {
        return reference;
    }

    /** {@return the lines at its head} */
    Entry<List<String>> letterhead() {
        return letterhead;
    }

    /** {@return its date} */
    Entry<LocalDate> date() {
        return date;
    }

    /** {@return what gets a table of all its rows} */
    ObjectProperty<Tables> tables() {
        return tables;
    }

    /** {@return whether its tables give rates or volumes} */
    ObjectProperty<Amounts> amounts() {
        return amounts;
    }

    List<ObservableValue<?>> observables() {
        return List.of(title.text(), author.text(), reference.text(), letterhead.text(), date.text(), tables, amounts);
    }

    List<Entry<?>> entries() {
        return List.of(title, author, reference, letterhead, date);
    }

    ReportRequest request() {
        return new ReportRequest(
                title.value(),
                author.value(),
                reference.value(),
                letterhead.value().orElse(List.of()),
                date.value().orElseGet(LocalDate::now),
                tables.get().periods,
                amounts.get());
    }

    /** Adds what differs from a command's defaults, and the date, which would be another one tomorrow. */
    CommandText into(CommandText command) {
        command.with("--report-title", title.value())
                .with("--report-author", author.value())
                .with("--report-reference", reference.value())
                .with("--report-letterhead", letterhead.value().map(lines -> String.join("|", lines)))
                .with("--report-date", request().date());
        if (tables.get() != Tables.RECORD) {
            tables.get().periods.forEach(period -> command.with("--report-periods", period));
        }
        return command.with(
                "--report-amounts",
                Optional.of(amounts.get())
                        .filter(wanted -> wanted != Amounts.RATE)
                        .map(CommandText::word));
    }
}
