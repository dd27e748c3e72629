package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.io.WholeFile;
import org.seepledger.io.aquifer.AquiferDraft;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.progress.Progress;

/** Mends the description of an aquifer folder: says what is wrong with it and where, and puts a mended one in its place. */
public final class MendJob {

    /** What the description that was there before is called from then on. */
    public static final String BEFORE = "aquifer-before.json";

    private static final long MOST_BYTES = 4L << 20;

    private MendJob() {}

    /**
     * Something that is wrong.
     *
     * @param words what it is and what to do
     * @param stretch where in the text it is; empty if nowhere
     */
    public record Fault(String words, Optional<AquiferDraft.Stretch> stretch) {}

    /**
     * What was found.
     *
     * @param faults what is wrong; empty if nothing is
     * @param report what {@code inspect} says; empty as long as something is wrong
     */
    public record Finding(List<Fault> faults, String report) {}

    /**
     * {@return the text of a folder's description}
     *
     * @param folder the folder
     * @throws DataFault if there is none that can be read, or it is too long to be mended by hand
     */
    public static String text(Path folder) {
        Path file = folder.resolve(AquiferReader.FILE);
        try {
            if (Files.size(file) > MOST_BYTES) {
                throw new DataFault(
                        AquiferReader.FILE, "", "more than 4 MiB", "a text to be mended by hand", "Use an editor.");
            }
            return Files.readString(file);
        } catch (IOException e) {
            throw Unreadable.file(file.toString(), e);
        }
    }

    /**
     * Checks a text that could stand in the place of a folder's description.
     *
     * @param text the text
     * @param folder the folder
     * @param threads how many threads may work
     * @param progress told how far the work is
     * @return what is wrong, or what {@code inspect} says
     */
    public static Finding check(String text, Path folder, int threads, Progress progress) {
        AquiferDraft draft = new AquiferDraft(text);
        try (Scaffold scaffold = Scaffold.inTemporaryFolder()) {
            Path file = Files.writeString(scaffold.folder().resolve(AquiferReader.FILE), text);
            List<Fault> faults = new ArrayList<>();
            draft.faults(file).forEach(fault -> faults.add(new Fault(fault.getMessage(), draft.of(fault))));
            if (!faults.isEmpty()) {
                return new Finding(faults, "");
            }
            try (AquiferFolder opened = AquiferReader.open(file, folder)) {
                return new Finding(
                        List.of(), InspectJob.of(opened, threads, progress).text());
            } catch (DataFault e) {
                return new Finding(List.of(new Fault(e.getMessage(), draft.of(e))), "");
            }
        } catch (IOException e) {
            throw new UsageFault(
                    "The check cannot be made (" + Unreadable.reason(e) + "). Make room for temporary files.");
        }
    }

    /**
     * Puts a text in the place of a folder's description, and keeps the one before as {@value #BEFORE}.
     *
     * @param text the text
     * @param folder the folder
     * @throws UsageFault if it cannot be written, or there is a kept one already
     */
    public static void save(String text, Path folder) {
        Path file = folder.resolve(AquiferReader.FILE);
        Path before = folder.resolve(BEFORE);
        if (Files.exists(before, LinkOption.NOFOLLOW_LINKS)) {
            throw new UsageFault("There is a " + BEFORE + " in " + folder + " already. Move it elsewhere first.");
        }
        try {
            Files.copy(file, before);
        } catch (IOException e) {
            throw new UsageFault("The file " + before + " cannot be written (" + Unreadable.reason(e) + ").");
        }
        WholeFile.write(file, target -> target.write(text));
    }
}
