package org.seepledger.io.raster;

import java.nio.ByteBuffer;
import java.util.Arrays;
import java.util.zip.DataFormatException;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.DataFault;

/** One image of a TIFF file: gives stored values by band and window, rows as the file has them. */
final class TiffImage {

    /** So many bytes of a block that lies plain in the file are read at once. */
    private static final int SLICE_BYTES = 1 << 20;

    private final TiffFile file;
    private final Encoding encoding;
    private final BlockLayout layout;
    private final long[] offsets;
    private final long[] counts;
    private final BlockCache cache;

    /** Rows of a block from a certain one. */
    private record Unpacked(int firstRow, ByteBuffer rows) {}

    private TiffImage(TiffDirectory directory, BlockCache cache) {
        this.cache = cache;
        this.file = directory.file();
        this.encoding = Encoding.of(directory);
        this.layout = BlockLayout.of(directory, encoding.sample());
        this.offsets = directory.integers(layout.tiled() ? Tag.TILE_OFFSETS : Tag.STRIP_OFFSETS);
        this.counts = directory.integers(layout.tiled() ? Tag.TILE_BYTE_COUNTS : Tag.STRIP_BYTE_COUNTS);
    }

    /**
     * Reads what a directory says of its image.
     *
     * @param directory the directory
     * @param cache keeps unpacked blocks
     * @throws DataFault if it cannot be read here or is not consistent with the file's length
     */
    static TiffImage of(TiffDirectory directory, BlockCache cache) {
        TiffImage image = new TiffImage(directory, cache);
        image.checkBlocks();
        return image;
    }

    BlockLayout layout() {
        return layout;
    }

    SampleType sample() {
        return encoding.sample();
    }

    private void checkBlocks() {
        int blocks = layout.blocks();
        if (offsets.length != blocks || counts.length != blocks) {
            throw file.fault(
                    "",
                    offsets.length + " places and " + counts.length + " lengths of strips or tiles",
                    blocks + " of each for " + layout.rows() + " rows × " + layout.columns() + " columns × "
                            + layout.bands() + " bands",
                    "The file is damaged: copy or write it again.");
        }
        for (int block = 0; block < blocks; block++) {
            if (!isLeftOut(block)) {
                checkBlock(block);
            }
        }
    }

    private void checkBlock(int block) {
        if (!file.holds(offsets[block], counts[block])) {
            throw file.cutShort(place(block), offsets[block], counts[block]);
        }
        long needed = (long) layout.rowsStored(block) * layout.rowBytes();
        if (!encoding.compression().canHold(counts[block], needed)) {
            throw damaged(block, counts[block] + " bytes for " + needed + " unpacked ones");
        }
        boolean whole = encoding.compression() != Compression.NONE;
        if (whole && Math.max(needed, counts[block]) > BlockLayout.MAX_BLOCK_BYTES) {
            throw file.fault(
                    place(block),
                    "a compressed strip or tile of " + needed + " bytes",
                    "at most " + BlockLayout.MAX_BLOCK_BYTES,
                    "Write the raster in smaller blocks, for instance with gdal_translate -co TILED=YES.");
        }
    }

    /** Sparse files leave out blocks that have nothing but the nodata value. */
    private boolean isLeftOut(int block) {
        return offsets[block] == 0 && counts[block] == 0;
    }

    /**
     * Reads stored values.
     *
     * @param band from 0
     * @param window a part of the image, rows as in the file
     * @param leftOut the value of blocks that a sparse file leaves out
     * @param target receives the values, row-major
     * @param start where in {@code target} the first goes
     * @throws DataFault if the file is damaged
     */
    void read(int band, Window window, double leftOut, double[] target, int start) {
        int lastDown = (window.rowEnd() - 1) / layout.blockRows();
        int lastAcross = (window.columnEnd() - 1) / layout.blockColumns();
        for (int down = window.row() / layout.blockRows(); down <= lastDown; down++) {
            for (int across = window.column() / layout.blockColumns(); across <= lastAcross; across++) {
                Window part = part(window, down, across);
                int first = start + window.index(part.row(), part.column());
                copy(band, layout.block(band, down, across), part, leftOut, target, first, window.columns());
            }
        }
    }

