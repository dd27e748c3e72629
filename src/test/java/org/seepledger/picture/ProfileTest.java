package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.ToDoubleBiFunction;
import java.util.stream.IntStream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.Window;
import org.seepledger.picture.Profile.Stretch;
import org.seepledger.progress.Progress;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;

class ProfileTest {

    static SectionLine line(double... xy) {
        return new SectionLine(IntStream.range(0, xy.length / 2)
                .mapToObj(i -> new Place(xy[2 * i], xy[2 * i + 1]))
                .toList());
    }

    static Profile profile(SectionLine line, Aquifer aquifer) {
        return Profile.along(line, aquifer, 0, 1, Optional.empty(), Progress.NONE);
    }

    /** The scene on another grid, with surfaces by row and column. */
    private static Aquifer on(Grid grid, ToDoubleBiFunction<Integer, Integer> top) {
        Aquifer scene = Scene.aquifer();
        GriddedValues surface = new GriddedValues() {
            @Override
            public void read(int layer, int step, Window window, double[] target, int offset) {
                for (int row = window.row(); row < window.rowEnd(); row++) {
                    for (int column = window.column(); column < window.columnEnd(); column++) {
                        target[offset + window.index(row, column)] = top.applyAsDouble(row, column);
                    }
                }
            }

            @Override
            public boolean changes() {
                return false;
            }

            @Override
            public boolean layered() {
                return false;
            }
        };
        List<Layer> layers = List.of(
                new Layer("sand", Optional.of(surface), GriddedValues.constant(90), true),
                scene.layers().get(1));
        return new Aquifer(
                scene.name(),
                grid,
                layers,
                scene.times(),
                scene.flow(),
                scene.head(),
                scene.storage(),
                scene.sources(),
                scene.lengthUnit(),
                scene.timeUnit());
    }

    private static Aquifer numbered() {
        return on(Scene.GRID, (row, column) -> 100 + row * 30 + column);
    }

    @Test
    void eachCellThatTheLineCrossesIsAStretch() {
        Profile profile = profile(line(1005, 2195, 1035, 2195), numbered());
        assertThat(profile.length()).isEqualTo(30);
        assertThat(profile.stretches()).extracting(Stretch::from).containsExactly(0.0, 5.0, 15.0, 25.0);
        assertThat(profile.stretches()).extracting(Stretch::to).containsExactly(5.0, 15.0, 25.0, 30.0);
        assertThat(profile.stretches())
                .extracting(stretch -> stretch.column().surfaces()[0])
                .containsExactly(100.0, 101.0, 102.0, 103.0);
        assertThat(profile.at(10).orElseThrow().column().column()).isEqualTo(1);
        assertThat(profile.at(31)).isEmpty();
    }

    @Property(tries = 60)
    void stretchesLieInTheCellOfTheirMiddleAndFollowOneAnother(@ForAll long seed) {
        Random random = new Random(seed);
        Grid grid = new Grid(Axis.even(1000, 10, 30), Axis.even(2000, 10, 20), 90 * random.nextDouble(), 2);
        double[] xy = new double[6];
        for (int i = 0; i < xy.length; i += 2) {
            double localX = 300 * random.nextDouble();
            double localY = 200 * random.nextDouble();
            xy[i] = grid.mapX(localX, localY);
            xy[i + 1] = grid.mapY(localX, localY);
        }
        Profile profile = profile(line(xy), on(grid, (row, column) -> 100 + row * 30 + column));
        double end = 0;
        for (Stretch stretch : profile.stretches()) {
            assertThat(stretch.from()).isCloseTo(end, within(1e-9));
            Place middle = profile.line().at((stretch.from() + stretch.to()) / 2 / 2);
            int column = grid.x().cellAt(grid.localX(middle.x(), middle.y()));
            int row = grid.flipped(grid.y().cellAt(grid.localY(middle.x(), middle.y())));
            assertThat(stretch.column().surfaces()[0]).isEqualTo(100 + row * 30 + column);
            end = stretch.to();
        }
        assertThat(end).isCloseTo(profile.length(), within(1e-9));
        assertThat(profile.length()).isCloseTo(2 * profile.line().length(), within(1e-9));
    }

    @Test
    void offTheGridNothingStands() {
        assertThat(profile(line(0, 0, 500, 500), Scene.aquifer()).stretches()).isEmpty();
        Profile partly = profile(line(900, 2100, 1400, 2100), Scene.aquifer());
        assertThat(partly.stretches()).hasSize(30);
        assertThat(partly.stretches().get(0).from()).isCloseTo(100, within(1e-9));
        assertThat(partly.length()).isEqualTo(500);
        assertThat(SectionFrame.fitting(profile(line(0, 0, 500, 500), Scene.aquifer()), new Box(0, 0, 100, 50))
                        .to())
                .isGreaterThan(0);
    }

