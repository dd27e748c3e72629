package org.seepledger.desktop.solute;

import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.pane.StatePane;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.Answer;

/** Questions and answers about a solute's budget, then what is doubtful, and the cautions in full. */
public final class SoluteAnswersView extends BorderPane {

    private final SoluteAnswersModel model;
    private final Label belongs = new Label();
    private final VBox sheet = new VBox();

    /**
     * Builds the page.
     *
     * @param model what it shows
     */
    public SoluteAnswersView(SoluteAnswersModel model) {
        this.model = model;
        setId("solute-answers");
        sheet.getStyleClass().add("sl-answers");
        belongs.setId("solute-answers-belongs");
        belongs.setWrapText(true);
        belongs.getStyleClass().addAll("sl-belongs", "sl-choices");
        setTop(belongs);
        ScrollPane scroll = new ScrollPane(sheet);
        scroll.setFitToWidth(true);
        setCenter(new StatePane(scroll, model.state()).withAction(Words.of("budget.draw"), model::draw));
        model.changes().addListener((changes, before, after) -> fill());
        fill();
    }

    private void fill() {
        belongs.setText(model.belongs());
        sheet.getChildren().clear();
        model.answer().ifPresent(this::fill);
        add(Words.of("closure.warnings"), model.warnings());
        add(Words.of("closure.notes"), model.notes());
        add(Words.of("caution.title"), model.cautions());
    }

    private void fill(Answer answer) {
        for (Answer.Topic topic : Answer.Topic.values()) {
            add(topic.question(), answer.on(topic).toList());
        }
    }

    private void add(String title, List<String> sentences) {
        if (!sentences.isEmpty()) {
            sheet.getChildren().add(words(title, "sl-question"));
            sentences.forEach(sentence -> sheet.getChildren().add(words(sentence, "sl-answer")));
        }
    }

    private static Label words(String text, String style) {
        Label label = new Label(text);
        label.setWrapText(true);
        label.setMinHeight(USE_PREF_SIZE);
        label.getStyleClass().add(style);
        return label;
    }
}
