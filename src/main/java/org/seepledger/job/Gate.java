package org.seepledger.job;

import java.util.concurrent.locks.ReadWriteLock;
import java.util.concurrent.locks.ReentrantReadWriteLock;
import java.util.function.Function;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Lets questions in from any thread while it is open; shutting it stops those within and waits until they have left. */
final class Gate {

    private final ReadWriteLock lock = new ReentrantReadWriteLock();
    private volatile boolean shut;

    /** Answers a question, whose progress ends it when the gate is shut. */
    <T> T ask(Progress progress, Function<Progress, T> question) {
        lock.readLock().lock();
        try {
            mustBeOpen();
            return question.apply(untilShut(progress));
        } finally {
            lock.readLock().unlock();
        }
    }

    private Progress untilShut(Progress progress) {
        return new Progress() {
            @Override
            public void begin(String what, long steps) {
                mustBeOpen();
                progress.begin(what, steps);
            }

            @Override
            public void step() {
                mustBeOpen();
                progress.step();
            }
        };
    }

    void mustBeOpen() {
        if (shut) {
            throw new Cancelled();
        }
    }

    /** Shuts it, then does what must wait until nobody is within. */
    void shut(Runnable last) {
        shut = true;
        lock.writeLock().lock();
        try {
            last.run();
        } finally {
            lock.writeLock().unlock();
        }
    }
}
