package org.seepledger.desktop.task;

/** Runs work beside the window. */
public interface Tasks extends AutoCloseable {

    /**
     * {@return a lane in which only the latest work counts: whatever was begun before is cancelled and not heard of again}
     *
     * @param name what the lane is for
     */
    Lane latest(String name);

    /**
     * {@return a lane in which all work counts until the lane is cancelled}
     *
     * @param name what the lane is for
     * @param threads how many pieces of work may run at the same time
     */
    Lane each(String name, int threads);

    /** Cancels everything. */
    @Override
    void close();
}
