package org.seepledger.io.raster;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.Arrays;
import java.util.zip.DataFormatException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Packings and predictors on bytes worked out by hand from their specifications. */
class PackingTest {

    private static byte[] bytes(int... values) {
        byte[] bytes = new byte[values.length];
        for (int i = 0; i < values.length; i++) {
            bytes[i] = (byte) values[i];
        }
        return bytes;
    }

    /** The example of TIFF 6.0, section 9, page 42. */
    @Test
    void unpacksTheExampleOfPackBits() throws DataFormatException {
        byte[] packed = bytes(0xFE, 0xAA, 0x02, 0x80, 0x00, 0x2A, 0xFD, 0xAA, 0x03, 0x80, 0x00, 0x2A, 0x22, 0xF7, 0xAA);
        byte[] target = new byte[24];
        Compression.PACKBITS.unpack(packed, target);
        assertThat(target)
                .isEqualTo(bytes(
                        0xAA, 0xAA, 0xAA, 0x80, 0x00, 0x2A, 0xAA, 0xAA, 0xAA, 0xAA, 0x80, 0x00, 0x2A, 0x22, 0xAA, 0xAA,
                        0xAA, 0xAA, 0xAA, 0xAA, 0xAA, 0xAA, 0xAA, 0xAA));
    }

    /** The example of TIFF 6.0, section 13: 7 7 7 8 8 7 7 6 6 as the 9-bit codes 256 7 258 8 8 258 6 6 257. */
    @Test
    void unpacksTheExampleOfLzw() throws DataFormatException {
        byte[] target = new byte[9];
        Compression.LZW.unpack(codes(256, 7, 258, 8, 8, 258, 6, 6, 257), target);
        assertThat(target).isEqualTo(bytes(7, 7, 7, 8, 8, 7, 7, 6, 6));
    }

    @Test
    void refusesLzwCodesThatAreNotInTheTable() {
        assertThatThrownBy(() -> Compression.LZW.unpack(codes(256, 258, 7), new byte[9]))
                .isInstanceOf(DataFormatException.class);
        assertThatThrownBy(() -> Compression.LZW.unpack(codes(256, 7, 260, 257), new byte[9]))
                .isInstanceOf(DataFormatException.class);
    }

    private static byte[] codes(int... codes) {
        BigInteger bits = BigInteger.ONE;
        for (int code : codes) {
            bits = bits.shiftLeft(9).or(BigInteger.valueOf(code));
        }
        int length = (9 * codes.length + 7) / 8;
        byte[] all = bits.shiftLeft(8 * length - 9 * codes.length).toByteArray();
        return Arrays.copyOfRange(all, all.length - length, all.length);
    }

    /** 1.0 and -2.0 are 3F800000 and C0000000: planes 3F C0, 80 00, 00 00, 00 00, each byte less the one before. */
    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void restoresRealsInTheFilesByteOrder(boolean big) {
        byte[] stored = bytes(0x3F, 0xC0 - 0x3F, 0x80 - 0xC0, 0x00 - 0x80, 0, 0, 0, 0);
        ByteBuffer block = ByteBuffer.wrap(stored).order(big ? ByteOrder.BIG_ENDIAN : ByteOrder.LITTLE_ENDIAN);
        Predictor.FLOATING.undo(block, 8, 4, 1);
        assertThat(block.getFloat(0)).isEqualTo(1f);
        assertThat(block.getFloat(4)).isEqualTo(-2f);
    }

    @Test
    void restoresIntegersOfTwoBandsRowByRow() {
        ByteBuffer block = ByteBuffer.allocate(16).order(ByteOrder.LITTLE_ENDIAN);
        for (int value : new int[] {100, 7, 1, -1, 200, 9, 2, 0}) {
            block.putShort((short) value);
        }
        Predictor.HORIZONTAL.undo(block, 8, 2, 2);
        short[] restored = new short[8];
        block.rewind();
        block.asShortBuffer().get(restored);
        assertThat(restored).isEqualTo(new short[] {100, 7, 101, 6, 200, 9, 202, 9});
    }
}
