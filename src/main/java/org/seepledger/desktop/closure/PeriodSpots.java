package org.seepledger.desktop.closure;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.balance.HotSpot;
import org.seepledger.balance.Periods;
import org.seepledger.balance.Whereabouts;
import org.seepledger.desktop.budget.LiveBudget;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.job.RecordBudget;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;

/** The cells furthest from balance in the period that is shown, where that is shorter than the record. */
final class PeriodSpots {

    /** Imbalances that add up to less than this share of throughput are rounding. */
    private static final double LOCATED = 1e-8;

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;
    private final Lane looking;
    private final ObservableList<Spot> spots = FXCollections.observableArrayList();
    private final ReadOnlyStringWrapper period = new ReadOnlyStringWrapper("");

    PeriodSpots(Session session, LiveBudget live, Reading reading, Tasks tasks) {
        this.session = session;
        this.live = live;
        this.reading = reading;
        this.looking = tasks.latest("task.whereabouts");
    }

    /** Looks for them anew. */
    void find(Function<HotSpot, Spot> words) {
        looking.cancel();
        spots.clear();
        period.set("");
        Optional<OpenSet> set = session.set().get();
        Optional<RecordBudget> record = live.whole().get();
        Optional<Prism> prism = session.selectedPrism();
        if (set.isEmpty()
                || record.isEmpty()
                || prism.isEmpty()
                || reading.every().get() == Periods.Every.RECORD
                || !record.get().prisms().contains(prism.get())) {
            return;
        }
        Period shown = reading.period(set.get(), session.interval().get());
        PeriodBudget budget = record.get()
                .balance()
                .ledgers()
                .get(record.get().prisms().indexOf(prism.get()))
                .budget(shown);
        if (Double.isNaN(budget.totals().storageChange())) {
            return;
        }
        double throughput = budget.totals().throughput() / shown.duration();
        looking.run(
                progress -> {
                    EntryGuard.enter();
                    return set.get().workbench().whereabouts(prism.get(), shown, progress);
                },
                found -> show(shown, found, throughput, words),
                fault -> spots.clear());
    }

    private void show(Period shown, Whereabouts found, double throughput, Function<HotSpot, Spot> words) {
        if (found.magnitude() > LOCATED * throughput) {
            List<Spot> all = found.largest().stream().map(words).toList();
            period.set(shown.name());
            spots.setAll(all);
        }
    }

    ObservableList<Spot> spots() {
        return spots;
    }

    /** What the period is called; empty where there are no such cells. */
    ReadOnlyStringProperty period() {
        return period.getReadOnlyProperty();
    }
}
