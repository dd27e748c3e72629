package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.List;
import java.util.function.Consumer;
import org.seepledger.progress.Progress;

/** Tasks that run at once, so that a view model can be tested step by step. */
public final class DirectTasks implements Tasks {

    @Override
    public Lane latest(String name) {
        return new DirectLane();
    }

    @Override
    public Lane each(String name, int threads) {
        return new DirectLane();
    }

    @Override
    public List<Running> running() {
        return List.of();
    }

    @Override
    public void close() {}

    private static final class DirectLane implements Lane {

        @Override
        public <T> void runAfter(Duration delay, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
            T result;
            try {
                result = work.call(Progress.NONE);
            } catch (Exception | Error e) {
                failed.accept(e);
                return;
            }
            done.accept(result);
        }

        @Override
        public void cancel() {}
    }
}
