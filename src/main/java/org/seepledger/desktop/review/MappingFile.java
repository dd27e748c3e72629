package org.seepledger.desktop.review;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.desktop.port.FileDialogs;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.io.submission.MappingJson;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Submission;

/** What a person says of how a table is read, and the file that holds just that, if there is one. */
public final class MappingFile {

    private static final FileDialogs.Kind JSON = new FileDialogs.Kind("JSON", "*.json");

    private final ReviewModel review;
    private final FileDialogs dialogs;
    private final Lane lane;
    private final ReadOnlyObjectWrapper<Mapping> mapping = new ReadOnlyObjectWrapper<>(Mapping.NONE);
    private final ReadOnlyObjectWrapper<Optional<Path>> file = new ReadOnlyObjectWrapper<>(Optional.empty());

    MappingFile(ReviewModel review, Tasks tasks, FileDialogs dialogs) {
        this.review = review;
        this.dialogs = dialogs;
        this.lane = tasks.latest("task.review.mapping");
    }

    /** {@return what a person said; all else is guessed} */
    public ReadOnlyObjectProperty<Mapping> mapping() {
        return mapping.getReadOnlyProperty();
    }

    /** {@return the file that holds just that} */
    public ReadOnlyObjectProperty<Optional<Path>> file() {
        return file.getReadOnlyProperty();
    }

    /** {@return whether something was said that no file holds} */
    boolean isUnsaved() {
        return file.get().isEmpty() && !mapping.get().equals(Mapping.NONE);
    }

    void correct(UnaryOperator<Mapping> change) {
        take(Optional.empty(), change.apply(mapping.get()));
    }

    /** Goes back to the guess. */
    public void forget() {
        lane.cancel();
        take(Optional.empty(), Mapping.NONE);
    }

    private void take(Optional<Path> kept, Mapping said) {
        file.set(kept);
        mapping.set(said);
    }

    /** Asks for a mapping, and reads the table by it. */
    public void open() {
        dialogs.fileToRead(Words.of("review.mapping.open.title"), JSON).ifPresent(from -> read(from, () -> {}));
    }

    private void read(Path from, Work first) {
        lane.run(
                progress -> {
                    EntryGuard.enter();
                    first.run();
                    return MappingJson.read(from, from.toString());
                },
                said -> {
                    take(Optional.of(from), said);
                    review.session().notices().done(Words.of("review.mapping.holds", from));
                },
                fault -> review.session().notices().refuse(FaultWords.of(fault)));
    }

    private interface Work {
        void run() throws java.io.IOException;
    }

    /** Asks where the mapping is to be kept, all that was guessed with it, and goes on with what stands there then. */
    public void save() {
        Optional<ReviewAnswer> read = review.answer().get();
        Optional<Path> table = review.submitted().get();
        if (read.isEmpty() || table.isEmpty()) {
            review.session().notices().refuse(Words.of("review.mapping.none"));
            return;
        }
        List<Mapping> mappings =
                read.get().tables().stream().map(Submission::mapping).toList();
        Path suggested = table.get().resolveSibling("mapping.json");
        dialogs.fileToWrite(Words.of("review.mapping.save.title"), JSON, suggested)
                .ifPresent(to -> read(to, () -> MappingJson.write(to, mappings)));
    }
}
