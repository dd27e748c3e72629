package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.seepledger.aquifer.Grid;
import org.seepledger.prism.Transect;

/**
 * A transect as it was drawn: a line of at least two places, none at the place of the next.
 *
 * @param name its name
 * @param places its vertices, in the direction of drawing
 */
public record ControlLine(String name, List<Place> places) {

    /** Drops segments of no length, and refuses what is no line. */
    public ControlLine {
        if (!Names.isPlain(name)) {
            throw new Refusal("A transect's name is not empty and has no blanks at its ends.");
        }
        places = distinct(places);
        if (places.size() < 2) {
            throw new Refusal("A transect keeps at least two vertices.");
        }
    }

    private static List<Place> distinct(List<Place> given) {
        return Stroke.EMPTY.along(given).places();
    }

    /**
     * {@return the line that a transect is drawn as}
     *
     * @param transect the transect
     */
    public static ControlLine of(Transect transect) {
        return new ControlLine(
                transect.name(),
                transect.vertices().stream()
                        .map(vertex -> new Place(vertex[0], vertex[1]))
                        .toList());
    }

    /** {@return the transect as the engine takes it} */
    public Transect transect() {
        return new Transect(
                name,
                places.stream()
                        .map(place -> new double[] {place.x(), place.y()})
                        .toList());
    }

    /**
     * {@return the line under another name}
     *
     * @param other the name
     */
    public ControlLine named(String other) {
        return new ControlLine(other, places);
    }

    /**
     * {@return the line with a vertex elsewhere}
     *
     * @param vertex the vertex, from 0
     * @param place where it is to be
     */
    public ControlLine move(int vertex, Place place) {
        return with(list -> list.set(vertex, place));
    }

    /**
     * {@return the line with a new vertex in a segment}
     *
     * @param segment the segment, from 0; the vertex becomes number {@code segment + 1}
     * @param place where it is to be
     */
    public ControlLine insert(int segment, Place place) {
        return with(list -> list.add(segment + 1, place));
    }

    /**
     * {@return the line without a vertex}
     *
     * @param vertex the vertex, from 0
     * @throws Refusal if fewer than two would be left
     */
    public ControlLine delete(int vertex) {
        return with(list -> list.remove(vertex));
    }

    private ControlLine with(Consumer<List<Place>> change) {
        List<Place> list = new ArrayList<>(places);
        change.accept(list);
        return new ControlLine(name, list);
    }

    /**
     * {@return the place on a grid that is nearest to a place; the place itself where it lies on the grid}
     *
     * @param place the place
     * @param grid the grid
     */
    public static Place within(Grid grid, Place place) {
        if (grid.holds(place.x(), place.y())) {
            return place;
        }
        double x = Math.max(0, Math.min(grid.x().edge(grid.columns()), grid.localX(place.x(), place.y())));
        double y = Math.max(0, Math.min(grid.y().edge(grid.rows()), grid.localY(place.x(), place.y())));
        return new Place(grid.mapX(x, y), grid.mapY(x, y));
    }
}
