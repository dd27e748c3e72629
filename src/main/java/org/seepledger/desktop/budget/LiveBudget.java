package org.seepledger.desktop.budget;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.IntervalBudget;
import org.seepledger.job.RecordBudget;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;

/**
 * Keeps the selected prism's budget up with the drawing: the interval looked at at once, the whole record when the hand
 * rests.
 *
 * <p>While a question about the interval is being answered, newer ones wait, and only the newest of them is asked next: a
 * hand that never rests would otherwise never see a number. The record is given up at once when the drawing changes.
 */
public final class LiveBudget {

    private static final Duration REST = Duration.ofMillis(200);

    private final Session session;
    private final Lane quick;
    private final Lane thorough;
    private final ReadOnlyObjectWrapper<Known> known = new ReadOnlyObjectWrapper<>(Known.NOTHING);
    private final ReadOnlyObjectWrapper<Optional<RecordBudget>> whole = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> now = new ReadOnlyObjectWrapper<>(nothing());
    private final ReadOnlyObjectWrapper<PaneState> record = new ReadOnlyObjectWrapper<>(nothing());
    private Optional<Question> asked = Optional.empty();
    private Optional<List<Prism>> balanced = Optional.empty();

    /** A prism in an interval. */
    private record Question(OpenSet set, Prism prism, int interval) {}

    /**
     * Begins to follow.
     *
     * @param session what the window looks at
     * @param tasks where work is done
     */
    public LiveBudget(Session session, Tasks tasks) {
        this.session = session;
        this.quick = tasks.latest("task.budget.interval");
        this.thorough = tasks.latest("task.budget.record");
        known.addListener((last, before, after) -> whole.set(after.record()));
        session.set().addListener((set, before, after) -> begin());
        session.drawing().addListener((drawing, before, after) -> follow());
        session.selected().addListener((selected, before, after) -> follow());
        session.interval().addListener((interval, before, after) -> follow());
        follow();
    }

    /** {@return what was last worked out} */
    public ReadOnlyObjectProperty<Known> known() {
        return known.getReadOnlyProperty();
    }

    /** {@return the budgets of the whole record that were last worked out; it changes more seldom than what is known} */
    public ReadOnlyObjectProperty<Optional<RecordBudget>> whole() {
        return whole.getReadOnlyProperty();
    }

    /** Asks the map to begin a prism: what leads on where there is none. */
    public void draw() {
        session.demand().set(Session.Demand.DRAW_PRISM);
    }

    /** {@return how it stands with the budget of the interval looked at} */
    public ReadOnlyObjectProperty<PaneState> now() {
        return now.getReadOnlyProperty();
    }

    /** {@return how it stands with the budgets of the whole record} */
    public ReadOnlyObjectProperty<PaneState> record() {
        return record.getReadOnlyProperty();
    }

    /** Old content is dimmed meanwhile, and it is said whose it is. */
    private static String working(boolean shown) {
        return Words.of(shown ? "budget.working.shown" : "budget.working");
    }

    private static PaneState nothing() {
        return PaneState.empty(Words.of("budget.empty"));
    }

    private void begin() {
        quick.cancel();
        thorough.cancel();
        asked = Optional.empty();
        balanced = Optional.empty();
        known.set(Known.NOTHING);
        follow();
    }

    private void follow() {
        Optional<OpenSet> set = session.set().get();
        Drawing drawing = session.drawing().get();
        if (set.isEmpty() || drawing.prisms().isEmpty()) {
            quick.cancel();
            thorough.cancel();
            asked = Optional.empty();
            balanced = Optional.empty();
            known.set(Known.NOTHING);
            now.set(nothing());
            record.set(nothing());
            return;
        }
        followRecord(set.get(), drawing);
        followNow(set.get());
    }

    private void followNow(OpenSet set) {
        Optional<Prism> prism = session.selectedPrism();
        if (prism.isEmpty()) {
            now.set(PaneState.empty(Words.of("budget.select")));
            return;
        }
        Question question = new Question(set, prism.get(), session.interval().get());
        if (known.get().hasRecordOf(session.drawing().get().prisms())
                || known.get().hasNow(question.prism, question.interval)) {
            now.set(PaneState.READY);
        } else if (asked.isEmpty()) {
            now.set(PaneState.working(working(
                    known.get().now().isPresent() || known.get().record().isPresent())));
            ask(question);
        }
    }

    private void ask(Question question) {
        asked = Optional.of(question);
        quick.run(
                progress -> {
                    EntryGuard.enter();
                    return question.set
                            .workbench()
                            .budgets(List.of(question.prism), question.interval, progress)
                            .get(0);
                },
                this::answered,
                fault -> notAnswered(question, fault));
    }

    private void answered(IntervalBudget budget) {
        asked = Optional.empty();
        known.set(new Known(Optional.of(budget), known.get().record()));
        follow();
    }

    /** What cannot be answered is not asked again until something changes. */
    private void notAnswered(Question question, Throwable fault) {
        asked = Optional.empty();
        boolean changed = !session.selectedPrism().equals(Optional.of(question.prism))
                || session.interval().get() != question.interval;
        if (changed) {
            follow();
        } else {
            now.set(PaneState.failed(why(fault)));
        }
    }

    private void followRecord(OpenSet set, Drawing drawing) {
        if (known.get().hasRecordOf(drawing.prisms())) {
            record.set(PaneState.READY);
            return;
        }
        if (balanced.equals(Optional.of(drawing.prisms())) && drawing.settled()) {
            return;
        }
        thorough.cancel();
        balanced = Optional.empty();
        record.set(PaneState.working(working(known.get().record().isPresent())));
        if (drawing.settled()) {
            balance(set, drawing.prisms());
        }
    }

    private void balance(OpenSet set, List<Prism> prisms) {
        balanced = Optional.of(prisms);
        thorough.runAfter(
                REST,
                progress -> {
                    EntryGuard.enter();
                    return set.workbench().record(prisms, progress);
                },
                this::balanced,
                this::notBalanced);
    }

    private void balanced(RecordBudget budget) {
        known.set(new Known(known.get().now(), Optional.of(budget)));
        follow();
    }

    private void notBalanced(Throwable fault) {
        record.set(PaneState.failed(why(fault)));
    }

    private static String why(Throwable fault) {
        return fault instanceof Cancelled ? Words.of("stopped.again") : FaultWords.of(fault);
    }

    /** Works out again what was stopped or failed. */
    public void again() {
        balanced = Optional.empty();
        follow();
    }
}
