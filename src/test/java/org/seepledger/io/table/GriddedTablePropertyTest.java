package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.lifecycle.AfterProperty;
import net.jqwik.api.lifecycle.BeforeProperty;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Times;
import org.seepledger.fault.DataFault;

class GriddedTablePropertyTest {

    private static final String[] SEPARATORS = {",", ";", "\t"};
    private static final String[] LINE_ENDS = {"\n", "\r\n", "\r"};

    private Path folder;

    @BeforeProperty
    void makeFolder() throws IOException {
        folder = Files.createTempDirectory("tables");
    }

    @AfterProperty
    void removeFolder() throws IOException {
        Files.deleteIfExists(folder.resolve("t.csv"));
        Files.delete(folder);
    }

    @Property(tries = 150)
    void valuesInAnyOrderAndDialectReadBackExactly(@ForAll long seed) {
        Random random = new Random(seed);
        Grid grid =
                new Grid(axis(random, 5e5), axis(random, 5e6), random.nextBoolean() ? 0 : random.nextInt(720) / 2.0, 1);
        int layers = 1 + random.nextInt(3);
        int intervals = 1 + random.nextInt(4);
        double[] instants = new double[intervals + 1];
        Arrays.setAll(instants, i -> 10 * i);
        Frame frame = new Frame(grid, layers, new Times(instants, Tables.DAY, Optional.empty()));
        double[][][] values = new double[layers][intervals][grid.window().size()];
        String text = table(random, grid, values);
        try (GriddedTable table =
                GriddedTable.open(Tables.file(folder, text), "t", frame, Repeats.REFUSED, Below.REFUSED, folder)) {
            for (int layer = 0; layer < layers; layer++) {
                for (int step = 0; step < intervals; step++) {
                    double[] read = Tables.plane(table.values("q", StepKind.INTERVAL), frame, layer, step);
                    assertThat(read).containsExactly(values[layer][step]);
                }
            }
        }
    }

    private static Axis axis(Random random, double origin) {
        double[] edges = new double[2 + random.nextInt(6)];
        edges[0] = origin + random.nextInt(1_000);
        for (int i = 1; i < edges.length; i++) {
            edges[i] = edges[i - 1] + 10 + random.nextInt(90);
        }
        return Axis.of(edges);
    }

    /** Fills the values and writes them as shuffled lines in one of the dialects. */
    private static String table(Random random, Grid grid, double[][][] values) {
        String separator = SEPARATORS[random.nextInt(SEPARATORS.length)];
        String end = LINE_ENDS[random.nextInt(LINE_ENDS.length)];
        boolean comma = !separator.equals(",") && random.nextBoolean();
        boolean byCentre = random.nextBoolean();
        List<String> lines = new ArrayList<>();
        for (int layer = 0; layer < values.length; layer++) {
            for (int step = 0; step < values[layer].length; step++) {
                for (int cell = 0; cell < values[layer][step].length; cell++) {
                    double value = random.nextInt(10) == 0 ? Double.NaN : random.nextGaussian() * 1e-3;
                    values[layer][step][cell] = value;
                    if (!Double.isNaN(value) || random.nextBoolean()) {
                        String number = Double.isNaN(value) ? "" : Double.toString(value);
                        String line = place(grid, cell, byCentre) + "|" + (layer + 1) + "|" + (step + 1) + "|" + number;
                        lines.add(comma ? line.replace('.', ',') : line);
                    }
                }
            }
        }
        Collections.shuffle(lines, random);
        lines.add(lines.size() / 2, "# a note, between; lines");
        lines.add(0, (byCentre ? "x|y" : "row|col") + "|layer|interval|q [m/d]");
        String text = String.join(end, lines).replace("|", separator);
        return (random.nextBoolean() ? "\uFEFF" : "") + text + (random.nextBoolean() ? end : "");
    }

    private static String place(Grid grid, int cell, boolean byCentre) {
        int row = cell / grid.columns();
        int column = cell % grid.columns();
        if (!byCentre) {
            return (row + 1) + "|" + (column + 1);
        }
        int fromSouth = grid.rows() - 1 - row;
        double east = (grid.x().edge(column) + grid.x().edge(column + 1)) / 2;
        double north = (grid.y().edge(fromSouth) + grid.y().edge(fromSouth + 1)) / 2;
        double angle = Math.toRadians(grid.rotation());
        double x = grid.x().origin() + east * Math.cos(angle) - north * Math.sin(angle);
        double y = grid.y().origin() + east * Math.sin(angle) + north * Math.cos(angle);
        return x + "|" + y;
    }

    @Property(tries = 600)
    void whateverTheBytesOnlyADataFaultComesOut(@ForAll long seed) {
        Random random = new Random(seed);
        byte[] bytes = random.nextInt(4) == 0 ? garbage(random) : damaged(random);
        Path file = Tables.file(folder, bytes);
        Frame dated = new Frame(Tables.GRID, 2, Tables.DATED);
        checkFault(() -> readGridded(file));
        checkFault(() ->
                PointsTable.read(file, "t.csv", "wells", dated, Tables.METRE, Tables.CUBIC_METRE_A_DAY, warning -> {}));
        checkFault(() -> PeriodsTable.read(file, "t.csv", Tables.DATED, warning -> {}));
    }

    private static void checkFault(ThrowingCallable call) {
        Throwable thrown = catchThrowable(call);
        if (thrown != null) {
            assertThat(thrown).isInstanceOf(DataFault.class);
            assertThat(thrown.getMessage()).startsWith("t.csv").hasSizeLessThan(1_500);
        }
    }

    private void readGridded(Path file) {
        try (GriddedTable table =
                GriddedTable.open(file, "t.csv", Tables.FRAME, Repeats.REFUSED, Below.REFUSED, folder)) {
            for (String column : table.columns()) {
                table.unit(column);
                Tables.plane(table.values(column, StepKind.INTERVAL), Tables.FRAME, 1, 2);
            }
        }
    }

    private static byte[] garbage(Random random) {
        byte[] bytes = new byte[random.nextInt(300)];
        random.nextBytes(bytes);
        return bytes;
    }

    private static byte[] damaged(Random random) {
        String[] sound = {
            "x,y,layer,interval,q [m/d]\n105,230,1,1,5\n115,230,1,2,6\n#n\n105,210,2,3,\n",
            "row;col;instant;h\n1;1;0;1,5\n2;3;1;1e2\n",
            "name,x,y,layer,from,to,rate [m3/d]\nA,105,230,1,2021-10-01,2021-10-31,-5\nB,115,230,2,,,3\n",
            "name\tfrom\tto\none\t0\t30\ntwo\t2021-10-05\t2021-12-01T12:00\n"
        };
        byte[] bytes = sound[random.nextInt(sound.length)].getBytes(StandardCharsets.UTF_8);
        String signs = ",;\t\"\n\r#[].-+eE0123456789xyT\u0000\u00ff ";
        for (int i = random.nextInt(5); i >= 0; i--) {
            bytes[random.nextInt(bytes.length)] = (byte) signs.charAt(random.nextInt(signs.length()));
        }
        return Arrays.copyOf(bytes, bytes.length - random.nextInt(bytes.length / 2));
    }
}
