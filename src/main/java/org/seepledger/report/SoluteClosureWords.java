package org.seepledger.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;

/** Whether a solute's budget closes, beside the water's, in words. */
final class SoluteClosureWords {

    private static final double ROUNDING = 1e-9;
    private static final int NAMED = 3;

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
        if (result.budget().storageKnown()) {
            addCutting(sentences);
        }
        return sentences;
    }

    /** What of the residual is the work of sides and lids that cut cells, where that is more than rounding. */
    private void addCutting(List<String> sentences) {
        PeriodBudget record = result.budget().record();
        double[] byAccount = result.plume().cutting(record.period());
        double cutting = Arrays.stream(byAccount).sum();
        double gross = Arrays.stream(byAccount).map(Math::abs).sum();
        double time = record.period().duration();
        if (!(gross > ROUNDING * record.totals().throughput())) {
            return;
        }
        Map<String, Double> items = new TreeMap<>();
        for (int i = 0; i < byAccount.length; i++) {
            items.merge(record.entries().get(i).account().name(), byAccount[i], Double::sum);
        }
        List<String> largest = items.entrySet().stream()
                .sorted(Comparator.comparingDouble(item -> -Math.abs(item.getValue())))
                .limit(NAMED)
                .map(item -> item.getKey() + " (" + wording.rate(item.getValue(), time) + ")")
                .toList();
        sentences.add("Sides and lids that cut cells put " + wording.rate(cutting, time)
                + " into what is unexplained, net; the largest: " + Wording.listed(largest)
                + ". There a cell's own concentration counts all through it, while what it gains and loses is kept at its"
                + " faces; sides along cell faces, or smaller cells, leave less. The other "
                + wording.rate(record.totals().residual() - cutting, time)
                + " are what the cells inside do not balance by themselves.");
    }

    private String ofWater(double percent) {
        double rounding = BudgetCourse.ROUNDING_PERCENT;
        return Math.abs(percent) < rounding ? "rounding alone" : wording.percent(percent);
    }
}
