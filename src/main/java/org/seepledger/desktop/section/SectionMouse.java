package org.seepledger.desktop.section;

import javafx.scene.Cursor;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;

/** Mouse and keys on the section: drags lids, else what is seen; the wheel goes nearer. */
final class SectionMouse {

    private static final double NOTCH = 40;
    private static final double PER_NOTCH = 1.2;
    private static final double PAN = 60;
    private static final int FAR = 10;

    private final SectionModel model;
    private final SectionCanvas canvas;
    private boolean panning;
    private double lastX;
    private double lastY;

    SectionMouse(SectionModel model, SectionCanvas canvas) {
        this.model = model;
        this.canvas = canvas;
    }

    void begin() {
        canvas.setCursor(Cursor.CROSSHAIR);
        canvas.addEventHandler(MouseEvent.MOUSE_PRESSED, this::onPressed);
        canvas.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::onDragged);
        canvas.addEventHandler(MouseEvent.MOUSE_RELEASED, this::onReleased);
        canvas.addEventHandler(MouseEvent.MOUSE_MOVED, this::onMoved);
        canvas.addEventHandler(MouseEvent.MOUSE_EXITED, left -> model.leave());
        canvas.addEventHandler(ScrollEvent.SCROLL, this::onScroll);
        canvas.addEventHandler(KeyEvent.KEY_PRESSED, this::onKey);
    }

    private void onPressed(MouseEvent press) {
        canvas.requestFocus();
        lastX = press.getX();
        lastY = press.getY();
        boolean primary = press.getButton() == MouseButton.PRIMARY;
        panning = !(primary && model.lids().press(press.getX(), press.getY()));
        canvas.repaint();
    }

    private void onDragged(MouseEvent drag) {
        if (panning) {
            canvas.setCursor(Cursor.CLOSED_HAND);
            model.drag(drag.getX() - lastX, drag.getY() - lastY);
            lastX = drag.getX();
            lastY = drag.getY();
        } else {
            model.lids().drag(drag.getX(), drag.getY(), drag.isAltDown());
        }
        model.point(drag.getX(), drag.getY());
        canvas.repaint();
    }

    private void onReleased(MouseEvent release) {
        model.lids().release();
        panning = false;
        onMoved(release);
        canvas.repaint();
    }

    private void onMoved(MouseEvent move) {
        boolean overLid = model.lids().at(move.getX(), move.getY()).isPresent();
        canvas.setCursor(overLid ? Cursor.V_RESIZE : Cursor.CROSSHAIR);
        model.point(move.getX(), move.getY());
    }

    /** The wheel goes nearer; with Shift it exaggerates heights, with Ctrl it spreads distances. */
    private void onScroll(ScrollEvent scroll) {
        double turned = scroll.getDeltaY() != 0 ? scroll.getDeltaY() : scroll.getDeltaX();
        if (!scroll.isInertia() && turned != 0) {
            double factor = Math.pow(PER_NOTCH, turned / NOTCH);
            double across = scroll.isShiftDown() ? 1 : factor;
            double up = scroll.isShortcutDown() ? 1 : factor;
            model.zoom(scroll.getX(), scroll.getY(), across, up);
            model.point(scroll.getX(), scroll.getY());
            scroll.consume();
        }
    }

    private void onKey(KeyEvent key) {
        if (!canvas.keeps(key)) {
            return;
        }
        int steps = key.isShiftDown() ? FAR : 1;
        switch (key.getCode()) {
            case UP -> up(steps);
            case DOWN -> up(-steps);
            case LEFT -> model.drag(PAN, 0);
            case RIGHT -> model.drag(-PAN, 0);
            default -> model.lids().cancel();
        }
        canvas.repaint();
        key.consume();
    }

    private void up(int steps) {
        if (!model.lids().nudge(steps)) {
            model.drag(0, Math.signum(steps) * PAN);
        }
    }
}
