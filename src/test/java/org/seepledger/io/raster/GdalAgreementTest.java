package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.DoubleBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;

/** GDAL reads what is written here, and writes what is read here; skipped where GDAL's programs are not installed. */
class GdalAgreementTest {

    private static final Grid GRID = new Grid(Axis.even(500_000, 50, 300), Axis.even(5_199_080, 40, 270), 0, 1);

    @TempDir
    Path folder;

    @BeforeAll
    static void needsGdal() {
        assumeTrue(isInstalled(), "GDAL is not on the path");
    }

    private static boolean isInstalled() {
        try {
            return new ProcessBuilder("gdalinfo", "--version").start().waitFor() == 0;
        } catch (IOException e) {
            return false;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }

    private static String run(String... command) throws IOException, InterruptedException {
        ProcessBuilder builder = new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.DISCARD);
        Process process = builder.start();
        String output = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(process.waitFor()).as(String.join(" ", command)).isZero();
        return output;
    }

    private String written(Grid grid, Window window, String crs, boolean big) throws IOException {
        Path file = folder.resolve("written.tif");
        GeoTiffWriter.write(file, grid, window, Optional.ofNullable(crs), GeoTiffWriterTest.rows(window), big);
        return file.toString();
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void readsWhatIsWritten(boolean big) throws IOException, InterruptedException {
        Window window = new Window(3, 20, 262, 270);
        String file = written(GRID, window, "EPSG:32633", big);
        assertThat(run("gdalinfo", file))
                .contains(
                        "Size is 270, 262",
                        "Origin = (501000.000000000000000,5209760.000000000000000)",
                        "Pixel Size = (50.000000000000000,-40.000000000000000)",
                        "ID[\"EPSG\",32633]",
                        "Type=Float64",
                        "NoData Value=nan",
                        "AREA_OR_POINT=Area",
                        "COMPRESSION=DEFLATE")
                .doesNotContain("ERROR", "Warning");
        assertThat(valuesAsGdalReadsThem(file)).isEqualTo(Samples.expected(GeoTiffWriterTest.FORMULA, window));
    }

    /** Through a format of plain doubles, least significant byte first. */
    private double[] valuesAsGdalReadsThem(String file) throws IOException, InterruptedException {
        Path plain = folder.resolve("plain.bin");
        run("gdal_translate", "-q", "-of", "ENVI", file, plain.toString());
        DoubleBuffer values = ByteBuffer.wrap(Files.readAllBytes(plain))
                .order(ByteOrder.LITTLE_ENDIAN)
                .asDoubleBuffer();
        double[] all = new double[values.remaining()];
        values.get(all);
        return all;
    }

    @Test
    void readsATurnedGrid() throws IOException, InterruptedException {
        Grid turned = new Grid(Axis.even(500_000, 50, 37), Axis.even(5_199_080, 40, 23), 30, 1);
        String info = run("gdalinfo", written(turned, turned.window(), "EPSG:32633", false));
        // The affine of src/test/gdal/make-samples.sh, which was worked out apart.
        assertThat(info.replaceAll("\\s+", ""))
                .contains("GeoTransform=499540,43.3012701892", ",20", "5199876.74337148", ",25,-34.641016151377");
        assertThat(info).contains("Lower Left  (  500000.000, 5199080.000)");
    }

    @Test
    void readsWkt() throws IOException, InterruptedException {
        String wkt = "PROJCS[\"Invented\",GEOGCS[\"G\",DATUM[\"D\",SPHEROID[\"S\",6377397.155,299.1528128]],"
                + "PRIMEM[\"Greenwich\",0],UNIT[\"Degree\",0.0174532925199433]],PROJECTION[\"Transverse_Mercator\"],"
                + "PARAMETER[\"Central_Meridian\",11],PARAMETER[\"Latitude_Of_Origin\",0],PARAMETER[\"Scale_Factor\",1],"
                + "PARAMETER[\"False_Easting\",5000],PARAMETER[\"False_Northing\",0],UNIT[\"Meter\",1]]";
        String info = run("gdalinfo", written(Samples.GRID, Samples.GRID.window(), wkt, false));
        assertThat(info)
                .contains("Transverse Mercator", "\"Longitude of natural origin\",11", "\"False easting\",5000")
                .contains("6377397.155");
    }

    /** Two bands of its own making from what is written here, packed anew: large enough for many tiles and codes. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "COMPRESS=LZW PREDICTOR=3 TILED=YES INTERLEAVE=PIXEL",
                "COMPRESS=LZW PREDICTOR=2 BLOCKYSIZE=100 INTERLEAVE=BAND",
                "COMPRESS=DEFLATE PREDICTOR=3 ENDIANNESS=LITTLE TILED=YES INTERLEAVE=BAND",
                "COMPRESS=ZSTD PREDICTOR=2 BIGTIFF=YES INTERLEAVE=PIXEL",
                "COMPRESS=PACKBITS ENDIANNESS=BIG BLOCKYSIZE=33",
            })
    void isReadWhenItPacksAnew(String options) throws IOException, InterruptedException {
        String file = written(GRID, GRID.window(), "EPSG:32633", false);
        Path packed = folder.resolve("packed.tif");
        List<String> command = new ArrayList<>(List.of("gdal_translate", "-q", "-b", "1", "-b", "1"));
        for (String option : options.split(" ")) {
            command.addAll(List.of("-co", option));
        }
        command.addAll(List.of(file, packed.toString()));
        run(command.toArray(String[]::new));
        try (GeoTiff raster = GeoTiff.open(packed, "packed.tif")) {
            double[] expected = Samples.expected(GeoTiffWriterTest.FORMULA, GRID.window());
            assertThat(Samples.readAll(raster, 0)).isEqualTo(expected);
            assertThat(Samples.readAll(raster, 1)).isEqualTo(expected);
            assertThat(raster.georeference()).contains(Georeference.of(GRID, Optional.of("EPSG:32633")));
        }
    }
}
