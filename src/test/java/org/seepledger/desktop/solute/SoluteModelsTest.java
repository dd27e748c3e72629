package org.seepledger.desktop.solute;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.budget.LiveSet;
import org.seepledger.desktop.chart.ChartModel;
import org.seepledger.desktop.session.Drawing;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.DirectTasks;
import org.seepledger.picture.Box;
import org.seepledger.picture.MapFrame;
import org.seepledger.picture.Mark;
import org.seepledger.picture.MassCurve;
import org.seepledger.picture.PlumeTrack;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Stock;
import org.seepledger.prism.Prism;
import org.seepledger.unit.Figures;

/** What the window says and draws of a solute. */
class SoluteModelsTest {

    private static final MapFrame FRAME = new MapFrame(new Box(0, 0, 500, 300), 0, 150, 2);

    private final LiveSet depot = LiveSet.depot();
    private final PlumeMapModel map = new PlumeMapModel(depot.session, depot.look, depot.plumes, new DirectTasks());
    private final SolutePanelModel panel = new SolutePanelModel(depot.session, depot.look, depot.plumes);
    private final ChartModel chart =
            new ChartModel(depot.session, depot.live, depot.reading, depot.plumes, depot.masses, depot.said);

    @BeforeEach
    void look() {
        depot.session.interval().set(7);
        depot.session.solute().set("solvent");
    }

    @AfterEach
    void close() {
        depot.close();
    }

    private Stock held(int instant) {
        return depot.plumes.shown().orElseThrow().plume().whole(instant);
    }

    @Test
    void aThresholdIsTypedInTheSolutesUnitOrAnother() {
        assertThat(depot.look.type(" 0.1 ")).isTrue();
        double inMilligrams = depot.look.choice(depot.set).above().orElseThrow();
        assertThat(inMilligrams).isCloseTo(1e-4, within(1e-18));
        assertThat(depot.look.type("100 ug/L")).isTrue();
        assertThat(depot.look.choice(depot.set).above().orElseThrow()).isCloseTo(inMilligrams, within(1e-18));
        for (String text : new String[] {"0.1 m", "much", "-1", "1 2 mg/L", "NaN"}) {
            assertThat(depot.look.type(text)).as(text).isFalse();
        }
        assertThat(depot.look.wanted()).contains("mg/L");
        assertThat(depot.look.threshold().get()).isPresent();
        assertThat(depot.look.type("")).isTrue();
        assertThat(depot.look.choice(depot.set).above()).isEmpty();
    }

    /** The outline encloses the very area that the engine counts, in a prism that holds all of the layer. */
    @Test
    void theOutlineEnclosesTheAreaThatIsCounted() {
        Prism all = depot.set.workbench().solutes().everything("all");
        depot.session.drawing().set(new Drawing(2, List.of(all), true));
        depot.session.selected().set("all");
        depot.look.type("0.05");
        double counted = held(8).areaAbove();
        assertThat(counted).isPositive();
        Mark.Area outline = (Mark.Area) map.marks(FRAME).get(1);
        double enclosed =
                outline.rings().stream().mapToDouble(SoluteModelsTest::area).sum();
        assertThat(Math.abs(enclosed) / (FRAME.scale() * FRAME.scale())).isCloseTo(counted, within(1e-6));
        assertThat(panel.above().get())
                .contains(Figures.typeset(counted) + " m²")
                .contains(Figures.typeset(held(8).rockAbove()) + " m³");
        depot.session.interval().set(0);
        assertThat(((Mark.Area) map.marks(FRAME).get(1)).rings()).isNotEqualTo(outline.rings());
    }

    private static double area(double[] ring) {
        double twice = 0;
        for (int i = 0; i < ring.length; i += 2) {
            int next = (i + 2) % ring.length;
            twice += ring[i] * ring[next + 1] - ring[next] * ring[i + 1];
        }
        return twice / 2;
    }

