package org.seepledger.desktop.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.StringProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.ledger.LedgerSheet.Held;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.LivePlume;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.PlumeShown;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.Totals;
import org.seepledger.picture.UnitShown;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.prism.Prism;
import org.seepledger.unit.Figures;

/**
 * The budget looked at: of water, or of the solute that is chosen.
 *
 * @param session what the window looks at
 * @param live the water's budgets
 * @param reading how figures are read
 * @param plumes the solutes' budgets
 * @param masses how masses are read
 */
record LedgerSheets(Session session, LiveBudget live, Reading reading, LivePlume plumes, MassReading masses) {

    /** All that the sheet depends on. */
    List<ObservableValue<?>> causes() {
        return List.of(
                live.known(),
                plumes.known(),
                plumes.record(),
                session.selected(),
                session.interval(),
                session.solute(),
                reading.changes(),
                masses.changes());
    }

    /** All that how it stands with the sheet depends on. */
    List<ObservableValue<?>> states() {
        return List.of(live.now(), live.record(), plumes.nowState(), plumes.recordState());
    }

    boolean ofSolute() {
        return !session.solute().get().isEmpty();
    }

    /** How it stands with the sheet. */
    PaneState state() {
        boolean quick = reading.every().get() == Periods.Every.INTERVAL;
        ReadOnlyObjectProperty<PaneState> state =
                ofSolute() ? quick ? plumes.nowState() : plumes.recordState() : quick ? live.now() : live.record();
        return state.get();
    }

    /** The units to choose from, the set's own first. */
    List<String> units() {
        return ofSolute() ? masses.units() : reading.units();
    }

    /** The chosen unit; empty for the set's own. */
    StringProperty unit() {
        return ofSolute() ? masses.unit() : reading.unit();
    }

    Optional<LedgerSheet> now() {
        Optional<OpenSet> set = session.set().get();
        Optional<Prism> prism = session.selectedPrism();
        if (set.isEmpty() || prism.isEmpty()) {
            return Optional.empty();
        }
        Period period = reading.period(set.get(), session.interval().get());
        return ofSolute()
                ? plumes.shown(period).map(shown -> solute(set.get(), shown, period))
                : live.known()
                        .get()
                        .budget(prism.get(), period)
                        .map(shown -> new LedgerSheet(
                                shown, reading.shown(set.get()), reading.unitName(set.get()), Optional.empty()));
    }

    private LedgerSheet solute(OpenSet set, PlumeShown shown, Period period) {
        MassUnits units = masses.inUse(set);
        Plume plume = shown.plume();
        return new LedgerSheet(
                shown.in(period),
                masses.shown(set),
                masses.unitName(set),
                Optional.of(new LedgerSheet.OfSolute(
                        plume.ledgers().get(NonDetects.ZERO).budget(period),
                        plume.ledgers().get(NonDetects.LIMIT).budget(period),
                        held(set, plume, period.to(), units.massFactor()),
                        units.mass().toString(),
                        closure(set, plume, period))));
    }

    /** What is held in each phase and layer at a time, as the command writes it. */
    private static List<Held> held(OpenSet set, Plume plume, double time, double factor) {
        List<Held> held = new ArrayList<>();
        for (String phase : List.of("dissolved", "sorbed")) {
            for (int layer = 0; layer < plume.layers(); layer++) {
                double[] masses = new double[NonDetects.values().length];
                for (NonDetects choice : NonDetects.values()) {
                    ToDoubleFunction<Stock> what =
                            stock -> phase.equals("sorbed") ? stock.sorbed(choice) : stock.dissolved(choice);
                    masses[choice.ordinal()] = plume.held(set.aquifer().times(), time, layer, what) * factor;
                }
                held.add(new Held(phase, plume.firstLayer() + layer, masses[0], masses[1], masses[2]));
            }
        }
        return held;
    }

    private String closure(OpenSet set, Plume plume, Period period) {
        Totals totals = plume.ledger().budget(period).totals();
        if (Double.isNaN(totals.closureError())) {
            return Words.of(Double.isNaN(totals.storageChange()) ? "ledger.closure.unknown" : "ledger.closure.nothing");
        }
        UnitShown unit = masses.shown(set);
        return Words.of(
                "ledger.closure",
                Figures.typesetPercent(totals.closureError()),
                Figures.typeset(unit.of(totals.residual(), period)),
                Figures.typeset(unit.of(totals.throughput(), period)),
                unit.words());
    }
}
