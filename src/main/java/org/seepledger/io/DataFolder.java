package org.seepledger.io;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/**
 * A folder of data files that name each other by relative paths, none of which may leave it.
 *
 * <p>A data set is often somebody else's: a path that leads out of its folder, openly or by a link, is refused.
 */
public final class DataFolder {

    private static final String EXPECTED = "the path of a file below the folder, relative to it, with \"/\"";

    private final Path folder;
    private final String shownFile;
    private final Optional<Map<String, Path>> listed;

    private DataFolder(Path folder, String shownFile, Optional<Map<String, Path>> listed) {
        this.folder = folder;
        this.shownFile = shownFile;
        this.listed = listed;
    }

    /**
     * {@return the folder that a file stands in, for the paths that it names}
     *
     * @param file the file
     * @param shownFile the file as the user named it, for messages
     */
    public static DataFolder holding(Path file, String shownFile) {
        return new DataFolder(file.toAbsolutePath().getParent(), shownFile, Optional.empty());
    }

    /**
     * {@return a folder that is yet to be made, whose files lie elsewhere}
     *
     * @param files where they lie, by the path that they will have in the folder
     * @param shownFile the file that names them, for messages
     */
    public static DataFolder of(Map<String, Path> files, String shownFile) {
        return new DataFolder(Path.of(""), shownFile, Optional.of(Map.copyOf(files)));
    }

    /**
     * {@return the file that a path names}
     *
     * @param relative the path as written, relative to the folder
     * @param place where it is written, for messages
     * @throws DataFault if the path is empty, absolute, holds {@code ..}, leads out of the folder by a link, or names
     *     no plain file; the nearest existing name is told
     */
    public Path resolve(String relative, String place) {
        Path path = inside(relative, place);
        if (listed.isPresent()) {
            return listed(relative, place);
        }
        if (!Files.exists(path)) {
            throw missing(relative, path, place);
        }
        try {
            if (!path.toRealPath().startsWith(folder.toRealPath())) {
                throw fault(place, shown(relative) + ", which leads out of the folder", "Copy the file into it.");
            }
        } catch (IOException e) {
            throw fault(place, shown(relative) + ", which cannot be followed", "Check the links and permissions.");
        }
        if (!Files.isRegularFile(path)) {
            throw fault(place, shown(relative) + ", which is not a plain file", "Name the file itself.");
        }
        return path;
    }

    private Path listed(String relative, String place) {
        Path path = listed.orElseThrow().get(relative);
        if (path == null) {
            throw fault(place, shown(relative) + ", which is not among the files", "Bring the file too.");
        }
        return path;
    }

    private Path inside(String relative, String place) {
        boolean absolute = relative.startsWith("/") || relative.matches("[A-Za-z]:.*");
        if (relative.isBlank() || absolute || relative.contains("\\")) {
            throw fault(place, shown(relative), "Write a path such as \"ground.tif\" or \"surfaces/ground.tif\".");
        }
        if (List.of(relative.split("/")).contains("..")) {
            throw fault(place, shown(relative) + ", which leads out of the folder", "Copy the file into it.");
        }
        try {
            return folder.resolve(relative);
        } catch (InvalidPathException e) {
            throw fault(place, shown(relative) + ", which cannot be the name of a file", "Correct the path.");
        }
    }

    private DataFault missing(String relative, Path path, String place) {
        Path parent = path.getParent();
        if (!Files.isDirectory(parent)) {
            return fault(place, shown(relative) + ", whose folder does not exist", "Correct the path.");
        }
        String remedy = NearestName.besides(path)
                .map(name -> "Did you mean \"" + name + "\"?")
                .orElse("Put the file there or correct the path.");
        return fault(place, shown(relative) + ", which does not exist", remedy);
    }

    private static String shown(String relative) {
        return "the path \"" + (relative.length() > 120 ? relative.substring(0, 120) + "…" : relative) + "\"";
    }

    private DataFault fault(String place, String found, String remedy) {
        return new DataFault(shownFile, place, found, EXPECTED, remedy);
    }
}
