package org.seepledger.job;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.RunJson;

/**
 * The folder that a run's files go to. They are built in a folder aside and moved into place when all are there, the run
 * record last; a run that ends early leaves nothing behind.
 */
final class OutputFolder implements AutoCloseable {

    private final Path target;
    private final Path aside;
    private final List<Path> made;
    private final Set<String> replaceable;

    private OutputFolder(Path target, Path aside, List<Path> made, Set<String> replaceable) {
        this.target = target;
        this.aside = aside;
        this.made = made;
        this.replaceable = replaceable;
    }

    /**
     * Prepares a folder.
     *
     * @param target where the files are to go: a new or empty folder, or with {@code overwrite} one that an earlier run
     *     wrote
     * @param command the command that is run; an earlier run of another one is not replaced
     * @param overwrite whether the files that its run record names may be replaced
     * @return the folder, to be closed
     * @throws UsageFault if the folder cannot be used
     */
    static OutputFolder at(Path target, String command, boolean overwrite) {
        Path absolute = target.toAbsolutePath().normalize();
        Set<String> replaceable = replaceable(target, command, overwrite);
        List<Path> made = missing(absolute.getParent());
        try {
            Files.createDirectories(absolute.getParent());
            String name = "." + absolute.getFileName() + "-building-";
            Path aside = Files.createTempDirectory(absolute.getParent(), name);
            if (Files.isDirectory(absolute) && !Files.isWritable(absolute)) {
                Files.delete(aside);
                throw new AccessDeniedException(target.toString());
            }
            return new OutputFolder(absolute, aside, made, replaceable);
        } catch (IOException e) {
            removeEmpty(made);
            throw new UsageFault("The output folder " + target + " cannot be used (" + Unreadable.reason(e)
                    + "). Name a folder where you may write.");
        }
    }

    /**
     * Makes sure that a folder is a new or empty one, or holds an earlier run that may be replaced.
     *
     * @throws UsageFault if not
     */
    static void mustBeUsable(Path target, String command, boolean overwrite) {
        replaceable(target, command, overwrite);
    }

    /** The folders above the target that do not exist yet, the innermost first. */
    static List<Path> missing(Path parent) {
        List<Path> missing = new ArrayList<>();
        for (Path folder = parent; folder != null && Files.notExists(folder); folder = folder.getParent()) {
            missing.add(folder);
        }
        return missing;
    }

    /** Removes folders, in their order, as far as they are empty. */
    static void removeEmpty(List<Path> folders) {
        try {
            for (Path folder : folders) {
                Files.deleteIfExists(folder);
            }
        } catch (IOException inUse) {
            // Somebody else put something there meanwhile: it stays.
        }
    }

    private static Set<String> replaceable(Path target, String command, boolean overwrite) {
        if (Files.exists(target) && !Files.isDirectory(target)) {
            throw new UsageFault("The output folder " + target + " is a file. Name a new or empty folder.");
        }
        if (isEmpty(target)) {
            return Set.of();
        }
        if (!overwrite) {
            throw new UsageFault(
                    "The output folder " + target
                            + " is not empty. Name a new or empty folder, or add --overwrite to replace an earlier run's files.");
        }
        Path record = target.resolve(RunJson.NAME);
        if (!Files.isRegularFile(record)) {
            throw new UsageFault("The output folder " + target + " is not empty and has no " + RunJson.NAME
                    + ", so no earlier run's files can be told apart. Name a new or empty folder.");
        }
        return recorded(record, command);
    }

    /** The files below the folder that an earlier run's record lists; anything else in it is not ours to touch. */
    private static Set<String> recorded(Path record, String command) {
        Set<String> names = new LinkedHashSet<>();
        names.add(RunJson.NAME);
        try {
            if (!RunJson.command(record).equals(command)) {
                throw new UsageFault("The output folder holds what \"" + RunJson.command(record) + "\" wrote, not \""
                        + command + "\". Name a new or empty folder.");
            }
            RunJson.outputs(record).stream()
                    .filter(output -> isOurs(record.toAbsolutePath().getParent(), output))
                    .forEach(output -> names.add(output.name()));
        } catch (DataFault e) {
            throw new UsageFault(
                    "The output folder holds no run record that can be read, so no earlier run's files can be told"
                            + " apart: " + e.getMessage() + " Name a new or empty folder.");
        }
        return names;
    }

