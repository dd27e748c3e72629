package org.seepledger.prism;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;

class SideNumberingTest {

    private static final Coordinate[] COUNTER_CLOCKWISE = ring(0, 0, 4, 0, 4, 3, 0, 3, 0, 0);
    private static final Coordinate[] CLOCKWISE = ring(0, 0, 0, 3, 4, 3, 4, 0, 0, 0);

    private static Coordinate[] ring(double... xy) {
        Coordinate[] vertices = new Coordinate[xy.length / 2];
        for (int i = 0; i < vertices.length; i++) {
            vertices[i] = new Coordinate(xy[2 * i], xy[2 * i + 1]);
        }
        return vertices;
    }

    private static String shown(Ring ring) {
        StringBuilder text = new StringBuilder();
        ring.sides()
                .forEach(side -> text.append(side.name())
                        .append(" (")
                        .append((int) side.x())
                        .append(' ')
                        .append((int) side.y())
                        .append(") "));
        return text.toString().strip();
    }

    @Test
    void anOuterRingRunsCounterClockwiseFromItsFirstVertex() {
        SideNumbering plain = new SideNumbering(false);
        String expected = "side 1 (0 0) side 2 (4 0) side 3 (4 3) side 4 (0 3)";
        assertThat(shown(plain.number(1, 0, COUNTER_CLOCKWISE))).isEqualTo(expected);
        assertThat(shown(plain.number(1, 0, CLOCKWISE))).isEqualTo(expected);
    }

    @Test
    void anIslandRunsClockwiseFromItsFirstVertex() {
        SideNumbering plain = new SideNumbering(false);
        String expected = "island 2 side 1 (0 0) island 2 side 2 (0 3) island 2 side 3 (4 3) island 2 side 4 (4 0)";
        assertThat(shown(plain.number(1, 2, CLOCKWISE))).isEqualTo(expected);
        assertThat(shown(plain.number(1, 2, COUNTER_CLOCKWISE))).isEqualTo(expected);
    }

    @Test
    void partsArePrefixedEvenIfThereIsJustOne() {
        SideNumbering parts = new SideNumbering(true);
        assertThat(parts.number(1, 0, CLOCKWISE).sides().get(0).name()).isEqualTo("part 1 side 1");
        assertThat(parts.number(2, 1, CLOCKWISE).sides().get(2).item()).isEqualTo("part 2 island 1 side 3");
    }
}
