package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.seepledger.picture.ProfileTest.line;
import static org.seepledger.picture.ProfileTest.profile;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.Screen;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Place;

class SectionPictureTest {

    private static final UnitShown RATE = new UnitShown("m3/d", 1, true);
    private static final Prism BOX = Prisms.of("a", 0, 1, Shapes.box(1060, 2050, 1240, 2150));

    private static double inside(Body body) {
        return body.slabs().stream()
                .mapToDouble(slab -> slab.to() - slab.from())
                .sum();
    }

    private static Body body(SectionLine line, Prism prism) {
        return Body.of(prism, profile(line, Scene.aquifer()));
    }

    private static Place begin(SectionLine line) {
        return line.places().get(0);
    }

    private static Place end(SectionLine line) {
        return line.places().get(line.places().size() - 1);
    }

    @Test
    void theLineFollowsTheLongerSideAndStaysOnTheGrid() {
        SectionLine line = SectionLine.through(BOX, Scene.GRID);
        assertThat(begin(line).x()).isCloseTo(1060 - 0.12 * 180, within(1e-9));
        assertThat(end(line).x()).isCloseTo(1240 + 0.12 * 180, within(1e-9));
        assertThat(begin(line).y()).isCloseTo(end(line).y(), within(1e-9)).isBetween(2050.0, 2150.0);
        SectionLine whole = SectionLine.through(Prisms.of("b", 0, 0, Shapes.box(1000, 2000, 1300, 2200)), Scene.GRID);
        assertThat(begin(whole).x()).isCloseTo(1000, within(1e-9));
        assertThat(end(whole).x()).isCloseTo(1300, within(1e-9));
    }

    @Property(tries = 50)
    void itLeadsFromWestToEastThroughThePrismHoweverThatIsTurned(@ForAll long seed) {
        double degrees = new Random(seed).nextDouble() * 360;
        double[] turned = Shapes.turned(Shapes.box(1100, 2080, 1200, 2120), degrees, 1150, 2100);
        SectionLine line = SectionLine.through(Prisms.of("a", 0, 0, turned), Scene.GRID);
        assertThat(end(line).x()).isGreaterThanOrEqualTo(begin(line).x() - 1e-6);
        assertThat(line.length()).isCloseTo(124, within(1e-6));
        assertThat(inside(body(line, Prisms.of("a", 0, 0, turned)))).isCloseTo(100, within(1e-6));
    }

    @Test
    void anIslandIsNotInTheBody() {
        Prism holed = Prisms.of(
                "a",
                0,
                0,
                List.of(
                        Prisms.ring(1, 0, Shapes.box(1060, 2050, 1240, 2150)),
                        Prisms.ring(1, 1, Shapes.reversed(Shapes.box(1100, 2070, 1130, 2130)))));
        assertThat(inside(body(line(1000, 2100, 1300, 2100), holed))).isCloseTo(150, within(1e-9));
    }

    @Test
    void theBodyReachesFromLidToLid() {
        SectionLine line = SectionLine.through(BOX, Scene.GRID);
        List<Ring> rings = BOX.rings();
        Prism lower = new Prism("b", rings, new VerticalRange.Layers(1, 1));
        Prism between = new Prism(
                "c",
                rings,
                new VerticalRange.Elevations(
                        Optional.of(GriddedValues.constant(93)), Optional.of(GriddedValues.constant(60))));
        assertThat(body(line, lower).slabs()).isNotEmpty().allMatch(slab -> slab.top() == 90 && slab.bottom() == 70);
        assertThat(body(line, between).slabs()).isNotEmpty().allMatch(slab -> slab.top() == 93 && slab.bottom() == 70);
    }

    @Test
    void saysWhatFlowsThroughTheLidsAndShowsWellsNearby() {
        Aquifer aquifer = Scene.aquifer(
                Scene.well("near", 1120, 2101, new Screen.InLayer(1)),
                Scene.well("between", 1180, 2099, new Screen.Between(94, 80)),
                Scene.well("far", 1120, 2140, new Screen.InLayer(1)));
        Picture section = SectionPicture.of(
                        aquifer,
                        BOX,
                        line(1020, 2100, 1280, 2100),
                        Scene.budget(Map.of("lid:top", 12.5, "lid:bottom", -40.0)),
                        RATE,
                        720)
                .orElseThrow();
        assertThat(Scene.texts(section))
                .extracting(Mark.Text::words)
                .contains("top: in 12.5", "bottom: out 40", "near", "between", "A", "A′", "1 sand", "2 gravel")
                .doesNotContain("far");
        Box page = new Box(0, 0, section.width(), section.height());
        assertThat(Scene.texts(section)).extracting(Lettering::box).allMatch(page::holds);
    }

