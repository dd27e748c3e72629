package org.seepledger.desktop.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.map.Aim;
import org.seepledger.desktop.map.Camera;
import org.seepledger.desktop.map.Touch;
import org.seepledger.desktop.port.GivenAnswers;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.prism.VerticalRange;
import org.seepledger.sample.SampleCopy;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.RingAt;

class DraftTest {

    @TempDir
    private Path folder;

    private final Session session = new Session();
    private final GivenAnswers answers = new GivenAnswers();
    private final DraftModel model = new DraftModel(session);
    private final DraftHand hand = new DraftHand(model);
    private final DraftFiles files = new DraftFiles(model, new DirectTasks(), answers, answers);
    private final CardModel card = new CardModel(model, new LidSurfaces(model, new DirectTasks(), answers));
    private final List<Opening> opened = new ArrayList<>();

    @BeforeEach
    void open() throws IOException {
        SampleCopy.of("valley", folder);
        reopen();
    }

    private void reopen() {
        Opening opening = Opening.of(folder);
        opened.add(opening);
        session.show(Optional.of(opening.set()));
        session.wells().set(opening.set().workbench().views().wells(0));
        files.begin(opening);
    }

    @AfterEach
    void close() {
        opened.forEach(opening -> opening.set().close());
    }

    private static Touch at(double x, double y) {
        return new Touch(x, y, 2, true, false);
    }

    private static Touch snapping(double x, double y) {
        return new Touch(x, y, 2, false, false);
    }

    private void click(double x, double y) {
        hand.hover(at(x, y));
        hand.press(at(x, y));
        hand.release(at(x, y));
    }

    private void drag(double x, double y, double toX, double toY) {
        hand.press(at(x, y));
        hand.drag(at((x + toX) / 2, (y + toY) / 2));
        hand.drag(at(toX, toY));
        hand.release(at(toX, toY));
    }

    private Place vertex(String shape, int vertex) {
        return model.drawing().outline(RingAt.outer(shape)).place(vertex);
    }

    @Test
    void thePrismsBesideTheSetAreThereAndTheFirstIsSelected() {
        assertThat(session.drawing().get().prisms()).hasSize(4);
        assertThat(session.selected().get()).isEqualTo("well field");
        assertThat(model.isUnsaved()).isFalse();
        assertThat(model.undoable()).isEmpty();
    }

    @Test
    void aPolygonIsDrawnByClicksAndItsFinishingDoubleClickAddsNoVertex() {
        model.choose(Tool.POLYGON);
        click(501900, 5200300);
        click(502300, 5200300);
        click(502300, 5200700);
        click(501900, 5200700);
        hand.doubleClick(at(501900, 5200700));
        assertThat(session.selected().get()).isEqualTo("prism");
        assertThat(model.drawing().outline(RingAt.outer("prism")).size()).isEqualTo(4);
        assertThat(model.tool().get()).isEqualTo(Tool.SELECT);
        assertThat(model.undoable()).contains("Draw polygon");
        assertThat(session.drawing().get().settled()).isTrue();
    }

    @Test
    void aClickOnTheFirstVertexEndsTooAndTypedPlacesCount() {
        model.choose(Tool.POLYGON);
        assertThat(hand.type("501900, 5200300")).isTrue();
        click(502300, 5200300);
        click(502300, 5200700);
        click(502300, 5200900);
        hand.delete();
        click(501905, 5200304);
        assertThat(model.drawing().outline(RingAt.outer("prism")).size()).isEqualTo(3);
        assertThat(vertex("prism", 0)).isEqualTo(new Place(501900, 5200300));
    }

    @Test
    void whatIsNoPlaceIsRefusedWithAReason() {
        model.choose(Tool.POLYGON);
        assertThat(hand.type("here")).isFalse();
        assertThat(session.status().get()).contains("two numbers");
        model.choose(Tool.SELECT);
        assertThat(hand.type("1, 2")).isFalse();
        model.choose(Tool.CIRCLE);
        assertThat(hand.type("100")).isFalse();
        assertThat(session.status().get()).contains("centre first");
    }

