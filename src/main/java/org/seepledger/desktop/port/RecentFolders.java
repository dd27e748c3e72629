package org.seepledger.desktop.port;

import java.nio.file.Path;
import java.util.List;

/** The folders opened lately, kept from run to run. */
public interface RecentFolders {

    /** {@return the folders, the latest first} */
    List<Path> list();

    /**
     * Puts a folder first.
     *
     * @param folder the folder
     */
    void remember(Path folder);

    /**
     * Leaves a folder out from now on.
     *
     * @param folder the folder
     */
    void forget(Path folder);
}
