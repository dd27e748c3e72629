package org.seepledger.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.intake.ItemRow.Mark;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.HeldTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.intake.LooseFolder;
import org.seepledger.intake.Role;
import org.seepledger.intake.Wishes.Topic;

class IntakeModelTest {

    @TempDir
    private Path folder;

    private final GivenAnswers answers = new GivenAnswers();
    private final List<Path> opened = new ArrayList<>();
    private Path loose;
    private LooseFolder files;

    @BeforeEach
    void write() {
        loose = folder.resolve("loose");
        files = new LooseFolder(loose)
                .raster("top.tif", 20)
                .raster("bottom.tif", 0)
                .raster("K.tif", 5)
                .raster("head.tif", (row, column) -> 15 + 0.1 * column);
    }

    private IntakeModel model(Tasks tasks) {
        return new IntakeModel(tasks, answers, opened::add);
    }

    private static void choose(IntakeModel model, String title) {
        model.rows().stream()
                .filter(row -> row.title().contains(title))
                .findFirst()
                .ifPresent(row -> model.chosen().set(row.index()));
    }

    @Test
    void aFolderIsLookedAtCheckedWrittenAndOpened() {
        IntakeModel model = model(new DirectTasks());
        answers.paths.add(Optional.of(loose));
        model.addFolder();
        assertThat(model.rows())
                .extracting(ItemRow::title)
                .containsExactly("The set as a whole", "K.tif", "bottom.tif", "head.tif", "top.tif");
        assertThat(model.making().check().get().says()).isPresent();
        assertThat(model.writing().target().get())
                .isEqualTo(folder.resolve("loose-aquifer").toString());
        model.write();
        assertThat(opened).containsExactly(folder.resolve("loose-aquifer"));
        assertThat(model.shown().get()).isFalse();
    }

    @Test
    void filesStayWhereTheyLieIfOnlyTheDescriptionIsWritten() {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        model.describe();
        assertThat(opened).containsExactly(loose);
        assertThat(loose.resolve("aquifer.json")).content().contains("\"conductivity\": \"K.tif\"");
    }

    @Test
    void correctionsOutliveFurtherFiles() {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        choose(model, "K.tif");
        model.changeUse(0, use -> use.withRole(Role.SPECIFIC_YIELD));
        model.say(Topic.NAME, "Mine");
        files.raster("recharge_mm_yr.tif", 200);
        model.bring(List.of(loose.resolve("recharge_mm_yr.tif")));
        choose(model, "K.tif");
        assertThat(model.item().orElseThrow().uses().get(0).role()).isEqualTo(Role.SPECIFIC_YIELD);
        assertThat(model.plan().get().orElseThrow().wishes().of(Topic.NAME)).isEqualTo("Mine");
        assertThat(model.rows()).extracting(ItemRow::title).contains("recharge_mm_yr.tif");
    }

    @Test
    void whatStandsInTheWayIsMarkedAndNothingIsWritten() {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        choose(model, "bottom.tif");
        model.changeUse(0, use -> use.withRole(Role.NONE));
        assertThat(model.rows().get(0).mark()).isEqualTo(Mark.FAULT);
        assertThat(model.rows().get(model.rows().size() - 1).mark()).isEqualTo(Mark.UNUSED);
        model.write();
        model.describe();
        assertThat(opened).isEmpty();
        assertThat(folder.resolve("loose-aquifer")).doesNotExist();
    }

    @Test
    void aTargetThatIsTakenIsSaidInWords() throws IOException {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        Files.createDirectories(folder.resolve("taken/inside"));
        model.writing().target().set(folder.resolve("taken").toString());
        model.write();
        assertThat(model.writing().state().get().phase()).isEqualTo(PaneState.Phase.FAILED);
        assertThat(model.writing().state().get().words()).contains("not empty");
        assertThat(model.shown().get()).isTrue();
        assertThat(opened).isEmpty();
    }

    @Test
    void aTargetThatIsNoPathIsSaidInWords() {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        for (String wrong : List.of("", "  ", "no" + (char) 0 + "path")) {
            model.writing().target().set(wrong);
            model.write();
            assertThat(model.writing().state().get().phase()).isEqualTo(PaneState.Phase.FAILED);
        }
        assertThat(opened).isEmpty();
    }

    @Test
    void onlyTheLatestCorrectionIsWorkedOut() {
        HeldTasks tasks = new HeldTasks();
        IntakeModel model = model(tasks);
        model.bring(List.of(loose));
        tasks.all();
        for (String name : List.of("A", "AB", "ABC")) {
            model.say(Topic.NAME, name);
        }
        assertThat(tasks.waiting()).isEqualTo(1);
        tasks.all();
        assertThat(model.making().check().get().says().orElseThrow().text()).contains("\"ABC\"");
    }

    @Test
    void stoppingTheWritingLeavesNothing() {
        HeldTasks tasks = new HeldTasks();
        IntakeModel model = model(tasks);
        model.bring(List.of(loose));
        tasks.all();
        model.write();
        assertThat(model.writing().state().get().phase()).isEqualTo(PaneState.Phase.WORKING);
        model.writing().cancel();
        tasks.all();
        assertThat(model.writing().state().get()).isEqualTo(PaneState.READY);
        assertThat(folder.resolve("loose-aquifer")).doesNotExist();
        assertThat(opened).isEmpty();
    }

    @Test
    void aFolderWithoutDataLeadsOn(@TempDir Path empty) {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(empty));
        assertThat(model.state().get().phase()).isEqualTo(PaneState.Phase.EMPTY);
        assertThat(model.state().get().words()).contains("No raster and no table");
        model.clear();
        assertThat(model.plan().get()).isEmpty();
    }

    @Test
    void aPathThatIsGoneIsSaidInWords() {
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(folder.resolve("gone")));
        assertThat(model.state().get().phase()).isEqualTo(PaneState.Phase.FAILED);
    }

    @Test
    void oneOfSeveralFilesIsLeftOutForGood() {
        files.raster("run1/recharge_2021-10.tif", 200).raster("run2/recharge_2021-10.tif", 300);
        IntakeModel model = model(new DirectTasks());
        model.bring(List.of(loose));
        choose(model, "recharge");
        model.leaveOut(1);
        assertThat(model.item().orElseThrow().files()).hasSize(1);
        files.raster("porosity.tif", 0.2);
        model.bring(List.of(loose));
        choose(model, "recharge");
        assertThat(model.item().orElseThrow().files()).hasSize(1);
    }
}
