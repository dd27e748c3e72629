package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import org.locationtech.jts.geom.Coordinate;
import org.seepledger.prism.Ring;
import org.seepledger.prism.SideNumbering;

/**
 * A closed ring as it was drawn: at least three vertices, none at the place of the next. It may cross itself.
 *
 * <p>Side {@code i} runs from vertex {@code i} to the next one, both counted from 0 in the direction of drawing; the
 * numbers that a budget shows are those of {@link #ring}.
 *
 * @param corners the vertices, the first not repeated at the end
 */
public record Outline(List<Corner> corners) {

    /** Drops sides of no length; the first vertex stays where it is. */
    public Outline {
        corners = distinct(corners);
        if (corners.size() < 3) {
            throw new Refusal("A ring keeps at least three vertices.");
        }
    }

    private static List<Corner> distinct(List<Corner> given) {
        List<Corner> distinct = new ArrayList<>(given.size());
        for (int i = 0; i < given.size(); i++) {
            if (!given.get(i).place().equals(given.get((i + 1) % given.size()).place())) {
                distinct.add(given.get(i));
            }
        }
        return List.copyOf(distinct);
    }

    /**
     * {@return the outline through the given places}
     *
     * @param places the vertices, the first not repeated at the end
     * @throws Refusal if fewer than three differ
     */
    public static Outline through(List<Place> places) {
        return new Outline(places.stream()
                .map(place -> new Corner(place, Optional.empty()))
                .toList());
    }

    /** {@return the outline of a numbered ring, each side in the boundary that it counts under} */
    static Outline of(Ring ring) {
        return new Outline(ring.sides().stream().map(Corner::of).toList());
    }

    /**
     * {@return the number of vertices, and of sides}
     */
    public int size() {
        return corners.size();
    }

    /**
     * {@return where a vertex is; the one after the last is the first}
     *
     * @param vertex the vertex, from 0
     */
    public Place place(int vertex) {
        return corners.get(vertex % corners.size()).place();
    }

    /**
     * {@return the vertices in the direction of drawing}
     */
    public List<Place> places() {
        return corners.stream().map(Corner::place).toList();
    }

    /**
     * {@return the outline with a vertex elsewhere; one that comes to lie on its neighbour becomes one with it}
     *
     * @param vertex the vertex, from 0
     * @param place where it is to be
     * @throws Refusal if fewer than three vertices would be left
     */
    public Outline move(int vertex, Place place) {
        return with(list -> list.set(vertex, list.get(vertex).to(place)));
    }

    /**
     * {@return the outline with a new vertex in a side; both halves stay in the side's boundary}
     *
     * @param side the side, from 0; the vertex becomes number {@code side + 1}
     * @param place where it is to be, on the side or off it
     */
    public Outline insert(int side, Place place) {
        return with(list -> list.add(side + 1, list.get(side).to(place)));
    }

    /**
     * {@return the outline without a vertex; the side that takes the place of two counts as the one before the vertex
     * did}
     *
     * @param vertex the vertex, from 0
     * @throws Refusal if fewer than three would be left
     */
    public Outline delete(int vertex) {
        return with(list -> list.remove(vertex));
    }

    /**
     * {@return the outline moved as a whole}
     *
     * @param dx how far along x, in plan units
     * @param dy how far along y
     */
    public Outline moved(double dx, double dy) {
        return map(corner -> corner.to(corner.place().moved(dx, dy)));
    }

    /**
     * {@return the outline with every vertex that lies at a place moved to another}
     *
     * @param from the place
     * @param to the other
     */
    public Outline moved(Place from, Place to) {
        return map(corner -> corner.place().equals(from) ? corner.to(to) : corner);
    }

    /**
     * {@return the outline with sides in a boundary, or taken out of theirs}
     *
     * @param sides the sides, from 0
     * @param boundary the boundary's name; empty for the sides' own
     * @throws Refusal if no boundary may have that name
     */
    public Outline under(Collection<Integer> sides, Optional<String> boundary) {
        return with(list -> sides.forEach(side -> list.set(side, list.get(side).under(boundary))));
    }

    /** {@return the outline with a boundary under another name, or dissolved} */
    Outline renamed(String boundary, Optional<String> name) {
        return map(corner -> corner.boundary().filter(boundary::equals).isPresent() ? corner.under(name) : corner);
    }

    /**
     * {@return the ring as prisms have it: turned where it must be, its sides numbered from the first vertex}
     *
     * @param part the number of its part, from 1
     * @param island its number among the islands, from 1; 0 for the outer ring
     * @param numbering how the sides of the shape are numbered
     */
    public Ring ring(int part, int island, SideNumbering numbering) {
        return numbering.number(
                part, island, closed(), corners.stream().map(Corner::boundary).toList());
    }

    /** {@return the outline that begins at another vertex} */
    Outline beginningAt(int vertex) {
        return with(list -> Collections.rotate(list, -vertex));
    }

    /** {@return the vertices and the first again, for the geometry library} */
    Coordinate[] closed() {
        Coordinate[] closed = new Coordinate[size() + 1];
        for (int i = 0; i <= size(); i++) {
            closed[i] = place(i).coordinate();
        }
        return closed;
    }

    private Outline map(UnaryOperator<Corner> change) {
        return new Outline(corners.stream().map(change).toList());
    }

    private Outline with(Consumer<List<Corner>> change) {
        List<Corner> list = new ArrayList<>(corners);
        change.accept(list);
        return new Outline(list);
    }
}
