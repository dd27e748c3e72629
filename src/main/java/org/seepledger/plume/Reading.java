package org.seepledger.plume;

import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.Concentration;
import org.seepledger.fault.DataFault;

/**
 * Concentrations of one solute in a block at an instant, or the mean of two, for each way to count non-detects.
 *
 * @param solute the solute's name
 * @param geometry the cells
 * @param byChoice mass/length³ by {@link NonDetects} and cell; NaN where there is none
 * @param nonDetect whether each is a non-detect
 * @param limits the limits of non-detects
 */
record Reading(String solute, CellGeometry geometry, double[][] byChoice, boolean[] nonDetect, double[] limits) {

    static Reading of(String solute, Concentration given, int instant, CellGeometry geometry) {
        Block block = geometry.block();
        Concentration.AtInstant found = given.at(instant, block);
        NonDetects[] choices = NonDetects.values();
        double[][] byChoice = new double[choices.length][];
        boolean[] nonDetect = new boolean[block.size()];
        for (int choice = 0; choice < choices.length; choice++) {
            byChoice[choice] = found.values().clone();
            for (int cell = 0; cell < nonDetect.length; cell++) {
                nonDetect[cell] = !Double.isNaN(found.limits()[cell]);
                if (nonDetect[cell]) {
                    byChoice[choice][cell] = choices[choice].of(found.limits()[cell]);
                }
            }
        }
        return new Reading(solute, geometry, byChoice, nonDetect, found.limits());
    }

    /** The mean of two instants. */
    static Reading mean(Reading one, Reading other) {
        double[][] means = new double[one.byChoice.length][one.nonDetect.length];
        boolean[] either = new boolean[one.nonDetect.length];
        for (int choice = 0; choice < means.length; choice++) {
            for (int cell = 0; cell < either.length; cell++) {
                means[choice][cell] = 0.5 * (one.byChoice[choice][cell] + other.byChoice[choice][cell]);
                either[cell] = one.nonDetect[cell] || other.nonDetect[cell];
            }
        }
        return new Reading(one.solute, one.geometry, means, either, one.limits);
    }

    /** The concentration of a cell, which must have one. */
    double needed(int choice, int cell) {
        double value = byChoice[choice][cell];
        if (Double.isNaN(value)) {
            throw missing("concentration", cell);
        }
        return value;
    }

    private DataFault missing(String what, int cell) {
        return new DataFault(
                what + " of " + solute,
                geometry.place(cell),
                "no value in an active cell that the budget needs",
                "a value in each active cell of the prisms and beside them",
                "Give one there (0 or a non-detect where the solute is absent), or make the cell inactive.");
    }
}
