package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.fault.DataFault;
import org.seepledger.io.result.BudgetCsv;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** A kept-open aquifer gives the numbers of the command, however and whenever it is asked. */
class WorkbenchTest {

    private static final Path TERRACE = Path.of("sample-aquifers/terrace");
    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    @TempDir
    private Path folder;

    @Test
    void givesTheCommandsNumbersForTheValley() throws IOException {
        assertCommandsNumbers(VALLEY);
    }

    @Test
    void givesTheCommandsNumbersForTheTerrace() throws IOException {
        assertCommandsNumbers(TERRACE);
    }

    @Test
    void givesTheCommandsNumbersForLidsAtElevations() throws IOException {
        SmallSets.heads(folder.resolve("set"));
        assertCommandsNumbers(folder.resolve("set"));
    }

    @Test
    void givesTheCommandsNumbersForPrismsCutAtTheGridsEdge() throws IOException {
        SmallSets.flux(folder.resolve("set"));
        assertCommandsNumbers(folder.resolve("set"));
    }

    @Test
    void givesTheCommandsNumbersForFaceFlows() throws IOException {
        SmallSets.faces(folder.resolve("set"));
        assertCommandsNumbers(folder.resolve("set"));
    }

    private void assertCommandsNumbers(Path set) throws IOException {
        Path prisms = set.resolve("prisms.geojson");
        Path out = folder.resolve("out");
        BalanceJob.run(Requests.byInterval(set, prisms, out), Progress.NONE);
        try (Workbench bench = Workbench.open(set)) {
            List<Prism> drawn = bench.drawings().prisms(prisms).prisms();
            List<Period> periods = bench.periods(Periods.Every.INTERVAL, 1);
            List<PrismBudget> byInterval = new ArrayList<>();
            for (Prism prism : drawn) {
                List<PeriodBudget> budgets = IntStream.range(0, periods.size())
                        .mapToObj(interval -> budget(bench, prism, interval))
                        .toList();
                byInterval.add(new PrismBudget(prism.name(), budgets));
            }
            List<PrismBudget> byRecord = bench.record(drawn, Progress.NONE).balance().ledgers().stream()
                    .map(ledger -> new PrismBudget(
                            ledger.prism(), periods.stream().map(ledger::budget).toList()))
                    .toList();
            List<String> expected = Rows.text(out.resolve("budget.csv"));
            assertThat(rows(bench, byInterval, "intervals.csv")).isEqualTo(expected);
            assertThat(rows(bench, byRecord, "record.csv")).isEqualTo(expected);
        }
    }

    private List<String> rows(Workbench bench, List<PrismBudget> budgets, String name) throws IOException {
        Path file = folder.resolve(name);
        BudgetCsv.write(
                file,
                new Statement("", List.of(), List.of(), List.of()),
                budgets,
                bench.aquifer().times(),
                bench.units(Optional.empty(), Optional.empty()));
        return Rows.text(file);
    }

    private static PeriodBudget budget(Workbench bench, Prism prism, int interval) {
        return bench.budgets(List.of(prism), interval, Progress.NONE).get(0).budget();
    }

    /** A round prism that wanders over the middle of the valley. */
    private static Prism wandering(Workbench bench, int step) {
        var grid = bench.aquifer().grid();
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        double radius = 0.15 * Math.min(width, height);
        double x = grid.mapX(width * (0.3 + 0.04 * step), height * 0.5);
        double y = grid.mapY(width * (0.3 + 0.04 * step), height * 0.5);
        return Prisms.of("wandering", 0, 1, Shapes.round(x, y, radius, 24));
    }

    @Test
    void doesNotDependOnWhatWasAskedBefore() {
        try (Workbench asked = Workbench.open(VALLEY)) {
            for (int step = 0; step < 10; step++) {
                budget(asked, wandering(asked, step), step % 3);
            }
            for (int step : new int[] {2, 9, 0}) {
                try (Workbench fresh = Workbench.open(VALLEY)) {
                    assertThat(budget(asked, wandering(asked, step), 1))
                            .isEqualTo(budget(fresh, wandering(fresh, step), 1));
                }
            }
        }
    }

