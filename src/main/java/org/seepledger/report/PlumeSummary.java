package org.seepledger.report;

import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.io.result.MassUnits;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.SoluteCautions;
import org.seepledger.unit.Figures;

/**
 * The summary of a solute balance on the terminal: first the warnings, then for each prism and solute how much there is,
 * how well it closes, and what dominates.
 */
public final class PlumeSummary {

    private final MassUnits units;
    private final Wording wording;
    private final StringBuilder text = new StringBuilder();

    private PlumeSummary(MassUnits units) {
        this.units = units;
        this.wording = Wording.plain(units.ofBudget());
    }

    /**
     * {@return the summary as lines of text}
     *
     * @param aquifer the aquifer
     * @param results what the run came to for each prism and solute, at least one
     * @param units the units to show
     * @param warnings what the reader must know
     * @param notes lesser remarks
     */
    public static String of(
            Aquifer aquifer, List<PlumeResult> results, MassUnits units, List<String> warnings, List<String> notes) {
        PlumeSummary summary = new PlumeSummary(units);
        summary.writeHead(aquifer, results);
        summary.writeList("Warnings", warnings);
        results.forEach(summary::write);
        summary.writeList("Notes", notes);
        summary.text.append('\n').append(String.join(" ", SoluteCautions.sentences()));
        summary.text.append('\n').append(Disclaimer.text()).append('\n');
        return summary.text.toString();
    }

    private void writeHead(Aquifer aquifer, List<PlumeResult> results) {
        int solutes = (int) results.stream().map(PlumeResult::solute).distinct().count();
        Period record = results.get(0).budget().record().period();
        text.append("Solute budget of \"").append(aquifer.name()).append("\": ");
        text.append(Wording.counted(results.size() / solutes, "prism")).append(", ");
        text.append(Wording.counted(solutes, "solute"));
        text.append(", time ").append(Figures.shown(record.from())).append(" to ");
        text.append(Figures.shown(record.to())).append(' ').append(aquifer.timeUnit());
        text.append(". Rates are means over the record.\n");
    }

    private void writeList(String title, List<String> lines) {
        if (!lines.isEmpty()) {
            text.append('\n').append(title).append('\n');
            lines.forEach(line -> text.append("  - ").append(line).append('\n'));
        }
    }

    private void write(PlumeResult result) {
        text.append('\n')
                .append(result.prism())
                .append(": ")
                .append(result.solute())
                .append('\n');
        HoldingWords holding = new HoldingWords(result, units, wording);
        holding.held().forEach(this::writeLine);
        holding.undetected().forEach(this::writeLine);
        new SoluteClosureWords(result, wording).sentences().forEach(this::writeLine);
        LargestTerms.append(text, result.budget(), units.ofBudget());
    }

    private void writeLine(String words) {
        text.append("  ").append(words).append('\n');
    }
}
