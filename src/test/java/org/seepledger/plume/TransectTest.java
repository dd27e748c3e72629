package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.Periods;
import org.seepledger.balance.RandomCase;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Side;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Progress;

class TransectTest {

    /**
     * Σ q C A is not mean q × mean C × ΣA where both go together (ITRC 2010, Use and measurement of mass flux and mass
     * discharge): here 10 × 1 × 2 + 1 × 0.1 × 4 + 4 × 0.5 × 3 = 26.4.
     */
    @Test
    void massDischargeIsTheSumOverPanels() {
        Panels panels = new Panels(new double[] {2, 4, 3}, new double[] {20, 4, 12}, new double[] {20, 0.4, 6});
        assertThat(panels.discharge()).isCloseTo(26.4, within(1e-12));
        double meanTimesMean = (10 + 1 + 4) / 3.0 * (1 + 0.1 + 0.5) / 3.0 * 9;
        assertThat(meanTimesMean).isCloseTo(24, within(1e-12));
        assertThat(panels.fluxAveraged()).isCloseTo(26.4 / 36, within(1e-12));
    }

    /** Densest first: 20 of 26.4 cross 2 of 9; the half is 13.2, which takes 13.2 ÷ 20 of the first panel. */
    @Test
    void tellsThroughWhichShareOfTheAreaMassCrosses() {
        Panels panels = new Panels(new double[] {2, 4, 3}, new double[] {20, 4, 12}, new double[] {20, 0.4, 6});
        assertThat(panels.areaShareFor(0.5)).isCloseTo(2 * 13.2 / 20 / 9, within(1e-12));
        assertThat(panels.areaShareFor(0.9)).isCloseTo((2 + 3 * (23.76 - 20) / 6) / 9, within(1e-12));
        assertThat(panels.areaShareFor(1)).isCloseTo(1, within(1e-12));
        assertThat(new Panels(new double[] {1}, new double[] {0}, new double[] {0}).areaShareFor(0.5))
                .isNaN();
    }

    /** Uniform flow crosses each segment with q · n × length × thickness; the right of the line is forward. */
    @Test
    void uniformFlowCrossesByVectorArea() {
        Aquifer aquifer = SmallPlumes.uniform(7, 6, 2, 10, new double[] {0.3, -0.1, 0}, 0, 10);
        Transect line = new Transect(
                "line",
                List.of(new double[] {7, 55}, new double[] {33, 21}, new double[] {62, 21}, new double[] {62, 3}));
        Crossing crossing = TransectFlows.of(
                        aquifer,
                        List.of(SoluteDraft.of("salt", GriddedValues.constant(0.02))
                                .done()),
                        List.of(line),
                        Progress.NONE)
                .get(0);
        double[][] steps = {{26, -34}, {29, 0}, {0, -18}};
        for (int segment = 0; segment < 3; segment++) {
            double forward = 0.3 * steps[segment][1] - -0.1 * steps[segment][0];
            Panels found = crossing.panels(new Periods(aquifer.times()).record(), NonDetects.HALF, segment, 1);
            assertThat(found.discharge()).isCloseTo(0.02 * 5 * forward, within(1e-12));
            assertThat(found.area()).isCloseTo(5 * Math.hypot(steps[segment][0], steps[segment][1]), within(1e-9));
        }
        assertThat(crossing.panels(new Periods(aquifer.times()).record(), NonDetects.HALF, -1, -1)
                        .fluxAveraged())
                .isCloseTo(0.02, within(1e-14));
    }

    /** What crosses a line along a prism's sides is what leaves the prism there. */
    @Property(tries = 80)
    void agreesWithTheSidesOfAPrism(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0.05, 0.1, 0);
        double[][] values = random.values(0);
        for (double[] layer : values) {
            for (int i = 0; i < layer.length; i++) {
                layer[i] = Math.abs(layer[i]);
            }
        }
        Solute solute = SoluteDraft.of("salt", ArrayValues.steady(random.grid.columns(), values))
                .done();
        Prism prism = random.prism("a");
        List<Side> sides = prism.rings().get(0).sides();
        List<double[]> vertices = new ArrayList<>();
        sides.forEach(side -> vertices.add(new double[] {side.x(), side.y()}));
        vertices.add(vertices.get(0));
        Plume plume =
                SoluteDraft.balance(aquifer, false, List.of(prism), solute).get(0);
        Crossing crossing = TransectFlows.of(
                        aquifer, List.of(solute), List.of(new Transect("around", vertices)), Progress.NONE)
                .get(0);
        PeriodBudget budget = plume.ledger().budget(new Periods(aquifer.times()).record());
        Offset<Double> rounding = Offset.offset(1e-12 * budget.totals().throughput() + 1e-300);
        for (Entry entry : budget.entries()) {
            int segment = index(sides, entry.account().item());
            if (entry.account().group() == Group.SIDE
                    && segment >= 0
                    && entry.account().quantified()) {
                Panels panels = crossing.panels(
                        budget.period(),
                        NonDetects.HALF,
                        segment,
                        entry.account().layer());
                assertThat(panels.discharge()).isCloseTo(-entry.net(), rounding);
            }
        }
    }

    private static int index(List<Side> sides, String item) {
        for (int i = 0; i < sides.size(); i++) {
            if (sides.get(i).item().equals(item)) {
                return i;
            }
        }
        return -1;
    }
}
