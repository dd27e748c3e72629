package org.seepledger.job;

import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.balance.Trace;
import org.seepledger.fault.ProgramFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.NearestName;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.plume.SoluteTrace;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;

/** A row of a solute's budget: what it comes to, and how to trace it to stored concentrations. */
final class SoluteRow {

    private final Aquifer aquifer;
    private final BudgetRow row;
    private final double net;
    private final double gross;
    private final SoluteTrace.Request traced;

    private SoluteRow(Aquifer aquifer, BudgetRow row, double net, double gross, SoluteTrace.Request traced) {
        this.aquifer = aquifer;
        this.row = row;
        this.net = net;
        this.gross = gross;
        this.traced = traced;
    }

    /**
     * How solutes are balanced for it.
     *
     * @param aquifer the aquifer
     * @param solutes the solutes that a concentration is given for
     * @param name the solute
     * @param options how solutes are balanced
     * @param units the units of results
     */
    record Budget(Aquifer aquifer, List<Solute> solutes, String name, SoluteBalance.Options options, MassUnits units) {

        private Solute solute() {
            return solute(name);
        }

        private Solute solute(String wanted) {
            List<String> names = solutes.stream().map(Solute::name).toList();
            return solutes.stream()
                    .filter(solute -> solute.name().equals(wanted))
                    .findFirst()
                    .orElseThrow(() -> new UsageFault("--solute \"" + wanted
                            + "\": there is no solute of that name with a concentration."
                            + NearestName.of(wanted, names)
                                    .map(near -> " The nearest is \"" + near + "\".")
                                    .orElse(" There are \"" + String.join("\", \"", names) + "\".")));
        }

        private Plume plume(Prism prism, Progress progress) {
            List<Plume> plumes = SoluteBalance.of(aquifer, solutes, List.of(prism), options, progress);
            return plumes.get(solutes.indexOf(solute()));
        }
    }

    /**
     * {@return a row}
     *
     * @param budget how solutes are balanced
     * @param name the row's name
     * @param prisms the prisms
     * @param periods the periods
     * @param progress told how far the work is
     * @throws UsageFault if there is no such solute or row, or the row has no weights
     */
    static SoluteRow of(Budget budget, String name, List<Prism> prisms, List<Period> periods, Progress progress) {
        Aquifer aquifer = budget.aquifer();
        Solute solute = budget.solute();
        Optional<Solute> parent = solute.ancestry().map(ancestry -> budget.solute(ancestry.parent()));
        BudgetRow row = BudgetRow.of(
                name,
                prism -> SoluteTrace.accounts(aquifer, solute, prism, budget.options()),
                aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN,
                prisms,
                periods);
        TracedNets nets = TracedNets.of(row, SoluteTrace.accounts(aquifer, solute, row.prism(), budget.options()));
        nets.mustBeLinear(solute, parent);
        PeriodBudget struck = budget.plume(row.prism(), progress).ledger().budget(row.period());
        double perMass = budget.units().rateFactor() / row.period().duration();
        SoluteTrace.Request traced = new SoluteTrace.Request(
                solute,
                parent,
                row.prism(),
                budget.options(),
                nets.row(),
                row.period(),
                budget.units().rateFactor());
        return new SoluteRow(aquifer, row, nets.net(struck) * perMass, nets.gross(struck) * perMass, traced);
    }

    String shortName() {
        return row.shortName();
    }

    Period period() {
        return row.period();
    }

    /** Its net rate, in the unit of rates. */
    double net() {
        return net;
    }

    /**
     * {@return what the lines of its trace came to}
     *
     * @param lines takes them
     * @param progress told how far the work is
     * @throws ProgramFault if they add up to something else than the row
     */
    Trace.Sum trace(Trace.Lines lines, Progress progress) {
        Trace.Sum sum = SoluteTrace.of(aquifer, traced, lines, progress);
        double difference = Math.abs(sum.value() - net);
        if (!(difference <= RowNumber.AGREES * gross + RowNumber.ROUNDING * sum.magnitude())) {
            throw new ProgramFault("The trace of \"" + row.shortName() + "\" adds up to " + sum.value()
                    + ", but the row's net rate is " + net + ".");
        }
        return sum;
    }
}
