package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.Locale;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The window on a machine that is set to another country. */
class LocaleWindowTest {

    private final Locale before = Locale.getDefault();

    @AfterEach
    void comeBack() {
        Locale.setDefault(before);
    }

    @ParameterizedTest
    @ValueSource(strings = {"de-DE", "tr-TR"})
    void itOpensDrawsASetAndCopiesItsBudget(String country) {
        Locale.setDefault(Locale.forLanguageTag(country));
        try (OpenWindow window = new OpenWindow(1280, 800)) {
            window.openSet(Path.of("sample-aquifers/valley"));
            window.await(() -> !window.robot
                    .lookup("#ledger-belongs")
                    .queryAs(Label.class)
                    .getText()
                    .isEmpty());
            window.robot
                    .press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.C)
                    .release(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.C);
            window.await(() -> !window.answers.copied.isEmpty());
            assertThat(window.answers.copied.get(0))
                    .containsPattern("\\d\\.\\d{6}")
                    .doesNotContainPattern("\\d,\\d");
            window.robot.press(KeyCode.F1).release(KeyCode.F1);
            window.robot.clickOn("#actions-sought").write("LIST ALL");
            assertThat(window.robot.lookup("List all actions").tryQuery()).isPresent();
        }
    }
}
