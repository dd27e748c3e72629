package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Window;

/** Every layout that GDAL writes and users meet: the values are those of the formulas, exactly. */
class GeoTiffLayoutTest {

    @ParameterizedTest
    @CsvSource({
        "uint8, uint8",
        "int8, int8",
        "int16, signed",
        "uint16, uint16",
        "int32, signed",
        "uint32, uint32",
        "float32, real",
        "float64, real",
        "float32-LZW-strips, real",
        "float32-DEFLATE-strips, real",
        "float32-PACKBITS-strips, real",
        "float32-ZSTD-strips, real",
        "float64-tiles, real",
        "float64-LZW-tiles, real",
        "float64-DEFLATE-tiles, real",
        "float64-PACKBITS-tiles, real",
        "float64-ZSTD-tiles, real",
        "int16-LZW-predictor2, signed",
        "int16-DEFLATE-predictor2, signed",
        "int16-ZSTD-predictor2, signed",
        "uint8-LZW-predictor2, uint8",
        "uint32-DEFLATE-predictor2, uint32",
        "float32-LZW-predictor2, real",
        "float32-DEFLATE-predictor2, real",
        "float32-ZSTD-predictor2, real",
        "float64-DEFLATE-predictor2, real",
        "float32-LZW-predictor3, real",
        "float32-DEFLATE-predictor3, real",
        "float32-ZSTD-predictor3, real",
        "float64-LZW-predictor3, real",
        "float64-DEFLATE-predictor3, real",
        "float64-ZSTD-predictor3, real",
        "float64-big-endian, real",
        "int16-big-endian-predictor2, signed",
        "float64-bigtiff, real",
        "float64-bigtiff-big-endian, real",
        "overviews, real",
    })
    void readsEachLayoutExactly(String file, String formula) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            assertThat(raster.rows()).isEqualTo(Samples.ROWS);
            assertThat(raster.columns()).isEqualTo(Samples.COLUMNS);
            assertThat(raster.bands()).isEqualTo(1);
            assertReads(raster, 0, Samples.formula(formula));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"bands-pixel", "bands-band", "bands-pixel-predictor3", "bands-band-tiles"})
    void readsBandsInBothArrangements(String file) throws IOException {
        assertReadsThreeBands(file, Samples.REAL);
    }

    @Test
    void readsBandsOfIntegersPredictedAcrossTiles() throws IOException {
        assertReadsThreeBands("bands-pixel-tiles-predictor2", Samples.formula("whole"));
    }

    private static void assertReadsThreeBands(String file, Samples.Formula first) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            assertThat(raster.bands()).isEqualTo(3);
            for (int band = 0; band < 3; band++) {
                double more = 10_000.0 * band;
                assertReads(raster, band, (r, c) -> first.at(r, c) + more);
            }
        }
    }

    /** The 200 × 200 cells fill LZW's table of codes several times; the cloud-optimised file has overviews before the image. */
    @ParameterizedTest
    @ValueSource(strings = {"cog", "large-LZW"})
    void readsTheFullImageOfALargeFile(String file) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            assertThat(raster.rows()).isEqualTo(200);
            assertReads(raster, 0, Samples.REAL);
            assertReads(raster, 0, Samples.REAL, new Window(120, 100, 20, 90));
        }
    }

    private static void assertReads(GeoTiff raster, int band, Samples.Formula formula) {
        assertReads(raster, band, formula, new Window(0, 0, raster.rows(), raster.columns()));
        assertReads(raster, band, formula, new Window(3, 14, 15, 20));
        assertReads(raster, band, formula, new Window(raster.rows() - 1, 0, 1, raster.columns()));
        assertReads(raster, band, formula, new Window(0, raster.columns() - 1, raster.rows(), 1));
        assertReads(raster, band, formula, new Window(17, 33, 1, 1));
    }

    private static void assertReads(GeoTiff raster, int band, Samples.Formula formula, Window window) {
        assertThat(Samples.read(raster, band, window)).isEqualTo(Samples.expected(formula, window));
    }

    @Test
    void leavesTheRestOfTheTargetAlone() throws IOException {
        try (GeoTiff raster = Samples.open("float64-tiles")) {
            double[] target = new double[8];
            raster.read(0, new Window(2, 3, 2, 2), target, 3);
            assertThat(target).containsExactly(0, 0, 0, 203.25, 204.25, 303.25, 304.25, 0);
        }
    }

    @Test
    void refusesWhatIsNotInTheRaster() throws IOException {
        try (GeoTiff raster = Samples.open("float64")) {
            double[] target = new double[100];
            assertThatThrownBy(() -> raster.read(1, new Window(0, 0, 1, 1), target, 0))
                    .isInstanceOf(IndexOutOfBoundsException.class);
            assertThatThrownBy(() -> raster.read(0, new Window(22, 0, 2, 1), target, 0))
                    .isInstanceOf(IndexOutOfBoundsException.class);
            assertThatThrownBy(() -> raster.read(0, new Window(0, 30, 1, 8), target, 0))
                    .isInstanceOf(IndexOutOfBoundsException.class);
            assertThatThrownBy(() -> raster.read(0, new Window(0, 0, 1, 8), target, 95))
                    .isInstanceOf(IndexOutOfBoundsException.class);
        }
    }
}
