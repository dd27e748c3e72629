package org.seepledger.desktop.review;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.desktop.port.CopyBoard;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.port.Opener;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.ReviewAsked;
import org.seepledger.job.ReviewJob;
import org.seepledger.job.ReviewOutcome;
import org.seepledger.job.ReviewRequest;
import org.seepledger.sketch.Drawing;

/** Writing the review as the command does: where to, what keeps it from being written, the command, what came of it. */
public final class WritingModel {

    private final ReviewModel review;
    private final Session session;
    private final FileDialogs dialogs;
    private final CopyBoard copies;
    private final Opener opener;
    private final Lane lane;
    private final StringProperty out = new SimpleStringProperty("");
    private final BooleanProperty overwrite = new SimpleBooleanProperty();
    private final ReadOnlyStringWrapper command = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper told = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Optional<Path>> written = new ReadOnlyObjectWrapper<>(Optional.empty());

    /**
     * Makes the model.
     *
     * @param review what is written
     * @param tasks does the work
     * @param dialogs asks for the folder
     * @param copies where the command is copied to
     * @param opener opens what was written
     */
    public WritingModel(ReviewModel review, Tasks tasks, FileDialogs dialogs, CopyBoard copies, Opener opener) {
        this.review = review;
        this.session = review.session();
        this.dialogs = dialogs;
        this.copies = copies;
        this.opener = opener;
        this.lane = tasks.latest("task.review.writing");
        review.submitted().addListener((file, before, after) -> after.ifPresent(this::suggest));
        Stream.<ObservableValue<?>>of(
                        review.submitted(),
                        review.mapping().mapping(),
                        review.mapping().file(),
                        review.tolerance(),
                        review.wholeCells(),
                        review.waterYearStart(),
                        session.set(),
                        session.shapes(),
                        session.drawing(),
                        out,
                        overwrite)
                .forEach(cause -> cause.addListener((value, before, after) -> show()));
        show();
    }

    /** A folder beside the table. */
    private void suggest(Path file) {
        String name = file.getFileName().toString().replaceFirst("\\.[^.]*$", "");
        out.set(file.toAbsolutePath().resolveSibling(name + "-review").toString());
    }

    private void show() {
        written.set(Optional.empty());
        told.set("");
        Optional<ReviewRequest> request = request();
        command.set(request.map(WritingModel::command).orElse(""));
        problem.set(problemWords());
    }

    /** The set that the table is held against; empty where it is looked at by itself. */
    private Optional<OpenSet> against() {
        return session.set()
                .get()
                .filter(set -> !session.drawing().get().prisms().isEmpty());
    }

    private String problemWords() {
        if (review.submitted().get().isEmpty()) {
            return Words.of("review.empty");
        }
        if (review.mapping().isUnsaved()) {
            return Words.of("review.write.mapping");
        }
        if (against().isPresent() && !session.shapes().get().saved()) {
            return Words.of("review.write.drawing");
        }
        return request().isEmpty() ? Words.of("handover.nowhere") : "";
    }

    private Optional<Path> folder() {
        try {
            return out.get().isBlank()
                    ? Optional.empty()
                    : Optional.of(Path.of(out.get().strip()));
        } catch (java.nio.file.InvalidPathException e) {
            return Optional.empty();
        }
    }

    private Optional<ReviewRequest> request() {
        return review.asked().flatMap(asked -> folder().map(to -> request(asked, to)));
    }

    private ReviewRequest request(ReviewAsked asked, Path to) {
        Optional<Path> aquifer =
                against().map(set -> set.path().toAbsolutePath().normalize());
        return new ReviewRequest(
                aquifer,
                aquifer.map(folder -> folder.resolve(Opening.PRISMS)),
                asked.submitted(),
                review.mapping().file().get(),
                to,
                asked.tolerance(),
                asked.wholeCells(),
                asked.waterYearStart(),
                aquifer.isPresent(),
                Runtime.getRuntime().availableProcessors(),
                overwrite.get(),
                LocalDate.now());
    }

    private static String command(ReviewRequest request) {
        CommandText text = request.aquifer()
                .map(folder -> CommandText.of("review", folder))
                .orElseGet(() -> CommandText.of("review"))
                .with("--prisms", request.prisms())
                .with("--submitted", request.submitted())
                .with("--mapping", request.mapping())
                .with("--out", request.out());
        return text.with("--tolerance", Optional.of(request.tolerance()).filter(percent -> percent != 1))
                .flag("--whole-cells", request.wholeCells())
                .with(
                        "--water-year-start",
                        Optional.of(request.waterYearStart()).filter(month -> month != 10))
                .flag("--clip", request.clip())
                .flag("--overwrite", request.overwrite())
                .toString();
    }

    /** {@return the folder, as it is typed} */
    StringProperty out() {
        return out;
    }

    /** {@return whether an earlier review there may be replaced} */
    BooleanProperty overwrite() {
        return overwrite;
    }

    /** {@return the command that does the same} */
    public ReadOnlyStringProperty command() {
        return command.getReadOnlyProperty();
    }

    /** {@return what keeps it from being written; empty for nothing} */
    public ReadOnlyStringProperty problem() {
        return problem.getReadOnlyProperty();
    }

    /** {@return what came of it, or went wrong; empty for nothing} */
    public ReadOnlyStringProperty told() {
        return told.getReadOnlyProperty();
    }

    /** {@return the folder that was written, until something changes} */
    public ReadOnlyObjectProperty<Optional<Path>> written() {
        return written.getReadOnlyProperty();
    }

    /** Asks for the folder. */
    void chooseFolder() {
        dialogs.folder(Words.of("review.folder.title")).ifPresent(folder -> out.set(folder.toString()));
    }

    /** Copies the command. */
    void copyCommand() {
        copies.text(command.get());
        session.notices().done(Words.of("review.command.copied"));
    }

    /** Writes the review. */
    public void write() {
        Optional<ReviewRequest> request = request();
        if (!problem.get().isEmpty() || request.isEmpty()) {
            session.notices().refuse(problem.get());
            return;
        }
        Optional<OpenSet> set = against();
        Drawing drawing = session.shapes().get().drawing();
        written.set(Optional.empty());
        told.set(Words.of("budget.working"));
        lane.run(
                progress -> {
                    EntryGuard.enter();
                    set.ifPresent(open -> open.workbench()
                            .drawings()
                            .mustHold(request.get().prisms().orElseThrow(), drawing));
                    return ReviewJob.run(request.get(), progress);
                },
                outcome -> written(request.get().out(), outcome),
                fault -> told.set(FaultWords.of(fault)));
    }

    private void written(Path folder, ReviewOutcome outcome) {
        String words = Words.of("review.written", outcome.files().size(), folder);
        told.set(words);
        written.set(Optional.of(folder));
        session.notices().done(words);
    }

    /** Opens what was written. */
    void openFolder() {
        written.get().ifPresent(opener::open);
    }

    /** Opens the page that was written. */
    void openPage() {
        written.get().map(folder -> folder.resolve("review.html")).ifPresent(opener::open);
    }
}
