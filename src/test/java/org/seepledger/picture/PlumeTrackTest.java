package org.seepledger.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

/** The track of a centre of mass. */
class PlumeTrackTest {

    private static final MapFrame FRAME = new MapFrame(new Box(0, 0, 400, 300), 1000, 2300, 1);

    private static PlumeTrack.Stop stop(double x, double y, String name) {
        return new PlumeTrack.Stop(x, y, 40, 10, 90, name);
    }

    private static List<Mark> marks(PlumeTrack.Stop... stops) {
        return new PlumeTrack(List.of(stops)).marks(FRAME, new Labels(FRAME.box()));
    }

    @Test
    void itLeadsFromTheFirstToTheLastInstantThatHasMass() {
        List<Mark> marks = marks(
                stop(Double.NaN, Double.NaN, "2020"),
                stop(1100, 2100, "2021"),
                stop(1150, 2120, ""),
                stop(1200, 2130, "2023"));
        assertThat(Drawn.of(Mark.Line.class, marks).get(1).xy()).containsExactly(100, 200, 150, 180, 200, 170);
        assertThat(Drawn.texts(marks)).extracting(Mark.Text::words).containsExactly("2023", "2021");
    }

    @Test
    void theSpreadIsAnEllipseAlongThePrincipalAxes() {
        Box spread =
                Drawn.box(Drawn.of(Mark.Area.class, marks(stop(1200, 2150, ""))).get(0));
        assertThat(spread.height()).isCloseTo(80, within(1e-9));
        assertThat(spread.width()).isCloseTo(20, within(1e-9));
        assertThat(spread.x()).isCloseTo(190, within(1e-9));
    }

    @Test
    void oneInstantIsADotAndNoneIsNothing() {
        assertThat(Drawn.of(Mark.Line.class, marks(stop(1200, 2150, "2021")))).isEmpty();
        assertThat(marks(stop(Double.NaN, Double.NaN, "2020"))).isEmpty();
    }
}
