package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.Statement;
import org.seepledger.io.submission.BesideCsv;
import org.seepledger.io.submission.FindingsCsv;
import org.seepledger.io.submission.MappingJson;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.progress.Progress;
import org.seepledger.report.ReviewText;
import org.seepledger.report.page.ReviewPage;
import org.seepledger.review.check.Reference;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.Severity;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Submission;

/** The review of a submitted budget: reads it, recomputes, holds the two against each other, writes what was found. */
public final class ReviewJob {

    private final ReviewRequest request;
    private final Progress progress;
    private final Stopwatch stopwatch = new Stopwatch();

    private ReviewJob(ReviewRequest request, Progress progress) {
        this.request = request;
        this.progress = progress;
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return what it came to; the files are in place
     * @throws UsageFault if the request cannot be met
     * @throws org.seepledger.fault.DataFault if the data or the submission are wrong; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     */
    public static ReviewOutcome run(ReviewRequest request, Progress progress) {
        if (request.aquifer().isPresent() != request.prisms().isPresent()) {
            throw new UsageFault(
                    "Give both AQUIFER and --prisms, or neither: without them the table alone is looked at.");
        }
        try (OutputFolder out = OutputFolder.at(request.out(), "review", request.overwrite())) {
            return new ReviewJob(request, progress).run(out);
        }
    }

    private ReviewOutcome run(OutputFolder out) {
        if (request.aquifer().isEmpty()) {
            return finish(out, Optional.empty(), Optional.empty());
        }
        Path aquifer = request.aquifer().get();
        Path prisms = request.prisms().orElseThrow();
        try (Subject subject = Subject.open(aquifer, prisms, request.clip())) {
            subject.alsoReads(request.submitted());
            request.mapping().ifPresent(subject::alsoReads);
            Recomputation recomputation = new Recomputation(
                    subject.aquifer(), subject.prisms(), request.wholeCells(), request.threads(), progress);
            stopwatch.lap("balancing");
            return finish(out, Optional.of(subject), Optional.of(recomputation));
        }
    }

    private ReviewOutcome finish(OutputFolder out, Optional<Subject> subject, Optional<Reference> reference) {
        List<Submission> tables = Reading.of(request.submitted(), corrections(), reference, request.waterYearStart());
        Review.Result result = Review.of(tables, reference, request.tolerance());
        stopwatch.lap("reviewing");
        write(out, tables, result, statement(subject));
        List<String> files = out.written();
        out.publish();
        return new ReviewOutcome(ReviewText.summary(result, reference.isPresent()), result.has(Severity.FAULT), files);
    }

    private Optional<Mapping> corrections() {
        return request.mapping().map(file -> MappingJson.read(file, file.toString()));
    }

    private Statement statement(Optional<Subject> subject) {
        String title = "Review of a submitted budget";
        if (subject.isPresent()) {
            return subject.get().statement(title, progress);
        }
        List<FileRecord> inputs = new ArrayList<>(List.of(record(request.submitted())));
        request.mapping().ifPresent(file -> inputs.add(record(file)));
        return new Statement(title + " by seepledger " + Version.text(), inputs, List.of(), List.of());
    }

    private static FileRecord record(Path file) {
        try {
            return FileRecord.of(file.toString(), file);
        } catch (IOException e) {
            throw Unreadable.file(file.toString(), e);
        }
    }

    private void write(OutputFolder out, List<Submission> tables, Review.Result result, Statement statement) {
        List<String> notes = notes(statement);
        try {
            FindingsCsv.write(out.file("findings.csv"), notes, result.findings());
            BesideCsv.write(out.file("side_by_side.csv"), notes, result.beside());
            MappingJson.write(
                    out.file("mapping.json"),
                    tables.stream().map(Submission::mapping).toList());
            boolean recomputed = request.aquifer().isPresent();
            Files.writeString(
                    out.file("review.html"),
                    ReviewPage.of(result, recomputed, statement, options(), request.date(), Version.text()));
            RunRecord.write(out, "review", options(), statement, List.of(), Map.of(), stopwatch);
        } catch (IOException e) {
            throw new UsageFault("The results cannot be written beside " + request.out() + " (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
        }
    }

    private static List<String> notes(Statement statement) {
        List<String> lines = new ArrayList<>();
        lines.add(statement.title());
        statement.inputs().forEach(input -> lines.add("Input: " + input.name() + ", SHA-256 " + input.sha256()));
        statement.warnings().forEach(warning -> lines.add("Warning: " + warning));
        lines.add("A finding says what may be behind a number; it does not prove it.");
        Disclaimer.sentences().forEach(sentence -> lines.add("Disclaimer: " + sentence));
        return lines.stream().map(line -> line.replaceAll("\\p{Cntrl}+", " ")).toList();
    }

    private Map<String, String> options() {
        Map<String, String> options = new LinkedHashMap<>();
        request.aquifer().ifPresent(aquifer -> options.put("aquifer", aquifer.toString()));
        request.prisms().ifPresent(prisms -> options.put("prisms", prisms.toString()));
        options.put("submitted", request.submitted().toString());
        request.mapping().ifPresent(mapping -> options.put("mapping", mapping.toString()));
        options.put("tolerance", String.valueOf(request.tolerance()));
        options.put("whole-cells", String.valueOf(request.wholeCells()));
        options.put("water-year-start", String.valueOf(request.waterYearStart()));
        options.put("clip", String.valueOf(request.clip()));
        return options;
    }
}
