package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.seepledger.fault.DataFault;

/**
 * One directory of a TIFF file: the fields that describe an image. Values are read when they are asked for, so that what is
 * never asked for costs nothing and cannot harm.
 */
final class TiffDirectory {

    /** The most directories of a file that are looked at. */
    private static final int MAX_DIRECTORIES = 4096;

    private static final int MAX_FIELDS = 4096;
    private static final int MAX_VALUES = 1 << 22;
    private static final Set<Integer> KNOWN =
            Arrays.stream(Tag.values()).map(Tag::code).collect(Collectors.toUnmodifiableSet());

    private final TiffFile file;
    private final Map<Integer, Field> fields = new HashMap<>();
    private final long next;

    /** Where a field's values are and what they are. */
    private record Field(int type, long count, long position) {}

    private TiffDirectory(TiffFile file, long position) {
        this.file = file;
        boolean big = file.isBig();
        int countBytes = big ? Long.BYTES : Short.BYTES;
        int fieldBytes = big ? 20 : 12;
        ByteBuffer head = file.read(position, countBytes);
        long count = big ? head.getLong(0) : Short.toUnsignedInt(head.getShort(0));
        if (count < 1 || count > MAX_FIELDS) {
            throw damaged(Long.toUnsignedString(count) + " fields in a directory");
        }
        long start = position + countBytes;
        int bytes = (int) count * fieldBytes;
        ByteBuffer body = file.read(start, bytes + (big ? Long.BYTES : Integer.BYTES));
        for (int at = 0; at < bytes; at += fieldBytes) {
            int code = Short.toUnsignedInt(body.getShort(at));
            if (KNOWN.contains(code)) {
                fields.putIfAbsent(code, field(body, at, start));
            }
        }
        this.next = offset(body, bytes);
    }

    /**
     * Reads all directories of a file, the main image's first.
     *
     * @throws DataFault if one lies beyond the file or they go round in a circle
     */
    static List<TiffDirectory> all(TiffFile file) {
        List<TiffDirectory> found = new ArrayList<>();
        Set<Long> seen = new HashSet<>();
        long position = file.firstDirectory();
        do {
            TiffDirectory directory = new TiffDirectory(file, position);
            if (!seen.add(position) || found.size() == MAX_DIRECTORIES) {
                throw directory.damaged("directories that go round in a circle or are too many");
            }
            found.add(directory);
            position = directory.next;
        } while (position != 0);
        return found;
    }

    private Field field(ByteBuffer body, int at, long start) {
        int type = Short.toUnsignedInt(body.getShort(at + 2));
        boolean big = file.isBig();
        long count = big ? body.getLong(at + 4) : Integer.toUnsignedLong(body.getInt(at + 4));
        int value = at + (big ? 12 : 8);
        int room = big ? Long.BYTES : Integer.BYTES;
        boolean inPlace = count >= 0 && count <= room / Math.max(1, size(type));
        return new Field(type, count, inPlace ? start + value : offset(body, value));
    }

    private long offset(ByteBuffer body, int at) {
        return file.isBig() ? body.getLong(at) : Integer.toUnsignedLong(body.getInt(at));
    }

    /** The bytes of one value of a type; 0 for an unknown type. */
    private static int size(int type) {
        return switch (type) {
            case 1, 2, 6, 7 -> 1;
            case 3, 8 -> 2;
            case 4, 9, 11, 13 -> 4;
            case 5, 10, 12, 16, 17, 18 -> 8;
            default -> 0;
        };
    }

    TiffFile file() {
        return file;
    }

    /**
     * {@return a whole number}
     *
     * @param otherwise what to return if the field is absent
     */
    long integer(Tag tag, long otherwise) {
        long[] values = integers(tag);
        return values.length == 0 ? otherwise : values[0];
    }

    /** {@return the whole numbers of a field; none if it is absent} */
    long[] integers(Tag tag) {
        Field field = fields.get(tag.code());
        if (field == null) {
            return new long[0];
        }
        ByteBuffer bytes = values(tag, field);
        long[] values = new long[(int) field.count];
        for (int i = 0; i < values.length; i++) {
            values[i] = switch (field.type) {
                case 1 -> Byte.toUnsignedLong(bytes.get());
                case 3 -> Short.toUnsignedLong(bytes.getShort());
                case 4, 13 -> Integer.toUnsignedLong(bytes.getInt());
                case 16, 18 -> bytes.getLong();
                default -> throw damaged("values of type " + field.type + " in " + tag);
            };
        }
        return values;
    }

    /** {@return the real numbers of a field; none if it is absent} */
    double[] reals(Tag tag) {
        Field field = fields.get(tag.code());
        if (field == null) {
            return new double[0];
        }
        ByteBuffer bytes = values(tag, field);
        double[] values = new double[(int) field.count];
        for (int i = 0; i < values.length; i++) {
            values[i] = switch (field.type) {
                case 11 -> bytes.getFloat();
                case 12 -> bytes.getDouble();
                default -> throw damaged("values of type " + field.type + " in " + tag);
            };
        }
        return values;
    }

    /** {@return the text of a field without the zeros that end it; empty if it is absent} */
    String text(Tag tag) {
        Field field = fields.get(tag.code());
        if (field == null) {
            return "";
        }
        if (size(field.type) != 1) {
            throw damaged("values of type " + field.type + " in " + tag);
        }
        String text = new String(values(tag, field).array(), StandardCharsets.UTF_8);
        int end = text.indexOf('\0');
        return end < 0 ? text : text.substring(0, end);
    }

    private ByteBuffer values(Tag tag, Field field) {
        int size = size(field.type);
        if (size == 0 || field.count < 0 || field.count > MAX_VALUES) {
            throw damaged(Long.toUnsignedString(field.count) + " values of type " + field.type + " in " + tag);
        }
        return file.read(field.position, (int) field.count * size);
    }

    private DataFault damaged(String found) {
        return file.fault("", found, "a sound TIFF directory", "The file is damaged: copy it again or write it again.");
    }
}
