package org.seepledger.io.prisms;

import org.seepledger.prism.SideNumbering;

/**
 * What a message calls a ring.
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
}
