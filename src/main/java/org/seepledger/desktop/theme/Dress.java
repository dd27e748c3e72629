package org.seepledger.desktop.theme;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import javafx.application.Application;
import javafx.beans.value.ObservableValue;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.paint.Color;

/** Dresses a scene in a theme, and again whenever the theme changes. */
public final class Dress {

    private static final String SHEET =
            Dress.class.getResource("seepledger.css").toExternalForm();

    private Dress() {}

    /**
     * Dresses a scene.
     *
     * @param scene the scene
     * @param theme the theme
     */
    public static void put(Scene scene, ObservableValue<Theme> theme) {
        scene.getStylesheets().add(SHEET);
        wear(scene, theme.getValue());
        theme.addListener((now, before, after) -> wear(scene, after));
    }

    /** The map has no ground of its own but the scene's, which costs nothing to paint, however often the map moves. */
    private static void wear(Scene scene, Theme theme) {
        scene.setFill(Color.web(theme.ground().toString()));
        Parent root = scene.getRoot();
        Application.setUserAgentStylesheet(
                theme == Theme.LIGHT
                        ? new PrimerLight().getUserAgentStylesheet()
                        : new PrimerDark().getUserAgentStylesheet());
        root.getStyleClass().removeAll(Theme.LIGHT.styleClass(), Theme.DARK.styleClass());
        root.getStyleClass().add(theme.styleClass());
        root.setStyle(theme.inks());
    }
}
