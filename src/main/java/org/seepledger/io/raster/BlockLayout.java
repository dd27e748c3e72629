package org.seepledger.io.raster;

import org.seepledger.fault.DataFault;

/**
 * How an image is divided into blocks, which are strips or tiles; checked against the limits.
 *
 * @param rows the image's rows
 * @param columns the image's columns
 * @param bands its bands
 * @param separate whether each band has blocks of its own
 * @param tiled whether blocks are tiles, which are whole at the edges too
 * @param blockRows rows of a block
 * @param blockColumns columns of a block
 * @param sampleBits bits of a sample
 */
record BlockLayout(
        int rows,
        int columns,
        int bands,
        boolean separate,
        boolean tiled,
        int blockRows,
        int blockColumns,
        int sampleBits) {

    /** The most cells of a band that are read. */
    static final long MAX_CELLS = 1L << 31;

    /** The most bands that are read. */
    static final int MAX_BANDS = 65_536;

    /** The most strips or tiles of a file that are read. */
    static final int MAX_BLOCKS = 1 << 22;

    /** The most bytes of one unpacked strip or tile that are read. */
    static final int MAX_BLOCK_BYTES = 1 << 28;

    /**
     * Reads the layout of an image.
     *
     * @throws DataFault if it makes no sense or passes a limit
     */
    static BlockLayout of(TiffDirectory directory, SampleType sample) {
        TiffFile file = directory.file();
        int columns = size(directory, Tag.IMAGE_WIDTH, "columns");
        int rows = size(directory, Tag.IMAGE_LENGTH, "rows");
        limit(file, (long) rows * columns, MAX_CELLS, "cells in a band (" + rows + " rows × " + columns + " columns)");
        long bands = directory.integer(Tag.SAMPLES_PER_PIXEL, 1);
        limit(file, bands, MAX_BANDS, "bands");
        boolean tiled = directory.integers(Tag.TILE_WIDTH).length > 0;
        boolean separate = directory.integer(Tag.PLANAR_CONFIGURATION, 1) == 2;
        int blockRows = tiled ? size(directory, Tag.TILE_LENGTH, "tile rows") : stripRows(directory, rows);
        int blockColumns = tiled ? size(directory, Tag.TILE_WIDTH, "tile columns") : columns;
        BlockLayout layout =
                new BlockLayout(rows, columns, (int) bands, separate, tiled, blockRows, blockColumns, sample.bits());
        limit(file, layout.longRowBytes(), MAX_BLOCK_BYTES, "bytes in a row of a strip or tile");
        limit(file, layout.longBlocks(), MAX_BLOCKS, "strips or tiles");
        return layout;
    }

    private static int size(TiffDirectory directory, Tag tag, String what) {
        long value = directory.integer(tag, 0);
        limit(directory.file(), value, Integer.MAX_VALUE, what);
        return (int) value;
    }

    private static int stripRows(TiffDirectory directory, int rows) {
        long declared = directory.integer(Tag.ROWS_PER_STRIP, rows);
        return declared < 1 || declared > rows ? rows : (int) declared;
    }

    private static void limit(TiffFile file, long value, long most, String what) {
        if (value < 1 || value > most) {
            throw file.fault(
                    "",
                    Long.toUnsignedString(value) + " " + what,
                    "from 1 to " + most,
                    "If the raster is meant to be so large, cut it; else write it again, for it is damaged.");
        }
    }

    /** {@return the samples of a cell that lie side by side in a block} */
    int samplesTogether() {
        return separate ? 1 : bands;
    }

    /** {@return the bytes of a row of a block} */
    int rowBytes() {
        return (int) longRowBytes();
    }

    private long longRowBytes() {
        long samples = (long) blockColumns * samplesTogether();
        return (samples * sampleBits + Byte.SIZE - 1) / Byte.SIZE;
    }

    int blocksAcross() {
        return ceilDiv(columns, blockColumns);
    }

    int blocksDown() {
        return ceilDiv(rows, blockRows);
    }

    /** {@return the number of blocks of all bands} */
    int blocks() {
        return (int) longBlocks();
    }

    private long longBlocks() {
        return (long) blocksAcross() * blocksDown() * (separate ? bands : 1);
    }

    /**
     * {@return the block of a band at a place among its blocks}
     */
    int block(int band, int down, int across) {
        return ((separate ? band : 0) * blocksDown() + down) * blocksAcross() + across;
    }

    /** {@return the first row of a block in the image} */
    int firstRow(int block) {
        return block / blocksAcross() % blocksDown() * blockRows;
    }

    /** {@return the rows that a block has in the file: the last strip is shorter, the last tile is not} */
    int rowsStored(int block) {
        return tiled ? blockRows : Math.min(blockRows, rows - firstRow(block));
    }

    private static int ceilDiv(int whole, int part) {
        return (int) (((long) whole + part - 1) / part);
    }
}
