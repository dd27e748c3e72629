package org.seepledger.desktop.budget;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.FaceFlows;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.HeldTasks;
import org.seepledger.desktop.task.PaneState.Phase;
import org.seepledger.job.IntervalBudget;
import org.seepledger.prism.Prism;

/** The budget follows the hand and never runs behind for ever. */
class LiveBudgetTest {

    private final Session session = new Session();
    private final HeldTasks tasks = new HeldTasks();
    private final LiveBudget live = new LiveBudget(session, tasks);
    private final Reading reading = new Reading(session);
    private OpenSet set;
    private List<Prism> prisms;

    @BeforeEach
    void open() {
        Opening opening = Opening.of(Path.of("sample-aquifers/valley"));
        set = opening.set();
        prisms = set.workbench()
                .drawings()
                .prisms(set.path().resolve(Opening.PRISMS))
                .prisms();
    }

    @AfterEach
    void close() {
        set.close();
    }

    private void show() {
        session.show(Optional.of(set));
        draw(prisms, true);
        session.selected().set(prisms.get(0).name());
    }

    private void draw(List<Prism> drawn, boolean settled) {
        session.drawing().set(new Drawing(session.drawing().get().revision() + 1, drawn, settled));
    }

    /** The first prism with all its vertices moved to the east. */
    private List<Prism> moved(double distance) {
        List<Prism> drawn = new ArrayList<>(prisms);
        drawn.set(0, LiveSet.moved(prisms.get(0), distance));
        return drawn;
    }

    private IntervalBudget now() {
        return live.known().get().now().orElseThrow();
    }

    @Test
    void withNothingDrawnItSaysWhatToDo() {
        assertThat(live.now().get().phase()).isEqualTo(Phase.EMPTY);
        session.show(Optional.of(set));
        assertThat(live.now().get().words()).contains("Draw one");
        assertThat(live.record().get().phase()).isEqualTo(Phase.EMPTY);
        draw(prisms, true);
        assertThat(live.now().get().words()).contains("Select a prism");
        assertThat(tasks.waiting()).isEqualTo(1);
    }

    @Test
    void theIntervalComesFirstAndThenTheRecord() {
        show();
        assertThat(live.now().get().phase()).isEqualTo(Phase.WORKING);
        tasks.all();
        assertThat(live.now().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.record().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.known().get().record().orElseThrow().prisms()).isEqualTo(prisms);
    }

    @Test
    void aHandThatNeverRestsSeesNumbersOfTheNewestGeometryNext() {
        show();
        tasks.all();
        draw(moved(10), false);
        draw(moved(20), false);
        draw(moved(30), false);
        assertThat(tasks.waiting()).isEqualTo(1);
        tasks.next();
        assertThat(now().prism()).isEqualTo(moved(10).get(0));
        assertThat(live.now().get().phase()).isEqualTo(Phase.WORKING);
        tasks.next();
        assertThat(now().prism()).isEqualTo(moved(30).get(0));
        assertThat(live.now().get().phase()).isEqualTo(Phase.READY);
        assertThat(tasks.waiting()).isZero();
    }

    @Test
    void theRecordWaitsForTheHandToRest() {
        show();
        tasks.all();
        draw(moved(10), false);
        tasks.all();
        assertThat(live.record().get().phase()).isEqualTo(Phase.WORKING);
        assertThat(live.known().get().record().orElseThrow().prisms()).isEqualTo(prisms);
        draw(moved(10), true);
        tasks.all();
        assertThat(live.record().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.known().get().record().orElseThrow().prisms()).isEqualTo(moved(10));
    }

    @Test
    void whileItWorksTheOldBudgetStaysAndSaysWhoseItIs() {
        show();
        tasks.all();
        draw(moved(500), false);
        BudgetShown shown = live.known()
                .get()
                .budget(moved(500).get(0), reading.period(set, 0))
                .orElseThrow();
        assertThat(shown.prism()).isEqualTo(prisms.get(0));
        tasks.all();
        shown = live.known()
                .get()
                .budget(moved(500).get(0), reading.period(set, 0))
                .orElseThrow();
        assertThat(shown.prism()).isEqualTo(moved(500).get(0));
        assertThat(shown.whose(set, org.seepledger.desktop.words.NumberForm.SPACE_POINT))
                .contains("well field", "m²", "interval 1", "2021-10-01");
    }

    @Test
    void otherIntervalsComeFromTheRecordAtOnce() {
        show();
        tasks.all();
        session.interval().set(7);
        assertThat(tasks.waiting()).isZero();
        assertThat(live.now().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.known().get().budget(prisms.get(0), reading.period(set, 7)))
                .hasValueSatisfying(
                        shown -> assertThat(shown.budget().period().name()).isEqualTo("interval 8"));
    }

    @Test
    void whatCannotBeBalancedIsSaidInWordsAndMendedByTheNextDrawing() {
        new FaceFeed(session, live, reading).begin();
        show();
        tasks.all();
        draw(moved(1e6), true);
        tasks.all();
        assertThat(live.now().get().phase()).isEqualTo(Phase.FAILED);
        assertThat(live.now().get().words()).contains("well field", "outside the grid");
        assertThat(live.record().get().phase()).isEqualTo(Phase.FAILED);
        assertThat(session.faceFlows().get()).isEqualTo(FaceFlows.NONE);
        draw(prisms, true);
        tasks.all();
        assertThat(live.now().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.record().get().phase()).isEqualTo(Phase.READY);
        assertThat(session.faceFlows().get().prism()).isEqualTo("well field");
    }

    @Test
    void theMapIsToldWhatFlowsThroughTheSides() {
        new FaceFeed(session, live, reading).begin();
        show();
        tasks.next();
        tasks.all();
        FaceFlows flows = session.faceFlows().get();
        assertThat(flows.prism()).isEqualTo("well field");
        assertThat(flows.unit()).isEqualTo("m3/d");
        assertThat(flows.net()).containsKeys("far bank", "side 3").doesNotContainKeys("top", "recharge");
        assertThat(flows.revision()).isEqualTo(session.drawing().get().revision());
        draw(moved(40), false);
        assertThat(session.faceFlows().get().revision())
                .isNotEqualTo(session.drawing().get().revision());
    }

    @Test
    void anotherSetForgetsEverything() {
        show();
        tasks.all();
        session.show(Optional.empty());
        assertThat(live.known().get()).isEqualTo(Known.NOTHING);
        assertThat(live.now().get().phase()).isEqualTo(Phase.EMPTY);
    }

    @Test
    void whatWasStoppedSaysSoAndIsTakenUpAgain() {
        show();
        tasks.stop();
        tasks.stop();
        assertThat(live.now().get().phase()).isEqualTo(Phase.FAILED);
        assertThat(live.record().get().phase()).isEqualTo(Phase.FAILED);
        assertThat(live.record().get().words()).contains("Stopped");
        tasks.all();
        assertThat(live.record().get().phase()).isEqualTo(Phase.FAILED);
        live.again();
        tasks.all();
        assertThat(live.now().get().phase()).isEqualTo(Phase.READY);
        assertThat(live.record().get().phase()).isEqualTo(Phase.READY);
    }
}
