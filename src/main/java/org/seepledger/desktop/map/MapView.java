package org.seepledger.desktop.map;

import java.util.List;
import java.util.function.Function;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.MapFrame;
import org.seepledger.picture.Mark;

/** The map pane. */
public final class MapView extends BorderPane {

    private static final double NOTCH = 40;
    private static final double PER_NOTCH = 1.2;

    private final MapModel model;
    private final GroundModel ground;
    private final MapCanvas canvas;
    private final Hand hand;
    private final Legend legend;
    private boolean panning;
    private double lastX;
    private double lastY;

    /**
     * Builds the pane.
     *
     * @param model the map
     * @param ground the picture under it
     * @param tasks colours tiles
     * @param theme gives colours
     * @param hand works on the map
     * @param tray what the hand works with, laid over the map
     */
    public MapView(
            MapModel model, GroundModel ground, Tasks tasks, ObservableValue<Theme> theme, Hand hand, Region tray) {
        this.ground = ground;
        this.model = model;
        this.hand = hand;
        this.canvas = new MapCanvas(model, ground, tasks, theme);
        setId("map");
        canvas.setId("map-canvas");
        canvas.setFocusTraversable(true);
        this.legend = new Legend(model.values(), theme);
        LayerColumn layers = new LayerColumn(model.session());
        Region ring = new Region();
        ring.getStyleClass().add("sl-ring");
        ring.setMouseTransparent(true);
        ring.visibleProperty().bind(canvas.focusedProperty());
        StackPane.setMargin(ring, new Insets(-2));
        // Kept as pictures, since their shadows would be worked out anew with each move of the map.
        for (Node afloat : List.of(legend, layers, tray)) {
            afloat.setCache(true);
        }
        StackPane stack = new StackPane(canvas, ring, legend, layers, tray);
        stack.getStyleClass().add("sl-map");
        canvas.invite(hand::marks);
        StackPane.setAlignment(legend, Pos.BOTTOM_RIGHT);
        StackPane.setAlignment(layers, Pos.TOP_LEFT);
        StackPane.setAlignment(tray, Pos.TOP_RIGHT);
        StackPane.setMargin(tray, new Insets(14));
        StackPane.setMargin(legend, new Insets(14));
        StackPane.setMargin(layers, new Insets(14));
        setCenter(new StatePane(stack, model.values().state()));
        setBottom(new ReadoutLine(model));
        setMinSize(360, 240);
        canvas.setCursor(Cursor.OPEN_HAND);
        canvas.addEventHandler(MouseEvent.MOUSE_PRESSED, this::onPressed);
        canvas.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::onDragged);
        canvas.addEventHandler(MouseEvent.MOUSE_RELEASED, this::onReleased);
        canvas.addEventHandler(MouseEvent.MOUSE_MOVED, this::onMoved);
        canvas.addEventHandler(MouseEvent.MOUSE_EXITED, left -> model.leave());
        canvas.addEventHandler(ScrollEvent.SCROLL, this::onScroll);
    }

    /**
     * Lets something else draw over the map, below what the hand draws.
     *
     * @param guest gives the marks for a frame
     */
    public void lay(Function<MapFrame, List<Mark>> guest) {
        canvas.layBelow(camera -> guest.apply(camera.frame()));
    }

    /** Moves the keyboard to the map. */
    public void focus() {
        canvas.requestFocus();
    }

    /** Paints anew what the hand draws. */
    public void repaint() {
        canvas.repaint();
        canvas.setCursor(cursor());
    }

    private Touch touch(MouseEvent mouse) {
        Camera camera = model.camera().get();
        return new Touch(
                camera.mapX(mouse.getX()),
                camera.mapY(mouse.getY()),
                1 / camera.scale(),
                mouse.isAltDown(),
                mouse.isShiftDown());
    }

    private Cursor cursor() {
        if (panning) {
            return Cursor.CLOSED_HAND;
        }
        return switch (hand.aim()) {
            case PAN -> Cursor.OPEN_HAND;
            case DRAW -> Cursor.CROSSHAIR;
            case MOVE -> Cursor.MOVE;
            case CHOOSE -> Cursor.HAND;
        };
    }

    private void onPressed(MouseEvent press) {
        canvas.requestFocus();
        lastX = press.getX();
        lastY = press.getY();
        boolean primary = press.getButton() == MouseButton.PRIMARY;
        if (primary && press.getClickCount() == 2) {
            hand.doubleClick(touch(press));
            panning = false;
        } else {
            panning = !primary || !hand.press(touch(press));
        }
        repaint();
    }

    private void onDragged(MouseEvent drag) {
        if (panning) {
            model.drag(drag.getX() - lastX, drag.getY() - lastY);
            lastX = drag.getX();
            lastY = drag.getY();
            return;
        }
        hand.drag(touch(drag));
        model.point(drag.getX(), drag.getY());
        repaint();
    }

    private void onReleased(MouseEvent release) {
        if (!panning) {
            hand.release(touch(release));
        }
        panning = false;
        repaint();
    }

    private void onMoved(MouseEvent move) {
        hand.hover(touch(move));
        model.point(move.getX(), move.getY());
        repaint();
    }

    /** Wheels tell notches, touch pads pixels: both give the same speed. */
    private void onScroll(ScrollEvent scroll) {
        if (!scroll.isInertia() && scroll.getDeltaY() != 0) {
            model.zoom(scroll.getX(), scroll.getY(), Math.pow(PER_NOTCH, scroll.getDeltaY() / NOTCH));
            model.point(scroll.getX(), scroll.getY());
            scroll.consume();
        }
    }

    /** {@return what can be done on the map} */
    public List<Action> actions() {
        String group = "actions.group.map";
        return List.of(
                new Action(group, "action.all", "Home", model::showAll),
                new Action(group, "action.prism", "End", model::showPrism),
                new Action(group, "action.nearer", "Equals", () -> model.step(1)),
                new Action(group, "action.farther", "Minus", () -> model.step(-1)),
                new Action(
                        group,
                        "action.contours",
                        "F2",
                        () -> flip(model.overlays().contours())),
                new Action(
                        group,
                        "action.arrows",
                        "F3",
                        () -> flip(model.overlays().arrows())),
                new Action(
                        group, "action.wells", "F4", () -> flip(model.overlays().wells())),
                new Action(group, "action.fit", "F5", model.values()::fitRange),
                new Action(group, "action.legend", "L", legend::turn),
                new Action(group, "action.ground", "Shortcut+B", ground::choose),
                new Action(group, "action.ground.clear", "Shortcut+Shift+B", ground::clear));
    }

    private static void flip(javafx.beans.property.BooleanProperty shown) {
        shown.set(!shown.get());
    }
}
