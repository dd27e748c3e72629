package org.seepledger.desktop.solute;

import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.BudgetShown;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.result.MassUnits;
import org.seepledger.job.RecordPlume;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.report.Answer;
import org.seepledger.report.PlumeResult;
import org.seepledger.report.Wording;

/** What the record of the solute looked at says in sentences, the same as in the report. */
public final class SoluteAnswersModel {

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;
    private final LivePlume plumes;
    private final MassReading masses;
    private final SoluteLook look;
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param live the water's budgets
     * @param reading over which periods figures are read
     * @param plumes the solutes' budgets
     * @param masses how masses are read
     * @param look how solutes are looked at
     */
    public SoluteAnswersModel(
            Session session, LiveBudget live, Reading reading, LivePlume plumes, MassReading masses, SoluteLook look) {
        this.session = session;
        this.live = live;
        this.reading = reading;
        this.plumes = plumes;
        this.masses = masses;
        this.look = look;
        for (ObservableValue<?> cause : List.of(
                session.solute(),
                session.selected(),
                live.whole(),
                plumes.record(),
                masses.changes(),
                reading.changes())) {
            cause.addListener((value, before, after) -> changes.set(changes.get() + 1));
        }
    }

    /** {@return how often what it says has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return plumes.recordState();
    }

    /** Asks the map to begin a prism. */
    public void draw() {
        live.draw();
    }

    /** {@return which geometry, solute and time the sentences belong to; empty where there are none} */
    public String belongs() {
        return session.set()
                .get()
                .flatMap(set -> plumes.shown()
                        .map(shown -> Words.of(
                                "ledger.of.solute",
                                session.solute().get(),
                                shown.in(record(set))
                                        .whose(set, session.numbers().get()))))
                .orElse("");
    }

    private static Period record(OpenSet set) {
        return set.workbench().periods(Periods.Every.RECORD, 1).get(0);
    }

    /** {@return what the budget says; empty where it is not known} */
    public Optional<Answer> answer() {
        return session.set()
                .get()
                .flatMap(set -> plumes.shown()
                        .flatMap(shown -> live.whole()
                                .get()
                                .flatMap(water -> BudgetShown.whole(
                                        set, water, shown.prism().name()))
                                .map(water -> answer(set, shown, water))));
    }

    private Answer answer(OpenSet set, PlumeShown shown, BudgetShown water) {
        MassUnits units = masses.inUse(set);
        PlumeResult result = PlumeResult.of(
                set.aquifer(),
                shown.plume(),
                reading.periods(set),
                water.budget(),
                look.choice(set).above());
        return Answer.of(
                result,
                units,
                Wording.typeset(units.ofBudget(), session.numbers().get()::of));
    }

    /** {@return what the trend of mass and outflow is, in sentences; empty where it is not known} */
    public String trend() {
        return answer().map(
                        found -> String.join(" ", found.on(Answer.Topic.TREND).toList()))
                .orElse("");
    }

    /** {@return what may make a number wrong or missing} */
    public List<String> warnings() {
        return known().map(RecordPlume::warnings).orElse(List.of());
    }

    /** {@return lesser remarks} */
    public List<String> notes() {
        return known().map(RecordPlume::notes).orElse(List.of());
    }

    private Optional<RecordPlume> known() {
        return plumes.record().get().map(Inquiry.Reply::answer);
    }

    /** {@return what stands with every result about a solute} */
    public List<String> cautions() {
        return SoluteCautions.sentences();
    }
}