    /** What a window has of a block. */
    private Window part(Window window, int down, int across) {
        int top = Math.max(window.row(), down * layout.blockRows());
        int left = Math.max(window.column(), across * layout.blockColumns());
        long bottom = Math.min(window.rowEnd(), (down + 1L) * layout.blockRows());
        long right = Math.min(window.columnEnd(), (across + 1L) * layout.blockColumns());
        return new Window(top, left, (int) bottom - top, (int) right - left);
    }

    private void copy(int band, int block, Window part, double leftOut, double[] target, int first, int stride) {
        if (isLeftOut(block)) {
            for (int row = 0; row < part.rows(); row++) {
                Arrays.fill(target, first + row * stride, first + row * stride + part.columns(), leftOut);
            }
            return;
        }
        int slice = Math.min(part.rows(), rowsAtOnce(block));
        for (int row = 0; row < part.rows(); row += slice) {
            int rows = Math.min(slice, part.rows() - row);
            Window lines = new Window(part.row() + row, part.column(), rows, part.columns());
            copyRows(band, block, lines, target, first + row * stride, stride);
        }
    }

    /** Unpacked blocks can be read in parts, which matters where one strip holds the image; others only as a whole. */
    private int rowsAtOnce(int block) {
        boolean plain = encoding.compression() == Compression.NONE;
        return plain ? Math.max(1, SLICE_BYTES / layout.rowBytes()) : layout.rowsStored(block);
    }

    private void copyRows(int band, int block, Window part, double[] target, int first, int stride) {
        int top = part.row() - layout.firstRow(block);
        Unpacked unpacked = unpacked(block, top, part.rows());
        int together = layout.samplesTogether();
        int sampleInCell = layout.separate() ? 0 : band;
        int left = part.column() % layout.blockColumns();
        for (int row = 0; row < part.rows(); row++) {
            int begin = (top + row - unpacked.firstRow) * layout.rowBytes();
            for (int column = 0; column < part.columns(); column++) {
                int index = (left + column) * together + sampleInCell;
                target[first + row * stride + column] = encoding.sample().value(unpacked.rows, begin, index);
            }
        }
    }

    private Unpacked unpacked(int block, int firstRow, int rows) {
        if (encoding.compression() == Compression.NONE) {
            long position = offsets[block] + (long) firstRow * layout.rowBytes();
            return new Unpacked(firstRow, file.read(position, rows * layout.rowBytes()));
        }
        return new Unpacked(0, cache.get(this, block, () -> unpack(block)));
    }

    /** Gives back the memory of its blocks. */
    void forget() {
        cache.forget(this);
    }

    private ByteBuffer unpack(int block) {
        byte[] bytes = new byte[layout.rowsStored(block) * layout.rowBytes()];
        try {
            byte[] packed = file.read(offsets[block], (int) counts[block]).array();
            encoding.compression().unpack(packed, bytes);
        } catch (DataFormatException e) {
            throw damaged(block, "data that do not unpack (" + e.getMessage() + ")");
        }
        ByteBuffer buffer = ByteBuffer.wrap(bytes).order(file.order());
        int sampleBytes = Math.max(1, layout.sampleBits() / Byte.SIZE);
        encoding.predictor().undo(buffer, layout.rowBytes(), sampleBytes, layout.samplesTogether());
        return buffer;
    }

    private DataFault damaged(int block, String found) {
        return file.fault(
                place(block), found, "a sound strip or tile", "The file is damaged: copy it again or write it again.");
    }

    private String place(int block) {
        String rows = layout.rows() == 1 ? "row 1" : "rows " + (layout.firstRow(block) + 1) + " to " + lastRow(block);
        int firstColumn = block % layout.blocksAcross() * layout.blockColumns();
        long lastColumn = Math.min(layout.columns(), (long) firstColumn + layout.blockColumns());
        String band =
                layout.separate() ? "band " + (block / layout.blocksAcross() / layout.blocksDown() + 1) + ", " : "";
        return band + rows + " as stored, columns " + (firstColumn + 1) + " to " + lastColumn;
    }

    private long lastRow(int block) {
        return Math.min(layout.rows(), (long) layout.firstRow(block) + layout.blockRows());
    }
}
