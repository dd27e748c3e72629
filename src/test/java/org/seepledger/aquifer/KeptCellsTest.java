package org.seepledger.aquifer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.seepledger.fault.DataFault;

/** What is kept of an aquifer is what the aquifer itself would say. */
class KeptCellsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 10, 200), Axis.even(0, 10, 200), 0, 1);
    private static final long PLENTY = 1L << 30;
    private static final Window WINDOW = new Window(90, 80, 20, 30);

    private final AtomicInteger reads = new AtomicInteger();

    private Aquifer aquifer(GriddedValues rain) {
        return AquiferDraft.on(GRID)
                .layers(30, 20, 0)
                .times(0, 1, 2, 3, 4)
                .source(new Source.Areal("rain", rain))
                .done();
    }

    private GriddedValues counted(GriddedValues values) {
        return new GriddedValues() {
            @Override
            public void read(int layer, int step, Window window, double[] target, int offset) {
                reads.incrementAndGet();
                values.read(layer, step, window, target, offset);
            }

            @Override
            public boolean changes() {
                return values.changes();
            }

            @Override
            public boolean layered() {
                return values.layered();
            }
        };
    }

    private static GriddedValues rain() {
        return FormulaValues.steady(GRID, (east, north) -> 1e-3 * (east + 2 * north));
    }

    private static double[] rain(KnownCells known, Window window, int interval) {
        CellGeometry geometry = known.geometry(window);
        IntervalState state = known.state(interval, geometry, List.of());
        double[] rates = new double[window.size()];
        for (int row = window.row(); row < window.rowEnd(); row++) {
            for (int column = window.column(); column < window.columnEnd(); column++) {
                int cell = geometry.block().cell(0, row, column);
                rates[window.index(row, column)] = state.terms().get(0).rates()[cell];
            }
        }
        assertThat(geometry.inner()).isEqualTo(window);
        return rates;
    }

    @Test
    void aWindowThatMovedALittleIsNotReadAgain() {
        Aquifer aquifer = aquifer(counted(rain()));
        KeptCells kept = new KeptCells(aquifer, PLENTY);
        rain(kept.around(WINDOW), WINDOW, 0);
        int once = reads.get();
        Window moved = new Window(95, 75, 22, 30);
        double[] rates = rain(kept.around(moved), moved, 0);
        assertThat(reads.get()).isEqualTo(once);
        assertThat(rates).isEqualTo(rain(aquifer, moved, 0));
    }

    @Test
    void eachIntervalIsItsOwn() {
        Aquifer aquifer = aquifer(counted(rain()));
        KeptCells kept = new KeptCells(aquifer, PLENTY);
        rain(kept.around(WINDOW), WINDOW, 0);
        int once = reads.get();
        rain(kept.around(WINDOW), WINDOW, 1);
        assertThat(reads.get()).isGreaterThan(once);
    }

    @Test
    void keepsNoMoreThanItMay() {
        Aquifer aquifer = aquifer(rain());
        long limit = 3_000_000;
        KeptCells kept = new KeptCells(aquifer, limit);
        for (int i = 0; i < 12; i++) {
            Window window = new Window(10 * i, 12 * i, 20, 30);
            rain(kept.around(window), window, i % 4);
            assertThat(kept.bytes()).isPositive().isLessThanOrEqualTo(limit);
        }
    }

    @Test
    void passesOnWhatIsTooLargeToKeep() {
        Aquifer aquifer = aquifer(rain());
        assertThat(new KeptCells(aquifer, 1000).around(WINDOW)).isSameAs(aquifer);
    }

    @Test
    void badDataBesideTheWindowDoNotMatterAndBadDataInItDo() {
        GriddedValues sound = FormulaValues.steady(GRID, (east, north) -> 20);
        GriddedValues crossing = FormulaValues.steady(GRID, (east, north) -> east < 700 ? 25 : 10);
        Aquifer drafted = aquifer(rain());
        Aquifer aquifer = new Aquifer(
                drafted.name(),
                GRID,
                List.of(
                        new Layer("upper", Optional.of(sound), crossing, false),
                        new Layer("lower", Optional.empty(), GriddedValues.constant(0), false)),
                drafted.times(),
                drafted.flow(),
                drafted.head(),
                drafted.storage(),
                drafted.sources(),
                drafted.lengthUnit(),
                drafted.timeUnit());
        KeptCells kept = new KeptCells(aquifer, PLENTY);
        assertThat(rain(kept.around(WINDOW), WINDOW, 0)).isEqualTo(rain(aquifer, WINDOW, 0));
        Window bad = new Window(90, 60, 20, 30);
        assertThatThrownBy(() -> kept.around(bad).geometry(bad)).isInstanceOf(DataFault.class);
    }
}
