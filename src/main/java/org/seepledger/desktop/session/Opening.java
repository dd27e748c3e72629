package org.seepledger.desktop.session;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.job.DrawingFile;
import org.seepledger.job.Workbench;
import org.seepledger.sketch.ControlLine;

/**
 * A folder as it was opened.
 *
 * @param set the set
 * @param kept the prisms and transects that lie beside it
 * @param unsaved prisms and transects that were drawn and not saved when the program last ended
 */
public record Opening(OpenSet set, DrawingFile kept, Optional<DrawingFile> unsaved) implements AutoCloseable {

    /** What the prisms beside an aquifer are called. */
    public static final String PRISMS = "prisms.geojson";

    /** What prisms are called that are drawn and not saved. */
    public static final String UNSAVED = "prisms.unsaved.geojson";

    /** What the transects beside an aquifer with solutes are called. */
    public static final String TRANSECTS = "transects.geojson";

    /** What transects are called that are drawn and not saved. */
    public static final String UNSAVED_TRANSECTS = "transects.unsaved.geojson";

    /**
     * Opens an aquifer folder and reads the prisms beside it.
     *
     * @param folder the folder, or the {@code aquifer.json} in it
     * @return what was found
     * @throws org.seepledger.fault.DataFault if something is wrong with either
     */
    public static Opening of(Path folder) {
        EntryGuard.enter();
        Path path = isSetFile(folder) ? folder.toAbsolutePath().getParent() : folder;
        OpenSet set = new OpenSet(path, Workbench.open(path));
        try {
            DrawingFile kept = drawing(path.resolve(PRISMS), set)
                    .orElse(DrawingFile.NONE)
                    .with(lines(path.resolve(TRANSECTS), set).orElse(List.of()));
            return new Opening(set, kept, unsaved(path, set, kept));
        } catch (RuntimeException e) {
            set.close();
            throw e;
        }
    }

    @Override
    public void close() {
        set.close();
    }

    /** Of the two files there may be one alone. */
    private static Optional<DrawingFile> unsaved(Path path, OpenSet set, DrawingFile kept) {
        Optional<DrawingFile> prisms = drawing(path.resolve(UNSAVED), set);
        Optional<List<ControlLine>> lines = lines(path.resolve(UNSAVED_TRANSECTS), set);
        return prisms.isEmpty() && lines.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        prisms.orElse(kept).with(lines.orElse(kept.drawing().lines())));
    }

    private static Optional<List<ControlLine>> lines(Path file, OpenSet set) {
        return set.solutes().isEmpty() || !Files.isRegularFile(file)
                ? Optional.empty()
                : Optional.of(set.workbench().drawings().transects(file).stream()
                        .map(ControlLine::of)
                        .toList());
    }

    private static boolean isSetFile(Path path) {
        return path.endsWith(AquiferReader.FILE) && Files.isRegularFile(path);
    }

    private static Optional<DrawingFile> drawing(Path file, OpenSet set) {
        return Files.isRegularFile(file)
                ? Optional.of(set.workbench().drawings().drawing(file))
                : Optional.empty();
    }
}
