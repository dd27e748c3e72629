package org.seepledger.io.aquifer;

/**
 * Which band of a raster holds what.
 *
 * @param kind what bands are counted by
 * @param fixed the band, from 0, where it is always the same
 */
record BandRule(Kind kind, int fixed) {

    enum Kind {
        FIXED,
        LAYER,
        STEP
    }

    static final BandRule FIRST = new BandRule(Kind.FIXED, 0);

    int index(int layer, int step) {
        return switch (kind) {
            case FIXED -> fixed;
            case LAYER -> layer;
            case STEP -> step;
        };
    }

    boolean layered() {
        return kind == Kind.LAYER;
    }

    boolean changes() {
        return kind == Kind.STEP;
    }

    /** How many bands a raster must have. */
    int needed(int layers, int steps) {
        return switch (kind) {
            case FIXED -> fixed + 1;
            case LAYER -> layers;
            case STEP -> steps;
        };
    }
}
