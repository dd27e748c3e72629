package org.seepledger.desktop.review;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Severity;

/** What a finding may mean, and what to ask the author; below it what was not checked, and why. */
final class FindingDetail extends ScrollPane {

    private static final Set<Code> NOT_CHECKED = EnumSet.of(Code.NOT_TIED, Code.NOT_RECOMPUTED, Code.UNIT_ASSUMED);

    private final ReviewModel model;
    private final VBox box = new VBox(6);

    FindingDetail(ReviewModel model) {
        this.model = model;
        setId("review-detail");
        setContent(box);
        setFitToWidth(true);
        getStyleClass().add("sl-review-detail");
        model.chosen().addListener((chosen, before, after) -> show());
        model.answer().addListener((answer, before, after) -> show());
        show();
    }

    private void show() {
        List<Node> nodes = new ArrayList<>();
        model.chosen()
                .get()
                .ifPresentOrElse(
                        finding -> about(nodes, finding),
                        () -> nodes.add(line(
                                "sl-muted",
                                Words.of(
                                        model.session().set().get().isPresent()
                                                ? "review.choose.finding"
                                                : "review.choose.alone"))));
        notChecked(nodes);
        nodes.add(line("sl-small", Words.of("review.caution")));
        box.getChildren().setAll(nodes);
        setVvalue(0);
    }

    private static void about(List<Node> nodes, Finding finding) {
        nodes.add(line("sl-form-heading", FindingsPane.where(finding)));
        nodes.add(line("sl-plain", finding.message()));
        if (finding.severity() != Severity.NOTE) {
            nodes.add(line("sl-form-heading", Words.of("review.ask")));
            Label question = line("sl-plain", finding.code().question());
            question.setId("review-question");
            nodes.add(question);
        }
    }

    private void notChecked(List<Node> nodes) {
        List<Finding> not = model.answer().get().stream()
                .flatMap(answer -> answer.result().findings().stream())
                .filter(finding -> NOT_CHECKED.contains(finding.code()))
                .toList();
        boolean alone =
                model.answer().get().filter(answer -> !answer.recomputed()).isPresent();
        if (!not.isEmpty() || alone) {
            nodes.add(line("sl-form-heading", Words.of("review.not.checked")));
        }
        if (alone) {
            boolean open = model.session().set().get().isPresent();
            nodes.add(line("sl-plain", Words.of(open ? "review.alone.undrawn" : "review.alone")));
        }
        not.forEach(finding -> nodes.add(line("sl-plain", finding.message())));
    }

    private static Label line(String style, String words) {
        Label line = new Label(words);
        line.setWrapText(true);
        line.setMinHeight(USE_PREF_SIZE);
        line.getStyleClass().add(style);
        return line;
    }
}