    @Test
    void alongALineBetweenCellsItTakesOneSide() {
        Profile between = profile(line(1000, 2100, 1300, 2100), numbered());
        assertThat(between.stretches()).hasSize(30);
        assertThat(between.stretches()).allMatch(stretch -> stretch.column().row() == 9);
        Profile edge = profile(line(1300, 2000, 1300, 2200), numbered());
        assertThat(edge.stretches()).hasSize(20);
        assertThat(edge.stretches()).allMatch(stretch -> stretch.column().column() == 29);
    }

    @Test
    void aLineOfNoLengthIsRefused() {
        assertThatThrownBy(() -> line(1050, 2050)).isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> line(1050, 2050, 1050, 2050)).isInstanceOf(Refusal.class);
        assertThatThrownBy(() -> new SectionLine(List.of())).isInstanceOf(Refusal.class);
        assertThat(line(1050, 2050, 1050, 2050, 1060, 2050).places()).hasSize(2);
    }

    @Test
    void inactiveCellsLeaveAGap() {
        Aquifer aquifer = on(Scene.GRID, (row, column) -> column == 10 ? Double.NaN : 100);
        Profile profile = profile(line(1000, 2105, 1300, 2105), aquifer);
        assertThat(profile.stretches()).hasSize(30);
        Section section = section(profile, aquifer, List.of());
        assertThat(section.isThere()).isTrue();
        assertThat(Scene.flat(SectionPicture.of(section, 700, 300).marks())
                        .filter(Mark.Area.class::isInstance)
                        .flatMap(mark -> ((Mark.Area) mark).rings().stream()))
                .allMatch(ring -> IntStream.range(0, ring.length).allMatch(i -> Double.isFinite(ring[i])));
    }

    @Test
    void aGridOfOneCellHasASection() {
        Grid grid = new Grid(Axis.even(0, 100, 1), Axis.even(0, 100, 1), 0, 1);
        Aquifer aquifer = on(grid, (row, column) -> 100);
        Profile profile = profile(line(-50, 50, 150, 50), aquifer);
        assertThat(profile.stretches()).hasSize(1);
        assertThat(profile.stretches().get(0).from()).isEqualTo(50);
        Picture picture = SectionPicture.of(section(profile, aquifer, List.of()), 700, 300);
        assertThat(Scene.texts(picture)).extracting(Mark.Text::words).contains("A", "A′");
    }

    @Test
    void onlyCellsNearTheLineAreReadAndEachOnce() {
        Grid grid = new Grid(Axis.even(0, 10, 1000), Axis.even(0, 10, 1000), 0, 1);
        List<Window> read = new ArrayList<>();
        Profile.LayerValues values = (layer, window) -> {
            if (layer == 0) {
                read.add(window);
            }
            return new double[window.size()];
        };
        Profile profile = Profile.along(
                line(3, 0, 9993, 10_000), on(grid, (row, column) -> 100), 0, 1, Optional.of(values), Progress.NONE);
        assertThat(profile.stretches()).hasSizeBetween(1990, 2000);
        assertThat(read).allMatch(window -> window.size() <= 64);
        assertThat(read.stream().mapToInt(Window::size).sum()).isLessThan(20_000);
    }

    @Test
    void lineKnowsItsPlaces() {
        SectionLine line = line(0, 0, 30, 0, 30, 40);
        assertThat(line.length()).isEqualTo(70);
        assertThat(line.at(10)).isEqualTo(new Place(10, 0));
        assertThat(line.at(50)).isEqualTo(new Place(30, 20));
        assertThat(line.at(-5)).isEqualTo(new Place(0, 0));
        assertThat(line.at(99)).isEqualTo(new Place(30, 40));
        assertThat(line.nearest(new Place(12, 3))).isEqualTo(12);
        assertThat(line.nearest(new Place(28, 20))).isEqualTo(50);
        assertThat(line.nearest(new Place(31, 90))).isEqualTo(70);
        assertThat(line.turned().at(0)).isEqualTo(new Place(30, 40));
        assertThat(line.turned().turned()).isEqualTo(line);
    }

    static Section section(Profile profile, Aquifer aquifer, List<Body> bodies) {
        return new Section(
                profile,
                aquifer.layers(),
                "m",
                Optional.empty(),
                bodies,
                List.of(),
                10,
                Optional.empty(),
                Section.Light.NONE);
    }
}
