package org.seepledger.desktop.closure;

import java.util.List;
import javafx.beans.value.ObservableValue;
import javafx.collections.ListChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Hyperlink;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.paint.PictureView;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.Answer;

/** Questions and answers about the budget, then the cells that do not balance, each a way to its place on the map. */
public final class ClosureView extends BorderPane {

    private final ClosureModel model;
    private final PictureView blocks;
    private final VBox sheet = new VBox();

    /**
     * Builds the pane.
     *
     * @param model what it shows
     * @param theme light or dark
     */
    public ClosureView(ClosureModel model, ObservableValue<Theme> theme) {
        this.model = model;
        this.blocks = new PictureView(model::blocks, theme);
        blocks.setId("closure-blocks");
        setId("closure");
        sheet.getStyleClass().add("sl-answers");
        Label belongs = new Label();
        belongs.setId("closure-belongs");
        belongs.setWrapText(true);
        belongs.getStyleClass().addAll("sl-belongs", "sl-choices");
        belongs.textProperty().bind(model.belongs());
        setTop(belongs);
        ScrollPane scroll = new ScrollPane(sheet);
        scroll.setFitToWidth(true);
        setCenter(new StatePane(scroll, model.state()).withAction(Words.of("budget.draw"), model::draw));
        // The model fills this last, when all else it shows is there.
        model.belongs().addListener((text, before, after) -> fill());
        model.points().addListener((ListChangeListener<Answer.Point>) change -> fill());
        model.spots().addListener((ListChangeListener<Spot>) change -> fill());
        model.spotsOfPeriod().addListener((ListChangeListener<Spot>) change -> fill());
        fill();
    }

    private void fill() {
        sheet.getChildren().clear();
        Answer.Topic topic = null;
        for (Answer.Point point : model.points()) {
            if (point.topic() != topic) {
                topic = point.topic();
                sheet.getChildren().add(words(topic.question(), "sl-question"));
                addBlocks(topic);
            }
            sheet.getChildren().add(words(point.text(), "sl-answer"));
            if (isLastOfClosure(point)) {
                addPlaces();
            }
        }
        addAll(Words.of("closure.warnings"), model.warnings());
        addAll(Words.of("closure.notes"), model.notes());
    }

    private void addAll(String title, List<String> sentences) {
        if (!sentences.isEmpty()) {
            sheet.getChildren().add(words(title, "sl-question"));
            sentences.forEach(sentence -> sheet.getChildren().add(words(sentence, "sl-answer")));
        }
    }

    private void addBlocks(Answer.Topic topic) {
        if (topic == Answer.Topic.DOMINANT) {
            blocks.redraw();
            sheet.getChildren().add(blocks);
        }
    }

    private boolean isLastOfClosure(Answer.Point point) {
        return point.topic() == Answer.Topic.CLOSURE
                && model.points().stream()
                                .filter(other -> other.topic() == Answer.Topic.CLOSURE)
                                .reduce((before, after) -> after)
                                .orElseThrow()
                        == point;
    }

    private void addPlaces() {
        addPlaces(Words.of("closure.where"), model.spots(), "closure-cell-");
        model.leads().forEach(lead -> sheet.getChildren().add(words(lead, "sl-answer")));
        addPlaces(
                Words.of("closure.where.period", model.period().get()), model.spotsOfPeriod(), "closure-period-cell-");
    }

    private void addPlaces(String title, List<Spot> spots, String id) {
        if (spots.isEmpty()) {
            return;
        }
        sheet.getChildren().add(words(title, "sl-question"));
        if (sheet.lookup("#closure-imbalance") == null) {
            Button imbalance = new Button(Words.of("closure.imbalance"));
            imbalance.setId("closure-imbalance");
            imbalance.setOnAction(pressed -> model.showImbalance());
            sheet.getChildren().add(imbalance);
        }
        for (int i = 0; i < spots.size(); i++) {
            sheet.getChildren().add(row(spots.get(i), id + (i + 1)));
        }
    }

    private Node row(Spot spot, String id) {
        Hyperlink way = new Hyperlink(spot.where());
        way.setId(id);
        way.setOnAction(pressed -> model.goTo(spot));
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        Label imbalance = new Label(spot.imbalance());
        imbalance.getStyleClass().add("sl-figure");
        return new HBox(8, way, gap, imbalance);
    }

    private static Label words(String text, String style) {
        Label label = new Label(text);
        label.setWrapText(true);
        label.setMinHeight(USE_PREF_SIZE);
        label.getStyleClass().add(style);
        return label;
    }
}
