package org.seepledger.desktop.ledger;

import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.aquifer.Layer;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.LivePlume;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;

/** The ledger of the selected prism: its rows, which geometry and time they belong to, and which face is lit up. */
public final class LedgerModel {

    private final Session session;
    private final LedgerSheets sheets;
    private final CopyBoard copies;
    private final ObservableList<LedgerRow> rows = FXCollections.observableArrayList();
    private final ReadOnlyStringWrapper belongs = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper notes = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper unit = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper massUnit = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper closure = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);
    private final ObjectProperty<Arrangement> arrangement = new SimpleObjectProperty<>(Arrangement.ITEMS);
    private final ObjectProperty<Order> order = new SimpleObjectProperty<>(Order.AS_DRAWN);
    private final ObjectProperty<Optional<LedgerRow>> chosen = new SimpleObjectProperty<>(Optional.empty());
    private double largest;
    private String whose = "";
    private String copyTitle = "";

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param live the water's budgets
     * @param reading how figures are read
     * @param plumes the solutes' budgets
     * @param masses how masses are read
     * @param copies where copies go
     */
    public LedgerModel(
            Session session, LiveBudget live, Reading reading, LivePlume plumes, MassReading masses, CopyBoard copies) {
        this.session = session;
        this.sheets = new LedgerSheets(session, live, reading, plumes, masses);
        this.copies = copies;
        sheets.causes().forEach(cause -> cause.addListener((value, before, after) -> show()));
        sheets.states().forEach(cause -> cause.addListener((value, before, after) -> showState()));
        arrangement.addListener((arranged, before, after) -> show());
        order.addListener((ordered, before, after) -> show());
        show();
    }

    /** {@return the rows} */
    public ObservableList<LedgerRow> rows() {
        return rows;
    }

    /** {@return which geometry and time the rows belong to} */
    public ReadOnlyStringProperty belongs() {
        return belongs.getReadOnlyProperty();
    }

    /** {@return what was done to the prism before it was balanced; empty for nothing} */
    public ReadOnlyStringProperty notes() {
        return notes.getReadOnlyProperty();
    }

    /** Asks the map to begin a prism. */
    public void draw() {
        sheets.live().draw();
    }

    /** {@return the unit of the numbers} */
    public ReadOnlyStringProperty unit() {
        return unit.getReadOnlyProperty();
    }

    /** {@return how a solute's budget closes; empty for water's} */
    public ReadOnlyStringProperty closure() {
        return closure.getReadOnlyProperty();
    }

    /** {@return the solute whose budget it is; empty for water's} */
    public ReadOnlyStringProperty solute() {
        return session.solute();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** {@return how rows are laid out} */
    public ObjectProperty<Arrangement> arrangement() {
        return arrangement;
    }

    /** {@return in which order rows stand} */
    public ObjectProperty<Order> order() {
        return order;
    }

    /** {@return how figures are read} */
    public Reading reading() {
        return sheets.reading();
    }

    LedgerSheets sheets() {
        return sheets;
    }

    /**
     * Sorts by something, or by nothing when it is sorted so already.
     *
     * @param by the order
     */
    public void sort(Order by) {
        order.set(order.get() == by ? Order.AS_DRAWN : by);
    }

    /**
     * Lights up the face that a row is about; none if it is about something else.
     *
     * @param row the row
     */
    public void light(LedgerRow row) {
        session.pointed().set(Optional.empty());
        session.lit().set(row.isFace() ? row.item() : "");
    }

    /** {@return the row that is chosen, if one is that has a number} */
    public ObjectProperty<Optional<LedgerRow>> chosen() {
        return chosen;
    }

    /** Asks where the number of the chosen row comes from. */
    public void askOrigin() {
        chosen.get()
                .filter(row -> row.kind() != LedgerRow.Kind.HEADING && row.kind() != LedgerRow.Kind.HELD)
                .ifPresentOrElse(this::askOrigin, () -> session.notices().refuse(Words.of("ledger.origin.none")));
    }

    /**
     * Asks where the number of a row comes from.
     *
     * @param row the row
     */
    public void askOrigin(LedgerRow row) {
        session.asked().set(Optional.of(new RowAsked(row.group(), row.item(), row.layer())));
    }

    /** {@return the first row about the face that is lit up, if there is one} */
    public Optional<LedgerRow> lit() {
        String item = session.lit().get();
        return rows.stream()
                .filter(LedgerRow::isFace)
                .filter(row -> row.item().equals(item))
                .findFirst();
    }

    /** {@return the row that another pane points at, if there is one; where it means all of a group, their heading} */
    public Optional<LedgerRow> pointed() {
        return session.pointed()
                .get()
                .flatMap(wanted -> rows.stream()
                        .filter(row ->
                                row.group() == wanted.group() && row.item().equals(wanted.item()))
                        .findFirst());
    }

    /** {@return what another pane points at} */
    public ReadOnlyObjectProperty<Optional<RowAsked>> pointing() {
        return session.pointed();
    }

    /** {@return the face that is lit up} */
    public ReadOnlyStringProperty litItem() {
        return session.lit();
    }

    /** Copies the rows with their units, in full precision. */
    public void copy() {
        if (!rows.isEmpty() && !belongs.get().isEmpty()) {
            new LedgerCopy(copyTitle, unit.get(), massUnit.get(), rows).table().on(copies);
            session.notices().done(Words.of("ledger.copied", belongs.get()));
        }
    }

    /**
     * {@return a number as a share of the largest of all rows, from 0 to 1}
     *
     * @param value what comes in or goes out
     */
    public double share(double value) {
        return largest == 0 || Double.isNaN(value) ? 0 : value / largest;
    }

    /**
     * {@return a number of a row, as it is to be read}
     *
     * @param row the row
     * @param value the number
     */
    public String text(LedgerRow row, double value) {
        return session.numbers().get().of(row.text(value));
    }

    private void show() {
        session.set()
                .get()
                .ifPresentOrElse(
                        set -> sheets.now().ifPresentOrElse(sheet -> show(set, sheet), this::clear), this::clear);
        showState();
    }

    private void showState() {
        state.set(sheets.state());
        belongs.set(state.get().phase() == PaneState.Phase.FAILED ? "" : whose);
    }

    private void show(OpenSet set, LedgerSheet sheet) {
        List<String> layers = set.aquifer().layers().stream().map(Layer::name).toList();
        List<LedgerRow> arranged = new LedgerRows(sheet, layers, order.get()).arranged(arrangement.get());
        largest = arranged.stream()
                .filter(row -> row.kind() == LedgerRow.Kind.ENTRY)
                .flatMapToDouble(row -> DoubleStream.of(row.inflow(), row.outflow()))
                .filter(value -> !Double.isNaN(value))
                .max()
                .orElse(0);
        unit.set(sheet.unitName());
        massUnit.set(sheet.ofSolute().map(LedgerSheet.OfSolute::massUnit).orElse(""));
        closure.set(session.numbers()
                .get()
                .of(sheet.ofSolute().map(LedgerSheet.OfSolute::closure).orElse("")));
        whose = whose(set, sheet, session.numbers().get());
        copyTitle = whose(set, sheet, NumberForm.SPACE_POINT);
        notes.set(String.join(" ", sheet.shown().notes()));
        rows.setAll(arranged);
    }

    private String whose(OpenSet set, LedgerSheet sheet, NumberForm form) {
        String geometry = sheet.shown().whose(set, form);
        return sheets.ofSolute() ? Words.of("ledger.of.solute", session.solute().get(), geometry) : geometry;
    }

    private void clear() {
        rows.clear();
        whose = "";
        notes.set("");
        closure.set("");
    }
}
