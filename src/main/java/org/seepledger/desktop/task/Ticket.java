package org.seepledger.desktop.task;

import java.util.concurrent.Future;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Whether a piece of work still counts. */
final class Ticket implements Progress {

    private volatile boolean stale;
    private volatile Future<?> waiting;

    void waitsIn(Future<?> future) {
        waiting = future;
    }

    /** Work that runs is not interrupted: files that are being read would be closed under others' hands. */
    void tearUp() {
        stale = true;
        Future<?> future = waiting;
        if (future != null) {
            future.cancel(false);
        }
    }

    boolean isStale() {
        return stale;
    }

    @Override
    public void begin(String what, long steps) {
        step();
    }

    @Override
    public void step() {
        if (stale) {
            throw new Cancelled();
        }
    }
}
