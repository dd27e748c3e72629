package org.seepledger.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.seepledger.fault.UsageFault;
import org.seepledger.job.PlumeJob;
import org.seepledger.job.PlumeOutcome;
import org.seepledger.job.PlumeRequest;
import org.seepledger.unit.Measure;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code seepledger plume}. */
@Command(
        name = "plume",
        description =
                "Strikes the solute budget of each prism: how much mass it holds, what comes in and goes out through"
                        + " each side and lid, what sources add and take, what decays, and how well it closes.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Example: the sample's yearly budgets in kilograms a year, with dispersion and the volume above 0.1 mg/L.",
            "  seepledger plume sample-aquifers/depot --prisms sample-aquifers/depot/prisms.geojson \\",
            "    --out plume --every year --rate-unit kg/yr --dispersion --above \"0.1 mg/L\"",
            "",
            "Written to DIR: report.html (to read and hand over), plume.csv (the budget), mass.csv (what is there at each instant), trend.csv"
                    + " (where it goes and how it changes), transect.csv (what crosses lines), run.json (inputs, options, warnings).",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong;",
            "4 done, but a closure error exceeds --max-closure-error."
        })
final class PlumeCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Mixin
    private ResultOptions result = new ResultOptions();

    @Mixin
    private BudgetOptions options = new BudgetOptions();

    @Option(names = "--mass-unit", paramLabel = "UNIT", description = "Unit of masses, such as g or lb (default: kg).")
    private String massUnit;

    @Option(
            names = "--dispersion",
            description = "Book what disperses through faces, too, for solutes that dispersion is given for.")
    private boolean dispersion;

    @Option(
            names = "--above",
            paramLabel = "CONCENTRATION",
            description = "Count volume and area above a concentration, as \"50 mg/L\".")
    private String above;

    @Option(
            names = "--transects",
            paramLabel = "F",
            description = "Lines, as GeoJSON, each with a name: what crosses them goes into transect.csv.")
    private Path transects;

    @Option(
            names = "--panels",
            paramLabel = "F",
            description = "Or measured panels of transects, as CSV: transect,solute,panel,q,c,area.")
    private Path panels;

    @Mixin
    private ReportOptions report = new ReportOptions();

    @Mixin
    private ClosureLimit limit = new ClosureLimit();

    PlumeCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        limit.check();
        PlumeOutcome outcome = PlumeJob.run(request(), options.progress(terminal));
        result.tell(terminal.out(), outcome.summary(), outcome.files());
        return limit.status(outcome.worstClosureError(), terminal.out());
    }

    private PlumeRequest request() {
        return new PlumeRequest(
                result.aquifer(),
                result.prisms(),
                result.out(),
                options.every(),
                options.periods(),
                options.waterYearStart(),
                options.rateUnit("kg/d"),
                Choices.measure("--mass-unit", massUnit, "kg"),
                result.volumeUnit(),
                options.wells(),
                dispersion,
                above(),
                Optional.ofNullable(transects),
                Optional.ofNullable(panels),
                options.clip(),
                options.threads(),
                result.overwrite(),
                report.request(terminal.clock()));
    }

    private Optional<PlumeRequest.Threshold> above() {
        if (above == null) {
            return Optional.empty();
        }
        String[] words = above.strip().split("\\s+", 2);
        try {
            double value = Double.parseDouble(words[0]);
            if (words.length == 2 && value >= 0 && Double.isFinite(value)) {
                Measure unit = Choices.measure("--above", words[1], "mg/L").orElseThrow();
                return Optional.of(new PlumeRequest.Threshold(value, unit));
            }
        } catch (NumberFormatException e) {
            throw notAConcentration();
        }
        throw notAConcentration();
    }

    private UsageFault notAConcentration() {
        return new UsageFault("--above is \"" + above + "\"; give a concentration with its unit, as \"50 mg/L\".");
    }
}
