package org.seepledger.desktop.session;

import java.nio.file.Path;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.job.Workbench;

/**
 * An aquifer folder, open in the window: its files stay readable until it is closed.
 *
 * @param path where it lies
 * @param workbench answers questions about it
 */
public record OpenSet(Path path, Workbench workbench) implements AutoCloseable {

    /** {@return the aquifer} */
    public Aquifer aquifer() {
        return workbench.aquifer();
    }

    /** {@return the solutes that a concentration is given for} */
    public List<Solute> solutes() {
        return workbench.solutes().solutes();
    }

    @Override
    public void close() {
        workbench.close();
    }
}
