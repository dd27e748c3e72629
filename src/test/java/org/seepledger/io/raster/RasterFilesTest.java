package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/** Rasters kept open: few at a time, and never closed under those who read them. */
class RasterFilesTest {

    private static final Window CELL = new Window(2, 3, 1, 1);
    private static final String[] FILES = {"float64", "float32-LZW-strips", "float64-DEFLATE-tiles", "overviews"};

    private static GeoTiff open(RasterFiles files, String name) {
        return files.open(Samples.path(name), name);
    }

    @Test
    void opensAFileOnceAndKeepsTheLatest() throws IOException {
        try (RasterFiles files = new RasterFiles(2);
                GeoTiff first = open(files, "float64");
                GeoTiff second = open(files, "float32")) {
            open(files, "float64").close();
            open(files, "int16").close();
            try (GeoTiff firstAgain = open(files, "float64");
                    GeoTiff secondAgain = open(files, "float32")) {
                assertThat(firstAgain).isSameAs(first);
                assertThat(secondAgain).isNotSameAs(second);
            }
        }
    }

    @Test
    void leavesWhatIsHeldOpenUntilItIsGivenBack() throws IOException {
        RasterFiles files = new RasterFiles(1);
        GeoTiff held = open(files, "float64");
        open(files, "float32").close();
        files.close();
        assertThat(Samples.read(held, 0, CELL)).containsExactly(203.25);
        held.close();
        assertThatThrownBy(() -> Samples.read(held, 0, CELL)).isInstanceOf(DataFault.class);
    }

    @Test
    @Timeout(20)
    void readsFromManyThreadsMoreFilesThanAreKept() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try (RasterFiles files = new RasterFiles(2)) {
            List<Future<double[]>> read = new ArrayList<>();
            Window window = new Window(3, 5, 15, 30);
            for (int i = 0; i < 400; i++) {
                String name = FILES[i % FILES.length];
                read.add(threads.submit(() -> {
                    try (GeoTiff raster = open(files, name)) {
                        return Samples.read(raster, 0, window);
                    }
                }));
            }
            double[] expected = Samples.expected(Samples.REAL, window);
            for (Future<double[]> values : read) {
                assertThat(values.get()).isEqualTo(expected);
            }
        } finally {
            threads.shutdownNow();
        }
    }
}
