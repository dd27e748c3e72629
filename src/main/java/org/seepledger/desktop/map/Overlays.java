package org.seepledger.desktop.map;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;

/** What is drawn over the values. */
public final class Overlays {

    private final BooleanProperty contours = new SimpleBooleanProperty(true);
    private final BooleanProperty arrows = new SimpleBooleanProperty(true);
    private final BooleanProperty wells = new SimpleBooleanProperty(true);
    private final BooleanProperty lines = new SimpleBooleanProperty(true);

    Overlays() {}

    /** {@return whether lines of equal value are drawn} */
    public BooleanProperty contours() {
        return contours;
    }

    /** {@return whether arrows of flux are drawn} */
    public BooleanProperty arrows() {
        return arrows;
    }

    /** {@return whether wells are drawn} */
    public BooleanProperty wells() {
        return wells;
    }

    /** {@return whether grid lines are drawn when they are far enough apart} */
    public BooleanProperty lines() {
        return lines;
    }
}
