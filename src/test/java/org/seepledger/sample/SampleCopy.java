package org.seepledger.sample;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.Predicate;

/** Copies of the sample aquifers in folders of a test's own, to be written to. */
public final class SampleCopy {

    private static final Path SAMPLES = Path.of("sample-aquifers");

    private SampleCopy() {}

    /**
     * Copies a sample.
     *
     * @param name the sample
     * @param folder where to; made if it is not there
     */
    public static void of(String name, Path folder) throws IOException {
        of(name, folder, file -> true);
    }

    /**
     * Copies some files of a sample.
     *
     * @param name the sample
     * @param folder where to; made if it is not there
     * @param chosen which files, by their names
     */
    public static void of(String name, Path folder, Predicate<String> chosen) throws IOException {
        Files.createDirectories(folder);
        try (var files = Files.list(SAMPLES.resolve(name))) {
            for (Path file : files.toList()) {
                if (chosen.test(file.getFileName().toString())) {
                    Files.copy(file, folder.resolve(file.getFileName()));
                }
            }
        }
    }
}
