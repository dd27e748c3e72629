package org.seepledger.desktop.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.desktop.session.Draped;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.Body;
import org.seepledger.picture.NearbyWell;
import org.seepledger.picture.Ramp;
import org.seepledger.picture.SectionFrame;
import org.seepledger.picture.ValueScale;
import org.seepledger.sample.SampleCopy;

class SectionModelTest {

    private static final String PICTURE = Words.of("section.picture");

    private DrawnSection drawn = DrawnSection.valley();

    @TempDir
    private Path folder;

    @AfterEach
    void close() {
        drawn.close();
    }

    private PaneState.Phase phase() {
        return drawn.model.state().get().phase();
    }

    @Test
    void withoutALineOneActionLeadsOn() {
        assertThat(phase()).isEqualTo(PaneState.Phase.EMPTY);
        assertThat(drawn.session.section().get()).isEmpty();
        drawn.model.draw();
        assertThat(drawn.draft.tool().get()).isEqualTo(org.seepledger.desktop.draw.Tool.SECTION);
        assertThat(drawn.session.demand().get()).isEqualTo(Session.Demand.NONE);
    }

    @Test
    void aLineThroughThePrismIsCutAndHandedOverAndTakenAwayAgain() {
        drawn.model.alongPrism();
        assertThat(phase()).isEqualTo(PaneState.Phase.READY);
        assertThat(drawn.section().body().map(Body::name)).contains("well field");
        assertThat(drawn.frame().to()).isCloseTo(drawn.section().profile().length(), within(1e-9));
        assertThat(drawn.session.pictures().get(PICTURE).draws().apply(null).marks())
                .isNotEmpty();
        drawn.model.clear();
        assertThat(phase()).isEqualTo(PaneState.Phase.EMPTY);
        assertThat(drawn.session.pictures()).doesNotContainKey(PICTURE);
        assertThat(drawn.model.frame().get()).isEmpty();
    }

    @Test
    void offTheGridThereIsNoSectionAndItIsSaid() {
        drawn.line(0, 0, 100, 100);
        assertThat(drawn.model.state().get()).isEqualTo(PaneState.empty(Words.of("section.off")));
        assertThat(drawn.session.section().get()).isEmpty();
        drawn.model.alongPrism();
        assertThat(phase()).isEqualTo(PaneState.Phase.READY);
    }

    @Test
    void dataThatCannotBeReadAreToldInWords() throws IOException {
        SampleCopy.of("valley", folder);
        drawn.close();
        drawn = new DrawnSection(folder);
        drawn.model.alongPrism();
        Files.write(folder.resolve("head_l2_12.tif"), new byte[] {1, 2, 3});
        drawn.session.interval().set(11);
        assertThat(phase()).isEqualTo(PaneState.Phase.FAILED);
        assertThat(drawn.model.state().get().words()).contains("head_l2_12.tif");
        assertThat(drawn.session.section().get()).isEmpty();
        drawn.session.interval().set(3);
        assertThat(phase()).isEqualTo(PaneState.Phase.READY);
    }

    @Test
    void itFollowsIntervalQuantityAndPrisms() {
        drawn.model.alongPrism();
        double before = drawn.section().profile().stretches().get(3).column().heads()[0];
        drawn.session.interval().set(7);
        assertThat(drawn.section().profile().stretches().get(3).column().heads()[0])
                .isNotEqualTo(before);
        assertThat(drawn.section().colours()).isEmpty();
        MapQuantity thickness = new MapQuantity(MapQuantity.Kind.THICKNESS, "", "m");
        drawn.session.draped().set(Optional.of(new Draped(thickness, new ValueScale(Ramp.DEPTH, 0, 10))));
        assertThat(drawn.section().colours()).isPresent();
        double[] surfaces =
                drawn.section().profile().stretches().get(3).column().surfaces();
        assertThat(drawn.section().profile().stretches().get(3).column().values()[0])
                .isEqualTo(surfaces[0] - surfaces[1]);
        drawn.draft.beginGesture("step.move");
        drawn.draft.preview(drawing -> drawing.edit("well field", shape -> shape.moved(100, 0)));
        double moved = drawn.section().body().orElseThrow().slabs().get(0).from();
        drawn.draft.cancelGesture();
        assertThat(moved)
                .isGreaterThan(
                        drawn.section().body().orElseThrow().slabs().get(0).from());
    }

