package org.seepledger.plume;

/**
 * What stands for a concentration of which only the detection limit is known (US EPA 2009, Unified Guidance, chapter 15).
 * The three together are a bracket, not an estimate.
 */
public enum NonDetects {
    /** Nothing. */
    ZERO(0),
    /** Half the limit: what results show. */
    HALF(0.5),
    /** The limit. */
    LIMIT(1);

    /** From this share of mass on, what stands for non-detects decides too much. */
    public static final double TOO_MUCH = 0.15;

    private final double share;

    NonDetects(double share) {
        this.share = share;
    }

    /**
     * {@return what stands for a value below a limit}
     *
     * @param limit the limit
     */
    public double of(double limit) {
        return share * limit;
    }
}
