package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.RunJson;
import org.seepledger.io.result.Statement;
import org.seepledger.io.submission.DifferencesCsv;
import org.seepledger.io.submission.RunFolder;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.progress.Progress;
import org.seepledger.report.ComparisonText;
import org.seepledger.report.page.ComparisonPage;
import org.seepledger.review.change.Difference;
import org.seepledger.review.change.Pairs;
import org.seepledger.review.change.RecordedRow;
import org.seepledger.review.change.Split;

/** Two runs of {@code balance} side by side, and what made the difference. */
public final class CompareJob {

    private final CompareRequest request;
    private final Progress progress;
    private final RunFolder first;
    private final RunFolder second;
    private final Stopwatch stopwatch = new Stopwatch();
    private Optional<String> notSplit = Optional.empty();

    private CompareJob(CompareRequest request, Progress progress) {
        this.request = request;
        this.progress = progress;
        this.first = RunFolder.read(request.first());
        this.second = RunFolder.read(request.second());
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return the summary, lines of text; the files are in place
     * @throws UsageFault if the request cannot be met
     * @throws DataFault if a folder is not what a run of {@code balance} left
     */
    public static String run(CompareRequest request, Progress progress) {
        try (OutputFolder out = OutputFolder.at(request.out(), "compare", request.overwrite())) {
            return new CompareJob(request, progress).run(out);
        }
    }

    private String run(OutputFolder out) {
        List<Difference> differences = differences();
        stopwatch.lap("comparing");
        ComparisonText text = new ComparisonText(
                first.hashes(), second.hashes(), first.options(), second.options(), differences, notSplit);
        try {
            List<String> notes = notes();
            DifferencesCsv.write(out.file("differences.csv"), notes, differences);
            DifferencesCsv.writeInputs(out.file("inputs.csv"), notes, first.hashes(), second.hashes());
            Files.writeString(
                    out.file("compare.html"),
                    ComparisonPage.of(
                            text,
                            request.first().toString(),
                            request.second().toString(),
                            request.date(),
                            Version.text()));
            RunRecord.write(out, "compare", options(), statement(), List.of(), Map.of(), stopwatch);
        } catch (IOException e) {
            throw new UsageFault("The results cannot be written beside " + request.out() + " (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
        }
        List<String> files = out.written();
        out.publish();
        return String.join("\n", text.sentences()) + "\nWritten to " + request.out() + ": " + String.join(", ", files)
                + "\n";
    }

    private List<Difference> differences() {
        Pairs pairs = Pairs.of(first.rows(), second.rows());
        try (MixedBudgets mixed = MixedBudgets.of(first, second, request.threads(), progress)) {
            return pairs.rows().stream().map(pair -> difference(pair, mixed)).toList();
        } catch (DataFault cannot) {
            notSplit = Optional.of(cannot.getMessage());
            return pairs.rows().stream()
                    .map(pair -> new Difference(pair.first(), pair.second(), Optional.empty(), Optional.empty()))
                    .toList();
        }
    }

    private static Difference difference(Pairs.Pair pair, MixedBudgets mixed) {
        boolean both = pair.first().isPresent()
                && pair.second().isPresent()
                && !pair.first().get().isPercentage();
        if (!both) {
            return new Difference(pair.first(), pair.second(), Optional.empty(), Optional.empty());
        }
        RecordedRow one = pair.first().get();
        RecordedRow other = pair.second().get();
        return new Difference(
                pair.first(),
                pair.second(),
                mixed.values(one, other, false).map(values -> Split.of(values, other.rate())),
                mixed.values(one, other, true).map(values -> Split.of(values, other.volume())));
    }

    private Statement statement() throws IOException {
        List<FileRecord> inputs = new ArrayList<>();
        for (RunFolder run : List.of(first, second)) {
            for (String name : List.of(RunJson.NAME, "budget.csv")) {
                inputs.add(FileRecord.of(
                        run.folder().resolve(name).toString(), run.folder().resolve(name)));
            }
        }
        return new Statement("Comparison of two runs by seepledger " + Version.text(), inputs, List.of(), List.of());
    }

    private List<String> notes() throws IOException {
        List<String> lines = new ArrayList<>();
        lines.add(statement().title());
        statement().inputs().forEach(input -> lines.add("Input: " + input.name() + ", SHA-256 " + input.sha256()));
        notSplit.ifPresent(reason -> lines.add("Parts of differences cannot be told: " + reason));
        Disclaimer.sentences().forEach(sentence -> lines.add("Disclaimer: " + sentence));
        return lines.stream().map(line -> line.replaceAll("\\p{Cntrl}+", " ")).toList();
    }

    private Map<String, String> options() {
        Map<String, String> options = new LinkedHashMap<>();
        options.put("first", request.first().toString());
        options.put("second", request.second().toString());
        return options;
    }
}
