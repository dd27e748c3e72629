package org.seepledger.desktop.pane;

import javafx.beans.binding.Bindings;
import javafx.scene.control.Labeled;

/** What words keep where a line is too short for all that stands in it. */
public final class ShortOfRoom {

    private ShortOfRoom() {}

    /**
     * Lets words keep their room, or of long ones a part.
     *
     * @param words the words
     * @param most how much of it they keep at the most, in logical pixels
     */
    public static void keep(Labeled words, double most) {
        words.minWidthProperty()
                .bind(Bindings.createDoubleBinding(
                        () -> Math.min(most, words.prefWidth(-1)),
                        words.textProperty(),
                        words.fontProperty(),
                        words.skinProperty()));
    }
}
