package org.seepledger.io.submission;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.fault.DataFault;
import org.seepledger.io.NearestName;
import org.seepledger.io.Unreadable;
import org.seepledger.review.sheet.Sheet;

/** Reads the tables of a submitted budget, whichever kind of file it is. */
public final class SubmissionFile {

    /** The most rows of one table. */
    static final int MOST_ROWS = 100_000;

    /** The most columns of one table. */
    static final int MOST_COLUMNS = 2_000;

    /** The most cells of one file. */
    static final int MOST_CELLS = 2_000_000;

    /** The longest text of one cell. */
    static final int LONGEST_CELL = 32_767;

    private static final long MOST_BYTES = 64L << 20;
    private static final byte[] ZIP = {'P', 'K', 3, 4};
    private static final byte[] COMPOUND = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0};

    private SubmissionFile() {}

    /**
     * {@return the tables of a file, at least one}
     *
     * @param file the file
     * @param shownFile the file as the user named it
     * @throws DataFault if it cannot be read, is neither text nor a workbook, or is beyond a limit
     */
    public static List<Sheet> read(Path file, String shownFile) {
        if (!Files.isRegularFile(file)) {
            String remedy = NearestName.besides(file)
                    .map(name -> "Did you mean \"" + name + "\"?")
                    .orElse("Correct the path.");
            throw new DataFault(shownFile, "", "no such file", "a budget as CSV or XLSX", remedy);
        }
        try (InputStream in = Files.newInputStream(file)) {
            long bytes = Files.size(file);
            if (bytes > MOST_BYTES) {
                throw tooMuch(shownFile, "", bytes + " bytes", MOST_BYTES + " bytes");
            }
            byte[] start = in.readNBytes(ZIP.length);
            if (java.util.Arrays.equals(start, ZIP)) {
                return Workbook.read(file, shownFile);
            }
            if (java.util.Arrays.equals(start, COMPOUND)) {
                throw new DataFault(
                        shownFile,
                        "",
                        "a workbook of the old kind, or one with a password",
                        "CSV or XLSX",
                        "Save it as XLSX without a password, or as CSV.");
            }
            return List.of(TextTable.read(file, shownFile));
        } catch (IOException e) {
            throw Unreadable.file(shownFile, e);
        }
    }

    static DataFault tooMuch(String shownFile, String place, String found, String most) {
        return new DataFault(shownFile, place, found, "at most " + most, "Keep the budget, and leave the rest out.");
    }
}
