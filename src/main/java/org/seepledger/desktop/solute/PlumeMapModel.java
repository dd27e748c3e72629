package org.seepledger.desktop.solute;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.value.ObservableValue;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Times;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.RecordPlume;
import org.seepledger.picture.Box;
import org.seepledger.picture.Labels;
import org.seepledger.picture.MapFrame;
import org.seepledger.picture.Mark;
import org.seepledger.picture.PlumeTrack;
import org.seepledger.picture.ThresholdOutline;
import org.seepledger.plume.Course;
import org.seepledger.plume.Plume;
import org.seepledger.unit.Figures;

/**
 * What the map shows of the solute looked at: the outline above the threshold in the layer and at the end of the interval looked
 * at, and the track of the centre of mass.
 */
public final class PlumeMapModel {

    private final Session session;
    private final SoluteLook look;
    private final LivePlume plumes;
    private final Inquiry<Where, ThresholdOutline> outline;
    private final Inquiry<LivePlume.Whole, RecordPlume> everything;
    private final ReadOnlyLongWrapper changes = new ReadOnlyLongWrapper();

    /** What is outlined. */
    private record Where(OpenSet set, Solute solute, int layer, int interval, double above) {}

    /**
     * Begins to follow.
     *
     * @param session what the window looks at
     * @param look how solutes are looked at
     * @param plumes the budgets
     * @param tasks where work is done
     */
    public PlumeMapModel(Session session, SoluteLook look, LivePlume plumes, Tasks tasks) {
        this.session = session;
        this.look = look;
        this.plumes = plumes;
        this.outline = new Inquiry<>(
                tasks.latest("task.outline"),
                (where, progress) -> where.set
                        .workbench()
                        .solutes()
                        .outline(where.solute, where.layer, where.interval, where.above, progress));
        this.everything = new Inquiry<>(
                tasks.latest("task.track"),
                (question, progress) ->
                        question.set().workbench().solutes().record(question.prisms(), question.choice(), progress));
        for (ObservableValue<?> cause : List.of(
                session.set(),
                session.solute(),
                session.layer(),
                session.interval(),
                session.selected(),
                look.threshold(),
                look.dispersion(),
                look.track(),
                plumes.record())) {
            cause.addListener((value, before, after) -> follow());
        }
        for (ObservableValue<?> answer : List.of(outline.last(), everything.last())) {
            answer.addListener((value, before, after) -> changes.set(changes.get() + 1));
        }
    }

    /** {@return how often what is shown has changed} */
    public ReadOnlyLongProperty changes() {
        return changes.getReadOnlyProperty();
    }

    private void follow() {
        Optional<Where> where = where();
        where.ifPresentOrElse(outline::want, () -> outline.forget(PaneState.READY));
        Optional<LivePlume.Whole> whole =
                look.track().get() == SoluteLook.Track.OF_SET && look.solute().isPresent()
                        ? session.set().get().map(this::whole)
                        : Optional.empty();
        whole.ifPresentOrElse(everything::wantAtRest, () -> everything.rest(PaneState.READY));
        changes.set(changes.get() + 1);
    }

    private LivePlume.Whole whole(OpenSet set) {
        return new LivePlume.Whole(
                set, List.of(set.workbench().solutes().everything(Words.of("solute.everything"))), look.choice(set));
    }

    private Optional<Where> where() {
        return session.set()
                .get()
                .flatMap(set -> look.solute()
                        .flatMap(solute -> look.threshold()
                                .get()
                                .map(typed -> new Where(
                                        set,
                                        solute,
                                        session.layer().get(),
                                        session.interval().get(),
                                        typed.kilograms(set.aquifer().lengthUnit())))));
    }

    /**
     * {@return the marks, the lowermost first}
     *
     * @param frame where map coordinates come to
     */
    public List<Mark> marks(MapFrame frame) {
        List<Mark> marks = new ArrayList<>();
        if (look.solute().isPresent()) {
            outline.last().get().ifPresent(reply -> marks.addAll(reply.answer().marks(frame)));
            Box box = frame.box();
            track().ifPresent(track -> marks.addAll(track.marks(frame, new Labels(box))));
        }
        return marks;
    }

    /** The track, if it is wanted and known. */
    Optional<PlumeTrack> track() {
        Optional<Plume> followed = switch (look.track().get()) {
            case NONE -> Optional.empty();
            case OF_PRISM -> plumes.shown().map(PlumeShown::plume);
            case OF_SET ->
                everything
                        .last()
                        .get()
                        .flatMap(reply -> PlumeShown.of(
                                        reply.answer(),
                                        Words.of("solute.everything"),
                                        session.solute().get())
                                .map(PlumeShown::plume));
        };
        return session.set().get().flatMap(set -> followed.map(plume -> track(set, plume)));
    }

    private PlumeTrack track(OpenSet set, Plume plume) {
        Times times = set.aquifer().times();
        Course course = new Course(plume, times, set.aquifer().grid());
        int current = session.interval().get() + 1;
        List<PlumeTrack.Stop> stops = IntStream.rangeClosed(0, times.intervals())
                .mapToObj(instant -> PlumeTrack.Stop.of(
                        course.at(instant),
                        set.aquifer().grid().planUnit(),
                        instant == current ? name(times, times.instant(instant)) : ""))
                .toList();
        return PlumeTrack.at(stops, current);
    }

    private static String name(Times times, double time) {
        return times.isoDate(time).orElseGet(() -> Figures.typeset(time) + "\u00a0" + times.unit());
    }
}
