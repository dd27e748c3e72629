package org.seepledger.cli;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.seepledger.fault.UsageFault;
import org.seepledger.job.ReviewJob;
import org.seepledger.job.ReviewOutcome;
import org.seepledger.job.ReviewRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code seepledger review}. */
@Command(
        name = "review",
        description =
                "Reviews a budget that somebody submitted: its arithmetic, its units and signs and, given the aquifer, each"
                        + " of its figures against a recomputed one. Says what may be behind a difference, and what to ask.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Example: a submitted table, held against the sample.",
            "  seepledger review sample-aquifers/terrace \\",
            "    --prisms sample-aquifers/terrace/prisms.geojson \\",
            "    --submitted sample-aquifers/terrace/submitted.csv --out review",
            "",
            "Written to DIR: review.html (to read and to send), findings.csv, side_by_side.csv (figure beside figure),"
                    + " mapping.json (how the table was read: correct it and give it to --mapping), run.json.",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong;",
            "4 done, and a fault was found in the submitted budget."
        })
final class ReviewCommand implements Callable<Integer> {

    private static final int FAULT_FOUND = 4;

    private final Terminal terminal;

    @Parameters(
            paramLabel = "AQUIFER",
            arity = "0..1",
            description = "The folder with aquifer.json; without it the table alone is looked at.")
    private Path aquifer;

    @Option(names = "--prisms", paramLabel = "F", description = "The prisms, as GeoJSON.")
    private Path prisms;

    @Option(
            names = "--submitted",
            paramLabel = "F",
            required = true,
            description = "The submitted budget, CSV or XLSX.")
    private Path submitted;

    @Option(
            names = "--mapping",
            paramLabel = "F",
            description = "How to read it where the guess is wrong: a corrected mapping.json.")
    private Path mapping;

    @Mixin
    private OutputOptions output = new OutputOptions();

    @Option(
            names = "--tolerance",
            paramLabel = "PERCENT",
            description = "How far a figure may differ, in percent of throughput (default: 1), beside rounding.")
    private double tolerance = 1;

    @Option(
            names = "--whole-cells",
            description = "Hold it against budgets of whole cells, if its author took cells whole.")
    private boolean wholeCells;

    @Option(
            names = "--water-year-start",
            paramLabel = "MONTH",
            description = "The month in which a water year begins, 1 to 12 (default: 10).")
    private int waterYearStart = 10;

    @Option(
            names = "--clip",
            description = "Cut prisms at the grid's edge instead of refusing those that reach beyond it.")
    private boolean clip;

    @Mixin
    private WorkOptions work = new WorkOptions();

    ReviewCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        ReviewOutcome outcome = ReviewJob.run(request(), work.progress(terminal));
        terminal.out().print(outcome.summary());
        terminal.out().println("Written to " + output.folder() + ": " + String.join(", ", outcome.files()));
        return outcome.fault() ? FAULT_FOUND : 0;
    }

    private ReviewRequest request() {
        if (!(tolerance >= 0 && tolerance <= 100)) {
            throw new UsageFault("--tolerance is " + tolerance + "; give a percentage from 0 to 100.");
        }
        if (waterYearStart < 1 || waterYearStart > 12) {
            throw new UsageFault("--water-year-start is " + waterYearStart + "; give a month from 1 to 12.");
        }
        return new ReviewRequest(
                Optional.ofNullable(aquifer),
                Optional.ofNullable(prisms),
                submitted,
                Optional.ofNullable(mapping),
                output.folder(),
                tolerance,
                wholeCells,
                waterYearStart,
                clip,
                work.threads(),
                output.overwrite(),
                LocalDate.now(terminal.clock()));
    }
}
