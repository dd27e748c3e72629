package org.seepledger.desktop.theme;

/** How the window is lit. */
public enum Theme {
    /** Ink on paper. */
    LIGHT,
    /** For dim rooms. */
    DARK;

    /** {@return the other one} */
    public Theme other() {
        return this == LIGHT ? DARK : LIGHT;
    }

    /** The style class that the root has. */
    String styleClass() {
        return this == LIGHT ? "sl-light" : "sl-dark";
    }
}
