package org.seepledger.sample;

/** A quantity of the ground or the water, by layer and place. */
interface CellField {

    double at(int layer, double x, double y);

    /** {@return its value at the centre of each cell} */
    default double[] on(BlockGrid grid) {
        double[] values = new double[grid.cells()];
        for (int cell = 0; cell < values.length; cell++) {
            values[cell] = at(grid.layer(cell), grid.centreX(cell), grid.centreY(cell));
        }
        return values;
    }
}
