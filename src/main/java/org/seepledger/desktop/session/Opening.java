package org.seepledger.desktop.session;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.job.Workbench;
import org.seepledger.prism.Prism;

/**
 * A folder as it was opened.
 *
 * @param set the set
 * @param prisms the prisms that lie beside it, if any
 */
public record Opening(OpenSet set, List<Prism> prisms) {

    /** What the prisms beside an aquifer are called. */
    public static final String PRISMS = "prisms.geojson";

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
            return new Opening(set, prisms(path.resolve(PRISMS), set));
        } catch (RuntimeException e) {
            set.close();
            throw e;
        }
    }

    private static boolean isSetFile(Path path) {
        return path.endsWith(AquiferReader.FILE) && Files.isRegularFile(path);
    }

    private static List<Prism> prisms(Path file, OpenSet set) {
        if (!Files.isRegularFile(file)) {
            return List.of();
        }
        return set.workbench().read(file).prisms();
    }
}
