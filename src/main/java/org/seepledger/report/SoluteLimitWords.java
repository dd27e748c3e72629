package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Solute;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Stock;

/** What a solute's budget cannot carry, in words. */
final class SoluteLimitWords {

    private final PlumeResult result;
    private final Wording wording;

    SoluteLimitWords(PlumeResult result, Wording wording) {
        this.result = result;
        this.wording = wording;
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>();
        addResidual(sentences);
        addBracket(sentences);
        Solute solute = result.plume().solute();
        if (Double.isFinite(result.plume().doubts().shortestDispersivity())) {
            sentences.add(
                    "A concentration taken from the cell upstream spreads like a longitudinal dispersivity of half a"
                            + " cell, up to " + length(result.plume().doubts().widestHalfCell()) + " here; given is "
                            + length(result.plume().doubts().shortestDispersivity())
                            + " or more. Differences between neighbouring sides finer than that are not resolved.");
        }
        if (solute.decay().dissolved().isPresent() || solute.decay().sorbed().isPresent()) {
            sentences.add(
                    "Decay follows from the half-life that was given; the budget does not show that anything decays.");
        }
        if (!solute.concentration().orElseThrow().simulated()) {
            sentences.add(
                    "Concentrations between the places where they were measured are interpretation, which no number here"
                            + " can check.");
        }
        return sentences;
    }

    private void addResidual(List<String> sentences) {
        double residual = Math.abs(result.budget().record().totals().residual());
        double time = result.budget().record().period().duration();
        if (!result.budget().storageKnown() || result.budget().closesToRounding()) {
            return;
        }
        List<String> smaller = Term.bySize(result.budget().terms()).stream()
                .filter(term -> term.gross() > 0 && term.gross() < residual)
                .map(term -> term.name() + " (" + wording.rate(term.gross(), time) + ")")
                .toList();
        if (!smaller.isEmpty()) {
            sentences.add("Smaller than what is unexplained (" + wording.rate(residual, time)
                    + "), so that the budget neither supports nor contradicts them: " + Wording.listed(smaller) + ".");
        }
    }

    private void addBracket(List<String> sentences) {
        Stock first = result.plume().whole(0);
        Stock last = result.plume().whole(result.end());
        double change = Math.abs(last.total(NonDetects.HALF) - first.total(NonDetects.HALF));
        double width = Math.max(width(first), width(last));
        if (width > change) {
            sentences.add("Non-detects alone leave " + wording.volume(width)
                    + " of the mass open, more than the change of mass over the record (" + wording.volume(change)
                    + ").");
        }
    }

    private static double width(Stock stock) {
        return stock.total(NonDetects.LIMIT) - stock.total(NonDetects.ZERO);
    }

    private String length(double value) {
        return wording.quantity(value, wording.unit(result.aquifer().lengthUnit()));
    }
}
