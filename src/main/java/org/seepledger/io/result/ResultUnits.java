package org.seepledger.io.result;

import org.seepledger.unit.Measure;

/**
 * The units that results are given in: those of water, or of a solute with kilograms in place of length³.
 *
 * @param rate unit of rates
 * @param volume unit of volumes; of masses in a solute's budget
 * @param rateFactor how many of it one length³/time of the set is
 * @param volumeFactor how many of it one length³ of the set is
 */
public record ResultUnits(Measure rate, Measure volume, double rateFactor, double volumeFactor) {

    /**
     * {@return the units for results, in place of the set's own}
     *
     * @param length the set's length unit
     * @param time the set's time unit
     * @param rate unit of rates; null for the set's own
     * @param volume unit of volumes; null for the set's own
     * @throws IllegalArgumentException if one of them does not measure a rate or a volume
     */
    public static ResultUnits of(Measure length, Measure time, Measure rate, Measure volume) {
        Measure ownVolume = Measure.power(length, 3);
        Measure ownRate = ownVolume.per(time);
        Measure givenRate = rate == null ? ownRate : rate;
        Measure givenVolume = volume == null ? ownVolume : volume;
        return new ResultUnits(givenRate, givenVolume, ownRate.in(givenRate), ownVolume.in(givenVolume));
    }
}
