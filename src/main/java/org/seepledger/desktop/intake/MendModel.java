package org.seepledger.desktop.intake;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MendJob;
import org.seepledger.progress.Cancelled;

/** An aquifer folder whose description is wrong, and the text that is to stand in its place. */
public final class MendModel {

    private static final Duration REST = Duration.ofMillis(400);
    private static final MendJob.Finding NOTHING = new MendJob.Finding(List.of(), "");

    private final Lane checking;
    private final Consumer<Path> open;
    private final StringProperty text = new SimpleStringProperty("");
    private final ReadOnlyObjectWrapper<Optional<Path>> folder = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<MendJob.Finding> finding = new ReadOnlyObjectWrapper<>(NOTHING);
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);

    /**
     * Makes the model.
     *
     * @param tasks checks and writes
     * @param open opens the mended folder in the window
     */
    public MendModel(Tasks tasks, Consumer<Path> open) {
        this.checking = tasks.latest("task.intake.mending");
        this.open = open;
        text.addListener((now, before, after) -> check(after));
    }

    /** {@return the folder; empty as long as none is to be mended} */
    public ReadOnlyObjectProperty<Optional<Path>> folder() {
        return folder.getReadOnlyProperty();
    }

    /** {@return the text} */
    StringProperty text() {
        return text;
    }

    /** {@return what is wrong with the text, or what {@code inspect} says} */
    ReadOnlyObjectProperty<MendJob.Finding> finding() {
        return finding.getReadOnlyProperty();
    }

    /** {@return how the check and the saving stand} */
    ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /**
     * Begins with a folder.
     *
     * @param broken the folder
     */
    public void mend(Path broken) {
        finding.set(NOTHING);
        folder.set(Optional.of(broken));
        text.set("");
        state.set(PaneState.working(Words.of("intake.checking")));
        checking.run(
                progress -> {
                    EntryGuard.enter();
                    return MendJob.text(broken);
                },
                text::set,
                this::fail);
    }

    private void fail(Throwable fault) {
        state.set(fault instanceof Cancelled ? PaneState.READY : PaneState.failed(FaultWords.of(fault)));
    }

    private void check(String checked) {
        if (folder.get().isEmpty() || checked.isEmpty()) {
            return;
        }
        Path where = folder.get().get();
        state.set(PaneState.working(Words.of("intake.checking")));
        int threads = Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
        checking.runAfter(
                REST,
                progress -> {
                    EntryGuard.enter();
                    return MendJob.check(checked, where, threads, progress);
                },
                found -> {
                    finding.set(found);
                    state.set(PaneState.READY);
                },
                this::fail);
    }

    /** {@return whether the text that is shown was checked and nothing is wrong with it} */
    boolean isSound() {
        return state.get().phase() == PaneState.Phase.READY
                && !finding.get().report().isEmpty();
    }

    /** Puts the text in the place of the description, and opens the folder. */
    void save() {
        if (!isSound()) {
            return;
        }
        Path where = folder.get().orElseThrow();
        String mended = text.get();
        checking.run(
                progress -> {
                    EntryGuard.enter();
                    MendJob.save(mended, where);
                    return where;
                },
                saved -> {
                    leave();
                    open.accept(saved);
                },
                this::fail);
    }

    /** Leaves the folder as it is. */
    public void leave() {
        checking.cancel();
        folder.set(Optional.empty());
        text.set("");
    }
}
