package org.seepledger.desktop.task;

/** A piece of work that is being done beside the window. Asked on the window's own thread. */
public interface Running {

    /** {@return the key of the words that say what it is} */
    String name();

    /** {@return how far its present stretch is, from 0 to 1; NaN where that is not known} */
    double share();

    /** {@return which stretch of the work it is in, counted up: a new one begins at 0 again} */
    int stretch();

    /** {@return whether it can be stopped: it asks now and then whether it still counts} */
    boolean listens();

    /**
     * Stops it: whoever asked for it is told at once by {@link org.seepledger.progress.Cancelled}, and the work ends the
     * next time it asks.
     */
    void stop();
}
