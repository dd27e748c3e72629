package org.seepledger.desktop.task;

import java.util.List;

/** Runs work beside the window. */
public interface Tasks extends AutoCloseable {

    /**
     * {@return a lane in which only the latest work counts: whatever was begun before is cancelled and not heard of again}
     *
     * @param name the key of the words that say what is done there, as {@code task.opening}
     */
    Lane latest(String name);

    /**
     * {@return a lane in which all work counts until the lane is cancelled}
     *
     * @param name the key of the words that say what is done there, as {@code task.opening}
     * @param threads how many pieces of work may run at the same time
     */
    Lane each(String name, int threads);

    /** {@return what is being done now, in no order} */
    List<Running> running();

    /** Cancels everything. */
    @Override
    void close();
}