    /** Whether an earlier run wrote a file; in a folder further below, only if it is what the run wrote. */
    private static boolean isOurs(Path folder, FileRecord output) {
        String name = output.name();
        if (!isBelow(folder, name) || Files.isDirectory(folder.resolve(name))) {
            return false;
        }
        try {
            return !name.contains("/")
                    || Files.notExists(folder.resolve(name))
                    || FileRecord.of(name, folder.resolve(name)).equals(output);
        } catch (IOException e) {
            return false;
        }
    }

    /** Whether a folder that stands at the target already is a link to elsewhere. */
    private boolean leadsAway(String name) {
        return Files.isDirectory(target.resolve(name).getParent()) && !isBelow(target, name);
    }

    private static boolean isBelow(Path folder, String name) {
        try {
            Path file = folder.resolve(name);
            boolean plain = !name.isEmpty()
                    && List.of(name.split("/", -1)).stream().noneMatch(step -> step.isEmpty() || step.startsWith("."));
            return plain
                    && file.normalize().startsWith(folder)
                    && Files.isDirectory(file.getParent())
                    && file.getParent().toRealPath().startsWith(folder.toRealPath());
        } catch (IOException | InvalidPathException e) {
            return false;
        }
    }

    private static boolean isEmpty(Path folder) {
        if (!Files.isDirectory(folder)) {
            return true;
        }
        try (Stream<Path> files = Files.list(folder)) {
            return files.findAny().isEmpty();
        } catch (IOException e) {
            throw new UsageFault("The output folder " + folder + " cannot be read (" + Unreadable.reason(e)
                    + "). Name a folder where you may read and write.");
        }
    }

    private static List<String> names(Path folder) {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.filter(file -> !Files.isDirectory(file))
                    .map(file -> folder.relativize(file).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /**
     * Where a file is to be written while the run lasts.
     *
     * @param name its name, with {@code /} between folders
     * @throws IOException if its folder cannot be made
     */
    Path file(String name) throws IOException {
        Path file = aside.resolve(name);
        Files.createDirectories(file.getParent());
        return file;
    }

    /** The names of the files written so far. */
    List<String> written() {
        return names(aside);
    }

    /** The files written so far, with their fingerprints. */
    List<FileRecord> records() throws IOException {
        List<FileRecord> records = new ArrayList<>();
        for (String name : written()) {
            records.add(FileRecord.of(name, file(name)));
        }
        return records;
    }

    /**
     * Moves the files into place, the run record last, and removes those of an earlier run that have no successor.
     *
     * @throws UsageFault if a file that no earlier run wrote is in the way
     */
    void publish() {
        List<String> files = new ArrayList<>(written());
        files.remove(RunJson.NAME);
        files.add(RunJson.NAME);
        for (String name : files) {
            boolean free = !Files.exists(target.resolve(name)) && !leadsAway(name);
            if (!free && !replaceable.contains(name)) {
                throw new UsageFault("The file " + target.resolve(name)
                        + " is in the way, and no earlier run wrote it. Move it or name another folder.");
            }
        }
        try {
            Files.createDirectories(target);
            for (String name : files) {
                Files.createDirectories(target.resolve(name).getParent());
                Files.move(file(name), target.resolve(name), StandardCopyOption.REPLACE_EXISTING);
            }
            for (String old : replaceable) {
                if (!files.contains(old)) {
                    Files.deleteIfExists(target.resolve(old));
                }
            }
        } catch (IOException e) {
            throw new UsageFault(
                    "The files cannot be moved to " + target + " (" + Unreadable.reason(e) + "). Name another folder.");
        }
    }

    @Override
    public void close() {
        try {
            List<Path> left;
            try (Stream<Path> files = Files.walk(aside)) {
                left = files.sorted(Comparator.reverseOrder()).toList();
            }
            for (Path file : left) {
                Files.deleteIfExists(file);
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        if (!Files.exists(target)) {
            removeEmpty(made);
        }
    }
}
