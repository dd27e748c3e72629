package org.seepledger.desktop.shell;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.SplitPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.StackPane;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.action.Actions;
import org.seepledger.desktop.action.ActionsPage;
import org.seepledger.desktop.notice.NoticeLine;
import org.seepledger.desktop.notice.NoticePage;
import org.seepledger.desktop.running.RunningList;
import org.seepledger.desktop.running.RunningModel;
import org.seepledger.desktop.running.RunningStrip;

/** The window's frame. */
public final class ShellView extends StackPane {

    private static final Set<KeyCode> TEXT_COMMANDS =
            EnumSet.of(KeyCode.A, KeyCode.C, KeyCode.V, KeyCode.X, KeyCode.Z, KeyCode.Y, KeyCode.HOME, KeyCode.END);
    private static final Set<KeyCode> WORKING_KEYS =
            EnumSet.of(KeyCode.TAB, KeyCode.ENTER, KeyCode.SPACE, KeyCode.DELETE, KeyCode.BACK_SPACE);

    private final ShellModel model;
    private final Actions actions;
    private final Slots slots;
    private final BorderPane work = new BorderPane();
    private final StackPane veil = new StackPane();
    private final ActionsPage actionsPage;
    private final NoticePage noticePage;
    private final RunningList runningList;
    private final CautionPage cautionPage;

    /**
     * Builds the frame.
     *
     * @param model which page is shown
     * @param slots what is put into the frame
     * @param actions everything that can be done
     * @param running what runs beside the window
     */
    public ShellView(ShellModel model, Slots slots, Actions actions, RunningModel running) {
        this.model = model;
        this.slots = slots;
        this.actions = actions;
        this.cautionPage = new CautionPage(
                model.session()
                        .set()
                        .map(set ->
                                set.filter(open -> !open.solutes().isEmpty()).isPresent()),
                this::lift);
        this.actionsPage = new ActionsPage(actions, this::lift);
        work.setTop(new Caption(model, slots.showing(), this::showActions));
        work.setCenter(panes());
        this.noticePage = new NoticePage(model.session().notices(), this::lift);
        this.runningList = new RunningList(running, this::lift);
        work.setBottom(new Footer(
                new NoticeLine(model.session().notices(), model.session().status(), this::showNotices),
                new RunningStrip(running, this::showRunning),
                this::showCaution));
        veil.getStyleClass().add("sl-veil");
        veil.setVisible(false);
        veil.setOnMousePressed(press -> {
            if (press.getTarget() == veil) {
                lift();
            }
        });
        getChildren().addAll(work, slots.welcome(), veil);
        slots.welcome().visibleProperty().bind(model.atWelcome());
        work.visibleProperty().bind(model.atWelcome().not());
        addEventFilter(KeyEvent.KEY_PRESSED, this::onKey);
    }

    private Node panes() {
        SplitPane across = new SplitPane(slots.map());
        slots.ledger().ifPresent(ledger -> {
            across.getItems().add(ledger);
            across.setDividerPositions(0.6);
            SplitPane.setResizableWithParent(ledger, false);
        });
        SplitPane down = new SplitPane(across);
        down.setOrientation(Orientation.VERTICAL);
        slots.ribbon().ifPresent(ribbon -> {
            down.getItems().add(ribbon);
            down.setDividerPositions(0.74);
            SplitPane.setResizableWithParent(ribbon, false);
        });
        return down;
    }

    /** Shows the page of all actions. */
    public void showActions() {
        lower(actionsPage);
        actionsPage.open();
    }

    /** Shows the caution in full. */
    public void showCaution() {
        lower(cautionPage);
        cautionPage.requestFocus();
    }

    /** Shows all notices. */
    public void showNotices() {
        lower(noticePage);
        noticePage.open();
    }

    /** Shows all that runs beside the window. */
    public void showRunning() {
        lower(runningList);
        runningList.open();
    }

    /** Moves the keyboard to the next pane. */
    public void nextPane() {
        List<Node> panes = slots.panes();
        Node owner = getScene().getFocusOwner();
        int here = -1;
        for (int pane = 0; pane < panes.size(); pane++) {
            here = holds(panes.get(pane), owner) ? pane : here;
        }
        focusIn(panes.get((here + 1) % panes.size()));
    }

    private static void focusIn(Node pane) {
        Node target = firstFocusable(pane);
        (target == null ? pane : target).requestFocus();
    }

    private static Node firstFocusable(Node node) {
        if (!node.isVisible()) {
            return null;
        }
        if (node.isFocusTraversable() && !node.isDisabled()) {
            return node;
        }
        if (node instanceof javafx.scene.Parent parent) {
            for (Node child : parent.getChildrenUnmodifiable()) {
                Node found = firstFocusable(child);
                if (found != null) {
                    return found;
                }
            }
        }
        return null;
    }

    private static boolean holds(Node pane, Node node) {
        for (Node up = node; up != null; up = up.getParent()) {
            if (up == pane) {
                return true;
            }
        }
        return false;
    }

    /**
     * Shows a page over all else until it is lifted.
     *
     * @param page the page
     */
    public void lower(Node page) {
        veil.getChildren().setAll(page);
        veil.setVisible(true);
    }

    /** Puts away what is shown over all else. */
    public void lift() {
        veil.setVisible(false);
        veil.getChildren().clear();
        focusIn(model.atWelcome().get() ? slots.welcome() : slots.map());
    }

    /** Text fields keep all keys but commands; other controls those that they work with themselves. */
    private void onKey(KeyEvent key) {
        if (veil.isVisible() || isKept(key)) {
            return;
        }
        for (Action action : actions.all()) {
            if (KeyCombination.valueOf(action.keys()).match(key)) {
                action.perform();
                key.consume();
                return;
            }
        }
    }

    private boolean isKept(KeyEvent key) {
        Node owner = getScene().getFocusOwner();
        if (key.getCode().isFunctionKey() || key.getCode() == KeyCode.ESCAPE && key.isShiftDown()) {
            return false;
        }
        if (owner instanceof TextInputControl) {
            return !key.isShortcutDown() || TEXT_COMMANDS.contains(key.getCode());
        }
        boolean works = key.getCode().isNavigationKey() || WORKING_KEYS.contains(key.getCode());
        return owner instanceof Control && works && !key.isShortcutDown();
    }
}
