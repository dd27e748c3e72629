package org.seepledger.job;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.StorageKnowledge;
import org.seepledger.balance.Trace;
import org.seepledger.fault.ProgramFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.NearestName;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.TraceCsv;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.plume.SoluteTrace;
import org.seepledger.progress.Progress;

/** Where a number of a solute's budget comes from: the stored concentrations that it rests on, each with its weight. */
public final class SoluteTraceJob {

    /** How far value × weight may add up to something else than the row, as a share of the row's gross flow. */
    private static final double AGREES = 1e-9;

    /** What rounding of the terms may add to that, as a share of the sum of their magnitudes. */
    private static final double ROUNDING = 1e-14;

    private final TraceRequest asked;
    private final Subject subject;
    private final Progress progress;
    private final MassUnits units;
    private final Solute solute;
    private final SoluteBalance.Options options;

    private SoluteTraceJob(SoluteTraceRequest request, Subject subject, Progress progress) {
        this.asked = request.row();
        this.subject = subject;
        this.progress = progress;
        this.units = subject.massUnits(asked.rateUnit(), Optional.empty(), Optional.empty());
        this.solute = solute(request.solute());
        this.options =
                new SoluteBalance.Options(asked.wells(), request.dispersion(), OptionalDouble.empty(), asked.threads());
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return the summary, lines of text; the file is in place
     * @throws UsageFault if the request cannot be met, there is no such solute or row, or the row has no weights
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws ProgramFault if the trace does not add up to the row; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     * @throws IOException if a file cannot be read or written
     */
    public static String run(SoluteTraceRequest request, Progress progress) throws IOException {
        TraceRequest row = request.row();
        try (OutputFile out = OutputFile.at(row.out(), row.overwrite(), "# " + TraceCsv.TITLE);
                Subject subject = Subject.open(row.aquifer(), row.prisms(), row.clip())) {
            return new SoluteTraceJob(request, subject, progress).run(out);
        }
    }

    private String run(OutputFile out) throws IOException {
        Aquifer aquifer = subject.aquifer();
        Optional<Solute> parent = solute.ancestry().map(ancestry -> solute(ancestry.parent()));
        BudgetRow row = row(aquifer);
        TracedNets nets = TracedNets.of(row, SoluteTrace.accounts(aquifer, solute, row.prism(), options));
        nets.mustBeLinear(solute, parent);
        PeriodBudget budget = plume(row).ledger().budget(row.period());
        double perMass = units.rateFactor() / row.period().duration();
        double net = nets.net(budget) * perMass;
        String title =
                TraceCsv.TITLE + "\"" + row.shortName() + "\" of " + solute.name() + " in \"" + aquifer.name() + "\"";
        SoluteTrace.Request traced = new SoluteTrace.Request(
                solute, parent, row.prism(), options, nets.row(), row.period(), units.rateFactor());
        Trace.Sum sum;
        try (TraceCsv table = TraceCsv.open(out.path(), subject.statement(title, progress), notes(net))) {
            sum = SoluteTrace.of(aquifer, traced, table::line, progress);
        }
        check(row, net, nets.gross(budget) * perMass, sum);
        out.publish();
        return "\"" + row.shortName() + "\" of " + solute.name() + ": net rate " + net + " " + units.rate() + "\n"
                + "Value × weight over " + sum.lines() + " lines: " + sum.value() + " " + units.rate() + "\n"
                + "Written to " + asked.out() + "\n";
    }

    private BudgetRow row(Aquifer aquifer) {
        return BudgetRow.of(
                asked.row(),
                prism -> SoluteTrace.accounts(aquifer, solute, prism, options),
                aquifer.storageKnowledge() != StorageKnowledge.UNKNOWN,
                subject.prisms(),
                subject.periods(asked.every(), asked.periods(), asked.waterYearStart()));
    }

    private Plume plume(BudgetRow row) {
        List<Solute> balanced = subject.folder().solutes().stream()
                .filter(other -> other.concentration().isPresent())
                .toList();
        List<Plume> plumes = SoluteBalance.of(subject.aquifer(), balanced, List.of(row.prism()), options, progress);
        return plumes.get(balanced.indexOf(solute));
    }

    private Solute solute(String name) {
        List<Solute> known = subject.folder().solutes().stream()
                .filter(solute -> solute.concentration().isPresent())
                .toList();
        List<String> names = known.stream().map(Solute::name).toList();
        return known.stream()
                .filter(solute -> solute.name().equals(name))
                .findFirst()
                .orElseThrow(() -> new UsageFault("--solute \"" + name
                        + "\": there is no solute of that name with a concentration."
                        + NearestName.of(name, names)
                                .map(near -> " The nearest is \"" + near + "\".")
                                .orElse(" There are \"" + String.join("\", \"", names) + "\".")));
    }

    private List<String> notes(double net) {
        List<String> notes = new ArrayList<>(List.of(
                "net_rate: " + net + " " + units.rate() + "; value x weight over all lines adds up to it, within "
                        + AGREES + " of the row's gross flow. Lines of the same place add.",
                "value: a concentration as it stands in the file, before scale, offset and unit. weight: what net_rate"
                        + " grows by for each unit of it, while the water's flows, thicknesses, porosity, sorption and decay"
                        + " stand as they are. A non-detect counts half its limit, and has half the weight."));
        SoluteCautions.sentences().forEach(sentence -> notes.add("Caution: " + sentence));
        return notes;
    }

    private static void check(BudgetRow row, double net, double gross, Trace.Sum sum) {
        double difference = Math.abs(sum.value() - net);
        if (!(difference <= AGREES * gross + ROUNDING * sum.magnitude())) {
            throw new ProgramFault("The trace of \"" + row.shortName() + "\" adds up to " + sum.value()
                    + ", but the row's net rate is " + net + ".");
        }
    }
}