    @Test
    void theTrackIsLookedAtAtTheIntervalsEnd() {
        PlumeTrack track = map.track().orElseThrow();
        assertThat(track.stops()).hasSizeBetween(20, 25);
        assertThat(track.stops().get(track.current()).name()).isEqualTo("2022-06-01");
        double[] centre = held(8).centre();
        assertThat(track.stops().get(track.current()).mapX()).isEqualTo(centre[0]);
        depot.look.track().set(SoluteLook.Track.OF_SET);
        PlumeTrack ofSet = map.track().orElseThrow();
        assertThat(ofSet.stops().get(ofSet.current()).mapX()).isNotEqualTo(centre[0]);
        depot.look.track().set(SoluteLook.Track.NONE);
        assertThat(map.track()).isEmpty();
    }

    @Test
    void withWaterLookedAtTheMapHasNothingOfIt() {
        depot.look.type("0.1");
        depot.session.solute().set("");
        assertThat(map.marks(FRAME)).isEmpty();
        assertThat(panel.above().get()).isEmpty();
        assertThat(chart.masses(900, 240)).isEmpty();
        assertThat(chart.trend()).isEmpty();
    }

    @Test
    void theMassChartFollowsTheIntervalAndLeadsToOthers() {
        MassCurve curve = chart.masses(900, 240).orElseThrow();
        assertThat(curve.picture().title()).isEqualTo("solvent that yard holds, through time");
        String words = words(curve);
        assertThat(words).contains("then " + Figures.typeset(held(8).total(NonDetects.HALF)) + " kg");
        double middle = 450;
        OptionalInt there = curve.intervalAt(middle);
        assertThat(there).isPresent();
        chart.look(there.getAsInt());
        assertThat(words(chart.masses(900, 240).orElseThrow()))
                .contains("then " + Figures.typeset(held(there.getAsInt() + 1).total(NonDetects.HALF)) + " kg");
        assertThat(curve.intervalAt(0)).isEmpty();
        assertThat(chart.trend()).contains("Mass in place falls by").doesNotContain("stable");
    }

    private static String words(MassCurve curve) {
        StringBuilder words = new StringBuilder();
        for (Mark mark : curve.picture().marks()) {
            words.append(mark instanceof Mark.Text text ? text.words() + "\n" : "");
        }
        return words.toString();
    }

    @Test
    void warningsStandBeside() {
        assertThat(panel.doubts().get()).contains("warning");
        assertThat(depot.said.warnings()).anyMatch(warning -> warning.contains("--dispersion"));
        depot.look.dispersion().set(true);
        assertThat(depot.said.warnings()).noneMatch(warning -> warning.contains("--dispersion"));
        assertThat(depot.said.notes()).anyMatch(note -> note.contains("half a cell"));
        assertThat(depot.said.cautions()).anyMatch(caution -> caution.contains("safe to drink"));
        assertThat(depot.said.belongs()).startsWith("solvent: yard");
        assertThat(depot.said.answer().orElseThrow().points()).isNotEmpty();
    }

    @Test
    void howItIsLookedAtIsKeptFromRunToRun() {
        KeptLook.of(depot.look, depot.answers);
        depot.look.type("100 ug/L");
        depot.look.dispersion().set(true);
        depot.look.track().set(SoluteLook.Track.OF_SET);
        SoluteLook next = new SoluteLook(new Session());
        KeptLook.of(next, depot.answers);
        assertThat(next.threshold().get()).isEqualTo(depot.look.threshold().get());
        assertThat(next.dispersion().get()).isTrue();
        assertThat(next.track().get()).isEqualTo(SoluteLook.Track.OF_SET);
        depot.answers.settings.put("solute.track", "sideways");
        depot.answers.settings.put("solute.threshold", "much");
        SoluteLook last = new SoluteLook(new Session());
        KeptLook.of(last, depot.answers);
        assertThat(last.track().get()).isEqualTo(SoluteLook.Track.OF_PRISM);
        assertThat(last.threshold().get()).isEmpty();
    }

    /** Masses through sides in place of water, in the ledger's unit. */
    @Test
    void theMapHasTheMassThroughSides() {
        new MassFeed(depot.session, depot.plumes, depot.masses);
        depot.masses.unit().set("g/d");
        assertThat(depot.session.faceFlows().get().unit()).isEqualTo("g/d");
        assertThat(depot.session.faceFlows().get().net().get("meadow side")).isNegative();
    }
}
