package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.Executor;
import java.util.concurrent.ScheduledThreadPoolExecutor;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.seepledger.progress.Cancelled;

/** A lane with threads of its own. */
final class BackgroundLane implements Lane {

    private final String name;
    private final boolean onlyLatest;
    private final Executor window;
    private final ScheduledThreadPoolExecutor threads;
    private final Map<Ticket, Consumer<Throwable>> open = new ConcurrentHashMap<>();

    BackgroundLane(String name, int count, boolean onlyLatest, Executor window) {
        this.name = name;
        this.onlyLatest = onlyLatest;
        this.window = window;
        this.threads = new ScheduledThreadPoolExecutor(count, work -> {
            Thread thread = new Thread(work, name);
            thread.setDaemon(true);
            return thread;
        });
        threads.setRemoveOnCancelPolicy(true);
        // What is still asked for when the window has closed is not done.
        threads.setRejectedExecutionHandler(new ThreadPoolExecutor.DiscardPolicy());
        threads.setExecuteExistingDelayedTasksAfterShutdownPolicy(false);
    }

    @Override
    public <T> void runAfter(Duration delay, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        if (onlyLatest) {
            cancel();
        }
        Ticket ticket = new Ticket();
        open.put(ticket, failed);
        ticket.waitsIn(
                threads.schedule(() -> carryOut(ticket, work, done, failed), delay.toNanos(), TimeUnit.NANOSECONDS));
    }

    /** Errors too are told, so that a pane never waits for work that has died. */
    private <T> void carryOut(Ticket ticket, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        if (ticket.isStale()) {
            return;
        }
        ticket.runs(true);
        try {
            T result = work.call(ticket);
            answer(ticket, () -> done.accept(result), () -> threads.execute(() -> putAway(result)));
        } catch (Exception | Error e) {
            answer(ticket, () -> failed.accept(e), () -> {});
        } finally {
            ticket.runs(false);
        }
    }

    private void answer(Ticket ticket, Runnable told, Runnable unheard) {
        window.execute(() -> {
            open.remove(ticket);
            if (!ticket.isStale()) {
                told.run();
            } else if (!threads.isShutdown()) {
                unheard.run();
            }
        });
    }

    /** A result that nobody hears of keeps no files open. */
    private static void putAway(Object result) {
        if (result instanceof AutoCloseable open) {
            try {
                open.close();
            } catch (Exception e) {
                // Nobody asks for it any more, so nobody need know.
            }
        }
    }

    @Override
    public void cancel() {
        for (Ticket ticket : open.keySet()) {
            ticket.tearUp();
            open.remove(ticket);
        }
    }

    Stream<Running> running() {
        return open.keySet().stream().filter(Ticket::isRunning).map(Errand::new);
    }

    /** A piece of work of this lane. */
    private final class Errand implements Running {

        private final Ticket ticket;

        Errand(Ticket ticket) {
            this.ticket = ticket;
        }

        @Override
        public String name() {
            return name;
        }

        @Override
        public double share() {
            return ticket.share();
        }

        @Override
        public int stretch() {
            return ticket.stretch();
        }

        @Override
        public boolean listens() {
            return ticket.stretch() > 0;
        }

        @Override
        public void stop() {
            ticket.tearUp();
            Optional.ofNullable(open.remove(ticket)).ifPresent(failed -> failed.accept(new Cancelled()));
        }

        /** The same work, whenever it is asked for. */
        @Override
        public boolean equals(Object other) {
            return other instanceof Errand errand && errand.ticket == ticket;
        }

        @Override
        public int hashCode() {
            return ticket.hashCode();
        }
    }

    void close() {
        cancel();
        threads.shutdown();
    }
}