    @Test
    void answersManyThreadsAtOnce() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try (Workbench bench = Workbench.open(VALLEY)) {
            List<Callable<PeriodBudget>> questions = new ArrayList<>();
            for (int i = 0; i < 40; i++) {
                int step = i % 5;
                questions.add(() -> budget(bench, wandering(bench, step), step % 2));
            }
            List<Future<PeriodBudget>> answers = threads.invokeAll(questions);
            for (int i = 5; i < answers.size(); i++) {
                assertThat(answers.get(i).get()).isEqualTo(answers.get(i - 5).get());
            }
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void stopsOnRequest() {
        Progress stopping = new Progress() {
            @Override
            public void begin(String what, long steps) {
                throw new Cancelled();
            }

            @Override
            public void step() {}
        };
        try (Workbench bench = Workbench.open(VALLEY)) {
            List<Prism> prisms = List.of(wandering(bench, 3));
            assertThatThrownBy(() -> bench.budgets(prisms, 0, stopping)).isInstanceOf(Cancelled.class);
            assertThatThrownBy(() -> bench.record(prisms, stopping)).isInstanceOf(Cancelled.class);
        }
    }

    @Test
    void closingStopsWhatIsUnderWay() throws Exception {
        Workbench bench = Workbench.open(VALLEY);
        List<Prism> prisms = List.of(wandering(bench, 3));
        ExecutorService thread = Executors.newSingleThreadExecutor();
        try {
            Progress closing = new Progress() {
                private boolean begun;

                @Override
                public void begin(String what, long steps) {}

                @Override
                public void step() {
                    if (!begun) {
                        begun = true;
                        thread.execute(bench::close);
                        waitUntilClosing(bench);
                    }
                }
            };
            assertThatThrownBy(() -> bench.record(prisms, closing)).isInstanceOf(Cancelled.class);
        } finally {
            thread.shutdown();
        }
        assertThatThrownBy(() -> bench.budgets(prisms, 0, Progress.NONE)).isInstanceOf(Cancelled.class);
    }

    private static void waitUntilClosing(Workbench bench) {
        try {
            while (true) {
                bench.views().quantities();
            }
        } catch (Cancelled e) {
            // It has begun to close, and waits for those who still ask.
        }
    }

    @Test
    void saysWhatIsWrongWithADrawing() {
        try (Workbench bench = Workbench.open(TERRACE)) {
            Prism away = Prisms.of("away", 0, 0, Shapes.box(-9e6, -9e6, -8e6, -8e6));
            assertThatThrownBy(() -> budget(bench, away, 0))
                    .isInstanceOf(DataFault.class)
                    .hasMessageContaining("away")
                    .hasMessageContaining("outside the grid");
            var grid = bench.aquifer().grid();
            double x = grid.mapX(500, 500);
            double y = grid.mapY(500, 500);
            Prism bow = Prisms.of("bow", 0, 0, x, y, x + 400, y + 300, x + 400, y, x, y + 300);
            assertThatThrownBy(() -> budget(bench, bow, 0))
                    .isInstanceOf(DataFault.class)
                    .hasMessageContaining("crosses or touches itself");
        }
    }

    @Test
    void saysWhatItCutOff() throws IOException {
        SmallSets.flux(folder.resolve("set"));
        try (Workbench bench = Workbench.open(folder.resolve("set"))) {
            List<Prism> drawn = bench.drawings()
                    .prisms(folder.resolve("set/prisms.geojson"))
                    .prisms();
            Prism wide = Prisms.of("wide", 0, 1, Shapes.box(900, 2050, 1100, 2200));
            assertThat(bench.budgets(List.of(wide), 0, Progress.NONE).get(0).notes())
                    .singleElement()
                    .asString()
                    .contains("\"wide\"", "cut at the grid's edge");
            assertThat(drawn).hasSize(2);
        }
    }
}
