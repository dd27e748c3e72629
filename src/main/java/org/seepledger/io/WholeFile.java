package org.seepledger.io;

import java.io.IOException;
import java.io.Writer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;
import org.seepledger.fault.UsageFault;

/**
 * A text file that is written whole or not at all: built beside its place under another name, brought to the disk, and
 * moved over what was there. Whoever reads it meanwhile, or after a power cut, finds the old one or the new one.
 */
public final class WholeFile {

    private WholeFile() {}

    /** Writes what the file is to hold, in UTF-8. */
    @FunctionalInterface
    public interface Content {

        /**
         * Writes it.
         *
         * @param text where to; may be closed or left open
         * @throws IOException if it cannot be written
         */
        void write(Writer text) throws IOException;
    }

    /**
     * Writes a file, in place of the one that is there.
     *
     * @param file where; of a link the file that it leads to
     * @param content writes what it is to hold
     * @throws UsageFault if it cannot be written; the old file is then still there
     */
    public static void write(Path file, Content content) {
        try {
            Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            Path aside = target.resolveSibling("." + target.getFileName() + "-" + UUID.randomUUID() + ".part");
            try {
                build(aside, content);
                move(aside, target);
            } finally {
                Files.deleteIfExists(aside);
            }
        } catch (IOException e) {
            throw new UsageFault("The file " + file + " cannot be written (" + Unreadable.reason(e)
                    + "). Name a file where you may write.");
        }
    }

    private static void build(Path aside, Content content) throws IOException {
        try (Writer text = Files.newBufferedWriter(aside, StandardOpenOption.CREATE_NEW)) {
            content.write(text);
        }
        try (FileChannel channel = FileChannel.open(aside, StandardOpenOption.WRITE)) {
            channel.force(true);
        }
    }

    private static void move(Path aside, Path target) throws IOException {
        try {
            Files.move(aside, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(aside, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
