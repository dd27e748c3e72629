package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.aquifer.Window;
import org.seepledger.fault.ProgramFault;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.progress.Progress;

/** Where a budget does not close, and the sums that tell. */
class ImbalanceTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 4), Axis.even(0, 1, 3), 0, 1);

    private static Balance balance(Aquifer aquifer, Prism prism) {
        return WaterBalance.of(aquifer, List.of(prism), WellRule.POINT, 1, Progress.NONE);
    }

    @Test
    void eachCellShowsWhatItGainsThatNothingAccountsForAsTheMeanOfTheRecord() {
        double[] first = {1, -2, 3, 4, 5, -6, 7, 8, 9, 10, 11, 12};
        double[] second = new double[12];
        PointRate pump = new PointRate("P", "pumping", 0.5, 2.5, new Screen.InLayer(0), 0, 4, -8, "wells.csv");
        Aquifer aquifer = AquiferDraft.on(GRID)
                .times(0, 1, 4)
                .source(new Source.Cells("exchange", new ArrayValues(4, new double[][][] {{first}, {second}})))
                .source(new Source.Points("pumping", Well.of(List.of(pump))))
                .done();
        Balance balance = balance(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 0.5, 2.5, 3)));
        assertThat(balance.imbalance().window()).isEqualTo(new Window(0, 0, 3, 3));
        assertThat(balance.imbalance().layers()).isEqualTo(1);
        assertThat(balance.imbalance().at(0, 0, 0)).isEqualTo(0.25 - 8);
        assertThat(balance.imbalance().row(0, 1)).containsExactly(1.25, -1.5, 1.75);
        Whereabouts whereabouts = balance.whereabouts().get(0);
        assertThat(whereabouts.prism()).isEqualTo("a");
        // Column 3 and the last row are half covered.
        double magnitude = 7.75 + 0.5 + 0.375 + 1.25 + 1.5 + 0.875 + 0.5 * 2.25 + 0.5 * 2.5 + 0.25 * 2.75;
        assertThat(whereabouts.magnitude()).isEqualTo(magnitude, within(1e-12));
        assertThat(whereabouts.largest())
                .containsExactly(
                        new HotSpot(0, 0, 0, -7.75),
                        new HotSpot(0, 1, 1, -1.5),
                        whereabouts.largest().get(2),
                        whereabouts.largest().get(3),
                        new HotSpot(0, 2, 0, 1.125));
        assertThat(whereabouts.largest().subList(2, 4))
                .containsExactlyInAnyOrder(new HotSpot(0, 1, 0, 1.25), new HotSpot(0, 2, 1, 1.25));
    }

    @Test
    void aCellThatIsNeverActiveHasNoneAndOneThatSometimesIsCountsThen() {
        double none = Double.NaN;
        double[][][] heads = {
            {{none, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5}},
            {{5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5}},
            {{5, none, 5, 5, 5, 5, 5, 5, 5, 5, 5, none}},
            {{5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5}}
        };
        Aquifer aquifer = AquiferDraft.on(GRID)
                .times(0, 1, 2, 3)
                .head(new ArrayValues(4, heads))
                .source(new Source.Areal("recharge", ArrayValues.steady(4, heads[1][0])))
                .done();
        Imbalance imbalance =
                balance(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 0, 4, 3))).imbalance();
        assertThat(imbalance.at(0, 0, 0)).isEqualTo(10 / 3.0, within(1e-14));
        assertThat(imbalance.at(0, 0, 1)).isEqualTo(5 / 3.0, within(1e-14));
        assertThat(imbalance.at(0, 0, 2)).isEqualTo(5, within(1e-14));
        double[][][] dead = {{{none, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5, 5}}};
        Balance still = balance(
                AquiferDraft.on(GRID).head(new ArrayValues(4, dead)).done(),
                Prisms.of("a", 0, 0, Shapes.box(0, 0, 4, 3)));
        assertThat(still.imbalance().at(0, 0, 0)).isNaN();
        assertThat(still.imbalance().at(0, 0, 1)).isZero();
        assertThat(still.whereabouts().get(0).largest()).isEmpty();
        assertThat(still.whereabouts().get(0).magnitude()).isZero();
    }

    @Test
    void onlyThePrismsOwnLayersCount() {
        ArrayValues rates = ArrayValues.steady(4, new double[12], new double[] {1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1, 1});
        Aquifer aquifer = AquiferDraft.on(GRID)
                .layers(9, 5, 0)
                .source(new Source.Cells("exchange", rates))
                .done();
        double[] box = Shapes.box(1, 1, 3, 2);
        assertThat(balance(aquifer, Prisms.of("a", 0, 0, box))
                        .whereabouts()
                        .get(0)
                        .magnitude())
                .isZero();
        assertThat(balance(aquifer, Prisms.of("a", 0, 1, box))
                        .whereabouts()
                        .get(0)
                        .magnitude())
                .isEqualTo(2);
    }

    @Test
    void sumsKeepWhatPlainOnesLose() {
        Sums sums = new Sums(2);
        for (double value : new double[] {1, 1e100, 1, -1e100}) {
            sums.add(0, value);
        }
        sums.add(1, 5);
        // Neumaier (1974): plain summation gives 0, Kahan's too.
        assertThat(sums.get(0)).isEqualTo(2);
        Sums more = new Sums(2);
        more.add(0, 1e100);
        more.add(0, 1);
        more.add(1, 0.5);
        sums.add(more);
        Sums less = new Sums(2);
        less.add(0, -1e100);
        sums.add(less);
        assertThat(sums.toArray()).containsExactly(3, 5.5);
    }

    @Test
    void aPieceThatTheFlowTurnsInIsSplitWhereItTurns() {
        Tally tally = new Tally(2, 1);
        tally.throughPiece(0, 6, -2);
        // Out over three quarters of its length: 6 × 3/4 ÷ 2; in over the rest: 2 × 1/4 ÷ 2.
        assertThat(tally.outflow()[0]).isEqualTo(2.25);
        assertThat(tally.inflow()[0]).isEqualTo(0.25);
        tally.throughPiece(1, -2, 6);
        assertThat(tally.outflow()[1]).isEqualTo(2.25);
        assertThat(tally.inflow()[1]).isEqualTo(0.25);
        tally.throughPiece(0, 0, 3);
        tally.throughPiece(0, -4, 0);
        assertThat(tally.outflow()[0]).isEqualTo(3.75);
        assertThat(tally.inflow()[0]).isEqualTo(2.25);
        tally.throughFace(1, -3);
        tally.throughFace(1, 4);
        assertThat(tally.outflow()[1]).isEqualTo(6.25);
        assertThat(tally.inflow()[1]).isEqualTo(3.25);
    }

    @Test
    void routesThatDisagreeAreAFaultOfTheProgram() {
        Tally tally = new Tally(1, 1);
        assertThat(tally.disagreement()).isZero();
        tally.throughFace(0, 10);
        tally.fromVolume(10 - 3e-12, 5);
        assertThat(tally.disagreement()).isEqualTo(6e-13, within(2e-13));
        tally.check("a", 0, 1e-12);
        tally.fromVolume(-1e-11, 0);
        assertThatThrownBy(() -> tally.check("a", 2, 1e-12))
                .isInstanceOf(ProgramFault.class)
                .hasMessageContaining("\"a\" in interval 3");
    }
}
