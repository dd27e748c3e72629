package org.seepledger.desktop.budget;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.report.Term;

/** Tells map and section what water flows through the selected prism's faces in the interval looked at, where no solute is. */
public final class FaceFeed {

    private final Session session;
    private final LiveBudget live;
    private final Reading reading;

    /**
     * Prepares to tell.
     *
     * @param session what the window looks at
     * @param live the budgets
     * @param reading the units
     */
    public FaceFeed(Session session, LiveBudget live, Reading reading) {
        this.session = session;
        this.live = live;
        this.reading = reading;
    }

    /** Begins to tell. */
    public void begin() {
        live.known().addListener((known, before, after) -> tell());
        live.now().addListener((now, before, after) -> tell());
        session.selected().addListener((selected, before, after) -> tell());
        session.interval().addListener((interval, before, after) -> tell());
        session.solute().addListener((solute, before, after) -> tell());
        reading.rateUnit().addListener((unit, before, after) -> tell());
    }

    private void tell() {
        if (!session.solute().get().isEmpty()) {
            return;
        }
        Optional<OpenSet> set = session.set().get().filter(open -> !hasFailed());
        Optional<Prism> prism = session.selectedPrism();
        session.faceFlows()
                .set(set.flatMap(open -> prism.flatMap(drawn -> flows(open, drawn)))
                        .orElse(FaceFlows.NONE));
    }

    /** Old flows must not stand at the sides of a prism that has no budget. */
    private boolean hasFailed() {
        return live.now().get().phase() == PaneState.Phase.FAILED;
    }

    private Optional<FaceFlows> flows(OpenSet set, Prism prism) {
        Period interval = set.workbench()
                .periods(Periods.Every.INTERVAL, 1)
                .get(session.interval().get());
        Drawing drawing = session.drawing().get();
        return live.known().get().budget(prism, interval).map(shown -> {
            ResultUnits units = reading.inUse(set);
            DoubleUnaryOperator rate = volume -> volume / interval.duration() * units.rateFactor();
            Map<String, Double> net = nets(shown, Group.SIDE, rate);
            long revision = shown.prism().equals(prism) ? drawing.revision() : FaceFlows.NONE.revision();
            String unit = units.rate().toString();
            return new FaceFlows(revision, prism.name(), unit, net, nets(shown, Group.LID, rate));
        });
    }

    private static Map<String, Double> nets(BudgetShown shown, Group group, DoubleUnaryOperator rate) {
        Map<String, Double> nets = new LinkedHashMap<>();
        Term.of(shown.budget()).stream()
                .filter(term -> term.group() == group)
                .forEach(term -> nets.put(term.item(), rate.applyAsDouble(term.net())));
        return nets;
    }
}
