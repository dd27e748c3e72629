package org.seepledger.io.raster;

import io.airlift.compress.zstd.ZstdDecompressor;
import java.util.Arrays;
import java.util.Optional;
import java.util.zip.DataFormatException;
import java.util.zip.Inflater;

/** How the bytes of a block are packed. Lossy ones are left out on purpose. */
enum Compression {
    NONE(1, 1, false),
    /** A code of at least 9 bits stands for at most the 4096 bytes of the longest string. */
    LZW(5, 4096, true),
    /** A match of 258 bytes takes at least two bits. */
    DEFLATE(8, 1032, true),
    /** The code from before DEFLATE had one of its own. */
    ADOBE_DEFLATE(32946, 1032, true),
    /** Two bytes repeat one at most 128 times. */
    PACKBITS(32773, 64, false),
    /** Four bytes repeat one for a block of 128 KiB. */
    ZSTD(50000, 1 << 15, true);

    private final int code;
    private final int greatestRatio;
    private final boolean predicts;

    Compression(int code, int greatestRatio, boolean predicts) {
        this.code = code;
        this.greatestRatio = greatestRatio;
        this.predicts = predicts;
    }

    static Optional<Compression> of(long code) {
        return Arrays.stream(values())
                .filter(compression -> compression.code == code)
                .findFirst();
    }

    /** {@return what is known under the code of a compression that is not read here} */
    static String name(long code) {
        return switch ((int) code) {
            case 2, 3, 4 -> "CCITT";
            case 6, 7 -> "JPEG";
            case 34712 -> "JPEG 2000";
            case 34887 -> "LERC";
            case 34925 -> "LZMA";
            case 50001 -> "WebP";
            case 50002 -> "JPEG XL";
            default -> "unknown";
        };
    }

    int code() {
        return code;
    }

    /** {@return whether a predictor may have been applied before packing} */
    boolean predicts() {
        return predicts;
    }

    /** {@return whether so few bytes can hold so many} */
    boolean canHold(long packed, long unpacked) {
        return unpacked <= packed * greatestRatio;
    }

    /**
     * Unpacks a block.
     *
     * @param packed the bytes in the file
     * @param target receives the block and is filled exactly
     * @throws DataFormatException if the bytes are damaged or do not fill the target
     */
    void unpack(byte[] packed, byte[] target) throws DataFormatException {
        int filled = switch (this) {
            case NONE -> copy(packed, target);
            case LZW -> new LzwDecoder(packed, target).decode();
            case DEFLATE, ADOBE_DEFLATE -> inflate(packed, target);
            case PACKBITS -> PackBits.decode(packed, target);
            case ZSTD -> decompress(packed, target);
        };
        if (filled < target.length) {
            throw new DataFormatException(filled + " of " + target.length + " bytes");
        }
    }

    private static int copy(byte[] packed, byte[] target) {
        int count = Math.min(packed.length, target.length);
        System.arraycopy(packed, 0, target, 0, count);
        return count;
    }

    private static int inflate(byte[] packed, byte[] target) throws DataFormatException {
        Inflater inflater = new Inflater();
        try {
            inflater.setInput(packed);
            int filled = inflater.inflate(target);
            if (filled == target.length && !inflater.finished()) {
                // The check sum stands behind the last byte and is only looked at when more is asked for.
                inflater.inflate(new byte[1]);
            }
            return filled;
        } finally {
            inflater.end();
        }
    }

    private static int decompress(byte[] packed, byte[] target) throws DataFormatException {
        try {
            return new ZstdDecompressor().decompress(packed, 0, packed.length, target, 0, target.length);
        } catch (RuntimeException e) {
            throw new DataFormatException(e.getMessage());
        }
    }
}
