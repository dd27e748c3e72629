package org.seepledger.desktop.budget;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.solute.LivePlume;
import org.seepledger.desktop.solute.MassReading;
import org.seepledger.desktop.solute.SoluteAnswersModel;
import org.seepledger.desktop.solute.SoluteLook;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/** A sample with its prisms, the first selected, and its budgets worked out, as view models see them. */
public final class LiveSet implements AutoCloseable {

    /** What the window looks at. */
    public final Session session = new Session();

    /** How figures are read. */
    public final Reading reading = new Reading(session);

    /** The budgets. */
    public final LiveBudget live = new LiveBudget(session, new DirectTasks());

    /** How solutes are looked at. */
    public final SoluteLook look = new SoluteLook(session);

    /** The solutes' budgets. */
    public final LivePlume plumes = new LivePlume(session, look, new DirectTasks());

    /** How masses are read. */
    public final MassReading masses = new MassReading(session, reading);

    /** What solutes' budgets say. */
    public final SoluteAnswersModel said = new SoluteAnswersModel(session, live, reading, plumes, masses, look);

    /** Where copies go. */
    public final GivenAnswers answers = new GivenAnswers();

    /** The set. */
    public final OpenSet set;

    /** Its prisms. */
    public final List<Prism> prisms;

    private LiveSet(Path folder) {
        Opening opening = Opening.of(folder);
        set = opening.set();
        prisms = set.workbench()
                .drawings()
                .prisms(set.path().resolve(Opening.PRISMS))
                .prisms();
        session.show(Optional.of(set));
        session.drawing().set(new Drawing(1, prisms, true));
        session.selected().set(prisms.get(0).name());
    }

    /** A set in a folder. */
    public static LiveSet of(Path folder) {
        return new LiveSet(folder);
    }

    /** The valley: 24 dated intervals, four prisms, storage known; it closes. */
    public static LiveSet valley() {
        return new LiveSet(Path.of("sample-aquifers/valley"));
    }

    /** The terrace: specific discharge at cell centres; it does not close. */
    public static LiveSet terrace() {
        return new LiveSet(Path.of("sample-aquifers/terrace"));
    }

    /** The depot: 24 months, two prisms, a solvent and its breakdown product, non-detects. */
    public static LiveSet depot() {
        return new LiveSet(Path.of("sample-aquifers/depot"));
    }

    /** A prism with all its vertices moved to the east. */
    public static Prism moved(Prism prism, double distance) {
        List<Ring> rings = prism.rings().stream()
                .map(ring -> new Ring(
                        ring.part(),
                        ring.island(),
                        ring.sides().stream()
                                .map(side -> new Side(side.name(), side.item(), side.x() + distance, side.y()))
                                .toList()))
                .toList();
        return new Prism(prism.name(), rings, prism.range());
    }

    @Override
    public void close() {
        set.close();
    }
}
