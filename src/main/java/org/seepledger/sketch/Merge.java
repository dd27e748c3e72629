package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.algorithm.locate.PointOnGeometryLocator;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Location;

/**
 * Makes two shapes one, which covers what either of them did.
 *
 * <p>They must overlap, or share a stretch of side, and reach equally far up and down. Sides between them fall away; the
 * others keep their coordinates and boundaries. A gap that they enclose becomes an island. Vertices that lie along what
 * is now one straight side stay.
 */
final class Merge {

    private final double near;

    /**
     * Merges shapes.
     *
     * @param near how near two sides or vertices count as one, in plan units
     */
    Merge(double near) {
        this.near = near;
    }

    /** {@return the first shape grown by the other; both notes, and the first's properties before the other's} */
    Shape of(Shape one, Shape other) {
        one.sound();
        other.sound();
        if (one.name().equals(other.name())) {
            throw new Refusal("Choose two prisms to merge.");
        }
        if (!one.reach().equals(other.reach())) {
            throw new Refusal("The prisms reach differently far up and down; give both the same layers or elevations.");
        }
        Map<String, String> others = new LinkedHashMap<>(other.others());
        others.putAll(one.others());
        String note = Stream.of(one.note(), other.note())
                .filter(text -> !text.isBlank())
                .distinct()
                .collect(Collectors.joining("\n"));
        return one.madeOf(union(one, other)).noted(note).keeping(others).sound();
    }

    private List<Part> union(Shape one, Shape other) {
        PointOnGeometryLocator inOne = new IndexedPointInAreaLocator(PlanShape.of(one.parts()));
        PointOnGeometryLocator inOther = new IndexedPointInAreaLocator(PlanShape.of(other.parts()));
        Noding.Noded noded = new Noding(near).of(Link.sides(one.rings()), Link.sides(other.rings()));
        List<Link> kept = new ArrayList<>(outside(noded.first(), noded.second(), inOther, true));
        kept.addAll(outside(noded.second(), noded.first(), inOne, false));
        if (kept.size() == noded.first().size() + noded.second().size()) {
            throw new Refusal("The prisms do not touch along a side; only such prisms can be merged.");
        }
        return new Faces(kept).where(face -> {
            Coordinate place = face.getInteriorPoint().getCoordinate();
            // Not the inside alone: the place may lie on a side that has fallen away.
            return inOne.locate(place) != Location.EXTERIOR || inOther.locate(place) != Location.EXTERIOR;
        });
    }

    /** The links with the inside of neither shape on their right; of those that run alike, the first shape's. */
    private static List<Link> outside(
            List<Link> links, List<Link> others, PointOnGeometryLocator other, boolean keepsShared) {
        Set<Link> bare = others.stream().map(Link::bare).collect(Collectors.toCollection(HashSet::new));
        return links.stream()
                .filter(link -> !bare.contains(link.bare().reversed()))
                .filter(link -> bare.contains(link.bare())
                        ? keepsShared
                        : other.locate(link.middle().coordinate()) != Location.INTERIOR)
                .toList();
    }
}
