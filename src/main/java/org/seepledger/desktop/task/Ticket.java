package org.seepledger.desktop.task;

import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicLong;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Whether a piece of work still counts, and how far it is. */
final class Ticket implements Progress {

    private final AtomicLong done = new AtomicLong();
    private final AtomicInteger stretch = new AtomicInteger();
    private volatile long steps;
    private volatile boolean stale;
    private volatile boolean running;
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

    void runs(boolean now) {
        running = now;
    }

    boolean isRunning() {
        return running && !stale;
    }

    int stretch() {
        return stretch.get();
    }

    double share() {
        long all = steps;
        return all > 0 ? Math.min(1, (double) done.get() / all) : Double.NaN;
    }

    @Override
    public void begin(String what, long count) {
        done.set(0);
        steps = count;
        stretch.incrementAndGet();
        mustCount();
    }

    @Override
    public void step() {
        done.incrementAndGet();
        mustCount();
    }

    private void mustCount() {
        if (stale) {
            throw new Cancelled();
        }
    }
}
