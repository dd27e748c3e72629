package org.seepledger.desktop;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** The valley in a folder of a test's own, to be written to. */
public final class ValleyCopy {

    private ValleyCopy() {}

    /** Copies it. */
    public static void into(Path folder) throws IOException {
        try (var sample = Files.list(Path.of("sample-aquifers/valley"))) {
            for (Path file : sample.toList()) {
                Files.copy(file, folder.resolve(file.getFileName()));
            }
        }
    }
}
