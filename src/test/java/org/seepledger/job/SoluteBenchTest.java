package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.io.result.MassUnits;
import org.seepledger.io.result.PlumeCsv;
import org.seepledger.io.result.Statement;
import org.seepledger.io.result.TransectCsv;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Solutes of a kept-open aquifer have the numbers of the command, interval by interval and over the record. */
class SoluteBenchTest {

    private static final Path DEPOT = Path.of("sample-aquifers/depot");
    private static final Statement NONE = new Statement("", List.of(), List.of(), List.of());

    @TempDir
    private Path folder;

    @Test
    void givesTheCommandsNumbersForTheDepot() throws IOException {
        assertCommandsNumbers(DEPOT, DEPOT.resolve("transects.geojson"), false);
        assertCommandsNumbers(DEPOT, DEPOT.resolve("transects.geojson"), true);
    }

    /** Falling water tables, dry cells, lids at elevations, wells, two layers, non-detects, sorption that is not linear. */
    @Test
    void givesTheCommandsNumbersUnderAWaterTable() throws IOException {
        Path set = folder.resolve("set");
        withSalt(set);
        Path transects = Files.writeString(folder.resolve("t.geojson"), """
                {"type": "FeatureCollection", "features": [{"type": "Feature", "properties": {"name": "a,b"},
                 "geometry": {"type": "LineString", "coordinates": [[1210, 2105], [1275, 2190], [1390, 2150]]}}]}
                """);
        assertCommandsNumbers(set, transects, true);
    }

    private static void withSalt(Path set) throws IOException {
        SmallSets.heads(set);
        Random random = new Random(20240612);
        StringBuilder salt = new StringBuilder("row,col,layer,instant,c\n");
        for (int place = 0; place < 9 * 11 * 2 * 3; place++) {
            salt.append(place % 9 + 1).append(',').append(place / 9 % 11 + 1).append(',');
            salt.append(place / 99 % 2 + 1).append(',').append(place / 198).append(',');
            salt.append(10 * random.nextDouble()).append('\n');
        }
        Files.writeString(set.resolve("salt.csv"), salt);
        Path file = set.resolve("aquifer.json");
        String text = Files.readString(file).strip();
        Files.writeString(file, text.substring(0, text.length() - 1) + """
                , "solutes": [{"name": "salt", "concentration": {"file": "salt.csv", "column": "c"}, "unit": "mg/L",
                  "detection_limit": 3, "porosity": 0.3, "bulk_density": {"value": 1700, "unit": "kg/m3"},
                  "sorption": {"isotherm": "freundlich", "kf": 0.2, "n": 0.8}, "half_life": 30,
                  "dispersion": {"longitudinal": 5, "transverse": 0.5, "vertical": 0.1}}]}
                """);
    }

    private void assertCommandsNumbers(Path set, Path transects, boolean dispersion) throws IOException {
        Path prisms = set.resolve("prisms.geojson");
        Path out = folder.resolve("out " + dispersion);
        PlumeJob.run(
                Requests.plume(set, prisms, out, Periods.Every.INTERVAL, dispersion, Optional.of(transects)),
                Progress.NONE);
        try (Workbench bench = Workbench.open(set)) {
            List<String> expected = Rows.text(out.resolve("plume.csv"));
            SoluteBench.Choice choice = new SoluteBench.Choice(dispersion, OptionalDouble.empty());
            List<Prism> drawn = bench.drawings().prisms(prisms).prisms();
            RecordPlume record = bench.solutes().record(drawn, choice, Progress.NONE);
            assertThat(rows(bench, record.plumes(), periods(bench))).isEqualTo(expected);
            assertThat(intervals(bench, drawn, choice)).containsExactlyInAnyOrderElementsOf(expected);
            assertThat(crossed(bench, transects)).isEqualTo(Rows.text(out.resolve("transect.csv")));
        }
    }

    private List<String> intervals(Workbench bench, List<Prism> drawn, SoluteBench.Choice choice) throws IOException {
        List<String> rows = new ArrayList<>();
        for (Prism prism : drawn) {
            for (Period period : periods(bench)) {
                int interval = period.parts().get(0).interval();
                IntervalPlume known = bench.solutes().interval(prism, interval, choice, Progress.NONE);
                assertThat(known.prism()).isSameAs(prism);
                List<String> own = rows(bench, known.plumes(), List.of(period));
                rows.addAll(rows.isEmpty() ? own : own.subList(1, own.size()));
            }
        }
        return rows;
    }

