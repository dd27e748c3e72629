package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Screen;
import org.seepledger.balance.HotSpot;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

class MapPictureTest {

    private static final UnitShown RATE = new UnitShown("m3/d", 1, true);
    private static final double WIDTH = 720;

    /** Sides 1 to 4 are south, east, north and west. */
    private static final Prism PRISM = Prisms.of("a", 0, 1, Shapes.box(1060, 2050, 1240, 2150));

    private static Picture map(Map<String, Double> flows) {
        return MapPicture.ofFaces(
                Scene.aquifer(),
                PRISM,
                List.of(),
                Optional.empty(),
                Optional.empty(),
                Scene.budget(flows),
                RATE,
                WIDTH);
    }

    private static Map<String, Double> flows(double south, double east, double north, double west) {
        Map<String, Double> flows = new LinkedHashMap<>();
        flows.put("side:side 1", south);
        flows.put("side:side 2", east);
        flows.put("side:side 3", north);
        flows.put("side:side 4", west);
        return flows;
    }

    /** Arrows have seven corners; the fourth is the tip, the first and last the end of the shaft. */
    private static List<double[]> arrows(Picture map) {
        return Scene.flat(map.marks())
                .filter(Mark.Area.class::isInstance)
                .map(mark -> ((Mark.Area) mark).rings().get(0))
                .filter(ring -> ring.length == 14)
                .toList();
    }

    private static double shaft(double[] arrow) {
        return Math.hypot(arrow[0] - arrow[12], arrow[1] - arrow[13]);
    }

    @Test
    void arrowsPointInForGainsAndOutForLosses() {
        Picture map = map(flows(0, -60, 0, 80));
        MapFrame frame = MapRoom.of(PRISM, WIDTH);
        List<double[]> arrows = arrows(map);
        assertThat(arrows).hasSize(2);
        double[] west = arrows.get(0);
        assertThat(west[6]).isGreaterThan(frame.x(1060)).isGreaterThan(west[0]);
        assertThat(west[7]).isCloseTo(frame.y(2100), within(1e-9));
        double[] east = arrows.get(1);
        assertThat(east[6]).isGreaterThan(frame.x(1240)).isGreaterThan(east[0]);
        assertThat(shaft(west) / shaft(east)).isCloseTo(80.0 / 60, within(1e-9));
    }

    @Test
    void labelsSayInOrOutAndHowMuchTheRateIs() {
        Picture map = map(flows(-5, -60, Double.NaN, 80));
        assertThat(Scene.texts(map))
                .extracting(Mark.Text::words)
                .contains("side 1: out 5", "side 2: out 60", "side 3: –", "side 4: in 80");
    }

    @Test
    void withoutFlowNothingPoints() {
        Picture map = map(flows(0, 0, 0, 0));
        assertThat(arrows(map)).isEmpty();
        assertThat(Scene.texts(map)).extracting(Mark.Text::words).contains("side 1: 0");
    }

    @Test
    void aHundredSidesStayLegible() {
        Prism round = Prisms.of("round", 0, 0, Shapes.round(1150, 2100, 80, 100));
        Map<String, Double> flows = new HashMap<>();
        round.rings().get(0).sides().forEach(side -> flows.put("side:" + side.item(), side.x() - 1150.5));
        Picture map = MapPicture.ofFaces(
                Scene.aquifer(Scene.well("W1", 1150, 2100, new Screen.InLayer(0))),
                round,
                List.of(PRISM),
                Optional.empty(),
                Optional.of(SectionLine.through(round, Scene.GRID)),
                Scene.budget(flows),
                RATE,
                WIDTH);
        List<Box> labels = Scene.texts(map).stream()
                .filter(text -> text.words().startsWith("side") || text.words().equals("W1"))
                .map(Lettering::box)
                .toList();
        assertThat(labels).hasSizeGreaterThan(8);
        for (int i = 0; i < labels.size(); i++) {
            assertThat(labels.subList(0, i)).noneMatch(labels.get(i)::meets);
        }
        Box page = new Box(0, 0, map.width(), map.height());
        assertThat(Scene.texts(map))
                .filteredOn(text -> text.angle() == 0)
                .extracting(Lettering::box)
                .allMatch(page::holds);
    }

    @Test
    void valuesThatDifferByRoundingHaveOneColourAndNoLines() {
        Drape drape = Drape.of(Scene.GRID, Scene.GRID.window(), 100, row -> {
            double[] values = new double[30];
            Arrays.setAll(values, column -> 95 + 1e-13 * (column * row % 7));
            return values;
        });
        ValueScale scale = ValueScale.over(drape.values());
        MapPicture.Ground ground = new MapPicture.Ground(drape, scale, "head", "m", "sand", true);
        Picture map = MapPicture.ofFaces(
                Scene.aquifer(),
                PRISM,
                List.of(),
                Optional.of(ground),
                Optional.empty(),
                Scene.budget(flows(0, 0, 0, 0)),
                RATE,
                WIDTH);
        assertThat(DoubleStream.of(drape.values()).map(scale::share).boxed())
                .allSatisfy(share -> assertThat(share).isCloseTo(0.5, within(1e-6)));
        assertThat(Scene.flat(map.marks()))
                .noneMatch(mark ->
                        mark instanceof Mark.Line line && line.stroke().equals(Mark.Stroke.of(Ink.Token.TEXT, 0.7)));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 20, 40, 60, 80})
    void coordinatesStayInThePicture(int north) {
        Prism far = Prisms.of("far", 0, 1, Shapes.box(8_000_000, 8_200_000 + north, 8_000_400, 8_200_300 + north));
        Picture map = MapPicture.ofFaces(
                Scene.aquifer(),
                far,
                List.of(),
                Optional.empty(),
                Optional.empty(),
                Scene.budget(Map.of()),
                RATE,
                WIDTH);
        assertThat(Scene.texts(map))
                .filteredOn(text -> text.angle() != 0)
                .isNotEmpty()
                .allMatch(text -> text.y() >= Lettering.width(text.words(), text.size()) / 2);
    }

    @Test
    void cellsThatDoNotBalanceAreNumberedWhereTheyAre() {
        Drape drape = Drape.of(Scene.GRID, Scene.GRID.window(), 100, row -> new double[30]);
        MapPicture.Ground ground =
                new MapPicture.Ground(drape, ValueScale.aboutZero(drape.values()), "imbalance", "m3/d", "sand", false);
        Picture map = MapPicture.ofImbalance(
                Scene.aquifer(), PRISM, ground, List.of(new HotSpot(0, 10, 12, 3), new HotSpot(0, 7, 20, -2)), WIDTH);
        MapFrame frame = MapRoom.of(PRISM, WIDTH);
        Mark.Text second = Scene.texts(map).stream()
                .filter(text -> text.words().equals("2"))
                .findFirst()
                .orElseThrow();
        assertThat(second.x()).isCloseTo(frame.x(1205), within(1e-9));
        assertThat(second.y()).isCloseTo(frame.y(2125), within(5.0));
    }
}
