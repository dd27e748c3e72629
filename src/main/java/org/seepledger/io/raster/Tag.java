package org.seepledger.io.raster;

/** The fields of a TIFF directory that matter here, with their codes (TIFF 6.0, OGC 19-008r4, GDAL). */
enum Tag {
    NEW_SUBFILE_TYPE(254),
    IMAGE_WIDTH(256),
    IMAGE_LENGTH(257),
    BITS_PER_SAMPLE(258),
    COMPRESSION(259),
    PHOTOMETRIC_INTERPRETATION(262),
    FILL_ORDER(266),
    STRIP_OFFSETS(273),
    ORIENTATION(274),
    SAMPLES_PER_PIXEL(277),
    ROWS_PER_STRIP(278),
    STRIP_BYTE_COUNTS(279),
    PLANAR_CONFIGURATION(284),
    PREDICTOR(317),
    TILE_WIDTH(322),
    TILE_LENGTH(323),
    TILE_OFFSETS(324),
    TILE_BYTE_COUNTS(325),
    EXTRA_SAMPLES(338),
    SAMPLE_FORMAT(339),
    MODEL_PIXEL_SCALE(33550),
    MODEL_TIEPOINT(33922),
    MODEL_TRANSFORMATION(34264),
    GEO_KEY_DIRECTORY(34735),
    GEO_ASCII_PARAMS(34737),
    GDAL_METADATA(42112),
    GDAL_NODATA(42113);

    private final int code;

    Tag(int code) {
        this.code = code;
    }

    int code() {
        return code;
    }

    /** How messages name the field. */
    @Override
    public String toString() {
        return "TIFF tag " + code;
    }
}
