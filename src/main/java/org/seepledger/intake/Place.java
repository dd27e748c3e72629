package org.seepledger.intake;

/** What a column of a table is for. */
public enum Place {
    /** Map coordinate. */
    X("x"),
    /** Map coordinate. */
    Y("y"),
    /** Row, from the north. */
    ROW("row"),
    /** Column, along x. */
    COL("col"),
    /** Layer. */
    LAYER("layer"),
    /** Number of an interval. */
    INTERVAL("interval"),
    /** Number of an instant. */
    INSTANT("instant"),
    /** A time or date that tells instants or intervals apart. */
    TIME(""),
    /** Name of a point. */
    NAME("name"),
    /** When a rate begins. */
    FROM("from"),
    /** When a rate ends. */
    TO("to"),
    /** Rate of a point. */
    RATE("rate"),
    /** Volume of a point. */
    VOLUME("volume"),
    /** Upper end of a screen. */
    SCREEN_TOP("screen_top"),
    /** Lower end of a screen. */
    SCREEN_BOTTOM("screen_bottom"),
    /** Category of a point. */
    CATEGORY("category"),
    /** Values on the grid. */
    VALUE(""),
    /** Not used. */
    NOTHING("");

    private final String heading;

    Place(String heading) {
        this.heading = heading;
    }

    /** {@return its heading in an aquifer folder; empty for any} */
    public String heading() {
        return heading;
    }
}
