package org.seepledger.desktop.intake;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.BiConsumer;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Composition;
import org.seepledger.job.IntakeJob;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** The writing of an aquifer folder: where to, and how it stands. */
final class WritingModel {

    private final FileDialogs dialogs;
    private final Consumer<Path> done;
    private final Lane writing;
    private final StringProperty target = new SimpleStringProperty("");
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);

    WritingModel(Tasks tasks, FileDialogs dialogs, Consumer<Path> done) {
        this.dialogs = dialogs;
        this.done = done;
        this.writing = tasks.latest("task.intake.writing");
    }

    /** {@return where the new folder is to be} */
    StringProperty target() {
        return target;
    }

    /** {@return how the writing stands} */
    ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /**
     * Suggests a folder beside the one that holds the files.
     *
     * @param root the folder that holds them
     */
    void suggest(Path root) {
        Path name = root.getFileName();
        Path beside = name == null ? root.resolve("aquifer") : root.resolveSibling(name + "-aquifer");
        target.set(beside.toString());
    }

    /** Asks for a folder in which the new one is to be. */
    void choose() {
        Path name = folder().map(Path::getFileName).orElse(Path.of("aquifer"));
        dialogs.folder(Words.of("intake.target"))
                .ifPresent(folder -> target.set(folder.resolve(name).toString()));
    }

    /** Where the new folder is to be, if that can be the name of a folder. */
    private Optional<Path> folder() {
        try {
            Path path = Path.of(target.get().strip());
            boolean named = path.getFileName() != null && !path.toString().isEmpty();
            return named ? Optional.of(path.toAbsolutePath().normalize()) : Optional.empty();
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }

    void write(Composition composition) {
        folder().ifPresentOrElse(
                        folder -> write(
                                folder, (threads, progress) -> IntakeJob.write(composition, folder, threads, progress)),
                        () -> state.set(PaneState.failed(Words.of("intake.target.none"))));
    }

    void describe(Composition composition, Path root) {
        write(root, (threads, progress) -> IntakeJob.describe(composition, root, threads, progress));
    }

    private void write(Path folder, BiConsumer<Integer, Progress> work) {
        state.set(PaneState.working(Words.of("intake.writing", folder)));
        int threads = Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
        writing.run(
                progress -> {
                    EntryGuard.enter();
                    work.accept(threads, progress);
                    return folder;
                },
                written -> {
                    state.set(PaneState.READY);
                    done.accept(written);
                },
                this::fail);
    }

    /** Says what went wrong. */
    void fail(Throwable fault) {
        state.set(fault instanceof Cancelled ? PaneState.READY : PaneState.failed(FaultWords.of(fault)));
    }

    /** What was said of an earlier writing no longer holds. */
    void forget() {
        state.set(PaneState.READY);
    }

    /** Ends the writing; nothing is left of it. */
    void cancel() {
        writing.cancel();
        forget();
    }
}
