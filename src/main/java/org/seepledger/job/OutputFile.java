package org.seepledger.job;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.UUID;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;

/** A single file that a run writes: built aside and moved into place whole; a run that ends early leaves nothing behind. */
final class OutputFile implements AutoCloseable {

    private final Path target;
    private final Path aside;

    private OutputFile(Path target, Path aside) {
        this.target = target;
        this.aside = aside;
    }

    /**
     * Prepares a file.
     *
     * @param target where it is to go
     * @param overwrite whether a file that an earlier run wrote there may be replaced
     * @param begins how the first line of such a file begins; others are not ours to replace
     * @throws UsageFault if the file cannot be written
     */
    static OutputFile at(Path target, boolean overwrite, String begins) {
        Path absolute = target.toAbsolutePath().normalize();
        if (Files.exists(absolute)) {
            check(absolute, overwrite, begins);
        }
        try {
            Files.createDirectories(absolute.getParent());
            String name = "." + absolute.getFileName() + "-building-" + UUID.randomUUID();
            return new OutputFile(absolute, Files.createFile(absolute.resolveSibling(name)));
        } catch (IOException e) {
            throw new UsageFault("The output file " + target + " cannot be written (" + Unreadable.reason(e)
                    + "). Name a file where you may write.");
        }
    }

    private static void check(Path target, boolean overwrite, String begins) {
        if (!Files.isRegularFile(target)) {
            throw new UsageFault("The output file " + target + " is a folder. Name a file.");
        }
        if (!overwrite) {
            throw new UsageFault(
                    "The output file " + target + " exists. Name another, or add --overwrite to replace it.");
        }
        try (BufferedReader old = Files.newBufferedReader(target)) {
            String first = old.readLine();
            if (first != null && first.startsWith(begins)) {
                return;
            }
        } catch (IOException e) {
            // What cannot be read as text was not written by an earlier run.
        }
        throw new UsageFault("The output file " + target + " does not begin with \"" + begins
                + "\", so no earlier run wrote it, and it is not replaced. Name another.");
    }

    /** Where the file is to be written while the run lasts. */
    Path path() {
        return aside;
    }

    /**
     * Moves the file into place.
     *
     * @throws UsageFault if that fails
     */
    void publish() {
        try {
            Files.move(aside, target, StandardCopyOption.REPLACE_EXISTING);
        } catch (IOException e) {
            throw new UsageFault("The file cannot be moved to " + target + " (" + Unreadable.reason(e) + ").");
        }
    }

    @Override
    public void close() {
        try {
            Files.deleteIfExists(aside);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
