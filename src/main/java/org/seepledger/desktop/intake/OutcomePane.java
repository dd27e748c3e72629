package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Finding;
import org.seepledger.job.Inspection;

/** What the files make: what stands in the way, what the check says, and the writing. */
final class OutcomePane extends VBox {

    private final IntakeModel model;
    private final FindingsBox findings;
    private final Label verdict = new Label();
    private final TextArea checked = new TextArea();
    private final TextField target = new TextField();
    private final Label size = new Label();
    private final Label obstacles = new Label();
    private final Label written = new Label();
    private final Button write = new Button(Words.of("intake.write"));
    private final Button describe = new Button(Words.of("intake.describe"));
    private final Button cancel = new Button(Words.of("intake.cancel"));

    OutcomePane(IntakeModel model, Consumer<Finding> go) {
        super(10);
        this.model = model;
        this.findings = new FindingsBox(go);
        setId("intake-outcome");
        getStyleClass().add("sl-intake-outcome");
        verdict.setId("intake-verdict");
        verdict.setWrapText(true);
        verdict.setMinHeight(USE_PREF_SIZE);
        checked.setId("intake-check");
        checked.setEditable(false);
        checked.getStyleClass().add("sl-typed");
        checked.setPrefRowCount(12);
        VBox content = new VBox(10, findings, checked);
        VBox.setVgrow(checked, Priority.ALWAYS);
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().addAll(Form.heading("intake.heading.outcome"), verdict, scroll, writing());
        model.making().made().addListener((now, before, after) -> show());
        model.making().check().addListener((now, before, after) -> show());
        model.writing().state().addListener((now, before, after) -> show());
        show();
    }

    private VBox writing() {
        target.setId("intake-target");
        target.textProperty().bindBidirectional(model.writing().target());
        HBox.setHgrow(target, Priority.ALWAYS);
        Button choose = new Button(Words.of("intake.target.choose"));
        choose.setOnAction(pressed -> model.writing().choose());
        write.setId("intake-write");
        write.getStyleClass().add("accent");
        write.setOnAction(pressed -> model.write());
        describe.setId("intake-describe");
        describe.setOnAction(pressed -> model.describe());
        cancel.setId("intake-cancel");
        cancel.setOnAction(pressed -> model.writing().cancel());
        for (Button button : List.of(write, describe, cancel, choose)) {
            button.setMinWidth(USE_PREF_SIZE);
        }
        for (Label label : List.of(size, obstacles, written)) {
            label.setWrapText(true);
            label.setMinHeight(USE_PREF_SIZE);
        }
        size.getStyleClass().add("sl-small");
        obstacles.getStyleClass().add("sl-small");
        written.setId("intake-written");
        Label where = new Label(Words.of("intake.target.label"));
        where.getStyleClass().add("sl-muted");
        return new VBox(
                8,
                where,
                new HBox(6, target, choose),
                size,
                new FlowPane(8, 8, write, describe, cancel),
                obstacles,
                written);
    }

    private void show() {
        PaneState check = model.making().check().get().state();
        boolean failed = check.phase() == PaneState.Phase.FAILED;
        verdict.getStyleClass().remove("sl-fault");
        if (failed) {
            verdict.getStyleClass().add("sl-fault");
        }
        Optional<Inspection> says = model.making().check().get().says();
        checked.setText(says.map(Inspection::text).orElse(""));
        boolean told = says.isPresent();
        checked.setVisible(told);
        checked.setManaged(told);
        findings.show(findings());
        verdict.setText(model.making().made().get().map(this::verdict).orElse(""));
        model.making().made().get().ifPresent(this::showWriting);
        PaneState state = model.writing().state().get();
        boolean working = state.phase() == PaneState.Phase.WORKING;
        written.getStyleClass().remove("sl-fault");
        if (state.phase() == PaneState.Phase.FAILED) {
            written.getStyleClass().add("sl-fault");
        }
        written.setText(state.words());
        written.setManaged(!state.words().isEmpty());
        cancel.setVisible(working);
        cancel.setManaged(working);
        boolean sound = !failed
                && model.making()
                        .made()
                        .get()
                        .map(Made::copied)
                        .filter(Composition::isSound)
                        .isPresent();
        write.setDisable(working || !sound);
        describe.setDisable(working
                || failed
                || model.making()
                        .made()
                        .get()
                        .map(Made::placed)
                        .filter(Composition::isSound)
                        .isEmpty());
    }

    /** What stands in the way, and what the check warns of. */
    private List<Finding> findings() {
        List<Finding> all = new ArrayList<>(
                model.making().made().get().map(now -> now.copied().findings()).orElse(List.of()));
        model.making()
                .check()
                .get()
                .says()
                .ifPresent(says -> says.warnings()
                        .forEach(words ->
                                all.add(new Finding(Finding.Level.DOUBT, Optional.empty(), Optional.empty(), words))));
        return all;
    }

    private String verdict(Made made) {
        PaneState check = model.making().check().get().state();
        if (check.phase() == PaneState.Phase.FAILED || check.phase() == PaneState.Phase.WORKING) {
            return check.words();
        }
        long faults = made.copied().findings().stream()
                .filter(finding -> finding.level() == Finding.Level.FAULT)
                .count();
        return faults == 0
                ? Words.of("intake.check.sound")
                : faults == 1 ? Words.of("intake.check.one") : Words.of("intake.check.faults", faults);
    }

    private void showWriting(Made made) {
        size.setText(Words.of(
                "intake.size", made.copied().copies().size(), bytes(made.plan().bytes())));
        List<String> reasons = made.placed().obstacles();
        obstacles.setText(
                reasons.isEmpty() ? Words.of("intake.place", made.plan().root()) : why(reasons));
    }

    private static String why(List<String> reasons) {
        return reasons.size() == 1
                ? Words.of("intake.obstacle", reasons.get(0))
                : Words.of("intake.obstacles", reasons.get(0), reasons.size() - 1);
    }

    private static String bytes(long bytes) {
        if (bytes < 1_000_000) {
            return Words.of("intake.kilobytes", Math.max(1, Math.round(bytes / 1e3)));
        }
        return bytes < 1_000_000_000
                ? Words.of("intake.megabytes", Math.round(bytes / 1e5) / 10.0)
                : Words.of("intake.gigabytes", Math.round(bytes / 1e8) / 10.0);
    }
}
