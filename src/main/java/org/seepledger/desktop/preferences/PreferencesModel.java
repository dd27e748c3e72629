package org.seepledger.desktop.preferences;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.Property;
import javafx.beans.property.SimpleObjectProperty;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.port.Settings;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.desktop.words.NumberForm;

/** What users want for good. What is kept and not known, or no longer allowed, counts as not kept. */
public final class PreferencesModel {

    private static final List<Integer> SIZES = List.of(100, 125, 150, 175, 200);
    private static final List<Integer> COVERS = List.of(80, 60, 40);
    private static final int USUAL_COVER = 60;

    private final ObjectProperty<Theme> theme = new SimpleObjectProperty<>(Theme.LIGHT);
    private final ObjectProperty<Integer> size = new SimpleObjectProperty<>(SIZES.get(0));
    private final ObjectProperty<NumberForm> numbers = new SimpleObjectProperty<>(NumberForm.SPACE_POINT);
    private final ObjectProperty<String> rateUnit = new SimpleObjectProperty<>("");
    private final ObjectProperty<String> volumeUnit = new SimpleObjectProperty<>("");
    private final ObjectProperty<Integer> cover = new SimpleObjectProperty<>(USUAL_COVER);

    /**
     * Takes up what is kept.
     *
     * @param settings where it is kept
     */
    public PreferencesModel(Settings settings) {
        keep(settings, "theme", theme, List.of(Theme.values()), PreferencesModel::name);
        keep(settings, "size", size, SIZES, String::valueOf);
        keep(settings, "numbers", numbers, List.of(NumberForm.values()), PreferencesModel::name);
        keep(settings, "unit.rate", rateUnit, Reading.rateUnits(), unit -> unit);
        keep(settings, "unit.volume", volumeUnit, Reading.volumeUnits(), unit -> unit);
        keep(settings, "cover", cover, COVERS, String::valueOf);
    }

    private static String name(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT);
    }

    private static <T> void keep(
            Settings settings, String key, Property<T> property, List<T> choices, Function<T, String> text) {
        settings.get("preference." + key)
                .flatMap(kept -> choices.stream()
                        .filter(choice -> text.apply(choice).equals(kept))
                        .findFirst())
                .ifPresent(property::setValue);
        property.addListener((value, before, after) -> settings.put("preference." + key, text.apply(after)));
    }

    /** {@return light or dark} */
    public ObjectProperty<Theme> theme() {
        return theme;
    }

    /** {@return how large everything is, in percent} */
    public ObjectProperty<Integer> size() {
        return size;
    }

    /** {@return the sizes to choose from} */
    public List<Integer> sizes() {
        return SIZES;
    }

    /**
     * Takes the next size up or down, if there is one.
     *
     * @param steps up if positive
     */
    public void resize(int steps) {
        int place = SIZES.indexOf(size.get()) + steps;
        size.set(SIZES.get(Math.max(0, Math.min(SIZES.size() - 1, place))));
    }

    /** {@return how numbers are written in the window} */
    public ObjectProperty<NumberForm> numbers() {
        return numbers;
    }

    /** {@return the unit of rates of a set that is opened; empty for the set's own} */
    public ObjectProperty<String> rateUnit() {
        return rateUnit;
    }

    /** {@return the unit of volumes of a set that is opened; empty for the set's own} */
    public ObjectProperty<String> volumeUnit() {
        return volumeUnit;
    }

    /** {@return how strongly values cover a picture that lies under them, in percent} */
    public ObjectProperty<Integer> cover() {
        return cover;
    }

    /** {@return the strengths to choose from} */
    public List<Integer> covers() {
        return COVERS;
    }
}
