package org.seepledger.cli;

import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.unit.Measure;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What a command that writes a folder of results works on, where the results go, and their unit of volumes. */
final class ResultOptions {

    @Parameters(paramLabel = "AQUIFER", description = "The folder with aquifer.json.")
    private Path aquifer;

    @Option(
            names = "--prisms",
            paramLabel = "F",
            required = true,
            description = "The prisms, as GeoJSON: polygons, each with a name.")
    private Path prisms;

    @Mixin
    private OutputOptions output = new OutputOptions();

    @Option(
            names = "--volume-unit",
            paramLabel = "UNIT",
            description = "Unit of volumes, such as ML (default: the set's own).")
    private String volumeUnit;

    Path aquifer() {
        return aquifer;
    }

    Path prisms() {
        return prisms;
    }

    Path out() {
        return output.folder();
    }

    boolean overwrite() {
        return output.overwrite();
    }

    Optional<Measure> volumeUnit() {
        return Choices.measure("--volume-unit", volumeUnit, "m3");
    }

    /** Prints what a run came to, and which files it wrote. */
    void tell(PrintStream to, String summary, List<String> files) {
        to.print(summary);
        to.println();
        to.println("Written to " + out() + ": " + String.join(", ", files));
    }
}
