package org.seepledger.plume;

import java.util.List;

/**
 * A part of a cell that a prism holds.
 *
 * @param matrix pores and sorption
 * @param cell the cell
 * @param layer its layer, counted from the prism's first
 * @param area plan area inside, length²
 * @param height saturated height inside, length
 * @param centre local x and y, and elevation
 * @param above the concentration above which volume and area are counted, mass/length³
 */
record Holding(Matrix matrix, int cell, int layer, double area, double height, double[] centre, double above) {

    private static final int HALF = NonDetects.HALF.ordinal();

    /**
     * Counts it, and tells whether its concentration is above the one asked for.
     *
     * @param when concentrations
     * @param stocks a stock for each layer, and one for all
     * @param counted whether a cell above it in the column was, so that its plan area counts already
     */
    boolean count(Reading when, List<Stock> stocks, boolean counted) {
        if (height <= 0) {
            return false;
        }
        Stock own = stocks.get(layer);
        Stock all = stocks.get(stocks.size() - 1);
        addMass(when, own);
        addMass(when, all);
        boolean isAbove = when.needed(HALF, cell) > above;
        if (isAbove) {
            own.addAbove(area * height, area);
            all.addAbove(area * height, counted ? 0 : area);
        }
        return isAbove;
    }

    private void addMass(Reading when, Stock stock) {
        double rock = area * height;
        double[] dissolved = new double[NonDetects.values().length];
        double[] sorbed = new double[dissolved.length];
        for (int choice = 0; choice < dissolved.length; choice++) {
            double concentration = when.needed(choice, cell);
            dissolved[choice] = rock * matrix.dissolved(cell, concentration);
            sorbed[choice] = rock * matrix.sorbed(cell, concentration);
        }
        stock.add(rock, matrix.dissolved(cell, 1), dissolved, sorbed, when.needed(HALF, cell), centre);
        if (when.nonDetect()[cell]) {
            stock.addNonDetect(dissolved[HALF] + sorbed[HALF], when.limits()[cell]);
        } else {
            stock.addDetect();
        }
    }
}
