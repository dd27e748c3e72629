package org.seepledger.cli;

import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Writes plain GeoTIFFs of 32-bit floats for tests: one strip for each band, tags as in TIFF 6.0 and OGC 19-008. */
final class TinyTiff {

    private static final int SHORT = 3;
    private static final int LONG = 4;
    private static final int DOUBLE = 12;
    private static final int ASCII = 2;

    private final int rows;
    private final int columns;
    private final List<double[]> bands = new ArrayList<>();
    private double x;
    private double y;
    private double step = 10;
    private int epsg;
    private boolean placed = true;
    private String noData = "";
    private String metadata = "";

    private record Tag(int code, int type, int count, byte[] value) {}

    interface Formula {
        double at(int row, int column);
    }

    /** A raster whose south-western corner is (0, 0), in cells of 10. */
    TinyTiff(int rows, int columns) {
        this.rows = rows;
        this.columns = columns;
    }

    TinyTiff band(Formula formula) {
        double[] band = new double[rows * columns];
        for (int i = 0; i < band.length; i++) {
            band[i] = formula.at(i / columns, i % columns);
        }
        bands.add(band);
        return this;
    }

    TinyTiff at(double west, double south, double cell) {
        x = west;
        y = south;
        step = cell;
        return this;
    }

    TinyTiff nowhere() {
        placed = false;
        return this;
    }

    TinyTiff epsg(int code) {
        epsg = code;
        return this;
    }

    TinyTiff noData(String mark) {
        noData = mark;
        return this;
    }

    /** Scale and offset of band 1, as GDAL writes them. */
    TinyTiff scaled(double scale, double offset) {
        metadata = "<GDALMetadata><Item name=\"OFFSET\" sample=\"0\" role=\"offset\">" + offset
                + "</Item><Item name=\"SCALE\" sample=\"0\" role=\"scale\">" + scale + "</Item></GDALMetadata>";
        return this;
    }

    byte[] bytes() {
        int strip = rows * columns * Float.BYTES;
        int[] offsets = new int[bands.size()];
        int[] counts = new int[bands.size()];
        int[] bits = new int[bands.size()];
        int[] formats = new int[bands.size()];
        for (int i = 0; i < bands.size(); i++) {
            offsets[i] = 8 + i * strip;
            counts[i] = strip;
            bits[i] = 32;
            formats[i] = 3;
        }
        List<Tag> tags = new ArrayList<>();
        tags.add(longs(256, columns));
        tags.add(longs(257, rows));
        tags.add(shorts(258, bits));
        tags.add(shorts(259, 1));
        tags.add(shorts(262, 1));
        tags.add(longs(273, offsets));
        tags.add(shorts(277, bands.size()));
        tags.add(longs(278, rows));
        tags.add(longs(279, counts));
        tags.add(shorts(284, 2));
        tags.add(shorts(339, formats));
        if (placed) {
            tags.add(doubles(33550, step, step, 0));
            tags.add(doubles(33922, 0, 0, 0, x, y + rows * step, 0));
        }
        if (epsg != 0) {
            tags.add(shorts(34735, 1, 1, 0, 3, 1024, 0, 1, 1, 1025, 0, 1, 1, 3072, 0, 1, epsg));
        }
        addText(tags, 42112, metadata);
        addText(tags, 42113, noData);
        return whole(tags, 8 + bands.size() * strip);
    }

    private byte[] whole(List<Tag> tags, int directory) {
        int extra = directory + 2 + 12 * tags.size() + 4;
        ByteArrayOutputStream values = new ByteArrayOutputStream();
        ByteBuffer entries = little(2 + 12 * tags.size() + 4).putShort((short) tags.size());
        for (Tag tag : tags) {
            entries.putShort((short) tag.code()).putShort((short) tag.type()).putInt(tag.count());
            if (tag.value().length <= 4) {
                entries.put(tag.value()).put(new byte[4 - tag.value().length]);
            } else {
                entries.putInt(extra + values.size());
                values.writeBytes(tag.value());
                values.writeBytes(new byte[values.size() % 2]);
            }
        }
        ByteBuffer file = little(extra + values.size());
        file.put((byte) 'I').put((byte) 'I').putShort((short) 42).putInt(directory);
        for (double[] band : bands) {
            for (double value : band) {
                file.putFloat((float) value);
            }
        }
        return file.put(entries.array()).put(values.toByteArray()).array();
    }

    private static ByteBuffer little(int size) {
        return ByteBuffer.allocate(size).order(ByteOrder.LITTLE_ENDIAN);
    }

    private static Tag shorts(int code, int... values) {
        ByteBuffer bytes = little(2 * values.length);
        for (int value : values) {
            bytes.putShort((short) value);
        }
        return new Tag(code, SHORT, values.length, bytes.array());
    }

    private static Tag longs(int code, int... values) {
        ByteBuffer bytes = little(4 * values.length);
        for (int value : values) {
            bytes.putInt(value);
        }
        return new Tag(code, LONG, values.length, bytes.array());
    }

    private static Tag doubles(int code, double... values) {
        ByteBuffer bytes = little(8 * values.length);
        for (double value : values) {
            bytes.putDouble(value);
        }
        return new Tag(code, DOUBLE, values.length, bytes.array());
    }

    private static void addText(List<Tag> tags, int code, String text) {
        if (!text.isEmpty()) {
            byte[] bytes = (text + "\0").getBytes(StandardCharsets.US_ASCII);
            tags.add(new Tag(code, ASCII, bytes.length, bytes));
        }
    }
}
