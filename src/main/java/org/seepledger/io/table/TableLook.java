package org.seepledger.io.table;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.LongConsumer;
import org.seepledger.fault.DataFault;

/**
 * A first look at a table of which nothing is known yet: its columns, what stands in them, its first lines.
 *
 * @param separator what stands between cells
 * @param columns the columns, in their order
 * @param lines how many lines of values there are
 * @param sample the first lines of values as they are written
 */
public record TableLook(char separator, List<Column> columns, long lines, List<List<String>> sample) {

    private static final int SAMPLE_LINES = 30;
    private static final long MOST_LINES = 100_000_000;

    /** Copies the lists. */
    public TableLook {
        columns = List.copyOf(columns);
        sample = List.copyOf(sample);
    }

    /**
     * What stands in a column.
     *
     * @param heading its cell of the header, as written
     * @param name the heading without a unit in brackets
     * @param unit the unit in brackets as written; empty if there is none
     * @param numbers how many cells hold a number
     * @param texts how many cells hold something else
     * @param limits how many cells give a limit that a value is below, as {@code <0.5}
     * @param blanks how many cells hold nothing
     * @param least the least number; NaN if there is none
     * @param greatest the greatest number; NaN if there is none
     * @param distinct the different cells in order of appearance; empty where there are more than 20,000
     */
    public record Column(
            String heading,
            String name,
            String unit,
            long numbers,
            long texts,
            long limits,
            long blanks,
            double least,
            double greatest,
            List<String> distinct) {

        /** {@return whether it holds numbers and nothing else} */
        public boolean isNumeric() {
            return numbers + limits > 0 && texts == 0;
        }
    }

    /**
     * Reads a table through.
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param progress told the number of lines read, now and then; may throw to end the reading
     * @return what was seen
     * @throws DataFault if the file cannot be read as a table
     */
    public static TableLook of(Path file, String shownName, LongConsumer progress) {
        try (TableReader table = TableReader.open(file, shownName, MOST_LINES)) {
            List<String> header = table.headerLine().cells();
            List<ColumnTally> tallies = new ArrayList<>();
            for (int column = 0; column < header.size(); column++) {
                tallies.add(new ColumnTally(header.get(column), table.dialect()));
            }
            List<List<String>> sample = new ArrayList<>();
            long lines = 0;
            while (table.next()) {
                for (int column = 0; column < tallies.size(); column++) {
                    tallies.get(column).add(table.text(column));
                }
                if (sample.size() < SAMPLE_LINES) {
                    sample.add(table.current().cells());
                }
                if (++lines % 10_000 == 0) {
                    progress.accept(lines);
                }
            }
            List<Column> columns = tallies.stream().map(ColumnTally::column).toList();
            return new TableLook(table.dialect().separator(), columns, lines, sample);
        }
    }

    /**
     * Reads the numbers of some columns.
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param columns which columns, from 0
     * @param most how many lines at most
     * @return for each of the columns its numbers, line by line; NaN where there is none
     * @throws DataFault if the file cannot be read as a table, or a cell is no number
     */
    public static double[][] numbers(Path file, String shownName, int[] columns, int most) {
        try (TableReader table = TableReader.open(file, shownName, MOST_LINES)) {
            double[][] numbers = new double[columns.length][16];
            int line = 0;
            while (line < most && table.next()) {
                for (int i = 0; i < columns.length; i++) {
                    if (line == numbers[i].length) {
                        numbers[i] = Arrays.copyOf(numbers[i], 2 * line);
                    }
                    numbers[i][line] = table.number(columns[i]);
                }
                line++;
            }
            int read = line;
            return Arrays.stream(numbers)
                    .map(column -> Arrays.copyOf(column, read))
                    .toArray(double[][]::new);
        }
    }
}