    private static Aquifer withLayers(GriddedValues second, GriddedValues head) {
        Aquifer scene = Scene.aquifer();
        return new Aquifer(
                scene.name(),
                scene.grid(),
                List.of(
                        scene.layers().get(0),
                        new Layer("clay", Optional.empty(), second, false),
                        new Layer("gravel", Optional.empty(), GriddedValues.constant(70), false)),
                scene.times(),
                scene.flow(),
                Optional.of(head),
                scene.storage(),
                List.of(),
                scene.lengthUnit(),
                scene.timeUnit());
    }

    @Test
    void aPrismInALayerOfNoThicknessHasAMark() {
        Aquifer aquifer = withLayers(GriddedValues.constant(90), GriddedValues.constant(95));
        Profile profile = profile(line(1000, 2100, 1300, 2100), aquifer);
        Body flat = Body.of(Prisms.of("flat", 1, 1, Shapes.box(1060, 2050, 1240, 2150)), profile);
        assertThat(inside(flat)).isCloseTo(180, within(1e-9));
        assertThat(flat.slabs()).allMatch(slab -> slab.top() == 90 && slab.bottom() == 90);
        Section section = ProfileTest.section(profile, aquifer, List.of(flat));
        Picture picture = SectionPicture.of(section, 720, 300);
        SectionFrame frame = SectionFrame.fitting(profile, SectionPicture.box(section, 720, 300));
        assertThat(Scene.flat(picture.marks())
                        .filter(Mark.Line.class::isInstance)
                        .map(Mark.Line.class::cast)
                        .filter(mark -> mark.stroke().ink() == Ink.Token.PRISM)
                        .filter(mark -> mark.xy()[0] == frame.x(60)))
                .singleElement()
                .satisfies(mark -> assertThat(mark.xy()[1]).isEqualTo(frame.y(90)));
        assertThat(Scene.texts(picture)).extracting(Mark.Text::words).contains("flat");
    }

    @Test
    void aRangeThatMissesTheLayersLeavesNoBody() {
        Prism above = new Prism(
                "above",
                BOX.rings(),
                new VerticalRange.Elevations(Optional.empty(), Optional.of(GriddedValues.constant(120))));
        assertThat(body(line(1000, 2100, 1300, 2100), above).slabs()).isEmpty();
    }

    @Test
    void valuesAreColouredAndDryCellsDotted() {
        Aquifer aquifer = withLayers(GriddedValues.constant(80), GriddedValues.constant(85));
        Profile profile = Profile.along(
                line(1000, 2100, 1300, 2100),
                aquifer,
                0,
                1,
                Optional.of((layer, window) -> {
                    double[] values = new double[window.size()];
                    java.util.Arrays.fill(values, layer == 1 ? Double.NaN : layer);
                    return values;
                }),
                Progress.NONE);
        ValueScale scale = new ValueScale(Ramp.DEPTH, 0, 2);
        Section section = ProfileTest.section(profile, aquifer, List.of())
                .in(Optional.of(new Section.Colours(scale, "index, m")));
        SectionFrame frame = SectionFrame.fitting(profile, SectionPicture.box(section, 720, 300));
        Picture picture = SectionPicture.of(section, frame);
        Mark.Image image = Scene.flat(picture.marks())
                .filter(Mark.Image.class::isInstance)
                .map(Mark.Image.class::cast)
                .findFirst()
                .orElseThrow();
        int column = image.columns() / 2;
        int[] rows = {
            (int) (frame.y(95) - frame.box().y()),
            (int) (frame.y(85) - frame.box().y()),
            (int) (frame.y(75) - frame.box().y())
        };
        assertThat(image.argb()[rows[0] * image.columns() + column]).isZero();
        assertThat(image.argb()[rows[1] * image.columns() + column]).isZero();
        assertThat(image.argb()[rows[2] * image.columns() + column]).isEqualTo(scale.argb(2, 1));
        assertThat(Scene.flat(picture.marks())
                        .filter(Mark.Area.class::isInstance)
                        .flatMap(mark -> ((Mark.Area) mark).fill().stream()))
                .anyMatch(fill -> fill.texture() == Mark.Texture.DOTS);
        assertThat(Scene.texts(picture)).extracting(Mark.Text::words).contains("dry", "colour: index, m");
        assertThat(Scene.texts(SectionPicture.of(section, 720, 400)))
                .extracting(Mark.Text::words)
                .contains("index, m")
                .doesNotContain("colour: index, m");
    }

