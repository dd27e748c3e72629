package org.seepledger.review.change;

/**
 * A row of a budget that an earlier run wrote.
 *
 * @param prism the prism
 * @param period the period
 * @param from when it begins, in time units
 * @param to when it ends
 * @param group the group
 * @param item the item
 * @param layer the layer as written, {@code *} for totals
 * @param rate the net rate; NaN where it is not given
 * @param volume the net volume; NaN where it is not given
 * @param rateUnit the unit of the rate
 * @param volumeUnit the unit of the volume; empty for a percentage
 */
public record RecordedRow(
        String prism,
        String period,
        double from,
        double to,
        String group,
        String item,
        String layer,
        double rate,
        double volume,
        String rateUnit,
        String volumeUnit) {

    /** {@return what it is about within its prism and period} */
    public String key() {
        return group + "/" + item + "/" + layer;
    }

    /** {@return whether it is a percentage} */
    public boolean isPercentage() {
        return rateUnit.equals("%");
    }
}
