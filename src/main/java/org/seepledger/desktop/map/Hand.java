package org.seepledger.desktop.map;

import java.util.List;
import org.seepledger.picture.Mark;

/** Who works on the map with the mouse; what it does not take drags the map. */
public interface Hand {

    /**
     * {@return whether the press is taken}
     *
     * @param touch where
     */
    boolean press(Touch touch);

    /**
     * The mouse has moved with its button down.
     *
     * @param touch where
     */
    void drag(Touch touch);

    /**
     * The button was let go.
     *
     * @param touch where
     */
    void release(Touch touch);

    /**
     * The mouse has moved.
     *
     * @param touch where
     */
    void hover(Touch touch);

    /**
     * The second press of a double-click.
     *
     * @param touch where
     */
    void doubleClick(Touch touch);

    /** {@return what a press would do where the mouse is} */
    Aim aim();

    /**
     * {@return what is drawn over the map}
     *
     * @param camera which part of the map is seen
     */
    List<Mark> marks(Camera camera);
}
