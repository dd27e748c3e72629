package org.seepledger.desktop.solute;

import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.IntervalPlume;
import org.seepledger.job.RecordPlume;
import org.seepledger.job.SoluteBench;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;

/**
 * Keeps the solute budgets up with the drawing as {@link org.seepledger.desktop.budget.LiveBudget} keeps the water's: the
 * selected prism's interval at once, the record of all prisms when the hand rests. Nothing is worked out while nobody looks
 * at a solute.
 */
public final class LivePlume {

    private final Session session;
    private final SoluteLook look;
    private final Inquiry<Now, IntervalPlume> now;
    private final Inquiry<Whole, RecordPlume> whole;

    /**
     * A prism in an interval.
     *
     * @param set the set
     * @param prism the prism
     * @param interval from 0
     * @param choice how solutes are balanced
     */
    public record Now(OpenSet set, Prism prism, int interval, SoluteBench.Choice choice) {}

    /**
     * Prisms over the whole record.
     *
     * @param set the set
     * @param prisms the prisms
     * @param choice how solutes are balanced
     */
    public record Whole(OpenSet set, List<Prism> prisms, SoluteBench.Choice choice) {}

    /**
     * Begins to follow.
     *
     * @param session what the window looks at
     * @param look how solutes are looked at
     * @param tasks where work is done
     */
    public LivePlume(Session session, SoluteLook look, Tasks tasks) {
        this.session = session;
        this.look = look;
        this.now = new Inquiry<>(
                tasks.latest("task.solutes.interval"),
                (question, progress) -> question.set
                        .workbench()
                        .solutes()
                        .interval(question.prism, question.interval, question.choice, progress));
        this.whole = new Inquiry<>(
                tasks.latest("task.solutes.record"),
                (question, progress) ->
                        question.set.workbench().solutes().record(question.prisms, question.choice, progress));
        session.set().addListener((set, before, after) -> begin());
        for (ObservableValue<?> cause :
                List.of(session.drawing(), session.selected(), session.interval(), session.solute(), look.changes())) {
            cause.addListener((value, before, after) -> follow());
        }
        whole.last().addListener((last, before, after) -> follow());
        begin();
    }

    /** {@return what was last worked out of the interval looked at} */
    public ReadOnlyObjectProperty<Optional<Inquiry.Reply<Now, IntervalPlume>>> known() {
        return now.last();
    }

    /** {@return what was last worked out of the whole record} */
    public ReadOnlyObjectProperty<Optional<Inquiry.Reply<Whole, RecordPlume>>> record() {
        return whole.last();
    }

    /** {@return how it stands with the interval looked at} */
    public ReadOnlyObjectProperty<PaneState> nowState() {
        return now.state();
    }

    /** {@return how it stands with the whole record} */
    public ReadOnlyObjectProperty<PaneState> recordState() {
        return whole.state();
    }

    /** Works out again what was stopped or failed. */
    public void again() {
        now.again();
        whole.again();
    }

    private void begin() {
        now.forget(nothing());
        whole.forget(nothing());
        follow();
    }

    private static PaneState nothing() {
        return PaneState.empty(Words.of("budget.empty"));
    }

    private void follow() {
        Optional<OpenSet> set = session.set().get();
        Drawing drawing = session.drawing().get();
        if (set.isEmpty() || drawing.prisms().isEmpty()) {
            now.forget(nothing());
            whole.forget(nothing());
        } else if (session.solute().get().isEmpty()) {
            now.rest(PaneState.READY);
            whole.rest(PaneState.READY);
        } else {
            Whole question = new Whole(set.get(), drawing.prisms(), look.choice(set.get()));
            followRecord(question, drawing.settled());
            followNow(question);
        }
    }

    private void followRecord(Whole question, boolean settled) {
        if (settled || whole.answers(question)) {
            whole.wantAtRest(question);
        } else {
            whole.outdate();
        }
    }

    private void followNow(Whole question) {
        Optional<Prism> prism = session.selectedPrism();
        if (prism.isEmpty()) {
            now.rest(PaneState.empty(Words.of("budget.select")));
        } else if (whole.answers(question)) {
            now.rest(PaneState.READY);
        } else {
            now.want(new Now(question.set, prism.get(), session.interval().get(), question.choice));
        }
    }

    /**
     * {@return what the selected prism holds of the solute looked at, for a period: of the geometry drawn now if that is known,
     * else of the last one known}
     *
     * @param period the period
     */
    public Optional<PlumeShown> shown(Period period) {
        Optional<Prism> prism = session.selectedPrism();
        String solute = session.solute().get();
        Optional<PlumeShown> fromRecord = prism.flatMap(drawn -> whole(drawn, solute));
        Optional<PlumeShown> fromNow = prism.flatMap(drawn -> now.last()
                .get()
                .map(Inquiry.Reply::answer)
                .filter(known -> known.prism().name().equals(drawn.name()))
                .filter(known -> period.parts().size() == 1
                        && period.parts().get(0).interval() == known.interval()
                        && isWhole(period))
                .flatMap(known -> PlumeShown.of(known, solute)));
        return isOfNow(fromRecord) ? fromRecord : fromNow.or(() -> fromRecord);
    }

    private boolean isWhole(Period period) {
        Period.Part part = period.parts().get(0);
        return session.set()
                .get()
                .filter(set -> set.aquifer().times().length(part.interval()) == part.duration())
                .isPresent();
    }

    /** Whether something from the record is of the geometry and the choices of now. */
    private boolean isOfNow(Optional<PlumeShown> fromRecord) {
        boolean chosen = session.set()
                .get()
                .flatMap(set -> whole.last()
                        .get()
                        .filter(reply -> reply.question().choice().equals(look.choice(set))))
                .isPresent();
        return chosen && fromRecord.map(PlumeShown::prism).equals(session.selectedPrism());
    }

    /** {@return what the selected prism holds of the solute looked at over the whole record, as far as that is known} */
    public Optional<PlumeShown> shown() {
        return session.selectedPrism()
                .flatMap(prism -> whole(prism, session.solute().get()));
    }

    private Optional<PlumeShown> whole(Prism prism, String solute) {
        return whole.last().get().flatMap(reply -> PlumeShown.of(reply.answer(), prism.name(), solute));
    }
}
