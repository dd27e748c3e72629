package org.seepledger.desktop.port;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Asks which file or folder. An empty answer means that the person thought better of it. */
public interface FileDialogs {

    /**
     * {@return a folder that exists}
     *
     * @param title what it is for
     */
    Optional<Path> folder(String title);

    /**
     * {@return a file that exists}
     *
     * @param title what it is for
     * @param kind what kind of file
     */
    Optional<Path> fileToRead(String title, Kind kind);

    /**
     * {@return files that exist; none if the person thought better of it}
     *
     * @param title what they are for
     */
    List<Path> filesToRead(String title);

    /**
     * {@return a file to be written; whether it may be overwritten has been asked}
     *
     * @param title what it is for
     * @param kind what kind of file
     * @param suggested its suggested place and name
     */
    Optional<Path> fileToWrite(String title, Kind kind, Path suggested);

    /**
     * A kind of file.
     *
     * @param words what it is called
     * @param pattern what its name looks like, as {@code *.geojson}
     */
    record Kind(String words, String pattern) {}
}
