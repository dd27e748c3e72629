package org.seepledger.intake;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.progress.Progress;

/**
 * Files that were brought, each after a first look.
 *
 * @param root the folder that all lie under
 * @param files the files, by name
 */
public record LooseFiles(Path root, List<LooseFile> files) {

    private static final int MOST = 20_000;
    private static final int DEEPEST = 12;

    /** Copies the list. */
    public LooseFiles {
        files = List.copyOf(files);
    }

    /**
     * Looks at files, and at all files of folders.
     *
     * @param brought files and folders
     * @param progress told of each file
     * @return what was found
     * @throws UsageFault if there are more than 20,000 files, or a folder cannot be read
     */
    public static LooseFiles at(List<Path> brought, Progress progress) {
        Set<Path> paths = new LinkedHashSet<>();
        for (Path each : brought) {
            collect(each.toAbsolutePath().normalize(), paths);
        }
        Path root = root(brought);
        progress.begin("looking at files", paths.size());
        List<LooseFile> files = new ArrayList<>();
        for (Path path : paths) {
            String shown = root.relativize(path).toString().replace('\\', '/');
            files.add(leadsOut(path, root) ? link(path, shown) : FirstLook.at(path, shown, progress));
            progress.step();
        }
        return new LooseFiles(root, files);
    }

    /** A folder is often somebody else's: a link in it could lead to anything. */
    private static boolean leadsOut(Path path, Path root) {
        try {
            return Files.isSymbolicLink(path) && !path.toRealPath().startsWith(root.toRealPath());
        } catch (IOException e) {
            return true;
        }
    }

    /**
     * {@return the same without some of the files}
     *
     * @param leftOut the paths of those that are left out
     */
    public LooseFiles without(Set<Path> leftOut) {
        return new LooseFiles(
                root,
                files.stream().filter(file -> !leftOut.contains(file.path())).toList());
    }

    private static LooseFile link(Path path, String shown) {
        String words = shown + " is a link that leads out of the folder. Bring the file itself.";
        return new LooseFile.Other(path, shown, 0, LooseFile.Kind.STRANGE, words);
    }

    private static void collect(Path brought, Set<Path> paths) {
        try (Stream<Path> below = Files.walk(brought, DEEPEST)) {
            below.filter(Files::isRegularFile)
                    .filter(path -> isData(brought.relativize(path)))
                    .sorted()
                    .limit(MOST + 1L)
                    .forEach(paths::add);
        } catch (IOException e) {
            throw new UsageFault(brought + " cannot be read (" + Unreadable.reason(e) + ").");
        }
        if (paths.size() > MOST) {
            throw new UsageFault("There are more than " + MOST + " files below " + brought
                    + ". Bring the folder that holds the data alone.");
        }
    }

    /** Hidden files, the description of a set, and what lies beside rasters and texts as a matter of course, are no data. */
    private static boolean isData(Path relative) {
        for (Path step : relative) {
            if (step.toString().startsWith(".")) {
                return false;
            }
        }
        String name = String.valueOf(relative.getFileName()).toLowerCase(Locale.ROOT);
        return !name.equals(AquiferReader.FILE) && !name.matches(".*\\.(aux\\.xml|ovr|tfw|md|qml|lock)");
    }

    private static Path root(List<Path> brought) {
        Optional<Path> root = brought.stream()
                .map(path -> path.toAbsolutePath().normalize())
                .map(path -> Files.isDirectory(path) ? path : path.getParent())
                .reduce(LooseFiles::common);
        return root.orElseThrow(() -> new UsageFault("No file was named."));
    }

    private static Path common(Path one, Path other) {
        for (Path folder = one; folder != null; folder = folder.getParent()) {
            if (other.startsWith(folder)) {
                return folder;
            }
        }
        throw new UsageFault("The files lie on different drives. Bring those of one drive.");
    }
}
