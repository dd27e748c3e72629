package org.seepledger.desktop.task;

import org.seepledger.progress.Progress;

/**
 * A piece of work beside the window.
 *
 * @param <T> what it gives
 */
@FunctionalInterface
public interface Work<T> {

    /**
     * {@return the result}
     *
     * @param progress asked now and then; throws {@link org.seepledger.progress.Cancelled} when the work is stale
     * @throws Exception if something goes wrong
     */
    T call(Progress progress) throws Exception;
}
