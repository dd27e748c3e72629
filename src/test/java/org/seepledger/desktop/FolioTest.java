package org.seepledger.desktop;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TableView;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.balance.Periods;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.draw.Tool;
import org.seepledger.desktop.ledger.LedgerRow;
import org.seepledger.desktop.map.Camera;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.Session;
import org.seepledger.job.MapQuantity;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;

/** The budget's panes in the real window. */
class FolioTest {

    private static final Path VALLEY = Path.of("sample-aquifers/valley");

    private OpenWindow window;

    @BeforeEach
    void open() {
        window = new OpenWindow(1280, 800);
    }

    @AfterEach
    void close() {
        window.close();
    }

    private void openSet(Path folder) {
        window.openSet(folder);
        window.await(() -> !rows().isEmpty());
    }

    private Session session() {
        return window.assembly().session();
    }

    private String text(String selector) {
        return window.robot.lookup(selector).queryAs(Label.class).getText();
    }

    @SuppressWarnings("unchecked")
    private TableView<LedgerRow> table() {
        return window.robot.lookup("#ledger-table").queryAs(TableView.class);
    }

    private List<LedgerRow> rows() {
        return table().getItems();
    }

    private List<String> labels() {
        return rows().stream().map(LedgerRow::label).toList();
    }

    private boolean isShown(String selector) {
        return window.robot
                .lookup(selector)
                .match(node -> node.isVisible())
                .tryQuery()
                .isPresent();
    }

    @Test
    void aClickOnAHeaderSortsAndOnARowLightsTheFaceUp() {
        openSet(VALLEY);
        window.robot.clickOn("#sort-largest-out");
        window.await(() -> labels().get(1).equals("side 3"));
        window.settle();
        window.robot.clickOn("side 4");
        assertThat(session().lit().get()).isEqualTo("side 4");
        window.robot.interact(() -> session().lit().set("pit edge"));
        assertThat(table().getSelectionModel().getSelectedItem().label()).isEqualTo("pit edge");
    }

    @Test
    void theLedgerSaysWhoseItIsInTheUnitAndPeriodChosen() {
        openSet(VALLEY);
        assertThat(text("#ledger-belongs")).startsWith("well field").contains("interval 1, 2021-10-01");
        window.choose("#ledger-unit", "L/s");
        window.choose("#ledger-period", Periods.Every.RECORD);
        window.await(() -> text("#ledger-belongs").contains("record, 2021-10-01 to 2023-10-01"));
        window.robot.clickOn("#ledger-copy");
        assertThat(window.answers.copied.get(0)).contains("\tL/s").startsWith("well field");
        window.choose("#ledger-period", Periods.Every.WATER_YEAR);
        window.choose("#ledger-month", 4);
        window.await(() -> text("#ledger-belongs").contains("water year 2022, 2021-10-01 to 2022-04-01"));
    }

    @Test
    void theSliderTheKeysAndTheChartAreOneInterval() {
        openSet(VALLEY);
        window.await(() -> isShown("#chart-picture"));
        window.robot.press(KeyCode.PERIOD).release(KeyCode.PERIOD);
        assertThat(text("#interval-words")).startsWith("interval 2,");
        window.robot.clickOn("#interval-slider");
        window.await(() -> session().interval().get() > 8);
        window.robot.clickOn("#chart-picture");
        window.await(() -> text("#ledger-belongs")
                .contains("interval " + (session().interval().get() + 1) + ","));
    }

    @Test
    void pagesOpenByClickAndByKey() {
        openSet(VALLEY);
        window.robot.clickOn("#folio-answers");
        window.await(() -> window.robot.lookup("Does it close?").tryQuery().isPresent());
        assertThat(isShown("#ledger-table")).isFalse();
        window.robot.press(KeyCode.CONTROL, KeyCode.DIGIT3).release(KeyCode.DIGIT3, KeyCode.CONTROL);
        window.await(() -> isShown("#exchange-matrix"));
        window.robot.clickOn("#exchange-copy");
        assertThat(window.answers.copied.get(0)).contains("from ↓ to → [m3/d]");
        window.robot.clickOn("#folio-exchange");
        assertThat(isShown("#exchange-matrix")).isTrue();
    }

