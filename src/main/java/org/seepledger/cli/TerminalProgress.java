package org.seepledger.cli;

import java.io.PrintStream;
import java.time.Duration;
import java.util.Locale;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Prints how far the work is and how long it will take, now and then. */
final class TerminalProgress implements Progress {

    private static final long EVERY_NANOS = 500_000_000L;

    private final PrintStream err;
    private final Interrupt interrupt;
    private String what = "";
    private long steps;
    private long done;
    private long began;
    private long printed;

    TerminalProgress(PrintStream err, Interrupt interrupt) {
        this.err = err;
        this.interrupt = interrupt;
    }

    @Override
    public synchronized void begin(String work, long count) {
        stopIfAsked();
        what = work;
        steps = count;
        done = 0;
        began = System.nanoTime();
        printed = began;
        err.println(what + ": " + steps + (steps == 1 ? " step" : " steps"));
    }

    private void stopIfAsked() {
        if (interrupt.isAsked()) {
            throw new Cancelled();
        }
    }

    @Override
    public synchronized void step() {
        stopIfAsked();
        done++;
        long now = System.nanoTime();
        if (now - printed >= EVERY_NANOS && done < steps) {
            printed = now;
            long left = (now - began) / done * (steps - done);
            long seconds = Duration.ofNanos(left).toSeconds() + 1;
            err.println(
                    String.format(Locale.ROOT, "%s: %.0f %%, about %d s left", what, 100.0 * done / steps, seconds));
        }
    }
}
