package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/** Files that are not what they should be give a {@link DataFault}, never zeros, another exception or a full memory. */
@Timeout(20)
class DamagedGeoTiffTest {

    @TempDir
    Path folder;

    private static void readAll(Path file) throws IOException {
        try (GeoTiff raster = GeoTiff.open(file, "damaged.tif")) {
            for (int band = 0; band < Math.min(raster.bands(), 4); band++) {
                for (int row = 0; row < Math.min(raster.rows(), 500); row++) {
                    Window line = new Window(row, 0, 1, Math.min(raster.columns(), 5000));
                    raster.read(band, line, new double[line.size()], 0);
                }
            }
        }
    }

    private static void assertFault(Path file, String... parts) {
        assertThatThrownBy(() -> readAll(file))
                .isInstanceOf(DataFault.class)
                .hasMessageStartingWith("damaged.tif")
                .message()
                .satisfies(message -> assertThat(List.of(parts)).allMatch(message::contains));
    }

    @Test
    void refusesAMissingFileAndAFolder() {
        assertFault(folder.resolve("none.tif"), "no such file");
        assertFault(folder, "no such file");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "II", "ncols 37\nnrows 23\n", "II*\0", "II+\0\u0004\0\0\0--------", "MM\0*\0\0\0\0"})
    void refusesWhatIsNoTiff(String content) throws IOException {
        Path file = folder.resolve("damaged.tif");
        Files.write(file, content.getBytes(StandardCharsets.ISO_8859_1));
        assertFault(file);
    }

    @Test
    void refusesTextWithARemedy() throws IOException {
        Path file = Files.writeString(folder.resolve("damaged.tif"), "ncols 37\nnrows 23\n");
        assertFault(file, "no TIFF header", "gdal_translate");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "float64", "float64-tiles", "float32-LZW-strips", "float32-DEFLATE-strips", "float32-PACKBITS-strips",
                "float32-ZSTD-strips", "float64-DEFLATE-tiles", "bands-band", "bands-pixel", "float64-bigtiff",
                "float64-bigtiff-big-endian", "int16-LZW-predictor2"
            })
    void refusesAFileCutShortAnywhere(String sample) throws IOException {
        byte[] whole = Files.readAllBytes(Samples.path(sample));
        for (int length = 0; length < whole.length - 1; length += 1 + whole.length / 97) {
            Path file = Files.write(folder.resolve("damaged.tif"), Arrays.copyOf(whole, length));
            assertFault(file);
        }
    }

    /** Libraries that fill up with zeros would give a budget of zeros here. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "int16-LZW-predictor2",
                "int16-DEFLATE-predictor2",
                "int16-ZSTD-predictor2",
                "uint8-LZW-predictor2"
            })
    void refusesABlockThatDoesNotUnpackToItsFullLength(String sample) throws IOException {
        TiffBytes bytes = TiffBytes.of(sample);
        long count = bytes.get(Tag.STRIP_BYTE_COUNTS);
        assertFault(bytes.set(Tag.STRIP_BYTE_COUNTS, count - count / 3).in(folder), "rows 1 to 23", "do not unpack");
    }

    @Test
    void refusesAPlainBlockThatIsTooShort() throws IOException {
        long count = TiffBytes.of("float64").get(Tag.STRIP_BYTE_COUNTS);
        TiffBytes bytes = TiffBytes.of("float64").set(Tag.STRIP_BYTE_COUNTS, count - 8);
        assertFault(bytes.in(folder), count - 8 + " bytes for " + count);
    }

    @Test
    void refusesADamagedCheckSum() throws IOException {
        TiffBytes bytes = TiffBytes.of("int16-DEFLATE-predictor2");
        long end = bytes.get(Tag.STRIP_OFFSETS) + bytes.get(Tag.STRIP_BYTE_COUNTS);
        bytes.bytes()[(int) end - 1] ^= 1;
        assertFault(bytes.in(folder), "do not unpack");
    }

    @ParameterizedTest
    @CsvSource({
        "IMAGE_WIDTH, 0, 0 columns",
        "IMAGE_WIDTH, 38, '6808 bytes for 6992 unpacked'",
        "IMAGE_WIDTH, 3000000000, 3000000000 columns",
        "IMAGE_WIDTH, 100000000, 2300000000 cells in a band (23 rows × 100000000 columns)",
        "IMAGE_WIDTH, 50000000, bytes in a row of a strip",
        "IMAGE_LENGTH, 0, 0 rows",
        "IMAGE_LENGTH, 24, 'for 24 rows × 37 columns'",
        "IMAGE_LENGTH, 50000000, strips or tiles",
        "SAMPLES_PER_PIXEL, 0, 0 bands",
        "SAMPLES_PER_PIXEL, 70000, 70000 bands",
        "SAMPLES_PER_PIXEL, 65536, 6808 bytes for",
        "BITS_PER_SAMPLE, 128, 128-bit real samples",
        "SAMPLE_FORMAT, 6, 64-bit complex samples",
        "SAMPLE_FORMAT, 2, 64-bit signed samples",
        "COMPRESSION, 7, JPEG",
        "COMPRESSION, 4711, unknown compression (code 4711)",
        "COMPRESSION, 8, do not unpack",
        "COMPRESSION, 5, do not unpack",
        "COMPRESSION, 50000, do not unpack",
        "PHOTOMETRIC_INTERPRETATION, 6, YCbCr",
        "STRIP_OFFSETS, 4000000000, 6808 bytes declared at byte 4000000000",
        "STRIP_BYTE_COUNTS, 4000000000, 4000000000 bytes declared",
        "STRIP_BYTE_COUNTS, 0, 0 bytes for 6808",
    })
    void refusesDeclarationsThatCannotBe(Tag tag, long value, String message) throws IOException {
        assertFault(TiffBytes.of("float64").set(tag, value).in(folder), message);
    }

    @ParameterizedTest
    @CsvSource({
        "float64-DEFLATE-tiles, TILE_WIDTH, 0, 0 tile columns",
        "float64-DEFLATE-tiles, TILE_WIDTH, 2147483647, bytes in a row of a strip or tile",
        "float64-DEFLATE-tiles, TILE_LENGTH, 2147483647, 6 places and 6 lengths of strips or tiles",
        "int16-LZW-predictor2, PREDICTOR, 3, predictor 3 on int16",
        "float64-DEFLATE-predictor2, PREDICTOR, 34892, predictor 34892 on float64",
    })
    void refusesBlocksThatCannotBeRead(String sample, Tag tag, long value, String message) throws IOException {
        assertFault(TiffBytes.of(sample).set(tag, value).in(folder), message);
    }

    @ParameterizedTest
    @CsvSource({"ORIENTATION, 4, orientation", "FILL_ORDER, 2, fill order 2"})
    void refusesRearrangedImages(Tag tag, long value, String message) throws IOException {
        TiffBytes bytes = TiffBytes.of("float64").rename(Tag.PLANAR_CONFIGURATION, tag);
        assertFault(bytes.set(tag, value).in(folder), message);
    }

    @Test
    void refusesABombBeforeItUnpacks() throws IOException {
        TiffBytes bytes = TiffBytes.of("int16-DEFLATE-predictor2")
                .set(Tag.IMAGE_LENGTH, 20_000_000)
                .set(Tag.ROWS_PER_STRIP, 20_000_000);
        assertFault(bytes.in(folder), "bytes for 1480000000 unpacked ones");
    }

    @Test
    void refusesFieldsThatReachBeyondTheFileOrGoRoundInACircle() throws IOException {
        assertFault(
                TiffBytes.of("float64-tiles")
                        .setPlace(Tag.TILE_OFFSETS, 4_000_000_000L)
                        .in(folder),
                "declared at");
        assertFault(
                TiffBytes.of("float64-tiles")
                        .setCount(Tag.TILE_OFFSETS, 4_000_000_000L)
                        .in(folder),
                "values of type");
        assertFault(
                TiffBytes.of("float64-tiles")
                        .setCount(Tag.TILE_OFFSETS, 2_000_000L)
                        .in(folder),
                "declared at");
        assertFault(TiffBytes.of("float64").linkToItself().in(folder), "circle");
    }

    @Test
    void refusesGeoreferencesWithoutSense() throws IOException {
        assertFault(
                TiffBytes.of("float64").setReal(Tag.MODEL_PIXEL_SCALE, 1, -40).in(folder), "two ways");
        assertFault(TiffBytes.of("float64").setReal(Tag.MODEL_PIXEL_SCALE, 1, 0).in(folder), "without extent");
        assertFault(
                TiffBytes.of("float64")
                        .setReal(Tag.MODEL_TIEPOINT, 3, Double.NaN)
                        .in(folder),
                "without extent");
        assertFault(
                TiffBytes.of("float64").setReal(Tag.MODEL_PIXEL_SCALE, 0, -50).in(folder), "mirrored");
    }

    @Test
    void refusesNodataAndScalesThatAreNoNumbers() throws IOException {
        assertFault(
                TiffBytes.of("nodata-float64").setText(Tag.GDAL_NODATA, "none").in(folder), "\"none\"");
        byte[] scaled = TiffBytes.of("scaled").bytes();
        assertFault(replaced(scaled, ">0.01", ">0.o1"), "band 1", "scale \"0.o1");
        assertFault(replaced(scaled, ">0.0100000000000000002", ">0.0000000000000000000"), "other than 0");
        assertFault(replaced(scaled, "sample=\"0\"", "sample=\"9\""), "band index \"9\"");
        assertFault(replaced(scaled, "</GDALMetadata>", "</GDALMetadat!>"), "XML that cannot be read");
        assertFault(replaced(scaled, ">0.01", ">&xx;"), "XML that cannot be read");
    }

    private Path replaced(byte[] bytes, String from, String to) throws IOException {
        String text = new String(bytes, StandardCharsets.ISO_8859_1);
        assertThat(text).contains(from);
        byte[] changed = text.replace(from, to).getBytes(StandardCharsets.ISO_8859_1);
        return Files.write(folder.resolve("damaged.tif"), changed);
    }

    @ParameterizedTest
    @CsvSource({
        "refused-complex, 128-bit complex samples",
        "refused-lerc, LERC compression (code 34887)",
        "refused-jpeg, JPEG compression",
        "refused-4-bit, 4-bit unsigned samples",
        "refused-float16, 16-bit real samples",
        "refused-int64, 64-bit signed samples",
    })
    void refusesEncodingsThatAreNotReadWithARemedy(String sample, String message) {
        assertThatThrownBy(() -> Samples.open(sample))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining(message)
                .hasMessageContaining("COMPRESS=DEFLATE");
    }

    /** One to three bytes changed, several hundred times, seeds fixed: values may differ, but only a fault may be thrown. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "int16-LZW-predictor2",
                "int16-DEFLATE-predictor2",
                "int16-ZSTD-predictor2",
                "uint8",
                "scaled",
                "float32-PACKBITS-strips",
                "sparse",
                "masked",
                "bands-pixel-tiles-predictor2",
                "float64-bigtiff",
                "turned"
            })
    void survivesChangedBytes(String sample) throws IOException {
        byte[] whole = Files.readAllBytes(Samples.path(sample));
        Random random = new Random(sample.hashCode());
        for (int round = 0; round < 250; round++) {
            byte[] changed = whole.clone();
            for (int i = random.nextInt(3); i >= 0; i--) {
                // Most of the structure stands in the first bytes.
                int reach = random.nextBoolean() ? Math.min(400, changed.length) : changed.length;
                changed[random.nextInt(reach)] = (byte) random.nextInt(256);
            }
            Path file = Files.write(folder.resolve("damaged.tif"), changed);
            assertThatCode(() -> readOrFault(file)).as("round " + round).doesNotThrowAnyException();
        }
    }

    private static void readOrFault(Path file) throws IOException {
        try {
            readAll(file);
        } catch (DataFault expected) {
            assertThat(expected).hasMessageStartingWith("damaged.tif");
        }
    }
}
