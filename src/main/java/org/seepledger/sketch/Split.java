package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.locationtech.jts.algorithm.locate.IndexedPointInAreaLocator;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.geom.Polygon;

/**
 * Cuts shapes along a line.
 *
 * <p>The line begins and ends outside, or on sides, or closes; what of it lies outside, or ends inside, cuts nothing. Each piece
 * becomes a shape of its own; parts that the line misses stay with the largest piece. Both sides of the cut have the very
 * same vertices. Sides stay in their boundaries, both halves of one that is cut too; the cut itself is in none.
 */
final class Split {

    private final List<Place> line;
    private final Noding noding;

    /**
     * Cuts along a line.
     *
     * @param line at least two places
     * @param near how near a side or vertex the line counts as on it, in plan units
     * @throws Refusal if the line crosses or touches itself, or is none
     */
    Split(List<Place> line, double near) {
        this.line = Stroke.EMPTY.along(line).places();
        this.noding = new Noding(near);
        if (this.line.size() < 2) {
            throw new Refusal("A line that splits has at least two places.");
        }
        if (touchesItself(Link.along(this.line))) {
            throw new Refusal("A line that splits does not cross or touch itself.");
        }
    }

    /** Whether two of its stretches have more in common than where one ends and the next begins, to rounding. */
    private boolean touchesItself(List<Link> links) {
        boolean closed = line.get(0).equals(line.get(line.size() - 1));
        for (int i = 0; i < links.size(); i++) {
            for (int j = i + 1; j < links.size(); j++) {
                boolean next = j == i + 1 || closed && i == 0 && j == links.size() - 1;
                if (noding.meetBeyondEnds(links.get(i), links.get(j), next)) {
                    return true;
                }
            }
        }
        return false;
    }

    /** {@return the parts of each shape that becomes of one, the largest piece first, with what the line misses} */
    List<List<Part>> of(Shape shape) {
        shape.sound();
        List<List<Part>> byPart = shape.parts().stream().map(this::pieces).toList();
        List<Part> pieces = byPart.stream()
                .filter(list -> list.size() > 1)
                .flatMap(List::stream)
                .sorted(Comparator.comparingDouble(
                        part -> -PlanShape.polygon(part).getArea()))
                .toList();
        if (pieces.isEmpty()) {
            throw new Refusal("The line does not cut the prism in two: begin and end it outside, or on its sides.");
        }
        List<Part> kept = byPart.stream()
                .map(list -> list.size() > 1
                        ? list.stream().filter(pieces.get(0)::equals).toList()
                        : list)
                .flatMap(List::stream)
                .toList();
        List<List<Part>> shapes = new ArrayList<>(List.of(kept));
        pieces.subList(1, pieces.size()).forEach(piece -> shapes.add(List.of(piece)));
        shapes.forEach(parts -> shape.madeOf(parts).sound());
        return shapes;
    }

    private List<Part> pieces(Part part) {
        Shape alone = Shape.of("part", part.outer()).madeOf(List.of(part));
        Noding.Noded noded = noding.of(Link.sides(alone.rings()), Link.along(line));
        List<Link> links =
                Stream.concat(noded.first().stream(), noded.second().stream()).toList();
        IndexedPointInAreaLocator whole = new IndexedPointInAreaLocator(PlanShape.polygon(part));
        List<Part> pieces = new Faces(links).where(face -> isIn(whole, face));
        return pieces.size() > 1 ? pieces : List.of(part);
    }

    private static boolean isIn(IndexedPointInAreaLocator whole, Polygon face) {
        return whole.locate(face.getInteriorPoint().getCoordinate()) == Location.INTERIOR;
    }
}
