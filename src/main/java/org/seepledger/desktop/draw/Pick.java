package org.seepledger.desktop.draw;

import java.util.LinkedHashSet;
import java.util.Optional;
import java.util.Set;
import org.seepledger.sketch.Hit;
import org.seepledger.sketch.RingAt;

/** Which vertex or sides of the selected prism are chosen. */
final class Pick {

    private Optional<Hit.Vertex> vertex = Optional.empty();
    private final Set<SideAt> sides = new LinkedHashSet<>();

    /** A side of a ring. */
    record SideAt(RingAt ring, int side) {}

    void nothing() {
        vertex = Optional.empty();
        sides.clear();
    }

    void vertex(Hit.Vertex chosen) {
        nothing();
        vertex = Optional.of(chosen);
    }

    /** Chooses one side, or with more adds it or takes it away. */
    void side(SideAt chosen, boolean more) {
        vertex = Optional.empty();
        if (!more) {
            sides.clear();
            sides.add(chosen);
        } else if (!sides.remove(chosen)) {
            sides.add(chosen);
        }
    }

    Optional<Hit.Vertex> vertex() {
        return vertex;
    }

    Set<SideAt> sides() {
        return sides;
    }
}
