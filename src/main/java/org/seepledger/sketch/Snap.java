package org.seepledger.sketch;

/**
 * A place that the pointer is held at, and what holds it.
 *
 * @param kind the kind of target
 * @param place a place on the target: the vertex or grid corner itself, or the place on the side or grid line that is
 *     nearest to the pointer
 * @param from where the target begins; the same as {@code place} for a vertex or corner
 * @param to where it ends
 */
public record Snap(Kind kind, Place place, Place from, Place to) {

    /** What can hold the pointer, the strongest first. */
    public enum Kind {
        /** A vertex of a shape. */
        VERTEX,
        /** A crossing of two grid lines. */
        GRID_CORNER,
        /** A side of a shape. */
        EDGE,
        /** A line between columns or rows, or the grid's edge. */
        GRID_LINE
    }

    static Snap point(Kind kind, Place place) {
        return new Snap(kind, place, place, place);
    }

    static Snap line(Kind kind, Place pointer, Place from, Place to) {
        return new Snap(kind, pointer.nearestOn(from, to), from, to);
    }

    /** {@return what the same target gives when the pointer has moved} */
    Snap follow(Place pointer) {
        return line(kind, pointer, from, to);
    }

    boolean hasTargetOf(Snap other) {
        return kind == other.kind && from.equals(other.from) && to.equals(other.to);
    }
}
