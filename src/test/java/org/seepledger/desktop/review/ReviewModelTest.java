package org.seepledger.desktop.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.RowAsked;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.job.Workbench;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.mapping.Mapping;

/** What the page of the review says and does, step by step. */
class ReviewModelTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    @TempDir
    private Path folder;

    private final Session session = new Session();
    private final GivenAnswers answers = new GivenAnswers();
    private final ReviewModel model = new ReviewModel(session, new DirectTasks(), answers);
    private final WritingModel writing = new WritingModel(model, new DirectTasks(), answers, answers, answers);
    private OpenSet set;

    @BeforeEach
    void open() {
        set = new OpenSet(VALLEY, Workbench.open(VALLEY));
        session.show(Optional.of(set));
        session.drawing()
                .set(new Drawing(
                        1,
                        set.workbench()
                                .drawings()
                                .prisms(VALLEY.resolve("prisms.geojson"))
                                .prisms(),
                        true));
        model.show(true);
    }

    @AfterEach
    void close() {
        set.close();
    }

    private Path table(String... lines) throws IOException {
        return Files.write(folder.resolve("table.csv"), List.of(lines));
    }

    private Finding first(Code code) {
        return model.findings().stream()
                .filter(finding -> finding.code() == code)
                .findFirst()
                .orElseThrow(() -> new AssertionError(model.findings()));
    }

    private void look(String item) {
        model.look(model.findings().stream()
                .filter(found -> found.item().equals(item))
                .findFirst()
                .orElseThrow(() -> new AssertionError(model.findings())));
    }

    private MappingRow row(String what, String label) {
        return MappingRows.of(model.answer().get().orElseThrow(), 24).stream()
                .filter(row ->
                        row.what().equals("review.row." + what) && row.label().equals(label))
                .findFirst()
                .orElseThrow();
    }

    private static MappingRow.Choice choice(List<MappingRow.Choice> choices, String words) {
        return choices.stream()
                .filter(choice -> choice.words().equals(words))
                .findFirst()
                .orElseThrow(() -> new AssertionError(choices));
    }

    @Test
    void aFindingLeadsToThePeriodAndTheRowOfItsTerm() throws IOException {
        model.bring(table(
                "area,term,m³/d interval 1,m³/d interval 5",
                "well field,Recharge,1,2",
                "well field,Pumping,-9,-900000"));
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
        look("far bank");
        assertThat(session.selected().get()).isEqualTo("well field");
        assertThat(session.interval().get()).isZero();
        assertThat(session.lit().get()).isEqualTo("far bank");
        look("Recharge");
        assertThat(session.interval().get()).isEqualTo(4);
        assertThat(session.pointed().get()).contains(new RowAsked(Group.SOURCE, "recharge", Line.ALL_LAYERS));
        assertThat(session.lit().get()).isEmpty();
        look("water-table storage");
        assertThat(session.pointed().get())
                .contains(new RowAsked(Group.STORAGE, "water-table storage", Line.ALL_LAYERS));
    }

    @Test
    void aPeriodThatIsTiedIsThenCovered() throws IOException {
        model.bring(table("area,period,term,m³/d", "well field,the wet one,Recharge,1"));
        assertThat(row("period", "the wet one").is()).contains("not covered");
        model.correct(row("period", "the wet one").typed().orElseThrow().apply("interval 3"));
        assertThat(row("period", "the wet one").is()).isEqualTo("interval 3");
        assertThat(model.answer().get().orElseThrow().intervals()).containsEntry("the wet one", 2);
    }

    @Test
    void anAreaThatIsUntiedIsNotChecked() throws IOException {
        model.bring(table("area,term,m³/d record", "well field,Recharge,1"));
        assertThat(row("area", "well field").is()).isEqualTo("well field");
        model.correct(choice(row("area", "well field").kinds(), "not tied").change());
        assertThat(row("area", "well field").is()).isEqualTo("not tied");
        assertThat(first(Code.NOT_TIED).message()).contains("well field");
    }

    @Test
    void aColumnMayBeInAnotherUnitAndCountAnotherWay() throws IOException {
        model.bring(table("area,term,record", "well field,Recharge,1"));
        assertThat(row("column", "record").unit()).isEmpty();
        model.correct(row("column", "record").united().orElseThrow().apply("L/s"));
        model.correct(choice(row("column", "record").senses(), "out").change());
        assertThat(row("column", "record").unit()).isEqualTo("L/s");
        assertThat(row("term", "Recharge").counts()).isEqualTo("out, as a heading or column says");
    }

    @Test
    void writingWaitsUntilMappingAndDrawingAreInFiles() throws IOException {
        assertThat(writing.problem().get()).contains("Choose it");
        model.bring(table("area,term,m³/d record", "well field,Recharge,1"));
        assertThat(writing.problem().get()).isEmpty();
        session.shapes().set(new DrawnShapes(DrawnShapes.NONE.drawing(), false));
        assertThat(writing.problem().get()).contains("drawing is not saved");
        session.shapes().set(DrawnShapes.NONE);
        model.correct(choice(row("term", "Recharge").kinds(), "not tied").change());
        assertThat(writing.problem().get()).contains("mapping is not saved");
        Path kept = folder.resolve("kept.json");
        answers.paths.add(Optional.of(kept));
        model.mapping().save();
        assertThat(writing.problem().get()).isEmpty();
        assertThat(writing.command().get()).contains("--mapping " + kept);
        assertThat(row("term", "Recharge").is()).isEqualTo("not tied");
        model.mapping().forget();
        assertThat(model.mapping().mapping().get()).isEqualTo(Mapping.NONE);
        assertThat(writing.command().get()).doesNotContain("--mapping");
    }

    @Test
    void theTableIsHeldAgainstThePrismsAsTheyAreDrawnNow() throws IOException {
        model.bring(table("area,term,m³/d record", "well field,Recharge,1"));
        assertThat(row("area", "well field").is()).isEqualTo("well field");
        Drawing drawn = session.drawing().get();
        session.drawing().set(new Drawing(2, drawn.prisms().subList(1, 3), false));
        assertThat(row("area", "well field").is()).isEqualTo("well field");
        session.drawing().set(new Drawing(3, drawn.prisms().subList(1, 3), true));
        assertThat(row("area", "well field").is()).isEqualTo("not tied");
        session.drawing().set(new Drawing(4, List.of(), true));
        assertThat(model.answer().get().orElseThrow().recomputed()).isFalse();
    }

    @Test
    void nothingIsWorkedOutWhileNobodyLooks() throws IOException {
        model.show(false);
        model.bring(table("area,term,m³/d record", "well field,Recharge,1"));
        assertThat(model.answer().get()).isEmpty();
        model.show(true);
        assertThat(model.answer().get()).isPresent();
    }

    @Test
    void aMappingThatLeadsNowhereCanBeTakenBack() throws IOException {
        model.bring(table("area,term,m³/d record", "well field,Recharge,1"));
        model.correct(
                choice(row("column", "m³/d record").kinds(), "not looked at").change());
        assertThat(model.state().get().phase()).isEqualTo(PaneState.Phase.FAILED);
        assertThat(model.answer().get()).isPresent();
        model.mapping().forget();
        assertThat(model.state().get()).isEqualTo(PaneState.READY);
    }
}
