package org.seepledger.desktop.welcome;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.RecentFolders;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.progress.Cancelled;

/** What can be opened, and the opening of it. */
public final class WelcomeModel {

    private final FileDialogs dialogs;
    private final RecentFolders folders;
    private final Consumer<Opening> opened;
    private final Consumer<Runnable> whenSafe;
    private final Lane opening;
    private final Lane looking;
    private final ObservableList<Place> samples = FXCollections.observableArrayList();
    private final ObservableList<Place> recent = FXCollections.observableArrayList();
    private final ReadOnlyObjectWrapper<Optional<Broken>> failed = new ReadOnlyObjectWrapper<>(Optional.empty());
    private Consumer<List<Path>> loose = paths -> {};
    private Runnable review = () -> {};
    private Consumer<Path> wrong = folder -> {};
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);

    /**
     * Makes the model.
     *
     * @param tasks runs the opening
     * @param dialogs asks for a folder
     * @param folders the folders opened lately
     * @param opened gets what was opened
     * @param whenSafe goes on once no work can be lost
     */
    public WelcomeModel(
            Tasks tasks,
            FileDialogs dialogs,
            RecentFolders folders,
            Consumer<Opening> opened,
            Consumer<Runnable> whenSafe) {
        this.whenSafe = whenSafe;
        this.dialogs = dialogs;
        this.folders = folders;
        this.opened = opened;
        this.opening = tasks.latest("task.opening");
        this.looking = tasks.latest("task.looking");
    }

    /**
     * Looks for samples and recent folders.
     *
     * @param places where samples may lie
     */
    public void look(List<Path> places) {
        looking.run(
                progress -> new Found(Samples.in(places), stillThere()),
                found -> {
                    samples.setAll(found.samples());
                    recent.setAll(found.recent());
                },
                fault -> samples.clear());
    }

    /** What there is to open. */
    private record Found(List<Place> samples, List<Place> recent) {}

    private List<Place> stillThere() {
        return folders.list().stream().filter(Files::isDirectory).map(Place::of).toList();
    }

    /** {@return the samples found} */
    public ObservableList<Place> samples() {
        return samples;
    }

    /** {@return the folders opened lately that are still there} */
    public ObservableList<Place> recent() {
        return recent;
    }

    /** {@return how the opening goes; failed with what went wrong} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** Asks for a folder and opens it. */
    public void choose() {
        dialogs.folder(Words.of("open.choose")).ifPresent(this::open);
    }

    /**
     * Opens a folder.
     *
     * @param folder an aquifer folder, or the {@code aquifer.json} in it
     */
    public void open(Path folder) {
        whenSafe.accept(() -> read(folder));
    }

    private void read(Path folder) {
        failed.set(Optional.empty());
        state.set(PaneState.working(Words.of("open.working", folder.getFileName())));
        AtomicReference<Optional<Broken>> broken = new AtomicReference<>(Optional.empty());
        opening.run(
                progress -> {
                    progress.begin(folder.toString(), 0);
                    broken.set(Broken.of(folder));
                    return Opening.of(folder);
                },
                result -> {
                    state.set(PaneState.READY);
                    folders.remember(result.set().path());
                    opened.accept(result);
                },
                fault -> {
                    boolean stopped = fault instanceof Cancelled;
                    failed.set(stopped ? Optional.empty() : broken.get());
                    state.set(stopped ? PaneState.READY : PaneState.failed(FaultWords.of(fault)));
                });
    }

    /**
     * Takes files and folders that make no aquifer folder.
     *
     * @param taker gets them
     */
    public void whenLoose(Consumer<List<Path>> taker) {
        loose = taker;
    }

    /**
     * Says where a submitted budget is reviewed.
     *
     * @param turn turns there
     */
    public void whenReview(Runnable turn) {
        review = turn;
    }

    /** Goes to where a submitted budget is reviewed. */
    void review() {
        review.run();
    }

    /** Goes to where loose files are made into an aquifer folder. */
    void bringLoose() {
        loose.accept(List.of());
    }

    /**
     * Takes folders whose description is wrong.
     *
     * @param taker gets them
     */
    public void whenWrong(Consumer<Path> taker) {
        wrong = taker;
    }

    /** Mends the description of the folder that could not be opened; without one, brings its files. */
    void mendFailed() {
        failed.get().ifPresent(broken -> {
            if (broken.described()) {
                wrong.accept(broken.folder());
            } else {
                loose.accept(List.of(broken.folder()));
            }
        });
    }

    /** {@return the folder that could not be opened, if it is so} */
    ReadOnlyObjectProperty<Optional<Broken>> failed() {
        return failed.getReadOnlyProperty();
    }

    /**
     * Opens the first aquifer folder of several files and folders that were dropped; if there is none, they are loose files.
     *
     * @param dropped the files and folders
     */
    public void drop(List<Path> dropped) {
        opening.run(
                progress -> dropped.stream().filter(WelcomeModel::isAquifer).findFirst(),
                first -> first.ifPresentOrElse(this::open, () -> {
                    if (!dropped.isEmpty()) {
                        loose.accept(dropped);
                    }
                }),
                fault -> state.set(PaneState.failed(FaultWords.of(fault))));
    }

    private static boolean isAquifer(Path path) {
        EntryGuard.enter();
        return path.endsWith(AquiferReader.FILE) || Files.isRegularFile(path.resolve(AquiferReader.FILE));
    }
}
