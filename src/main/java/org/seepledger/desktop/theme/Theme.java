package org.seepledger.desktop.theme;

import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Collectors;
import org.seepledger.picture.Ink;
import org.seepledger.picture.Palette;

/** How the window is lit. */
public enum Theme {
    /** Ink on paper. */
    LIGHT(0xf1f0ea),
    /** For dim rooms. */
    DARK(0x202528);

    private final Ink.Rgb ground;

    Theme(int ground) {
        this.ground = new Ink.Rgb(ground);
    }

    /** {@return the other one} */
    public Theme other() {
        return this == LIGHT ? DARK : LIGHT;
    }

    /** {@return the colours of inks} */
    public Palette palette() {
        return this == LIGHT ? Palette.LIGHT : Palette.DARK;
    }

    /** {@return the colour of the map where nothing lies on it} */
    public Ink.Rgb ground() {
        return ground;
    }

    /** The inks as looked-up colours of the style sheet, {@code -sl-gain} and so on. */
    String inks() {
        return Arrays.stream(Ink.Token.values())
                .map(token -> "-sl-" + token.name().toLowerCase(Locale.ROOT) + ": "
                        + palette().colour(token) + ";")
                .collect(Collectors.joining(" "));
    }

    /** The style class that the root has. */
    String styleClass() {
        return this == LIGHT ? "sl-light" : "sl-dark";
    }
}
