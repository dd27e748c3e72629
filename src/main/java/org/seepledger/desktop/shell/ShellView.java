package org.seepledger.desktop.shell;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Control;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.action.Actions;
import org.seepledger.desktop.action.ActionsPage;
import org.seepledger.desktop.action.OwnKeys;
import org.seepledger.desktop.notice.NoticeLine;
import org.seepledger.desktop.notice.NoticePage;
import org.seepledger.desktop.port.Settings;
import org.seepledger.desktop.preferences.PreferencesModel;
import org.seepledger.desktop.preferences.PreferencesPage;
import org.seepledger.desktop.running.RunningList;
import org.seepledger.desktop.running.RunningModel;
import org.seepledger.desktop.running.RunningStrip;

/** The window's frame. */
public final class ShellView extends StackPane {

    private static final Set<KeyCode> TEXT_COMMANDS =
            EnumSet.of(KeyCode.A, KeyCode.C, KeyCode.V, KeyCode.X, KeyCode.Z, KeyCode.Y, KeyCode.HOME, KeyCode.END);
    private static final Set<KeyCode> WORKING_KEYS =
            EnumSet.of(KeyCode.TAB, KeyCode.ENTER, KeyCode.SPACE, KeyCode.DELETE, KeyCode.BACK_SPACE);

    /** Less room than this, and what lies over the map would lie over each other: then the whole is scrolled. */
    private static final double LEAST_WIDTH = 1180;

    private static final double LEAST_HEIGHT = 720;
    /** How wide the pane beside the map is at first, in logical pixels, at least, and as a share of the window. */
    private static final double[] SIDE = {452, 0.3};

    /** How high the pane below it is at first. */
    private static final double[] BELOW = {196, 0.22};

    /** How high the section is at first. */
    private static final double[] SECTION = {290, 0.36};

    /** How high the review is at first. */
    private static final double[] REVIEW = {330, 0.4};

    private static final double[][] HEIGHTS = {BELOW, SECTION, REVIEW};
    private static final String[] HEIGHT_KEYS = {"below.height", "section.height", "review.height"};

    private final ShellModel model;
    private final Actions actions;
    private final Slots slots;
    private final SplitPane across = new SplitPane();
    private final SplitPane down = new SplitPane();
    private final Optional<Fold> side;
    private final Optional<Fold> below;
    private final BorderPane work = new BorderPane();
    private final StackPane veil = new StackPane();
    private final StackPane around = new StackPane();
    private Optional<Node> before = Optional.empty();
    private boolean acted;
    private final ActionsPage actionsPage;
    private final PreferencesPage preferencesPage;
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
     * @param preferences what users want for good
     * @param settings keep how large panes are
     */
    public ShellView(
            ShellModel model,
            Slots slots,
            Actions actions,
            RunningModel running,
            PreferencesModel preferences,
            Settings settings) {
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
        work.setCenter(panes());
        this.preferencesPage = new PreferencesPage(preferences, this::lift);
        across.getItems().add(slots.map());
        this.side = slots.ledger().map(pane -> new Fold(across, pane, SIDE[0], SIDE[1], settings, "side.width"));
        this.below = slots.ribbon().map(pane -> new Fold(down, pane, BELOW[0], BELOW[1], settings, "below.height"));
        Caption caption = new Caption(
                model,
                slots.showing(),
                this::showActions,
                () -> actions.perform("action.review"),
                () -> actions.perform("action.handover"));
        side.ifPresent(fold -> caption.add(fold.button("fold-side", "action.fold.side")));
        below.ifPresent(fold -> caption.add(fold.button("fold-below", "action.fold.below")));
        work.setTop(caption);
        this.noticePage = new NoticePage(model.session().notices(), this::lift);
        this.runningList = new RunningList(running, this::lift);
        work.setBottom(new Footer(
                new NoticeLine(model.session().notices(), model.session().status(), this::showNotices),
                new RunningStrip(running, this::showRunning),
                this::showCaution));
        veil.getStyleClass().add("sl-veil");
        veil.setVisible(false);
        ScrollPane scroll = new ScrollPane(around);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        scroll.setFocusTraversable(false);
        scroll.getStyleClass().add("sl-clear");
        veil.getChildren().add(scroll);
        veil.setOnMousePressed(press -> {
            if (press.getTarget() == around) {
                lift();
            }
        });
        getChildren().addAll(work, slots.welcome());
        slots.welcome().visibleProperty().bind(model.atWelcome());
        work.visibleProperty().bind(model.atWelcome().not());
        work.visibleProperty().addListener((visible, before, after) -> requestLayout());
        work.setMinSize(LEAST_WIDTH, LEAST_HEIGHT);
        addEventFilter(KeyEvent.KEY_PRESSED, this::onKey);
        addEventFilter(KeyEvent.KEY_TYPED, this::onTyped);
        for (Node part : List.of(this, veil)) {
            part.addEventFilter(KeyEvent.KEY_PRESSED, ShellView::press);
        }
        sceneProperty().flatMap(Scene::focusOwnerProperty).addListener((owner, from, to) -> stayIn(to));
    }

