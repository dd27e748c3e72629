package org.seepledger.desktop.review;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.Inquiry;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.job.ReviewAsked;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Severity;
import org.seepledger.review.mapping.Mapping;

/** The submitted budget, how it is read, and what was found. While nobody looks, nothing is worked out. */
public final class ReviewModel {

    private static final FileDialogs.Kind TABLE = new FileDialogs.Kind("CSV, XLSX", "*.*");
    private static final int OCTOBER = 10;

    private final Session session;
    private final FileDialogs dialogs;
    private final Inquiry<ReviewQuestion, ReviewAnswer> inquiry;
    private final MappingFile mappingFile;
    private final ReadOnlyObjectWrapper<Optional<Path>> submitted = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Optional<ReviewAnswer>> answer = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> state = new ReadOnlyObjectWrapper<>(PaneState.READY);
    private final ObjectProperty<Double> tolerance = new SimpleObjectProperty<>(1.0);
    private final BooleanProperty wholeCells = new SimpleBooleanProperty();
    private final ObjectProperty<Integer> waterYearStart = new SimpleObjectProperty<>(OCTOBER);
    private final ObjectProperty<Optional<Severity>> filter = new SimpleObjectProperty<>(Optional.empty());
    private final ObjectProperty<Optional<Finding>> chosen = new SimpleObjectProperty<>(Optional.empty());
    private int reading;
    private boolean shown;

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks does the work
     * @param dialogs asks for files
     */
    public ReviewModel(Session session, Tasks tasks, FileDialogs dialogs) {
        this.session = session;
        this.dialogs = dialogs;
        this.inquiry = new Inquiry<>(tasks.latest("task.review"), ReviewQuestion::answer);
        this.mappingFile = new MappingFile(this, tasks, dialogs);
        session.set().addListener((set, before, after) -> {
            inquiry.forget(PaneState.working(Words.of("budget.working")));
            ask();
        });
        Stream.<ObservableValue<?>>of(session.drawing(), tolerance, wholeCells, waterYearStart, mappingFile.mapping())
                .forEach(cause -> cause.addListener((value, before, after) -> ask()));
        inquiry.last().addListener((reply, before, after) -> {
            chosen.set(Optional.empty());
            answer.set(after.map(Inquiry.Reply::answer));
        });
        inquiry.state().addListener((told, before, after) -> showState());
        showState();
    }

    /**
     * Tells whether somebody looks.
     *
     * @param now whether the page is shown
     */
    void show(boolean now) {
        shown = now;
        ask();
    }

    private void ask() {
        Optional<ReviewAsked> asked = asked();
        if (shown && asked.isPresent() && session.drawing().get().settled()) {
            inquiry.wantAtRest(new ReviewQuestion(
                    session.set().get(), session.drawing().get().prisms(), asked.get(), reading));
        }
        showState();
    }

    /** What is to be reviewed; empty while no table is chosen. */
    Optional<ReviewAsked> asked() {
        return submitted
                .get()
                .map(file -> new ReviewAsked(
                        file, mappingFile.mapping().get(), tolerance.get(), wholeCells.get(), waterYearStart.get()));
    }

    private void showState() {
        state.set(
                submitted.get().isEmpty()
                        ? PaneState.empty(Words.of("review.empty"))
                        : inquiry.state().get());
    }

    /** Asks for a submitted table. */
    public void choose() {
        dialogs.fileToRead(Words.of("review.choose.title"), TABLE).ifPresent(this::bring);
    }

    /**
     * Reviews a table.
     *
     * @param file the table, CSV or XLSX
     */
    public void bring(Path file) {
        Optional<Path> wanted = Optional.of(file.toAbsolutePath().normalize());
        boolean other = !submitted.get().equals(wanted);
        submitted.set(wanted);
        if (other) {
            inquiry.forget(PaneState.working(Words.of("budget.working")));
            mappingFile.forget();
        }
        readAgain();
    }

    /** Reads the table anew. */
    public void readAgain() {
        reading++;
        ask();
    }

    /** Takes up again what was stopped or failed. */
    public void again() {
        inquiry.again();
    }

    /**
     * Reads the table otherwise.
     *
     * @param change what of the corrections changes
     */
    void correct(UnaryOperator<Mapping> change) {
        mappingFile.correct(change);
    }

    /** {@return the mapping, and the file that it is kept in} */
    public MappingFile mapping() {
        return mappingFile;
    }

    Session session() {
        return session;
    }

    /** {@return the submitted table, if one is chosen} */
    public ReadOnlyObjectProperty<Optional<Path>> submitted() {
        return submitted.getReadOnlyProperty();
    }

    /** {@return what was found, if anything was reviewed yet} */
    public ReadOnlyObjectProperty<Optional<ReviewAnswer>> answer() {
        return answer.getReadOnlyProperty();
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }

    /** {@return how far figures may differ, in percent of throughput} */
    ObjectProperty<Double> tolerance() {
        return tolerance;
    }

    /** {@return whether cells along outlines are taken whole} */
    BooleanProperty wholeCells() {
        return wholeCells;
    }

    /** {@return the month in which a water year begins} */
    ObjectProperty<Integer> waterYearStart() {
        return waterYearStart;
    }

    /** {@return the one severity that is listed; empty for all} */
    ObjectProperty<Optional<Severity>> filter() {
        return filter;
    }

    /** {@return the finding that is looked at} */
    public ObjectProperty<Optional<Finding>> chosen() {
        return chosen;
    }

    /** {@return the findings listed, the heaviest first} */
    public List<Finding> findings() {
        return all().filter(finding -> filter.get().stream().allMatch(finding.severity()::equals))
                .toList();
    }

    private Stream<Finding> all() {
        return answer.get().stream().flatMap(found -> found.result().findings().stream());
    }

    /**
     * {@return how many findings there are}
     *
     * @param severity of which severity
     */
    long count(Severity severity) {
        return all().filter(finding -> finding.severity() == severity).count();
    }

    /**
     * Looks at a finding: its prism, period and row are selected, and its face lit up.
     *
     * @param finding the finding
     */
    public void look(Finding finding) {
        chosen.set(Optional.of(finding));
        answer.get().ifPresent(found -> new Pointing(session, found).at(finding));
    }
}
