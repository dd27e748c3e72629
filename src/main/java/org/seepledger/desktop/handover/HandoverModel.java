package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.time.Duration;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;
import javafx.collections.MapChangeListener;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.command.CommandText;
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
import org.seepledger.job.ShownPicture;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Figures;

/** Handing over the prisms that are drawn: what is chosen, what is wrong with it, how far it is, what came of it. */
public final class HandoverModel {

    private static final FileDialogs.Kind CSV = new FileDialogs.Kind("CSV", "*.csv");
    private static final Duration REST = Duration.ofMillis(200);

    private final Session session;
    private final FileDialogs dialogs;
    private final CopyBoard copies;
    private final Opener opener;
    private final PngPainter painter;
    private final Lane working;
    private final Lane looking;
    private final HandoverChoices choices;
    private final ReadOnlyStringWrapper outProblem = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper fault = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper commands = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper prismsNote = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Stage> stage = new ReadOnlyObjectWrapper<>(Stage.CHOOSING);
    private final ReadOnlyObjectWrapper<Optional<HandoverOutcome>> outcome =
            new ReadOnlyObjectWrapper<>(Optional.empty());
    private volatile Advance advance = new Advance(Progress.NONE);

    /** Where the page is. */
    public enum Stage {
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
        this.dialogs = dialogs;
        this.copies = copies;
        this.opener = opener;
        this.painter = painter;
        this.working = tasks.latest("task.handover");
        this.looking = tasks.latest("task.handover.looking");
        this.choices = new HandoverChoices(session.pictures());
        session.set().addListener((set, before, after) -> begin());
        List<ObservableValue<?>> all = new ArrayList<>(List.of(session.shapes()));
        all.addAll(choices.observables());
        all.forEach(choice -> choice.addListener((changed, before, after) -> show()));
        session.pictures().addListener((MapChangeListener<String, ShownPicture>) change -> show());
        choices.out().text().addListener((text, before, after) -> look());
        choices.overwrite().addListener((chosen, before, after) -> look());
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
        show();
    }

    /** A folder beside the aquifer's. */
    private static Path suggested(OpenSet set) {
        Path folder = set.path().toAbsolutePath().normalize();
        return folder.resolveSibling(folder.getFileName() + "-handover");
    }

    /** {@return what is chosen} */
    public HandoverChoices choices() {
        return choices;
    }

    /** {@return what is wrong with the folder chosen; empty for nothing} */
    public ReadOnlyStringProperty outProblem() {
        return outProblem.getReadOnlyProperty();
    }

    /** {@return what keeps the work from being begun; empty for nothing} */
    public ReadOnlyStringProperty problem() {
        return problem.getReadOnlyProperty();
    }

    /** {@return what went wrong with the work; empty for nothing} */
    public ReadOnlyStringProperty fault() {
        return fault.getReadOnlyProperty();
    }

    /** {@return the commands that do the same} */
    public ReadOnlyStringProperty commands() {
        return commands.getReadOnlyProperty();
    }

    /** {@return what is to be known of the file of prisms that they name; empty for nothing} */
    public ReadOnlyStringProperty prismsNote() {
        return prismsNote.getReadOnlyProperty();
    }

    /** {@return where the page is} */
    public ReadOnlyObjectProperty<Stage> stage() {
        return stage.getReadOnlyProperty();
    }

    /** {@return what came of it} */
    public ReadOnlyObjectProperty<Optional<HandoverOutcome>> outcome() {
        return outcome.getReadOnlyProperty();
    }

    /** {@return what is to be said of the closure error allowed; empty for nothing} */
    public String limitWords() {
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
    public String doing() {
        return advance.stage();
    }

    /** {@return how much of that is done, from 0 to 1} */
    public double share() {
        return advance.share();
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

    /** {@return whether the open set has solutes to strike budgets of} */
    public boolean hasSolutes() {
        return session.set().get().filter(set -> set.workbench().hasSolutes()).isPresent();
    }

    /** {@return the periods that there are to choose from} */
    public List<Periods.Every> periodChoices() {
        boolean dated = session.set()
                .get()
                .filter(set -> set.aquifer().times().hasDates())
                .isPresent();
        return dated ? List.of(Periods.Every.values()) : List.of(Periods.Every.INTERVAL, Periods.Every.RECORD);
    }

    private void show() {
        Optional<HandoverPlan> plan = plan();
        commands.set(plan.map(planned -> CommandText.script(planned.commands())).orElse(""));
        prismsNote.set(prismsWords());
        problem.set(problemWords());
    }

    private Optional<HandoverPlan> plan() {
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
    private void look() {
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

    /** Asks for the folder. */
    public void chooseFolder() {
        dialogs.folder(Words.of("handover.folder.title"))
                .ifPresent(folder -> choices.out().text().set(folder.toString()));
    }

    /** Asks for a file of transects. */
    public void chooseTransects() {
        FileDialogs.Kind lines = new FileDialogs.Kind("GeoJSON", "*.geojson");
        dialogs.fileToRead(Words.of("handover.transects.title"), lines)
                .ifPresent(file -> choices.solutes().transects().text().set(file.toString()));
    }

    /** Asks for a file of measured panels. */
    public void choosePanels() {
        dialogs.fileToRead(Words.of("handover.panels.title"), CSV)
                .ifPresent(file -> choices.solutes().panels().text().set(file.toString()));
    }

    /** Asks for a file of periods. */
    public void choosePeriods() {
        dialogs.fileToRead(Words.of("handover.periods.title"), CSV)
                .ifPresent(file -> choices.budget().periods().text().set(file.toString()));
    }

    /** Copies the commands. */
    public void copyCommands() {
        copies.text(commands.get());
        session.notices().done(Words.of("handover.copied"));
    }

    /** Hands over. */
    public void handOver() {
        Optional<HandoverPlan> plan = plan();
        if (!problem.get().isEmpty() || plan.isEmpty() || stage.get() == Stage.WORKING) {
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
    public void cancel() {
        working.cancel();
        stopped();
    }

    /** Goes back to what is chosen. */
    public void chooseAgain() {
        stage.set(Stage.CHOOSING);
        suggestTransects();
        look();
    }

    /** Opens the folder that was made. */
    public void openFolder() {
        outcome.get().ifPresent(done -> opener.open(done.out()));
    }

    /** Opens the report that was made. */
    public void openReport() {
        outcome.get().flatMap(HandoverOutcome::report).ifPresent(opener::open);
    }
}
