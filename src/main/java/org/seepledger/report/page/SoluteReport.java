package org.seepledger.report.page;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.table.MeasuredPanels;
import org.seepledger.ledger.Period;
import org.seepledger.report.PlumeResult;
import org.seepledger.report.Wording;

/**
 * All that a report on solutes is made of.
 *
 * @param cover what every report has
 * @param results what the run came to for each prism and solute, at least one
 * @param units the units to give
 * @param amounts whether tables give rates or masses
 * @param tables which budgets get a table of all their rows
 * @param pictures the pictures of each prism and solute, in the order of results
 * @param crossings what crosses drawn transects, each with its picture
 * @param measured what crosses measured ones
 */
public record SoluteReport(
        Cover cover,
        List<PlumeResult> results,
        MassUnits units,
        Amounts amounts,
        TableChoice tables,
        List<PlumePictures> pictures,
        List<DrawnCrossing> crossings,
        List<MeasuredPanels> measured) {

    /** Copies the lists. */
    public SoluteReport {
        results = List.copyOf(results);
        pictures = List.copyOf(pictures);
        crossings = List.copyOf(crossings);
        measured = List.copyOf(measured);
        if (pictures.size() != results.size()) {
            throw new IllegalArgumentException("pictures of " + pictures.size() + " plumes for " + results.size());
        }
    }

    /** The whole record. */
    Period record() {
        return results.get(0).budget().record().period();
    }

    BudgetFrame frame() {
        return new BudgetFrame(cover, units.ofBudget(), amounts, "masses");
    }

    Wording wording() {
        return frame().wording();
    }

    List<String> prisms() {
        return results.stream().map(PlumeResult::prism).distinct().toList();
    }

    List<String> solutes() {
        return results.stream().map(PlumeResult::solute).distinct().toList();
    }

    /** A line of a table of totals for each prism and solute. */
    List<TotalsTable.Line> lines() {
        return IntStream.range(0, results.size())
                .mapToObj(i -> new TotalsTable.Line(
                        new About(
                                results.get(i).prism(),
                                Optional.of(results.get(i).solute()),
                                "plume-" + (i + 1)),
                        results.get(i).budget()))
                .toList();
    }
}
