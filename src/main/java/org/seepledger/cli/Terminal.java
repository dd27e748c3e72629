package org.seepledger.cli;

import java.io.OutputStream;
import java.io.PrintStream;
import java.time.Clock;
import org.seepledger.progress.Progress;

/**
 * Where a command prints, and what time it is there.
 *
 * @param out results
 * @param err progress and faults
 * @param interrupt told when the user wants the work to stop
 * @param interactive whether a person watches
 * @param clock what tells the date
 */
record Terminal(PrintStream out, PrintStream err, Interrupt interrupt, boolean interactive, Clock clock) {

    /** Progress as the user wants it: shown if asked for or if a person watches, but not if declined. */
    Progress progress(Boolean wanted) {
        boolean shown = wanted == null ? interactive : wanted;
        return new TerminalProgress(shown ? err : new PrintStream(OutputStream.nullOutputStream()), interrupt);
    }
}
