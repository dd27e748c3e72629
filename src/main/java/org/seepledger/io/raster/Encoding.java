package org.seepledger.io.raster;

import java.util.Arrays;
import java.util.Optional;
import org.seepledger.fault.DataFault;

/**
 * How samples are written: what they are, how they are packed and what was done to them before.
 *
 * @param sample what a stored value is
 * @param compression how blocks are packed
 * @param predictor what was done to a row before packing
 */
record Encoding(SampleType sample, Compression compression, Predictor predictor) {

    private static final int COMPLEX = 5;
    private static final int YCBCR = 6;
    private static final int UNSIGNED = 1;
    private static final int UNDEFINED = 4;
    private static final String REWRITE =
            "Write it again, for instance with gdal_translate -co COMPRESS=DEFLATE -co PREDICTOR=1";

    /**
     * Reads the encoding of an image.
     *
     * @throws DataFault if it cannot be read here
     */
    static Encoding of(TiffDirectory directory) {
        SampleType sample = sample(directory);
        Compression compression = compression(directory);
        refuseRearranged(directory);
        return new Encoding(sample, compression, predictor(directory, sample, compression));
    }

    private static SampleType sample(TiffDirectory directory) {
        long bits = common(directory, Tag.BITS_PER_SAMPLE, 1);
        long declared = common(directory, Tag.SAMPLE_FORMAT, UNSIGNED);
        long format = declared == UNDEFINED ? UNSIGNED : declared;
        Optional<SampleType> type = SampleType.of(format, bits);
        String kind = format == UNSIGNED ? "unsigned" : format == 2 ? "signed" : format == 3 ? "real" : "complex";
        return type.orElseThrow(() -> refused(
                directory,
                bits + "-bit " + (format <= COMPLEX + 1 ? kind : "unknown") + " samples",
                "integers of 8, 16 or 32 bits or reals of 32 or 64 bits",
                REWRITE + " -ot Float64."));
    }

    private static long common(TiffDirectory directory, Tag tag, long otherwise) {
        long[] values = directory.integers(tag);
        long first = values.length == 0 ? otherwise : values[0];
        if (Arrays.stream(values).anyMatch(value -> value != first)) {
            throw refused(
                    directory,
                    "bands of different kinds (" + tag + ")",
                    "the same kind of samples in all bands",
                    REWRITE + " -ot Float64.");
        }
        return first;
    }

    private static Compression compression(TiffDirectory directory) {
        long code = directory.integer(Tag.COMPRESSION, Compression.NONE.code());
        return Compression.of(code)
                .orElseThrow(() -> refused(
                        directory,
                        Compression.name(code) + " compression (code " + code + ")",
                        "no compression, DEFLATE, LZW, PackBits or ZSTD",
                        REWRITE + "."));
    }

    private static Predictor predictor(TiffDirectory directory, SampleType sample, Compression compression) {
        if (!compression.predicts()) {
            return Predictor.NONE;
        }
        long code = directory.integer(Tag.PREDICTOR, 1);
        return Predictor.of(code)
                .filter(predictor -> predictor != Predictor.FLOATING || sample.isReal())
                .filter(predictor -> predictor == Predictor.NONE || sample != SampleType.BIT)
                .orElseThrow(() -> refused(
                        directory,
                        "predictor " + code + " on " + sample + " samples",
                        "predictor 1 or 2, or 3 for reals",
                        REWRITE + "."));
    }

    private static void refuseRearranged(TiffDirectory directory) {
        if (directory.integer(Tag.PHOTOMETRIC_INTERPRETATION, 1) == YCBCR) {
            throw refused(
                    directory, "colours (YCbCr)", "plain values", "Use the raster of values, not a picture of it.");
        }
        if (directory.integer(Tag.FILL_ORDER, 1) > 1) {
            throw refused(directory, "bits in reverse order (fill order 2)", "fill order 1", REWRITE + ".");
        }
        if (directory.integer(Tag.ORIENTATION, 1) > 1) {
            throw refused(
                    directory,
                    "an orientation other than top left (" + Tag.ORIENTATION + ")",
                    "rows from the top, columns from the left",
                    "Remove the tag if the rows do run from the top, or write the raster again.");
        }
    }

    private static DataFault refused(TiffDirectory directory, String found, String expected, String remedy) {
        return directory.file().fault("", found, expected, remedy);
    }
}
