package org.seepledger.desktop.intake;

import java.time.Duration;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Plan;
import org.seepledger.job.Inspection;
import org.seepledger.job.IntakeJob;
import org.seepledger.progress.Cancelled;

/** What a plan makes, worked out once typing rests, and what the check says of it. */
final class MakingModel {

    private static final Duration REST = Duration.ofMillis(250);

    private final Lane making;
    private final Lane checking;
    private final ReadOnlyObjectWrapper<Optional<Made>> made = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Check> check = new ReadOnlyObjectWrapper<>(Check.NONE);

    /**
     * What the check says.
     *
     * @param state how it stands
     * @param says what {@code inspect} says; empty as long as it has not said it
     */
    record Check(PaneState state, Optional<Inspection> says) {

        static final Check NONE = new Check(PaneState.READY, Optional.empty());
    }

    MakingModel(Tasks tasks) {
        this.making = tasks.latest("task.intake.making");
        this.checking = tasks.latest("task.intake.checking");
    }

    /** {@return what it makes, once it is worked out} */
    ReadOnlyObjectProperty<Optional<Made>> made() {
        return made.getReadOnlyProperty();
    }

    /** {@return what the check says} */
    ReadOnlyObjectProperty<Check> check() {
        return check.getReadOnlyProperty();
    }

    /** Works out what a plan makes, in place of what was worked out before. */
    void begin(Plan plan) {
        checking.cancel();
        making.runAfter(
                REST,
                progress -> {
                    EntryGuard.enter();
                    return Made.of(plan);
                },
                this::take,
                fault -> check.set(new Check(PaneState.failed(FaultWords.of(fault)), Optional.empty())));
    }

    private void take(Made next) {
        made.set(Optional.of(next));
        Composition copied = next.copied();
        if (!copied.isSound()) {
            check.set(new Check(PaneState.empty(Words.of("intake.check.waits")), Optional.empty()));
            return;
        }
        check.set(new Check(
                PaneState.working(Words.of("intake.checking")), check.get().says()));
        int threads = Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
        checking.run(
                progress -> {
                    EntryGuard.enter();
                    return IntakeJob.check(copied, threads, progress);
                },
                says -> check.set(new Check(PaneState.READY, Optional.of(says))),
                fault -> check.set(
                        fault instanceof Cancelled
                                ? Check.NONE
                                : new Check(PaneState.failed(FaultWords.of(fault)), Optional.empty())));
    }

    /** Forgets all. */
    void forget() {
        making.cancel();
        checking.cancel();
        made.set(Optional.empty());
        check.set(Check.NONE);
    }
}
