package org.seepledger.desktop.chart;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.PeriodWords;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.LivePlume;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.SoluteAnswersModel;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.io.result.MassUnits;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.Ledger;
import org.seepledger.ledger.Period;
import org.seepledger.picture.BudgetSeries;
import org.seepledger.picture.MassCurve;
import org.seepledger.picture.Picture;
import org.seepledger.report.Wording;

/** The selected prism's budgets through time, and the interval looked at among them. */
public final class ChartModel {

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;
    private final LivePlume plumes;
    private final MassReading masses;
    private final SoluteAnswersModel answers;
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();
    private final ReadOnlyIntegerWrapper last = new ReadOnlyIntegerWrapper();
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);
    private final ReadOnlyStringWrapper when = new ReadOnlyStringWrapper("");

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param live the water's budgets
     * @param reading how figures are read
     * @param plumes the solutes' budgets
     * @param masses how masses are read
     * @param answers tells the trend of masses
     */
    public ChartModel(
            Session session,
            LiveBudget live,
            Reading reading,
            LivePlume plumes,
            MassReading masses,
            SoluteAnswersModel answers) {
        this.session = session;
        this.live = live;
        this.reading = reading;
        this.plumes = plumes;
        this.masses = masses;
        this.answers = answers;
        session.set().addListener((set, before, after) -> change());
        live.whole().addListener((whole, before, after) -> change());
        session.selected().addListener((selected, before, after) -> change());
        session.interval().addListener((interval, before, after) -> change());
        reading.changes().addListener((changed, before, after) -> change());
        answers.changes().addListener((changed, before, after) -> change());
        session.solute().addListener((solute, before, after) -> showState());
        live.record().addListener((record, before, after) -> showState());
        plumes.recordState().addListener((record, before, after) -> showState());
        showState();
        change();
    }

    /** {@return how often what it shows has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return the last interval, from 0} */
    public ReadOnlyIntegerProperty last() {
        return last.getReadOnlyProperty();
    }

    /** {@return the interval looked at in words} */
    public ReadOnlyStringProperty when() {
        return when.getReadOnlyProperty();
    }

    /** Asks the map to begin a prism. */
    public void draw() {
        live.draw();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    private void showState() {
        state.set((ofSolute() ? plumes.recordState() : live.record()).get());
    }

    private boolean ofSolute() {
        return !session.solute().get().isEmpty();
    }

    /** {@return what the masses shown say of a trend; empty for water} */
    public String trend() {
        return ofSolute() ? answers.trend() : "";
    }

    /** {@return the interval looked at, from 0} */
    public ReadOnlyIntegerProperty interval() {
        return session.interval();
    }

    /**
     * Looks at an interval.
     *
     * @param interval the interval; the nearest there is
     */
    public void look(int interval) {
        session.interval().set(Math.max(0, Math.min(last.get(), interval)));
    }

    /**
     * Looks at the first interval of a period of the chart.
     *
     * @param period the period, from 0
     */
    public void lookAtPeriod(int period) {
        session.set().get().ifPresent(set -> {
            List<Period.Part> parts = periods(set).get(period).parts();
            boolean within = parts.stream()
                    .anyMatch(part -> part.interval() == session.interval().get());
            if (!within) {
                look(parts.get(0).interval());
            }
        });
    }

    /**
     * {@return what is drawn: gains and losses of water, or masses of the solute looked at}
     *
     * @param width in logical pixels
     * @param height in logical pixels
     */
    Optional<Drawn> drawn(double width, double height) {
        return ofSolute()
                ? masses(width, height)
                        .map(curve -> new Drawn(
                                written(curve.picture()),
                                x -> curve.intervalAt(x).ifPresent(this::look)))
                : chart(width, height)
                        .map(series -> new Drawn(
                                picture(series), x -> series.periodAt(x).ifPresent(this::lookAtPeriod)));
    }

    /**
     * {@return what the selected prism holds of the solute looked at through time, if the record is known}
     *
     * @param width in logical pixels
     * @param height in logical pixels
     */
    public Optional<MassCurve> masses(double width, double height) {
        return session.set()
                .get()
                .flatMap(set -> plumes.shown().map(shown -> {
                    MassUnits units = masses.inUse(set);
                    return MassCurve.of(
                            shown.plume(),
                            set.aquifer().times(),
                            Wording.raised(units.mass()),
                            units.massFactor(),
                            session.interval().get(),
                            Math.max(300, width),
                            height);
                }));
    }

    /**
     * {@return the chart, if the record is known}
     *
     * @param width in logical pixels
     * @param height in logical pixels
     */
    public Optional<BudgetSeries> chart(double width, double height) {
        return session.set()
                .get()
                .flatMap(set -> ledger().map(ledger -> {
                    List<Period> periods = periods(set);
                    return BudgetSeries.of(
                            ledger.prism(),
                            periods.stream().map(ledger::budget).toList(),
                            set.aquifer().times(),
                            reading.shown(set),
                            marked(periods),
                            Math.max(300, width),
                            height);
                }));
    }

    /**
     * {@return a chart as a picture, its numbers in the form chosen}
     *
     * @param chart the chart
     */
    public Picture picture(BudgetSeries chart) {
        return written(chart.picture());
    }

    private Picture written(Picture picture) {
        return picture.written(session.numbers().get()::label);
    }

    private Optional<Ledger> ledger() {
        return live.whole()
                .get()
                .map(RecordBudget::balance)
                .flatMap(balance -> balance.ledgers().stream()
                        .filter(ledger ->
                                ledger.prism().equals(session.selected().get()))
                        .findFirst());
    }

    /** One bar for the whole record would show nothing through time: intervals then. */
    private List<Period> periods(OpenSet set) {
        return reading.every().get() == Periods.Every.RECORD
                ? set.workbench().periods(Periods.Every.INTERVAL, 1)
                : reading.periods(set);
    }

    private OptionalInt marked(List<Period> periods) {
        int interval = session.interval().get();
        for (int i = 0; i < periods.size(); i++) {
            if (periods.get(i).parts().stream().anyMatch(part -> part.interval() == interval)) {
                return OptionalInt.of(i);
            }
        }
        return OptionalInt.empty();
    }

    private void change() {
        Optional<OpenSet> set = session.set().get();
        last.set(set.map(open -> open.aquifer().times().intervals() - 1).orElse(0));
        when.set(set.map(open -> PeriodWords.of(
                        open.workbench()
                                .periods(Periods.Every.INTERVAL, 1)
                                .get(session.interval().get()),
                        open.aquifer().times(),
                        session.numbers().get()))
                .orElse(""));
        changes.set(changes.get() + 1);
    }
}
