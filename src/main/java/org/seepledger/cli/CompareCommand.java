package org.seepledger.cli;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.concurrent.Callable;
import org.seepledger.job.CompareJob;
import org.seepledger.job.CompareRequest;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code seepledger compare}. */
@Command(
        name = "compare",
        description =
                "Puts two runs of balance side by side, and tells which part of each difference is due to the area, the"
                        + " period, the inputs and the unit. The parts add to the difference.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "The parts are told by striking the budgets again, each run's inputs with each run's prisms and periods; this needs"
                    + " the inputs of both runs where they were, unchanged. Without them the differences alone are given.",
            "",
            "Example: the budgets before and after a change.",
            "  seepledger compare budget-before budget-after --out comparison",
            "",
            "Written to DIR: compare.html (to read), differences.csv, inputs.csv (inputs by hash), run.json.",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong."
        })
final class CompareCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Parameters(index = "0", paramLabel = "FIRST", description = "The folder that the first run of balance wrote.")
    private Path first;

    @Parameters(index = "1", paramLabel = "SECOND", description = "The folder that the second run wrote.")
    private Path second;

    @Mixin
    private OutputOptions output = new OutputOptions();

    @Mixin
    private WorkOptions work = new WorkOptions();

    CompareCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        CompareRequest request = new CompareRequest(
                first, second, output.folder(), work.threads(), output.overwrite(), LocalDate.now(terminal.clock()));
        terminal.out().print(CompareJob.run(request, work.progress(terminal)));
        return 0;
    }
}
