package org.seepledger.review.mapping;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.Optional;

/**
 * A stretch of whole days.
 *
 * @param from its first day
 * @param to the day after its last
 */
public record Days(LocalDate from, LocalDate to) {

    /** Refuses what does not last. */
    public Days {
        if (!to.isAfter(from)) {
            throw new IllegalArgumentException(to + " is not after " + from);
        }
    }

    /**
     * {@return the days between two dates; a last day that ends a month which the first day began counts whole}
     *
     * @param from the first day
     * @param to when it ends
     */
    static Optional<Days> between(LocalDate from, LocalDate to) {
        boolean inclusive = from.getDayOfMonth() == 1 && to.getDayOfMonth() == to.lengthOfMonth();
        LocalDate end = inclusive ? to.plusDays(1) : to;
        return end.isAfter(from) ? Optional.of(new Days(from, end)) : Optional.empty();
    }

    /** {@return how many they are} */
    public double count() {
        return ChronoUnit.DAYS.between(from, to);
    }
}
