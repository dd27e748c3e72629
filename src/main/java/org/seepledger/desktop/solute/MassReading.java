package org.seepledger.desktop.solute;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.io.result.MassUnits;
import org.seepledger.picture.UnitShown;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** In which units masses of solutes are read. Whether as rates or as masses is chosen with the water's figures. */
public final class MassReading {

    private static final List<String> RATES = List.of("kg/d", "g/d", "kg/yr", "t/yr", "mg/s", "lb/d", "lb/yr");
    private static final List<String> MASSES = List.of("kg", "g", "mg", "t", "lb");

    private final Session session;
    private final Reading reading;
    private final StringProperty rateUnit = new SimpleStringProperty("");
    private final StringProperty massUnit = new SimpleStringProperty("");
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();

    /**
     * Reads kilograms, and kilograms over the set's time unit.
     *
     * @param session what the window looks at
     * @param reading whether amounts are rates
     */
    public MassReading(Session session, Reading reading) {
        this.session = session;
        this.reading = reading;
        session.set().addListener((set, before, after) -> {
            rateUnit.set("");
            massUnit.set("");
        });
        for (ObservableValue<?> choice : List.of(rateUnit, massUnit)) {
            choice.addListener((value, before, after) -> changes.set(changes.get() + 1));
        }
    }

    /** {@return how often the units have changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return whether amounts are masses, rather than rates} */
    public boolean amounts() {
        return reading.volumes().get();
    }

    /** {@return the unit shown; empty for the first of {@link #units()}} */
    public StringProperty unit() {
        return amounts() ? massUnit : rateUnit;
    }

    /** {@return the units to choose from, the set's own first} */
    public List<String> units() {
        List<String> units = new ArrayList<>();
        session.set().get().ifPresent(set -> {
            MassUnits own = set.workbench().solutes().units(Optional.empty(), Optional.empty());
            units.add((amounts() ? own.mass() : own.rate()).toString());
        });
        (amounts() ? MASSES : RATES)
                .stream().filter(unit -> !units.contains(unit)).forEach(units::add);
        return units;
    }

    /**
     * {@return the units in use; rates are in the chosen unit of masses over the set's time unit where none is chosen for them}
     *
     * @param set the set
     */
    public MassUnits inUse(OpenSet set) {
        return set.workbench().solutes().units(measure(rateUnit), measure(massUnit));
    }

    private static Optional<Measure> measure(StringProperty unit) {
        return Optional.of(unit.get()).filter(chosen -> !chosen.isEmpty()).map(Measure::of);
    }

    /**
     * {@return the name of the unit shown, as users write it}
     *
     * @param set the set
     */
    public String unitName(OpenSet set) {
        MassUnits units = inUse(set);
        return (amounts() ? units.mass() : units.rate()).toString();
    }

    /**
     * {@return the unit shown; amounts in it are those of the result tables, digit for digit}
     *
     * @param set the set
     */
    public UnitShown shown(OpenSet set) {
        MassUnits units = inUse(set);
        return amounts()
                ? new UnitShown(Wording.raised(units.mass()), units.massFactor(), false)
                : new UnitShown(Wording.raised(units.rate()), units.rateFactor(), true);
    }
}
