package org.seepledger.desktop.intake;

import java.util.List;
import java.util.function.Consumer;
import javafx.scene.control.Button;
import javafx.scene.layout.VBox;
import javafx.scene.text.TextAlignment;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Finding;

/** What is wrong, missing or doubtful; each sentence leads to where it is mended. */
final class FindingsBox extends VBox {

    private final Consumer<Finding> go;

    FindingsBox(Consumer<Finding> go) {
        super(6);
        this.go = go;
    }

    void show(List<Finding> findings) {
        getChildren().setAll(findings.stream().map(this::line).toList());
        setManaged(!findings.isEmpty());
    }

    private Button line(Finding finding) {
        Button line = new Button(Words.of("intake.finding", mark(finding.level()), finding.words()));
        line.setMnemonicParsing(false);
        line.setWrapText(true);
        line.setTextAlignment(TextAlignment.LEFT);
        line.getStyleClass().setAll("sl-finding", style(finding.level()));
        line.setMaxWidth(Double.MAX_VALUE);
        line.setMinSize(0, USE_PREF_SIZE);
        line.setOnAction(pressed -> go.accept(finding));
        return line;
    }

    private static String mark(Finding.Level level) {
        return switch (level) {
            case FAULT -> Words.of("intake.level.fault");
            case DOUBT -> Words.of("intake.level.doubt");
            case NOTE -> Words.of("intake.level.note");
        };
    }

    private static String style(Finding.Level level) {
        return switch (level) {
            case FAULT -> "fault";
            case DOUBT -> "doubt";
            case NOTE -> "fine";
        };
    }
}
