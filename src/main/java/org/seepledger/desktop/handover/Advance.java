package org.seepledger.desktop.handover;

import org.seepledger.progress.Progress;

/** How far work is, told by the thread that does it and asked by the window now and then. */
final class Advance implements Progress {

    private final Progress ticket;
    private volatile String stage = "";
    private volatile long steps;
    private volatile long done;

    /**
     * Begins.
     *
     * @param ticket asked whether the work is to stop
     */
    Advance(Progress ticket) {
        this.ticket = ticket;
    }

    @Override
    public void begin(String what, long count) {
        ticket.begin(what, count);
        stage = what;
        steps = count;
        done = 0;
    }

    /** Steps may be told by several threads. */
    @Override
    public void step() {
        ticket.step();
        synchronized (this) {
            done++;
        }
    }

    /** What is being done. */
    String stage() {
        return stage;
    }

    /** How much of it is done, from 0 to 1. */
    double share() {
        return steps == 0 ? 0 : Math.min(1, (double) done / steps);
    }
}
