package org.seepledger.cli;

import java.util.concurrent.Callable;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.BalanceOutcome;
import org.seepledger.job.BalanceRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

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
            "Written to DIR: report.html (to read and hand over), budget.csv (the table), exchange.csv (what prisms give to each other),"
                    + " faces.geojson (faces with their flow), imbalance_l1.tif"
                    + " and so on (what does not balance, by cell and layer), run.json (inputs, options, warnings).",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong;",
            "4 done, but a closure error exceeds --max-closure-error."
        })
final class BalanceCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Mixin
    private ResultOptions result = new ResultOptions();

    @Mixin
    private BudgetOptions options = new BudgetOptions();

    @Mixin
    private ReportOptions report = new ReportOptions();

    @Option(
            names = "--mass-unit",
            paramLabel = "UNIT",
            description = "Unit of masses, such as kg; checked, but a water budget has none.")
    private String massUnit;

    @Mixin
    private ClosureLimit limit = new ClosureLimit();

    BalanceCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        limit.check();
        Choices.measure("--mass-unit", massUnit, "kg");
        BalanceOutcome outcome = BalanceJob.run(request(), options.progress(terminal));
        result.tell(terminal.out(), outcome.summary(), outcome.files());
        return limit.status(outcome.worstClosureError(), terminal.out());
    }

    private BalanceRequest request() {
        return new BalanceRequest(
                result.aquifer(),
                result.prisms(),
                result.out(),
                options.every(),
                options.periods(),
                options.waterYearStart(),
                options.rateUnit(),
                result.volumeUnit(),
                options.wells(),
                options.clip(),
                options.threads(),
                result.overwrite(),
                report.request(terminal.clock()));
    }
}
