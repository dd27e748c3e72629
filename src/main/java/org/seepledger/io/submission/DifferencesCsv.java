package org.seepledger.io.submission;

import java.io.IOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.apache.commons.csv.CSVPrinter;
import org.seepledger.io.table.CsvText;
import org.seepledger.io.table.NotedCsv;
import org.seepledger.review.change.Difference;
import org.seepledger.review.change.RecordedRow;
import org.seepledger.review.change.Split;

/** Writes how two runs differ: {@code differences.csv} and {@code inputs.csv}. */
public final class DifferencesCsv {

    private static final String[] HEADER = {
        "prism",
        "period",
        "group",
        "item",
        "layer",
        "quantity",
        "first",
        "first_unit",
        "second",
        "second_unit",
        "difference",
        "percent",
        "by_area",
        "by_period",
        "by_inputs",
        "by_unit"
    };
    private static final String[] INPUTS = {"name", "first_sha256", "second_sha256", "state"};

    private DifferencesCsv() {}

    /**
     * Writes the differences.
     *
     * @param file the file
     * @param notes what stands before the rows, a line each
     * @param differences the differences
     * @throws IOException if it cannot be written
     */
    public static void write(Path file, List<String> notes, List<Difference> differences) throws IOException {
        try (Writer text = Files.newBufferedWriter(file)) {
            CSVPrinter rows = NotedCsv.begin(text, notes, HEADER);
            for (Difference difference : differences) {
                rows.printRecord(cells(difference, false));
                if (!difference.any().isPercentage()) {
                    rows.printRecord(cells(difference, true));
                }
            }
        }
    }

    private static List<String> cells(Difference difference, boolean volumes) {
        RecordedRow row = difference.any();
        List<String> cells = new ArrayList<>(List.of(
                CsvText.text(row.prism()),
                CsvText.text(row.period()),
                row.group(),
                CsvText.text(row.item()),
                row.layer(),
                volumes ? "net_volume" : "net_rate"));
        cells.add(CsvText.number(Difference.value(difference.first(), volumes)));
        cells.add(Difference.unit(difference.first(), volumes));
        cells.add(CsvText.number(Difference.value(difference.second(), volumes)));
        cells.add(Difference.unit(difference.second(), volumes));
        cells.add(CsvText.number(difference.off(volumes)));
        cells.add(CsvText.number(difference.percent(volumes)));
        Optional<Split> split = volumes ? difference.volume() : difference.rate();
        cells.add(CsvText.number(split.map(Split::area).orElse(Double.NaN)));
        cells.add(CsvText.number(split.map(Split::period).orElse(Double.NaN)));
        cells.add(CsvText.number(split.map(Split::inputs).orElse(Double.NaN)));
        cells.add(CsvText.number(split.map(Split::unit).orElse(Double.NaN)));
        return cells;
    }

    /**
     * Writes which inputs the runs share.
     *
     * @param file the file
     * @param notes what stands before the rows, a line each
     * @param first hashes of the first run's inputs, by name
     * @param second hashes of the second run's inputs, by name
     * @throws IOException if it cannot be written
     */
    public static void writeInputs(Path file, List<String> notes, Map<String, String> first, Map<String, String> second)
            throws IOException {
        TreeSet<String> names = new TreeSet<>(first.keySet());
        names.addAll(second.keySet());
        try (Writer text = Files.newBufferedWriter(file)) {
            CSVPrinter rows = NotedCsv.begin(text, notes, INPUTS);
            for (String name : names) {
                rows.printRecord(
                        CsvText.text(name),
                        first.getOrDefault(name, ""),
                        second.getOrDefault(name, ""),
                        state(name, first, second));
            }
        }
    }

    /**
     * {@return how an input of two runs stands: same, changed, only first, only second}
     *
     * @param name its name
     * @param first hashes of the first run's inputs, by name
     * @param second hashes of the second run's inputs, by name
     */
    public static String state(String name, Map<String, String> first, Map<String, String> second) {
        if (!second.containsKey(name)) {
            return "only first";
        }
        if (!first.containsKey(name)) {
            return "only second";
        }
        return first.get(name).equals(second.get(name)) ? "same" : "changed";
    }
}
