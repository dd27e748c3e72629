package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

/** Legends, scale bar and north arrow. */
class MapFurnitureTest {

    private static Picture page(List<Mark> marks) {
        return new Picture(220, 220, "", "", marks);
    }

    @Property(tries = 100)
    void aScaleBarIsRoundAndAsLongAsItCanBe(@ForAll @DoubleRange(min = -4, max = 3) double power) {
        double scale = Math.pow(10, power);
        ScaleBar bar = ScaleBar.within(scale, "m", 120);
        double metres = bar.distance() * (bar.unit().equals("km") ? 1000 : 1);
        assertThat(bar.length()).isLessThanOrEqualTo(120 * (1 + 1e-9)).isGreaterThan(120 / 2.6);
        assertThat(metres * scale).isCloseTo(bar.length(), within(1e-9 * bar.length()));
        double digit = metres / Math.pow(10, Math.floor(Math.log10(metres * (1 + 1e-9))));
        assertThat(digit)
                .satisfiesAnyOf(
                        one -> assertThat(one).isCloseTo(1, within(1e-9)),
                        two -> assertThat(two).isCloseTo(2, within(1e-9)),
                        five -> assertThat(five).isCloseTo(5, within(1e-9)));
        Drawn.isLegible(page(bar.marks(10, 10)));
    }

    @Test
    void kilometresAreForMetresAlone() {
        assertThat(ScaleBar.within(0.05, "m", 110).label()).isEqualTo("2\u202fkm");
        assertThat(ScaleBar.within(0.05, "ft", 110).label()).isEqualTo("2\u202f000\u202fft");
        assertThat(ScaleBar.within(0.5, "m", 110).label()).isEqualTo("200\u202fm");
    }

    @Property(tries = 100)
    void legendsHaveTicksInPlace(@ForAll @DoubleRange(min = -1e5, max = 1e5) double from, @ForAll boolean fine) {
        ValueScale scale = new ValueScale(Ramp.DEPTH, from, from + (fine ? 0.37 : 4321));
        Picture level = page(RampLegend.level(scale, 1, "head, m", new Box(10, 10, 200, RampLegend.LEVEL_HEIGHT)));
        Drawn.isLegible(level);
        assertThat(Drawn.texts(level.marks())).hasSizeGreaterThan(2);
    }

    @Test
    void aTickStandsWhereItsColourIs() {
        ValueScale scale = new ValueScale(Ramp.DEPTH, 0, 10);
        List<Mark> marks = RampLegend.level(scale, 1, "x", new Box(10, 0, 200, 46));
        assertThat(Drawn.of(Mark.Line.class, marks).stream().map(line -> line.xy()[0]))
                .containsExactly(10.0, 50.0, 90.0, 130.0, 170.0, 210.0);
        int[] strip = Drawn.of(Mark.Image.class, marks).get(0).argb();
        assertThat(strip[0]).isEqualTo(0xff000000 | Ramp.DEPTH.rgb(0));
        assertThat(strip[strip.length - 1]).isEqualTo(0xff000000 | Ramp.DEPTH.rgb(1));
    }

    @Test
    void theNorthArrowPointsUp() {
        List<Mark> marks = NorthArrow.marks(20, 20);
        Drawn.isLegible(page(marks));
        Box kite = Drawn.box(Drawn.of(Mark.Area.class, marks).get(0));
        double letter = Drawn.texts(marks).get(0).y();
        assertThat(kite.y()).isLessThan(letter);
        assertThat(kite.width()).isLessThan(kite.height());
    }
}
