package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.function.Consumer;

/** Where work of one kind runs. Called from the window's own thread, and answers there. */
public interface Lane {

    /**
     * Begins work after a while, unless newer work or a cancel comes first.
     *
     * @param <T> what the work gives
     * @param delay how long to wait
     * @param work the work
     * @param done gets its result, unless the work has become stale
     * @param failed gets what went wrong, unless the work has become stale
     */
    <T> void runAfter(Duration delay, Work<T> work, Consumer<T> done, Consumer<Throwable> failed);

    /**
     * Begins work as soon as a thread is free.
     *
     * @param <T> what the work gives
     * @param work the work
     * @param done gets its result, unless the work has become stale
     * @param failed gets what went wrong, unless the work has become stale
     */
    default <T> void run(Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        runAfter(Duration.ZERO, work, done, failed);
    }

    /** Makes all work of the lane stale. */
    void cancel();
}
