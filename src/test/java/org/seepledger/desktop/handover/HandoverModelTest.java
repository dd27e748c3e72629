package org.seepledger.desktop.handover;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.HeldTasks;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.sketch.Drawing;

class HandoverModelTest {

    @TempDir
    private Path folder;

    private LiveSet live;
    private Drawing drawing;
    private HandoverModel model;

    @BeforeEach
    void open() {
        live = LiveSet.terrace();
        drawing = live.set
                .workbench()
                .drawings()
                .drawing(live.set.path().resolve("prisms.geojson"))
                .drawing();
        live.session.shapes().set(new DrawnShapes(drawing, true));
        model = model(new DirectTasks());
        model.choices().out().text().set(folder.resolve("out").toString());
    }

    @AfterEach
    void close() {
        live.close();
    }

    private HandoverModel model(Tasks tasks) {
        return new HandoverModel(live.session, tasks, live.answers, live.answers, live.answers, picture -> new byte[0]);
    }

    @Test
    void suggestsAFolderBesideTheAquifers() {
        assertThat(model(new DirectTasks()).choices().out().text().get())
                .isEqualTo(Path.of("sample-aquifers/terrace-handover")
                        .toAbsolutePath()
                        .toString());
        assertThat(model.periodChoices()).containsExactly(Periods.Every.values());
        assertThat(model.hasSolutes()).isFalse();
    }

    @Test
    void theCommandsFollowWhatIsChosen() {
        assertThat(model.prospect().commands().get())
                .startsWith("seepledger balance "
                        + Path.of("sample-aquifers/terrace").toAbsolutePath())
                .contains("--clip", "--report-date ")
                .doesNotContain("--every", "--wells", "--rate-unit", "extract", "plume", "--overwrite");
        BudgetChoices budget = model.choices().budget();
        budget.every().set(Periods.Every.RECORD);
        budget.wells().set(WellRule.SPREAD);
        budget.rateUnit().text().set(" L/s ");
        budget.limit().text().set("2.5");
        model.choices().report().tables().set(ReportChoices.Tables.RECORD_AND_WORST);
        model.choices().report().letterhead().text().set("Ground Water Office\n\n 1 Main Street ");
        model.choices().extract().set(true);
        model.choices().overwrite().set(true);
        assertThat(model.prospect().commands().get())
                .contains(
                        "--every record",
                        "--wells spread",
                        "--rate-unit L/s",
                        "--max-closure-error 2.5",
                        "--report-periods record \\\n    --report-periods worst",
                        "--report-letterhead 'Ground Water Office|1 Main Street'",
                        "--overwrite\nseepledger extract ");
        budget.periods().text().set("periods.csv");
        assertThat(model.prospect().commands().get())
                .contains("--periods " + Path.of("periods.csv").toAbsolutePath())
                .doesNotContain("--every");
    }

    @Test
    void whatIsWrongIsSaidBesideTheFieldAndKeepsTheWorkFromBeingBegun() {
        assertThat(model.prospect().problem().get()).isEmpty();
        Entry<?> rate = model.choices().budget().rateUnit();
        for (String text : List.of("m", "florins", "m3/d/d")) {
            rate.text().set(text);
            assertThat(rate.problem().get()).as(text).isNotEmpty();
            assertThat(model.prospect().problem().get()).isNotEmpty();
        }
        model.handOver();
        assertThat(folder.resolve("out")).doesNotExist();
        rate.text().set("");
        Entry<?> limit = model.choices().budget().limit();
        for (String text : List.of("-1", "NaN", "a", "Infinity")) {
            limit.text().set(text);
            assertThat(limit.problem().get()).as(text).isNotEmpty();
        }
        limit.text().set("1");
        model.choices().report().date().text().set("31.5.2024");
        assertThat(model.prospect().problem().get()).isNotEmpty();
        model.choices().report().date().text().set("2024-05-31");
        model.choices().report().letterhead().text().set("a|b");
        assertThat(model.prospect().problem().get()).isNotEmpty();
        model.choices().report().letterhead().text().set("");
        model.choices().solutes().above().text().set("50");
        assertThat(model.choices().solutes().above().problem().get()).contains("50 mg/L");
        model.choices().solutes().above().text().set("50 mg/L");
        assertThat(model.prospect().problem().get()).isEmpty();
        model.choices().water().set(false);
        assertThat(model.prospect().problem().get()).contains("Choose something");
    }

