package org.seepledger.desktop.preferences;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import javafx.beans.property.Property;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** The page of preferences; each is taken up at once. */
public final class PreferencesPage extends VBox {

    private static final String SAMPLE = "12\u202f345.67";

    private final GridPane rows = new GridPane(14, 10);

    /**
     * Makes the page.
     *
     * @param model what is chosen
     * @param close puts the page away
     */
    public PreferencesPage(PreferencesModel model, Runnable close) {
        setId("preferences-page");
        getStyleClass().add("sl-sheet");
        setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
        Label title = new Label(Words.of("preferences.title"));
        title.getStyleClass().add("sl-heading");
        row("theme", List.of(Theme.values()), model.theme(), PreferencesPage::words);
        row("size", model.sizes(), model.size(), size -> size + "\u202f%");
        row("numbers", List.of(NumberForm.values()), model.numbers(), form -> form.of(SAMPLE));
        row("rate", withOwn(Reading.rateUnits()), model.rateUnit(), PreferencesPage::unit);
        row("volume", withOwn(Reading.volumeUnits()), model.volumeUnit(), PreferencesPage::unit);
        row("cover", model.covers(), model.cover(), cover -> cover + "\u202f%");
        Label note = new Label(Words.of("preferences.note"));
        note.getStyleClass().add("sl-small");
        note.setWrapText(true);
        note.setMaxWidth(460);
        note.setMinHeight(USE_PREF_SIZE);
        Button done = new Button(Words.of("close"));
        done.setDefaultButton(true);
        done.setCancelButton(true);
        done.setOnAction(pressed -> close.run());
        getChildren().addAll(title, rows, note, done);
    }

    /** Moves the keyboard to the first choice. */
    public void open() {
        rows.lookup(".choice-box").requestFocus();
    }

    private static String words(Theme theme) {
        return Words.of("preferences.theme." + theme.name().toLowerCase(Locale.ROOT));
    }

    private static List<String> withOwn(List<String> units) {
        List<String> all = new ArrayList<>(List.of(""));
        all.addAll(units);
        return all;
    }

    private static String unit(String unit) {
        return unit.isEmpty() ? Words.of("preferences.own") : Wording.raised(Measure.of(unit));
    }

    private <T> void row(String name, List<T> choices, Property<T> property, Function<T, String> words) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId("preference-" + name);
        box.setMaxWidth(Double.MAX_VALUE);
        box.setConverter(new ChoiceWords<>(words));
        box.getItems().setAll(choices);
        box.valueProperty().bindBidirectional(property);
        Label label = new Label(Words.of("preferences." + name));
        label.setLabelFor(box);
        rows.addRow(rows.getRowCount(), label, box);
    }
}
