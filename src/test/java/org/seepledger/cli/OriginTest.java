package org.seepledger.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.OpenWindow;
import org.seepledger.desktop.ledger.Arrangement;
import org.seepledger.job.TracedNumber;
import org.seepledger.sample.SampleCopy;

/** What the window tells of where a number comes from is what the command tells. */
class OriginTest {

    @TempDir
    private Path folder;

    private OpenWindow window;

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("valley", folder);
        window = new OpenWindow(1600, 1000);
        window.openSet(folder);
        window.await(() -> !window.robot
                .lookup("#ledger-table")
                .queryAs(TableView.class)
                .getItems()
                .isEmpty());
        window.settle();
    }

    @AfterEach
    void close() {
        window.close();
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    private TableView<TracedNumber.Line> table() {
        return window.robot.lookup("#origin-table").queryTableView();
    }

    private void type(KeyCode... keys) {
        window.robot.press(keys).release(keys);
    }

    private void awaitSum() {
        window.await(() -> window.robot
                .lookup("#origin-sum")
                .match((Label label) -> !label.getText().isEmpty())
                .tryQuery()
                .isPresent());
        window.settle();
    }

    @Test
    void aRowOverAllLayersIsTracedSearchedShownOnTheMapAndWrittenAsTheCommandDoes() throws IOException {
        window.choose("#ledger-period", Periods.Every.MONTH);
        window.settle();
        window.robot.clickOn("side 9");
        window.robot.clickOn("#ledger-origin");
        awaitSum();
        assertThat(text("#origin-belongs")).contains("well field", "side 9", "2021-10");
        double sum = table().getItems().stream()
                .mapToDouble(TracedNumber.Line::contribution)
                .sum();
        window.robot.clickOn("#origin-sought").write("l3, col 17");
        window.settle();
        assertThat(table().getItems())
                .isNotEmpty()
                .allMatch(line -> line.file().contains("l3") && line.place().endsWith("col 17"));
        window.robot.clickOn(table().getItems().get(0).place());
        assertThat(window.robot.lookup("#origin-shown").queryAs(Label.class).getText())
                .startsWith(table().getItems().size() + " values shown");
        Path csv = folder.resolve("trace.csv");
        window.answers.paths.add(Optional.of(csv));
        window.robot.clickOn("#origin-export");
        window.await(() -> Files.exists(csv));
        window.robot.clickOn("#origin-copy");
        String command = window.answers.copied.get(0);
        Path again = folder.resolve("again.csv");
        List<String> words = ShellWords.of(folder, command).get(0);
        words.set(words.indexOf("--out") + 1, again.toString());
        Ran ran = Ran.of(words.toArray(String[]::new));
        assertThat(ran.status()).as(ran.err()).isZero();
        assertThat(again).hasSameBinaryContentAs(csv);
        double net = Double.parseDouble(ran.out().replaceAll("(?s).*net rate (\\S+) .*", "$1"));
        assertThat(sum).isCloseTo(net, within(1e-9 * Math.abs(net)));
    }

    @Test
    void totalsAreTracedAndRatiosSayWhyNot() {
        window.robot.clickOn("#total-inflow");
        awaitSum();
        assertThat(text("#origin-belongs")).contains("inflow");
        type(KeyCode.CONTROL, KeyCode.DIGIT1);
        window.robot.clickOn("#total-closure-error");
        window.await(() -> window.robot
                .lookup(".sl-notice-words")
                .match((Label label) -> label.isVisible() && label.getText().contains("is a ratio of sums"))
                .tryQuery()
                .isPresent());
        type(KeyCode.CONTROL, KeyCode.DIGIT1);
        window.choose("#ledger-arrangement", Arrangement.LAYERS);
        window.robot.clickOn("sides");
        window.robot.interact(() -> window.robot
                .lookup("#ledger-table")
                .queryTableView()
                .getContextMenu()
                .getItems()
                .get(0)
                .fire());
        window.await(() -> window.robot
                .lookup(".sl-notice-words")
                .match((Label label) -> label.isVisible() && label.getText().contains("no row of its own"))
                .tryQuery()
                .isPresent());
    }

    @Test
    void aPrismThatHasChangedIsTracedAgain() {
        window.robot.clickOn("recharge");
        type(KeyCode.CONTROL, KeyCode.T);
        awaitSum();
        String before = text("#origin-sum");
        window.robot.clickOn("#map-canvas");
        type(KeyCode.TAB);
        type(KeyCode.RIGHT);
        window.await(() -> text("#origin-remark").contains("has changed"));
        window.robot.clickOn("#origin-again");
        window.await(() -> text("#origin-remark").contains("not saved"));
        assertThat(text("#origin-sum")).isNotEqualTo(before);
        window.robot.clickOn("#origin-export");
        assertThat(window.answers.asked).isEmpty();
    }
}
