package org.seepledger.desktop.theme;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import javafx.application.Application;
import javafx.beans.value.ObservableValue;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.paint.Color;

/** Dresses a scene in a theme, and again whenever the theme changes. */
public final class Dress {

    private static final String SHEET =
            Dress.class.getResource("seepledger.css").toExternalForm();

    private static final int USUAL_LETTERS = 13;

    private Dress() {}

    /**
     * Dresses a scene.
     *
     * @param scene the scene
     * @param theme the theme
     * @param size how large everything is, in percent: menus and tips are no part of the scene, and are told by a sheet
     */
    public static void put(Scene scene, ObservableValue<Theme> theme, ObservableValue<Integer> size) {
        wear(scene, theme.getValue());
        enlargeMenus(scene, size.getValue());
        size.addListener((now, before, after) -> enlargeMenus(scene, after));
        theme.addListener((now, before, after) -> wear(scene, after));
    }

    private static void enlargeMenus(Scene scene, int percent) {
        String rule =
                ".context-menu, .combo-box-popup, .tooltip { -fx-font-size: " + USUAL_LETTERS * percent / 100 + "px; }";
        String sheet =
                "data:text/css;base64," + Base64.getEncoder().encodeToString(rule.getBytes(StandardCharsets.UTF_8));
        scene.getStylesheets().setAll(SHEET, sheet);
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
