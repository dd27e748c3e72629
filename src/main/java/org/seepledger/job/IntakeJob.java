package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.fault.UsageFault;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Copy;
import org.seepledger.intake.LooseFiles;
import org.seepledger.io.Unreadable;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.aquifer.AquiferText;
import org.seepledger.io.prisms.DrawingReader;
import org.seepledger.progress.Progress;

/**
 * Makes an aquifer folder of loose files: looks at them, checks what they make by the code of {@link InspectJob}, and
 * writes it whole or not at all. The files that were brought are only read.
 */
public final class IntakeJob {

    private static final String PRISMS = "prisms.geojson";

    private IntakeJob() {}

    /**
     * Looks at files and folders.
     *
     * @param brought the files and folders
     * @param progress told of each file
     * @return what was found
     * @throws UsageFault if a folder cannot be read, or there are too many files
     */
    public static LooseFiles look(List<Path> brought, Progress progress) {
        return LooseFiles.at(brought, progress);
    }

    /**
     * Checks the folder that a composition makes. Files that stay as they are are read where they lie; others are made in a
     * temporary folder.
     *
     * @param composition the composition, without faults
     * @param threads how many threads may work
     * @param progress told how far the work is
     * @return what {@code inspect} says of it
     * @throws org.seepledger.fault.DataFault if something is wrong with it
     * @throws UsageFault if there is no room for temporary files
     */
    public static Inspection check(Composition composition, int threads, Progress progress) {
        try (Scaffold scaffold = Scaffold.inTemporaryFolder()) {
            Map<String, Path> files = new LinkedHashMap<>();
            for (Copy copy : composition.copies()) {
                files.put(copy.to(), copy instanceof Copy.Whole ? copy.from() : scaffold.take(copy, progress));
            }
            Path description = scaffold.describe(composition.set());
            try (AquiferFolder opened = AquiferReader.open(description, files)) {
                readPrisms(opened, files);
                return InspectJob.of(opened, threads, progress);
            }
        } catch (IOException e) {
            throw new UsageFault(
                    "The check cannot be made (" + Unreadable.reason(e) + "). Make room for temporary files.");
        }
    }

    /**
     * Writes a new aquifer folder.
     *
     * @param composition the composition, made for copying
     * @param target a folder that does not exist yet, or an empty one
     * @param threads how many threads may work
     * @param progress told how far the work is; when it ends the work, nothing is left
     * @throws org.seepledger.fault.DataFault if something is wrong with what was brought
     * @throws UsageFault if the folder cannot be written
     */
    public static void write(Composition composition, Path target, int threads, Progress progress) {
        Path absolute = target.toAbsolutePath().normalize();
        requireEmpty(absolute);
        try (Scaffold scaffold = Scaffold.beside(absolute)) {
            for (Copy copy : composition.copies()) {
                scaffold.take(copy, progress);
            }
            scaffold.describe(composition.set());
            try (AquiferFolder opened = AquiferReader.open(scaffold.folder())) {
                readPrisms(opened, Map.of(PRISMS, scaffold.folder().resolve(PRISMS)));
                InspectJob.of(opened, threads, progress);
            }
            scaffold.publish(absolute);
        } catch (IOException e) {
            throw new UsageFault("The folder " + target + " cannot be written (" + Unreadable.reason(e)
                    + "). Name a folder where you may write.");
        }
    }

    /** Prisms that cannot be read would keep the window from opening the folder. */
    private static void readPrisms(AquiferFolder opened, Map<String, Path> files) {
        Path prisms = files.get(PRISMS);
        if (prisms != null && Files.isRegularFile(prisms)) {
            int layers = opened.aquifer().layers().size();
            new DrawingReader(opened.crs(), layers, note -> {}).read(prisms, PRISMS);
        }
    }

    private static void requireEmpty(Path target) {
        if (Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            try (var inside = Files.list(target)) {
                if (inside.findAny().isEmpty() && !Files.isSymbolicLink(target)) {
                    return;
                }
            } catch (IOException e) {
                throw new UsageFault(target + " is no folder that can be used (" + Unreadable.reason(e) + ").");
            }
            throw new UsageFault("The folder " + target + " is not empty. Name a new or empty folder.");
        }
    }

    /**
     * Writes the {@code aquifer.json} of files that stay where they lie.
     *
     * @param composition the composition, made for files in their place
     * @param root the folder that all files lie under
     * @param threads how many threads may work
     * @param progress told how far the work is
     * @throws org.seepledger.fault.DataFault if something is wrong with what was brought
     * @throws UsageFault if there is an {@code aquifer.json} already, or none can be written
     */
    public static void describe(Composition composition, Path root, int threads, Progress progress) {
        Path target = root.resolve(AquiferReader.FILE);
        if (Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
            throw new UsageFault("There is an " + AquiferReader.FILE + " in " + root
                    + " already, and it is not replaced. Write a new folder.");
        }
        check(composition, threads, progress);
        Path aside = root.resolve("." + AquiferReader.FILE + "-building");
        try {
            Files.writeString(aside, AquiferText.of(composition.set()), StandardOpenOption.CREATE_NEW);
            try {
                Files.move(aside, target, StandardCopyOption.ATOMIC_MOVE);
            } finally {
                Files.deleteIfExists(aside);
            }
        } catch (IOException e) {
            throw new UsageFault("The file " + target + " cannot be written (" + Unreadable.reason(e)
                    + "). Write a new folder elsewhere.");
        }
    }
}
