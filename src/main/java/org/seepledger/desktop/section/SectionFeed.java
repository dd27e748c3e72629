package org.seepledger.desktop.section;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.Observable;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import org.seepledger.desktop.session.Draped;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.job.ShownPicture;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionLine;
import org.seepledger.picture.SectionPicture;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/**
 * Keeps the section up with its line, the interval, what lies over the map, and the prisms as they are drawn. The aquifer
 * is read anew only where the line, the interval or the quantity has changed.
 */
final class SectionFeed {

    /** The size of the picture that is handed over, in logical pixels: the measure of a page. */
    private static final double PAGE_WIDTH = 760;

    private static final double PAGE_HEIGHT = 340;

    private final Session session;
    private final Inquiry<Question, Section> inquiry;
    private final ObjectProperty<OptionalDouble> within = new SimpleObjectProperty<>(OptionalDouble.empty());
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(nothing());
    private volatile Optional<Kept> kept = Optional.empty();

    /** What the aquifer is read for. */
    private record Ground(OpenSet set, SectionLine line, Optional<MapQuantity> quantity, int interval) {}

    private record Question(Ground ground, List<Prism> prisms, OptionalDouble within) {}

    /** What was last read. */
    private record Kept(Ground ground, Profile profile) {}

    SectionFeed(Session session, Tasks tasks) {
        this.session = session;
        this.inquiry = new Inquiry<>(tasks.latest("task.section"), this::answer);
        session.set().addListener((set, before, after) -> within.set(OptionalDouble.empty()));
        for (Observable cause : List.of(
                session.set(),
                session.sectionLine(),
                session.interval(),
                session.draped(),
                session.drawing(),
                within)) {
            cause.addListener(changed -> follow());
        }
        for (Observable cause :
                List.of(inquiry.last(), inquiry.state(), session.selected(), session.lit(), session.faceFlows())) {
            cause.addListener(changed -> show());
        }
    }

    private static PaneState nothing() {
        return PaneState.empty(Words.of("section.empty"));
    }

    /** {@return how it stands with the section} */
    ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** {@return how far from the line wells are shown, in length units; empty for what suits the line} */
    ObjectProperty<OptionalDouble> within() {
        return within;
    }

    private Optional<Question> question() {
        return session.set()
                .get()
                .flatMap(set -> session.sectionLine()
                        .get()
                        .map(line -> new Question(
                                new Ground(
                                        set,
                                        line,
                                        session.draped().get().map(Draped::quantity),
                                        session.interval().get()),
                                session.drawing().get().prisms(),
                                within.get())));
    }

    private void follow() {
        Optional<Question> question = question();
        if (question.isPresent()) {
            inquiry.want(question.get());
        } else {
            inquiry.forget(nothing());
            kept = Optional.empty();
        }
        show();
    }

    private Section answer(Question question, Progress progress) {
        Ground ground = question.ground;
        Profile profile = kept.filter(last -> last.ground.equals(ground))
                .map(Kept::profile)
                .orElseGet(() -> ground.set
                        .workbench()
                        .views()
                        .profile(ground.line, ground.quantity, ground.interval, progress));
        kept = Optional.of(new Kept(ground, profile));
        double distance = question.within.orElse(SectionPicture.nearby(profile));
        return ground.set.workbench().views().section(profile, question.prisms, distance, progress);
    }

    /** What has come is shown even where something newer is wanted by now: it is nearer to that than what was there. */
    private void show() {
        PaneState now = inquiry.state().get();
        Optional<Inquiry.Reply<Question, Section>> reply =
                inquiry.last().get().filter(known -> question().isPresent());
        boolean there = reply.filter(known -> known.answer().isThere()).isPresent();
        boolean ready = now.phase() == PaneState.Phase.READY;
        publish(reply.filter(known -> there && now.phase() != PaneState.Phase.FAILED));
        state.set(question().isEmpty() ? nothing() : ready && !there ? PaneState.empty(Words.of("section.off")) : now);
    }

    private void publish(Optional<Inquiry.Reply<Question, Section>> reply) {
        Optional<Section> shown =
                reply.map(known -> known.answer().in(colours(known.question())).in(light()));
        session.section().set(shown);
        String name = Words.of("section.picture");
        shown.ifPresentOrElse(
                section -> session.pictures()
                        .put(
                                name,
                                new ShownPicture(
                                        name, progress -> SectionPicture.of(section, PAGE_WIDTH, PAGE_HEIGHT))),
                () -> session.pictures().remove(name));
    }

    /** Only while what lies over the map is what the section was read for. */
    private Optional<Section.Colours> colours(Question question) {
        return session.draped()
                .get()
                .filter(draped -> question.ground.quantity.equals(Optional.of(draped.quantity())))
                .map(draped -> new Section.Colours(
                        draped.scale(),
                        Words.of(
                                "section.colours",
                                draped.quantity().label(),
                                draped.quantity().unit())));
    }

    private Section.Light light() {
        FaceFlows flows = session.faceFlows().get();
        String selected = session.selected().get();
        boolean own = flows.prism().equals(selected) && !selected.isEmpty();
        return new Section.Light(
                selected,
                session.lit().get(),
                own ? flows.lids().getOrDefault("top", Double.NaN) : Double.NaN,
                own ? flows.lids().getOrDefault("bottom", Double.NaN) : Double.NaN,
                own ? Wording.raised(Measure.of(flows.unit())) : "");
    }
}
