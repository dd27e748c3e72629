package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.seepledger.io.table.Tables.FRAME;
import static org.seepledger.io.table.Tables.plane;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Times;
import org.seepledger.aquifer.Window;
import org.seepledger.unit.Measure;

class GriddedTableTest {

    private static final double NONE = Double.NaN;

    @TempDir
    private Path folder;

    private GriddedTable open(String text, Frame frame, Repeats repeats) {
        return GriddedTable.open(Tables.file(folder, text), "data/t.csv", frame, repeats, Below.REFUSED, folder);
    }

    private GriddedTable open(String text) {
        return open(text, FRAME, Repeats.REFUSED);
    }

    @Test
    void placesByCentreInAnyOrder() {
        String text = "q,y,x\n4,210,105\n3,230,125\n1,230.0,105\n,210,115\n2,230,115\n";
        try (GriddedTable table = open(text)) {
            GriddedValues values = table.values("q", StepKind.NONE);
            assertThat(plane(values, FRAME, 0, 0)).containsExactly(1, 2, 3, 4, NONE, NONE);
            assertThat(plane(values, FRAME, 1, 2)).containsExactly(1, 2, 3, 4, NONE, NONE);
            assertThat(values.changes()).isFalse();
            assertThat(values.layered()).isFalse();
        }
    }

    @Test
    void placesByRowAndColumnFromTheNorth() {
        String text = "row;COL;Layer;Interval;q\n2;1;1;3;0,5\n1;3;2;1;-7\n1,0;1;1;3;8\n";
        try (GriddedTable table = open(text)) {
            GriddedValues values = table.values("q", StepKind.INTERVAL);
            assertThat(plane(values, FRAME, 0, 2)).containsExactly(8, NONE, NONE, 0.5, NONE, NONE);
            assertThat(plane(values, FRAME, 1, 0)).containsExactly(NONE, NONE, -7, NONE, NONE, NONE);
            assertThat(plane(values, FRAME, 1, 1)).containsOnly(NONE);
            assertThat(values.changes()).isTrue();
            assertThat(values.layered()).isTrue();
        }
    }

    @Test
    void readsABlockOfThePlane() {
        try (GriddedTable table = open("row,col,q\n1,1,11\n1,2,12\n1,3,13\n2,1,21\n2,2,22\n2,3,23\n")) {
            double[] target = {-1, -1, -1, -1, -1, -1};
            table.values("q", StepKind.NONE).read(0, 0, new Window(0, 1, 2, 2), target, 1);
            assertThat(target).containsExactly(-1, 12, 13, 22, 23, -1);
        }
    }

    @Test
    void countsInstantsFromZero() {
        try (GriddedTable table = open("row,col,instant,h\n1,1,0,5\n1,1,3,6\n")) {
            GriddedValues values = table.values("h", StepKind.INSTANT);
            assertThat(plane(values, FRAME, 0, 0)[0]).isEqualTo(5);
            assertThat(plane(values, FRAME, 1, 3)[0]).isEqualTo(6);
            assertThat(plane(values, FRAME, 0, 1)[0]).isNaN();
        }
    }

    @Test
    void holdsForTheWholeGridWithoutPlace() {
        try (GriddedTable table = open("interval,recharge [mm/yr]\n1,100\n3,300\n")) {
            GriddedValues values = table.values("recharge", StepKind.INTERVAL);
            assertThat(plane(values, FRAME, 1, 0)).containsOnly(100);
            assertThat(plane(values, FRAME, 0, 1)).containsOnly(NONE);
            assertThat(plane(values, FRAME, 0, 2)).containsOnly(300);
            assertThat(table.unit("recharge")).contains(Measure.of("mm/yr"));
        }
        try (GriddedTable table = open("sy\n0.2\n")) {
            assertThat(plane(table.values("sy", StepKind.NONE), FRAME, 1, 0)).containsOnly(0.2);
        }
    }

    @Test
    void anEmptyLayerOrStepMeansAll() {
        try (GriddedTable table = open("row,col,layer,interval,q\n1,1,,2,5\n1,1,2,1,6\n2,2,1,,7\n")) {
            GriddedValues values = table.values("q", StepKind.INTERVAL);
            assertThat(plane(values, FRAME, 0, 1)).containsExactly(5, NONE, NONE, NONE, 7, NONE);
            assertThat(plane(values, FRAME, 1, 1)).containsExactly(5, NONE, NONE, NONE, NONE, NONE);
            assertThat(plane(values, FRAME, 1, 0)).containsExactly(6, NONE, NONE, NONE, NONE, NONE);
            assertThat(plane(values, FRAME, 0, 2)).containsExactly(NONE, NONE, NONE, NONE, 7, NONE);
        }
    }

    @Test
    void givesEveryColumnOfOnePass() {
        try (GriddedTable table = open("row,col,qx [m/d],qy,remark\n1,1,1,2,dry\n2,3,3,,wet\n")) {
            assertThat(table.columns()).containsExactly("qx", "qy", "remark");
            assertThat(plane(table.values("qx", StepKind.NONE), FRAME, 0, 0))
                    .containsExactly(1, NONE, NONE, NONE, NONE, 3);
            assertThat(plane(table.values("qy", StepKind.NONE), FRAME, 0, 0))
                    .containsExactly(2, NONE, NONE, NONE, NONE, NONE);
            assertThat(table.unit("qx")).contains(Measure.of("m/d"));
            assertThat(table.unit("qy")).isEmpty();
        }
    }

