package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Prism;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Surroundings;

/** Rasters keep bands, scales and stored values in some cells, and lose them in others. */
class RasterCutTest {

    @TempDir
    private Path folder;

    /** Columns 10 to 12 of rows 3 to 5, so that columns 9 to 13 of rows 2 to 6 stay. */
    private static Surroundings surroundings() {
        double west = 500_000 + 10 * 50;
        double north = 5_199_080 + 40 * (Samples.ROWS - 3);
        Prism prism = Prisms.of("a", 0, 0, west, north - 120, west + 150, north - 120, west + 150, north, west, north);
        return Surroundings.of(List.of(PrismCut.of(prism, Samples.GRID)), Samples.GRID);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"float64-tiles", "int16", "bands-pixel", "bands-band-tiles", "scaled", "scaled-nodata", "masked"
            })
    void keepsWhatIsStored(String name) throws IOException {
        Path copy = folder.resolve("copy.tif");
        Surroundings cells = surroundings();
        try (GeoTiff from = Samples.open(name)) {
            RasterCut.write(from, Samples.GRID, Optional.empty(), cells, copy);
            try (GeoTiff to = GeoTiff.open(copy, "copy.tif")) {
                assertThat(to.bands()).isEqualTo(from.bands());
                assertThat(GridMatch.check(to, Samples.GRID)).isEmpty();
                for (int band = 0; band < from.bands(); band++) {
                    assertThat(to.scale(band)).isEqualTo(from.scale(band));
                    assertThat(to.offset(band)).isEqualTo(from.offset(band));
                    assertSame(from, to, band);
                }
            }
        }
    }

    private static void assertSame(GeoTiff from, GeoTiff to, int band) {
        Window all = Samples.GRID.window();
        double[] before = new double[all.size()];
        double[] after = new double[all.size()];
        from.readStored(band, all, before, 0);
        to.readStored(band, all, after, 0);
        for (int row = 0; row < Samples.ROWS; row++) {
            for (int column = 0; column < Samples.COLUMNS; column++) {
                boolean kept = row >= 2 && row <= 6 && column >= 9 && column <= 13;
                Double expected = kept ? before[all.index(row, column)] : Double.NaN;
                assertThat(after[all.index(row, column)])
                        .as("row %d, column %d", row, column)
                        .isEqualTo(expected);
            }
        }
    }
}
