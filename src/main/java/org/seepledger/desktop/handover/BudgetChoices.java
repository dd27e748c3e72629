package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.unit.Measure;

/** What is chosen of budgets, of water and solutes alike. */
final class BudgetChoices {

    private static final int OCTOBER = 10;

    private final ObjectProperty<Periods.Every> every = new SimpleObjectProperty<>(Periods.Every.INTERVAL);
    private final IntegerProperty waterYearStart = new SimpleIntegerProperty(OCTOBER);
    private final Entry<Path> periods = new Entry<>(Meaning::path);
    private final Entry<Measure> rateUnit = new Entry<>(Meaning.unit("m3/d"));
    private final Entry<Measure> volumeUnit = new Entry<>(Meaning.unit("m3"));
    private final Entry<Double> limit = new Entry<>(Meaning::percent);
    private final ObjectProperty<WellRule> wells = new SimpleObjectProperty<>(WellRule.POINT);
    private final BooleanProperty clip = new SimpleBooleanProperty(true);

    BudgetChoices() {}

    /** {@return how often a budget is struck} */
    ObjectProperty<Periods.Every> every() {
        return every;
    }

    /** {@return the month in which a water year begins, 1 to 12} */
    IntegerProperty waterYearStart() {
        return waterYearStart;
    }

    /** {@return a CSV of periods, in place of regular ones} */
    Entry<Path> periods() {
        return periods;
    }

    /** {@return the unit of rates of water} */
    Entry<Measure> rateUnit() {
        return rateUnit;
    }

    /** {@return the unit of volumes} */
    Entry<Measure> volumeUnit() {
        return volumeUnit;
    }

    /** {@return the largest closure error allowed, in percent} */
    Entry<Double> limit() {
        return limit;
    }

    /** {@return how wells in cut cells count} */
    ObjectProperty<WellRule> wells() {
        return wells;
    }

    /** {@return whether prisms are cut at the grid's edge, as the window's own budgets are} */
    BooleanProperty clip() {
        return clip;
    }

    List<ObservableValue<?>> observables() {
        return List.of(
                every, waterYearStart, periods.text(), rateUnit.text(), volumeUnit.text(), limit.text(), wells, clip);
    }

    List<Entry<?>> entries() {
        return List.of(periods, rateUnit, volumeUnit, limit);
    }

    /** Adds what differs from a command's defaults. */
    CommandText into(CommandText command) {
        if (periods.value().isPresent()) {
            command.with("--periods", periods.value());
        } else if (every.get() != Periods.Every.INTERVAL) {
            command.with("--every", CommandText.word(every.get()));
        }
        Optional<Integer> month = Optional.of(waterYearStart.get()).filter(start -> start != OCTOBER);
        return command.with("--water-year-start", month)
                .with("--volume-unit", volumeUnit.value())
                .with(
                        "--wells",
                        Optional.of(wells.get())
                                .filter(rule -> rule != WellRule.POINT)
                                .map(CommandText::word))
                .flag("--clip", clip.get())
                .with("--max-closure-error", limit.value());
    }
}
