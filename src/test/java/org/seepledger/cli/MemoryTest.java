package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Memory does not grow with the number of intervals: all values of the longer record would not fit into the heap. */
class MemoryTest {

    private static final int SIDE = 160;
    private static final int HEAP_MEGABYTES = 24;

    @TempDir
    Path folder;

    private static double value(int interval, int row, int column) {
        return (1 + interval % 5 + row % 7 + column % 3) / 1024.0;
    }

    @ParameterizedTest
    @CsvSource({"6, raster", "60, raster", "6, table", "60, table"})
    void holdsInTheSameHeap(int intervals, String kind) throws InterruptedException {
        boolean raster = kind.equals("raster");
        AquiferFiles files = new AquiferFiles(folder)
                .with(
                        "grid",
                        "{'x': {'from': 0, 'step': 10, 'count': %1$d}, 'y': {'from': 0, 'step': 10, 'count': %1$d}}"
                                .formatted(SIDE))
                .with("layers", "[{'top': 10, 'bottom': 0}]")
                .with(
                        "times",
                        IntStream.rangeClosed(0, intervals)
                                .mapToObj(String::valueOf)
                                .collect(Collectors.joining(",", "[", "]")))
                .with("flow/z", "0")
                .prism(
                        "p",
                        "",
                        "'type': 'Polygon', 'coordinates': [[[15,15],[1580,15],[1580,1580],[15,1580],[15,15]]]");
        for (String component : List.of("x", "y")) {
            if (raster) {
                files.with("flow/" + component, "{'file': 'q" + component + ".tif', 'band': 'interval'}");
                files.file("q" + component + ".tif", raster(intervals));
            } else {
                files.with("flow/" + component, "{'file': 'q.csv', 'column': 'q" + component + "'}");
            }
        }
        if (!raster) {
            files.file("q.csv", table(intervals));
        }
        files.write();
        Ran ran = new ChildJvm(
                        folder,
                        List.of("-Xmx" + HEAP_MEGABYTES + "m"),
                        List.of(
                                "balance",
                                files.aquifer().toString(),
                                "--prisms",
                                files.prisms().toString(),
                                "--out",
                                files.out().toString(),
                                "--threads",
                                "2"))
                .ended();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.status()).isZero();
    }

    private static byte[] raster(int intervals) {
        TinyTiff raster = new TinyTiff(SIDE, SIDE);
        for (int interval = 0; interval < intervals; interval++) {
            int step = interval;
            raster.band((row, column) -> value(step, row, column));
        }
        return raster.bytes();
    }

    private static String table(int intervals) {
        StringBuilder table = new StringBuilder("row,col,interval,qx,qy\n");
        for (int interval = 0; interval < intervals; interval++) {
            for (int cell = 0; cell < SIDE * SIDE; cell++) {
                double value = value(interval, cell / SIDE, cell % SIDE);
                table.append(cell / SIDE + 1)
                        .append(',')
                        .append(cell % SIDE + 1)
                        .append(',')
                        .append(interval + 1);
                table.append(',').append(value).append(',').append(value).append('\n');
            }
        }
        return table.toString();
    }
}
