package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;
import javafx.collections.MapChangeListener;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.HandoverJob;
import org.seepledger.job.HandoverRequest;
import org.seepledger.job.ShownPicture;

/** What the choices come to: the plan, the commands that do the same, and what keeps the work from being begun. */
final class Prospect {

    private static final Duration REST = Duration.ofMillis(200);

    private final Session session;
    private final HandoverChoices choices;
    private final Lane looking;
    private final ReadOnlyStringWrapper outProblem = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper commands = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper prismsNote = new ReadOnlyStringWrapper("");

    Prospect(Session session, HandoverChoices choices, Tasks tasks) {
        this.session = session;
        this.choices = choices;
        this.looking = tasks.latest("task.handover.looking");
        List<ObservableValue<?>> all = new ArrayList<>(List.of(session.shapes()));
        all.addAll(choices.observables());
        all.forEach(choice -> choice.addListener((changed, before, after) -> show()));
        session.pictures().addListener((MapChangeListener<String, ShownPicture>) change -> show());
        choices.out().text().addListener((text, before, after) -> look());
        choices.overwrite().addListener((chosen, before, after) -> look());
    }

    /** {@return what is wrong with the folder chosen; empty for nothing} */
    ReadOnlyStringProperty outProblem() {
        return outProblem.getReadOnlyProperty();
    }

    /** {@return what keeps the work from being begun; empty for nothing} */
    ReadOnlyStringProperty problem() {
        return problem.getReadOnlyProperty();
    }

    /** {@return the commands that do the same} */
    ReadOnlyStringProperty commands() {
        return commands.getReadOnlyProperty();
    }

    /** {@return what is to be known of the file of prisms that they name; empty for nothing} */
    ReadOnlyStringProperty prismsNote() {
        return prismsNote.getReadOnlyProperty();
    }

    /** Tells it anew. */
    void show() {
        Optional<HandoverPlan> plan = plan();
        commands.set(plan.map(planned -> CommandText.script(planned.commands())).orElse(""));
        prismsNote.set(prismsWords());
        problem.set(problemWords());
    }

    /** {@return what is to be done; empty as long as no folder is named} */
    Optional<HandoverPlan> plan() {
        return session.set()
                .get()
                .flatMap(set -> choices.out()
                        .value()
                        .map(folder -> new HandoverPlan(set, session.shapes().get(), folder, choices)));
    }

    private String prismsWords() {
        if (session.shapes().get().saved() || choices.out().value().isEmpty()) {
            return "";
        }
        return Words.of(
                "handover.unsaved",
                HandoverRequest.ownPrisms(choices.out().value().get()));
    }

    /** What keeps the work from being begun; empty for nothing. */
    private String problemWords() {
        if (session.shapes().get().drawing().shapes().isEmpty()) {
            return Words.of("handover.nothing.drawn");
        }
        if (choices.isEmpty()) {
            return Words.of("handover.nothing.chosen");
        }
        if (!choices.isSound()) {
            return Words.of("handover.unsound");
        }
        return choices.out().value().isEmpty() ? Words.of("handover.nowhere") : "";
    }

    /** Looks whether the folder can be used, once typing rests. */
    void look() {
        outProblem.set(choices.out().problem().get());
        Optional<Path> folder = choices.out().value();
        looking.cancel();
        if (folder.isPresent()) {
            boolean replace = choices.overwrite().get();
            looking.runAfter(
                    REST,
                    progress -> {
                        EntryGuard.enter();
                        HandoverJob.mustBeUsable(folder.get(), replace);
                        return folder;
                    },
                    usable -> outProblem.set(""),
                    thrown -> outProblem.set(FaultWords.of(thrown)));
        }
    }
}