    @Test
    void whatDoesNotCloseLeadsToTheMap() {
        openSet(Path.of("sample-aquifers/terrace"));
        window.robot.clickOn("#folio-answers");
        window.await(() -> isShown("#closure-cell-1"));
        Camera before = window.assembly().map().camera().get();
        window.robot.clickOn("#closure-cell-1");
        Camera after = window.assembly().map().camera().get();
        assertThat(after.scale()).isGreaterThan(before.scale());
        assertThat(window.assembly().map().values().quantity().get())
                .hasValueSatisfying(shown -> assertThat(shown.kind()).isEqualTo(MapQuantity.Kind.IMBALANCE));
    }

    @Test
    void whatCannotBeBalancedIsSaidInThePaneAndTheWindowLivesOn() {
        openSet(VALLEY);
        draw(List.of(LiveSet.moved(session().selectedPrism().orElseThrow(), 1e6)), true);
        window.await(() -> window.robot
                .lookup(".sl-notice-words")
                .match((Label label) -> label.isVisible() && label.getText().contains("outside the grid"))
                .tryQuery()
                .isPresent());
        draw(List.of(), true);
        Button begin = window.robot
                .from(window.robot.lookup("#ledger").<Node>query())
                .lookup("Draw a prism")
                .queryButton();
        window.await(begin::isVisible);
        window.robot.clickOn(begin);
        assertThat(window.assembly().draft().tool().get()).isEqualTo(Tool.POLYGON);
    }

    @Test
    void afterADragTheLedgerIsTheCommandsDigitForDigit(@TempDir Path folder) throws IOException {
        openSet(VALLEY);
        Prism first = session().selectedPrism().orElseThrow();
        for (int step = 1; step <= 12; step++) {
            draw(List.of(LiveSet.moved(first, 3.7 * step)), false);
        }
        Prism dropped = LiveSet.moved(first, 3.7 * 12);
        draw(List.of(dropped), true);
        window.choose("#ledger-arrangement", org.seepledger.desktop.ledger.Arrangement.ITEMS_BY_LAYER);
        window.robot.interact(() -> session().interval().set(4));
        window.await(() -> text("#ledger-belongs").contains("interval 5,")
                && window.assembly().session().faceFlows().get().revision()
                        == session().drawing().get().revision());
        window.robot.clickOn("#ledger-copy");
        Path prisms = Files.writeString(folder.resolve("prisms.geojson"), geoJson(dropped));
        assertThat(CommandRows.copied(window.answers.copied.get(0)))
                .isEqualTo(CommandRows.ofCommand(VALLEY, prisms, folder.resolve("out"), dropped.name(), "interval 5"));
    }

    private static String geoJson(Prism prism) {
        String rings = prism.rings().stream().map(FolioTest::ring).collect(Collectors.joining(","));
        VerticalRange.Layers layers = (VerticalRange.Layers) prism.range();
        String boundaries = prism.rings().stream()
                .flatMap(ring -> ring.sides().stream())
                .filter(side -> !side.item().equals(side.name()))
                .collect(Collectors.groupingBy(
                        Side::item,
                        java.util.LinkedHashMap::new,
                        Collectors.mapping(side -> "\"" + side.name() + "\"", Collectors.joining(","))))
                .entrySet()
                .stream()
                .map(group -> "\"" + group.getKey() + "\":[" + group.getValue() + "]")
                .collect(Collectors.joining(","));
        return "{\"type\":\"FeatureCollection\",\"crs\":{\"type\":\"name\",\"properties\":{\"name\":\"EPSG:32633\"}},"
                + "\"features\":[{\"type\":\"Feature\",\"properties\":{\"name\":\"" + prism.name() + "\",\"layers\":["
                + (layers.first() + 1) + "," + (layers.last() + 1) + "],\"boundaries\":{" + boundaries
                + "}},\"geometry\":{\"type\":\"Polygon\",\"coordinates\":[" + rings + "]}}]}";
    }

    private static String ring(Ring ring) {
        List<Side> sides = new ArrayList<>(ring.sides());
        sides.add(sides.get(0));
        return sides.stream()
                .map(side -> "[" + side.x() + "," + side.y() + "]")
                .collect(Collectors.joining(",", "[", "]"));
    }

    private void draw(List<Prism> prisms, boolean settled) {
        window.robot.interact(() ->
                session().drawing().set(new Drawing(session().drawing().get().revision() + 1, prisms, settled)));
    }
}
