package org.seepledger.desktop.budget;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.Observable;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.picture.UnitShown;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** How the figures of all panes are to be read: over which period, as rates or volumes, in which unit. */
public final class Reading {

    private static final List<String> RATES =
            List.of("m3/d", "L/s", "m3/s", "ML/d", "m3/yr", "hm3/yr", "ft3/d", "ft3/s", "gal/min", "acre-ft/yr");
    private static final List<String> VOLUMES = List.of("m3", "ML", "hm3", "km3", "ft3", "Mgal", "acre-ft");
    private static final int OCTOBER = 10;

    private final Session session;
    private final ObjectProperty<Periods.Every> every = new SimpleObjectProperty<>(Periods.Every.INTERVAL);
    private final BooleanProperty volumes = new SimpleBooleanProperty();
    private final StringProperty rateUnit = new SimpleStringProperty("");
    private final StringProperty volumeUnit = new SimpleStringProperty("");
    private final ReadOnlyBooleanWrapper dated = new ReadOnlyBooleanWrapper();
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();
    private String wantedRate = "";
    private String wantedVolume = "";
    private final IntegerProperty waterYearStart = new SimpleIntegerProperty(OCTOBER);

    /**
     * Reads rates of the interval looked at, in the set's own units.
     *
     * @param session what the window looks at
     */
    public Reading(Session session) {
        this.session = session;
        session.set().addListener((set, before, after) -> {
            dated.set(after.filter(open -> open.aquifer().times().hasDates()).isPresent());
            every.set(Periods.Every.INTERVAL);
            rateUnit.set(wantedRate);
            volumeUnit.set(wantedVolume);
            changes.set(changes.get() + 1);
        });
        for (Observable choice : List.of(every, volumes, rateUnit, volumeUnit, waterYearStart, session.numbers())) {
            choice.addListener(changed -> changes.set(changes.get() + 1));
        }
    }

    /**
     * Takes other units, for the open set and those to come.
     *
     * @param rate the unit of rates; empty for the set's own
     * @param volume the unit of volumes; empty for the set's own
     */
    public void want(String rate, String volume) {
        wantedRate = rate;
        wantedVolume = volume;
        rateUnit.set(rate);
        volumeUnit.set(volume);
    }

    /** {@return units of rates, as users write them} */
    public static List<String> rateUnits() {
        return RATES;
    }

    /** {@return units of volumes, as users write them} */
    public static List<String> volumeUnits() {
        return VOLUMES;
    }

    /** {@return how often the reading has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return how long the period is} */
    public ObjectProperty<Periods.Every> every() {
        return every;
    }

    /** {@return whether volumes are shown, rather than rates} */
    public BooleanProperty volumes() {
        return volumes;
    }

    /** {@return the unit of rates; empty for the set's own} */
    public StringProperty rateUnit() {
        return rateUnit;
    }

    /** {@return the unit of volumes; empty for the set's own} */
    public StringProperty volumeUnit() {
        return volumeUnit;
    }

    /** {@return the month in which a water year begins, 1 to 12} */
    public IntegerProperty waterYearStart() {
        return waterYearStart;
    }

    /** {@return the unit that is chosen by {@link #volumes()}} */
    public StringProperty unit() {
        return volumes.get() ? volumeUnit : rateUnit;
    }

    /** {@return whether the open set's times have dates, so that months and years can be read} */
    public ReadOnlyBooleanProperty dated() {
        return dated.getReadOnlyProperty();
    }

    /** {@return the lengths of periods that the open set can be read by} */
    public List<Periods.Every> choices() {
        return dated.get() ? List.of(Periods.Every.values()) : List.of(Periods.Every.INTERVAL, Periods.Every.RECORD);
    }

    /** {@return the units to choose from, the set's own first} */
    public List<String> units() {
        List<String> units = new ArrayList<>();
        session.set().get().ifPresent(set -> {
            ResultUnits own = set.workbench().units(Optional.empty(), Optional.empty());
            units.add((volumes.get() ? own.volume() : own.rate()).toString());
        });
        (volumes.get() ? VOLUMES : RATES)
                .stream().filter(unit -> !units.contains(unit)).forEach(units::add);
        return units;
    }

    /**
     * {@return the units in use}
     *
     * @param set the set
     */
    public ResultUnits inUse(OpenSet set) {
        return set.workbench().units(measure(rateUnit), measure(volumeUnit));
    }

    private static Optional<Measure> measure(StringProperty unit) {
        return unit.get().isEmpty() ? Optional.empty() : Optional.of(Measure.of(unit.get()));
    }

    /**
     * {@return the name of the unit shown, as users write it}
     *
     * @param set the set
     */
    public String unitName(OpenSet set) {
        ResultUnits units = inUse(set);
        return (volumes.get() ? units.volume() : units.rate()).toString();
    }

    /**
     * {@return the unit shown, its name as it is to be read; amounts in it are those of the result tables, digit for digit}
     *
     * @param set the set
     */
    public UnitShown shown(OpenSet set) {
        ResultUnits units = inUse(set);
        Wording words = Wording.typeset(units);
        return volumes.get()
                ? new UnitShown(words.unit(units.volume()), units.volumeFactor(), false)
                : new UnitShown(words.unit(units.rate()), units.rateFactor(), true);
    }

    /**
     * {@return all periods of the length chosen}
     *
     * @param set the set
     */
    public List<Period> periods(OpenSet set) {
        return set.workbench().periods(every.get(), waterYearStart.get());
    }

    /**
     * {@return the period that holds the middle of an interval}
     *
     * @param set the set
     * @param interval the interval, from 0
     */
    public Period period(OpenSet set, int interval) {
        double middle =
                set.aquifer().times().instant(interval) + set.aquifer().times().length(interval) / 2;
        return periods(set).stream()
                .filter(period -> middle >= period.from() && middle < period.to())
                .findFirst()
                .orElseThrow();
    }
}
