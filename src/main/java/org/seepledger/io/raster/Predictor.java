package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.Arrays;
import java.util.Optional;

/** What was done to the samples of a row before packing, and is undone here. */
enum Predictor {
    NONE(1),
    /** Each sample less the one before it, as integers of its width, whatever it is (TIFF 6.0, section 14). */
    HORIZONTAL(2),
    /** The bytes of the samples, most significant ones first, each less the one before (Adobe, TIFF Technical Note 3). */
    FLOATING(3);

    private final int code;

    Predictor(int code) {
        this.code = code;
    }

    static Optional<Predictor> of(long code) {
        return Arrays.stream(values())
                .filter(predictor -> predictor.code == code)
                .findFirst();
    }

    /**
     * Restores the samples in place.
     *
     * @param block rows of samples, in the file's byte order
     * @param rowBytes the bytes of a row
     * @param sampleBytes the bytes of a sample
     * @param stride samples from one to the next of the same band
     */
    void undo(ByteBuffer block, int rowBytes, int sampleBytes, int stride) {
        for (int row = 0; row < block.capacity(); row += rowBytes) {
            switch (this) {
                case NONE -> {}
                case HORIZONTAL -> sum(block, row, rowBytes, sampleBytes, stride * sampleBytes);
                case FLOATING -> {
                    sum(block, row, rowBytes, 1, stride);
                    gather(block, row, rowBytes, sampleBytes);
                }
            }
        }
    }

    private static void sum(ByteBuffer block, int row, int rowBytes, int sampleBytes, int back) {
        for (int at = row + back; at < row + rowBytes; at += sampleBytes) {
            switch (sampleBytes) {
                case 1 -> block.put(at, (byte) (block.get(at) + block.get(at - back)));
                case 2 -> block.putShort(at, (short) (block.getShort(at) + block.getShort(at - back)));
                case 4 -> block.putInt(at, block.getInt(at) + block.getInt(at - back));
                default -> block.putLong(at, block.getLong(at) + block.getLong(at - back));
            }
        }
    }

    private static void gather(ByteBuffer block, int row, int rowBytes, int sampleBytes) {
        byte[] planes = new byte[rowBytes];
        block.get(row, planes);
        int samples = rowBytes / sampleBytes;
        boolean swap = block.order() == ByteOrder.LITTLE_ENDIAN;
        for (int i = 0; i < samples; i++) {
            for (int k = 0; k < sampleBytes; k++) {
                int place = swap ? sampleBytes - 1 - k : k;
                block.put(row + i * sampleBytes + place, planes[k * samples + i]);
            }
        }
    }
}
