package org.seepledger.desktop.ledger;

import java.time.Month;
import java.time.format.TextStyle;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.IntStream;
import javafx.beans.binding.Bindings;
import javafx.beans.property.Property;
import javafx.beans.value.ObservableValue;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.VBox;
import org.seepledger.balance.Periods.Every;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.words.ChoiceWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** What is chosen above the table: period, rates or volumes, unit, arrangement; and whose budget it is. */
final class LedgerChoices extends VBox {

    private final Reading reading;
    private final LedgerSheets sheets;
    private final ChoiceBox<String> units = new ChoiceBox<>();
    private boolean filling;

    LedgerChoices(LedgerModel model) {
        this.reading = model.reading();
        this.sheets = model.sheets();
        getStyleClass().add("sl-choices");
        Label belongs = line("ledger-belongs", model.belongs(), "sl-belongs");
        Label closure = line("ledger-closure", model.closure(), "sl-small");
        closure.setTooltip(new Tooltip(Words.of("ledger.closure.why")));
        closure.managedProperty().bind(closure.textProperty().isNotEmpty());
        Label notes = line("ledger-notes", model.notes(), "sl-small", "sl-warning");
        notes.managedProperty().bind(notes.textProperty().isNotEmpty());
        FlowPane choices = new FlowPane(
                8,
                6,
                periods(),
                months(),
                amounts(model),
                units,
                box("ledger-arrangement", List.of(Arrangement.values()), LedgerChoices::arranged, model.arrangement()),
                copy(model),
                origin(model));
        getChildren().addAll(belongs, closure, notes, choices);
        units.setId("ledger-unit");
        units.setMinWidth(96);
        units.setConverter(new ChoiceWords<>(LedgerChoices::unit));
        units.setOnAction(chosen -> take());
        reading.changes().addListener((changes, before, after) -> fill());
        model.solute().addListener((solute, before, after) -> fill());
        fill();
    }

    private static Label line(String id, ObservableValue<String> text, String... styles) {
        Label line = new Label();
        line.setId(id);
        line.setWrapText(true);
        line.getStyleClass().addAll(styles);
        line.textProperty().bind(text);
        return line;
    }

    private static Button copy(LedgerModel model) {
        Button copy = new Button(Words.of("ledger.copy"));
        copy.setId("ledger-copy");
        copy.setTooltip(new Tooltip(Words.of("ledger.copy.tip")));
        copy.setOnAction(pressed -> model.copy());
        return copy;
    }

    private static Button origin(LedgerModel model) {
        Button origin = new Button(Words.of("ledger.origin.button"));
        origin.setId("ledger-origin");
        origin.setTooltip(new Tooltip(Words.of("ledger.origin")));
        origin.disableProperty()
                .bind(Bindings.createBooleanBinding(() -> model.chosen().get().isEmpty(), model.chosen()));
        origin.setOnAction(pressed -> model.askOrigin());
        return origin;
    }

    private ChoiceBox<Every> periods() {
        ChoiceBox<Every> box = box("ledger-period", reading.choices(), LedgerChoices::every, reading.every());
        box.setMinWidth(112);
        reading.dated().addListener((dated, before, after) -> {
            box.getItems().setAll(reading.choices());
            box.setValue(reading.every().get());
        });
        return box;
    }

    /** The month in which a water year begins, where water years are chosen. */
    private ChoiceBox<Integer> months() {
        List<Integer> all = IntStream.rangeClosed(1, 12).boxed().toList();
        ChoiceBox<Integer> box = box("ledger-month", all, LedgerChoices::month, reading.waterYearStart());
        box.visibleProperty().bind(reading.every().isEqualTo(Every.WATER_YEAR));
        box.managedProperty().bind(box.visibleProperty());
        return box;
    }

    private static String month(int month) {
        return Words.of("ledger.from.month", Month.of(month).getDisplayName(TextStyle.FULL, Locale.ENGLISH));
    }

    /** The unit with its powers raised. */
    private static String unit(String unit) {
        return Wording.raised(Measure.of(unit));
    }

    /** Rates, or what went through in all: volumes of water, masses of a solute. */
    private ChoiceBox<Boolean> amounts(LedgerModel model) {
        ChoiceBox<Boolean> box = box("ledger-amounts", List.of(false, true), this::amounts, reading.volumes());
        box.setMinWidth(96);
        model.solute().addListener((solute, before, after) -> {
            if (before.isEmpty() != after.isEmpty()) {
                box.getItems().setAll(false, true);
                box.setValue(reading.volumes().get());
            }
        });
        return box;
    }

    private String amounts(boolean all) {
        return Words.of(!all ? "ledger.rates" : sheets.ofSolute() ? "ledger.masses" : "ledger.volumes");
    }

    private static String arranged(Arrangement arrangement) {
        return Words.of("ledger.arranged." + arrangement.name().toLowerCase(Locale.ROOT));
    }

    private static String every(Every every) {
        return Words.of("ledger.every." + every.name().toLowerCase(Locale.ROOT));
    }

    private static <T> ChoiceBox<T> box(
            String id, List<T> choices, Function<T, String> words, Property<? super T> chosen) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId(id);
        box.setConverter(new ChoiceWords<>(words));
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

    private void fill() {
        filling = true;
        units.getItems().setAll(sheets.units());
        String unit = sheets.unit().get();
        units.setValue(
                unit.isEmpty() && !units.getItems().isEmpty() ? units.getItems().get(0) : unit);
        filling = false;
    }

    private void take() {
        if (!filling && units.getValue() != null) {
            sheets.unit().set(units.getValue());
        }
    }
}
