package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.plume.Crossing;
import org.seepledger.plume.Plume;
import org.seepledger.plume.SoluteBalance;
import org.seepledger.plume.TransectFlows;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/** What pictures show of a solute. */
class PlumePicturesTest {

    private static final UnitShown RATE = new UnitShown("kg/d", 1, true);
    private static final Prism PRISM = Prisms.of("a", 0, 1, Shapes.box(1060, 2050, 1240, 2150));

    /** 2 kg/m³ at first and 1 at the end, below a limit of 0.5 west of 1150. */
    private static Solute solute() {
        GriddedValues values =
                new FormulaValues(Scene.GRID, 2, (instant, layer, x, y) -> x < 1150 ? 0.1 : 2.0 - instant);
        return new Solute(
                "salt",
                Optional.of(new Concentration(
                        values,
                        GriddedValues.constant(Double.NaN),
                        Optional.of(GriddedValues.constant(0.5)),
                        false,
                        Measure.of("mg/L"))),
                Optional.of(GriddedValues.constant(0.25)),
                Optional.empty(),
                Optional.empty(),
                Solute.Decay.NONE,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Map.of());
    }

    private static Plume plume() {
        return SoluteBalance.of(
                        Scene.aquifer(),
                        List.of(solute()),
                        List.of(PRISM),
                        new SoluteBalance.Options(WellRule.POINT, false, OptionalDouble.empty(), 1),
                        Progress.NONE)
                .get(0);
    }

    @Test
    void massThroughTimeHasALineAndABandOfNonDetects() {
        Picture curve = MassCurve.of(plume(), Scene.aquifer().times(), "kg", 1, 720);
        Drawn.isLegible(curve);
        List<Mark.Line> lines = Drawn.of(Mark.Line.class, curve.marks()).stream()
                .filter(line -> line.stroke().equals(Mark.Stroke.of(Ink.Token.TEXT, 2)))
                .toList();
        double[] all = lines.get(lines.size() - 1).xy();
        assertThat(all).hasSize(4);
        // 18 000 m² × 25 m × a quarter, half of it at 2 and 1 kg/m³, the other at half of 0.5; below, the scale begins
        // at 0.
        double zero = Drawn.of(Mark.Line.class, curve.marks()).stream()
                .filter(line -> line.stroke().equals(Mark.Stroke.of(Ink.Token.TEXT, 1.2)))
                .findFirst()
                .orElseThrow()
                .xy()[1];
        assertThat((zero - all[1]) / (zero - all[3])).isCloseTo((2 + 0.25) / (1 + 0.25), within(1e-9));
        Box band = Drawn.box(Drawn.of(Mark.Area.class, curve.marks()).stream()
                .filter(area -> area.rings().get(0).length == 8 && area.stroke().isEmpty())
                .findFirst()
                .orElseThrow());
        assertThat(band.bottom()).isGreaterThan(all[3]);
        assertThat(Drawn.words(curve)).anyMatch(words -> words.contains("non-detects counted from 0 to their limit"));
        assertThat(curve.title()).isEqualTo("salt that a holds, through time");
    }

    @Test
    void theMapShowsOutlineTrackAndFlow() {
        Drape drape = Drape.of(Scene.GRID, Scene.GRID.window(), 100, row -> {
            double[] line = new double[30];
            Arrays.setAll(line, column -> column >= 15 ? 1 : 0.25);
            return line;
        });
        MapPicture.Ground ground = new MapPicture.Ground(
                drape, ValueScale.ofConcentrations(drape.values()), "concentration", "mg/L", "sand", false);
        PlumeTrack track = new PlumeTrack(List.of(
                new PlumeTrack.Stop(1160, 2100, 20, 10, 0, "2021"),
                new PlumeTrack.Stop(1200, 2110, 20, 10, 0, "2022")));
        Picture map = MapPicture.ofPlume(
                Scene.aquifer(),
                PRISM,
                List.of(),
                ground,
                new MapPicture.Trail(Optional.of(ThresholdOutline.of(drape, 0.5)), "0.5 mg/L", track),
                Optional.empty(),
                Scene.budget(Map.of("side:side 2", -3.0)),
                RATE,
                "Map of salt",
                720);
        assertThat(Scene.texts(map))
                .extracting(Mark.Text::words)
                .contains("2021", "2022", "side 2: out 3", "cells with more than 0.5 mg/L");
        assertThat(Scene.flat(map.marks()))
                .anyMatch(mark -> mark instanceof Mark.Area area
                        && area.stroke()
                                .filter(ThresholdOutline.stroke()::equals)
                                .isPresent());
        Box page = new Box(0, 0, map.width(), map.height());
        assertThat(Scene.texts(map))
                .filteredOn(text -> text.angle() == 0)
                .extracting(Lettering::box)
                .allMatch(page::holds);
    }

    private static double[] filled(int size, double value) {
        double[] values = new double[size];
        Arrays.fill(values, value);
        return values;
    }

    @Test
    void aSectionIsColouredUpToTheWaterTable() {
        ValueScale scale = new ValueScale(Ramp.STAIN, 0, 2);
        Picture section = SectionPicture.of(
                        Scene.aquifer(),
                        PRISM,
                        SectionLine.through(PRISM, Scene.GRID),
                        Scene.budget(Map.of()),
                        RATE,
                        Optional.of(new SectionPicture.Shade(
                                (layer, window) -> filled(window.size(), layer == 0 ? 1 : Double.NaN),
                                scale,
                                "concentration, mg/L")),
                        720)
                .orElseThrow();
        List<Mark> all = Scene.flat(section.marks()).toList();
        Mark.Image cells = Drawn.of(Mark.Image.class, all).get(0);
        int first = 0;
        while (cells.argb()[first] != scale.argb(1, 1)) {
            first++;
        }
        double head = Drawn.of(Mark.Line.class, all).stream()
                .filter(line -> line.stroke().ink() == Ink.Token.WATER)
                .findFirst()
                .orElseThrow()
                .xy()[1];
        assertThat(cells.placement()[5] + first / cells.columns()).isCloseTo(head, within(1.0));
        assertThat(Scene.texts(section)).extracting(Mark.Text::words).contains("concentration, mg/L");
    }

    /** A line whose pieces lie in several rows is drawn from its first vertex to its last, and its area is what crosses. */
    @Test
    void aProfileFollowsTheLine() {
        Aquifer aquifer = Scene.aquifer();
        Transect line = new Transect("fence", List.of(new double[] {1105, 2033}, new double[] {1221, 2171}));
        Crossing crossing = TransectFlows.of(aquifer, List.of(solute()), List.of(line), Progress.NONE)
                .get(0);
        List<Crossing.Stretch> way = crossing.along(Scene.GRID);
        double length = Math.hypot(116, 138);
        assertThat(way.get(0).from()).isCloseTo(0, within(1e-9));
        assertThat(way.get(way.size() - 1).to()).isCloseTo(length, within(1e-9));
        for (int i = 1; i < way.size(); i++) {
            assertThat(way.get(i).from()).isCloseTo(way.get(i - 1).to(), within(1e-9));
        }
        Picture profile = CrossingProfile.of(
                crossing,
                new Periods(aquifer.times()).record(),
                Scene.GRID,
                List.of("sand", "gravel"),
                "m",
                "kg/d",
                1,
                720);
        Drawn.isLegible(profile);
        assertThat(profile.title()).isEqualTo("salt across fence, record");
    }
}
