package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.operation.polygonize.Polygonizer;

/**
 * The polygons that links enclose, as parts: with the links' own coordinates and boundaries, each ring beginning at the
 * vertex that comes first along the drawing.
 */
final class Faces {

    /** By the stretch in either direction, the boundary that it is in. */
    private final Map<Link, Optional<String>> boundaries = new HashMap<>();
    /** Where each vertex stood in the drawing. */
    private final Map<Place, Integer> ranks = new HashMap<>();

    private final Polygonizer polygonizer = new Polygonizer();

    /**
     * Finds faces.
     *
     * @param links stretches that meet at ends alone, those of the drawing first, in its order
     */
    Faces(List<Link> links) {
        for (Link link : links) {
            ranks.putIfAbsent(link.from(), ranks.size());
            Link bare = link.bare();
            if (!boundaries.containsKey(bare)) {
                boundaries.put(bare, link.boundary());
                boundaries.put(bare.reversed(), link.boundary());
                polygonizer.add(link.line());
            }
        }
    }

    /** {@return the faces that are wanted, the one with the earliest vertex first} */
    List<Part> where(Predicate<Polygon> wanted) {
        Collection<?> polygons = polygonizer.getPolygons();
        return polygons.stream()
                .map(Polygon.class::cast)
                .filter(wanted)
                .map(this::part)
                .sorted(Comparator.comparingInt(part -> rank(part.outer().place(0))))
                .toList();
    }

    private Part part(Polygon polygon) {
        List<Outline> islands = new ArrayList<>();
        for (int i = 0; i < polygon.getNumInteriorRing(); i++) {
            islands.add(outline(polygon.getInteriorRingN(i), false));
        }
        islands.sort(Comparator.comparingInt(island -> rank(island.place(0))));
        return new Part(outline(polygon.getExteriorRing(), true), islands);
    }

    private Outline outline(LinearRing ring, boolean outer) {
        boolean turned = Orientation.isCCW(ring.getCoordinateSequence()) != outer;
        Coordinate[] closed = (turned ? ring.reverse() : ring).getCoordinates();
        List<Corner> corners = new ArrayList<>();
        int first = 0;
        for (int i = 0; i < closed.length - 1; i++) {
            Place from = Place.of(closed[i]);
            Link side = new Link(from, Place.of(closed[i + 1]), Optional.empty());
            corners.add(new Corner(from, boundaries.get(side)));
            first = rank(from) < rank(corners.get(first).place()) ? i : first;
        }
        return new Outline(corners).beginningAt(first);
    }

    private int rank(Place place) {
        return ranks.getOrDefault(place, Integer.MAX_VALUE);
    }
}
