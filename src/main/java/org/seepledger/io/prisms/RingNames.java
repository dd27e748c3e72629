package org.seepledger.io.prisms;

import org.seepledger.fault.DataFault;
import org.seepledger.prism.SideNumbering;
import org.seepledger.sketch.Flaw;
import org.seepledger.sketch.Place;

/**
 * What messages call a ring.
 *
 * @param numbering how the sides of the shape are numbered
 */
record RingNames(SideNumbering numbering) {

    /** {@return {@code outer ring}, {@code island 1}, {@code part 2 outer ring}, {@code part 2 island 1}} */
    String of(int part, int island) {
        String name = numbering.ring(part, island);
        if (island > 0) {
            return name;
        }
        return name.isEmpty() ? "outer ring" : name + " outer ring";
    }

    /**
     * {@return what to say of rings that are no polygon}
     *
     * @param flaw what was found
     * @param coordinates what is said behind a place, if it is not as in the file
     * @param spot where the shape stands
     */
    DataFault fault(Flaw flaw, String coordinates, Spot spot) {
        String ring = flaw.island() == Flaw.NO_RING ? numbering.ring(flaw.part(), 0) : of(flaw.part(), flaw.island());
        Spot closer = flaw.part() == Flaw.NO_PART ? spot : spot.in(ring);
        String place = Place.shown(flaw.place().x(), flaw.place().y());
        return closer.fault(flaw.found() + " at " + place + coordinates, flaw.expected(), flaw.remedy());
    }
}
