package org.seepledger.aquifer;

import org.seepledger.fault.DataFault;

/**
 * Release from storage over an interval, from the heads at its two ends.
 *
 * <p>Specific yield × area × the fall of the water table within the cell (water-table layers), and specific storage ×
 * area × ∫ b dh over the fall of head, where b is the saturated thickness at head h. Both integrals are closed forms, so a
 * cell that fills, drains or turns from confined to unconfined within the interval is split at its top and bottom.
 */
final class StorageRelease {

    private final CellGeometry geometry;
    private final Saturation saturation;
    private final double length;

    /**
     * Prepares one interval.
     *
     * @param geometry the cells
     * @param saturation their heads in the interval
     * @param length how long it lasts
     */
    StorageRelease(CellGeometry geometry, Saturation saturation, double length) {
        this.geometry = geometry;
        this.saturation = saturation;
        this.length = length;
    }

    /** Release from specific yield per cell, length³/time; 0 in layers that hold no water table. */
    double[] waterTable(GriddedValues specificYield, boolean[] active) {
        double[] yield = geometry.block().read(specificYield, 0);
        return perCell(
                active,
                cell -> saturation.isWaterTable(cell)
                        ? needed(yield, cell, "specific yield")
                                * (within(saturation.start(cell), cell) - within(saturation.end(cell), cell))
                        : 0);
    }

    /** Release from elastic storage per cell, length³/time. */
    double[] elastic(GriddedValues given, boolean perLength, boolean[] active) {
        double[] coefficient = geometry.block().read(given, 0);
        String name = perLength ? "specific storage" : "storativity";
        return perCell(active, cell -> {
            double value = needed(coefficient, cell, name);
            double specific = perLength ? value : value / geometry.thickness(cell);
            return specific
                    * (thicknessIntegral(saturation.start(cell), cell) - thicknessIntegral(saturation.end(cell), cell));
        });
    }

    /** The integral of saturated thickness over head, from the cell's bottom up to a head. */
    private double thicknessIntegral(double head, int cell) {
        double thickness = geometry.thickness(cell);
        double above = head - geometry.bottom(cell);
        if (!saturation.isWaterTable(cell)) {
            return thickness * above;
        }
        if (above > thickness) {
            return thickness * (above - 0.5 * thickness);
        }
        return above > 0 ? 0.5 * above * above : 0;
    }

    private double within(double head, int cell) {
        return Math.min(Math.max(head, geometry.bottom(cell)), geometry.top(cell));
    }

    private interface PerArea {
        double releasePerArea(int cell);
    }

    private double[] perCell(boolean[] active, PerArea release) {
        double[] rates = new double[active.length];
        for (int cell = 0; cell < rates.length; cell++) {
            if (active[cell]) {
                rates[cell] = release.releasePerArea(cell) * geometry.area(cell) / length;
            }
        }
        return rates;
    }

    private double needed(double[] values, int cell, String what) {
        if (Double.isNaN(values[cell])) {
            throw new DataFault(
                    what,
                    geometry.place(cell),
                    "no value in an active cell",
                    "a value in each active cell",
                    "Give one there, or make the cell inactive.");
        }
        return values[cell];
    }
}
