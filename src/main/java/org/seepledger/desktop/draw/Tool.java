package org.seepledger.desktop.draw;

import org.seepledger.desktop.words.Words;

/** What the mouse does on the map. */
public enum Tool {
    /** Chooses and moves. */
    SELECT("V"),
    /** Draws a prism vertex by vertex. */
    POLYGON("P"),
    /** Draws a rectangle along the grid, from corner to corner. */
    RECTANGLE("R"),
    /** Draws a circle from its centre, or round a well by a typed radius. */
    CIRCLE("C"),
    /** Draws an island in the selected prism. */
    ISLAND("I"),
    /** Cuts the selected prism along a line. */
    SPLIT("X"),
    /** Makes the selected prism and another one. */
    MERGE("M"),
    /** Draws the line of the section. */
    SECTION("A"),

    /** Draws a transect vertex by vertex; of sets with solutes alone. */
    TRANSECT("D");

    private final String keys;

    Tool(String keys) {
        this.keys = keys;
    }

    /** {@return its shortcut} */
    public String keys() {
        return keys;
    }

    /** {@return the key of its words} */
    public String key() {
        return "tool." + name().toLowerCase(java.util.Locale.ROOT);
    }

    /** {@return what it is called} */
    public String words() {
        return Words.of(key());
    }

    /** {@return what to do with it, in a sentence} */
    public String hint() {
        return Words.of("hint." + name().toLowerCase(java.util.Locale.ROOT));
    }

    boolean needsPrism() {
        return this == ISLAND || this == SPLIT || this == MERGE;
    }
}
