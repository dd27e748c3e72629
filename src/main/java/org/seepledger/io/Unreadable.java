package org.seepledger.io;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import org.seepledger.fault.DataFault;

/** Why the system would not give or take a file, in words. */
public final class Unreadable {

    private Unreadable() {}

    /**
     * {@return the fault that an input file cannot be read}
     *
     * @param shownFile the file as the user named it
     * @param cause what the system said
     */
    public static DataFault file(String shownFile, IOException cause) {
        return new DataFault(
                shownFile,
                "",
                "a file that cannot be read (" + reason(cause) + ")",
                "a file that may be read",
                "Check who may read it, and the disk that it lies on.");
    }

    /**
     * {@return what the system said, without the path}
     *
     * @param cause the exception
     */
    public static String reason(IOException cause) {
        if (cause instanceof AccessDeniedException) {
            return "permission denied";
        }
        if (cause instanceof NoSuchFileException) {
            return "no such file";
        }
        if (cause instanceof FileAlreadyExistsException) {
            return "a file is in its place";
        }
        String reason = cause instanceof FileSystemException system ? system.getReason() : cause.getMessage();
        return reason == null ? cause.getClass().getSimpleName() : reason;
    }
}
