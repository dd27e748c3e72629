package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.Executor;
import java.util.concurrent.ScheduledThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;

/** A lane with threads of its own. */
final class BackgroundLane implements Lane {

    private final boolean onlyLatest;
    private final Executor window;
    private final ScheduledThreadPoolExecutor threads;
    private final Set<Ticket> open = ConcurrentHashMap.newKeySet();

    BackgroundLane(String name, int count, boolean onlyLatest, Executor window) {
        this.onlyLatest = onlyLatest;
        this.window = window;
        this.threads = new ScheduledThreadPoolExecutor(count, work -> {
            Thread thread = new Thread(work, name);
            thread.setDaemon(true);
            return thread;
        });
        threads.setRemoveOnCancelPolicy(true);
        threads.setExecuteExistingDelayedTasksAfterShutdownPolicy(false);
    }

    @Override
    public <T> void runAfter(Duration delay, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        if (onlyLatest) {
            cancel();
        }
        Ticket ticket = new Ticket();
        open.add(ticket);
        ticket.waitsIn(
                threads.schedule(() -> carryOut(ticket, work, done, failed), delay.toNanos(), TimeUnit.NANOSECONDS));
    }

    /** Errors too are told, so that a pane never waits for work that has died. */
    private <T> void carryOut(Ticket ticket, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        if (ticket.isStale()) {
            return;
        }
        try {
            T result = work.call(ticket);
            answer(ticket, () -> done.accept(result));
        } catch (Exception | Error e) {
            answer(ticket, () -> failed.accept(e));
        }
    }

    private void answer(Ticket ticket, Runnable told) {
        window.execute(() -> {
            open.remove(ticket);
            if (!ticket.isStale()) {
                told.run();
            }
        });
    }

    @Override
    public void cancel() {
        for (Ticket ticket : open) {
            ticket.tearUp();
            open.remove(ticket);
        }
    }

    void close() {
        cancel();
        threads.shutdown();
    }
}
