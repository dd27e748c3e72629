package org.seepledger.desktop;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.seepledger.job.BalanceJob;
import org.seepledger.job.Requests;
import org.seepledger.progress.Progress;

/** Rates of faces, sources and storage as texts, in the order of rows: as the ledger copies them, and as the command writes them. */
final class CommandRows {

    private CommandRows() {}

    /** In, out and net of each row of a ledger that was copied with its items by layer, in m3/d. */
    static List<String> copied(String text) {
        return text.lines()
                .map(line -> line.split("\t", -1))
                .filter(cells -> cells.length == 5 && cells[4].equals("m3/d") && !cells[1].isEmpty())
                .map(cells -> cells[1] + " " + cells[2] + " " + cells[3])
                .toList();
    }

    /** The same of a prism's rows in the {@code budget.csv} that the command makes. */
    static List<String> ofCommand(Path set, Path prisms, Path out, String prism, String period) throws IOException {
        BalanceJob.run(Requests.byInterval(set, prisms, out), Progress.NONE);
        return Files.readAllLines(out.resolve("budget.csv")).stream()
                .map(line -> line.split(",", -1))
                .filter(cells -> cells.length == 17 && cells[0].equals(prism))
                .filter(cells -> cells[1].equals(period) && !cells[6].equals("total"))
                .map(cells -> cells[9] + " " + cells[10] + " " + cells[11])
                .toList();
    }
}
