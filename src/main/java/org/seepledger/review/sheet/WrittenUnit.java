package org.seepledger.review.sheet;

import org.seepledger.unit.Measure;

/**
 * A unit as a table writes it.
 *
 * @param measure the unit
 * @param times how many of it are meant, as 1000 by {@code thousand m3}
 * @param perPeriod whether it is an amount in each of the table's periods, as by {@code m3/month}
 */
public record WrittenUnit(Measure measure, double times, boolean perPeriod) {

    private static final Measure VOLUME = Measure.of("m3");
    private static final Measure RATE = Measure.of("m3/d");
    private static final Measure DEPTH = Measure.of("m");
    private static final Measure DEPTH_RATE = Measure.of("m/d");

    /** {@return what it measures} */
    public Amount amount() {
        if (measure.isCompatible(VOLUME)) {
            return Amount.VOLUME;
        }
        if (measure.isCompatible(RATE)) {
            return Amount.RATE;
        }
        if (measure.isCompatible(DEPTH)) {
            return Amount.DEPTH;
        }
        return measure.isCompatible(DEPTH_RATE) ? Amount.DEPTH_RATE : Amount.OTHER;
    }

    /**
     * {@return how many m3, m3/d, m or m/d one of it is}
     *
     * @throws IllegalStateException if no budget is given in it
     */
    public double inMetresAndDays() {
        Measure plain = switch (amount()) {
            case VOLUME -> VOLUME;
            case RATE -> RATE;
            case DEPTH -> DEPTH;
            case DEPTH_RATE -> DEPTH_RATE;
            case OTHER -> throw new IllegalStateException(measure + " measures no water");
        };
        return times * measure.in(plain);
    }
}
