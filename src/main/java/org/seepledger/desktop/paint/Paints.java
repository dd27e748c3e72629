package org.seepledger.desktop.paint;

import javafx.scene.paint.Color;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Ink;

/** The colours of inks in a theme. */
final class Paints {

    private Paints() {}

    /**
     * {@return an ink's colour}
     *
     * @param ink the ink
     * @param opacity from 0 to 1
     * @param theme the theme
     */
    static Color of(Ink ink, double opacity, Theme theme) {
        int rgb = theme.palette().colour(ink).value();
        return Color.rgb(rgb >> 16 & 0xff, rgb >> 8 & 0xff, rgb & 0xff, opacity);
    }
}
