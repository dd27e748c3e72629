package org.seepledger.aquifer;

import java.util.Map;
import java.util.Optional;

/**
 * What is known of a substance that water carries. Masses are in kilograms, whatever the set's length and time units.
 *
 * @param name its name, one of a kind in the set
 * @param concentration what is known of its concentration; empty where nothing is
 * @param porosity the share of the rock's volume that is pores, for mass; dimensionless
 * @param effectivePorosity the share that water moves through, for velocity; dimensionless
 * @param sorption how it sorbs; empty where it does not
 * @param decay how it decays
 * @param ancestry what it comes from as a product of decay
 * @param dispersion how it spreads; empty where that was not given
 * @param boundary mass/length³ of what enters through the grid's outer faces, by interval; empty for the cell's own
 * @param ofSources mass/length³ of what sources add, by interval and by the source's place among the set's
 */
public record Solute(
        String name,
        Optional<Concentration> concentration,
        Optional<GriddedValues> porosity,
        Optional<GriddedValues> effectivePorosity,
        Optional<Sorption> sorption,
        Decay decay,
        Optional<Ancestry> ancestry,
        Optional<Dispersion> dispersion,
        Optional<GriddedValues> boundary,
        Map<Integer, GriddedValues> ofSources) {

    /** Takes porosity for the effective one where that is not given, and copies the map. */
    public Solute {
        effectivePorosity = effectivePorosity.isPresent() ? effectivePorosity : porosity;
        ofSources = Map.copyOf(ofSources);
    }

    /**
     * How a substance decays, by first order.
     *
     * @param dissolved 1/time; empty where what is dissolved does not decay
     * @param sorbed 1/time; empty where what is sorbed does not decay
     */
    public record Decay(Optional<GriddedValues> dissolved, Optional<GriddedValues> sorbed) {

        /** No decay. */
        public static final Decay NONE = new Decay(Optional.empty(), Optional.empty());
    }

    /**
     * What a product of decay comes from.
     *
     * @param parent the parent's name
     * @param yield mass of the product for each mass of the parent that decays
     */
    public record Ancestry(String parent, GriddedValues yield) {}

    /**
     * How a substance spreads beside the mean flow.
     *
     * @param longitudinal dispersivity along the flow, length
     * @param transverse across it in plan, length
     * @param vertical across it up and down, length
     * @param diffusion molecular, length²/time
     * @param tortuosity by what diffusion is multiplied in pores, dimensionless
     */
    public record Dispersion(
            GriddedValues longitudinal,
            GriddedValues transverse,
            GriddedValues vertical,
            GriddedValues diffusion,
            GriddedValues tortuosity) {}
}
