package org.seepledger.desktop.draw;

import java.util.EnumSet;
import java.util.Optional;
import java.util.Set;
import org.seepledger.desktop.map.Touch;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Snap;
import org.seepledger.sketch.Snapping;

/** Holds the pointer at what is near it, and remembers what it was held at. */
final class Snapper {

    private static final Set<Snap.Kind> ALL = EnumSet.allOf(Snap.Kind.class);
    private static final Set<Snap.Kind> NONE = EnumSet.noneOf(Snap.Kind.class);

    private Optional<Snap> held = Optional.empty();

    /** Where the pointer counts as being. */
    Place held(Snapping targets, Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        held = targets.at(pointer, Nearness.ofPixel(touch.pixel()), touch.free() ? NONE : ALL, held);
        return held.map(Snap::place).orElse(pointer);
    }

    void letGo() {
        held = Optional.empty();
    }

    Optional<Snap> snap() {
        return held;
    }
}
