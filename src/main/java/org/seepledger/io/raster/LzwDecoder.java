package org.seepledger.io.raster;

import java.util.zip.DataFormatException;

/**
 * Lempel, Ziv and Welch's coding as TIFF has it (TIFF 6.0, section 13): most significant bit first, codes of 9 to 12 bits
 * that widen one code early.
 *
 * <p>Each string of the table but the first 256 is a stretch of what was already unpacked, so the table keeps just where it
 * begins and how long it is.
 */
final class LzwDecoder {

    private static final int CLEAR = 256;
    private static final int END = 257;
    private static final int FIRST_FREE = 258;
    private static final int TABLE = 4096;

    private final byte[] packed;
    private final byte[] target;
    private final int[] begin = new int[TABLE];
    private final int[] length = new int[TABLE];
    private int free = FIRST_FREE;
    private long bit;
    private int out;

    LzwDecoder(byte[] packed, byte[] target) {
        this.packed = packed;
        this.target = target;
    }

    /** Unpacks until one of the two ends. Returns how many bytes were filled. */
    int decode() throws DataFormatException {
        int previous = CLEAR;
        while (out < target.length) {
            int code = code();
            if (code == END) {
                break;
            }
            if (code == CLEAR) {
                free = FIRST_FREE;
            } else {
                int start = out;
                write(code, previous);
                remember(start, previous);
            }
            previous = code;
        }
        return out;
    }

    /** The next code; the end where the bytes end. */
    private int code() {
        int width = free < 511 ? 9 : free < 1023 ? 10 : free < 2047 ? 11 : 12;
        if (bit + width > packed.length * 8L) {
            return END;
        }
        int at = (int) (bit >> 3);
        int window = 0;
        for (int i = 0; i < 3; i++) {
            window = window << 8 | (at + i < packed.length ? packed[at + i] & 0xff : 0);
        }
        int code = window >> 24 - (int) (bit & 7) - width & (1 << width) - 1;
        bit += width;
        return code;
    }

    private void write(int code, int previous) throws DataFormatException {
        if (code < CLEAR) {
            target[out++] = (byte) code;
            return;
        }
        boolean isNext = code == free && previous != CLEAR;
        if (code >= free && !isNext) {
            throw new DataFormatException("a code that is not in the table");
        }
        int from = isNext ? out - lengthOf(previous) : begin[code];
        int count = isNext ? lengthOf(previous) + 1 : length[code];
        for (int i = 0; i < count && out < target.length; i++) {
            target[out++] = target[from + i];
        }
    }

    /** The new string: the previous one, which ends where the present one starts, and the present one's first byte. */
    private void remember(int start, int previous) {
        if (previous != CLEAR && free < TABLE) {
            length[free] = lengthOf(previous) + 1;
            begin[free] = start - lengthOf(previous);
            free++;
        }
    }

    private int lengthOf(int code) {
        return code < CLEAR ? 1 : length[code];
    }
}
