package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Item;
import org.seepledger.intake.Place;
import org.seepledger.io.table.TableLook;

/** A table: its first lines with what each column is for, and what is made of its values. */
final class TablePane extends VBox {

    private static final int LINES = 6;
    private static final double PLACE_WIDTH = 122;

    private final IntakeModel model;
    private final Item.Table item;

    TablePane(IntakeModel model, Item.Table item) {
        super(14);
        this.model = model;
        this.item = item;
        ScrollPane scroll = new ScrollPane(lines());
        scroll.getStyleClass().add("sl-preview");
        scroll.setVbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.setMinHeight(Math.min(LINES, item.file().look().lines()) * 20 + 84);
        getChildren().addAll(facts(), scroll);
        for (int use = 0; use < item.uses().size(); use++) {
            getChildren().add(new UsePane(model, item, use));
        }
    }

    private Label facts() {
        TableLook look = item.file().look();
        String separator = switch (look.separator()) {
            case '\t' -> Words.of("intake.table.tab");
            case ';' -> Words.of("intake.table.semicolon");
            default -> Words.of("intake.table.comma");
        };
        return new Label(Words.of("intake.table", look.lines(), look.columns().size(), separator));
    }

    private Node lines() {
        TableLook look = item.file().look();
        GridPane grid = new GridPane(10, 4);
        grid.setId("intake-lines");
        for (int column = 0; column < look.columns().size(); column++) {
            int index = column;
            List<Place> places = new ArrayList<>(Arrays.asList(Place.values()));
            ComboBox<Place> place = Form.choice(
                    "intake-place-" + column,
                    places,
                    item.places().get(column),
                    TablePane::words,
                    chosen -> model.change(now -> ((Item.Table) now).withPlace(index, chosen)));
            place.setPrefWidth(PLACE_WIDTH);
            grid.add(place, column, 0);
            Label heading = new Label(look.columns().get(column).heading());
            heading.getStyleClass().add("sl-strong");
            heading.setMinWidth(USE_PREF_SIZE);
            grid.add(heading, column, 1);
            for (int line = 0; line < Math.min(LINES, look.sample().size()); line++) {
                Label cell = new Label(look.sample().get(line).get(column));
                cell.setMaxWidth(160);
                grid.add(cell, column, 2 + line);
            }
        }
        return grid;
    }

    private static String words(Place place) {
        return Words.of("intake.place." + place.name().toLowerCase(Locale.ROOT).replace('_', '.'));
    }
}
