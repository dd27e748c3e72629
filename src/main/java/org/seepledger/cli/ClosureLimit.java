package org.seepledger.cli;

import java.io.PrintStream;
import org.seepledger.fault.UsageFault;
import picocli.CommandLine.Option;

/** How badly a budget may close before a command says so by its exit status. */
final class ClosureLimit {

    @Option(
            names = "--max-closure-error",
            paramLabel = "PERCENT",
            description = "End with status 4 if a closure error of any budget is larger, whatever its sign.")
    private Double most;

    /** Makes sure that what was asked for can be held against a closure error. */
    void check() {
        if (most != null && !(most >= 0)) {
            throw new UsageFault("--max-closure-error is " + most + "; give a percentage of 0 or more.");
        }
    }

    /** The exit status, and a line that says why it is what it is where that is not plain. */
    int status(double worst, PrintStream out) {
        if (most != null && worst > most) {
            out.println("The worst closure error is " + worst + " %, more than the " + most + " % allowed.");
            return Faults.CLOSURE;
        }
        if (most != null && Double.isNaN(worst)) {
            out.println("No closure error can be given, so that --max-closure-error was not checked.");
        }
        return 0;
    }
}
