package org.seepledger.sketch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;
import org.seepledger.prism.Ring;

/**
 * A straight stretch of a side or line, in its direction.
 *
 * @param from where it begins
 * @param to where it ends
 * @param boundary the boundary that its side is in, if any
 */
record Link(Place from, Place to, Optional<String> boundary) {

    /** {@return the sides of rings, the inside on their left} */
    static List<Link> sides(List<Ring> rings) {
        List<Link> links = new ArrayList<>();
        for (Ring ring : rings) {
            Outline outline = Outline.of(ring);
            for (int i = 0; i < outline.size(); i++) {
                links.add(new Link(
                        outline.place(i),
                        outline.place(i + 1),
                        outline.corners().get(i).boundary()));
            }
        }
        return links;
    }

    /** {@return the stretches of a line} */
    static List<Link> along(List<Place> line) {
        List<Link> links = new ArrayList<>();
        for (int i = 1; i < line.size(); i++) {
            links.add(new Link(line.get(i - 1), line.get(i), Optional.empty()));
        }
        return links;
    }

    /** {@return the same stretch the other way} */
    Link reversed() {
        return new Link(to, from, boundary);
    }

    /** {@return where it lies and how it runs, whatever boundary it is in} */
    Link bare() {
        return new Link(from, to, Optional.empty());
    }

    Place middle() {
        return new Place((from.x() + to.x()) / 2, (from.y() + to.y()) / 2);
    }

    LineString line() {
        return PlanShape.FACTORY.createLineString(new Coordinate[] {from.coordinate(), to.coordinate()});
    }
}
