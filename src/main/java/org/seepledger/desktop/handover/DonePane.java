package org.seepledger.desktop.handover;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.BalanceOutcome;
import org.seepledger.job.HandoverOutcome;
import org.seepledger.job.PlumeOutcome;

/** What a handing over came to, and ways to it. */
final class DonePane extends VBox {

    private final HandoverModel model;
    private final Label done = new Label();
    private final Label limit = new Label();
    private final TextArea summary = new TextArea();
    private final Button report = button("handover.open.report", "handover-open-report");

    DonePane(HandoverModel model, Runnable close) {
        this.model = model;
        getStyleClass().add("sl-done");
        visibleProperty().bind(model.stage().isEqualTo(HandoverModel.Stage.DONE));
        done.setId("handover-done");
        limit.setId("handover-limit");
        limit.getStyleClass().add("sl-fault");
        for (Label line : List.of(done, limit)) {
            line.setWrapText(true);
            line.setMinHeight(USE_PREF_SIZE);
        }
        limit.managedProperty().bind(limit.textProperty().isNotEmpty());
        limit.visibleProperty().bind(limit.managedProperty());
        summary.setId("handover-summary");
        summary.setEditable(false);
        summary.getStyleClass().add("sl-code");
        setVgrow(summary, Priority.ALWAYS);
        getChildren().addAll(done, limit, summary, buttons(close));
        model.outcome().addListener((outcome, before, after) -> after.ifPresent(this::show));
    }

    private static Button button(String words, String id) {
        Button button = new Button(Words.of(words));
        button.setId(id);
        return button;
    }

    private HBox buttons(Runnable close) {
        Button folder = button("handover.open.folder", "handover-open-folder");
        folder.setOnAction(pressed -> model.openFolder());
        report.setOnAction(pressed -> model.openReport());
        Button again = button("handover.again", "handover-again");
        again.setOnAction(pressed -> model.chooseAgain());
        Button away = button("close", "handover-close");
        away.setOnAction(pressed -> close.run());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        return new HBox(8, folder, report, gap, again, away);
    }

    private void show(HandoverOutcome outcome) {
        done.setText(Words.of("handover.done", outcome.files().size(), outcome.out()));
        report.setDisable(outcome.report().isEmpty());
        limit.setText(model.limitWords());
        summary.setText(Stream.concat(
                        Stream.of(
                                        outcome.balance().map(BalanceOutcome::summary),
                                        outcome.plume().map(PlumeOutcome::summary))
                                .flatMap(Optional::stream),
                        Stream.of(Words.of("handover.files") + "\n  " + String.join("\n  ", outcome.files())))
                .collect(Collectors.joining("\n")));
    }
}
