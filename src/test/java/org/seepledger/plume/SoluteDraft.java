package org.seepledger.plume;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.balance.WellRule;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/** A solute for tests: porosity 0.25, nothing else, as far as not told otherwise. */
final class SoluteDraft {

    private final String name;
    private final GriddedValues concentration;
    private GriddedValues porosity = GriddedValues.constant(0.25);
    private Optional<GriddedValues> limit = Optional.empty();
    private Optional<Sorption> sorption = Optional.empty();
    private Solute.Decay decay = Solute.Decay.NONE;
    private Optional<Solute.Ancestry> ancestry = Optional.empty();
    private Optional<Solute.Dispersion> dispersion = Optional.empty();
    private Optional<GriddedValues> boundary = Optional.empty();
    private final Map<Integer, GriddedValues> sources = new HashMap<>();

    private SoluteDraft(String name, GriddedValues concentration) {
        this.name = name;
        this.concentration = concentration;
    }

    static SoluteDraft of(String name, GriddedValues concentration) {
        return new SoluteDraft(name, concentration);
    }

    SoluteDraft porosity(GriddedValues given) {
        porosity = given;
        return this;
    }

    SoluteDraft limit(double given) {
        limit = Optional.of(GriddedValues.constant(given));
        return this;
    }

    SoluteDraft sorption(Sorption given) {
        sorption = Optional.of(given);
        return this;
    }

    /** Linear sorption that retards by a factor in a porosity of 0.25. */
    SoluteDraft retardation(double factor) {
        return sorption(
                new Sorption.Linear(GriddedValues.constant(1600), GriddedValues.constant(0.25 * (factor - 1) / 1600)));
    }

    SoluteDraft decay(GriddedValues dissolved, GriddedValues sorbed) {
        decay = new Solute.Decay(Optional.of(dissolved), Optional.of(sorbed));
        return this;
    }

    SoluteDraft decay(double rate) {
        return decay(GriddedValues.constant(rate), GriddedValues.constant(rate));
    }

    SoluteDraft parent(String parent, double yield) {
        ancestry = Optional.of(new Solute.Ancestry(parent, GriddedValues.constant(yield)));
        return this;
    }

    SoluteDraft dispersion(double longitudinal, double transverse, double vertical, double diffusion) {
        dispersion = Optional.of(new Solute.Dispersion(
                GriddedValues.constant(longitudinal),
                GriddedValues.constant(transverse),
                GriddedValues.constant(vertical),
                GriddedValues.constant(diffusion),
                GriddedValues.constant(1)));
        return this;
    }

    SoluteDraft boundary(double given) {
        boundary = Optional.of(GriddedValues.constant(given));
        return this;
    }

    SoluteDraft source(int source, GriddedValues given) {
        sources.put(source, given);
        return this;
    }

    Solute done() {
        return new Solute(
                name,
                Optional.of(new Concentration(
                        concentration, GriddedValues.constant(Double.NaN), limit, false, Measure.of("mg/L"))),
                Optional.of(porosity),
                Optional.empty(),
                sorption,
                decay,
                ancestry,
                dispersion,
                boundary,
                sources);
    }

    /** Balances solutes in prisms, all options as they stand by themselves. */
    static List<Plume> balance(Aquifer aquifer, boolean dispersion, List<Prism> prisms, Solute... solutes) {
        SoluteBalance.Options options =
                new SoluteBalance.Options(WellRule.POINT, dispersion, OptionalDouble.empty(), 1);
        return SoluteBalance.of(aquifer, List.of(solutes), prisms, options, Progress.NONE);
    }
}
