package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.function.Consumer;
import org.seepledger.progress.Cancelled;

/** Tasks that wait until a test lets them go on, one at a time. */
public final class HeldTasks implements Tasks {

    private final Deque<Held> waiting = new ArrayDeque<>();

    /** A piece of work, and who is told when it is stopped. */
    private record Held(Runnable run, Consumer<Throwable> failed) {}

    /** {@return how many pieces of work wait} */
    public int waiting() {
        return waiting.size();
    }

    /** Does the piece of work that has waited longest. */
    public void next() {
        waiting.remove().run().run();
    }

    /** Stops the piece of work that has waited longest. */
    public void stop() {
        waiting.remove().failed().accept(new Cancelled());
    }

    /** Does all work, and what follows from it. */
    public void all() {
        while (!waiting.isEmpty()) {
            next();
        }
    }

    @Override
    public Lane latest(String name) {
        return new HeldLane(waiting);
    }

    @Override
    public Lane each(String name, int threads) {
        return new HeldLane(waiting);
    }

    @Override
    public List<Running> running() {
        return List.of();
    }

    @Override
    public void close() {
        waiting.clear();
    }

    /** Keeps one piece of work. */
    private static final class HeldLane implements Lane {

        private final Deque<Held> waiting;
        private Held own;

        HeldLane(Deque<Held> waiting) {
            this.waiting = waiting;
        }

        @Override
        public <T> void runAfter(Duration delay, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
            cancel();
            own = new Held(() -> carryOut(work, done, failed), failed);
            waiting.add(own);
        }

        private static <T> void carryOut(Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
            new DirectTasks().latest("").run(work, done, failed);
        }

        @Override
        public void cancel() {
            waiting.remove(own);
        }
    }
}
