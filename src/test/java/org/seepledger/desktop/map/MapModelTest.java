package org.seepledger.desktop.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.ValueScale;

class MapModelTest {

    private final Session session = new Session();
    private final MapModel model = new MapModel(session, new DirectTasks());
    private Opening opening;

    @BeforeEach
    void open() {
        model.resize(1000, 700);
        assertThat(model.values().state().get().phase()).isEqualTo(PaneState.Phase.EMPTY);
        opening = Opening.of(Path.of("sample-aquifers/valley"));
        session.show(Optional.of(opening.set()));
        session.drawing()
                .set(new Drawing(
                        1,
                        opening.set()
                                .workbench()
                                .drawings()
                                .prisms(Path.of("sample-aquifers/valley/prisms.geojson"))
                                .prisms(),
                        true));
    }

    @AfterEach
    void close() {
        opening.set().close();
    }

    private LayerView shown() {
        return model.values().view().get().orElseThrow();
    }

    private void choose(MapQuantity.Kind kind) {
        model.values()
                .quantity()
                .set(model.values().quantities().stream()
                        .filter(quantity -> quantity.kind() == kind)
                        .findFirst());
    }

    @Test
    void headOfTheUppermostLayerIsShownFirstAndTheWholeGridIsSeen() {
        assertThat(model.values().state().get()).isEqualTo(PaneState.READY);
        assertThat(shown().request().quantity().kind()).isEqualTo(MapQuantity.Kind.HEAD);
        assertThat(model.camera().get().x(500000)).isBetween(48.0, 1000.0);
        assertThat(model.camera().get().y(5200000)).isBetween(48.0, 700.0);
        assertThat(session.wells().get()).isNotEmpty();
        assertThat(model.contours().lines().get()).isNotEmpty();
        assertThat(model.flux().flux().get()).isPresent();
    }

    @Test
    void theReadOutIsTheValueOfTheCellUnderTheCursor() {
        Camera camera = model.camera().get();
        model.point(camera.x(501225), camera.y(5201175));
        Readout readout = model.readout().get().orElseThrow();
        assertThat(readout.place()).isEqualTo("x 501\u202f225.0   y 5\u202f201\u202f175.0");
        assertThat(readout.cell()).isEqualTo("row 25, column 25, layer 1");
        double[] head = new double[1];
        session.set()
                .get()
                .orElseThrow()
                .aquifer()
                .head()
                .orElseThrow()
                .read(0, 1, new org.seepledger.aquifer.Window(24, 24, 1, 1), head, 0);
        assertThat(readout.value()).startsWith("head ").endsWith(" m");
        assertThat(Double.parseDouble(readout.value().split(" ")[1])).isCloseTo(head[0], within(0.051));
        model.point(0, 0);
        assertThat(model.readout().get().orElseThrow().cell()).isEqualTo("off the grid");
        model.leave();
        assertThat(model.readout().get()).isEmpty();
    }

    @Test
    void coloursStayFromIntervalToIntervalUntilTheyAreFitted() {
        ValueScale first = model.values().scale().get().orElseThrow();
        session.interval().set(9);
        assertThat(model.values().scale().get()).contains(first);
        assertThat(shown().natural()).isNotEqualTo(first);
        model.values().fitRange();
        assertThat(model.values().scale().get()).contains(shown().natural());
    }

    @Test
    void aTypedRangeIsTakenOrRefusedWithAReason() {
        assertThat(model.values().range(99, 101)).isTrue();
        assertThat(model.values().scale().get().orElseThrow().from()).isEqualTo(99);
        assertThat(model.values().range(101, 99)).isFalse();
        assertThat(model.values().range(Double.NaN, 99)).isFalse();
        assertThat(session.status().get()).contains("begins below its end");
        assertThat(model.values().scale().get().orElseThrow().to()).isEqualTo(101);
    }

    @Test
    void imbalanceIsShownOnDemandWithZeroInTheMiddle() {
        session.demand().set(Session.Demand.SHOW_IMBALANCE);
        assertThat(session.demand().get()).isEqualTo(Session.Demand.NONE);
        assertThat(shown().request().quantity().kind()).isEqualTo(MapQuantity.Kind.IMBALANCE);
        ValueScale scale = model.values().scale().get().orElseThrow();
        assertThat(scale.from()).isEqualTo(-scale.to());
    }

    @Test
    void everyQuantityOfEveryLayerCanBeShown() {
        for (MapQuantity quantity : model.values().quantities()) {
            model.values().quantity().set(Optional.of(quantity));
            for (int layer = 0; layer < 3; layer++) {
                session.layer().set(layer);
                assertThat(model.values().state().get())
                        .as(quantity + " " + layer)
                        .isEqualTo(PaneState.READY);
                assertThat(shown().request().layer()).isEqualTo(layer);
            }
        }
    }

    @Test
    void whatDoesNotChangeIsReadOnce() {
        choose(MapQuantity.Kind.THICKNESS);
        LayerView first = shown();
        session.interval().set(5);
        assertThat(shown()).isSameAs(first);
    }

    @Test
    void thePrismIsShownAsLargeAsItWillGo() {
        session.selected().set("well field");
        model.showPrism();
        Camera near = model.camera().get();
        assertThat(near.x(500868)).isGreaterThan(90);
        assertThat(near.x(501658)).isLessThan(910);
        model.showAll();
        assertThat(model.camera().get().scale()).isLessThan(near.scale());
        model.step(1);
        model.step(-1);
        assertThat(model.camera().get().centreX()).isCloseTo(501500, within(1e-6));
    }

    @Test
    void arrowsThinOutWithDistance() {
        model.showAll();
        int far = model.flux().flux().get().orElseThrow().field().east().stride();
        model.zoom(500, 350, 6);
        assertThat(model.flux().flux().get().orElseThrow().field().east().stride())
                .isLessThan(far);
        model.overlays().contours().set(false);
        assertThat(model.contours().lines().get()).isEmpty();
    }

    @Test
    void onlyFluxThatIsSeenIsReadAndArrowsKeepTheirScale() {
        Flux whole = model.flux().flux().get().orElseThrow();
        assertThat(whole.field().east().window().size()).isEqualTo(48 * 60);
        model.zoom(500, 350, 12);
        Flux near = model.flux().flux().get().orElseThrow();
        assertThat(near.field().east().window().size()).isLessThan(400);
        assertThat(near.greatest()).isEqualTo(whole.greatest());
        model.drag(20, 0);
        assertThat(model.flux().flux().get()).contains(near);
        model.drag(4000, 0);
        assertThat(model.flux().flux().get()).isNotEqualTo(Optional.of(near));
        Camera camera = model.camera().get();
        var grid = opening.set().aquifer().grid();
        assertThat(FluxArrows.of(near, grid, camera)).hasSizeLessThan(1000);
        model.overlays().arrows().set(false);
    }

    @Test
    void aSetThatIsClosedLeavesAnEmptyMap() {
        session.show(Optional.empty());
        assertThat(model.values().view().get()).isEmpty();
        assertThat(model.values().state().get().phase()).isEqualTo(PaneState.Phase.EMPTY);
        assertThat(session.wells().get()).isEmpty();
    }
}
