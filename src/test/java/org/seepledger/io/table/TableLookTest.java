package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.DataFault;

class TableLookTest {

    @TempDir
    private Path folder;

    private Path file(String... lines) throws IOException {
        return Files.writeString(folder.resolve("t.csv"), String.join("\n", lines) + "\n");
    }

    private TableLook look(String... lines) throws IOException {
        return TableLook.of(file(lines), "t.csv", line -> {});
    }

    @Test
    void countsWhatStandsInEachColumn() throws IOException {
        TableLook look = look("# a note", "x;name;c [mg/l];q", "1,5;A;<0,5;", "2,5;B;3;nan", "2,5;7b;;-4");
        assertThat(look.separator()).isEqualTo(';');
        assertThat(look.lines()).isEqualTo(3);
        assertThat(look.sample().get(0)).containsExactly("1,5", "A", "<0,5", "");
        TableLook.Column x = look.columns().get(0);
        assertThat(x.isNumeric()).isTrue();
        assertThat(x.least()).isEqualTo(1.5);
        assertThat(x.greatest()).isEqualTo(2.5);
        assertThat(x.distinct()).containsExactly("1,5", "2,5");
        assertThat(look.columns().get(1).isNumeric()).isFalse();
        assertThat(look.columns().get(1).texts()).isEqualTo(3);
        TableLook.Column c = look.columns().get(2);
        assertThat(c.name()).isEqualTo("c");
        assertThat(c.unit()).isEqualTo("mg/l");
        assertThat(c.limits()).isEqualTo(1);
        assertThat(c.blanks()).isEqualTo(1);
        assertThat(look.columns().get(3).blanks()).isEqualTo(2);
    }

    @Test
    void aDecimalCommaIsNoneBesideADecimalPoint() throws IOException {
        assertThat(look("a;b", "1,5;1", "1.5;2").columns().get(0).isNumeric()).isFalse();
    }

    @Test
    void manyDifferentTextsAreNotKept() throws IOException {
        String[] lines = new String[20_003];
        lines[0] = "a";
        for (int i = 1; i < lines.length; i++) {
            lines[i] = String.valueOf(i);
        }
        assertThat(look(lines).columns().get(0).distinct()).isEmpty();
    }

    @Test
    void numbersOfSomeColumnsAreReadLineByLine() throws IOException {
        double[][] numbers = TableLook.numbers(file("a,b,c", "1,x,3", "4,y,"), "t.csv", new int[] {0, 2}, 10);
        assertThat(numbers[0]).containsExactly(1, 4);
        assertThat(numbers[1]).containsExactly(3, Double.NaN);
        assertThatThrownBy(() -> TableLook.numbers(folder.resolve("t.csv"), "t.csv", new int[] {1}, 10))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("line 2");
    }

    @Test
    void aCopyChangesHeadingsAndCellsAndNothingElse() throws IOException {
        Path from = file("# note", "lay;gone;v (m)", "0;x;1,50", ";y;\"2;0\"");
        Path to = folder.resolve("copy.csv");
        TableCopy.write(
                from,
                "t.csv",
                List.of(
                        new TableCopy.Column("layer", text -> String.valueOf(Integer.parseInt(text) + 1)),
                        new TableCopy.Column("", UnaryOperator.identity()),
                        new TableCopy.Column("v (m)", UnaryOperator.identity())),
                to);
        assertThat(Files.readAllLines(to)).containsExactly("# note", "layer;v (m)", "1;1,50", "\"\";\"2;0\"");
    }
}