    @Test
    void withoutPrismsThereIsNothingToHandOver() {
        live.session.shapes().set(DrawnShapes.NONE);
        assertThat(model.prospect().problem().get()).contains("no prism");
    }

    @Test
    void prismsThatAreNotSavedAreReadFromTheFolder() {
        live.session.shapes().set(new DrawnShapes(drawing, false));
        assertThat(model.prospect().prismsNote().get())
                .contains(folder.resolve("out/prisms.geojson").toString());
        assertThat(model.prospect().commands().get()).contains("--prisms " + folder.resolve("out/prisms.geojson"));
    }

    @Test
    void theFolderIsLookedAtAndTheLimitIsToldAtTheEnd() throws IOException {
        model.choices().budget().limit().text().set("0.01");
        model.choices().pictures().png().set(false);
        model.handOver();
        assertThat(model.fault().get()).isEmpty();
        assertThat(model.stage().get()).isEqualTo(HandoverModel.Stage.DONE);
        assertThat(model.limitWords()).contains("more than the 0.01 % allowed");
        try (Stream<Path> pictures = Files.list(folder.resolve("out/pictures"))) {
            assertThat(pictures).isNotEmpty().allMatch(file -> file.toString().endsWith(".svg"));
        }
        model.chooseAgain();
        assertThat(model.prospect().outProblem().get()).contains("--overwrite");
        model.choices().overwrite().set(true);
        assertThat(model.prospect().outProblem().get()).isEmpty();
        model.choices().budget().limit().text().set("50");
        model.handOver();
        assertThat(model.stage().get()).isEqualTo(HandoverModel.Stage.DONE);
        assertThat(model.limitWords()).isEmpty();
    }

    @Test
    void whatGoesWrongIsSaidAndLeavesNothing() {
        model.choices().budget().periods().text().set(folder.resolve("none.csv").toString());
        model.handOver();
        assertThat(model.stage().get()).isEqualTo(HandoverModel.Stage.CHOOSING);
        assertThat(model.fault().get()).contains("none.csv");
        assertThat(folder).isEmptyDirectory();
        model.choices().budget().periods().text().set("");
        model.handOver();
        assertThat(model.fault().get()).isEmpty();
        assertThat(model.outcome().get()).isPresent();
    }

    @Test
    void whatIsStoppedIsNotDone() {
        HeldTasks held = new HeldTasks();
        HandoverModel stopped = model(held);
        held.all();
        stopped.choices().out().text().set(folder.resolve("out").toString());
        held.all();
        stopped.handOver();
        assertThat(stopped.stage().get()).isEqualTo(HandoverModel.Stage.WORKING);
        stopped.cancel();
        held.all();
        assertThat(stopped.stage().get()).isEqualTo(HandoverModel.Stage.CHOOSING);
        assertThat(folder.resolve("out")).doesNotExist();
        assertThat(live.session.notices().latest().get().orElseThrow().words()).contains("Nothing was written");
    }

    @Test
    void foldersAndFilesAreAskedFor() {
        live.answers.paths.add(Optional.of(folder.resolve("other")));
        model.questions().folder();
        assertThat(model.choices().out().text().get())
                .isEqualTo(folder.resolve("other").toString());
        live.answers.paths.add(Optional.empty());
        model.questions().periods();
        assertThat(model.choices().budget().periods().text().get()).isEmpty();
        model.copyCommands();
        assertThat(live.answers.copied)
                .containsExactly(model.prospect().commands().get());
    }
}
