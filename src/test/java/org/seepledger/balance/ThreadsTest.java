package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.Source;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** A grid so wide that it is worked through in bands of eight rows. */
class ThreadsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 1, 4000), Axis.even(0, 1, 38), 0, 1);
    private static final Prism OUTER = Prisms.of("outer", 0, 5, Shapes.box(0.5, 0.5, 3999.5, 37.5));
    private static final Prism ROUND = Prisms.of("round", 2, 3, Shapes.round(2000, 19, 17.3, 30));

    private static Aquifer aquifer() {
        FormulaValues x = FormulaValues.steady(GRID, (east, north) -> Math.sin(0.01 * east) + 1e-3 * north);
        FormulaValues y = FormulaValues.steady(GRID, (east, north) -> Math.cos(0.02 * east + 0.3 * north));
        return AquiferDraft.on(GRID)
                .layers(60, 50, 40, 30, 20, 10, 0)
                .times(0, 1, 3)
                .flow(new DarcyFlux(x, y, Optional.empty(), false, new OuterFaces(true, false, false)))
                .source(new Source.Areal("recharge", x))
                .done();
    }

    private static Balance balance(int threads, Progress progress) {
        return WaterBalance.of(aquifer(), List.of(OUTER, ROUND), WellRule.POINT, threads, progress);
    }

    @Test
    void theNumberOfThreadsDoesNotChangeOneBit() {
        Balance alone = balance(1, Progress.NONE);
        Balance four = balance(4, Progress.NONE);
        Period record = new Periods(aquifer().times()).record();
        for (int prism = 0; prism < 2; prism++) {
            assertThat(four.ledgers().get(prism).budget(record))
                    .isEqualTo(alone.ledgers().get(prism).budget(record));
        }
        assertThat(four.whereabouts()).isEqualTo(alone.whereabouts());
        assertThat(four.notes()).isEqualTo(alone.notes());
        for (int row = 0; row < GRID.rows(); row++) {
            assertThat(four.imbalance().row(3, row)).isEqualTo(alone.imbalance().row(3, row));
        }
    }

    @Test
    void tellsOfEachBandAndInterval() {
        AtomicLong announced = new AtomicLong();
        AtomicInteger done = new AtomicInteger();
        balance(2, new Progress() {
            @Override
            public void begin(String what, long steps) {
                announced.set(steps);
            }

            @Override
            public void step() {
                done.incrementAndGet();
            }
        });
        // 38 rows in bands of 8 are 5 bands; two intervals.
        assertThat(announced.get()).isEqualTo(10);
        assertThat(done.get()).isEqualTo(10);
    }

    @Test
    void stopsOnRequest() {
        Progress stopping = new Progress() {
            @Override
            public void begin(String what, long steps) {}

            @Override
            public void step() {
                throw new Cancelled();
            }
        };
        assertThatThrownBy(() -> balance(2, stopping)).isInstanceOf(Cancelled.class);
    }

    @Test
    void aFaultInABandComesOutAsItIs() {
        GriddedValues broken = FormulaValues.steady(GRID, (east, north) -> {
            throw new IllegalStateException("unreadable");
        });
        Aquifer aquifer = AquiferDraft.on(GRID)
                .source(new Source.Areal("recharge", broken))
                .done();
        assertThatThrownBy(() -> WaterBalance.of(
                        aquifer,
                        List.of(Prisms.of("a", 0, 0, Shapes.box(1, 1, 3, 30))),
                        WellRule.POINT,
                        2,
                        Progress.NONE))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("unreadable");
    }

    @Test
    void asksOnlyForThePrismsWindowAndARingAroundIt() {
        Grid grid = new Grid(Axis.even(0, 1, 100), Axis.even(0, 1, 100), 0, 1);
        AtomicInteger nearest = new AtomicInteger(Integer.MAX_VALUE);
        GriddedValues watched = FormulaValues.steady(grid, (east, north) -> {
            nearest.accumulateAndGet((int) Math.min(east, north), Math::min);
            return 1;
        });
        Aquifer aquifer = AquiferDraft.on(grid)
                .source(new Source.Areal("recharge", watched))
                .done();
        BudgetReading.of(aquifer, Prisms.of("a", 0, 0, Shapes.box(60, 70, 62, 72)));
        assertThat(nearest.get()).isEqualTo(59);
    }
}
