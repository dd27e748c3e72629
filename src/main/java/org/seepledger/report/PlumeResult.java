package org.seepledger.report;

import java.util.List;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.balance.Periods;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.plume.Course;
import org.seepledger.plume.Plume;
import org.seepledger.unit.Measure;

/**
 * What a run came to for one prism and solute.
 *
 * @param aquifer the aquifer
 * @param plume what the prism holds and its budgets
 * @param budget its budget over the record and by period, non-detects counted as half their limit, in kilograms
 * @param course the plume through time
 * @param water the prism's water budget over the record
 * @param above the concentration above which volume and area are counted, kg/length³; empty for none
 */
public record PlumeResult(
        Aquifer aquifer, Plume plume, BudgetCourse budget, Course course, PeriodBudget water, OptionalDouble above) {

    /**
     * {@return what a run came to for one prism and solute}
     *
     * @param aquifer the aquifer
     * @param plume what the prism holds and its budgets
     * @param periods the periods asked for
     * @param water the prism's water budget over the record
     * @param above the concentration above which volume and area are counted, kg/length³; empty for none
     */
    public static PlumeResult of(
            Aquifer aquifer, Plume plume, List<Period> periods, PeriodBudget water, OptionalDouble above) {
        Period record = new Periods(aquifer.times()).record();
        return new PlumeResult(
                aquifer,
                plume,
                new BudgetCourse(
                        plume.ledger().budget(record),
                        periods.stream().map(plume.ledger()::budget).toList()),
                new Course(plume, aquifer.times(), aquifer.grid()),
                water,
                above);
    }

    /** {@return the prism's name} */
    public String prism() {
        return plume.prism();
    }

    /** {@return the solute's name} */
    public String solute() {
        return plume.solute().name();
    }

    /** {@return solute and prism, as they are called in a sentence} */
    public String name() {
        return solute() + " in " + prism();
    }

    /** {@return the unit that the solute's concentrations were given in} */
    public Measure concentrationUnit() {
        return plume.solute().concentration().orElseThrow().unit();
    }

    /** {@return how many of that unit one kilogram in a length³ of the set is} */
    public double concentrationFactor() {
        return MassUnits.concentrationFactor(concentrationUnit(), aquifer.lengthUnit());
    }

    /** {@return the instant at the record's end} */
    public int end() {
        return aquifer.times().intervals();
    }
}
