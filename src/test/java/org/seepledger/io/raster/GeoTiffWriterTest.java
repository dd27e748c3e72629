package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/** What is written reads back; what another program makes of it is tested in {@link GdalAgreementTest}. */
class GeoTiffWriterTest {

    /** No multiples of a tile, values in full precision, and some missing. */
    static final Samples.Formula FORMULA = (r, c) -> (r + 2 * c) % 11 == 0 ? Double.NaN : Math.sqrt(1000.0 * r + c) - 7;

    private static final Grid LARGE = new Grid(Axis.even(500_000, 25, 600), Axis.even(5_200_000, 10, 300), 0, 1);

    @TempDir
    Path folder;

    static IntFunction<double[]> rows(Window window) {
        return row -> Samples.expected(FORMULA, new Window(row, window.column(), 1, window.columns()));
    }

    private Path write(Grid grid, Window window, String crs) throws IOException {
        Path file = folder.resolve("written.tif");
        GeoTiffWriter.write(file, grid, window, Optional.ofNullable(crs), rows(window));
        return file;
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void readsBackExactlyAsClassicAndBigTiff(boolean big) throws IOException {
        Path file = folder.resolve("written.tif");
        Window all = LARGE.window();
        GeoTiffWriter.write(file, LARGE, all, Optional.of("EPSG:32633"), rows(all), big);
        assertThat(Files.readAllBytes(file)[2]).isEqualTo((byte) (big ? 43 : 42));
        try (GeoTiff raster = GeoTiff.open(file, "written.tif")) {
            assertThat(Samples.readAll(raster, 0)).isEqualTo(Samples.expected(FORMULA, all));
            assertThat(raster.georeference()).contains(Georeference.of(LARGE, Optional.of("EPSG:32633")));
            assertThat(GridMatch.check(raster, LARGE)).isEmpty();
        }
    }

    @Test
    void writesAPartOfTheGridInItsPlace() throws IOException {
        Window part = new Window(20, 300, 270, 290);
        try (GeoTiff raster = GeoTiff.open(write(LARGE, part, null), "written.tif")) {
            assertThat(Samples.readAll(raster, 0)).isEqualTo(Samples.expected(FORMULA, part));
            Georeference place = raster.georeference().orElseThrow();
            assertThat(place.crs()).isEmpty();
            assertThat(place.mapX(0, 0)).isEqualTo(500_000 + 300 * 25);
            assertThat(place.mapY(0, 0)).isEqualTo(5_203_000 - 20 * 10);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {30, -75.5, 90, 180, 213})
    void writesATurnedGrid(double rotation) throws IOException {
        Grid grid = new Grid(Axis.even(500_000, 50, 37), Axis.even(5_199_080, 40, 23), rotation, 1);
        try (GeoTiff raster = GeoTiff.open(write(grid, grid.window(), "EPSG:32633"), "written.tif")) {
            assertThat(GridMatch.check(raster, grid)).isEmpty();
            Grid back = raster.grid(1);
            assertThat(Math.cos(Math.toRadians(back.rotation() - rotation))).isCloseTo(1, within(1e-12));
            assertThat(back.x().origin()).isCloseTo(500_000, within(1e-7));
            assertThat(back.y().origin()).isCloseTo(5_199_080, within(1e-7));
            assertThat(Samples.read(raster, 0, new Window(1, 2, 1, 1))).containsExactly(FORMULA.at(1, 2));
        }
    }

    @Test
    void writesAnUnevenGridWithoutAPlace() throws IOException {
        Grid uneven = new Grid(Axis.of(0, 10, 30, 70), Axis.even(0, 5, 2), 0, 1);
        try (GeoTiff raster = GeoTiff.open(write(uneven, uneven.window(), "EPSG:32633"), "written.tif")) {
            assertThat(raster.georeference()).isEmpty();
            assertThat(GridMatch.check(raster, uneven)).isPresent();
        }
    }

    @Test
    void writesWktWhereThereIsNoCode() throws IOException {
        String wkt = "PROJCS[\"Invented\",GEOGCS[\"G\",DATUM[\"D\",SPHEROID[\"S\",6377397.155,299.1528128]],"
                + "PRIMEM[\"Greenwich\",0],UNIT[\"Degree\",0.0174532925199433]],PROJECTION[\"Transverse_Mercator\"],"
                + "PARAMETER[\"Central_Meridian\",11],PARAMETER[\"Latitude_Of_Origin\",0],PARAMETER[\"Scale_Factor\",1],"
                + "PARAMETER[\"False_Easting\",5000],PARAMETER[\"False_Northing\",0],UNIT[\"Meter\",1]]";
        try (GeoTiff raster = GeoTiff.open(write(Samples.GRID, Samples.GRID.window(), wkt), "written.tif")) {
            assertThat(raster.georeference().orElseThrow().crs()).contains(wkt);
        }
    }

    @Test
    void replacesAnOlderFile() throws IOException {
        write(LARGE, LARGE.window(), null);
        Path file = write(LARGE, new Window(0, 0, 1, 1), null);
        assertThat(Files.size(file)).isLessThan(4000);
    }
}
