package org.seepledger.desktop.transect;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import javafx.beans.value.ObservableValue;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.Reading;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.session.Transects;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.plume.Crossing;
import org.seepledger.sketch.ControlLine;

/** What crosses: the chosen transect in the interval looked at, at once; all transects over the record, when the hand rests. */
final class LiveCrossings {

    private final Session session;
    private final Reading reading;
    private final Inquiry<Question, List<Crossing>> now;
    private final Inquiry<Question, List<Crossing>> whole;

    /** What crosses lines, in one interval or in all. */
    private record Question(OpenSet set, List<ControlLine> lines, OptionalInt interval) {}

    LiveCrossings(Session session, Tasks tasks, Reading reading) {
        this.session = session;
        this.reading = reading;
        this.now = inquiry(tasks.latest("task.transects.interval"));
        this.whole = inquiry(tasks.latest("task.transects.record"));
    }

    private static Inquiry<Question, List<Crossing>> inquiry(Lane lane) {
        return new Inquiry<>(
                lane,
                (question, progress) -> question.set
                        .workbench()
                        .solutes()
                        .crossings(
                                question.lines.stream()
                                        .map(ControlLine::transect)
                                        .toList(),
                                question.interval,
                                progress));
    }

    /** All that answers, and how it stands with them, depend on. */
    List<ObservableValue<?>> causes() {
        return List.of(now.last(), now.state(), whole.last(), whole.state());
    }

    private boolean quick() {
        return reading.every().get() == Periods.Every.INTERVAL;
    }

    private Inquiry<Question, List<Crossing>> inUse() {
        return quick() ? now : whole;
    }

    PaneState state() {
        return inUse().state().get();
    }

    void ask(OpenSet set) {
        Transects drawn = session.transects().get();
        if (quick()) {
            drawn.line(session.transect().get())
                    .ifPresent(line -> now.want(new Question(
                            set,
                            List.of(line),
                            OptionalInt.of(session.interval().get()))));
        } else if (drawn.settled()) {
            whole.wantAtRest(new Question(set, drawn.lines(), OptionalInt.empty()));
        }
    }

    /** What was last worked out, if it is of the transect and the time looked at. */
    Optional<Crossing> of(String solute) {
        String line = session.transect().get();
        OptionalInt interval = quick() ? OptionalInt.of(session.interval().get()) : OptionalInt.empty();
        return inUse().last()
                .get()
                .filter(reply -> reply.question().interval.equals(interval))
                .flatMap(reply -> reply.answer().stream()
                        .filter(crossing -> crossing.transect().name().equals(line))
                        .filter(crossing -> crossing.solute().name().equals(solute))
                        .findFirst());
    }

    void again() {
        now.again();
        whole.again();
    }

    void rest(PaneState why) {
        now.rest(why);
        whole.rest(why);
    }

    void forget(PaneState why) {
        now.forget(why);
        whole.forget(why);
    }
}
