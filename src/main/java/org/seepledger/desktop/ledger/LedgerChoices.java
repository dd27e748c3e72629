package org.seepledger.desktop.ledger;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import javafx.beans.property.Property;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** What is chosen above the table: period, rates or volumes, unit, arrangement; and whose budget it is. */
final class LedgerChoices extends VBox {

    private final Reading reading;
    private final ChoiceBox<String> units = new ChoiceBox<>();
    private boolean filling;

    LedgerChoices(LedgerModel model) {
        this.reading = model.reading();
        getStyleClass().add("sl-choices");
        Label belongs = new Label();
        belongs.setId("ledger-belongs");
        belongs.setWrapText(true);
        belongs.getStyleClass().add("sl-belongs");
        belongs.textProperty().bind(model.belongs());
        Label notes = new Label();
        notes.setId("ledger-notes");
        notes.setWrapText(true);
        notes.getStyleClass().addAll("sl-small", "sl-warning");
        notes.textProperty().bind(model.notes());
        notes.managedProperty().bind(notes.textProperty().isNotEmpty());
        Button copy = new Button(Words.of("ledger.copy"));
        copy.setId("ledger-copy");
        copy.setTooltip(new Tooltip(Words.of("ledger.copy.tip")));
        copy.setOnAction(pressed -> model.copy());
        FlowPane choices = new FlowPane(
                8,
                6,
                periods(),
                box("ledger-amounts", List.of(false, true), LedgerChoices::amounts, reading.volumes()),
                units,
                box("ledger-arrangement", List.of(Arrangement.values()), LedgerChoices::arranged, model.arrangement()),
                copy);
        getChildren().addAll(belongs, notes, choices);
        units.setId("ledger-unit");
        units.setMinWidth(96);
        units.setConverter(converter(LedgerChoices::unit));
        units.setOnAction(chosen -> take());
        reading.changes().addListener((changes, before, after) -> fill());
        fill();
    }

    private ChoiceBox<org.seepledger.balance.Periods.Every> periods() {
        var box = box("ledger-period", reading.choices(), LedgerChoices::every, reading.every());
        box.setMinWidth(112);
        reading.dated().addListener((dated, before, after) -> {
            box.getItems().setAll(reading.choices());
            box.setValue(reading.every().get());
        });
        return box;
    }

    /** The unit with its powers raised. */
    private static String unit(String unit) {
        return Wording.raised(Measure.of(unit));
    }

    private static String amounts(boolean volumes) {
        return Words.of(volumes ? "ledger.volumes" : "ledger.rates");
    }

    private static String arranged(Arrangement arrangement) {
        return Words.of("ledger.arranged." + arrangement.name().toLowerCase(Locale.ROOT));
    }

    private static String every(org.seepledger.balance.Periods.Every every) {
        return Words.of("ledger.every." + every.name().toLowerCase(Locale.ROOT));
    }

    private static <T> ChoiceBox<T> box(
            String id, List<T> choices, Function<T, String> words, Property<? super T> chosen) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId(id);
        box.setConverter(converter(words));
        box.getItems().setAll(choices);
        @SuppressWarnings("unchecked")
        Property<T> property = (Property<T>) chosen;
        box.valueProperty().addListener((value, before, after) -> {
            if (after != null) {
                property.setValue(after);
            }
        });
        property.addListener((value, before, after) -> box.setValue(after));
        box.setValue(property.getValue());
        return box;
    }

    private static <T> StringConverter<T> converter(Function<T, String> words) {
        return new StringConverter<>() {
            @Override
            public String toString(T choice) {
                return choice == null ? "" : words.apply(choice);
            }

            @Override
            public T fromString(String text) {
                throw new UnsupportedOperationException();
            }
        };
    }

    private void fill() {
        filling = true;
        units.getItems().setAll(reading.units());
        String unit = reading.unit().get();
        units.setValue(
                unit.isEmpty() && !units.getItems().isEmpty() ? units.getItems().get(0) : unit);
        filling = false;
    }

    private void take() {
        if (!filling && units.getValue() != null) {
            reading.unit().set(units.getValue());
        }
    }
}
