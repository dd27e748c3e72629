package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.io.result.MassUnits;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Stock;

/** How much of a solute a prism holds, and how much of that rests on non-detects, in words. */
final class HoldingWords {

    private final PlumeResult result;
    private final MassUnits units;
    private final Wording wording;
    private final Stock last;

    HoldingWords(PlumeResult result, MassUnits units, Wording wording) {
        this.result = result;
        this.units = units;
        this.wording = wording;
        this.last = result.plume().whole(result.end());
    }

    /** Mass at the end and the begin, phases, concentrations, and what lies above the threshold. */
    List<String> held() {
        List<String> sentences = new ArrayList<>();
        Stock first = result.plume().whole(0);
        String phases = result.plume().solute().sorption().isEmpty()
                ? ""
                : " (" + mass(last.dissolved(NonDetects.HALF)) + " dissolved, " + mass(last.sorbed(NonDetects.HALF))
                        + " sorbed)";
        sentences.add("Holds " + mass(last.total(NonDetects.HALF)) + " at the end" + phases + ", "
                + mass(first.total(NonDetects.HALF)) + " at the begin.");
        sentences.add("At the end the mean concentration is " + concentration(last.mean()) + ", the greatest "
                + concentration(last.maximum()) + ".");
        result.above().ifPresent(above -> sentences.add(above(above)));
        return sentences;
    }

    private String above(double threshold) {
        if (last.rockAbove() == 0) {
            return "No cell has more than " + concentration(threshold) + " at the end.";
        }
        return "More than " + concentration(threshold) + " at the end: "
                + quantity(last.rockAbove() * units.volumeFactor(), wording.unit(units.volume()))
                + " of saturated rock, under " + quantity(last.areaAbove(), wording.unit(units.area()))
                + "; cells count whole, as far as they lie in the prism.";
    }

    /** What of the mass at the end rests on non-detects; nothing where there are none. */
    List<String> undetected() {
        if (last.nonDetects() == 0) {
            return List.of();
        }
        return List.of(last.nonDetects() + " of " + (last.nonDetects() + last.detects())
                + " cells are non-detects at the end, on which " + wording.percent(100 * last.undetectedShare())
                + " of the mass rests. It is from " + mass(last.total(NonDetects.ZERO))
                + ", non-detects counted as 0, to "
                + mass(last.total(NonDetects.LIMIT)) + ", as their limit: a bracket, not an estimate.");
    }

    private String mass(double mass) {
        return wording.volume(mass);
    }

    private String concentration(double value) {
        return quantity(value * result.concentrationFactor(), wording.unit(result.concentrationUnit()));
    }

    private String quantity(double value, String unit) {
        return wording.quantity(value, unit);
    }
}
