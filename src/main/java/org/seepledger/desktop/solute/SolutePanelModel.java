package org.seepledger.desktop.solute;

import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Stock;
import org.seepledger.report.Wording;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/** What stands with every page about a solute: how it is looked at, what lies above the threshold, what is doubtful. */
public final class SolutePanelModel {

    private final Session session;
    private final SoluteLook look;
    private final LivePlume plumes;
    private final ReadOnlyStringWrapper above = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper doubts = new ReadOnlyStringWrapper("");

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param look how solutes are looked at
     * @param plumes the budgets
     */
    public SolutePanelModel(Session session, SoluteLook look, LivePlume plumes) {
        this.session = session;
        this.look = look;
        this.plumes = plumes;
        for (ObservableValue<?> cause : List.of(
                session.solute(),
                session.interval(),
                session.selected(),
                session.numbers(),
                look.changes(),
                plumes.known(),
                plumes.record())) {
            cause.addListener((value, before, after) -> show());
        }
    }

    /** {@return how solutes are looked at} */
    SoluteLook look() {
        return look;
    }

    /** {@return the solute looked at; empty for water} */
    ReadOnlyStringProperty solute() {
        return session.solute();
    }

    /** {@return area and volume above the threshold at the interval's end; empty for no threshold} */
    public ReadOnlyStringProperty above() {
        return above.getReadOnlyProperty();
    }

    /** {@return how many warnings there are on the solutes of the record, in words; empty for none} */
    public ReadOnlyStringProperty doubts() {
        return doubts.getReadOnlyProperty();
    }

    private void show() {
        above.set(session.set().get().flatMap(this::above).orElse(""));
        doubts.set(plumes.record()
                .get()
                .filter(known -> !session.solute().get().isEmpty())
                .map(Inquiry.Reply::answer)
                .map(known -> known.warnings().size())
                .filter(count -> count > 0)
                .map(count -> Words.of(count == 1 ? "solute.doubt" : "solute.doubts", count))
                .orElse(""));
    }

    private String number(double value) {
        return session.numbers().get().of(Figures.typeset(value));
    }

    private Optional<String> above(OpenSet set) {
        int interval = session.interval().get();
        Period period = set.workbench().periods(Periods.Every.INTERVAL, 1).get(interval);
        return look.threshold()
                .get()
                .flatMap(typed -> plumes.shown(period).map(shown -> {
                    Stock stock = shown.plume().whole(interval + 1);
                    Measure length = set.aquifer().lengthUnit();
                    return Words.of(
                            "solute.above",
                            shown.prism().name(),
                            number(stock.areaAbove()),
                            Wording.raised(Measure.power(length, 2)),
                            number(stock.rockAbove()),
                            Wording.raised(Measure.power(length, 3)));
                }));
    }
}
