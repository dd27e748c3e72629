package org.seepledger.desktop.welcome;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.RecentFolders;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
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
        state.set(PaneState.working(Words.of("open.working", folder.getFileName())));
        opening.run(
                progress -> {
                    progress.begin(folder.toString(), 0);
                    return Opening.of(folder);
                },
                result -> {
                    state.set(PaneState.READY);
                    folders.remember(result.set().path());
                    opened.accept(result);
                },
                fault -> state.set(
                        fault instanceof Cancelled ? PaneState.READY : PaneState.failed(FaultWords.of(fault))));
    }

    /**
     * Opens the first folder of several that were dropped.
     *
     * @param dropped the files and folders
     */
    public void drop(List<Path> dropped) {
        Optional<Path> first = dropped.stream().findFirst();
        first.ifPresent(this::open);
    }
}