    /** The page that is not shown needs no room, but is laid out, so that it is there at once when it is turned to. */
    @Override
    protected double computeMinWidth(double height) {
        double least = shown().minWidth(height);
        return shown() == work ? Math.max(least, work.getTop().minWidth(-1)) : least;
    }

    @Override
    protected double computeMinHeight(double width) {
        return shown().minHeight(width);
    }

    private Node shown() {
        return work.isVisible() ? work : slots.welcome();
    }

    /** {@return what lies over the window while a page is read} */
    public Region veil() {
        return veil;
    }

    private Node panes() {
        down.setOrientation(Orientation.VERTICAL);
        down.getItems().add(across);
        return down;
    }

    /** Folds the pane beside the map away, or shows it again. */
    public void turnSide() {
        side.ifPresent(Fold::turn);
    }

    /** Folds the pane below the map away, or shows it again. */
    public void turnBelow() {
        below.ifPresent(Fold::turn);
    }

    /** Shows the pane below the map, if it is folded away. */
    public void showBelow() {
        below.ifPresent(Fold::show);
    }

    /**
     * Gives the pane below the map a height for each of its pages.
     *
     * @param page which page is open: 0 for time, 1 for the section, 2 for the review
     */
    public void spreadBelow(ObservableValue<Number> page) {
        page.addListener((open, before, after) -> below.ifPresent(fold -> {
            double[] size = HEIGHTS[after.intValue()];
            fold.show();
            fold.take(HEIGHT_KEYS[after.intValue()], size[0], size[1]);
        }));
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

    /** Shows the preferences. */
    public void showPreferences() {
        lower(preferencesPage);
        preferencesPage.open();
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
        List<Node> panes =
                slots.panes().stream().filter(pane -> pane.getScene() != null).toList();
        Node owner = getScene().getFocusOwner();
        int here = -1;
        for (int pane = 0; pane < panes.size(); pane++) {
            here = Focus.isIn(panes.get(pane), owner) ? pane : here;
        }
        Focus.in(panes.get((here + 1) % panes.size()));
    }

    /**
     * Shows a page over all else until it is lifted.
     *
     * @param page the page
     */
    public void lower(Node page) {
        if (!veil.isVisible()) {
            before = Optional.ofNullable(getScene()).map(Scene::getFocusOwner);
        }
        around.getChildren().setAll(page);
        veil.setVisible(true);
        // What lies in a scroll pane is in the scene, and can have the keyboard, only once its looks are there.
        veil.applyCss();
        veil.layout();
    }

    /** Puts away what is shown over all else. */
    public void lift() {
        veil.setVisible(false);
        around.getChildren().clear();
        before.filter(node -> node.getScene() != null && Focus.isIn(shown(), node))
                .ifPresentOrElse(
                        Node::requestFocus, () -> Focus.in(model.atWelcome().get() ? slots.welcome() : slots.map()));
    }

    /** Text fields keep all keys but commands; other controls those that they work with themselves. */
    private void onKey(KeyEvent key) {
        acted = false;
        if (veil.isVisible() || isKept(key)) {
            return;
        }
        for (Action action : actions.all()) {
            if (KeyCombination.valueOf(action.keys()).match(key)) {
                acted = true;
                action.perform();
                key.consume();
                return;
            }
        }
    }

    /** The letter of a key that did something is not typed into the field that has the keyboard since. */
    private void onTyped(KeyEvent letter) {
        if (acted) {
            letter.consume();
        }
    }

    /** Enter presses the button that has the keyboard, not the one that is pressed by Enter when none has it. */
    private static void press(KeyEvent key) {
        boolean pressed = key.getTarget() instanceof ButtonBase && !(key.getTarget() instanceof CheckBox);
        if (pressed && key.getCode() == KeyCode.ENTER) {
            ((ButtonBase) key.getTarget()).fire();
            key.consume();
        }
    }

    /** While a page is read, the keyboard does not leave it. */
    private void stayIn(Node owner) {
        if (owner != null
                && veil.isVisible()
                && !Focus.isIn(veil, owner)
                && !around.getChildren().isEmpty()) {
            Focus.in(around);
        }
    }

    private boolean isKept(KeyEvent key) {
        Node owner = getScene().getFocusOwner();
        if (owner instanceof OwnKeys own && own.keeps(key)) {
            return true;
        }
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
