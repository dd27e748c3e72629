package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seepledger.io.table.Tables.FRAME;
import static org.seepledger.io.table.Tables.assertFault;

import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.unit.Measure;

class GriddedTableFaultTest {

    @TempDir
    private Path folder;

    private GriddedTable open(String text, Frame frame, Repeats repeats) {
        Path file = Tables.file(folder, text.replace('@', '\n'));
        return GriddedTable.open(file, "t.csv", frame, repeats, Below.REFUSED, folder);
    }

    private void openAndClose(String text) {
        open(text, FRAME, Repeats.REFUSED).close();
    }

    @Test
    void readsWell() {
        assertFault(() -> openAndClose("x,y,q\n105,230,1\n110,230,2\n"))
                .isEqualTo(
                        "t.csv, line 3: found x 110.0, y 230.0; expected the centre of a cell; the nearest is x 115.0, "
                                + "y 230.0, in row 1, column 2. Give the map coordinates of cell centres, or row and col instead.");
        assertFault(() -> openAndClose("row,col,layer,q\n2,1,1,1\n# note\n2,1,1,1\n"))
                .isEqualTo(
                        "t.csv, line 4: found a second line for row 2, column 1, layer 1; expected one line for each "
                                + "place and time. Take one of the lines out, or add the columns that tell them apart (x and y, or "
                                + "row and col; layer; interval or instant).");
        assertFault(() -> openAndClose("row,col,q\n3,1,1\n"))
                .isEqualTo(
                        "t.csv, line 2, column \"row\": found \"3\"; expected a whole number from 1 to 2. Rows count "
                                + "from 1, the northernmost.");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "x,y,q@105,230,1@135,230,1 | line 3: found x 135.0, y 230.0; expected a place on the grid, x 100.0 to 130.0",
                "x,y,q@105,199,1 | line 2: found x 105.0, y 199.0; expected a place on the grid",
                "x,y,q@105.2,230,1 | line 2: found x 105.2, y 230.0; expected the centre of a cell",
                "x,y,q@105,,1 | line 2, column \"y\": found an empty cell; expected a number",
                "x,y,q@105,NaN,1 | line 2, column \"y\": found \"NaN\"; expected a number",
                "x,y,q@a,230,1 | line 2, column \"x\": found \"a\"; expected a number",
                "row,col,q@0,1,1 | line 2, column \"row\": found \"0\"; expected a whole number from 1 to 2",
                "row,col,q@1,4,1 | line 2, column \"col\": found \"4\"; expected a whole number from 1 to 3",
                "row,col,q@1.5,1,1 | line 2, column \"row\": found \"1.5\"; expected a whole number",
                "row,col,q@,1,1 | line 2, column \"row\": found an empty cell",
                "row,col,layer,q@1,1,3,1 | line 2, column \"layer\": found \"3\"; expected a whole number from 1 to 2",
                "row,col,interval,q@1,1,0,1 | line 2, column \"interval\": found \"0\"; expected a whole number from 1 to 3",
                "row,col,instant,q@1,1,4,1 | line 2, column \"instant\": found \"4\"; expected a whole number from 0 to 3",
                "row,col,q@1,1,@1,1,2 | line 3: found a second line for row 1, column 1; expected",
                "interval,q@1,5@2,5@1,6 | line 4: found a second line for the whole grid, interval 1; expected",
                "row,col,layer,q@1,1,2,5@1,1,,6 | line 3: found a second line for row 1, column 1, layer 2; expected",
                "row,col,layer,q@1,1,,5@1,1,2,6 | line 3: found a second line for row 1, column 1, layer 2; expected",
                "x,y,q@105,230,1@125,210,1@125,210,1 | line 4: found a second line for row 2, column 3; expected",
                "x,q@105,1 | line 1: found a column \"x\" and none \"y\"; expected both or neither",
                "col,q@1,1 | line 1: found a column \"col\" and none \"row\"; expected both or neither",
                "x,y,row,col,q@105,230,1,1,1 | line 1: found both x, y and row, col; expected one",
                "row,col,interval,instant,q@1,1,1,1,1 | line 1: found both interval and instant",
                "row,col@1,1 | line 1: found no column of values; expected at least one",
                "row,col,q,Q@1,1,1,1 | line 1: found two columns named \"Q\"",
            })
    void saysWhatIsWrongAndWhere(String text, String message) {
        assertFault(() -> openAndClose(text)).startsWith("t.csv, " + message);
        assertThat(folder.toFile().list()).containsExactly("t.csv");
    }

    @Test
    void aCellThatIsNotANumberIsAFaultOfItsColumnAlone() {
        try (GriddedTable table = open("row,col,q,r@1,1,1,2@1,2,<0.5,3@1,3,x,4@", FRAME, Repeats.REFUSED)) {
            assertFault(() -> table.values("q", StepKind.NONE))
                    .startsWith("t.csv, line 3, column \"q\": found \"<0.5\"; expected a number.");
            assertThat(Tables.plane(table.values("r", StepKind.NONE), FRAME, 0, 0))
                    .contains(2, 3, 4);
        }
    }

    @Test
    void linesThatAddNeedTheirLayerAndStep() {
        assertFault(() -> open("row,col,layer,q@1,1,,5@", FRAME, Repeats.ADDED))
                .startsWith(
                        "t.csv, line 2, column \"layer\": found an empty cell; expected a number. Layers count from 1");
    }

    @Test
    void namesTheNearestColumnAndAll() {
        try (GriddedTable table = open("row,col,qx [m/d],qz@1,1,1,1@", FRAME, Repeats.REFUSED)) {
            String message =
                    "t.csv, line 1: found no column \"Qxx\" among \"row\", \"col\", \"qx\", \"qz\"; expected a "
                            + "column of that name. The nearest is \"qx\".";
            assertFault(() -> table.values("Qxx", StepKind.NONE)).isEqualTo(message);
            assertFault(() -> table.unit("Qxx")).isEqualTo(message);
            assertFault(() -> table.column(Optional.of("Qxx"))).isEqualTo(message);
            assertFault(() -> table.column(Optional.of("row"))).startsWith("t.csv, line 1: found");
            assertFault(() -> table.column(Optional.empty()))
                    .startsWith("t.csv, line 1: found the columns \"qx\", \"qz\"; expected one column of values");
        }
    }

    @Test
    void refusesUnitsThatAreUnknownOrDisagree() {
        try (GriddedTable table = open("row,col,a [m/d],b [furlong]@1,1,1,1@", FRAME, Repeats.REFUSED)) {
            assertFault(() -> table.unit("a", Optional.of(Measure.of("mm/d"))))
                    .isEqualTo(
                            "t.csv, line 1, column \"a\": found the unit \"m/d\"; expected \"mm/d\", the unit that is "
                                    + "given where the column is named. Give the unit at one of the two places.");
            assertFault(() -> table.unit("a", Optional.of(Measure.of("m")))).contains("expected \"m\"");
            assertFault(() -> table.unit("b"))
                    .startsWith(
                            "t.csv, line 1, column \"b\": found the unit \"furlong\"; expected a known unit: lengths");
        }
    }

    @ParameterizedTest
    @CsvSource({
        "interval, INSTANT, a column of intervals; expected \"instant\"",
        "interval, NONE, a column of intervals; expected neither interval nor instant",
        "instant, INTERVAL, a column of instants; expected \"interval\""
    })
    void refusesTheWrongKindOfStep(String column, StepKind kind, String message) {
        try (GriddedTable table = open("row,col," + column + ",q@1,1,1,1@", FRAME, Repeats.REFUSED)) {
            assertFault(() -> table.values("q", kind))
                    .startsWith("t.csv, line 1, column \"" + column + "\": found " + message);
        }
    }

    @Test
    void refusesTablesBeyondAllSpace() {
        Grid vast = new Grid(Axis.even(0, 1, 1_500_000), Axis.even(0, 1, 1_500_000), 0, 1);
        Frame frame = new Frame(vast, 2, Tables.TIMES);
        assertFault(() -> open("row,col,layer,q@1,1,1,1@", frame, Repeats.REFUSED))
                .isEqualTo("t.csv: found a table that needs room for more values than can be kept; expected at most "
                        + "1099511627776. Take columns out that are not needed, or name another temporary folder with java "
                        + "-Djava.io.tmpdir=FOLDER.");
        Frame countless = new Frame(vast, Integer.MAX_VALUE, Tables.TIMES);
        assertFault(() -> open("row,col,layer,q@1,1,1,1@", countless, Repeats.REFUSED))
                .startsWith("t.csv: found a table that needs room for more values than can be kept");
    }

    @Test
    void saysHowTheGridIsTurned() {
        Grid grid = new Grid(Axis.even(100, 10, 3), Axis.even(200, 20, 2), 90, 1);
        assertFault(() -> open("x,y,q@0,0,1@", new Frame(grid, 1, Tables.TIMES), Repeats.REFUSED))
                .contains("x 60.0 to 100.0 and y 200.0 to 230.0, turned by 90.0 degrees");
    }
}
