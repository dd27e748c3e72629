package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Window;

/** Where there is no value, and what is done to those that there are. */
class GeoTiffValuesTest {

    private static final Window ALL = new Window(0, 0, Samples.ROWS, Samples.COLUMNS);

    @ParameterizedTest
    @ValueSource(strings = {"nodata-float64", "nodata-lowest", "nodata-nan", "nodata-rounded", "masked"})
    void realsHaveNoValueWhereDeclaredOrHidden(String file) throws IOException {
        assertReads(file, Samples.withHoles(Samples.REAL));
    }

    @Test
    void integersHaveNoValueWhereDeclared() throws IOException {
        assertReads("nodata-int16", Samples.withHoles(Samples.formula("whole")));
        assertReads("nodata-uint8", Samples.withHoles((r, c) -> (7 * r + 3 * c) % 250 + 1));
    }

    @Test
    void appliesScaleAndOffset() throws IOException {
        assertReads("scaled", (r, c) -> (100.0 * r + c - 1000) * 0.01 + 5);
        assertReads("scaled-nodata", Samples.withHoles((r, c) -> (100.0 * r + c) * 0.01 + 5));
    }

    @Test
    void givesStoredValuesBeforeScaleAndOffset() throws IOException {
        try (GeoTiff raster = Samples.open("scaled-nodata")) {
            double[] stored = new double[ALL.size()];
            raster.readStored(0, ALL, stored, 0);
            assertThat(stored).isEqualTo(Samples.expected(Samples.withHoles(Samples.formula("whole")), ALL));
            assertThat(raster.scale(0)).isEqualTo(0.01);
            assertThat(raster.offset(0)).isEqualTo(5);
        }
    }

    @Test
    void blocksLeftOutOfASparseFileHaveNoValue() throws IOException {
        assertReads("sparse", (r, c) -> r < 16 && c >= 16 ? Samples.REAL.at(r, c) : Double.NaN);
    }

    @Test
    void blocksLeftOutOfASparseFileWithoutNodataAreZero() throws IOException {
        assertReads("sparse-zero", (r, c) -> 0);
    }

    private static void assertReads(String file, Samples.Formula formula) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            assertThat(Samples.readAll(raster, 0)).isEqualTo(Samples.expected(formula, ALL));
            Window part = new Window(5, 9, 14, 21);
            assertThat(Samples.read(raster, 0, part)).isEqualTo(Samples.expected(formula, part));
        }
    }
}
