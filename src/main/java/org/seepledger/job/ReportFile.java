package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import org.seepledger.balance.Balance;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Period;
import org.seepledger.report.PrismResult;
import org.seepledger.report.page.Masthead;
import org.seepledger.report.page.PrismPictures;
import org.seepledger.report.page.Report;
import org.seepledger.report.page.ReportPage;
import org.seepledger.report.page.ReportPictures;
import org.seepledger.report.page.TableChoice;

/** Puts a report together and writes it. */
final class ReportFile {

    private static final String NAME = "report.html";

    private final ReportRequest request;
    private final TableChoice tables;

    /**
     * Prepares a report.
     *
     * @param request what it is to look like
     * @param periods the periods of the budget, for those that it names
     * @throws UsageFault if it names a period that there is none of
     */
    ReportFile(ReportRequest request, List<Period> periods) {
        this.request = request;
        this.tables =
                choice(request.periods(), periods.stream().map(Period::name).toList());
    }

    private static TableChoice choice(List<String> wanted, List<String> periods) {
        Set<String> names = new LinkedHashSet<>(wanted);
        boolean record = names.remove(ReportRequest.RECORD);
        boolean worst = names.remove(ReportRequest.WORST);
        boolean all = names.remove(ReportRequest.ALL);
        for (String name : names) {
            if (!periods.contains(name)) {
                throw new UsageFault("--report-periods is \"" + name + "\"; give record, worst, all, or the name of a"
                        + " period as in budget.csv, from \"" + periods.get(0) + "\" to \""
                        + periods.get(periods.size() - 1)
                        + "\".");
            }
        }
        return new TableChoice(record, worst, all, names);
    }

    /** What the run record says of it. */
    Map<String, String> options() {
        Map<String, String> options = new LinkedHashMap<>();
        request.title().ifPresent(title -> options.put("report-title", title));
        request.author().ifPresent(author -> options.put("report-author", author));
        request.reference().ifPresent(reference -> options.put("report-reference", reference));
        if (!request.letterhead().isEmpty()) {
            options.put("report-letterhead", String.join("|", request.letterhead()));
        }
        options.put("report-date", request.date().toString());
        options.put("report-periods", String.join(", ", request.periods()));
        options.put("report-amounts", request.amounts().name().toLowerCase(Locale.ROOT));
        return options;
    }

    /** Writes the report. */
    void write(
            OutputFolder out,
            Subject subject,
            Balance balance,
            List<PrismBudget> budgets,
            ResultUnits units,
            Statement statement,
            Map<String, String> options)
            throws IOException {
        List<PrismResult> results = IntStream.range(0, budgets.size())
                .mapToObj(prism -> PrismResult.of(subject.aquifer(), balance, budgets, prism))
                .toList();
        ReportPictures drawing = new ReportPictures(subject.aquifer(), subject.prisms(), balance, units);
        List<PrismPictures> pictures = IntStream.range(0, results.size())
                .mapToObj(prism -> drawing.of(prism, results.get(prism)))
                .toList();
        Report report = new Report(
                masthead(subject),
                Version.text(),
                subject.aquifer(),
                subject.crs(),
                results,
                balance.exchange(),
                units,
                request.amounts(),
                tables,
                statement,
                subject.notes(),
                options,
                pictures,
                drawing.exchange(results.get(0).record().period()));
        Path file = out.file(NAME);
        Files.writeString(file, ReportPage.of(report));
    }

    private Masthead masthead(Subject subject) {
        String title = request.title()
                .orElse("Water budget of \u201c" + subject.aquifer().name() + "\u201d");
        return new Masthead(title, request.author(), request.reference(), request.letterhead(), request.date());
    }
}
