package org.seepledger.desktop.map;

/**
 * Where and how the mouse touches the map.
 *
 * @param x map x
 * @param y map y
 * @param pixel the size of a logical pixel, in plan units
 * @param free whether snapping is suspended (Alt)
 * @param more whether a selection is added to, or a shared vertex moved alone (Shift)
 */
public record Touch(double x, double y, double pixel, boolean free, boolean more) {}
