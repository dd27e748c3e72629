package org.seepledger.desktop.intake;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseFile;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Proposal;
import org.seepledger.intake.Use;
import org.seepledger.intake.Wishes;
import org.seepledger.job.IntakeJob;
import org.seepledger.job.RasterPreview;
import org.seepledger.progress.Cancelled;

/** Loose files, what they are taken for, and the aquifer folder that they make. */
public final class IntakeModel {

    private final FileDialogs dialogs;
    private final Consumer<Path> open;
    private final Lane looking;
    private final MakingModel making;
    private final WritingModel writing;
    private final Lane previewing;
    private final Set<Path> brought = new LinkedHashSet<>();
    private final Set<Path> leftOut = new HashSet<>();
    private final BooleanProperty shown = new SimpleBooleanProperty();
    private final IntegerProperty chosen = new SimpleIntegerProperty(-1);
    private final ReadOnlyObjectWrapper<Optional<Plan>> plan = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> state =
            new ReadOnlyObjectWrapper<>(PaneState.empty(Words.of("intake.empty")));

    /**
     * Makes the model.
     *
     * @param tasks looks, checks and writes
     * @param dialogs asks for files and folders
     * @param open opens an aquifer folder in the window
     */
    public IntakeModel(Tasks tasks, FileDialogs dialogs, Consumer<Path> open) {
        this.dialogs = dialogs;
        this.open = open;
        this.looking = tasks.latest("task.intake.looking");
        this.making = new MakingModel(tasks);
        this.writing = new WritingModel(tasks, dialogs, this::leaveTo);
        this.previewing = tasks.latest("task.intake.preview");
    }

    /** {@return whether the assistant is before the user} */
    public BooleanProperty shown() {
        return shown;
    }

    /** {@return the files and what they are taken for, once there are any} */
    public ReadOnlyObjectProperty<Optional<Plan>> plan() {
        return plan.getReadOnlyProperty();
    }

    /** {@return what they make, and what the check says of it} */
    MakingModel making() {
        return making;
    }

    /** {@return how the looking stands} */
    ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** {@return which item is looked at, from 0; −1 for the set as a whole} */
    IntegerProperty chosen() {
        return chosen;
    }

    /** Asks for files and adds them. */
    void addFiles() {
        List<Path> files = dialogs.filesToRead(Words.of("intake.files"));
        if (!files.isEmpty()) {
            bring(files);
        }
    }

    /** Asks for a folder and adds its files. */
    void addFolder() {
        dialogs.folder(Words.of("intake.folder")).ifPresent(folder -> bring(List.of(folder)));
    }

    /** Forgets all files. */
    void clear() {
        brought.clear();
        leftOut.clear();
        looking.cancel();
        making.forget();
        plan.set(Optional.empty());
        writing.forget();
        state.set(PaneState.empty(Words.of("intake.empty")));
    }

    /**
     * Shows the assistant, and adds files and folders.
     *
     * @param paths the files and folders; none to show what is there
     */
    public void bring(List<Path> paths) {
        shown.set(true);
        if (paths.isEmpty()) {
            return;
        }
        brought.addAll(
                paths.stream().map(path -> path.toAbsolutePath().normalize()).toList());
        List<Path> all = new ArrayList<>(brought);
        leftOut.removeAll(brought);
        Set<Path> without = Set.copyOf(leftOut);
        state.set(PaneState.working(Words.of("intake.looking")));
        looking.run(
                progress -> {
                    EntryGuard.enter();
                    return Proposal.of(IntakeJob.look(all, progress).without(without));
                },
                this::found,
                fault -> {
                    brought.removeAll(paths);
                    state.set(fault instanceof Cancelled ? rest() : PaneState.failed(FaultWords.of(fault)));
                });
    }

    private void found(Plan looked) {
        Plan merged = plan.get().map(before -> Corrections.kept(before, looked)).orElse(looked);
        state.set(merged.items().isEmpty() ? PaneState.empty(Words.of("intake.nothing")) : PaneState.READY);
        if (plan.get().isEmpty()) {
            writing.suggest(looked.root());
        }
        chosen.set(-1);
        take(merged);
    }

    private void take(Plan next) {
        plan.set(Optional.of(next));
        writing.forget();
        making.begin(next);
    }

    private PaneState rest() {
        return plan.get().isEmpty() ? PaneState.empty(Words.of("intake.empty")) : PaneState.READY;
    }

    /** {@return the item looked at; empty for the set as a whole} */
    Optional<Item> item() {
        int index = chosen.get();
        return plan.get()
                .filter(now -> index >= 0 && index < now.items().size())
                .map(now -> now.items().get(index));
    }

    /**
     * Makes something else of the item looked at.
     *
     * @param change the change
     */
    void change(UnaryOperator<Item> change) {
        item().ifPresent(item -> {
            Plan now = plan.get().orElseThrow();
            Item changed = change.apply(item);
            if (!changed.equals(item)) {
                take(now.with(chosen.get(), changed));
            }
        });
    }

    /**
     * Leaves out one of several files of the item looked at.
     *
     * @param file which, from 0
     */
    void leaveOut(int file) {
        change(item -> {
            Item.Rasters rasters = (Item.Rasters) item;
            leftOut.add(rasters.files().get(file).path());
            return rasters.without(file);
        });
    }

    /**
     * Changes what is made of a part of the item looked at.
     *
     * @param index which use, from 0
     * @param change the change
     */
    void changeUse(int index, UnaryOperator<Use> change) {
        change(item -> item.with(index, change.apply(item.uses().get(index))));
    }

    /**
     * Says something of the set as a whole.
     *
     * @param topic what of
     * @param text what
     */
    void say(Wishes.Topic topic, String text) {
        plan.get().ifPresent(now -> {
            Wishes said = now.wishes().with(topic, text);
            if (!said.equals(now.wishes())) {
                take(now.with(said));
            }
        });
    }

    /** {@return the lines of the list} */
    List<ItemRow> rows() {
        return ItemRows.of(plan.get(), making.made().get());
    }

    /**
     * Reads a band to be looked at.
     *
     * @param file the raster
     * @param band from 0
     * @param done gets it
     */
    void preview(LooseFile.Raster file, int band, Consumer<RasterPreview> done) {
        previewing.run(
                progress -> {
                    EntryGuard.enter();
                    return RasterPreview.of(file.path(), file.shownName(), band, progress);
                },
                done,
                writing::fail);
    }

    /** Writes the new folder and opens it. */
    void write() {
        making.made().get().map(Made::copied).filter(Composition::isSound).ifPresent(writing::write);
    }

    /** Writes the description of files where they lie, and opens their folder. */
    void describe() {
        making.made()
                .get()
                .filter(now -> now.placed().isSound())
                .ifPresent(now -> writing.describe(now.placed(), now.plan().root()));
    }

    /** {@return the writing: where to, and how it stands} */
    WritingModel writing() {
        return writing;
    }

    private void leaveTo(Path folder) {
        shown.set(false);
        clear();
        open.accept(folder);
    }
}
