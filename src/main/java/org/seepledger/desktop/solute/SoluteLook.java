package org.seepledger.desktop.solute;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.aquifer.Solute;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.PlumeRequest.Threshold;
import org.seepledger.job.SoluteBench;
import org.seepledger.unit.Measure;

/** How solutes are looked at: with or without dispersion, above which concentration, with which track. */
public final class SoluteLook {

    private static final Pattern TYPED = Pattern.compile("\\s*(\\d+(?:[.,]\\d+)?(?:[eE][-+]?\\d{1,3})?)\\s*(\\S*)\\s*");
    private static final Measure KG_PER_M3 = Measure.of("kg/m3");

    private final Session session;
    private final BooleanProperty dispersion = new SimpleBooleanProperty();
    private final ObjectProperty<Optional<Threshold>> threshold = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Track> track = new SimpleObjectProperty<>(Track.OF_PRISM);
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();

    /** Whose centre of mass is followed. */
    public enum Track {
        /** Nobody's. */
        NONE,
        /** The selected prism's. */
        OF_PRISM,
        /** The whole set's. */
        OF_SET
    }

    /**
     * Looks at no solute yet.
     *
     * @param session what the window looks at
     */
    public SoluteLook(Session session) {
        this.session = session;
        for (ObservableValue<?> cause : List.of(dispersion, threshold)) {
            cause.addListener((value, before, after) -> changes.set(changes.get() + 1));
        }
    }

    /** {@return whether dispersion is booked where it is known} */
    public BooleanProperty dispersion() {
        return dispersion;
    }

    /** {@return the concentration above which area and volume are counted} */
    public ObjectProperty<Optional<Threshold>> threshold() {
        return threshold;
    }

    /** {@return whose centre of mass is followed on the map} */
    public ObjectProperty<Track> track() {
        return track;
    }

    /** {@return how often something that budgets depend on has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return the solute looked at, if it is not the water} */
    public Optional<Solute> solute() {
        String name = session.solute().get();
        return session.set()
                .get()
                .flatMap(set -> set.solutes().stream()
                        .filter(solute -> solute.name().equals(name))
                        .findFirst());
    }

    /**
     * {@return how solutes of a set are balanced}
     *
     * @param set the set
     */
    public SoluteBench.Choice choice(OpenSet set) {
        return new SoluteBench.Choice(
                dispersion.get(),
                threshold
                        .get()
                        .map(typed ->
                                OptionalDouble.of(typed.kilograms(set.aquifer().lengthUnit())))
                        .orElse(OptionalDouble.empty()));
    }

    /**
     * Takes a concentration that was typed: a number in the solute's own unit, or with a unit after it; nothing for none.
     *
     * @param text what was typed
     * @return whether it was taken
     */
    public boolean type(String text) {
        if (text.isBlank()) {
            threshold.set(Optional.empty());
            return true;
        }
        try {
            threshold.set(Optional.of(typed(text)));
            return true;
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    /** {@return what can be typed, in a sentence} */
    public String wanted() {
        return Words.of("solute.threshold.refused", unit());
    }

    private Threshold typed(String text) {
        Matcher typed = TYPED.matcher(text);
        if (!typed.matches()) {
            throw new IllegalArgumentException(text);
        }
        Measure unit = Measure.of(typed.group(2).isEmpty() ? unit() : typed.group(2));
        KG_PER_M3.in(unit);
        return new Threshold(Double.parseDouble(typed.group(1).replace(',', '.')), unit);
    }

    /** The unit in which concentrations of the solute looked at were given. */
    private String unit() {
        return solute().flatMap(Solute::concentration)
                .map(given -> given.unit().toString())
                .orElse("mg/L");
    }
}
