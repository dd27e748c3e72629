package org.seepledger.plume;

import java.util.Optional;
import java.util.function.DoublePredicate;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.fault.DataFault;

/**
 * What of a solute does not change in time, in a block of cells: pores, sorption, decay and yield.
 *
 * @param solute the solute
 * @param geometry the cells
 * @param porosity total, by cell
 * @param isotherm sorbed mass in a volume of rock
 * @param dissolvedDecay 1/time, by cell
 * @param sorbedDecay 1/time, by cell
 * @param longitudinal dispersivity along the flow, length; NaN where none is given
 * @param yield mass of the solute for each mass of its parent that decays
 */
record Matrix(
        Solute solute,
        CellGeometry geometry,
        double[] porosity,
        Sorption.Isotherm isotherm,
        double[] dissolvedDecay,
        double[] sorbedDecay,
        double[] longitudinal,
        double[] yield) {

    static Matrix of(Solute solute, CellGeometry geometry) {
        Block block = geometry.block();
        return new Matrix(
                solute,
                geometry,
                read(block, solute.porosity()),
                solute.sorption().map(sorption -> sorption.in(block)).orElse((cell, c) -> 0),
                read(block, solute.decay().dissolved()),
                read(block, solute.decay().sorbed()),
                read(
                        block,
                        solute.dispersion()
                                .map(Solute.Dispersion::longitudinal)
                                .or(() -> Optional.of(GriddedValues.constant(Double.NaN)))),
                read(block, solute.ancestry().map(Solute.Ancestry::yield)));
    }

    private static double[] read(Block block, Optional<GriddedValues> values) {
        return values.map(given -> block.read(given, 0)).orElseGet(() -> new double[block.size()]);
    }

    /** Dissolved mass in a volume of saturated rock, mass/length³. */
    double dissolved(int cell, double concentration) {
        double share =
                needed(porosity, cell, "porosity", value -> value > 0 && value <= 1, "more than 0 and at most 1");
        return share * concentration;
    }

    /** Sorbed mass in a volume of rock, mass/length³. */
    double sorbed(int cell, double concentration) {
        double mass = isotherm.sorbed(cell, concentration);
        if (Double.isNaN(mass)) {
            throw fault("sorption", cell, "no value", "values in each active cell that holds the solute");
        }
        return mass;
    }

    double dissolvedDecay(int cell) {
        return needed(dissolvedDecay, cell, "decay", value -> true, "a number");
    }

    double sorbedDecay(int cell) {
        return needed(sorbedDecay, cell, "decay of what is sorbed", value -> true, "a number");
    }

    double yield(int cell) {
        return needed(yield, cell, "yield", value -> true, "a number");
    }

    private double needed(double[] values, int cell, String what, DoublePredicate sound, String expected) {
        if (Double.isNaN(values[cell])) {
            throw fault(what, cell, "no value", "a value in each active cell that holds the solute");
        }
        if (!sound.test(values[cell])) {
            throw fault(what, cell, String.valueOf(values[cell]), expected);
        }
        return values[cell];
    }

    private DataFault fault(String what, int cell, String found, String expected) {
        return new DataFault(
                what + " of " + solute.name(),
                geometry.place(cell),
                found,
                expected,
                "Correct it there, or make the cell inactive.");
    }
}
