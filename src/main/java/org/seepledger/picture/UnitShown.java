package org.seepledger.picture;

import org.seepledger.ledger.Period;

/**
 * The unit that a chart gives amounts of water in.
 *
 * @param words the unit as it is written
 * @param factor how many of it one length³ is, or one length³ per time unit where rates are shown
 * @param rate whether mean rates are shown, rather than volumes
 */
public record UnitShown(String words, double factor, boolean rate) {

    /**
     * {@return an amount in this unit; NaN where there is none}
     *
     * @param volume length³
     * @param period the time that it took
     */
    public double of(double volume, Period period) {
        return rate ? volume / period.duration() * factor : volume * factor;
    }
}
