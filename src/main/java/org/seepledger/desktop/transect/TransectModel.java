package org.seepledger.desktop.transect;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.aquifer.Solute;
import org.seepledger.desktop.budget.PeriodWords;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Crossing;

/** What crosses the transect that is chosen, of the solute looked at. */
public final class TransectModel {

    private static final FileDialogs.Kind CSV = new FileDialogs.Kind("CSV", "*.csv");

    private final Session session;
    private final Reading reading;
    private final MassReading masses;
    private final CopyBoard copies;
    private final FileDialogs dialogs;
    private final Lane files;
    private final LiveCrossings crossings;
    private final BooleanProperty open = new SimpleBooleanProperty();
    private final ObservableList<Choice> choices = FXCollections.observableArrayList();
    private final ObjectProperty<Optional<Choice>> chosen = new SimpleObjectProperty<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Optional<TransectTable>> table = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(nothing());
    private final List<MeasuredPanels> measured = new ArrayList<>();
    private boolean filling;

    /**
     * What can be chosen.
     *
     * @param name the transect's name, or what measured panels are called
     * @param measured which of the measured ones, from 0; -1 for a drawn one
     */
    public record Choice(String name, int measured) {}

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks where work is done
     * @param reading over which period figures are read
     * @param masses how masses are read
     * @param copies where copies go
     * @param dialogs asks for files of measured panels
     */
    public TransectModel(
            Session session, Tasks tasks, Reading reading, MassReading masses, CopyBoard copies, FileDialogs dialogs) {
        this.session = session;
        this.reading = reading;
        this.masses = masses;
        this.copies = copies;
        this.dialogs = dialogs;
        this.files = tasks.latest("task.panels");
        this.crossings = new LiveCrossings(session, tasks, reading);
        session.set().addListener((set, before, after) -> begin());
        session.transects().addListener((transects, before, after) -> fill());
        session.transect().addListener((name, before, after) -> touch());
        chosen.addListener((choice, before, after) -> choose(after));
        for (ObservableValue<?> cause :
                List.of(open, session.interval(), session.solute(), reading.changes(), masses.changes())) {
            cause.addListener((value, before, after) -> show());
        }
        crossings.causes().forEach(cause -> cause.addListener((value, before, after) -> show()));
        fill();
    }

    private static PaneState nothing() {
        return PaneState.empty(Words.of("transect.empty"));
    }

    private void begin() {
        measured.clear();
        crossings.forget(nothing());
        fill();
    }

    /** {@return whether anybody looks; nothing is worked out else} */
    public BooleanProperty open() {
        return open;
    }

    /** {@return what can be chosen: drawn transects, then measured ones} */
    public ObservableList<Choice> choices() {
        return choices;
    }

    /** {@return what is chosen} */
    public ObjectProperty<Optional<Choice>> chosen() {
        return chosen;
    }

    ReadOnlyObjectProperty<Optional<TransectTable>> table() {
        return table.getReadOnlyProperty();
    }

    /** {@return how it stands with the table} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** {@return how figures are read} */
    public Reading reading() {
        return reading;
    }

    /**
     * {@return a number as the window writes it}
     *
     * @param typeset the number, typeset
     */
    public String number(String typeset) {
        return session.numbers().get().of(typeset);
    }

    /** Asks the map to begin a transect. */
    public void draw() {
        session.demand().set(Session.Demand.DRAW_TRANSECT);
    }

    /** Works out again what was stopped or failed. */
    public void again() {
        crossings.again();
    }

    /**
     * Asks for another name of the drawn transect that is chosen.
     *
     * @param name the name
     */
    public void rename(String name) {
        if (chosen.get().filter(choice -> choice.measured < 0).isPresent()) {
            session.transectName().set(Optional.of(name.strip()));
        }
    }

    private void fill() {
        List<Choice> all = new ArrayList<>();
        session.transects().get().lines().forEach(line -> all.add(new Choice(line.name(), -1)));
        for (int i = 0; i < measured.size(); i++) {
            MeasuredPanels panels = measured.get(i);
            all.add(new Choice(Words.of("transect.measured", panels.solute(), panels.transect()), i));
        }
        Optional<Choice> before = chosen.get().filter(choice -> choice.measured >= 0 && all.contains(choice));
        filling = true;
        if (!choices.equals(all)) {
            choices.setAll(all);
        }
        chosen.set(before.or(() -> all.stream()
                .filter(choice -> choice.name.equals(session.transect().get()))
                .findFirst()));
        filling = false;
        show();
    }

    /** A transect that the map was touched at takes the place of a measured one. */
    private void touch() {
        filling = true;
        chosen.set(Optional.empty());
        filling = false;
        fill();
    }

    private void choose(Optional<Choice> choice) {
        if (!filling) {
            choice.filter(drawn -> drawn.measured < 0)
                    .ifPresent(drawn -> session.transect().set(drawn.name));
            show();
        }
    }

    private Optional<MeasuredPanels> measuredPanels() {
        return chosen.get().filter(choice -> choice.measured >= 0).map(choice -> measured.get(choice.measured));
    }

    private void show() {
        Optional<OpenSet> set = session.set().get();
        if (!open.get() || set.isEmpty() || chosen.get().isEmpty()) {
            crossings.rest(nothing());
            table.set(Optional.empty());
            state.set(nothing());
            return;
        }
        if (measuredPanels().isPresent()) {
            table.set(measuredPanels().map(panels -> TransectTable.of(set.get(), masses.inUse(set.get()), panels)));
            state.set(PaneState.READY);
            return;
        }
        crossings.ask(set.get());
        Period period = reading.period(set.get(), session.interval().get());
        Optional<Crossing> crossing = solute().flatMap(crossings::of);
        table.set(crossing.map(found -> TransectTable.of(
                set.get(),
                masses.inUse(set.get()),
                found,
                period,
                PeriodWords.of(
                        period, set.get().aquifer().times(), session.numbers().get()))));
        state.set(crossings.state());
    }

    /** The solute looked at; the first where that is the water. */
    private Optional<String> solute() {
        String name = session.solute().get();
        return session.set()
                .get()
                .flatMap(set -> set.solutes().stream()
                        .map(Solute::name)
                        .filter(solute -> name.isEmpty() || name.equals(solute))
                        .findFirst());
    }

    /** Adds measured panels of a file that is asked for. */
    public void openPanels() {
        Optional<OpenSet> set =
                session.set().get().filter(opened -> !opened.solutes().isEmpty());
        set.ifPresent(opened -> dialogs.fileToRead(Words.of("transect.panels.title"), CSV)
                .ifPresent(file -> files.run(
                        progress -> {
                            EntryGuard.enter();
                            return opened.workbench().solutes().panels(file);
                        },
                        this::add,
                        fault -> session.notices().refuse(FaultWords.of(fault)))));
    }

    private void add(List<MeasuredPanels> panels) {
        int first = measured.size();
        measured.addAll(panels);
        fill();
        choices.stream()
                .filter(choice -> choice.measured == first)
                .findFirst()
                .ifPresent(choice -> chosen.set(Optional.of(choice)));
        session.notices().done(Words.of("transect.panels.added", panels.size()));
    }

    /** Copies the table with its units, in full precision. */
    public void copy() {
        table.get().ifPresent(shown -> {
            shown.copy().on(copies);
            session.notices().done(Words.of("transect.copied", shown.whose()));
        });
    }
}
