package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Map;
import java.util.TreeMap;

/** The fields of a directory to be written, in the order of their codes as TIFF wants it; little-endian. */
final class TiffFields {

    private static final int ASCII = 2;
    private static final int SHORT = 3;
    private static final int LONG = 4;
    private static final int DOUBLE = 12;
    private static final int LONG8 = 16;

    private final boolean big;
    private final Map<Integer, Field> fields = new TreeMap<>();

    private record Field(int type, int count, byte[] values) {}

    /**
     * Begins a directory.
     *
     * @param big whether the file is a BigTIFF, with places of 8 bytes
     */
    TiffFields(boolean big) {
        this.big = big;
    }

    TiffFields shorts(Tag tag, int... values) {
        ByteBuffer bytes = buffer(values.length * Short.BYTES);
        for (int value : values) {
            bytes.putShort((short) value);
        }
        return put(tag, SHORT, values.length, bytes);
    }

    TiffFields integer(Tag tag, int value) {
        return put(tag, LONG, 1, buffer(Integer.BYTES).putInt(value));
    }

    /** Places in the file, or numbers of bytes. */
    TiffFields places(Tag tag, long... values) {
        ByteBuffer bytes = buffer(values.length * placeBytes());
        for (long value : values) {
            place(bytes, value);
        }
        return put(tag, big ? LONG8 : LONG, values.length, bytes);
    }

    TiffFields reals(Tag tag, double... values) {
        ByteBuffer bytes = buffer(values.length * Double.BYTES);
        for (double value : values) {
            bytes.putDouble(value);
        }
        return put(tag, DOUBLE, values.length, bytes);
    }

    TiffFields text(Tag tag, String value) {
        byte[] characters = (value + '\0').getBytes(StandardCharsets.US_ASCII);
        return put(tag, ASCII, characters.length, buffer(characters.length).put(characters));
    }

    private TiffFields put(Tag tag, int type, int count, ByteBuffer bytes) {
        fields.put(tag.code(), new Field(type, count, bytes.array()));
        return this;
    }

    /**
     * {@return the directory's bytes, followed by the values that do not fit into it}
     *
     * @param position where in the file it will stand
     */
    byte[] at(long position) {
        int countBytes = big ? Long.BYTES : Short.BYTES;
        int directory = countBytes + fields.size() * (big ? 20 : 12) + placeBytes();
        int total = fields.values().stream().mapToInt(this::bytesOutside).sum() + directory;
        ByteBuffer bytes = buffer(total);
        int outside = directory;
        if (big) {
            bytes.putLong(fields.size());
        } else {
            bytes.putShort((short) fields.size());
        }
        for (Map.Entry<Integer, Field> entry : fields.entrySet()) {
            Field field = entry.getValue();
            bytes.putShort((short) (int) entry.getKey()).putShort((short) field.type);
            place(bytes, field.count);
            if (bytesOutside(field) == 0) {
                bytes.put(Arrays.copyOf(field.values, placeBytes()));
            } else {
                place(bytes, position + outside);
                bytes.put(outside, field.values);
                outside += bytesOutside(field);
            }
        }
        place(bytes, 0);
        return bytes.array();
    }

    /** What a field takes behind the directory, rounded up to whole words. */
    private int bytesOutside(Field field) {
        int count = field.values.length;
        return count <= placeBytes() ? 0 : count + count % 2;
    }

    private void place(ByteBuffer bytes, long value) {
        if (big) {
            bytes.putLong(value);
        } else {
            bytes.putInt((int) value);
        }
    }

    private int placeBytes() {
        return big ? Long.BYTES : Integer.BYTES;
    }

    private static ByteBuffer buffer(int bytes) {
        return ByteBuffer.allocate(bytes).order(ByteOrder.LITTLE_ENDIAN);
    }
}