    private static List<Period> periods(Workbench bench) {
        return bench.periods(Periods.Every.INTERVAL, 1);
    }

    private List<String> rows(Workbench bench, List<Plume> plumes, List<Period> periods) throws IOException {
        Path file = folder.resolve("rows.csv");
        MassUnits units = bench.solutes().units(Optional.empty(), Optional.empty());
        Files.deleteIfExists(file);
        PlumeCsv.write(file, NONE, plumes, periods, bench.aquifer().times(), units);
        return Rows.text(file);
    }

    /** Interval by interval, then put together again. */
    private List<String> crossed(Workbench bench, Path file) throws IOException {
        List<Transect> transects = bench.drawings().transects(file);
        List<Crossing> all = bench.solutes().crossings(transects, OptionalInt.empty(), Progress.NONE);
        for (Period period : periods(bench)) {
            int interval = period.parts().get(0).interval();
            List<Crossing> one = bench.solutes().crossings(transects, OptionalInt.of(interval), Progress.NONE);
            for (int i = 0; i < all.size(); i++) {
                assertThat(one.get(i).panels(period, NonDetects.HALF, -1, -1).rates())
                        .isEqualTo(all.get(i)
                                .panels(period, NonDetects.HALF, -1, -1)
                                .rates());
            }
        }
        Path table = folder.resolve("transect.csv");
        Files.deleteIfExists(table);
        MassUnits units = bench.solutes().units(Optional.empty(), Optional.empty());
        TransectCsv.write(
                table,
                NONE,
                all,
                List.of(),
                periods(bench),
                bench.aquifer().times(),
                units,
                bench.aquifer().lengthUnit());
        return Rows.text(table);
    }

    @Test
    void whatWasNotAskedForHasNoNumbers() {
        try (Workbench bench = Workbench.open(DEPOT)) {
            Prism yard = bench.drawings()
                    .prisms(DEPOT.resolve("prisms.geojson"))
                    .prisms()
                    .get(0);
            SoluteBench.Choice choice = new SoluteBench.Choice(false, OptionalDouble.empty());
            IntervalPlume known = bench.solutes().interval(yard, 3, choice, Progress.NONE);
            assertThat(known.plumes()).hasSize(2);
            Plume plume = known.plumes().get(0);
            assertThat(plume.whole(2).total(NonDetects.HALF)).isNaN();
            assertThat(plume.whole(3).total(NonDetects.HALF)).isPositive();
            assertThat(plume.whole(4).total(NonDetects.HALF)).isPositive();
            assertThat(plume.ledger().budget(periods(bench).get(4)).totals().inflow())
                    .isNaN();
        }
    }

    @Test
    void everythingIsTheWholeGrid() throws IOException {
        SmallSets.flux(folder.resolve("turned"));
        try (Workbench bench = Workbench.open(folder.resolve("turned"))) {
            Prism all = bench.solutes().everything("whole set");
            assertThat(bench.budgets(List.of(all), 0, Progress.NONE).get(0).area())
                    .isEqualTo(11 * 50 * 9 * 40.0);
            assertThat(bench.solutes().solutes()).isEmpty();
        }
    }

    @Test
    void transectsThatAreWrittenAreReadAgainToTheLastBit() {
        try (Workbench bench = Workbench.open(DEPOT)) {
            Path file = folder.resolve("lines.geojson");
            List<double[]> places = List.of(new double[] {1 / 3.0, 2.2}, new double[] {100.1, 17 / 7.0});
            bench.drawings().write(file, List.of(new Transect("a \"b\"", places)));
            List<Transect> read = bench.drawings().transects(file);
            assertThat(read).hasSize(1);
            assertThat(read.get(0).name()).isEqualTo("a \"b\"");
            assertThat(read.get(0).vertices()).usingRecursiveComparison().isEqualTo(places);
            bench.drawings().write(file, List.of());
            assertThat(bench.drawings().transects(file)).isEmpty();
        }
    }

    @Test
    void closingStopsQuestions() {
        Workbench bench = Workbench.open(DEPOT);
        bench.close();
        assertThatThrownBy(() -> bench.solutes().panels(folder.resolve("none.csv")))
                .isInstanceOf(Cancelled.class);
    }
}
