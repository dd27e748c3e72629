package org.seepledger.desktop.ledger;

import java.util.Comparator;
import java.util.Optional;
import org.seepledger.ledger.Line;

/** In which order the lines of a section stand. */
public enum Order {
    /** As the prism has its sides and the set its sources. */
    AS_DRAWN,
    /** What brings the most first. */
    LARGEST_IN,
    /** What takes the most first. */
    LARGEST_OUT,
    /** What tips the balance the most first, either way. */
    LARGEST_NET;

    Optional<Comparator<Line>> comparator() {
        return switch (this) {
            case AS_DRAWN -> Optional.empty();
            case LARGEST_IN -> Optional.of(Comparator.comparingDouble(line -> -known(line.inflow())));
            case LARGEST_OUT -> Optional.of(Comparator.comparingDouble(line -> -known(line.outflow())));
            case LARGEST_NET -> Optional.of(Comparator.comparingDouble(line -> -Math.abs(known(line.net()))));
        };
    }

    private static double known(double value) {
        return Double.isNaN(value) ? 0 : value;
    }
}
