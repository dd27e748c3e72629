package org.seepledger.io.raster;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.Path;

/** The bytes of a sample, to be damaged: little-endian, classic TIFF. */
final class TiffBytes {

    private final byte[] bytes;
    private final ByteBuffer buffer;

    private TiffBytes(byte[] bytes) {
        this.bytes = bytes;
        this.buffer = ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN);
    }

    static TiffBytes of(String sample) throws IOException {
        return new TiffBytes(Files.readAllBytes(Samples.path(sample)));
    }

    byte[] bytes() {
        return bytes;
    }

    /** Replaces the first value of a field in the first directory, and makes it a single one of 32 bits. */
    TiffBytes set(Tag tag, long value) {
        int at = field(tag);
        buffer.putShort(at + 2, (short) 4).putInt(at + 4, 1).putInt(at + 8, (int) value);
        return this;
    }

    /** Replaces where a field's values are. */
    TiffBytes setPlace(Tag tag, long value) {
        buffer.putInt(field(tag) + 8, (int) value);
        return this;
    }

    /** Replaces how many values a field has. */
    TiffBytes setCount(Tag tag, long value) {
        buffer.putInt(field(tag) + 4, (int) value);
        return this;
    }

    /** Replaces one of a field's 64-bit reals. */
    TiffBytes setReal(Tag tag, int index, double value) {
        buffer.putDouble(buffer.getInt(field(tag) + 8) + index * Double.BYTES, value);
        return this;
    }

    /** Makes a field another one. */
    TiffBytes rename(Tag tag, Tag to) {
        buffer.putShort(field(tag), (short) to.code());
        return this;
    }

    /** Replaces the text of a field by one that is not longer. */
    TiffBytes setText(Tag tag, String text) {
        int at = field(tag);
        int count = buffer.getInt(at + 4);
        int place = count <= 4 ? at + 8 : buffer.getInt(at + 8);
        for (int i = 0; i < count; i++) {
            buffer.put(place + i, i < text.length() ? (byte) text.charAt(i) : 0);
        }
        return this;
    }

    /** Makes the first directory the one after itself. */
    TiffBytes linkToItself() {
        int directory = buffer.getInt(4);
        buffer.putInt(directory + 2 + 12 * buffer.getShort(directory), directory);
        return this;
    }

    long get(Tag tag) {
        return Integer.toUnsignedLong(buffer.getInt(field(tag) + 8));
    }

    private int field(Tag tag) {
        int directory = buffer.getInt(4);
        for (int i = 0; i < buffer.getShort(directory); i++) {
            int at = directory + 2 + 12 * i;
            if (Short.toUnsignedInt(buffer.getShort(at)) == tag.code()) {
                return at;
            }
        }
        throw new IllegalArgumentException("no " + tag);
    }

    Path in(Path folder) throws IOException {
        return Files.write(folder.resolve("damaged.tif"), bytes);
    }
}
