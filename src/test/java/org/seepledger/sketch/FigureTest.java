package org.seepledger.sketch;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.seepledger.sketch.Drawn.outline;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.algorithm.Orientation;

class FigureTest {

    private static final Place WELL = new Place(500_000, 5_200_000);

    private static double area(Outline outline) {
        return Shape.of("a", outline).area();
    }

    @Test
    void rectanglesKeepTheirCorners() {
        Place corner = new Place(0.1, 0.2);
        assertThat(Figure.rectangle(corner, new Place(7.3, 9.1), 0)).isEqualTo(Drawn.box(0.1, 0.2, 7.3, 9.1));
        assertThat(Figure.rectangle(corner, new Place(7.3, 9.1), 270)).isEqualTo(Drawn.box(0.1, 0.2, 7.3, 9.1));
        assertThat(Figure.rectangle(corner, new Place(-7.3, 9.1), 0))
                .isEqualTo(outline(0.1, 0.2, 0.1, 9.1, -7.3, 9.1, -7.3, 0.2));
        assertThatThrownBy(() -> Figure.rectangle(corner, new Place(0.1, 9), 0))
                .hasMessage("A rectangle has a width and a height.");
    }

    @Test
    void turnedRectanglesRunAlongTheGrid() {
        double root = Math.sqrt(0.5);
        Outline turned = Figure.rectangle(new Place(0, 0), new Place(0, 4 * root), 45);
        assertThat(turned.place(2)).isEqualTo(new Place(0, 4 * root));
        assertThat(turned.place(1).distance(new Place(2 * root, 2 * root))).isLessThan(1e-15);
        assertThat(turned.place(3).distance(new Place(-2 * root, 2 * root))).isLessThan(1e-15);
        assertThat(Orientation.isCCW(turned.closed())).isTrue();
        assertThat(Orientation.isCCW(
                        Figure.rectangle(new Place(0, 0), new Place(0, -4), 30).closed()))
                .isTrue();
        assertThat(Orientation.isCCW(
                        Figure.rectangle(new Place(0, 0), new Place(-5, 1), 30).closed()))
                .isTrue();
    }

    /** The area of a regular polygon of n vertices at distance R is n R² sin(2π/n) / 2. */
    @Test
    void circlesKeepTheArea() {
        for (int vertices : new int[] {3, 4, 12, 64, 360}) {
            Outline circle = Figure.circle(WELL, 150, vertices);
            assertThat(circle.size()).isEqualTo(vertices);
            assertThat(area(circle)).isEqualTo(Math.PI * 150 * 150, within(1e-4));
            double reach = circle.place(0).distance(WELL);
            assertThat(vertices * reach * reach * Math.sin(2 * Math.PI / vertices) / 2)
                    .isEqualTo(Math.PI * 150 * 150, within(1e-4));
        }
    }

    @Test
    void refusesCirclesThatAreNone() {
        for (double radius : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> Figure.circle(WELL, radius, 12)).hasMessage("A radius is a number above 0.");
        }
        assertThatThrownBy(() -> Figure.circle(WELL, 1, 2)).isInstanceOf(Refusal.class);
    }

    @Test
    void buffersAWellAndARiver() {
        assertThat(Buffer.round(List.of(WELL, WELL), 50)).containsExactly(Part.of(Figure.circle(WELL, 50, 64)));
        List<Part> corridor = Buffer.round(List.of(WELL, WELL.moved(1000, 0)), 50);
        assertThat(corridor).hasSize(1);
        double exact = 1000 * 100 + Math.PI * 50 * 50;
        assertThat(PlanShape.of(corridor).getArea()).isBetween(exact * 0.998, exact);
        List<Place> loop = List.of(WELL, WELL.moved(1000, 0), WELL.moved(1000, 1000), WELL.moved(0, 1000), WELL);
        assertThat(Buffer.round(loop, 50).get(0).islands()).hasSize(1);
        assertThatThrownBy(() -> Buffer.round(loop, -1)).isInstanceOf(Refusal.class);
    }

    @Test
    void growsAndShrinksShapes() {
        Shape field = Shape.of("field", Drawn.box(0, 0, 100, 100));
        double exact = 120 * 120 - 400 + Math.PI * 100;
        assertThat(PlanShape.of(Buffer.of(field, 10)).getArea()).isBetween(exact - 1, exact);
        assertThat(PlanShape.of(Buffer.of(field, -10)).getArea()).isEqualTo(6400, within(1e-9));
        assertThatThrownBy(() -> Buffer.of(field, -60)).hasMessageContaining("Nothing would be left");
        assertThatThrownBy(() -> Buffer.of(field, 0)).isInstanceOf(Refusal.class);
    }
}
