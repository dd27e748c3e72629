package org.seepledger.sample;

/**
 * Water that blocks hold: what drains when the water table falls (specific yield, in layers with a water table), and what
 * the ground and the water give back when the head falls (specific storage, over the water-filled thickness).
 *
 * @param grid the blocks
 * @param waterTable for each layer, whether the water table can lie in it
 * @param specificYield of each cell
 * @param specificStorage of each layer, 1/m
 */
record StoredWater(BlockGrid grid, boolean[] waterTable, double[] specificYield, double[] specificStorage) {

    /**
     * {@return the water in a cell, m³, from an arbitrary zero: specific yield times the water-filled thickness, and specific
     * storage times the integral of that thickness over the head}
     */
    double volume(int cell, double head) {
        double thickness = grid.thickness(cell);
        double above = head - grid.bottomElevation(cell);
        double elastic = specificStorage[grid.layer(cell)] * grid.area(cell);
        if (!waterTable[grid.layer(cell)]) {
            return elastic * thickness * above;
        }
        double filled = Math.max(0, Math.min(thickness, above));
        double drainable = specificYield[cell] * grid.area(cell) * filled;
        return drainable + elastic * (0.5 * filled * filled + thickness * Math.max(0, above - thickness));
    }

    /**
     * {@return how the volume grows with the head, m²; below the cell's bottom, where it does not, as it does just above, so
     * that a search which falls below finds back}
     */
    double perHead(int cell, double head) {
        double thickness = grid.thickness(cell);
        double above = head - grid.bottomElevation(cell);
        boolean full = !waterTable[grid.layer(cell)] || above >= thickness;
        double drainable = full ? 0 : specificYield[cell];
        double elastic = specificStorage[grid.layer(cell)] * (full ? thickness : Math.max(0, above));
        return (drainable + elastic) * grid.area(cell);
    }

    /**
     * {@return the release of a cell over a time step as an exchange: exact at the given head, linear about it (Newton's
     * tangent)}
     *
     * @param cell a cell with thickness
     * @param before the head at the step's begin, m
     * @param head about which, m
     * @param days how long the step lasts
     */
    Exchange release(int cell, double before, double head, double days) {
        double conductance = perHead(cell, head) / days;
        double released = (volume(cell, before) - volume(cell, head)) / days;
        return new Exchange(cell, conductance, head + released / conductance);
    }
}
