package org.seepledger.desktop.transect;

/**
 * What crosses a segment in one layer, a measured panel, or all together. Positive is forward.
 *
 * @param name the segment or panel; for all together, in words
 * @param layer the layer's name; empty for a measured panel and for all together
 * @param total whether it is all together
 * @param area length²
 * @param flow water, length³/time
 * @param discharge mass in the rate unit shown, non-detects as half their limit
 * @param low the same with non-detects as 0
 * @param high the same with non-detects as their limit
 * @param concentration flux-averaged, in the unit of the solute; NaN where nothing crosses
 * @param share its part of the whole discharge, in percent
 * @param areaShare its part of the whole area, in percent
 */
record TransectRow(
        String name,
        String layer,
        boolean total,
        double area,
        double flow,
        double discharge,
        double low,
        double high,
        double concentration,
        double share,
        double areaShare) {}
