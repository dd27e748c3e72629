package org.seepledger.io.raster;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;

/** The keys that say which coordinate system a raster is in (OGC 19-008r4, section 7). */
final class GeoKeys {

    private static final int MODEL_TYPE = 1024;
    private static final int RASTER_TYPE = 1025;
    private static final int CITATION = 1026;
    private static final int GEODETIC_CRS = 2048;
    private static final int PROJECTED_CRS = 3072;
    private static final int PROJECTED_CITATION = 3073;

    private static final int PROJECTED = 1;
    private static final int PIXEL_IS_AREA = 1;
    private static final int PIXEL_IS_POINT = 2;
    private static final int USER_DEFINED = 32_767;

    /** The values of key 3072 and 2048 that are codes of the EPSG register. */
    private static final int FIRST_EPSG = 1024;

    private static final int LAST_EPSG = 32_766;

    /** What stands before WKT in a citation, by a convention of long standing. */
    private static final String WKT_MARK = "ESRI PE String = ";

    private static final int IN_PLACE = 0;

    private final Map<Integer, Integer> numbers = new HashMap<>();
    private final Map<Integer, String> texts = new HashMap<>();

    private GeoKeys(long[] directory, String characters) {
        int keys = directory.length / 4 - 1;
        for (int at = 4; at < 4 * (keys + 1); at += 4) {
            int key = (int) directory[at];
            int count = (int) directory[at + 2];
            int value = (int) directory[at + 3];
            if (directory[at + 1] == IN_PLACE) {
                numbers.put(key, value);
            } else if (directory[at + 1] == Tag.GEO_ASCII_PARAMS.code()) {
                int end = Math.min(characters.length(), value + count);
                texts.put(key, value < end ? characters.substring(value, end) : "");
            }
        }
    }

    static GeoKeys of(TiffDirectory directory) {
        long[] keys = directory.integers(Tag.GEO_KEY_DIRECTORY);
        return new GeoKeys(keys, keys.length == 0 ? "" : directory.text(Tag.GEO_ASCII_PARAMS));
    }

    boolean isPixelPoint() {
        return numbers.getOrDefault(RASTER_TYPE, PIXEL_IS_AREA) == PIXEL_IS_POINT;
    }

    /** {@return the coordinate system as an EPSG code or WKT, where the keys tell it outright} */
    Optional<String> crs() {
        boolean projected = numbers.getOrDefault(MODEL_TYPE, 0) == PROJECTED || numbers.containsKey(PROJECTED_CRS);
        int code = numbers.getOrDefault(projected ? PROJECTED_CRS : GEODETIC_CRS, 0);
        if (code >= FIRST_EPSG && code <= LAST_EPSG) {
            return Optional.of("EPSG:" + code);
        }
        return wkt(PROJECTED_CITATION).or(() -> wkt(CITATION));
    }

    private Optional<String> wkt(int key) {
        String text = texts.getOrDefault(key, "");
        int end = text.indexOf('|');
        String citation = end < 0 ? text : text.substring(0, end);
        return citation.startsWith(WKT_MARK)
                ? Optional.of(citation.substring(WKT_MARK.length()).strip())
                : Optional.empty();
    }

    /** Writes the keys of a projected coordinate system, or of none: the register's code or, for any other, its WKT. */
    static void write(TiffFields fields, Optional<String> crs) {
        String text = crs.orElse("");
        int code = epsg(text);
        int[] area = key(RASTER_TYPE, PIXEL_IS_AREA);
        if (code > 0) {
            put(fields, key(MODEL_TYPE, PROJECTED), area, key(PROJECTED_CRS, code));
        } else if (text.isEmpty() || text.startsWith("EPSG:")) {
            put(fields, area);
        } else {
            String citation = WKT_MARK + text.replace('|', ' ').replaceAll("\\s+", " ") + '|';
            int[] wkt = {PROJECTED_CITATION, Tag.GEO_ASCII_PARAMS.code(), citation.length(), 0};
            put(fields, key(MODEL_TYPE, USER_DEFINED), area, key(PROJECTED_CRS, USER_DEFINED), wkt);
            fields.text(Tag.GEO_ASCII_PARAMS, citation);
        }
    }

    /** The code in {@code EPSG:n}, if it fits into a key; else 0. */
    private static int epsg(String crs) {
        int code = crs.matches("EPSG:\\d{4,5}") ? Integer.parseInt(crs.substring("EPSG:".length())) : 0;
        return code >= FIRST_EPSG && code <= LAST_EPSG ? code : 0;
    }

    private static int[] key(int key, int value) {
        return new int[] {key, IN_PLACE, 1, value};
    }

    /** Puts keys, which come in the order of their codes, behind the version of the standard and their number. */
    private static void put(TiffFields fields, int[]... keys) {
        IntStream head = IntStream.of(1, 1, 0, keys.length);
        int[] all = IntStream.concat(head, Arrays.stream(keys).flatMapToInt(Arrays::stream))
                .toArray();
        fields.shorts(Tag.GEO_KEY_DIRECTORY, all);
    }
}
