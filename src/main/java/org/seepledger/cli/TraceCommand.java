package org.seepledger.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.seepledger.fault.UsageFault;
import org.seepledger.job.SoluteTraceJob;
import org.seepledger.job.SoluteTraceRequest;
import org.seepledger.job.TraceJob;
import org.seepledger.job.TraceRequest;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code seepledger trace}. */
@Command(
        name = "trace",
        description =
                "Tells where a number of a water budget comes from: the stored values that add up to it, with the weight"
                        + " that it has in it. Value × weight adds up to the row's net_rate. With --solute the same for a"
                        + " solute's budget, back to the stored concentrations.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Give the options that the budget was struck with: they change what a row comes to.",
            "",
            "Example: which flux values make up the flow through one side of the sample's well field.",
            "  seepledger trace sample-aquifers/terrace \\",
            "    --prisms sample-aquifers/terrace/prisms.geojson \\",
            "    --row \"well field/interval 1/river side/1\" --out trace.csv",
            "",
            "Which concentrations make up what leaves the depot's yard in a month:",
            "  seepledger trace sample-aquifers/depot --prisms sample-aquifers/depot/prisms.geojson \\",
            "    --solute solvent --row \"yard/interval 5/meadow side/1\" --out trace.csv",
            "",
            "ROW is PRISM/PERIOD/ITEM/LAYER with the words of budget.csv or plume.csv; LAYER is * for a total, as"
                    + " \"residual/*\", and for an item over all its layers. It is"
                    + " held against the rows that there are, not split, so slashes in names stand as they are. Where"
                    + " several groups have an item of that name, write PRISM/PERIOD/GROUP/ITEM/LAYER.",
            "FILE is a CSV: file, place (band or column, and cell), value as it stands there, weight.",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong, or names a row that there is"
                    + " not; 3 the data are wrong."
        })
final class TraceCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(paramLabel = "AQUIFER", description = "The folder with aquifer.json.")
    private Path aquifer;

    @Option(names = "--prisms", paramLabel = "F", required = true, description = "The prisms, as GeoJSON.")
    private Path prisms;

    @Option(names = "--row", paramLabel = "ROW", required = true, description = "The row, as below.")
    private String row;

    @Option(names = "--out", paramLabel = "FILE", required = true, description = "The file to write.")
    private Path out;

    @Mixin
    private BudgetOptions options = new BudgetOptions();

    @Option(
            names = "--solute",
            paramLabel = "NAME",
            description = "Trace a row of this solute's budget, as in plume.csv.")
    private String solute;

    @Option(
            names = "--dispersion",
            description = "With --solute: book what disperses through faces, too, as plume does.")
    private boolean dispersion;

    @Option(names = "--overwrite", description = "Replace FILE if an earlier trace wrote it.")
    private boolean overwrite;

    TraceCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        if (solute == null && dispersion) {
            throw new UsageFault("--dispersion goes with --solute: water does not disperse.");
        }
        Progress progress = options.progress(terminal);
        terminal.out()
                .print(
                        solute == null
                                ? TraceJob.run(request(options.rateUnit()), progress)
                                : SoluteTraceJob.run(
                                        new SoluteTraceRequest(request(options.rateUnit("kg/d")), solute, dispersion),
                                        progress));
        return 0;
    }

    private TraceRequest request(Optional<Measure> rateUnit) {
        return new TraceRequest(
                aquifer,
                prisms,
                row,
                out,
                options.every(),
                options.periods(),
                options.waterYearStart(),
                rateUnit,
                options.wells(),
                options.clip(),
                options.threads(),
                overwrite);
    }
}
