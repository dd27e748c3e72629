package org.seepledger.desktop.shell;

import javafx.beans.value.ObservableValue;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.SoluteCautions;

/** The caution in full. */
final class CautionPage extends VBox {

    CautionPage(ObservableValue<Boolean> solutes, Runnable close) {
        setId("caution-page");
        getStyleClass().add("sl-sheet");
        setMaxSize(600, USE_PREF_SIZE);
        Label title = new Label(Words.of("caution.title"));
        title.getStyleClass().add("sl-heading");
        VBox sentences = new VBox(12);
        Disclaimer.sentences().forEach(sentence -> sentences.getChildren().add(line(sentence)));
        VBox ofSolutes = new VBox(12);
        SoluteCautions.sentences().forEach(sentence -> ofSolutes.getChildren().add(line(sentence)));
        ofSolutes.visibleProperty().bind(solutes);
        ofSolutes.managedProperty().bind(ofSolutes.visibleProperty());
        sentences.getChildren().add(ofSolutes);
        Button done = new Button(Words.of("close"));
        done.setDefaultButton(true);
        done.setCancelButton(true);
        done.setOnAction(pressed -> close.run());
        getChildren().addAll(title, sentences, done);
    }

    private static Label line(String sentence) {
        Label line = new Label(sentence);
        line.setWrapText(true);
        line.setMinHeight(USE_PREF_SIZE);
        return line;
    }

    @Override
    public void requestFocus() {
        getChildren().get(getChildren().size() - 1).requestFocus();
    }
}
