package org.seepledger.desktop.session;

import java.util.Optional;
import java.util.function.UnaryOperator;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Shape;

/** How a pane changes what is drawn: in steps that can be undone, all in one history. */
public interface Drafting {

    /** {@return the selected shape, if there is one} */
    Optional<Shape> selected();

    /**
     * Takes a step at once, or tells in the status line why it is refused.
     *
     * @param name the key of the step's name
     * @param change makes the next drawing
     * @return whether it was taken
     */
    boolean step(String name, UnaryOperator<Drawing> change);

    /**
     * Begins a gesture.
     *
     * @param name the key of the name that its step will have
     */
    void beginGesture(String name);

    /**
     * Shows what a gesture would do; what is refused leaves the last preview.
     *
     * @param change makes the drawing from the one before the gesture
     */
    void preview(UnaryOperator<Drawing> change);

    /** Ends a gesture, which becomes one step. */
    void commitGesture();

    /** Gives a gesture up: everything is again as it was, to the last bit. */
    void cancelGesture();

    /** {@return whether a gesture goes on} */
    boolean isGesturing();
}
