package org.seepledger.desktop.session;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.job.DrawingFile;
import org.seepledger.job.Workbench;

/**
 * A folder as it was opened.
 *
 * @param set the set
 * @param kept the prisms that lie beside it
 * @param unsaved prisms that were drawn and not saved when the program last ended
 */
public record Opening(OpenSet set, DrawingFile kept, Optional<DrawingFile> unsaved) implements AutoCloseable {

    /** What the prisms beside an aquifer are called. */
    public static final String PRISMS = "prisms.geojson";

    /** What prisms are called that are drawn and not saved. */
    public static final String UNSAVED = "prisms.unsaved.geojson";

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
            return new Opening(
                    set,
                    drawing(path.resolve(PRISMS), set).orElse(DrawingFile.NONE),
                    drawing(path.resolve(UNSAVED), set));
        } catch (RuntimeException e) {
            set.close();
            throw e;
        }
    }

    @Override
    public void close() {
        set.close();
    }

    private static boolean isSetFile(Path path) {
        return path.endsWith(AquiferReader.FILE) && Files.isRegularFile(path);
    }

    private static Optional<DrawingFile> drawing(Path file, OpenSet set) {
        return Files.isRegularFile(file) ? Optional.of(set.workbench().drawing(file)) : Optional.empty();
    }
}