    @Test
    void flowsThroughLidsAndTheLitOneStandOut() {
        drawn.model.alongPrism();
        assertThat(drawn.section().light().unit()).isEmpty();
        drawn.session
                .faceFlows()
                .set(new FaceFlows(
                        1, "well field", "m3/d", java.util.Map.of(), java.util.Map.of("top", 5.0, "bottom", -2.0)));
        drawn.session.lit().set("bottom");
        assertThat(drawn.section().light().top()).isEqualTo(5);
        assertThat(drawn.section().light().bottom()).isEqualTo(-2);
        assertThat(drawn.section().light().unit()).isEqualTo("m³/d");
        assertThat(drawn.section().light().lid()).isEqualTo("bottom");
        drawn.session.selected().set("river meadow");
        assertThat(drawn.section().light().top()).isNaN();
    }

    @Test
    void exaggerationIsTypedAndFitShowsAllAgain() {
        drawn.model.alongPrism();
        SectionFrame all = drawn.frame();
        assertThat(drawn.model.exaggerate("2,5")).isTrue();
        assertThat(drawn.frame().exaggeration()).isCloseTo(2.5, within(1e-9));
        drawn.model.resize(1200, 260);
        assertThat(drawn.frame().exaggeration()).isCloseTo(2.5, within(1e-9));
        for (String wrong : new String[] {"0", "-1", "x", "NaN", "Infinity", "1e300", "1e-9"}) {
            assertThat(drawn.model.exaggerate(wrong)).isFalse();
        }
        assertThat(drawn.session.status().get()).isEqualTo(Words.of("section.times.refused"));
        assertThat(drawn.model.exaggerate(" ")).isTrue();
        drawn.model.resize(1000, 300);
        assertThat(drawn.frame()).isEqualTo(all);
    }

    @Test
    void zoomingHasLimitsAndDraggingFollowsTheHand() {
        drawn.model.alongPrism();
        SectionFrame all = drawn.frame();
        drawn.model.zoom(300, 100, 2, 2);
        assertThat(drawn.frame().along(300)).isCloseTo(all.along(300), within(1e-6));
        drawn.model.drag(-40, 0);
        assertThat(drawn.frame().along(260)).isCloseTo(all.along(300), within(1e-6));
        for (int i = 0; i < 40; i++) {
            drawn.model.zoom(300, 100, 1e9, 1e9);
        }
        drawn.model.fit();
        for (int i = 0; i < 200; i++) {
            drawn.model.step(-1, -1);
        }
        assertThat(drawn.frame().to() - drawn.frame().from()).isLessThan(20 * all.to());
        for (int i = 0; i < 400; i++) {
            drawn.model.step(1, 1);
        }
        assertThat(drawn.frame().to()).isGreaterThan(drawn.frame().from());
    }

    @Test
    void wellsAreShownWithinWhatIsTyped() {
        drawn.line(500300, 5201350, 501300, 5201500, 502800, 5200950);
        assertThat(drawn.section().wells()).extracting(NearbyWell::name).contains("Field 1");
        assertThat(drawn.model.showWellsWithin("0")).isTrue();
        assertThat(drawn.section().wells()).isEmpty();
        assertThat(drawn.model.showWellsWithin("-1")).isFalse();
        assertThat(drawn.model.showWellsWithin("5000")).isTrue();
        assertThat(drawn.section().wells()).hasSizeGreaterThan(3);
        assertThat(drawn.model.showWellsWithin("")).isTrue();
        assertThat(drawn.section().within()).isEqualTo(100);
    }

    @Test
    void pointingIsTheSamePlaceOnMapAndSection() {
        drawn.line(500300, 5201350, 501300, 5201350);
        drawn.model.point(drawn.frame().x(400), drawn.frame().y(95));
        assertThat(drawn.session.along().get().orElseThrow()).isCloseTo(400, within(1e-6));
        assertThat(drawn.model.readout().get()).startsWith("400.00 m from A   elevation 95.00 m   1 Gravel");
        drawn.session.along().set(OptionalDouble.of(250));
        assertThat(drawn.model.readout().get()).isEqualTo("250.00 m from A");
        drawn.model.leave();
        assertThat(drawn.session.along().get()).isEmpty();
        assertThat(drawn.model.readout().get()).isEmpty();
    }

    @Test
    void turnedTheLineLeadsTheOtherWay() {
        drawn.line(500300, 5201350, 501300, 5201350);
        double first = drawn.section().profile().stretches().get(0).column().surfaces()[0];
        drawn.model.turn();
        var stretches = drawn.section().profile().stretches();
        assertThat(stretches.get(stretches.size() - 1).column().surfaces()[0]).isEqualTo(first);
    }
}
