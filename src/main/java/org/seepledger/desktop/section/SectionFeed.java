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
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionLine;
import org.seepledger.picture.SectionPicture;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/**
 * Keeps the section up with its line, the interval, what lies over the map, and the prisms as they are drawn.
 *
 * <p>While a question is being answered, newer ones wait, and only the newest of them is asked next: a hand that never
 * rests would otherwise never see its prism move. The aquifer is read anew only where the line, the interval or the
 * quantity has changed.
 */
final class SectionFeed {

    private final Session session;
    private final Lane lane;
    private final ObjectProperty<OptionalDouble> within = new SimpleObjectProperty<>(OptionalDouble.empty());
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(nothing());
    private Optional<Question> asked = Optional.empty();
    private Optional<Answer> known = Optional.empty();

    /** What the aquifer is read for. */
    private record Ground(OpenSet set, SectionLine line, Optional<MapQuantity> quantity, int interval) {}

    private record Question(Ground ground, List<Prism> prisms, OptionalDouble within) {}

    private record Answer(Question question, Section section) {}

    SectionFeed(Session session, Tasks tasks) {
        this.session = session;
        this.lane = tasks.latest("cutting a section");
        for (Observable cause : List.of(
                session.set(),
                session.sectionLine(),
                session.interval(),
                session.draped(),
                session.drawing(),
                session.selected(),
                session.lit(),
                session.faceFlows(),
                within)) {
            cause.addListener(changed -> follow());
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
        if (question.isEmpty()) {
            lane.cancel();
            asked = Optional.empty();
            known = Optional.empty();
            session.section().set(Optional.empty());
            state.set(nothing());
            return;
        }
        if (known.map(Answer::question).equals(question)) {
            show(known.get());
        } else if (asked.isEmpty()) {
            state.set(PaneState.working(Words.of("section.working")));
            ask(question.get());
        }
    }

    private void ask(Question question) {
        asked = Optional.of(question);
        Optional<Profile> kept = known.filter(answer -> answer.question.ground.equals(question.ground))
                .map(answer -> answer.section.profile());
        lane.run(progress -> answer(question, kept, progress), this::answered, fault -> notAnswered(question, fault));
    }

    private static Answer answer(Question question, Optional<Profile> kept, Progress progress) {
        EntryGuard.enter();
        Ground ground = question.ground;
        Profile profile = kept.orElseGet(
                () -> ground.set.workbench().profile(ground.line, ground.quantity, ground.interval, progress));
        double within = question.within.orElse(SectionPicture.nearby(profile));
        return new Answer(question, ground.set.workbench().section(profile, question.prisms, within, progress));
    }

    /** What has come is shown even where something newer is wanted by now: it is nearer to that than what was there. */
    private void answered(Answer answer) {
        asked = Optional.empty();
        known = Optional.of(answer);
        if (!known.map(Answer::question).equals(question())) {
            publish(answer);
        }
        follow();
    }

    /** What cannot be answered is not asked again until something changes. */
    private void notAnswered(Question question, Throwable fault) {
        asked = Optional.empty();
        if (!question().equals(Optional.of(question))) {
            follow();
        } else if (!(fault instanceof Cancelled)) {
            session.section().set(Optional.empty());
            state.set(PaneState.failed(FaultWords.of(fault)));
        }
    }

    private void show(Answer answer) {
        if (answer.section.isThere()) {
            publish(answer);
            state.set(PaneState.READY);
        } else {
            session.section().set(Optional.empty());
            state.set(PaneState.empty(Words.of("section.off")));
        }
    }

    private void publish(Answer answer) {
        Optional<Section.Colours> colours = session.draped()
                .get()
                .filter(draped -> answer.question.ground.quantity.equals(Optional.of(draped.quantity())))
                .map(draped -> new Section.Colours(
                        draped.scale(),
                        Words.of(
                                "section.colours",
                                draped.quantity().label(),
                                draped.quantity().unit())));
        session.section().set(Optional.of(answer.section.in(colours).in(light())));
    }

    private Section.Light light() {
        FaceFlows flows = session.faceFlows().get();
        String selected = session.selected().get();
        String lit = session.lit().get();
        boolean own = flows.prism().equals(selected) && !selected.isEmpty();
        return new Section.Light(
                selected,
                lit,
                own ? flows.lids().getOrDefault("top", Double.NaN) : Double.NaN,
                own ? flows.lids().getOrDefault("bottom", Double.NaN) : Double.NaN,
                own ? Wording.raised(Measure.of(flows.unit())) : "");
    }
}
