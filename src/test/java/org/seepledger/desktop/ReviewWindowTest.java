package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.job.ReviewJob;
import org.seepledger.job.ReviewRequest;
import org.seepledger.progress.Progress;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Severity;

/** The review of a submitted budget in the real window. */
class ReviewWindowTest {

    private static final Path TERRACE = Path.of("sample-aquifers/terrace").toAbsolutePath();
    private static final Path SUBMITTED = TERRACE.resolve("submitted.csv");

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
    }

    @AfterEach
    void close() {
        window.close();
    }

    private void reviewSample() {
        window.openSet(TERRACE);
        window.settle();
        window.robot.clickOn("#shelf-review");
        window.answers.paths.add(Optional.of(SUBMITTED));
        window.robot.clickOn("#review-choose");
        window.await(() -> !findings().isEmpty());
    }

    private List<Finding> findings() {
        TableView<Finding> table = window.robot.lookup("#review-findings").queryTableView();
        return List.copyOf(table.getItems());
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    private void select(Code code) {
        TableView<Finding> table = window.robot.lookup("#review-findings").queryTableView();
        window.robot.interact(() -> table.getSelectionModel()
                .select(table.getItems().stream()
                        .filter(finding -> finding.code() == code)
                        .findFirst()
                        .orElseThrow()));
    }

    /** The rows of the findings that the command writes, without the lines of notes. */
    private List<String> commanded(Path out, Optional<Path> mapping) throws IOException {
        ReviewJob.run(
                new ReviewRequest(
                        Optional.of(TERRACE),
                        Optional.of(TERRACE.resolve("prisms.geojson")),
                        SUBMITTED,
                        mapping,
                        out,
                        1,
                        false,
                        10,
                        true,
                        2,
                        true,
                        LocalDate.now()),
                Progress.NONE);
        return rows(out.resolve("findings.csv"));
    }

    private static List<String> rows(Path file) throws IOException {
        try (Stream<String> lines = Files.lines(file)) {
            return lines.filter(line -> !line.startsWith("#")).skip(1).toList();
        }
    }

    @Test
    void theWindowFindsWhatTheCommandWrites() throws IOException {
        reviewSample();
        List<String> rows = commanded(folder.resolve("command"), Optional.empty());
        List<Finding> found = findings();
        assertThat(found).hasSameSizeAs(rows);
        for (int i = 0; i < rows.size(); i++) {
            Finding finding = found.get(i);
            assertThat(rows.get(i))
                    .startsWith(finding.severity() + "," + finding.code() + "," + finding.prism() + ",")
                    .contains(finding.message().replace("\"", "\"\""));
            if (!Double.isNaN(finding.submitted())) {
                assertThat(rows.get(i)).contains("," + finding.submitted() + ",");
            }
        }
        assertThat(text("#review-verdict")).contains("4 faults");
        window.robot.clickOn("#review-only-note");
        assertThat(findings())
                .allMatch(finding -> finding.severity() == Severity.NOTE)
                .hasSize(4);
    }

    @Test
    void aFindingThatIsChosenIsSelectedOnTheMapAndInTheLedger() {
        reviewSample();
        select(Code.SIGN);
        assertThat(window.assembly().session().selected().get()).isEqualTo("upper terrace");
        assertThat(window.assembly().session().lit().get()).isEqualTo("side 3");
        assertThat(text("#review-question")).contains("bring water in");
        select(Code.WELL);
        assertThat(window.assembly().session().selected().get()).isEqualTo("well field");
        assertThat(window.assembly().session().lit().get()).isEmpty();
        TableView<?> ledger = window.robot.lookup("#ledger-table").queryTableView();
        window.await(() ->
                String.valueOf(ledger.getSelectionModel().getSelectedItem()).contains("public supply"));
    }

    private ComboBox<?> kindOf(String label) {
        TableView<?> table = window.robot.lookup("#review-mapping").queryTableView();
        return window
                .robot
                .lookup("#review-mapping .table-row-cell")
                .match((Node row) -> row.lookupAll(".table-cell").stream()
                        .map(cell -> ((TableCell<?, ?>) cell).getGraphic())
                        .anyMatch(node ->
                                node instanceof Label named && named.getText().equals(label)))
                .match(Node::isVisible)
                .queryAll()
                .stream()
                .findFirst()
                .map(row -> (ComboBox<?>) row.lookup(".combo-box"))
                .orElseThrow(() -> new AssertionError(label + " is not among " + table.getItems()));
    }

    private void take(String label, String choice) {
        ComboBox<?> box = kindOf(label);
        int index = box.getItems().stream().map(Object::toString).toList().indexOf(choice);
        window.robot.interact(() -> box.getSelectionModel().select(index));
    }

    @Test
    void aCorrectedMappingTakesAFindingAway() {
        reviewSample();
        assertThat(findings()).anyMatch(finding -> finding.code() == Code.WELL);
        window.robot.clickOn("#review-part-mapping");
        take("Public supply", "outside the aquifer");
        window.await(
                () -> window.assembly().review().findings().stream().noneMatch(finding -> finding.code() == Code.WELL));
        window.robot.clickOn("#review-part-write");
        assertThat(text("#review-problem")).contains("mapping is not saved");
        window.robot.clickOn("#review-part-mapping").clickOn("#review-mapping-guess");
        window.await(
                () -> window.assembly().review().findings().stream().anyMatch(finding -> finding.code() == Code.WELL));
    }

    @Test
    void whatIsWrittenIsWhatTheCommandWrites() throws IOException {
        reviewSample();
        window.robot.clickOn("#review-part-mapping");
        take("Irrigation wells", "not tied");
        Path mapping = folder.resolve("mapping.json");
        window.await(() ->
                !window.assembly().review().mapping().mapping().get().terms().isEmpty());
        window.settle();
        window.await(() -> window.assembly().review().state().get().words().isEmpty());
        window.answers.paths.add(Optional.of(mapping));
        window.robot.clickOn("#review-mapping-save");
        window.await(() -> window.assembly().review().mapping().file().get().isPresent());
        window.robot.clickOn("#review-part-write");
        TextField out = window.robot.lookup("#review-out").queryAs(TextField.class);
        window.robot.interact(() -> out.setText(folder.resolve("out").toString()));
        window.robot.clickOn("#review-go");
        window.await(() -> text("#review-told").startsWith("Wrote"));
        commanded(folder.resolve("command"), Optional.of(mapping));
        for (String file : List.of("findings.csv", "side_by_side.csv", "mapping.json", "review.html")) {
            assertThat(folder.resolve("out").resolve(file))
                    .hasSameTextualContentAs(folder.resolve("command").resolve(file));
        }
        window.robot.clickOn("#review-copy");
        assertThat(window.answers.copied.get(0)).contains("--mapping " + mapping, "--clip");
    }

    @Test
    void withoutAnAquiferTheTableIsLookedAtByItself() {
        window.await(() -> window.robot.lookup("#welcome-review").tryQuery().isPresent());
        window.robot.clickOn("#welcome-review");
        window.answers.paths.add(Optional.of(SUBMITTED));
        window.robot.clickOn("#review-choose");
        window.await(() -> !findings().isEmpty());
        assertThat(findings()).anyMatch(finding -> finding.code() == Code.SUM);
        assertThat(findings()).noneMatch(finding -> finding.code() == Code.WELL);
        window.type(KeyCode.ESCAPE);
        window.openSet(TERRACE);
        window.settle();
        window.type(KeyCode.CONTROL, KeyCode.G);
        window.await(() -> findings().stream().anyMatch(finding -> finding.code() == Code.WELL));
    }

    @Test
    void aTableThatIsDroppedIsReviewedAndTheNextFindingIsReachedByKey() {
        window.openSet(TERRACE);
        window.settle();
        window.type(KeyCode.CONTROL, KeyCode.G);
        window.robot.interact(
                () -> DraggedFolder.dropOn(window.robot.lookup("#review").query(), SUBMITTED));
        window.await(() -> !findings().isEmpty());
        window.robot.clickOn("#review-findings .table-row-cell");
        window.await(() -> window.assembly().review().chosen().get().isPresent());
        assertThat(window.assembly().session().selected().get()).isEqualTo("upper terrace");
        window.robot.type(KeyCode.DOWN).type(KeyCode.DOWN);
        assertThat(window.assembly().review().chosen().get().orElseThrow().code())
                .isEqualTo(Code.WELL);
        assertThat(window.assembly().session().selected().get()).isEqualTo("well field");
    }

    @Test
    void aFileThatIsNoTableIsSaidInWords() throws IOException {
        Path wrong = Files.writeString(folder.resolve("wrong.csv"), "nothing here");
        window.openSet(TERRACE);
        window.robot.interact(() -> window.assembly().review().bring(wrong));
        window.type(KeyCode.CONTROL, KeyCode.G);
        window.await(() -> window.assembly().review().state().get().words().contains("no table of a budget"));
    }
}
