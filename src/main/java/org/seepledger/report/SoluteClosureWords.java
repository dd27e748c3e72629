package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.Totals;

/** Whether a solute's budget closes, beside the water's, in words. */
final class SoluteClosureWords {

    private final PlumeResult result;
    private final Wording wording;

    SoluteClosureWords(PlumeResult result, Wording wording) {
        this.result = result;
        this.wording = wording;
    }

    List<String> sentences() {
        List<String> sentences = new ArrayList<>(new ClosureWords(result.budget(), wording).inShort());
        Totals water = result.water().totals();
        if (result.budget().storageKnown() && !Double.isNaN(water.closureError())) {
            sentences.add("The water's own closure error is " + ofWater(water.closureError())
                    + ": what the solute's has beyond that comes from concentrations and their changes.");
        }
        return sentences;
    }

    private String ofWater(double percent) {
        double rounding = BudgetCourse.ROUNDING_PERCENT;
        return Math.abs(percent) < rounding ? "rounding alone" : wording.percent(percent);
    }
}
