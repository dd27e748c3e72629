package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.Opener;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.BalanceOutcome;
import org.seepledger.job.HandoverJob;
import org.seepledger.job.HandoverOutcome;
import org.seepledger.job.HandoverRequest;
import org.seepledger.job.PlumeOutcome;
import org.seepledger.job.PngPainter;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Figures;

/** Handing over the prisms that are drawn: what is chosen, what is wrong with it, how far it is, what came of it. */
public final class HandoverModel {

    private final Session session;
    private final CopyBoard copies;
    private final Opener opener;
    private final PngPainter painter;
    private final Lane working;
    private final HandoverChoices choices;
    private final Prospect prospect;
    private final PathQuestions questions;
    private final ReadOnlyStringWrapper fault = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Stage> stage = new ReadOnlyObjectWrapper<>(Stage.CHOOSING);
    private final ReadOnlyObjectWrapper<Optional<HandoverOutcome>> outcome =
            new ReadOnlyObjectWrapper<>(Optional.empty());
    private volatile Advance advance = new Advance(Progress.NONE);

    /** Where the page is. */
    enum Stage {
        /** Things are chosen. */
        CHOOSING,
        /** Files are made. */
        WORKING,
        /** They are there. */
        DONE
    }

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks does the work
     * @param dialogs asks for the folder
     * @param copies where the commands are copied to
     * @param opener opens what was made
     * @param painter paints pictures
     */
    public HandoverModel(
            Session session, Tasks tasks, FileDialogs dialogs, CopyBoard copies, Opener opener, PngPainter painter) {
        this.session = session;
        this.copies = copies;
        this.opener = opener;
        this.painter = painter;
        this.working = tasks.latest("task.handover");
        this.choices = new HandoverChoices(session.pictures());
        this.prospect = new Prospect(session, choices, tasks);
        this.questions = new PathQuestions(dialogs, choices);
        session.set().addListener((set, before, after) -> begin());
        begin();
    }

    /** Another set has other periods and solutes, and goes elsewhere. */
    private void begin() {
        working.cancel();
        stage.set(Stage.CHOOSING);
        outcome.set(Optional.empty());
        fault.set("");
        choices.report().date().text().set(LocalDate.now().toString());
        if (!periodChoices().contains(choices.budget().every().get())) {
            choices.budget().every().set(Periods.Every.INTERVAL);
        }
        choices.plume().set(hasSolutes());
        choices.solutes().transects().text().set("");
        session.set()
                .get()
                .ifPresent(set -> choices.out().text().set(suggested(set).toString()));
        prospect.show();
    }

    /** A folder beside the aquifer's. */
    private static Path suggested(OpenSet set) {
        Path folder = set.path().toAbsolutePath().normalize();
        return folder.resolveSibling(folder.getFileName() + "-handover");
    }

    /** {@return what is chosen} */
    HandoverChoices choices() {
        return choices;
    }

    /** {@return what they come to} */
    Prospect prospect() {
        return prospect;
    }

    /** {@return what asks for folders and files} */
    PathQuestions questions() {
        return questions;
    }

    /** {@return what went wrong with the work; empty for nothing} */
    ReadOnlyStringProperty fault() {
        return fault.getReadOnlyProperty();
    }

    /** {@return where the page is} */
    ReadOnlyObjectProperty<Stage> stage() {
        return stage.getReadOnlyProperty();
    }

    /** {@return what came of it} */
    ReadOnlyObjectProperty<Optional<HandoverOutcome>> outcome() {
        return outcome.getReadOnlyProperty();
    }

    /** {@return what is to be said of the closure error allowed; empty for nothing} */
    String limitWords() {
        Optional<Double> limit = choices.budget().limit().value();
        double worst = outcome.get().stream()
                .flatMap(done -> Stream.of(
                        done.balance().map(BalanceOutcome::worstClosureError),
                        done.plume().map(PlumeOutcome::worstClosureError)))
                .flatMap(Optional::stream)
                .mapToDouble(Double::doubleValue)
                .max()
                .orElse(0);
        if (limit.isEmpty() || worst <= limit.get()) {
            return "";
        }
        return Double.isNaN(worst)
                ? Words.of("handover.limit.none")
                : Words.of("handover.limit.passed", Figures.typesetPercent(worst), limit.get());
    }

    /** {@return what is being done just now} */
    String doing() {
        return advance.stage();
    }

    /** {@return how much of that is done, from 0 to 1} */
    double share() {
        return advance.share();
    }

    /** {@return whether the open set has solutes to strike budgets of} */
    boolean hasSolutes() {
        return session.set().get().filter(set -> set.workbench().hasSolutes()).isPresent();
    }

    /** {@return the periods that there are to choose from} */
    List<Periods.Every> periodChoices() {
        boolean dated = session.set()
                .get()
                .filter(set -> set.aquifer().times().hasDates())
                .isPresent();
        return dated ? List.of(Periods.Every.values()) : List.of(Periods.Every.INTERVAL, Periods.Every.RECORD);
    }

    /** Copies the commands. */
    void copyCommands() {
        copies.text(prospect.commands().get());
        session.notices().done(Words.of("handover.copied"));
    }

    /** Hands over. */
    void handOver() {
        Optional<HandoverPlan> plan = prospect.plan();
        if (!prospect.problem().get().isEmpty() || plan.isEmpty() || stage.get() == Stage.WORKING) {
            return;
        }
        HandoverRequest request = plan.get().request();
        OpenSet set = session.set().get().orElseThrow();
        fault.set("");
        stage.set(Stage.WORKING);
        advance = new Advance(Progress.NONE);
        working.run(
                ticket -> {
                    EntryGuard.enter();
                    advance = new Advance(ticket);
                    return HandoverJob.run(set.workbench(), request, painter, advance);
                },
                this::handedOver,
                this::failed);
    }

    private void handedOver(HandoverOutcome done) {
        outcome.set(Optional.of(done));
        stage.set(Stage.DONE);
        session.notices().done(Words.of("handover.done", done.files().size(), done.out()));
    }

    private void stopped() {
        stage.set(Stage.CHOOSING);
        session.notices().done(Words.of("handover.cancelled"));
    }

    private void failed(Throwable thrown) {
        if (thrown instanceof Cancelled) {
            stopped();
            return;
        }
        stage.set(Stage.CHOOSING);
        fault.set(FaultWords.of(thrown));
    }

    /** Stops the work; nothing is left behind. */
    void cancel() {
        working.cancel();
        stopped();
    }

    /** Goes back to what is chosen. */
    void chooseAgain() {
        stage.set(Stage.CHOOSING);
        suggestTransects();
        prospect.look();
    }

    /** Saved lines lie in a file beside the aquifer. */
    private void suggestTransects() {
        DrawnShapes shapes = session.shapes().get();
        Entry<Path> transects = choices.solutes().transects();
        if (shapes.saved()
                && !shapes.drawing().lines().isEmpty()
                && transects.value().isEmpty()) {
            session.set()
                    .get()
                    .ifPresent(set -> transects
                            .text()
                            .set(set.path()
                                    .resolve(Opening.TRANSECTS)
                                    .toAbsolutePath()
                                    .normalize()
                                    .toString()));
        }
    }

    /** Opens the folder that was made. */
    void openFolder() {
        outcome.get().ifPresent(done -> opener.open(done.out()));
    }

    /** Opens the report that was made. */
    void openReport() {
        outcome.get().flatMap(HandoverOutcome::report).ifPresent(opener::open);
    }
}
