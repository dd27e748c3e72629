package org.seepledger.desktop.welcome;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.io.aquifer.AquiferReader;

/**
 * A folder that could not be opened.
 *
 * @param folder the folder
 * @param described whether there is a description in it, which can be mended
 */
record Broken(Path folder, boolean described) {

    /** {@return a folder as it is, in case that it cannot be opened; empty if there is none} */
    static Optional<Broken> of(Path path) {
        Path absolute = path.toAbsolutePath().normalize();
        Path folder = Files.isDirectory(absolute) ? absolute : absolute.getParent();
        return folder != null && Files.isDirectory(folder)
                ? Optional.of(new Broken(folder, Files.isRegularFile(folder.resolve(AquiferReader.FILE))))
                : Optional.empty();
    }
}
