package org.seepledger.desktop.port;

import java.nio.file.Path;

/** Opens files and folders with what the machine opens them with. */
@FunctionalInterface
public interface Opener {

    /**
     * Opens a file or a folder.
     *
     * @param path which
     */
    void open(Path path);
}
