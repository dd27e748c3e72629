package org.seepledger.aquifer;

import java.util.Optional;

/**
 * What is known of a substance that water carries.
 *
 * @param name its name, one of a kind in the set
 * @param porosity the share of the rock's volume that is pores, for mass; dimensionless, by layer
 * @param effectivePorosity the share that water moves through, for velocity; dimensionless, by layer
 */
public record Solute(String name, Optional<GriddedValues> porosity, Optional<GriddedValues> effectivePorosity) {

    /** Takes porosity for the effective one where that is not given. */
    public Solute {
        effectivePorosity = effectivePorosity.isPresent() ? effectivePorosity : porosity;
    }
}