    @Test
    void aDraggedVertexIsOneStepAndEscRestoresBitForBit() {
        Drawing before = model.drawing();
        hand.press(at(500921, 5201227));
        hand.drag(at(500900, 5201200));
        assertThat(session.drawing().get().settled()).isFalse();
        assertThat(model.drawing()).isNotEqualTo(before);
        hand.cancel();
        assertThat(model.drawing()).isSameAs(before);
        assertThat(session.drawing().get().settled()).isTrue();
        drag(500921, 5201227, 500880, 5201190);
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500880, 5201190));
        model.undo();
        assertThat(model.drawing()).isSameAs(before);
        assertThat(session.status().get()).contains("Move vertex");
        model.redo();
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500880, 5201190));
    }

    @Test
    void aDragBeginsAfterThreePixels() {
        Drawing before = model.drawing();
        hand.press(at(500921, 5201227));
        hand.drag(at(500926, 5201227));
        hand.release(at(500926, 5201227));
        assertThat(model.drawing()).isSameAs(before);
        assertThat(model.undoable()).isEmpty();
    }

    @Test
    void aVertexSnapsToGridCornersExactlyAndAltSuspendsIt() {
        hand.press(snapping(500921, 5201227));
        hand.drag(snapping(500904, 5201208));
        hand.drag(snapping(500904, 5201208));
        hand.release(snapping(500904, 5201208));
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500900, 5201200));
        drag(500900, 5201200, 500903, 5201208);
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500903, 5201208));
    }

    @Test
    void aSideIsChosenLitAndPutsAVertexWhereItIsDragged() {
        int vertices = model.drawing().outline(RingAt.outer("well field")).size();
        click(501062, 5201200);
        assertThat(session.lit().get()).isEqualTo("far bank");
        drag(501062, 5201200, 501062, 5201100);
        assertThat(model.drawing().outline(RingAt.outer("well field")).size()).isEqualTo(vertices + 1);
        hand.delete();
        assertThat(model.drawing().outline(RingAt.outer("well field")).size()).isEqualTo(vertices);
        hand.doubleClick(at(501062, 5201200));
        assertThat(model.drawing().outline(RingAt.outer("well field")).size()).isEqualTo(vertices + 1);
    }

    @Test
    void chosenSidesGetABoundarysName() {
        click(501640, 5201467);
        hand.press(new Touch(501652, 5201720, 2, true, true));
        hand.release(at(501652, 5201720));
        hand.nameBoundary("east bank");
        assertThat(session.selectedPrism().orElseThrow().rings().get(0).sides())
                .filteredOn(side -> side.item().equals("east bank"))
                .hasSize(2);
        hand.cancel();
        hand.nameBoundary("nothing");
        assertThat(session.status().get()).contains("Click a side first");
    }

    @Test
    void aPrismIsChosenByAPressAndMovedByTheNext() {
        Drawing before = model.drawing();
        assertThat(hand.press(at(500900, 5200600))).isFalse();
        hand.release(at(500900, 5200600));
        assertThat(session.selected().get()).isEqualTo("south terrace");
        hand.hover(at(500900, 5200600));
        assertThat(hand.aim()).isEqualTo(Aim.MOVE);
        Place corner = vertex("south terrace", 0);
        drag(500900, 5200600, 500930, 5200610);
        assertThat(vertex("south terrace", 0)).isEqualTo(corner.moved(30, 10));
        model.undo();
        assertThat(model.drawing()).isEqualTo(before);
    }

    @Test
    void rectanglesAndCirclesAreDrawnFromPlaceToPlaceOrByATypedRadius() {
        model.choose(Tool.RECTANGLE);
        drag(502000, 5200100, 502200, 5200300);
        assertThat(model.selected().orElseThrow().area()).isCloseTo(40000, within(1e-6));
        model.choose(Tool.CIRCLE);
        click(502600, 5200600);
        assertThat(hand.type("50")).isTrue();
        assertThat(model.selected().orElseThrow().area()).isCloseTo(Math.PI * 2500, within(1e-3));
        assertThat(session.selected().get()).isEqualTo("prism 2");
    }

    @Test
    void aCircleStandsOnTheWellThatIsClicked() {
        var well =
                session.set().get().orElseThrow().workbench().views().wells(0).get(0);
        model.choose(Tool.CIRCLE);
        click(well.x() + 7, well.y() - 5);
        hand.type("120");
        var ring = model.drawing().outline(RingAt.outer("prism"));
        double x = ring.places().stream().mapToDouble(Place::x).average().orElseThrow();
        assertThat(x).isCloseTo(well.x(), within(1e-6));
    }

    @Test
    void islandSplitAndMergeAreStepsThatCanAllBeUndone() {
        Drawing first = model.drawing();
        model.choose(Tool.ISLAND);
        click(501400, 5201500);
        click(501500, 5201500);
        click(501450, 5201600);
        hand.finish();
        assertThat(model.selected().orElseThrow().parts().get(0).islands()).hasSize(2);
        session.selected().set("south terrace");
        model.choose(Tool.SPLIT);
        click(500950, 5200200);
        click(500950, 5201200);
        hand.doubleClick(at(500950, 5201200));
        assertThat(model.drawing().shapes()).hasSize(5);
        model.choose(Tool.MERGE);
        click(1, 1);
        assertThat(session.status().get()).contains("another prism");
        Place other = model.drawing().outline(RingAt.outer("south terrace 2")).place(0);
        double middle = model.drawing().outline(RingAt.outer("south terrace 2")).places().stream()
                .mapToDouble(Place::y)
                .average()
                .orElse(other.y());
        double across = model.drawing().outline(RingAt.outer("south terrace 2")).places().stream()
                .mapToDouble(Place::x)
                .average()
                .orElse(other.x());
        click(across, middle);
        assertThat(model.drawing().shapes()).hasSize(4);
        model.undo();
        model.undo();
        model.undo();
        assertThat(model.drawing()).isSameAs(first);
        model.redo();
        model.redo();
        model.redo();
        assertThat(model.undoable()).contains("Merge prisms");
        assertThat(model.redoable()).isEmpty();
    }

    @Test
    void toolsThatNeedAPrismAreRefusedWithoutOne() {
        session.selected().set("");
        model.choose(Tool.SPLIT);
        assertThat(model.tool().get()).isEqualTo(Tool.SELECT);
        assertThat(session.status().get()).contains("Choose a prism");
    }

    @Test
    void prismsAreSelectedOneAfterAnother() {
        model.selectNext(-1);
        assertThat(session.selected().get())
                .isEqualTo(model.drawing().shapes().get(3).name());
        model.selectNext(1);
        assertThat(session.selected().get()).isEqualTo("well field");
    }

    @Test
    void keysCycleAndNudgeVertices() {
        assertThat(hand.nudge(1, 0)).isFalse();
        hand.cycle(1);
        assertThat(hand.nudge(2, -2)).isTrue();
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500923, 5201225));
        hand.cycle(-1);
        hand.delete();
        assertThat(model.undoable()).contains("Delete vertex");
    }

    @Test
    void aSelfCrossingIsMarkedWhileItHappens() {
        Camera camera = new Camera(1000, 700, 501300, 5201400, 0.5);
        int sound = hand.marks(camera).size();
        hand.press(at(500921, 5201227));
        hand.drag(at(501900, 5201400));
        assertThat(hand.marks(camera).size()).isGreaterThan(sound + 5);
        hand.cancel();
    }

    @Test
    void theCardRenamesAndSetsTheReach() {
        card.rename("capture zone");
        assertThat(session.selected().get()).isEqualTo("capture zone");
        card.rename("outside");
        assertThat(session.selected().get()).isEqualTo("capture zone");
        card.note("drawn for the permit");
        card.layers("2 to 3");
        assertThat(session.selectedPrism().orElseThrow().range()).isEqualTo(new VerticalRange.Layers(1, 2));
        card.layers("7");
        assertThat(session.status().get()).contains("from 1 to 3");
        card.layers("x");
        assertThat(session.status().get()).contains("1 to 3");
        card.lids("98.5", "");
        assertThat(card.topText()).isEqualTo("98.5");
        assertThat(session.selectedPrism().orElseThrow().range()).isInstanceOf(VerticalRange.Elevations.class);
        card.lids("no such.tif", "");
        assertThat(session.notices().latest().get().orElseThrow().words())
                .contains("no such.tif")
                .contains("does not exist");
        card.lids("", "");
        assertThat(card.layersText()).isEmpty();
        card.reorder(1);
        assertThat(model.drawing().shapes().get(1).name()).isEqualTo("capture zone");
        card.delete();
        assertThat(model.drawing().shapes()).hasSize(3);
    }

    @Test
    void whatIsDrawnIsKeptAsideAndComesBackAfterACrash() {
        drag(500921, 5201227, 500880, 5201190);
        assertThat(folder.resolve(Opening.UNSAVED)).exists();
        Drawing drawn = model.drawing();
        reopen();
        assertThat(model.drawing()).isEqualTo(drawn);
        assertThat(session.notices().latest().get().orElseThrow().words()).contains("not saved last time");
        assertThat(model.isUnsaved()).isTrue();
        model.undo();
        assertThat(vertex("well field", 0)).isEqualTo(new Place(500921, 5201227));
        assertThat(folder.resolve(Opening.UNSAVED)).doesNotExist();
    }

    @Test
    void savingPutsTheDrawingIntoTheFileThatCommandsRead() {
        drag(500921, 5201227, 500880, 5201190);
        files.save();
        assertThat(model.isUnsaved()).isFalse();
        assertThat(folder.resolve(Opening.UNSAVED)).doesNotExist();
        Drawing drawn = model.drawing();
        reopen();
        assertThat(model.drawing()).isEqualTo(drawn);
        assertThat(model.undoable()).isEmpty();
    }

    @Test
    void unsavedWorkIsAskedAbout() {
        List<String> gone = new ArrayList<>();
        files.whenSafe(() -> gone.add("at once"));
        drag(500921, 5201227, 500880, 5201190);
        answers.answers.add(Optional.of(2));
        files.whenSafe(() -> gone.add("never"));
        answers.answers.add(Optional.empty());
        files.whenSafe(() -> gone.add("never"));
        answers.answers.add(Optional.of(1));
        files.whenSafe(() -> gone.add("discarded"));
        assertThat(folder.resolve(Opening.UNSAVED)).doesNotExist();
        answers.answers.add(Optional.of(0));
        files.whenSafe(() -> gone.add("saved"));
        assertThat(gone).containsExactly("at once", "discarded", "saved");
        assertThat(model.isUnsaved()).isFalse();
    }

    @Test
    void filesAreWrittenAndAddedWhereTheyAreAskedFor() {
        Path other = folder.resolve("mine.geojson");
        answers.paths.add(Optional.of(other));
        files.export();
        assertThat(other).exists();
        answers.paths.add(Optional.of(other));
        files.importFile();
        assertThat(model.drawing().shapes()).hasSize(8);
        assertThat(model.drawing().find("well field 2")).isPresent();
        answers.paths.add(Optional.of(folder.resolve("none.geojson")));
        files.importFile();
        assertThat(session.notices().latest().get().orElseThrow().words()).contains("none.geojson");
        answers.paths.add(Optional.empty());
        files.export();
        assertThat(answers.paths).isEmpty();
    }
}
