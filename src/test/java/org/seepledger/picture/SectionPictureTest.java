package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

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

class SectionPictureTest {

    private static final UnitShown RATE = new UnitShown("m3/d", 1, true);
    private static final Prism BOX = Prisms.of("a", 0, 1, Shapes.box(1060, 2050, 1240, 2150));

    private static double inside(Profile profile) {
        return profile.stretches().stream()
                .filter(Profile.Stretch::isInPrism)
                .mapToDouble(stretch -> stretch.to() - stretch.from())
                .sum();
    }

    @Test
    void theLineFollowsTheLongerSideAndStaysOnTheGrid() {
        SectionLine line = SectionLine.through(BOX, Scene.GRID);
        assertThat(line.fromX()).isCloseTo(1060 - 0.12 * 180, within(1e-9));
        assertThat(line.toX()).isCloseTo(1240 + 0.12 * 180, within(1e-9));
        assertThat(line.fromY()).isCloseTo(line.toY(), within(1e-9)).isBetween(2050.0, 2150.0);
        SectionLine whole = SectionLine.through(Prisms.of("b", 0, 0, Shapes.box(1000, 2000, 1300, 2200)), Scene.GRID);
        assertThat(whole.fromX()).isCloseTo(1000, within(1e-9));
        assertThat(whole.toX()).isCloseTo(1300, within(1e-9));
    }

    @Property(tries = 50)
    void itLeadsFromWestToEastThroughThePrismHoweverThatIsTurned(@ForAll long seed) {
        double degrees = new Random(seed).nextDouble() * 360;
        double[] turned = Shapes.turned(Shapes.box(1100, 2080, 1200, 2120), degrees, 1150, 2100);
        SectionLine line = SectionLine.through(Prisms.of("a", 0, 0, turned), Scene.GRID);
        assertThat(line.toX()).isGreaterThanOrEqualTo(line.fromX() - 1e-6);
        assertThat(line.length()).isCloseTo(124, within(1e-6));
        double share = inside(Profile.along(line, Scene.aquifer(), Prisms.of("a", 0, 0, turned)));
        assertThat(share * line.length()).isCloseTo(100, within(1e-6));
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
        SectionLine line = new SectionLine(1000, 2100, 1300, 2100);
        assertThat(inside(Profile.along(line, Scene.aquifer(), holed))).isCloseTo(150.0 / 300, within(1e-12));
    }

    @Test
    void theBodyReachesFromLidToLid() {
        Aquifer aquifer = Scene.aquifer();
        SectionLine line = SectionLine.through(BOX, Scene.GRID);
        List<Ring> rings = BOX.rings();
        Prism lower = new Prism("b", rings, new VerticalRange.Layers(1, 1));
        Prism between = new Prism(
                "c",
                rings,
                new VerticalRange.Elevations(
                        Optional.of(GriddedValues.constant(93)), Optional.of(GriddedValues.constant(60))));
        assertThat(Profile.along(line, aquifer, lower).stretches())
                .filteredOn(Profile.Stretch::isInPrism)
                .allMatch(stretch -> stretch.top() == 90 && stretch.bottom() == 70);
        assertThat(Profile.along(line, aquifer, between).stretches())
                .filteredOn(Profile.Stretch::isInPrism)
                .allMatch(stretch -> stretch.top() == 93 && stretch.bottom() == 70);
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
                        new SectionLine(1020, 2100, 1280, 2100),
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
