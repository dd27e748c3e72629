package org.seepledger.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.seepledger.job.ExtractJob;
import org.seepledger.job.ExtractRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** {@code seepledger extract}. */
@Command(
        name = "extract",
        description =
                "Copies an aquifer folder with just the cells that prisms touch and a ring around them. The copy gives"
                        + " the same budget digit for digit, and is small enough to hand to a reviewer.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Example: what the sample's budget rests on.",
            "  seepledger extract sample-aquifers/terrace \\",
            "    --prisms sample-aquifers/terrace/prisms.geojson --out extract",
            "  seepledger balance extract --prisms extract/prisms.geojson --out budget",
            "",
            "The grid stays as it is, so that rows, columns and every digit do too; tables keep the lines of the cells"
                    + " kept, rasters have no value elsewhere. The first line of each category of points stays wherever"
                    + " it is, so that the budget has the same rows. The prisms and their surfaces are copied along.",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong."
        })
final class ExtractCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(paramLabel = "AQUIFER", description = "The folder with aquifer.json.")
    private Path aquifer;

    @Option(names = "--prisms", paramLabel = "F", required = true, description = "The prisms, as GeoJSON.")
    private Path prisms;

    @Option(names = "--out", paramLabel = "DIR", required = true, description = "A new or empty folder for the copy.")
    private Path out;

    @Option(
            names = "--clip",
            description = "Cut prisms at the grid's edge instead of refusing those that reach beyond it.")
    private boolean clip;

    @Option(
            names = "--progress",
            negatable = true,
            description = "Print progress to standard error (default: if a terminal is attached).")
    private Boolean progress;

    @Option(names = "--overwrite", description = "Replace the files that an earlier run wrote to DIR.")
    private boolean overwrite;

    ExtractCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        ExtractRequest request = new ExtractRequest(aquifer, prisms, out, clip, overwrite);
        terminal.out().print(ExtractJob.run(request, terminal.progress(progress)));
        return 0;
    }
}
