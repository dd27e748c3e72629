package org.seepledger.desktop.solute;

import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Control;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.FieldFault;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.PlumeRequest.Threshold;

/** Whose budget is looked at, and what is chosen of a solute, above all pages; not there where the set has no solutes. */
public final class SolutePanel extends VBox {

    private static final double TRACK_WIDTH = 124;

    private final SoluteLook look;
    private final TextField threshold = new TextField();
    private final FieldFault fault = new FieldFault("solute-threshold-fault");

    /**
     * Builds the panel.
     *
     * @param model what it shows
     * @param subject chooses water or a solute
     * @param answers opens the page on which the warnings stand
     */
    public SolutePanel(SolutePanelModel model, Control subject, Runnable answers) {
        this.look = model.look();
        setId("solute-panel");
        getStyleClass().addAll("sl-choices", "sl-solute");
        visibleProperty().bind(subject.visibleProperty());
        managedProperty().bind(visibleProperty());
        Hyperlink doubts = new Hyperlink();
        doubts.setId("solute-doubts");
        doubts.getStyleClass().addAll("sl-small", "sl-warning");
        doubts.textProperty().bind(model.doubts());
        doubts.setTooltip(new Tooltip(Words.of("solute.doubts.tip")));
        doubts.setOnAction(pressed -> answers.run());
        doubts.managedProperty().bind(doubts.textProperty().isNotEmpty());
        FlowPane choices = new FlowPane(12, 6, subject, threshold(), track(), dispersion(), doubts);
        choices.getChildren().stream().skip(1).forEach(node -> onlyOfSolutes(node, model));
        choices.setRowValignment(VPos.CENTER);
        fault.setMaxWidth(Double.MAX_VALUE);
        getChildren().addAll(choices, fault, line("solute-above", model.above()));
    }

    private static void onlyOfSolutes(Node node, SolutePanelModel model) {
        if (!node.managedProperty().isBound()) {
            node.visibleProperty().bind(model.solute().isNotEmpty());
            node.managedProperty().bind(node.visibleProperty());
        }
    }

    private static Label line(String id, ObservableValue<String> text) {
        Label line = new Label();
        line.setId(id);
        line.setWrapText(true);
        line.getStyleClass().add("sl-small");
        line.textProperty().bind(text);
        line.managedProperty().bind(line.textProperty().isNotEmpty());
        return line;
    }

    private HBox threshold() {
        Label label = new Label(Words.of("solute.threshold"));
        label.getStyleClass().add("sl-small");
        threshold.setId("solute-threshold");
        threshold.setPrefColumnCount(7);
        threshold.getStyleClass().add("small");
        threshold.setPromptText(Words.of("solute.threshold.prompt"));
        threshold.setTooltip(new Tooltip(Words.of("solute.threshold.tip")));
        threshold.setOnAction(entered -> take());
        threshold.focusedProperty().addListener((focus, before, now) -> {
            if (!now) {
                take();
            }
        });
        look.threshold().addListener((typed, before, after) -> show(after));
        show(look.threshold().get());
        return row(label, threshold);
    }

    /** What cannot be taken stays as it was typed, with the reason below. */
    private void take() {
        String typed = threshold.getText();
        boolean taken = typed.equals(text(look.threshold().get())) || look.type(typed);
        fault.say(taken ? "" : look.wanted());
    }

    private void show(Optional<Threshold> typed) {
        threshold.setText(text(typed));
        fault.say("");
    }

    private static String text(Optional<Threshold> typed) {
        return typed.map(given -> (Double.toString(given.value()) + " " + given.unit()).replace(".0 ", " "))
                .orElse("");
    }

    private HBox track() {
        Label label = new Label(Words.of("solute.track"));
        label.getStyleClass().add("sl-small");
        ChoiceBox<SoluteLook.Track> box = new ChoiceBox<>();
        box.setId("solute-track");
        box.setPrefWidth(TRACK_WIDTH);
        box.getItems().setAll(SoluteLook.Track.values());
        box.setConverter(new ChoiceWords<>(
                track -> Words.of("solute.track." + track.name().toLowerCase(java.util.Locale.ROOT))));
        box.valueProperty().bindBidirectional(look.track());
        box.setTooltip(new Tooltip(Words.of("solute.track.tip")));
        return row(label, box);
    }

    private CheckBox dispersion() {
        CheckBox box = new CheckBox(Words.of("solute.dispersion"));
        box.setId("solute-dispersion");
        box.getStyleClass().add("sl-small");
        box.setTooltip(new Tooltip(Words.of("solute.dispersion.tip")));
        box.selectedProperty().bindBidirectional(look.dispersion());
        return box;
    }

    private static HBox row(Node... nodes) {
        HBox row = new HBox(6, nodes);
        row.setAlignment(Pos.CENTER_LEFT);
        return row;
    }
}
