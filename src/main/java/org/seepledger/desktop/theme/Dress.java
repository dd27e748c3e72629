package org.seepledger.desktop.theme;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import javafx.application.Application;
import javafx.beans.value.ObservableValue;
import javafx.scene.Parent;
import javafx.scene.Scene;

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
        wear(scene.getRoot(), theme.getValue());
        theme.addListener((now, before, after) -> wear(scene.getRoot(), after));
    }

    private static void wear(Parent root, Theme theme) {
        Application.setUserAgentStylesheet(
                theme == Theme.LIGHT
                        ? new PrimerLight().getUserAgentStylesheet()
                        : new PrimerDark().getUserAgentStylesheet());
        root.getStyleClass().removeAll(Theme.LIGHT.styleClass(), Theme.DARK.styleClass());
        root.getStyleClass().add(theme.styleClass());
        root.setStyle(theme.inks());
    }
}
