package org.seepledger.io.result;

import org.seepledger.unit.Measure;

/**
 * The units that results about solutes are given in.
 *
 * @param rate unit of mass rates
 * @param mass unit of masses
 * @param volume unit of volumes
 * @param area unit of areas
 * @param rateFactor how many of the rate's unit one kilogram over the set's time unit is
 * @param massFactor how many of the mass's unit a kilogram is
 * @param volumeFactor how many of the volume's unit one length³ of the set is
 */
public record MassUnits(
        Measure rate,
        Measure mass,
        Measure volume,
        Measure area,
        double rateFactor,
        double massFactor,
        double volumeFactor) {

    private static final Measure KG = Measure.of("kg");

    /**
     * {@return the units for results}
     *
     * @param length the set's length unit
     * @param time the set's time unit
     * @param rate unit of mass rates; null for the mass's over the set's time unit
     * @param mass unit of masses; null for kilograms
     * @param volume unit of volumes; null for the set's own
     * @throws IllegalArgumentException if one of them does not measure what it should
     */
    public static MassUnits of(Measure length, Measure time, Measure rate, Measure mass, Measure volume) {
        Measure givenMass = mass == null ? KG : mass;
        Measure givenRate = rate == null ? givenMass.per(time) : rate;
        Measure own = Measure.power(length, 3);
        Measure givenVolume = volume == null ? own : volume;
        return new MassUnits(
                givenRate,
                givenMass,
                givenVolume,
                Measure.power(length, 2),
                KG.per(time).in(givenRate),
                KG.in(givenMass),
                own.in(givenVolume));
    }

    /** {@return the units of a budget whose amounts are masses} */
    public ResultUnits ofBudget() {
        return new ResultUnits(rate, mass, rateFactor, massFactor);
    }

    /**
     * {@return how many of a unit of concentration one kilogram in a length³ of the set is}
     *
     * @param concentration the unit
     * @param length the set's length unit
     */
    public static double concentrationFactor(Measure concentration, Measure length) {
        return KG.per(Measure.power(length, 3)).in(concentration);
    }
}
