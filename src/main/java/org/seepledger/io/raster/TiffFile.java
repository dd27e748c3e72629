package org.seepledger.io.raster;

import java.io.Closeable;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.Path;
import org.seepledger.fault.DataFault;

/**
 * The bytes of one TIFF file, read within its bounds and from any thread.
 *
 * <p>Not a {@code FileChannel}, which an interrupted thread would close for all the others.
 */
final class TiffFile implements Closeable {

    private static final int HEADER_BYTES = 8;
    private static final int BIG_HEADER_BYTES = 16;
    private static final int CLASSIC = 42;
    private static final int BIG = 43;

    private final RandomAccessFile bytes;
    private final long length;
    private final String shownName;
    private final ByteOrder order;
    private final boolean big;
    private final long firstDirectory;

    private TiffFile(RandomAccessFile bytes, String shownName) throws IOException {
        this.bytes = bytes;
        this.length = bytes.length();
        this.shownName = shownName;
        if (length < HEADER_BYTES) {
            throw notTiff();
        }
        byte[] mark = new byte[2];
        bytes.readFully(mark);
        this.order = order(mark);
        ByteBuffer header = read(0, HEADER_BYTES);
        int version = header.getShort(2);
        this.big = version == BIG;
        if (version != CLASSIC && !big) {
            throw notTiff();
        }
        this.firstDirectory = big ? bigFirstDirectory() : Integer.toUnsignedLong(header.getInt(4));
    }

    /**
     * Opens a file and reads its header.
     *
     * @throws DataFault if there is no such file or it is no TIFF
     */
    static TiffFile open(Path path, String shownName) {
        if (!Files.isRegularFile(path)) {
            throw new DataFault(shownName, "", "no such file", "a GeoTIFF", "Check the path and its spelling.");
        }
        RandomAccessFile bytes = null;
        try {
            bytes = new RandomAccessFile(path.toFile(), "r");
            return new TiffFile(bytes, shownName);
        } catch (IOException e) {
            closeAfter(e, bytes);
            throw new DataFault(
                    shownName, "", "a file that cannot be read", "a GeoTIFF", "Check that you may read the file.");
        } catch (DataFault e) {
            closeAfter(e, bytes);
            throw e;
        }
    }

    private static void closeAfter(Exception reason, RandomAccessFile bytes) {
        try {
            if (bytes != null) {
                bytes.close();
            }
        } catch (IOException e) {
            reason.addSuppressed(e);
        }
    }

    private ByteOrder order(byte[] mark) {
        if (mark[0] == 'I' && mark[1] == 'I') {
            return ByteOrder.LITTLE_ENDIAN;
        }
        if (mark[0] == 'M' && mark[1] == 'M') {
            return ByteOrder.BIG_ENDIAN;
        }
        throw notTiff();
    }

    private long bigFirstDirectory() {
        ByteBuffer header = read(0, BIG_HEADER_BYTES);
        if (header.getShort(4) != Long.BYTES) {
            throw notTiff();
        }
        return header.getLong(8);
    }

    private DataFault notTiff() {
        return fault(
                "",
                "no TIFF header",
                "a GeoTIFF",
                "Write the raster as GeoTIFF, for instance with gdal_translate -of GTiff.");
    }

    /**
     * Reads bytes, as a buffer in the file's byte order.
     *
     * @throws DataFault if they lie beyond the end of the file
     */
    ByteBuffer read(long position, int count) {
        if (!holds(position, count)) {
            throw cutShort("", position, count);
        }
        byte[] target = new byte[count];
        try {
            synchronized (bytes) {
                bytes.seek(position);
                bytes.readFully(target);
            }
        } catch (IOException e) {
            throw fault("byte " + position, "bytes that cannot be read", "a whole file", "Copy the file again.");
        }
        return ByteBuffer.wrap(target).order(order);
    }

    boolean holds(long position, long count) {
        return position >= 0 && count >= 0 && position <= length - count;
    }

    DataFault cutShort(String place, long position, long count) {
        return fault(
                place,
                count + " bytes declared at byte " + Long.toUnsignedString(position),
                "them within the file's " + length + " bytes",
                "The file is cut short or damaged: copy or write it again.");
    }

    DataFault fault(String place, String found, String expected, String remedy) {
        return new DataFault(shownName, place, found, expected, remedy);
    }

    String shownName() {
        return shownName;
    }

    ByteOrder order() {
        return order;
    }

    boolean isBig() {
        return big;
    }

    long firstDirectory() {
        return firstDirectory;
    }

    @Override
    public void close() throws IOException {
        bytes.close();
    }
}
