package org.seepledger.desktop.draw;

import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.FieldFault;
import org.seepledger.desktop.words.Words;

/** What one draws with: tools, a field for typed values, and the card of the selected prism. */
public final class Tray extends HBox {

    private final DraftModel model;
    private final DraftHand hand;
    private final PrismCard card;
    private final FieldFault typedFault = new FieldFault("typed-fault");
    private Runnable leave = () -> {};
    private Runnable taken = () -> {};
    private final TextField typed = new TextField();

    /**
     * Lays the tray.
     *
     * @param model the drawing
     * @param hand works with the tools
     * @param surfaces are chosen as lids
     */
    public Tray(DraftModel model, DraftHand hand, LidSurfaces surfaces) {
        this.model = model;
        this.hand = hand;
        this.card = new PrismCard(model, hand, surfaces);
        setId("tray");
        setSpacing(8);
        setAlignment(Pos.TOP_RIGHT);
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        setPickOnBounds(false);
        setFillHeight(false);
        card.setVisible(false);
        card.managedProperty().bind(card.visibleProperty());
        getChildren().addAll(card, tools());
        visibleProperty().bind(model.session().set().map(java.util.Optional::isPresent));
    }

    private VBox tools() {
        VBox row = new VBox(1);
        row.getStyleClass().addAll("sl-float", "sl-tools");
        row.setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        for (Tool tool : Tool.values()) {
            row.getChildren().add(button(tool));
        }
        typed.setId("typed");
        typed.getStyleClass().add("small");
        typed.setPrefColumnCount(8);
        typed.setOnAction(entered -> take());
        typed.addEventFilter(KeyEvent.KEY_PRESSED, this::leave);
        typed.textProperty().addListener((text, before, after) -> typedFault.say(""));
        model.tool().addListener((tool, before, after) -> prompt(after));
        prompt(Tool.SELECT);
        Button prism = new Button(Words.of("card.open"));
        prism.setId("card-open");
        prism.getStyleClass().addAll("flat", "small");
        prism.setTooltip(new Tooltip(Words.of("action.card")));
        prism.setMaxWidth(Double.MAX_VALUE);
        prism.setOnAction(pressed -> flipCard());
        row.getChildren().addAll(typed, typedFault, prism);
        return row;
    }

    /** Nothing typed ends what is drawn, as Enter does on the map. */
    private void take() {
        if (typed.getText().isBlank()) {
            hand.finish();
            leave.run();
        } else if (hand.type(typed.getText())) {
            typed.clear();
            taken.run();
        } else {
            typedFault.say(model.refusal().get());
        }
    }

    private void leave(KeyEvent key) {
        if (key.getCode() == KeyCode.ESCAPE && !key.isShiftDown()) {
            leave.run();
            key.consume();
        }
    }

    private void prompt(Tool tool) {
        typed.setPromptText(Words.of(tool == Tool.CIRCLE ? "typed.radius" : "typed.place"));
    }

    private ToggleButton button(Tool tool) {
        ToggleButton button = new ToggleButton(tool.words());
        button.setId(tool.key().replace('.', '-'));
        button.getStyleClass().setAll("sl-tool");
        button.setTooltip(new Tooltip(tool.hint() + " (" + tool.keys() + ")"));
        button.setMaxWidth(Double.MAX_VALUE);
        button.setOnAction(pressed -> {
            model.choose(tool);
            button.setSelected(model.tool().get() == tool);
        });
        model.tool().addListener((chosen, before, after) -> button.setSelected(after == tool));
        button.setSelected(model.tool().get() == tool);
        if (tool == Tool.TRANSECT) {
            button.visibleProperty().bind(model.session().set().map(set -> model.hasSolutes()));
            button.managedProperty().bind(button.visibleProperty());
        }
        return button;
    }

    /** Shows the card of the selected prism, or puts it away. */
    public void flipCard() {
        card.setVisible(!card.isVisible());
        if (card.isVisible()) {
            card.focusName();
        } else {
            leave.run();
        }
    }

    /**
     * Says where the keyboard goes from here.
     *
     * @param back moves it to the map
     */
    public void whenLeft(Runnable back) {
        leave = back;
        card.addEventFilter(KeyEvent.KEY_PRESSED, this::leave);
    }

    /**
     * Says what follows when a typed value was taken.
     *
     * @param then shows it on the map
     */
    public void whenTaken(Runnable then) {
        taken = then;
    }

    /** Moves the keyboard to the field for typed values. */
    public void focusTyped() {
        typed.requestFocus();
    }
}
