package org.seepledger.desktop.size;

import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.geometry.Bounds;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.ScrollBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Region;
import javafx.scene.shape.Rectangle;
import javafx.scene.transform.Scale;

/**
 * Shows the window's content enlarged, letters, lines and gaps alike. Where the window has too little room for it then, the
 * content keeps the size that it needs at least and is scrolled: by bars, by the wheel where nothing else takes it, and by
 * itself to wherever the keyboard goes.
 */
public final class Magnifier extends Region {

    private final Region content;
    private final Region above;
    private final Scale scale = new Scale(1, 1);
    private final DoubleProperty factor = new SimpleDoubleProperty(1);
    private final ScrollBar across = bar(Orientation.HORIZONTAL);
    private final ScrollBar down = bar(Orientation.VERTICAL);

    /**
     * Lays a magnifier over content.
     *
     * @param content what is shown
     * @param above what may lie over all that is seen, and is not scrolled
     */
    public Magnifier(Region content, Region above) {
        this.content = content;
        this.above = above;
        above.getTransforms().add(scale);
        content.getTransforms().add(scale);
        Rectangle clip = new Rectangle();
        clip.widthProperty().bind(widthProperty());
        clip.heightProperty().bind(heightProperty());
        setClip(clip);
        getChildren().addAll(content, across, down, above);
        factor.addListener((now, before, after) -> {
            scale.setX(after.doubleValue());
            scale.setY(after.doubleValue());
            requestLayout();
        });
        setOnScroll(this::onScroll);
        sceneProperty().flatMap(scene -> scene.focusOwnerProperty()).addListener((owner, before, after) -> show(after));
    }

    private ScrollBar bar(Orientation orientation) {
        ScrollBar bar = new ScrollBar();
        bar.setOrientation(orientation);
        bar.valueProperty().addListener((value, before, after) -> requestLayout());
        return bar;
    }

    /** {@return how many times as large as usual the content is shown} */
    public DoubleProperty factor() {
        return factor;
    }

    @Override
    protected double computePrefWidth(double height) {
        return factor.get() * content.prefWidth(-1);
    }

    @Override
    protected double computePrefHeight(double width) {
        return factor.get() * content.prefHeight(-1);
    }

    @Override
    protected void layoutChildren() {
        double needsWidth = factor.get() * content.minWidth(-1);
        double needsHeight = factor.get() * content.minHeight(-1);
        double thick = down.prefWidth(-1);
        boolean tall = needsHeight > getHeight() + 0.5;
        boolean wide = needsWidth > getWidth() - (tall ? thick : 0) + 0.5;
        tall = needsHeight > getHeight() - (wide ? thick : 0) + 0.5;
        double seenWidth = getWidth() - (tall ? thick : 0);
        double seenHeight = getHeight() - (wide ? thick : 0);
        place(across, wide, Math.max(needsWidth, seenWidth), seenWidth);
        place(down, tall, Math.max(needsHeight, seenHeight), seenHeight);
        across.resizeRelocate(0, seenHeight, seenWidth, thick);
        down.resizeRelocate(seenWidth, 0, thick, seenHeight);
        above.resizeRelocate(0, 0, getWidth() / factor.get(), getHeight() / factor.get());
        content.resizeRelocate(
                -Math.round(across.getValue()),
                -Math.round(down.getValue()),
                Math.max(needsWidth, seenWidth) / factor.get(),
                Math.max(needsHeight, seenHeight) / factor.get());
    }

    private static void place(ScrollBar bar, boolean shown, double whole, double seen) {
        bar.setVisible(shown);
        bar.setMax(whole - seen);
        bar.setVisibleAmount(whole > 0 ? (whole - seen) * seen / whole : 0);
        bar.setBlockIncrement(0.8 * seen);
        bar.setUnitIncrement(40);
        bar.setValue(shown ? Math.min(bar.getValue(), bar.getMax()) : 0);
    }

    private void onScroll(ScrollEvent scroll) {
        move(across, -scroll.getDeltaX());
        move(down, -scroll.getDeltaY());
    }

    private static void move(ScrollBar bar, double by) {
        if (bar.isVisible()) {
            bar.setValue(Math.max(0, Math.min(bar.getMax(), bar.getValue() + by)));
        }
    }

    /** Brings the node that has the keyboard into view; of a large one its beginning. */
    private void show(Node node) {
        for (Node up = node; up != null; up = up.getParent()) {
            if (up instanceof ScrollPane pane && up != node) {
                reveal(pane, node);
            }
        }
        if (node != null && !above.isVisible() && (across.isVisible() || down.isVisible())) {
            layout();
            Bounds place = sceneToLocal(node.localToScene(node.getBoundsInLocal()));
            move(across, beyond(place.getMinX(), place.getMaxX(), getWidth() - down.getWidth()));
            move(down, beyond(place.getMinY(), place.getMaxY(), getHeight() - across.getHeight()));
        }
    }

    private static void reveal(ScrollPane pane, Node node) {
        pane.applyCss();
        pane.layout();
        Bounds whole = pane.getContent().getLayoutBounds();
        Bounds seen = pane.getViewportBounds();
        Bounds place = pane.getContent().sceneToLocal(node.localToScene(node.getBoundsInLocal()));
        double across = whole.getWidth() - seen.getWidth();
        double down = whole.getHeight() - seen.getHeight();
        if (across > 0) {
            double from = pane.getHvalue() * across;
            double by = beyond(place.getMinX() - from, place.getMaxX() - from, seen.getWidth());
            pane.setHvalue(Math.max(0, Math.min(1, (from + by) / across)));
        }
        if (down > 0) {
            double from = pane.getVvalue() * down;
            double by = beyond(place.getMinY() - from, place.getMaxY() - from, seen.getHeight());
            pane.setVvalue(Math.max(0, Math.min(1, (from + by) / down)));
        }
    }

    private static double beyond(double from, double to, double seen) {
        return from < 0 || to - from > seen ? from : Math.max(0, to - seen);
    }
}
