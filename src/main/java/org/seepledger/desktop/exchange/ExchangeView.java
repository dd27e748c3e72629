package org.seepledger.desktop.exchange;

import javafx.beans.value.ObservableValue;
import javafx.geometry.HPos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.paint.PictureView;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;

/** The diagram of flows, and below it the matrix: who gives in rows, who receives in columns. */
public final class ExchangeView extends BorderPane {

    private final ExchangeModel model;
    private final PictureView diagram;
    private final GridPane matrix = new GridPane();

    /**
     * Builds the pane.
     *
     * @param model what it shows
     * @param theme light or dark
     */
    public ExchangeView(ExchangeModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.diagram = new PictureView(model::diagram, theme);
        setId("exchange");
        diagram.setId("exchange-diagram");
        matrix.setId("exchange-matrix");
        matrix.getStyleClass().add("sl-matrix");
        Label belongs = new Label();
        belongs.setId("exchange-belongs");
        belongs.getStyleClass().add("sl-belongs");
        belongs.setWrapText(true);
        belongs.textProperty().bind(model.belongs());
        Button copy = new Button(Words.of("ledger.copy"));
        copy.setId("exchange-copy");
        copy.setMinWidth(USE_PREF_SIZE);
        copy.setTooltip(new Tooltip(Words.of("ledger.copy.tip")));
        copy.setOnAction(pressed -> model.copy());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox top = new HBox(belongs, gap, copy);
        top.getStyleClass().add("sl-choices");
        setTop(top);
        ScrollPane across = new ScrollPane(matrix);
        across.setVbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        across.setMinHeight(USE_PREF_SIZE);
        VBox sheet = new VBox(16, diagram, across);
        sheet.getStyleClass().add("sl-answers");
        ScrollPane scroll = new ScrollPane(sheet);
        scroll.setFitToWidth(true);
        setCenter(new StatePane(scroll, model.state()).withAction(Words.of("budget.draw"), model::draw));
        model.changes().addListener((changes, before, after) -> fill());
        fill();
    }

    private void fill() {
        diagram.redraw();
        matrix.getChildren().clear();
        model.matrix().ifPresent(this::fill);
    }

    private void fill(Matrix flows) {
        int count = flows.names().size();
        matrix.add(styled(Words.of("exchange.corner") + ", " + flows.unit(), "sl-small"), 0, 0);
        for (int i = 0; i < count; i++) {
            matrix.add(end(styled(flows.names().get(i), "sl-matrix-head")), i + 1, 0);
            matrix.add(styled(flows.names().get(i), "sl-matrix-head"), 0, i + 1);
            for (int receiver = 0; receiver < count; receiver++) {
                matrix.add(end(styled(model.text(flows, i, receiver), "sl-figure")), receiver + 1, i + 1);
            }
        }
    }

    private static Label styled(String text, String style) {
        Label label = new Label(text);
        label.setMinWidth(USE_PREF_SIZE);
        label.getStyleClass().add(style);
        return label;
    }

    private static Label end(Label label) {
        GridPane.setHalignment(label, HPos.RIGHT);
        return label;
    }
}