    @Test
    void coloursReachUpToTheWaterLevelWhereItCanLie() {
        Aquifer aquifer = Scene.aquifer();
        Profile profile = Profile.along(
                line(1000, 2100, 1300, 2100),
                aquifer,
                0,
                1,
                Optional.of((layer, window) -> new double[window.size()]),
                Progress.NONE);
        Section section = ProfileTest.section(profile, aquifer, List.of())
                .in(Optional.of(new Section.Colours(new ValueScale(Ramp.DEPTH, 0, 1), "x")));
        SectionFrame frame = SectionFrame.fitting(profile, new Box(0, 0, 100, 200));
        Mark.Image image = SectionColours.of(section, section.colours().orElseThrow(), frame);
        assertThat(image.argb()[(int) (frame.y(95) - 1.5) * 100 + 50]).isZero();
        assertThat(image.argb()[(int) (frame.y(95) + 1.5) * 100 + 50]).isNotZero();
        assertThat(image.argb()[(int) (frame.y(70) - 1.5) * 100 + 50]).isNotZero();
    }

    @Test
    void wellsStandWhereTheyAreNearestToTheLine() {
        Aquifer aquifer = Scene.aquifer(
                Scene.well("beside", 1120, 2108, new Screen.InLayer(1)),
                Scene.well("screened", 1180, 2099, new Screen.Between(94, 80)),
                Scene.well("far", 1120, 2140, new Screen.InLayer(1)));
        List<NearbyWell> wells = NearbyWell.of(aquifer, profile(line(1020, 2100, 1280, 2100), aquifer), 10);
        assertThat(wells)
                .containsExactly(
                        new NearbyWell("beside", 100, 8, 100, 90, 70), new NearbyWell("screened", 160, 1, 100, 94, 80));
    }

    @Property(tries = 30)
    void wordsStayOnThePage(@ForAll long seed) {
        Random random = new Random(seed);
        Aquifer aquifer = Scene.aquifer(Scene.well("a well of a long name", 1120, 2101, new Screen.InLayer(1)));
        Profile profile = profile(line(1000, 2100, 1150, 2150, 1300, 2010), aquifer);
        Section section = ProfileTest.section(profile, aquifer, List.of(Body.of(BOX, profile)))
                .in(new Section.Light("a", "top", 12.5, -40, "m3/d"));
        double width = 400 + 900 * random.nextDouble();
        double height = 150 + 300 * random.nextDouble();
        Picture picture = SectionPicture.of(section, width, height);
        Box page = new Box(0, 0, width + 0.01, height + 0.01);
        assertThat(Scene.texts(picture)).extracting(Lettering::box).allMatch(page::holds);
    }

    @Test
    void whereNoLayerLiesThereIsNoSection() {
        GriddedValues none = GriddedValues.constant(Double.NaN);
        Aquifer full = Scene.aquifer();
        Aquifer empty = new Aquifer(
                full.name(),
                full.grid(),
                List.of(new Layer("gone", Optional.of(none), none, true)),
                full.times(),
                full.flow(),
                Optional.empty(),
                full.storage(),
                List.of(),
                full.lengthUnit(),
                full.timeUnit());
        SectionLine line = SectionLine.through(BOX, Scene.GRID);
        Prism one = new Prism("a", BOX.rings(), new VerticalRange.Layers(0, 0));
        assertThat(SectionPicture.of(empty, one, line, Scene.budget(Map.of()), RATE, 720))
                .isEmpty();
    }
}
