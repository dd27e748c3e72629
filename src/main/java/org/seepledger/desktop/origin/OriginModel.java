package org.seepledger.desktop.origin;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.SoluteLook;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.TracedNumber;
import org.seepledger.job.TracedNumber.Line;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;
import org.seepledger.report.CellPlace;

/** Where a number of the ledger comes from. */
public final class OriginModel {

    /** More values than these are not kept: nobody reads them, and the sum of the others is told. */
    private static final int MOST = 5000;

    private final Session session;
    private final Reading reading;
    private final MassReading masses;
    private final SoluteLook look;
    private final CopyBoard copies;
    private final Lane tracing;
    private final TraceExport export;
    private final ObservableList<Line> lines = FXCollections.observableArrayList();
    private final StringProperty sought = new SimpleStringProperty("");
    private final ReadOnlyStringWrapper belongs = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper sum = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper shown = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper remark = new ReadOnlyStringWrapper("");
    private final ReadOnlyBooleanWrapper changed = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper command = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(nothing());
    private Optional<Question> question = Optional.empty();
    private Optional<TracedNumber> answer = Optional.empty();

    /**
     * Makes the model.
     *
     * @param session what the window looks at, and which row is asked about
     * @param reading the period and the units of the ledger
     * @param masses the units of solutes
     * @param look how solutes are balanced
     * @param tasks does the work
     * @param dialogs asks where to write
     * @param copies where the command is copied to
     */
    public OriginModel(
            Session session,
            Reading reading,
            MassReading masses,
            SoluteLook look,
            Tasks tasks,
            FileDialogs dialogs,
            CopyBoard copies) {
        this.session = session;
        this.reading = reading;
        this.masses = masses;
        this.look = look;
        this.copies = copies;
        this.tracing = tasks.latest("task.trace");
        this.export = new TraceExport(session, dialogs, tasks);
        session.asked().addListener((asked, before, after) -> after.ifPresent(this::ask));
        session.set().addListener((set, before, after) -> clear(nothing()));
        session.solute().addListener((solute, before, after) -> clear(nothing()));
        session.drawing().addListener((drawing, before, after) -> showRemark());
        session.shapes().addListener((shapes, before, after) -> showRemark());
        sought.addListener((text, before, after) -> fill());
    }

    private static PaneState nothing() {
        return PaneState.empty(Words.of("origin.empty"));
    }

    private void clear(PaneState now) {
        tracing.cancel();
        question = Optional.empty();
        answer = Optional.empty();
        lines.clear();
        changed.set(false);
        session.marked().set(List.of());
        for (ReadOnlyStringWrapper words : List.of(belongs, sum, shown, remark, command)) {
            words.set("");
        }
        state.set(now);
    }

    private void ask(RowAsked row) {
        session.asked().set(Optional.empty());
        clear(nothing());
        Optional<OpenSet> set = session.set().get();
        Optional<Prism> prism = session.selectedPrism();
        if (set.isEmpty() || prism.isEmpty()) {
            return;
        }
        if (row.item().isEmpty()) {
            state.set(PaneState.empty(Words.of("origin.group")));
            return;
        }
        trace(Question.of(
                set.get(), prism.get(), row, reading, session.interval().get(), solute(set.get())));
    }

    private Optional<Question.OfSolute> solute(OpenSet set) {
        return Optional.of(session.solute().get())
                .filter(name -> !name.isEmpty())
                .map(name -> new Question.OfSolute(name, look.choice(set), masses.inUse(set)));
    }

    /** Asks the last question again, of the prism as it is drawn now. */
    public void again() {
        question.ifPresent(last -> session.asked().set(Optional.of(last.row())));
    }

    private TraceWords words() {
        return new TraceWords(session.numbers().get(), reading.volumes().get());
    }

    private void trace(Question asked) {
        question = Optional.of(asked);
        belongs.set(words().belongs(asked));
        command.set(asked.command().toString());
        state.set(PaneState.working(Words.of("origin.working")));
        tracing.run(
                progress -> {
                    EntryGuard.enter();
                    return asked.answer(MOST, progress);
                },
                this::answered,
                this::notAnswered);
    }

