package org.seepledger.ledger;

/**
 * What one prism gives to another, or to the outside, in each interval; gross, so that what it takes back is another flow.
 *
 * @param giver the prism that the water leaves, or {@link #OUTSIDE}
 * @param receiver the prism that it enters, or {@link #OUTSIDE}
 * @param rates length³/time by interval, never negative; NaN where it cannot be given
 */
public record ExchangeFlow(String giver, String receiver, double[] rates) {

    /** The partner that is no prism. */
    public static final String OUTSIDE = "outside";

    /**
     * {@return the volume that flows in a period, length³}
     *
     * @param period the period
     */
    public double volume(Period period) {
        double volume = 0;
        for (Period.Part part : period.parts()) {
            volume += rates[part.interval()] * part.duration();
        }
        return volume;
    }
}
