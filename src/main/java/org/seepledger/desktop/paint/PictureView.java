package org.seepledger.desktop.paint;

import java.util.Optional;
import java.util.function.DoubleFunction;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleRole;
import javafx.scene.layout.Region;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Picture;

/** A picture that is drawn anew for each size, and as high as it needs to be where it is given no height. */
public final class PictureView extends Region {

    private final ForSize pictures;
    /** Whether pictures fill their room, and get lower with it, down to where they need more. */
    private final boolean fills;

    private final ObservableValue<Theme> theme;
    private final SharpCanvas canvas = new SharpCanvas(this::redraw);
    private double drawnWidth = Double.NaN;
    private double drawnHeight = Double.NaN;

    /** Gives the picture for a size. */
    @FunctionalInterface
    public interface ForSize {

        /**
         * {@return the picture, if there is one}
         *
         * @param width in logical pixels
         * @param height in logical pixels
         */
        Optional<Picture> of(double width, double height);
    }

    /**
     * Shows pictures that are as high as they need to be.
     *
     * @param pictures gives the picture for a width in logical pixels, if there is one
     * @param theme gives its inks their colours
     */
    public PictureView(DoubleFunction<Optional<Picture>> pictures, ObservableValue<Theme> theme) {
        this((width, height) -> pictures.apply(width), false, theme);
    }

    /**
     * Shows pictures that fill their room.
     *
     * @param pictures gives the picture for a size
     * @param theme gives its inks their colours
     */
    public PictureView(ForSize pictures, ObservableValue<Theme> theme) {
        this(pictures, true, theme);
    }

    private PictureView(ForSize pictures, boolean fills, ObservableValue<Theme> theme) {
        this.pictures = pictures;
        this.fills = fills;
        this.theme = theme;
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        getChildren().add(canvas);
        theme.addListener((now, before, after) -> redraw());
    }

    /** Draws it anew, since what it shows has changed. */
    public void redraw() {
        drawnWidth = Double.NaN;
        if (fills) {
            setMinHeight(0);
        }
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight());
        if (width > 0 && (width != drawnWidth || height != drawnHeight)) {
            drawnWidth = width;
            drawnHeight = height;
            pictures.of(width, height).ifPresentOrElse(this::draw, this::clear);
        }
    }

    private void draw(Picture picture) {
        canvas.size(picture.width(), picture.height());
        canvas.context().clearRect(0, 0, picture.width(), picture.height());
        new MarkPainter(canvas.context(), theme.getValue()).paint(picture.marks());
        setAccessibleText(picture.title() + ". " + picture.description());
        setPrefHeight(picture.height());
        if (!fills || picture.height() > drawnHeight) {
            setMinHeight(picture.height());
        } else if (drawnHeight > getMinHeight()) {
            setMinHeight(0);
        }
    }

    private void clear() {
        canvas.context().clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
        setAccessibleText("");
    }
}
