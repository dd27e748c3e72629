package org.seepledger.desktop.task;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.Executor;

/** Tasks on daemon threads, so that none keeps the program alive. */
public final class BackgroundTasks implements Tasks {

    private final Executor window;
    private final List<BackgroundLane> lanes = new CopyOnWriteArrayList<>();

    /**
     * Makes tasks.
     *
     * @param window runs answers on the window's own thread
     */
    public BackgroundTasks(Executor window) {
        this.window = window;
    }

    @Override
    public Lane latest(String name) {
        return added(new BackgroundLane(name, 1, true, window));
    }

    @Override
    public Lane each(String name, int threads) {
        return added(new BackgroundLane(name, threads, false, window));
    }

    private Lane added(BackgroundLane lane) {
        lanes.add(lane);
        return lane;
    }

    @Override
    public List<Running> running() {
        return lanes.stream().flatMap(BackgroundLane::running).toList();
    }

    @Override
    public void close() {
        lanes.forEach(BackgroundLane::close);
    }
}
