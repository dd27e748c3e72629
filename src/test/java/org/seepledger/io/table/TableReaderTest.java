package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seepledger.io.table.Tables.assertFault;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TableReaderTest {

    @TempDir
    private Path folder;

    private List<double[]> read(String text) {
        List<double[]> lines = new ArrayList<>();
        try (TableReader table = open(Tables.file(folder, text))) {
            while (table.next()) {
                double[] line = new double[table.header().size()];
                for (int column = 0; column < line.length; column++) {
                    line[column] = table.number(column);
                }
                lines.add(line);
            }
        }
        return lines;
    }

    private static TableReader open(Path file) {
        return TableReader.open(file, "data/t.csv", 1_000);
    }

    @Test
    void readsEveryDialect() {
        for (String separator : new String[] {",", ";", "\t"}) {
            for (String decimal : separator.equals(",") ? new String[] {"."} : new String[] {".", ","}) {
                for (String end : new String[] {"\n", "\r\n", "\r"}) {
                    for (String mark : new String[] {"", "\uFEFF"}) {
                        checkDialect(separator, decimal, end, mark);
                    }
                }
            }
        }
    }

    private void checkDialect(String separator, String decimal, String end, String mark) {
        String text = mark
                + String.join(
                        end,
                        "# a note; with, all\tseparators \"and one quote",
                        "",
                        "a|\"b\" | c [m/d]",
                        "1!5| -2e3|",
                        "# another note",
                        "||",
                        "",
                        "\"+0!25\"|!5|NaN",
                        "#");
        String written = text.replace("|", separator).replace("!", decimal);
        assertThat(read(written)).as(written).containsExactly(new double[][] {
            {1.5, -2000, Double.NaN}, {0.25, 0.5, Double.NaN}
        });
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void countsEveryLine(String end) {
        String text = String.join(end, "# note", "a,b", "1,2", "", "# note", "3,4", "\"5\",x");
        try (TableReader table = open(Tables.file(folder, text))) {
            assertThat(table.line()).isEqualTo(2);
            assertThat(table.next()).isTrue();
            assertThat(table.line()).isEqualTo(3);
            assertThat(table.next()).isTrue();
            assertThat(table.line()).isEqualTo(6);
            assertThat(table.next()).isTrue();
            assertThat(table.place()).isEqualTo("data/t.csv, line 7");
            assertFault(() -> table.number(1)).startsWith("data/t.csv, line 7, column \"b\": found \"x\"");
            assertThat(table.next()).isFalse();
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "<0.5",
                "1d",
                "0x1p3",
                "1,5",
                "1.2.3",
                "--1",
                "1e",
                "e",
                ".",
                "Infinity",
                "1 000",
                "−1",
                "1'000",
                "½",
                "n/a"
            })
    void refusesWhatIsNotANumber(String cell) {
        assertFault(() -> read("a,b\n1,2\n3,\"" + cell + "\"\n"))
                .isEqualTo("data/t.csv, line 3, column \"b\": found \"" + cell + "\"; expected a number. "
                        + "Write plain numbers, without thousands separators and with one decimal sign in the whole file; "
                        + "leave the cell empty where there is no value.");
    }

    @Test
    void refusesNumbersThatADoubleCannotHold() {
        assertFault(() -> read("a\n1e999\n")).contains("found \"1e999\"; expected a number within the range");
    }

    @Test
    void refusesTwoDecimalSigns() {
        assertFault(() -> read("a;b\n0,5;1\n2;1.234\n"))
                .startsWith("data/t.csv, line 3, column \"b\": found \"1.234\"; expected \",\" as the decimal sign");
        assertFault(() -> read("a;b\n1.234,5;1\n")).startsWith("data/t.csv, line 2, column \"a\": found \"1.234,5\"");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "a,b@1@ | line 2: found 1 cell; expected 2, as in the header.",
                "a,b@1,2,3@ | line 2: found 3 cells; expected 2, as in the header.",
                "a,b@1,2@\"3,4@5,6@ | found a quotation mark that is not closed",
                "a,b@\"1\"x,2@ | line 2: found a quotation mark that is not closed, or text after a closed one",
                "a,A@1,2@ | line 1: found two columns named \"A\", the 1st and the 2nd; expected names that differ",
                "a,a [m]@1,2@ | line 1: found two columns named \"a\"",
                "#n@1,2@3,4@ | line 2: found a line of numbers; expected a header line",
                ",,@1,2,3@ | line 1: found no names",
                "# only@ | t.csv: found no line but notes",
            })
    void saysWhatIsWrongAndWhere(String text, String message) {
        assertFault(() -> read(text.replace('@', '\n'))).contains(message);
    }

    @Test
    void passesOverColumnsWithoutAName() {
        assertThat(read(",a,\n0,1,\n1,2,\n")).hasSize(2);
    }

    @Test
    void refusesAnEmptyFileAndOneThatIsNotThere() {
        assertFault(() -> read("")).startsWith("data/t.csv: found no line but notes");
        assertFault(() -> open(folder.resolve("none.csv")))
                .startsWith("data/t.csv: found no such file; expected a table");
        assertFault(() -> open(folder)).startsWith("data/t.csv: found a file that cannot be read");
    }

    @Test
    void refusesOtherEncodingsWithTheirLine() {
        byte[] latin = "a,b\n1,2\n# Brücke\n".getBytes(StandardCharsets.ISO_8859_1);
        assertFault(() -> open(Tables.file(folder, latin)))
                .isEqualTo("data/t.csv, line 3: found bytes that are not UTF-8 text; expected UTF-8. "
                        + "Save the table as CSV in UTF-8.");
        byte[] wide = "a,b\n1,2\n".getBytes(StandardCharsets.UTF_16LE);
        assertFault(() -> open(Tables.file(folder, wide))).startsWith("data/t.csv, line 1: found bytes that are not");
    }

    @Test
    void stopsAtAQuotationMarkThatIsNeverClosed() {
        String line = "12345678,12345678\n";
        String text = "a,b\n1,2\n\"" + line.repeat(StrictReader.LINE_LIMIT / line.length() + 1_000);
        assertFault(() -> read(text))
                .startsWith("data/t.csv, line 3: found more than 1,048,576 characters")
                .contains("quotation mark that is opened and never closed");
        assertFault(() -> read("a".repeat(StrictReader.LINE_LIMIT + 10_000)))
                .startsWith("data/t.csv, line 1: found more");
    }

    @Test
    void readsFilesLongerThanTheLimitOfALine() {
        String line = "# note\n12345678,12345678\n";
        int lines = 2 * StrictReader.LINE_LIMIT / line.length();
        try (TableReader table = TableReader.open(Tables.file(folder, "a,b\n" + line.repeat(lines)), "t", lines)) {
            for (int i = 0; i < lines; i++) {
                assertThat(table.next()).isTrue();
            }
            assertThat(table.line()).isEqualTo(2 * lines + 1);
        }
    }

    @Test
    void limitsLinesAndColumns() {
        assertFault(() -> read("a\n" + "1\n".repeat(1_001))).startsWith("data/t.csv, line 1002: found more lines");
        assertFault(() -> read("a,".repeat(10_000) + "a\n")).startsWith("data/t.csv, line 1: found 10001 columns");
    }
}