    private void notAnswered(Throwable fault) {
        if (fault instanceof Cancelled) {
            clear(nothing());
        } else {
            command.set("");
            state.set(PaneState.failed(FaultWords.of(fault)));
        }
    }

    private void answered(TracedNumber number) {
        answer = Optional.of(number);
        sum.set(words().sum(number));
        fill();
        showRemark();
        state.set(PaneState.READY);
    }

    private void fill() {
        if (answer.isEmpty()) {
            return;
        }
        TracedNumber number = answer.get();
        String[] words = sought.get().strip().toLowerCase(Locale.ROOT).split("\\s*[,;]\\s*");
        lines.setAll(
                number.largest().stream().filter(line -> holds(line, words)).toList());
        shown.set(words().shown(number, lines));
    }

    private static boolean holds(Line line, String[] words) {
        String text = (line.file() + " " + line.place()).toLowerCase(Locale.ROOT);
        for (String word : words) {
            if (!text.contains(word)) {
                return false;
            }
        }
        return true;
    }

    /** The trace belongs to the prism as it was drawn then, and the command to the file. */
    private void showRemark() {
        if (answer.isEmpty()) {
            return;
        }
        Prism traced = question.orElseThrow().prism();
        boolean differs = session.drawing()
                .get()
                .prism(traced.name())
                .filter(traced::equals)
                .isEmpty();
        boolean unsaved = !session.shapes().get().saved();
        changed.set(differs);
        remark.set(differs ? Words.of("origin.changed") : unsaved ? Words.of("origin.unsaved") : "");
    }

    /**
     * Lights the cells of values up on the map.
     *
     * @param chosen the values
     */
    public void light(List<Line> chosen) {
        session.marked()
                .set(chosen.stream()
                        .flatMap(line -> line.cell().stream())
                        .distinct()
                        .toList());
    }

    /**
     * Goes to the cell of a value on the map.
     *
     * @param line the value
     */
    public void goTo(Line line) {
        Optional<Grid> grid = session.set().get().map(set -> set.aquifer().grid());
        line.cell()
                .ifPresent(cell -> session.target().set(grid.map(on -> CellPlace.of(on, cell.row(), cell.column()))));
    }

    /** Copies the command. */
    public void copyCommand() {
        if (!command.get().isEmpty()) {
            copies.text(command.get());
            session.notices().done(Words.of("origin.copied"));
        }
    }

    /** Writes the whole trace, as the command does, to a file that is asked for. */
    public void export() {
        if (!remark.get().isEmpty()) {
            session.notices().refuse(remark.get());
        }
        if (answer.isEmpty() || !remark.get().isEmpty()) {
            return;
        }
        export.ask(question.orElseThrow());
    }

    /** {@return the values, the largest contribution first} */
    public ObservableList<Line> lines() {
        return lines;
    }

    /** {@return words that a value's file and place must hold} */
    public StringProperty sought() {
        return sought;
    }

    /** {@return whose number it is, and of when} */
    public ReadOnlyStringProperty belongs() {
        return belongs.getReadOnlyProperty();
    }

    /** {@return the number, and what its values add up to} */
    public ReadOnlyStringProperty sum() {
        return sum.getReadOnlyProperty();
    }

    /** {@return how many values are shown, and what they come to} */
    public ReadOnlyStringProperty shown() {
        return shown.getReadOnlyProperty();
    }

    /** {@return why it is not to be handed on as it is; empty for no reason} */
    public ReadOnlyStringProperty remark() {
        return remark.getReadOnlyProperty();
    }

    /** {@return whether the prism has changed since} */
    public ReadOnlyBooleanProperty changed() {
        return changed.getReadOnlyProperty();
    }

    /** {@return the command that does the same} */
    public ReadOnlyStringProperty command() {
        return command.getReadOnlyProperty();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }
}
