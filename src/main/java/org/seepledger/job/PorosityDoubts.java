package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;
import org.seepledger.io.aquifer.Quantity;
import org.seepledger.io.table.StepKind;
import org.seepledger.progress.Progress;
import org.seepledger.report.ValueRange;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/** Finds cells whose effective porosity is greater than their porosity: water would move through more than the pores. */
final class PorosityDoubts {

    private PorosityDoubts() {}

    /**
     * By how much one quantity is greater than another.
     *
     * @param greater the one
     * @param lesser the other; neither changes in time
     */
    private record Excess(GriddedValues greater, GriddedValues lesser) implements GriddedValues {

        @Override
        public void read(int layer, int step, Window window, double[] target, int offset) {
            double[] taken = new double[window.size()];
            lesser.read(layer, step, window, taken, 0);
            greater.read(layer, step, window, target, offset);
            for (int i = 0; i < taken.length; i++) {
                target[offset + i] -= taken[i];
            }
        }

        @Override
        public boolean changes() {
            return false;
        }

        @Override
        public boolean layered() {
            return greater.layered() || lesser.layered();
        }
    }

    static List<String> of(Aquifer aquifer, List<Solute> solutes, Progress progress) {
        List<String> doubts = new ArrayList<>();
        for (Solute solute : solutes) {
            if (solute.porosity().isPresent()) {
                Excess excess = new Excess(
                        solute.effectivePorosity().orElseThrow(),
                        solute.porosity().get());
                Quantity quantity = new Quantity(solute.name(), Measure.number(), StepKind.NONE, excess);
                ValueRange range =
                        Survey.of(aquifer, List.of(quantity), progress).get(0);
                if (range.greatest() > 0) {
                    doubts.add("\"effective porosity of " + solute.name() + "\" is greater than \"porosity of "
                            + solute.name() + "\", most by " + Figures.shown(range.greatest()) + " at "
                            + range.greatestAt() + ": water cannot move through more than all the pores.");
                }
            }
        }
        return doubts;
    }
}
