package org.seepledger.desktop.platform;

import java.util.List;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.stage.Window;
import org.seepledger.desktop.port.Questions;

/** Questions in a dialog of their own. */
public final class ScreenQuestions implements Questions {

    private final Window owner;

    /**
     * Makes questions.
     *
     * @param owner the window that they belong to
     */
    public ScreenQuestions(Window owner) {
        this.owner = owner;
    }

    @Override
    public Optional<Integer> ask(String title, String question, List<String> answers) {
        List<ButtonType> buttons = answers.stream()
                .map(answer -> new ButtonType(answer, place(answers.indexOf(answer))))
                .toList();
        Alert alert = new Alert(Alert.AlertType.NONE, question, buttons.toArray(ButtonType[]::new));
        alert.initOwner(owner);
        alert.setTitle(title);
        alert.setHeaderText(title);
        alert.setOnCloseRequest(asked -> {
            if (alert.getResult() == null) {
                alert.setResult(ButtonType.CANCEL);
            }
        });
        return alert.showAndWait().map(buttons::indexOf).filter(index -> index >= 0);
    }

    private static ButtonBar.ButtonData place(int index) {
        return index == 0 ? ButtonBar.ButtonData.OK_DONE : ButtonBar.ButtonData.OTHER;
    }
}
