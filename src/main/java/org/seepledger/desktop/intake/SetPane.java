package org.seepledger.desktop.intake;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.seepledger.aquifer.Axis;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Wishes;
import org.seepledger.intake.Wishes.Topic;
import org.seepledger.unit.Figures;

/** The set as a whole: what the files tell of it, and what a person says instead or beside. */
final class SetPane extends VBox {

    private final IntakeModel model;
    private final Map<Topic, Field> fields = new EnumMap<>(Topic.class);
    private final Map<Topic, ComboBox<String>> choices = new EnumMap<>(Topic.class);
    private final CheckBox skip = new CheckBox(Words.of("intake.skip"));
    private final Label gridReason = new Label();
    private final Label timesReason = new Label();

    SetPane(IntakeModel model) {
        super(12);
        this.model = model;
        setId("intake-set");
        Form set = new Form();
        field(set, Topic.NAME);
        field(set, Topic.CRS);
        choice(set, Topic.LENGTH_UNIT, List.of("", "m", "ft", "ftUS"));
        choice(set, Topic.TIME_UNIT, List.of("", "d", "s", "h", "yr"));
        Form grid = new Form();
        grid.note(gridReason);
        field(grid, Topic.X);
        field(grid, Topic.Y);
        field(grid, Topic.ROTATION);
        Form times = new Form();
        times.note(timesReason);
        field(times, Topic.START);
        field(times, Topic.TIMES);
        skip.setId("intake-skip");
        skip.setWrapText(true);
        skip.setOnAction(picked -> model.say(Topic.SKIP_FIRST, skip.isSelected() ? "yes" : ""));
        times.line("", skip);
        Form layers = new Form();
        field(layers, Topic.LAYERS);
        field(layers, Topic.WATER_TABLE);
        choice(layers, Topic.FLOW, List.of("", "head_gradient", "darcy_flux", "face_flow"));
        choice(layers, Topic.SIDES, List.of("", "open", "closed"));
        Form numbers = new Form();
        for (Topic topic : List.of(
                Topic.TOP,
                Topic.BOTTOM,
                Topic.HEAD,
                Topic.CONDUCTIVITY,
                Topic.VERTICAL_CONDUCTIVITY,
                Topic.VERTICAL_SHARE,
                Topic.SPECIFIC_YIELD,
                Topic.SPECIFIC_STORAGE,
                Topic.POROSITY,
                Topic.RECHARGE)) {
            field(numbers, topic);
        }
        Label hint = new Label(Words.of("intake.numbers.hint"));
        hint.getStyleClass().add("sl-small");
        hint.setWrapText(true);
        getChildren()
                .addAll(
                        set,
                        Form.heading("intake.heading.grid"),
                        grid,
                        Form.heading("intake.heading.times"),
                        times,
                        Form.heading("intake.heading.layers"),
                        layers,
                        Form.heading("intake.heading.numbers"),
                        hint,
                        numbers);
    }

    private static String key(Topic topic) {
        return topic.name().toLowerCase(Locale.ROOT).replace('_', '.');
    }

    static String words(Topic topic) {
        return Words.of("intake.topic." + key(topic));
    }

    private void field(Form form, Topic topic) {
        Field field = new Field("intake-" + key(topic).replace('.', '-'), text -> model.say(topic, text));
        fields.put(topic, field);
        form.line(words(topic), field);
    }

    private void choice(Form form, Topic topic, List<String> values) {
        ComboBox<String> box = Form.choice(
                "intake-" + key(topic).replace('.', '-'),
                values,
                "",
                value -> value.isEmpty() ? Words.of("intake.told." + key(topic)) : value(value),
                value -> model.say(topic, value));
        choices.put(topic, box);
        form.line(words(topic), box);
    }

    private static String value(String value) {
        return switch (value) {
            case "head_gradient" -> Words.of("intake.flow.gradient");
            case "darcy_flux" -> Words.of("intake.flow.flux");
            case "face_flow" -> Words.of("intake.flow.faces");
            case "open" -> Words.of("intake.sides.open");
            case "closed" -> Words.of("intake.sides.closed");
            default -> value;
        };
    }

    /** Puts the keyboard where something can be said of a topic. */
    void focus(Topic topic) {
        if (fields.containsKey(topic)) {
            fields.get(topic).requestFocus();
        } else if (choices.containsKey(topic)) {
            choices.get(topic).requestFocus();
        } else {
            skip.requestFocus();
        }
    }

    void show(Plan plan, Optional<Made> made) {
        Wishes wishes = plan.wishes();
        fields.forEach((topic, field) -> field.show(wishes.of(topic)));
        choices.forEach((topic, box) -> {
            if (!box.getValue().equals(wishes.of(topic))) {
                box.setValue(wishes.of(topic));
            }
        });
        skip.setSelected(wishes.has(Topic.SKIP_FIRST));
        made.ifPresent(now -> show(now.copied()));
    }

    private void show(Composition composition) {
        gridReason.setText(composition.grid().reason());
        timesReason.setText(composition.times().reason());
        composition.grid().grid().ifPresent(grid -> {
            prompt(Topic.X, axis(grid.x()));
            prompt(Topic.Y, axis(grid.y()));
            prompt(Topic.ROTATION, Figures.typeset(grid.rotation()));
        });
        prompt(Topic.NAME, String.valueOf(composition.set().get("name")));
        Object crs = composition.set().get("crs");
        prompt(Topic.CRS, crs == null ? Words.of("intake.local") : String.valueOf(crs));
        prompt(Topic.START, composition.times().start());
        prompt(Topic.TIMES, few(composition.times().instants()));
        prompt(Topic.WATER_TABLE, "1");
        prompt(Topic.LAYERS, Words.of("intake.prompt.layers", composition.layers()));
        prompt(Topic.VERTICAL_SHARE, Words.of("intake.prompt.share"));
        prompt(Topic.RECHARGE, Words.of("intake.prompt.recharge"));
    }

    private void prompt(Topic topic, String text) {
        fields.get(topic).setPromptText(text);
    }

    private static String axis(Axis axis) {
        return axis.isEven()
                ? Words.of("intake.axis", Figures.typeset(axis.origin()), Figures.typeset(axis.edge(1)), axis.count())
                : Words.of("intake.axis.uneven", axis.count());
    }

    private static String few(List<Double> instants) {
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < Math.min(5, instants.size()); i++) {
            texts.add(Figures.typeset(instants.get(i)));
        }
        String last = instants.size() > 5 ? " … " + Figures.typeset(instants.get(instants.size() - 1)) : "";
        return String.join(", ", texts) + last;
    }
}
