package org.seepledger.cli;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.UsageFault;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.BalanceOutcome;
import org.seepledger.job.BalanceRequest;
import org.seepledger.unit.Measure;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code seepledger balance}. */
@Command(
        name = "balance",
        description =
                "Strikes the water budget of each prism: what comes in and goes out through each side and lid, what"
                        + " sources add and take, what storage gives and takes, and how well it closes.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Example: the sample's budget in litres a second, failing if more than 1 %% is left unexplained.",
            "  seepledger balance sample-aquifers/terrace \\",
            "    --prisms sample-aquifers/terrace/prisms.geojson --out budget \\",
            "    --rate-unit L/s --max-closure-error 1",
            "",
            "Written to DIR: budget.csv (the table), faces.geojson (faces with their flow), imbalance_l1.tif"
                    + " and so on (what does not balance, by cell and layer), run.json (inputs, options, warnings).",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong;",
            "4 done, but a closure error exceeds --max-closure-error."
        })
final class BalanceCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(paramLabel = "AQUIFER", description = "The folder with aquifer.json.")
    private Path aquifer;

    @Option(
            names = "--prisms",
            paramLabel = "F",
            required = true,
            description = "The prisms, as GeoJSON: polygons, each with a name.")
    private Path prisms;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            required = true,
            description = "A new or empty folder for the results.")
    private Path out;

    @ArgGroup
    private Dates dates = new Dates();

    /** Either regular periods or the user's own. */
    static final class Dates {

        @Option(
                names = "--every",
                paramLabel = "PERIOD",
                description =
                        "Strike a budget for each interval (default), month, year or water-year, or one for the whole"
                                + " record.")
        private String every = "interval";

        @Option(names = "--periods", paramLabel = "FILE", description = "Or for the periods of a CSV: name,from,to.")
        private Path periods;
    }

    @Option(
            names = "--water-year-start",
            paramLabel = "MONTH",
            description = "The month in which a water year begins, 1 to 12 (default: 10).")
    private int waterYearStart = 10;

    @Option(
            names = "--rate-unit",
            paramLabel = "UNIT",
            description = "Unit of rates, such as L/s (default: the set's own).")
    private String rateUnit;

    @Option(
            names = "--volume-unit",
            paramLabel = "UNIT",
            description = "Unit of volumes, such as ML (default: the set's own).")
    private String volumeUnit;

    @Option(
            names = "--mass-unit",
            paramLabel = "UNIT",
            description = "Unit of masses, such as kg; checked, but a water budget has none.")
    private String massUnit;

    @Option(
            names = "--max-closure-error",
            paramLabel = "PERCENT",
            description = "End with status 4 if a closure error of any prism and period is larger, whatever its sign.")
    private Double maxClosureError;

    @Option(
            names = "--wells",
            paramLabel = "RULE",
            description =
                    "How a well counts whose cell a prism cuts: point (default), in full if it is inside; spread, by"
                            + " the share of its cell inside.")
    private String wells = "point";

    @Option(
            names = "--clip",
            description = "Cut prisms at the grid's edge instead of refusing those that reach beyond it.")
    private boolean clip;

    @Option(names = "--threads", paramLabel = "N", description = "How many threads may work (default: all processors).")
    private int threads = Runtime.getRuntime().availableProcessors();

    @Option(
            names = "--progress",
            negatable = true,
            description = "Print progress to standard error (default: if a terminal is attached).")
    private Boolean progress;

    @Option(names = "--overwrite", description = "Replace the files that an earlier run wrote to DIR.")
    private boolean overwrite;

    BalanceCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        measure("--mass-unit", massUnit, "kg");
        BalanceOutcome outcome = BalanceJob.run(request(), terminal.progress(progress));
        terminal.out().print(outcome.summary());
        terminal.out().println();
        terminal.out().println("Written to " + out + ": " + String.join(", ", outcome.files()));
        if (maxClosureError != null && outcome.worstClosureError() > maxClosureError) {
            terminal.out()
                    .println("The worst closure error is " + outcome.worstClosureError() + " %, more than the "
                            + maxClosureError + " % allowed.");
            return Faults.CLOSURE;
        }
        if (maxClosureError != null && Double.isNaN(outcome.worstClosureError())) {
            terminal.out().println("No closure error can be given, so that --max-closure-error was not checked.");
        }
        return 0;
    }

    private BalanceRequest request() {
        if (waterYearStart < 1 || waterYearStart > 12) {
            throw new UsageFault("--water-year-start is " + waterYearStart + "; give a month from 1 to 12.");
        }
        if (maxClosureError != null && !(maxClosureError >= 0)) {
            throw new UsageFault("--max-closure-error is " + maxClosureError + "; give a percentage of 0 or more.");
        }
        return new BalanceRequest(
                aquifer,
                prisms,
                out,
                choice("--every", dates.every, Periods.Every.class),
                Optional.ofNullable(dates.periods),
                waterYearStart,
                measure("--rate-unit", rateUnit, "m3/d"),
                measure("--volume-unit", volumeUnit, "m3"),
                choice("--wells", wells, WellRule.class),
                clip,
                checkedThreads(threads),
                overwrite);
    }

    static int checkedThreads(int threads) {
        if (threads < 1) {
            throw new UsageFault("--threads is " + threads + "; give 1 or more.");
        }
        return threads;
    }

    private static <E extends Enum<E>> E choice(String option, String text, Class<E> choices) {
        for (E choice : choices.getEnumConstants()) {
            if (choice.name().equals(text.toUpperCase(Locale.ROOT).replace('-', '_'))) {
                return choice;
            }
        }
        String known = String.join(
                ", ",
                Arrays.stream(choices.getEnumConstants())
                        .map(choice -> choice.name().toLowerCase(Locale.ROOT).replace('_', '-'))
                        .toList());
        throw new UsageFault(option + " is \"" + text + "\"; give one of " + known + ".");
    }

    private static Optional<Measure> measure(String option, String text, String like) {
        if (text == null) {
            return Optional.empty();
        }
        try {
            Measure measure = Measure.of(text);
            if (measure.isCompatible(Measure.of(like))) {
                return Optional.of(measure);
            }
            throw new UsageFault(
                    option + " is \"" + text + "\", which measures something else; give a unit as " + like + ".");
        } catch (IllegalArgumentException e) {
            throw new UsageFault(option + ": " + e.getMessage() + ".");
        }
    }
}
