package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** What one stored value is. All but 64-bit integers, which a double cannot hold exactly. */
enum SampleType {
    /** Of masks only. */
    BIT(1, 1),
    UINT8(1, 8),
    UINT16(1, 16),
    UINT32(1, 32),
    INT8(2, 8),
    INT16(2, 16),
    INT32(2, 32),
    FLOAT32(3, 32),
    FLOAT64(3, 64);

    /** Sample format of reals, as in TIFF 6.0. */
    private static final int REAL = 3;

    private final int format;
    private final int bits;

    SampleType(int format, int bits) {
        this.format = format;
        this.bits = bits;
    }

    static Optional<SampleType> of(long format, long bits) {
        return Arrays.stream(values())
                .filter(type -> type.format == format && type.bits == bits)
                .findFirst();
    }

    int bits() {
        return bits;
    }

    boolean isReal() {
        return format == REAL;
    }

    /**
     * {@return one stored value}
     *
     * @param block the decoded block
     * @param row where the row begins, in bytes
     * @param index the place in the row, in samples
     */
    double value(ByteBuffer block, int row, int index) {
        return switch (this) {
            case BIT -> block.get(row + (index >> 3)) >> (7 - (index & 7)) & 1;
            case UINT8 -> Byte.toUnsignedInt(block.get(row + index));
            case INT8 -> block.get(row + index);
            case UINT16 -> Short.toUnsignedInt(block.getShort(row + 2 * index));
            case INT16 -> block.getShort(row + 2 * index);
            case UINT32 -> Integer.toUnsignedLong(block.getInt(row + 4 * index));
            case INT32 -> block.getInt(row + 4 * index);
            case FLOAT32 -> block.getFloat(row + 4 * index);
            case FLOAT64 -> block.getDouble(row + 8 * index);
        };
    }

    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
