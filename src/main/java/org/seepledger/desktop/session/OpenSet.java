package org.seepledger.desktop.session;

import java.nio.file.Path;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.prisms.SurfaceRasters;

/**
 * An aquifer folder, open in the window: its files stay readable until it is closed.
 *
 * @param path where it lies
 * @param folder what is in it
 * @param surfaces the rasters that prisms name as tops and bottoms
 */
public record OpenSet(Path path, AquiferFolder folder, SurfaceRasters surfaces) implements AutoCloseable {

    /** {@return the aquifer} */
    public Aquifer aquifer() {
        return folder.aquifer();
    }

    @Override
    public void close() {
        surfaces.close();
        folder.close();
    }
}
