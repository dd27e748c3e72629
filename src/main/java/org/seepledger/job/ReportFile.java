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
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Crossing;
import org.seepledger.report.PlumeResult;
import org.seepledger.report.PrismResult;
import org.seepledger.report.page.Cover;
import org.seepledger.report.page.Masthead;
import org.seepledger.report.page.PlumeDrawing;
import org.seepledger.report.page.PrismPictures;
import org.seepledger.report.page.Report;
import org.seepledger.report.page.ReportPage;
import org.seepledger.report.page.ReportPictures;
import org.seepledger.report.page.SoluteReport;
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

    /** Writes the report on a water budget; gives its pictures of each prism. */
    List<PrismPictures> write(
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
                cover("Water budget", subject, statement, options),
                results,
                balance.exchange(),
                units,
                request.amounts(),
                tables,
                pictures,
                drawing.exchange(results.get(0).record().period()));
        Path file = out.file(NAME);
        Files.writeString(file, ReportPage.of(report));
        return pictures;
    }

    /** Writes the report on solutes. */
    void write(
            OutputFolder out,
            Subject subject,
            List<PlumeResult> results,
            List<Crossing> crossings,
            List<MeasuredPanels> measured,
            MassUnits units,
            Statement statement,
            Map<String, String> options)
            throws IOException {
        PlumeDrawing drawing = new PlumeDrawing(subject.aquifer(), subject.prisms(), units);
        SoluteReport report = new SoluteReport(
                cover("Solute budget", subject, statement, options),
                results,
                units,
                request.amounts(),
                tables,
                results.stream().map(drawing::of).toList(),
                crossings.stream()
                        .map(crossing -> drawing.of(crossing, results.get(0)))
                        .toList(),
                measured);
        Files.writeString(out.file(NAME), ReportPage.of(report));
    }

    private Cover cover(String budget, Subject subject, Statement statement, Map<String, String> options) {
        String title =
                request.title().orElse(budget + " of \u201c" + subject.aquifer().name() + "\u201d");
        return new Cover(
                new Masthead(title, request.author(), request.reference(), request.letterhead(), request.date()),
                Version.text(),
                subject.aquifer(),
                subject.crs(),
                statement,
                subject.notes(),
                options);
    }
}
