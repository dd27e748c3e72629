package org.seepledger.desktop.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Body;
import org.seepledger.picture.Section;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;

class LidHandTest {

    private final DrawnSection drawn = DrawnSection.valley();
    private final LidHand hand = drawn.model.lids();

    @BeforeEach
    void lay() {
        drawn.line(500300, 5201350, 501300, 5201500, 502800, 5200950);
    }

    @AfterEach
    void close() {
        drawn.close();
    }

    private Body.Spot spot() {
        return drawn.section()
                .body()
                .orElseThrow()
                .spot(drawn.frame(), LidHand.HANDLE)
                .orElseThrow();
    }

    private double x() {
        return drawn.frame().x(spot().along());
    }

    private double surface(int index) {
        return drawn.frame()
                .y(drawn.section()
                        .profile()
                        .at(spot().along())
                        .orElseThrow()
                        .column()
                        .surfaces()[index]);
    }

    private Limit top() {
        return Lid.TOP.in(drawn.draft.selected().orElseThrow().reach(), 3);
    }

    /** Takes hold of the top. */
    private void press() {
        assertThat(hand.press(x(), surface(0))).isTrue();
    }

    @Test
    void aHandleIsHitWithinSevenPixelsAndALidWithinFive() {
        double y = surface(0);
        assertThat(hand.at(x(), y - 6.9)).contains(Lid.TOP);
        assertThat(hand.at(x(), y - 7.1)).isEmpty();
        double aside = drawn.frame().x(spot().along() + 120);
        double there = drawn.frame()
                .y(drawn.section()
                        .profile()
                        .at(spot().along() + 120)
                        .orElseThrow()
                        .column()
                        .surfaces()[3]);
        assertThat(hand.at(aside, there + 4.9)).contains(Lid.BOTTOM);
        assertThat(hand.at(aside, there + 5.1)).isEmpty();
    }

    @Test
    void aLayerHoldsFromEightPixelsOnAndLetsGoAtTwelve() {
        press();
        hand.drag(x(), surface(1) - 9, false);
        assertThat(top()).isInstanceOf(Limit.Elevation.class);
        hand.drag(x(), surface(1) - 7.5, false);
        assertThat(top()).isEqualTo(new Limit.Layer(1));
        hand.drag(x(), surface(1) - 11.5, false);
        assertThat(top()).isEqualTo(new Limit.Layer(1));
        hand.drag(x(), surface(1) - 12.5, false);
        assertThat(top()).isInstanceOf(Limit.Elevation.class);
        hand.drag(x(), surface(1), true);
        assertThat(top()).isInstanceOf(Limit.Elevation.class);
        hand.release();
    }

    @Test
    void aDragIsOneNamedStepAndGivenUpItLeavesNothing() {
        Drawing before = drawn.draft.drawing();
        press();
        hand.drag(x(), surface(0) + 2, false);
        assertThat(drawn.draft.isGesturing()).isFalse();
        hand.drag(x(), surface(0) + 40, true);
        hand.drag(x(), surface(0) + 45, true);
        hand.release();
        assertThat(drawn.draft.undoable()).contains("Move top");
        drawn.draft.undo();
        assertThat(drawn.draft.drawing()).isSameAs(before);
        assertThat(drawn.draft.undoable()).isEmpty();
        press();
        hand.drag(x(), surface(0) + 40, true);
        hand.cancel();
        assertThat(drawn.draft.drawing()).isSameAs(before);
        hand.drag(x(), surface(0) + 60, true);
        hand.release();
        assertThat(drawn.draft.drawing()).isSameAs(before);
    }

    @Test
    void aLidPutBackWhereItWasIsNoStep() {
        press();
        hand.drag(x(), surface(0) + 40, false);
        hand.drag(x(), surface(0) + 1, false);
        hand.release();
        assertThat(drawn.draft.undoable()).isEmpty();
    }

