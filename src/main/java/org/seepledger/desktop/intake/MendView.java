package org.seepledger.desktop.intake;

import java.nio.file.Path;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.control.TextArea;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.scene.text.TextAlignment;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.aquifer.AquiferDraft;
import org.seepledger.job.MendJob;

/** The page on which the description of an aquifer folder is mended: its text, and faults that lead to their places. */
public final class MendView extends BorderPane {

    private final MendModel model;
    private final TextArea text = new TextArea();
    private final Label title = new Label();
    private final Label verdict = new Label();
    private final VBox faults = new VBox(6);
    private final TextArea report = new TextArea();
    private final Button save = new Button(Words.of("intake.mend.save"));

    /**
     * Builds the page.
     *
     * @param model the folder and its text
     */
    public MendView(MendModel model) {
        this.model = model;
        setId("mend");
        getStyleClass().add("sl-intake");
        text.setId("mend-text");
        text.getStyleClass().add("sl-typed");
        text.textProperty().bindBidirectional(model.text());
        setTop(bar());
        SplitPane panes = new SplitPane(text, outcome());
        panes.setDividerPositions(0.58);
        setCenter(panes);
        model.folder().addListener((now, before, after) -> show());
        model.finding().addListener((now, before, after) -> show());
        model.state().addListener((now, before, after) -> show());
        show();
    }

    private Node bar() {
        title.getStyleClass().add("sl-name");
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        Button back = new Button(Words.of("intake.back"));
        back.setId("mend-back");
        back.setOnAction(pressed -> model.leave());
        HBox bar = new HBox(title, gap, back);
        bar.getStyleClass().add("sl-caption");
        return bar;
    }

    private Node outcome() {
        verdict.setId("mend-verdict");
        verdict.setWrapText(true);
        report.setEditable(false);
        report.getStyleClass().add("sl-typed");
        VBox.setVgrow(report, Priority.ALWAYS);
        VBox content = new VBox(10, faults, report);
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.setFitToHeight(true);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        save.setId("mend-save");
        save.getStyleClass().add("accent");
        save.setOnAction(pressed -> model.save());
        Label before = new Label(Words.of("intake.mend.before"));
        before.getStyleClass().add("sl-small");
        before.setWrapText(true);
        VBox outcome = new VBox(10, verdict, scroll, before, save);
        outcome.getStyleClass().add("sl-intake-outcome");
        return outcome;
    }

    private void show() {
        title.setText(model.folder()
                .get()
                .map(Path::getFileName)
                .map(name -> Words.of("intake.mend.title", name))
                .orElse(""));
        faults.getChildren()
                .setAll(model.finding().get().faults().stream().map(this::line).toList());
        faults.setManaged(!faults.getChildren().isEmpty());
        String says = model.finding().get().report();
        report.setText(says);
        report.setVisible(!says.isEmpty());
        PaneState state = model.state().get();
        boolean ready = state.phase() == PaneState.Phase.READY;
        String checked = faults.isManaged() ? Words.of("intake.mend.faults") : Words.of("intake.mend.sound");
        verdict.setText(ready ? checked : state.words());
        save.setDisable(!model.isSound());
    }

    private Button line(MendJob.Fault fault) {
        String where = fault.stretch()
                .map(this::lineOf)
                .map(line -> Words.of("intake.mend.line", line))
                .orElse("aquifer.json");
        Button line = new Button(Words.of("intake.finding", where, fault.words()));
        line.setMnemonicParsing(false);
        line.setWrapText(true);
        line.setTextAlignment(TextAlignment.LEFT);
        line.getStyleClass().setAll("sl-finding", "fault");
        line.setMaxWidth(Double.MAX_VALUE);
        line.setMinSize(0, USE_PREF_SIZE);
        line.setOnAction(pressed -> fault.stretch().ifPresent(this::go));
        return line;
    }

    private long lineOf(AquiferDraft.Stretch stretch) {
        String before = text.getText().substring(0, Math.min(stretch.from(), text.getLength()));
        return before.chars().filter(c -> c == '\n').count() + 1;
    }

    private void go(AquiferDraft.Stretch stretch) {
        text.requestFocus();
        text.selectRange(Math.min(stretch.from(), text.getLength()), Math.min(stretch.to(), text.getLength()));
    }
}
