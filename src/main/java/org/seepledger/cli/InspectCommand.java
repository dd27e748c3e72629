package org.seepledger.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.seepledger.job.InspectJob;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code seepledger inspect}. */
@Command(
        name = "inspect",
        description =
                "Reads everything that an aquifer folder has and prints its grid, layers, times, units and ranges of"
                        + " values, how the set balances in itself, cell by cell, and what looks wrong.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Example: look at the sample before drawing anything.",
            "  seepledger inspect sample-aquifers/terrace"
        })
final class InspectCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(paramLabel = "AQUIFER", description = "The folder with aquifer.json.")
    private Path aquifer;

    @Mixin
    private WorkOptions work = new WorkOptions();

    InspectCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        terminal.out().print(InspectJob.run(aquifer, work.threads(), work.progress(terminal)));
        return 0;
    }
}
