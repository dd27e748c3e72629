package org.seepledger.desktop.section;

import java.util.Comparator;
import java.util.Optional;
import java.util.stream.Stream;
import org.seepledger.picture.Body;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.sketch.Lid;

/**
 * What is at a place of a section: a lid of the prism that stands out, within 7 pixels of its handle or 5 of its line, or a
 * body.
 *
 * @param section the section
 * @param frame which part of it is seen
 */
record LidHits(Section section, SectionFrame frame) {

    private static final double HANDLE_REACH = 7;
    private static final double LINE_REACH = 5;

    static double height(Body.Slab slab, Lid lid) {
        return lid == Lid.TOP ? slab.top() : slab.bottom();
    }

    /** The nearer lid; where both lie together, what is above them means the top. */
    Optional<Lid> lidAt(double x, double y) {
        return section.body()
                .flatMap(body -> Stream.of(Lid.values())
                        .filter(lid -> isNear(body, lid, x, y))
                        .min(Comparator.<Lid>comparingDouble(lid -> Math.abs(y - lineY(body, lid, x)))
                                .thenComparing(lid -> (lid == Lid.TOP) == y > lineY(body, lid, x))));
    }

    private boolean isNear(Body body, Lid lid, double x, double y) {
        double toHandle = body.spot(frame, LidHand.HANDLE)
                .map(spot -> Math.hypot(x - frame.x(spot.along()), y - frame.y(height(spot.slab(), lid))))
                .orElse(Double.POSITIVE_INFINITY);
        return toHandle <= HANDLE_REACH || Math.abs(y - lineY(body, lid, x)) <= LINE_REACH;
    }

    /** The y of a lid at an x; infinite where the body is not. */
    private double lineY(Body body, Lid lid, double x) {
        double along = frame.along(x);
        return body.slabs().stream()
                .filter(slab -> along >= slab.from() && along <= slab.to())
                .findFirst()
                .map(slab -> frame.y(height(slab, lid)))
                .orElse(Double.POSITIVE_INFINITY);
    }

    /** By how much a place is below a lid; 0 beside the body. */
    double below(Lid lid, double x, double y) {
        double line = section.body().map(body -> lineY(body, lid, x)).orElse(Double.POSITIVE_INFINITY);
        return Double.isFinite(line) ? y - line : 0;
    }

    /** The uppermost of the bodies at a place. */
    Optional<Body> bodyAt(double x, double y) {
        double along = frame.along(x);
        return section.bodies().stream()
                .filter(body -> body.slabs().stream()
                        .anyMatch(slab -> along >= slab.from()
                                && along <= slab.to()
                                && frame.y(slab.top()) - LINE_REACH <= y
                                && frame.y(slab.bottom()) + LINE_REACH >= y))
                .reduce((lower, upper) -> upper);
    }
}
