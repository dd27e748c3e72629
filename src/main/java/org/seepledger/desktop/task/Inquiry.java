package org.seepledger.desktop.task;

import java.time.Duration;
import java.util.Optional;
import java.util.function.BiFunction;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/**
 * Questions of one kind, of which only the newest counts, and the last answer with its question. Used on the window's own
 * thread alone.
 *
 * @param <Q> a question; questions that are equal have the same answer
 * @param <A> an answer
 */
public final class Inquiry<Q, A> {

    private static final Duration REST = Duration.ofMillis(200);

    private final Lane lane;
    private final BiFunction<Q, Progress, A> work;
    private final ReadOnlyObjectWrapper<Optional<Reply<Q, A>>> last = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);
    private Optional<Q> wanted = Optional.empty();
    private Optional<Q> asked = Optional.empty();

    /**
     * An answer with its question.
     *
     * @param <Q> a question
     * @param <A> an answer
     * @param question the question
     * @param answer its answer
     */
    public record Reply<Q, A>(Q question, A answer) {}

    /**
     * Makes an inquiry.
     *
     * @param lane where the work runs
     * @param work answers a question
     */
    public Inquiry(Lane lane, BiFunction<Q, Progress, A> work) {
        this.lane = lane;
        this.work = work;
    }

    /** {@return the last answer} */
    public ReadOnlyObjectProperty<Optional<Reply<Q, A>>> last() {
        return last.getReadOnlyProperty();
    }

    /** {@return how it stands with the question that is wanted} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /**
     * {@return whether the last answer is that of a question}
     *
     * @param question the question
     */
    public boolean answers(Q question) {
        return last.get().filter(reply -> reply.question().equals(question)).isPresent();
    }

    /**
     * Asks at once; while another question is being answered, it waits, and gives way to a newer one. A hand that never rests
     * would otherwise never see an answer.
     *
     * @param question the question
     */
    public void want(Q question) {
        if (isNew(question) && asked.isEmpty()) {
            ask(question, Duration.ZERO);
        }
    }

    /**
     * Asks once the hand has rested; what is being answered is given up.
     *
     * @param question the question
     */
    public void wantAtRest(Q question) {
        if (isNew(question)) {
            lane.cancel();
            ask(question, REST);
        }
    }

    /** Whether there is something to do about a question that is wanted now. What cannot be answered is not asked again. */
    private boolean isNew(Q question) {
        boolean same = wanted.equals(Optional.of(question));
        wanted = Optional.of(question);
        if (answers(question)) {
            settle();
            return false;
        }
        if (!same) {
            tell(working());
        }
        return !same;
    }

    private void settle() {
        lane.cancel();
        asked = Optional.empty();
        tell(PaneState.READY);
    }

    /** Tells that the last answer is outdated, and gives up what is being answered. */
    public void outdate() {
        lane.cancel();
        asked = Optional.empty();
        wanted = Optional.empty();
        tell(working());
    }

    /** A state that is told again would set off whoever asks when told. */
    private void tell(PaneState next) {
        if (!next.equals(state.get())) {
            state.set(next);
        }
    }

    /** Old content is dimmed meanwhile, and it is said whose it is. */
    private PaneState working() {
        return PaneState.working(Words.of(last.get().isPresent() ? "budget.working.shown" : "budget.working"));
    }

    /**
     * Wants nothing, but keeps the last answer.
     *
     * @param why how it stands then
     */
    public void rest(PaneState why) {
        lane.cancel();
        asked = Optional.empty();
        wanted = Optional.empty();
        tell(why);
    }

    /**
     * Wants nothing and forgets the last answer.
     *
     * @param why how it stands then
     */
    public void forget(PaneState why) {
        rest(why);
        last.set(Optional.empty());
    }

    private void ask(Q question, Duration after) {
        asked = Optional.of(question);
        lane.runAfter(
                after,
                progress -> {
                    EntryGuard.enter();
                    return work.apply(question, progress);
                },
                answer -> answered(question, answer),
                fault -> notAnswered(question, fault));
    }

    private void answered(Q question, A answer) {
        asked = Optional.empty();
        if (wanted.equals(Optional.of(question))) {
            tell(PaneState.READY);
        }
        last.set(Optional.of(new Reply<>(question, answer)));
        askNext(question);
    }

    private void notAnswered(Q question, Throwable fault) {
        asked = Optional.empty();
        if (wanted.equals(Optional.of(question))) {
            tell(PaneState.failed(fault instanceof Cancelled ? Words.of("stopped.again") : FaultWords.of(fault)));
        }
        askNext(question);
    }

    /** Asks again what was stopped or failed. */
    public void again() {
        if (asked.isEmpty() && state.get().phase() == PaneState.Phase.FAILED) {
            wanted.ifPresent(question -> {
                tell(working());
                ask(question, Duration.ZERO);
            });
        }
    }

    private void askNext(Q before) {
        if (asked.isEmpty()) {
            wanted.filter(question -> !question.equals(before)).ifPresent(question -> ask(question, Duration.ZERO));
        }
    }
}
