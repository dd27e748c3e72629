package org.seepledger.desktop.closure;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.balance.HotSpot;
import org.seepledger.desktop.budget.BudgetShown;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.Period;
import org.seepledger.picture.BudgetBlocks;
import org.seepledger.picture.Picture;
import org.seepledger.prism.Prism;
import org.seepledger.report.Answer;
import org.seepledger.report.CellPlace;
import org.seepledger.report.ClosureLeads;
import org.seepledger.report.PrismResult;
import org.seepledger.report.StatedOrigins;
import org.seepledger.report.Wording;

/** What the record of the selected prism says in sentences, the same as in the report, and where it does not close. */
public final class ClosureModel {

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;
    private final ObservableList<Answer.Point> points = FXCollections.observableArrayList();
    private final ObservableList<String> warnings = FXCollections.observableArrayList();
    private final ObservableList<String> notes = FXCollections.observableArrayList();
    private final ObservableList<String> leads = FXCollections.observableArrayList();
    private final ObservableList<Spot> spots = FXCollections.observableArrayList();
    private final PeriodSpots ofPeriod;
    private final ReadOnlyStringWrapper belongs = new ReadOnlyStringWrapper("");

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param live the budgets
     * @param reading how figures are read
     * @param tasks looks for the cells of the period shown
     */
    public ClosureModel(Session session, LiveBudget live, Reading reading, Tasks tasks) {
        this.session = session;
        this.live = live;
        this.reading = reading;
        this.ofPeriod = new PeriodSpots(session, live, reading, tasks);
        live.whole().addListener((whole, before, after) -> show());
        session.selected().addListener((selected, before, after) -> show());
        reading.changes().addListener((changes, before, after) -> show());
        session.interval().addListener((interval, before, after) -> findOfPeriod());
        show();
    }

    /** {@return what the budget says} */
    public ObservableList<Answer.Point> points() {
        return points;
    }

    /** {@return what may make a number wrong or missing} */
    public ObservableList<String> warnings() {
        return warnings;
    }

    /** {@return lesser remarks} */
    public ObservableList<String> notes() {
        return notes;
    }

    /** {@return why it may fail to close; empty where it closes} */
    public ObservableList<String> leads() {
        return leads;
    }

    /** {@return the cells furthest from balance, the furthest first; empty where the budget closes to rounding} */
    public ObservableList<Spot> spots() {
        return spots;
    }

    /** {@return the same of the period that is shown, where that is shorter than the record} */
    public ObservableList<Spot> spotsOfPeriod() {
        return ofPeriod.spots();
    }

    /** {@return what that period is called; empty where there are no such cells} */
    public ReadOnlyStringProperty period() {
        return ofPeriod.period();
    }

    /** {@return which geometry and time the sentences belong to} */
    public ReadOnlyStringProperty belongs() {
        return belongs.getReadOnlyProperty();
    }

    /** Asks the map to begin a prism. */
    public void draw() {
        live.draw();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return live.record();
    }

    /**
     * {@return the record's gains, losses and storage as blocks to scale, if they are known}
     *
     * @param width in logical pixels
     */
    public Optional<Picture> blocks(double width) {
        return session.set()
                .get()
                .flatMap(set -> session.selectedPrism()
                        .flatMap(prism -> live.whole()
                                .get()
                                .flatMap(record -> BudgetShown.whole(set, record, prism.name()))
                                .map(shown -> BudgetBlocks.of(
                                        prism.name(),
                                        shown.budget(),
                                        BudgetBlocks.Flows.NET,
                                        reading.shown(set),
                                        Math.max(300, width)))
                                .map(blocks -> blocks.written(session.numbers().get()::label))));
    }

    /** Asks the map to show imbalance. */
    public void showImbalance() {
        Stream.concat(spots.stream(), spotsOfPeriod().stream())
                .findFirst()
                .ifPresent(spot -> session.layer().set(spot.cell().layer()));
        session.demand().set(Session.Demand.SHOW_IMBALANCE);
    }

    /**
     * Asks the map to show imbalance and to go to a cell.
     *
     * @param spot the cell
     */
    public void goTo(Spot spot) {
        session.layer().set(spot.cell().layer());
        session.demand().set(Session.Demand.SHOW_IMBALANCE);
        session.target().set(Optional.of(spot.place()));
    }

    private void show() {
        points.clear();
        spots.clear();
        leads.clear();
        warnings.clear();
        notes.clear();
        belongs.set("");
        Optional<OpenSet> set = session.set().get();
        Optional<RecordBudget> record = live.whole().get();
        if (set.isPresent() && record.isPresent()) {
            List<String> names = record.get().prisms().stream().map(Prism::name).toList();
            int prism = names.indexOf(session.selected().get());
            if (prism >= 0) {
                show(set.get(), record.get(), prism);
            }
        }
        findOfPeriod();
    }

    private void findOfPeriod() {
        session.set().get().ifPresent(set -> {
            ResultUnits units = reading.inUse(set);
            ofPeriod.find(cell -> spot(set, cell, units));
        });
    }

    private void show(OpenSet set, RecordBudget record, int prism) {
        List<Period> periods = reading.periods(set);
        List<PrismBudget> budgets = record.balance().ledgers().stream()
                .map(ledger -> new PrismBudget(
                        ledger.prism(), periods.stream().map(ledger::budget).toList()))
                .toList();
        PrismResult result = PrismResult.of(set.aquifer(), record.balance(), budgets, prism);
        ResultUnits units = reading.inUse(set);
        StatedOrigins origins = StatedOrigins.of(set.aquifer(), set.workbench().origins());
        points.setAll(Answer.of(result, origins, wording(units)).points());
        warnings.addAll(set.workbench().warnings());
        warnings.addAll(record.warnings());
        notes.addAll(set.workbench().notes());
        notes.addAll(record.notes());
        if (result.isWorthLocating()) {
            leads.setAll(ClosureLeads.of(set.aquifer(), result));
            result.whereabouts().largest().forEach(cell -> spots.add(spot(set, cell, units)));
        }
        belongs.set(BudgetShown.whole(set, record, result.prism())
                .orElseThrow()
                .whose(set, session.numbers().get()));
    }

    private Wording wording(ResultUnits units) {
        return Wording.typeset(units, session.numbers().get()::of);
    }

    private Spot spot(OpenSet set, HotSpot cell, ResultUnits units) {
        String where = Words.of(
                "closure.cell", set.aquifer().layers().get(cell.layer()).name(), cell.row() + 1, cell.column() + 1);
        String imbalance = wording(units).rate(cell.imbalance(), 1);
        return new Spot(cell, CellPlace.of(set.aquifer().grid(), cell), where, imbalance);
    }
}
