package org.seepledger.cli;

import org.seepledger.progress.Progress;
import picocli.CommandLine.Option;

/** How a command works, which changes no result: by how many threads, and whether it tells its progress. */
final class WorkOptions {

    @Option(names = "--threads", paramLabel = "N", description = "How many threads may work (default: all processors).")
    private int threads = Runtime.getRuntime().availableProcessors();

    @Option(
            names = "--progress",
            negatable = true,
            description = "Print progress to standard error (default: if a terminal is attached).")
    private Boolean progress;

    int threads() {
        return Choices.threads(threads);
    }

    /** Where progress is told, if it is. */
    Progress progress(Terminal terminal) {
        return terminal.progress(progress);
    }
}