    @Test
    void addsLinesOfSourcesInOneCell() {
        String text = "row,col,layer,flow,other\n1,1,1,5,\n1,1,1,-2,1\n1,1,2,9,\n1,1,1,,2\n1,1,2,,\n";
        try (GriddedTable table = open(text, FRAME, Repeats.ADDED)) {
            assertThat(plane(table.values("flow", StepKind.NONE), FRAME, 0, 0)[0])
                    .isEqualTo(3);
            assertThat(plane(table.values("flow", StepKind.NONE), FRAME, 1, 0)[0])
                    .isEqualTo(9);
            assertThat(plane(table.values("other", StepKind.NONE), FRAME, 0, 0)[0])
                    .isEqualTo(3);
            assertThat(plane(table.values("other", StepKind.NONE), FRAME, 1, 0)[0])
                    .isNaN();
        }
    }

    /** Rotation written out: a place turned by 30 degrees counter-clockwise about the corner (1000, 2000). */
    @ParameterizedTest
    @ValueSource(doubles = {0, 30, 90, -120.5})
    void findsCentresOnATurnedUnevenGrid(double degrees) {
        Grid grid = new Grid(Axis.of(1000, 1010, 1040), Axis.of(2000, 2001, 2021), degrees, 1);
        double angle = Math.toRadians(degrees);
        StringBuilder text = new StringBuilder("x,y,q\n");
        double[][] centres = {{5, 11}, {25, 11}, {5, 0.5}, {25, 0.5}};
        for (int cell = 3; cell >= 0; cell--) {
            double east = centres[cell][0] + 0.009 * (cell % 2 == 0 ? 10 : 30);
            double north = centres[cell][1];
            text.append(1000 + east * Math.cos(angle) - north * Math.sin(angle)).append(',');
            text.append(2000 + east * Math.sin(angle) + north * Math.cos(angle)).append(',');
            text.append(cell).append('\n');
        }
        Frame frame = new Frame(grid, 1, Tables.TIMES);
        try (GriddedTable table = open(text.toString(), frame, Repeats.REFUSED)) {
            assertThat(plane(table.values("q", StepKind.NONE), frame, 0, 0)).containsExactly(0, 1, 2, 3);
        }
    }

    @Test
    void findsTheColumnThatIsMeant() {
        try (GriddedTable table = open("row,col,q\n1,1,1\n")) {
            assertThat(table.column(Optional.empty())).isEqualTo("q");
            assertThat(table.column(Optional.of("q"))).isEqualTo("q");
        }
    }

    @Test
    void takesTheUnitFromWhereItIsGiven() {
        Optional<Measure> none = Optional.empty();
        try (GriddedTable table = open("row,col,a [gpm],b\n1,1,1,1\n")) {
            assertThat(table.unit("a", none)).contains(Measure.of("gpm"));
            assertThat(table.unit("a", Optional.of(Measure.of("gal/min")))).contains(Measure.of("gpm"));
            assertThat(table.unit("b", Optional.of(Measure.of("m/d")))).contains(Measure.of("m/d"));
            assertThat(table.unit("b", none)).isEmpty();
        }
    }

    /** 60 intervals of ten million cells are 4.8 GB, more than the tests' heap; the temporary file has holes. */
    @Test
    void keepsValuesOffTheHeap() {
        double[] instants = new double[61];
        Arrays.setAll(instants, i -> i);
        Grid grid = new Grid(Axis.even(0, 1, 1_000), Axis.even(0, 1, 1_000), 0, 1);
        Frame frame = new Frame(grid, 10, new Times(instants, Tables.DAY, Optional.empty()));
        String text = "row,col,layer,interval,q\n1,1,1,1,1\n1000,1000,10,60,2\n500,500,5,30,3\n";
        try (GriddedTable table = open(text, frame, Repeats.REFUSED)) {
            GriddedValues values = table.values("q", StepKind.INTERVAL);
            double[] target = new double[3];
            values.read(0, 0, new Window(0, 0, 1, 1), target, 0);
            values.read(9, 59, new Window(999, 999, 1, 1), target, 1);
            values.read(4, 29, new Window(499, 499, 1, 1), target, 2);
            assertThat(target).containsExactly(1, 2, 3);
            assertThat(Runtime.getRuntime().maxMemory()).isLessThan(8L * 60 * 10_000_000);
        }
    }

    @Test
    void isGoneWhenClosed() {
        GriddedTable table = open("row,col,q\n1,1,1\n");
        GriddedValues values = table.values("q", StepKind.NONE);
        table.close();
        table.close();
        assertThat(folder.toFile().list()).containsExactly("t.csv");
        assertThatThrownBy(() -> plane(values, FRAME, 0, 0)).isInstanceOf(IllegalStateException.class);
    }
}
