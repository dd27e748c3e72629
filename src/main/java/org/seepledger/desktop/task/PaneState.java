package org.seepledger.desktop.task;

/**
 * What a pane has to show.
 *
 * @param phase which of the four states it is in
 * @param words what it says of it; empty when ready
 */
public record PaneState(Phase phase, String words) {

    /** The four states of a pane. */
    public enum Phase {
        /** There is nothing yet; one action leads on. */
        EMPTY,
        /** Work is going on; the old content stays, dimmed. */
        WORKING,
        /** The content holds. */
        READY,
        /** It went wrong, and the words say how. */
        FAILED
    }

    /** The content holds. */
    public static final PaneState READY = new PaneState(Phase.READY, "");

    /**
     * {@return nothing yet}
     *
     * @param words what to do
     */
    public static PaneState empty(String words) {
        return new PaneState(Phase.EMPTY, words);
    }

    /**
     * {@return work going on}
     *
     * @param words what is being done
     */
    public static PaneState working(String words) {
        return new PaneState(Phase.WORKING, words);
    }

    /**
     * {@return a failure}
     *
     * @param words what went wrong, with the remedy
     */
    public static PaneState failed(String words) {
        return new PaneState(Phase.FAILED, words);
    }
}
