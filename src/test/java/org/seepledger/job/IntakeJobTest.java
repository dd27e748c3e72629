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
import org.seepledger.intake.LooseValley;
import org.seepledger.intake.Plan;
import org.seepledger.intake.Proposal;
import org.seepledger.io.result.FileRecord;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

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
        Path out = folder.resolve("budget of " + set.getFileName());
        BalanceJob.run(Requests.byInterval(set, VALLEY.resolve("prisms.geojson"), out), Progress.NONE);
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
        String checked = IntakeJob.check(composition, 2, Progress.NONE);
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
        Files.createDirectories(place);
        try (Stream<Path> files = Files.list(VALLEY)) {
            for (Path file : files.toList()) {
                if (!file.endsWith("aquifer.json")) {
                    Files.copy(file, place.resolve(file.getFileName()));
                }
            }
        }
        Map<String, FileRecord> before = contents(place);
        Plan plan = LooseValley.corrected(Proposal.of(IntakeJob.look(List.of(place), Progress.NONE)));
        plan = plan.with(plan.wishes()
                .with(org.seepledger.intake.Wishes.Topic.TIMES, "monthly")
                .with(org.seepledger.intake.Wishes.Topic.START, "2021-10-01"));
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
}
