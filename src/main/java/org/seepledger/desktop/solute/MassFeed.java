package org.seepledger.desktop.solute;

import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Period;
import org.seepledger.report.Term;

/**
 * Tells map and section what mass of the solute looked at passes the selected prism's faces in the interval looked at, with the water and
 * by dispersion.
 */
public final class MassFeed {

    private static final Set<Group> FACES = EnumSet.of(Group.SIDE, Group.LID, Group.DISPERSION);

    private final Session session;
    private final LivePlume plumes;
    private final MassReading masses;

    /**
     * Begins to tell.
     *
     * @param session what the window looks at
     * @param plumes the budgets
     * @param masses the units
     */
    public MassFeed(Session session, LivePlume plumes, MassReading masses) {
        this.session = session;
        this.plumes = plumes;
        this.masses = masses;
        for (ObservableValue<?> cause : List.of(
                plumes.known(),
                plumes.record(),
                plumes.nowState(),
                session.selected(),
                session.interval(),
                session.solute(),
                masses.changes())) {
            cause.addListener((value, before, after) -> tell());
        }
    }

    private void tell() {
        if (!session.solute().get().isEmpty()) {
            boolean failed = plumes.nowState().get().phase() == PaneState.Phase.FAILED;
            session.faceFlows()
                    .set(session.set()
                            .get()
                            .filter(set -> !failed)
                            .flatMap(this::flows)
                            .orElse(FaceFlows.NONE));
        }
    }

    private Optional<FaceFlows> flows(OpenSet set) {
        Period interval = set.workbench()
                .periods(Periods.Every.INTERVAL, 1)
                .get(session.interval().get());
        Drawing drawing = session.drawing().get();
        MassUnits units = masses.inUse(set);
        return plumes.shown(interval).map(shown -> {
            Map<String, Double> sides = new LinkedHashMap<>();
            Map<String, Double> lids = new LinkedHashMap<>();
            for (Term term : Term.of(shown.in(interval).budget())) {
                Map<String, Double> faces = term.group() == Group.LID || lids.containsKey(term.item()) ? lids : sides;
                if (FACES.contains(term.group()) && term.quantified()) {
                    faces.merge(term.item(), term.net() / interval.duration() * units.rateFactor(), Double::sum);
                }
            }
            boolean isNow = Optional.of(shown.prism()).equals(session.selectedPrism());
            long revision = isNow ? drawing.revision() : FaceFlows.NONE.revision();
            return new FaceFlows(revision, shown.prism().name(), units.rate().toString(), sides, lids);
        });
    }
}
