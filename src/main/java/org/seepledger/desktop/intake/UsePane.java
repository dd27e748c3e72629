package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Item;
import org.seepledger.intake.Means;
import org.seepledger.intake.Place;
import org.seepledger.intake.Role;
import org.seepledger.intake.Use;

/** What is made of a part of an item: role, name, unit, layer, sign. */
final class UsePane extends VBox {

    private static final List<String> LENGTHS = List.of("", "m", "cm", "ft", "ftUS");
    private static final List<String> RATES =
            List.of("", "m/d", "m/s", "mm/d", "mm/yr", "m/yr", "cm/d", "ft/d", "in/yr");
    private static final List<String> FLOWS =
            List.of("", "m3/d", "m3/s", "L/s", "m3/yr", "ft3/d", "ft3/s", "gal/min", "acre-ft/yr");

    private final IntakeModel model;
    private final Item item;
    private final int index;
    private final Use use;
    private final Form form = new Form();

    UsePane(IntakeModel model, Item item, int index) {
        super(6);
        this.model = model;
        this.item = item;
        this.index = index;
        this.use = item.uses().get(index);
        if (!use.part().isEmpty()) {
            Label part = new Label(
                    item instanceof Item.Table
                            ? Words.of("intake.column", use.part())
                            : Words.of("intake.band", use.part()));
            part.getStyleClass().add("sl-strong");
            getChildren().add(part);
        }
        form.line(Words.of("intake.role"), role());
        form.note(new Label(use.guess().reason()));
        if (use.role().isNamed()) {
            String key = use.role() == Role.CONCENTRATION ? "intake.solute" : "intake.category";
            form.line(
                    Words.of(key),
                    new Field("intake-name-" + index, text -> model.changeUse(index, now -> now.withName(text)))
                            .show(use.name()));
        }
        if (units().size() > 1) {
            form.line(Words.of("intake.unit"), unit());
        }
        if (hasLayer()) {
            form.line(Words.of("intake.layer"), layer());
        }
        if (use.role().isSource() || use.role() == Role.SUPPLIED) {
            form.line("", turned());
        }
        getChildren().add(form);
    }

    private ComboBox<Role> role() {
        List<Role> roles = item instanceof Item.Other
                ? List.of(Role.NONE, Role.PRISMS)
                : item instanceof Item.Table table && table.arePoints()
                        ? List.of(Role.NONE, Role.POINTS)
                        : Arrays.stream(Role.values())
                                .filter(role -> role != Role.PRISMS && role != Role.POINTS)
                                .toList();
        return Form.choice(
                "intake-role-" + index,
                roles,
                use.role(),
                ItemRows::role,
                role -> model.changeUse(index, now -> now.role() == role ? now : now.withRole(role)));
    }

    private List<String> units() {
        return switch (use.role().amount()) {
            case LENGTH -> LENGTHS;
            case RATE -> RATES;
            case FLOW -> FLOWS;
            case PER_LENGTH -> List.of("", "1/m", "1/ft");
            case CONCENTRATION -> List.of("mg/L", "ug/L", "ng/L", "g/m3", "kg/m3");
            case DENSITY -> List.of("", "kg/m3", "g/m3");
            default -> List.of();
        };
    }

    private ComboBox<String> unit() {
        List<String> units = new ArrayList<>(units());
        if (!units.contains(use.unit())) {
            units.add(use.unit());
        }
        return Form.choice(
                "intake-unit-" + index,
                units,
                use.unit(),
                unit -> unit.isEmpty() ? Words.of("intake.unit.own") : unit,
                unit -> model.changeUse(index, now -> now.withUnit(unit)));
    }

    /** A layer is asked for where neither name, nor bands, nor lines tell it. */
    private boolean hasLayer() {
        boolean told = item instanceof Item.Rasters rasters
                        && (rasters.fields().contains(Means.LAYER)
                                || rasters.bands() == Means.LAYER && use.column() < 0)
                || item instanceof Item.Table table && table.places().contains(Place.LAYER);
        return !told && use.role() != Role.NONE && use.role() != Role.PRISMS && use.role() != Role.POINTS;
    }

    private ComboBox<Integer> layer() {
        int last = model.making().made().get().map(now -> now.copied().layers()).orElse(1);
        int first = use.role().isSurface() ? 1 : 0;
        List<Integer> layers = IntStream.rangeClosed(first, Math.max(last, use.layer()) + 1)
                .boxed()
                .toList();
        return Form.choice(
                "intake-layer-" + index,
                layers,
                use.layer(),
                layer -> layer == 0 ? Words.of("intake.layer.all") : Words.of("intake.layer.number", layer),
                layer -> model.changeUse(index, now -> now.inLayer(layer)));
    }

    private CheckBox turned() {
        CheckBox box = new CheckBox(Words.of("intake.turned"));
        box.setId("intake-turned-" + index);
        box.setSelected(use.turned());
        box.setOnAction(picked -> model.changeUse(index, now -> now.turned(box.isSelected())));
        return box;
    }

    static String means(Means means) {
        return Words.of("intake.means." + means.name().toLowerCase(Locale.ROOT));
    }
}
