package org.seepledger.aquifer;

/** How much of a solute the rock holds: an isotherm, and the density of dry rock. Sorbed mass is mass per mass of rock. */
public sealed interface Sorption {

    /**
     * {@return the dry bulk density of the rock, mass/length³}
     */
    GriddedValues bulkDensity();

    /**
     * S = Kd C.
     *
     * @param bulkDensity mass/length³
     * @param kd length³/mass
     */
    record Linear(GriddedValues bulkDensity, GriddedValues kd) implements Sorption {}

    /**
     * S = Kf Cⁿ, with S in mg/kg and C in mg/L (Freundlich 1907, Zeitschrift für Physikalische Chemie 57, 385–470).
     *
     * @param bulkDensity mass/length³
     * @param kf in the units that S and C have here
     * @param exponent n, dimensionless
     * @param perLength3 how many mg/L one mass/length³ of the set is
     */
    record Freundlich(GriddedValues bulkDensity, GriddedValues kf, GriddedValues exponent, double perLength3)
            implements Sorption {}

    /**
     * S = s b C ÷ (1 + b C) (Langmuir 1918, Journal of the American Chemical Society 40, 1361–1403).
     *
     * @param bulkDensity mass/length³
     * @param capacity s, mass/mass
     * @param affinity b, length³/mass
     */
    record Langmuir(GriddedValues bulkDensity, GriddedValues capacity, GriddedValues affinity) implements Sorption {}

    /**
     * Reads the isotherm in a block of cells.
     *
     * @param block the cells
     * @return sorbed mass in a volume of rock, mass/length³, by cell and concentration in mass/length³
     */
    default Isotherm in(Block block) {
        double[] density = block.read(bulkDensity(), 0);
        if (this instanceof Linear linear) {
            double[] kd = block.read(linear.kd, 0);
            return (cell, c) -> density[cell] * kd[cell] * c;
        }
        if (this instanceof Freundlich freundlich) {
            double[] kf = block.read(freundlich.kf, 0);
            double[] exponent = block.read(freundlich.exponent, 0);
            return (cell, c) ->
                    density[cell] * MG_PER_KG * kf[cell] * Math.pow(c * freundlich.perLength3, exponent[cell]);
        }
        Langmuir langmuir = (Langmuir) this;
        double[] capacity = block.read(langmuir.capacity, 0);
        double[] affinity = block.read(langmuir.affinity, 0);
        return (cell, c) -> density[cell] * capacity[cell] * (affinity[cell] * c) / (1 + affinity[cell] * c);
    }

    /** One milligram in a kilogram. */
    double MG_PER_KG = 1e-6;

    /** Sorbed mass by cell and concentration. */
    interface Isotherm {

        /**
         * {@return sorbed mass in a volume of rock, mass/length³}
         *
         * @param cell the cell's place in the block
         * @param concentration mass/length³
         */
        double sorbed(int cell, double concentration);
    }
}
