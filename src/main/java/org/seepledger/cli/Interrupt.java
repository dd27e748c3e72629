package org.seepledger.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/** Ctrl-C: asks the work to stop, and gives it the time to clear away what it had begun. */
final class Interrupt {

    private static final int SECONDS_TO_CLEAR_AWAY = 20;

    private final CountDownLatch finished = new CountDownLatch(1);
    private volatile boolean asked;

    boolean isAsked() {
        return asked;
    }

    /** The work is done, or undone. */
    void finished() {
        finished.countDown();
    }

    /** Asks the work to stop and waits until it has. */
    void stopAndWait() {
        asked = true;
        try {
            finished.await(SECONDS_TO_CLEAR_AWAY, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
