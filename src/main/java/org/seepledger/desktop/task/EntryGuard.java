package org.seepledger.desktop.task;

import javafx.application.Platform;

/** Stands where engine and file work begins, and throws when the window's own thread comes in. */
public final class EntryGuard {

    private static final boolean ON = Boolean.getBoolean("seepledger.guard");

    private EntryGuard() {}

    /**
     * Lets the caller in.
     *
     * @throws IllegalStateException if the guard is on and the caller is the window's own thread: the hand would have to
     *     wait for it
     */
    public static void enter() {
        if (ON && Platform.isFxApplicationThread()) {
            throw new IllegalStateException("engine or file work has begun on the window's own thread");
        }
    }
}
