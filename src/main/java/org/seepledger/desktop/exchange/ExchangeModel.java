package org.seepledger.desktop.exchange;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.PeriodWords;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.picture.ExchangeDiagram;
import org.seepledger.picture.Picture;
import org.seepledger.picture.UnitShown;
import org.seepledger.prism.Prism;

/** What prisms give to each other and to the outside in the period looked at. */
public final class ExchangeModel {

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;
    private final CopyBoard copies;
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();
    private final ReadOnlyStringWrapper belongs = new ReadOnlyStringWrapper("");
    private Optional<Matrix> matrix = Optional.empty();

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param live the budgets
     * @param reading how figures are read
     * @param copies where copies go
     */
    public ExchangeModel(Session session, LiveBudget live, Reading reading, CopyBoard copies) {
        this.session = session;
        this.live = live;
        this.reading = reading;
        this.copies = copies;
        live.whole().addListener((whole, before, after) -> show());
        session.interval().addListener((interval, before, after) -> show());
        reading.changes().addListener((changed, before, after) -> show());
        show();
    }

    /** {@return how often what it shows has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    /** {@return which geometry and time it belongs to} */
    public ReadOnlyStringProperty belongs() {
        return belongs.getReadOnlyProperty();
    }

    /** Asks the map to begin a prism. */
    public void draw() {
        live.draw();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return live.record();
    }

    /** {@return the flows as a matrix, if they are known} */
    public Optional<Matrix> matrix() {
        return matrix;
    }

    /**
     * {@return the flows as a diagram, if they are known}
     *
     * @param width in logical pixels
     */
    public Optional<Picture> diagram(double width) {
        return session.set()
                .get()
                .flatMap(set -> live.whole().get().map(record -> {
                    Period period = reading.period(set, session.interval().get());
                    return ExchangeDiagram.of(
                                    names(record),
                                    record.balance().exchange(),
                                    period,
                                    reading.shown(set),
                                    Math.max(320, width))
                            .written(session.numbers().get()::label);
                }));
    }

    /** Copies the matrix with its unit, in full precision. */
    public void copy() {
        matrix.ifPresent(shown -> {
            String title = belongs(NumberForm.SPACE_POINT);
            copies.table(shown.tabSeparated(title), shown.html(title));
            session.notices().done(Words.of("exchange.copied"));
        });
    }

    private static List<String> names(RecordBudget record) {
        return record.prisms().stream().map(Prism::name).toList();
    }

    private void show() {
        Optional<OpenSet> set = session.set().get();
        Optional<RecordBudget> record = live.whole().get();
        matrix = set.flatMap(open -> record.map(known -> matrix(open, known)));
        belongs.set(belongs(session.numbers().get()));
        changes.set(changes.get() + 1);
    }

    private String belongs(NumberForm form) {
        Optional<RecordBudget> record = live.whole().get();
        return session.set()
                .get()
                .filter(open -> record.isPresent())
                .map(open -> Words.of(
                        "exchange.belongs",
                        record.get().prisms().size(),
                        PeriodWords.of(
                                reading.period(open, session.interval().get()),
                                open.aquifer().times(),
                                form)))
                .orElse("");
    }

    /**
     * {@return a flow of the matrix as it is to be read; nothing where the two do not touch}
     *
     * @param shown the matrix
     * @param giver the place of who gives
     * @param receiver the place of who receives
     */
    public String text(Matrix shown, int giver, int receiver) {
        return session.numbers().get().of(shown.text(giver, receiver));
    }

    private Matrix matrix(OpenSet set, RecordBudget record) {
        Period period = reading.period(set, session.interval().get());
        UnitShown unit = reading.shown(set);
        List<String> names = new ArrayList<>(names(record));
        names.add(ExchangeFlow.OUTSIDE);
        Matrix made = Matrix.of(names, unit.words(), reading.unitName(set));
        for (ExchangeFlow flow : record.balance().exchange()) {
            made.put(names.indexOf(flow.giver()), names.indexOf(flow.receiver()), unit.of(flow.volume(period), period));
        }
        return made;
    }
}
