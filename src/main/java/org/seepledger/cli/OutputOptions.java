package org.seepledger.cli;

import java.nio.file.Path;
import picocli.CommandLine.Option;

/** Where results go. */
final class OutputOptions {

    @Option(
            names = "--out",
            paramLabel = "DIR",
            required = true,
            description = "A new or empty folder for the results.")
    private Path out;

    @Option(names = "--overwrite", description = "Replace the files that an earlier run wrote to DIR.")
    private boolean overwrite;

    Path folder() {
        return out;
    }

    boolean overwrite() {
        return overwrite;
    }
}
