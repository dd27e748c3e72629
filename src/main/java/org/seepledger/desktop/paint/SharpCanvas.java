package org.seepledger.desktop.paint;

import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.transform.Scale;

/** A canvas that has as many pixels as it shows when the window is enlarged, so that letters on it stay sharp. */
public final class SharpCanvas extends Region {

    private final Canvas canvas = new Canvas();
    private final Scale back = new Scale(1, 1);
    private double sharpness = 1;

    /**
     * Makes a canvas without size.
     *
     * @param changed told when the window is enlarged or reduced, and the canvas must be painted anew
     */
    public SharpCanvas(Runnable changed) {
        canvas.setManaged(false);
        canvas.getTransforms().add(back);
        getChildren().add(canvas);
        localToSceneTransformProperty().addListener((transform, before, after) -> {
            if (after.getMxx() != sharpness && after.getMxx() > 0) {
                sharpness = after.getMxx();
                fit();
                changed.run();
            }
        });
    }

    /**
     * Takes another size.
     *
     * @param toWidth in logical pixels
     * @param toHeight in logical pixels
     */
    public void size(double toWidth, double toHeight) {
        setMinSize(toWidth, toHeight);
        setMaxSize(toWidth, toHeight);
        resize(toWidth, toHeight);
        fit();
    }

    private void fit() {
        canvas.setWidth(Math.round(getMinWidth() * sharpness));
        canvas.setHeight(Math.round(getMinHeight() * sharpness));
        back.setX(1 / sharpness);
        back.setY(1 / sharpness);
    }

    /** {@return how many pixels a logical one has by the size of the window's content} */
    public double sharpness() {
        return sharpness;
    }

    /** {@return what paints on it, in logical pixels} */
    public GraphicsContext context() {
        GraphicsContext context = canvas.getGraphicsContext2D();
        context.setTransform(sharpness, 0, 0, sharpness, 0, 0);
        return context;
    }
}
