package org.seepledger.desktop.draw;

import java.util.Optional;
import org.seepledger.prism.Ring;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.RingAt;
import org.seepledger.sketch.Shape;

/** What sides are called in a budget. */
final class Sides {

    private Sides() {}

    /** The item that a drawn side counts under; numbered rings may run the other way round. */
    static Optional<String> item(Shape shape, RingAt at, int side) {
        Place from = shape.outlines().get(at).place(side);
        Place to = shape.outlines().get(at).place(side + 1);
        for (Ring ring : shape.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Place begin =
                        new Place(ring.sides().get(i).x(), ring.sides().get(i).y());
                Place end = new Place(ring.after(i).x(), ring.after(i).y());
                if (begin.equals(from) && end.equals(to) || begin.equals(to) && end.equals(from)) {
                    return Optional.of(ring.sides().get(i).item());
                }
            }
        }
        return Optional.empty();
    }
}
