package org.seepledger.desktop.shell;

import javafx.application.Platform;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.value.ObservableDoubleValue;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.SplitPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.Region;
import org.seepledger.desktop.port.Settings;
import org.seepledger.desktop.words.Words;

/** The last pane of a split: it can be folded away, and how large it is stays from run to run. */
final class Fold {

    private final SplitPane split;
    private final Node pane;
    private final Settings settings;
    private String key;
    private final BooleanProperty open = new SimpleBooleanProperty(true);
    private double least;
    private double share;
    private double size;

    /**
     * Puts a pane last into a split.
     *
     * @param split the split
     * @param pane the pane
     * @param least how large it is at first, in logical pixels, at least
     * @param share how large it is at first, as a share of the split, at least
     * @param settings keep its size
     * @param key under which
     */
    Fold(SplitPane split, Node pane, double least, double share, Settings settings, String key) {
        this.split = split;
        this.pane = pane;
        this.settings = settings;
        this.key = key;
        this.least = least;
        this.share = share;
        this.size = settings.get(key).map(Fold::number).orElse(0.0);
        SplitPane.setResizableWithParent(pane, false);
        add();
        // What the hand has not sized grows with the window, once the split has laid itself out.
        length().addListener((length, before, after) -> {
            if (before.doubleValue() <= 0) {
                place();
            } else if (size <= 0) {
                Platform.runLater(this::place);
            }
        });
        open.addListener((shown, before, after) -> {
            if (after) {
                add();
            } else {
                split.getItems().remove(pane);
            }
        });
    }

    /** What was written by hand or by another version is no reason to fail. */
    private static double number(String text) {
        try {
            return Math.max(0, Math.min(10_000, Double.parseDouble(text)));
        } catch (NumberFormatException e) {
            return 0;
        }
    }

    private ObservableDoubleValue length() {
        return split.getOrientation() == Orientation.HORIZONTAL ? split.widthProperty() : split.heightProperty();
    }

    private void add() {
        split.getItems().add(pane);
        place();
        split.getDividers()
                .get(split.getDividers().size() - 1)
                .positionProperty()
                .addListener((position, before, after) -> keep(after.doubleValue()));
    }

    private void place() {
        double length = length().get();
        if (length > 0) {
            double wanted = size > 0 ? size : Math.max(least, share * length);
            split.setDividerPosition(split.getDividers().size() - 1, Math.max(0.2, 1 - wanted / length));
        }
    }

    /** What the hand has dragged is kept; a window that is enlarged moves the divider too, but leaves the size. */
    private void keep(double position) {
        double dragged = Math.rint((1 - position) * length().get());
        if (dragged > 0 && Math.abs(dragged - size) > 1 && isHeld()) {
            size = dragged;
            settings.put(key, Double.toString(size));
        }
    }

    private boolean isHeld() {
        return split.lookupAll(".split-pane-divider").stream().anyMatch(Node::isPressed);
    }

    /** The pane shows something else, whose size is kept by itself. */
    void take(String otherKey, double otherLeast, double otherShare) {
        key = otherKey;
        least = otherLeast;
        share = otherShare;
        size = settings.get(key).map(Fold::number).orElse(0.0);
        place();
    }

    /** Shows the pane, if it is folded away. */
    void show() {
        open.set(true);
    }

    /** Folds the pane away, or shows it again. */
    void turn() {
        open.set(!open.get());
    }

    /** A button that does it. */
    ToggleButton button(String id, String words) {
        ToggleButton button = new ToggleButton();
        button.setId(id);
        button.getStyleClass().setAll("sl-fold");
        button.setGraphic(new Region());
        button.setAccessibleText(Words.of(words));
        button.setTooltip(new Tooltip(Words.of(words)));
        button.selectedProperty().bindBidirectional(open);
        return button;
    }
}
