package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/** Where samples lie; the places are those that src/test/gdal/make-samples.sh gave to GDAL. */
class GeoreferenceTest {

    private static final double TENTH_OF_A_MICROMETRE = 1e-7;

    @ParameterizedTest
    @ValueSource(
            strings = {
                "float64",
                "float64-tiles",
                "float64-big-endian",
                "float64-bigtiff",
                "pixel-is-point",
                "south-up",
                "overviews"
            })
    void liesOnTheGridWhateverTheFileTiesDown(String file) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            Georeference place = raster.georeference().orElseThrow();
            assertThat(place.crs()).contains("EPSG:32633");
            assertThat(place.mapX(0, 0)).isEqualTo(500_000);
            assertThat(place.mapY(0, 0)).isEqualTo(5_200_000);
            assertThat(place.mapX(Samples.COLUMNS, Samples.ROWS)).isEqualTo(501_850);
            assertThat(place.mapY(Samples.COLUMNS, Samples.ROWS)).isEqualTo(5_199_080);
            assertThat(GridMatch.check(raster, Samples.GRID)).isEmpty();
        }
    }

    @Test
    void turnsARasterStoredFromTheSouth() throws IOException {
        try (GeoTiff raster = Samples.open("south-up")) {
            Samples.Formula turned = (r, c) -> Samples.REAL.at(Samples.ROWS - 1 - r, c);
            Window all = Samples.GRID.window();
            Window part = new Window(4, 5, 8, 9);
            assertThat(Samples.read(raster, 0, all)).isEqualTo(Samples.expected(turned, all));
            assertThat(Samples.read(raster, 0, part)).isEqualTo(Samples.expected(turned, part));
            assertThat(Samples.read(raster, 0, new Window(0, 7, 1, 1))).containsExactly(turned.at(0, 7));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"turned", "turned-south-up", "turned-point"})
    void makesATurnedGrid(String file) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            Grid grid = raster.grid(1);
            assertThat(grid.rotation()).isCloseTo(30, within(1e-9));
            assertThat(grid.x().origin()).isCloseTo(500_000, within(TENTH_OF_A_MICROMETRE));
            assertThat(grid.y().origin()).isCloseTo(5_199_080, within(TENTH_OF_A_MICROMETRE));
            assertThat(grid.x().size(0)).isCloseTo(50, within(1e-9));
            assertThat(grid.y().size(0)).isCloseTo(40, within(1e-9));
            boolean southUp = file.endsWith("up");
            assertThat(Samples.read(raster, 0, new Window(0, 0, 1, 1)))
                    .containsExactly(Samples.REAL.at(southUp ? Samples.ROWS - 1 : 0, 0));
        }
    }

    @Test
    void makesAnEvenGridAndOneTurnedUpsideDown() throws IOException {
        try (GeoTiff raster = Samples.open("float64");
                GeoTiff half = Samples.open("half-turn")) {
            Grid grid = raster.grid(1);
            assertThat(grid.rotation()).isZero();
            assertThat(grid.x().origin()).isEqualTo(500_000);
            assertThat(grid.y().origin()).isEqualTo(5_199_080);
            assertThat(grid.columns()).isEqualTo(Samples.COLUMNS);
            assertThat(grid.rows()).isEqualTo(Samples.ROWS);
            assertThat(half.grid(1).rotation()).isEqualTo(180);
            assertThat(half.grid(1).mapX(50, 40)).isEqualTo(501_800);
            assertThat(Samples.read(half, 0, new Window(0, 0, 1, 1))).containsExactly(0.25);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "sheared, at right angles",
        "no-georeference, no georeference",
    })
    void refusesToMakeAGridOfWhatIsNone(String file, String message) throws IOException {
        try (GeoTiff raster = Samples.open(file)) {
            assertThatThrownBy(() -> raster.grid(1))
                    .isInstanceOf(DataFault.class)
                    .hasMessageContaining(file)
                    .hasMessageContaining(message);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "mirrored, mirrored raster",
        "control-points, control points",
    })
    void refusesPlacesThatWouldBeMisread(String file, String message) {
        assertThatThrownBy(() -> Samples.open(file))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining(file)
                .hasMessageContaining(message);
    }

    @Test
    void tellsTheCoordinateSystemOnlyWhereTheFileDoes() throws IOException {
        try (GeoTiff geographic = Samples.open("geographic");
                GeoTiff user = Samples.open("user-defined");
                GeoTiff none = Samples.open("no-georeference")) {
            assertThat(geographic.georeference().orElseThrow().crs()).contains("EPSG:4326");
            assertThat(user.georeference().orElseThrow().crs()).isEmpty();
            assertThat(none.georeference()).isEmpty();
        }
    }
}
