package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.intake.Composition;
import org.seepledger.intake.Item;
import org.seepledger.intake.LooseFolder;
import org.seepledger.intake.LooseValley;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Proposal;
import org.seepledger.intake.Role;
import org.seepledger.intake.Use;
import org.seepledger.intake.Wishes;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.io.aquifer.AquiferReader;
import org.seepledger.io.result.FileRecord;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;
import org.seepledger.sample.SampleCopy;

class IntakeJobTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    @TempDir
    private Path folder;

    private Path loose;
    private Path target;

    @BeforeEach
    void scatter() throws IOException {
        loose = folder.resolve("loose");
        target = folder.resolve("made");
        LooseValley.scatter(loose);
    }

    private Plan plan() {
        return LooseValley.corrected(Proposal.of(IntakeJob.look(List.of(loose), Progress.NONE)));
    }

    private static Map<String, FileRecord> contents(Path folder) throws IOException {
        Map<String, FileRecord> contents = new TreeMap<>();
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                String name = folder.relativize(file).toString();
                contents.put(name, FileRecord.of(name, file));
            }
        }
        return contents;
    }

    private List<String> left() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    private List<String> budget(Path set) throws IOException {
        return budget(set, VALLEY.resolve("prisms.geojson"));
    }

    private List<String> budget(Path set, Path prisms) throws IOException {
        Path out = folder.resolve("budget of " + set.getFileName());
        BalanceJob.run(Requests.byInterval(set, prisms, out), Progress.NONE);
        return Rows.text(out.resolve("budget.csv"));
    }

    @Test
    void theValleysLooseFilesGiveTheBudgetOfTheShippedFolderDigitForDigit() throws IOException {
        Map<String, FileRecord> before = contents(loose);
        Composition composition = Composition.of(plan(), false);
        assertThat(composition.findings()).isEmpty();
        IntakeJob.write(composition, target, 2, Progress.NONE);
        assertThat(budget(target)).isEqualTo(budget(VALLEY));
        assertThat(contents(loose)).isEqualTo(before);
    }

    @Test
    void theCheckSaysWhatInspectWillSay() {
        Composition composition = Composition.of(plan(), false);
        String checked = IntakeJob.check(composition, 2, Progress.NONE).text();
        IntakeJob.write(composition, target, 2, Progress.NONE);
        assertThat(checked).isEqualTo(InspectJob.run(target, 2, Progress.NONE));
    }

    @Test
    void cancellingLeavesNothing() throws IOException {
        Composition composition = Composition.of(plan(), false);
        int[] steps = {0};
        Progress stopping = new Progress() {
            @Override
            public void begin(String what, long count) {}

            @Override
            public void step() {
                if (++steps[0] > 40) {
                    throw new Cancelled();
                }
            }
        };
        assertThatThrownBy(() -> IntakeJob.write(composition, target, 2, stopping))
                .isInstanceOf(Cancelled.class);
        assertThat(left()).containsExactly("loose");
    }

    @Test
    void aFailedWriteLeavesNothing() throws IOException {
        Composition composition = Composition.of(plan(), false);
        Path broken = loose.resolve("parameters/kx-layer-2.tiff");
        Files.write(broken, java.util.Arrays.copyOf(Files.readAllBytes(broken), 500));
        assertThatThrownBy(() -> IntakeJob.write(composition, target, 2, Progress.NONE))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("conductivity_l2.tif");
        assertThat(left()).containsExactly("loose");
    }

    @Test
    void aFolderThatIsNotEmptyIsRefused() throws IOException {
        Files.createDirectories(target);
        Files.writeString(target.resolve("mine.txt"), "mine");
        Composition composition = Composition.of(plan(), false);
        assertThatThrownBy(() -> IntakeJob.write(composition, target, 2, Progress.NONE))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("not empty");
        assertThat(contents(target)).containsOnlyKeys("mine.txt");
        assertThat(left()).containsExactly("loose", "made");
    }

    @Test
    void anEmptyFolderWillDo() throws IOException {
        Files.createDirectories(target);
        IntakeJob.write(Composition.of(plan(), false), target, 2, Progress.NONE);
        assertThat(target.resolve("aquifer.json")).exists();
    }

    @Test
    void filesWhoseNamesCountAsTheyMustAreDescribedWhereTheyLie() throws IOException {
        Path place = folder.resolve("place");
        SampleCopy.of("valley", place, name -> !name.equals("aquifer.json"));
        Map<String, FileRecord> before = contents(place);
        Plan plan = LooseValley.corrected(Proposal.of(IntakeJob.look(List.of(place), Progress.NONE)));
        plan = plan.with(plan.wishes().with(Wishes.Topic.TIMES, "monthly").with(Wishes.Topic.START, "2021-10-01"));
        Composition composition = Composition.of(plan, true);
        assertThat(composition.obstacles()).isEmpty();
        IntakeJob.describe(composition, place, 2, Progress.NONE);
        assertThat(budget(place)).isEqualTo(budget(VALLEY));
        Map<String, FileRecord> after = contents(place);
        assertThat(after.remove("aquifer.json")).isNotNull();
        assertThat(after).isEqualTo(before);
        assertThatThrownBy(() -> IntakeJob.describe(composition, place, 2, Progress.NONE))
                .isInstanceOf(UsageFault.class)
                .hasMessageContaining("already");
    }

    @Test
    void whereNamesCannotBeCountedThatIsSaid() {
        Composition composition = Composition.of(plan(), true);
        assertThat(composition.obstacles())
                .contains("results/heads/Head_L1_T00.tif would have to be counted as 0, not 00.")
                .anyMatch(words -> words.startsWith("climate/recharge_2021-10.tif"));
        assertThat(composition.isSound()).isFalse();
    }

    private Plan looseOneLayer() {
        Path place = folder.resolve("one");
        LooseFolder one = new LooseFolder(place)
                .raster("top.tif", 20)
                .raster("bottom.tif", 0)
                .raster("K.tif", 5)
                .raster("head.tif", (row, column) -> 15 + 0.1 * column)
                .raster("active.tif", (row, column) -> column == 0 ? 0 : 1)
                .raster("recharge_mm_yr.tif", 200)
                .text("wells.csv", "\uFEFFwell;east;x;y;layer;start;end;Q (m3/h)", "W 1;;1025;2015;0;01.10.2021;;2,5")
                .text("prisms.geojson", "{\"type\": \"FeatureCollection\", \"features\": []}");
        Plan plan = one.plan();
        return LooseFolder.said(plan, Wishes.Topic.START, "2021-10-01");
    }

    @Test
    void headingsDatesSignsAndMasksAreMendedInTheCopy() throws IOException {
        IntakeJob.write(Composition.of(looseOneLayer(), false), target, 1, Progress.NONE);
        assertThat(Files.readAllLines(target.resolve("wells.csv")))
                .containsExactly("name;x;y;layer;from;to;rate [m3/h]", "W 1;1025;2015;1;2021-10-01;;-2,5");
        try (AquiferFolder opened = AquiferReader.open(target)) {
            double[] values = new double[20];
            opened.quantities().stream()
                    .filter(quantity -> quantity.name().equals("flow conductivity"))
                    .findFirst()
                    .orElseThrow()
                    .values()
                    .read(0, 0, LooseFolder.GRID.window(), values, 0);
            assertThat(values[0]).isNaN();
            assertThat(values[1]).isEqualTo(5);
        }
        assertThat(target.resolve("prisms.geojson")).exists();
    }

    @Test
    void prismsThatCannotBeReadAreRefusedBeforeAnythingIsWritten() throws IOException {
        looseOneLayer();
        Files.writeString(folder.resolve("one/prisms.geojson"), "{\"type\": \"Feature\"}");
        Plan plan = LooseFolder.said(
                Proposal.of(IntakeJob.look(List.of(folder.resolve("one")), Progress.NONE)),
                Wishes.Topic.START,
                "2021-10-01");
        assertThatThrownBy(() -> IntakeJob.write(Composition.of(plan, false), target, 1, Progress.NONE))
                .isInstanceOf(DataFault.class)
                .hasMessageContaining("prisms.geojson");
        assertThat(target).doesNotExist();
    }

    @Test
    void theTerracesTablesTellEvenItsUnevenTurnedGrid() throws IOException {
        Path terrace = Path.of("sample-aquifers/terrace");
        Path place = folder.resolve("tables");
        SampleCopy.of("terrace", place, name -> name.endsWith(".csv"));
        Plan plan = Proposal.of(IntakeJob.look(List.of(place), Progress.NONE));
        for (int i = 0; i < plan.items().size(); i++) {
            Item item = plan.items().get(i);
            for (int u = 0; u < item.uses().size(); u++) {
                Use use = item.uses().get(u);
                if (use.role() == Role.CELLS) {
                    plan = plan.with(i, item.with(u, use.withName("river exchange")));
                }
            }
        }
        plan = LooseFolder.said(plan, Wishes.Topic.START, "2023-01-01");
        IntakeJob.write(Composition.of(plan, false), target, 2, Progress.NONE);
        Path prisms = terrace.resolve("prisms.geojson");
        assertThat(budget(target, prisms)).isEqualTo(budget(terrace, prisms));
    }

    @Test
    void theDepotsTablesGiveItsWaterBudgetOnceGridTimesAndStorageAreTyped() throws IOException {
        Path depot = Path.of("sample-aquifers/depot");
        Path place = folder.resolve("tables");
        SampleCopy.of(
                "depot",
                place,
                List.of("flow.csv", "head.csv", "ground.csv", "concentration.csv", "spill.csv")::contains);
        Plan plan = Proposal.of(IntakeJob.look(List.of(place), Progress.NONE));
        plan = LooseFolder.said(plan, Wishes.Topic.X, "0 10 25");
        plan = LooseFolder.said(plan, Wishes.Topic.Y, "0, 10, 15");
        plan = LooseFolder.said(plan, Wishes.Topic.TIMES, "monthly");
        plan = LooseFolder.said(plan, Wishes.Topic.START, "2021-10-01");
        plan = LooseFolder.said(plan, Wishes.Topic.SPECIFIC_STORAGE, "0.00008");
        plan = LooseFolder.said(plan, Wishes.Topic.POROSITY, "0.28");
        Composition composition = Composition.of(plan, false);
        assertThat(composition.set().get("sources").toString()).contains("concentration={solvent=", "spill.csv");
        assertThat(composition.set().get("solutes").toString()).contains("name=solvent", "name=product");
        IntakeJob.write(composition, target, 2, Progress.NONE);
        Path prisms = depot.resolve("prisms.geojson");
        assertThat(budget(target, prisms)).isEqualTo(budget(depot, prisms));
    }
}