    @Test
    void theTopStaysAboveTheBottom() {
        hand.type(Lid.BOTTOM, "90");
        press();
        hand.drag(x(), drawn.frame().y(80), true);
        double height = ((Limit.Elevation) top()).height();
        assertThat(height).isGreaterThan(90).isCloseTo(90, within(1.0));
        hand.release();
    }

    @Test
    void freeElevationsAreRoundLessThanAPixelApart() {
        double step = LidHand.step(drawn.frame());
        assertThat(step)
                .isLessThanOrEqualTo(drawn.frame().pixel())
                .isGreaterThan(drawn.frame().pixel() / 10.000001);
        assertThat(LidHand.rounded(97.2468, 0.1)).isEqualTo(97.2);
        assertThat(LidHand.rounded(97.2468, 0.001)).isEqualTo(97.247);
        assertThat(LidHand.rounded(1234, 100)).isEqualTo(1200);
        assertThat(LidHand.rounded(-0.26, 0.1)).isEqualTo(-0.3);
    }

    @Test
    void whereBothLidsLieTogetherThePlaceDecides() {
        Section cut = drawn.section();
        Body flat = new Body("well field", List.of(new Body.Slab(0, 1000, 90, 90)));
        Section section = new Section(
                cut.profile(),
                cut.layers(),
                "m",
                cut.span(),
                List.of(flat),
                List.of(),
                0,
                Optional.empty(),
                cut.light());
        LidHits hits = new LidHits(section, drawn.frame());
        double x = drawn.frame().x(500);
        double y = drawn.frame().y(90);
        assertThat(hits.lidAt(x, y - 3)).contains(Lid.TOP);
        assertThat(hits.lidAt(x, y + 3)).contains(Lid.BOTTOM);
    }

    @Test
    void pressingABodyChoosesItsPrism() {
        Body other = drawn.section().bodies().stream()
                .filter(body -> body.name().equals("river meadow"))
                .findFirst()
                .orElseThrow();
        Body.Spot middle = other.spot(drawn.frame(), 0.5).orElseThrow();
        double y = drawn.frame().y((middle.slab().top() + middle.slab().bottom()) / 2);
        assertThat(hand.press(drawn.frame().x(middle.along()), y)).isFalse();
        assertThat(drawn.session.selected().get()).isEqualTo("river meadow");
        assertThat(drawn.draft.undoable()).isEmpty();
    }

    @Test
    void keysChooseAndNudge() {
        assertThat(hand.nudge(1)).isFalse();
        hand.chooseNext();
        assertThat(hand.chosen()).contains(Lid.TOP);
        hand.chooseNext();
        assertThat(hand.chosen()).contains(Lid.BOTTOM);
        double before = spot().slab().bottom();
        assertThat(hand.nudge(10)).isTrue();
        double step = LidHand.step(drawn.frame());
        Limit bottom = Lid.BOTTOM.in(drawn.draft.selected().orElseThrow().reach(), 3);
        assertThat(((Limit.Elevation) bottom).height()).isCloseTo(before + 10 * step, within(step));
    }

    @Test
    void whatIsTypedIsTakenOrRefusedInWords() {
        assertThat(hand.type(Lid.TOP, "97.25")).isTrue();
        assertThat(hand.text(Lid.TOP)).isEqualTo("97.25");
        assertThat(hand.type(Lid.TOP, "layer 2")).isTrue();
        assertThat(drawn.draft.selected().orElseThrow().reach()).isEqualTo(new Reach.Layers(1, 2));
        assertThat(hand.type(Lid.TOP, "high")).isFalse();
        assertThat(drawn.session.status().get()).isEqualTo(Words.of("section.lid.form"));
        assertThat(hand.type(Lid.TOP, "layer 4")).isFalse();
        assertThat(hand.type(Lid.BOTTOM, "layer 1")).isFalse();
        assertThat(hand.type(Lid.TOP, "")).isTrue();
        assertThat(drawn.draft.selected().orElseThrow().reach()).isEqualTo(new Reach.Layers(0, 2));
    }
}
