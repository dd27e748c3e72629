package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.statistics.Trend;

class CourseTest {

    /** A Gaussian whose longer axis is turned by 30° has that axis, its deviations and its centre, on any grid. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 20, 75})
    void findsCentreAndPrincipalAxes(double rotation) {
        Grid grid = new Grid(Axis.even(1000, 1, 60), Axis.even(2000, 1, 60), rotation, 1);
        double cx = grid.mapX(30.3, 29.1);
        double cy = grid.mapY(30.3, 29.1);
        double turn = Math.toRadians(30);
        FormulaValues values = FormulaValues.steady(grid, (x, y) -> {
            double along = (x - cx) * Math.cos(turn) + (y - cy) * Math.sin(turn);
            double across = (y - cy) * Math.cos(turn) - (x - cx) * Math.sin(turn);
            return Math.exp(-along * along / (2 * 25) - across * across / (2 * 4));
        });
        Aquifer aquifer = SmallPlumes.uniform(grid, 1, new double[] {0, 0, 0}, 0, 1);
        double[] corners = new double[8];
        double[][] local = {{0, 0}, {60, 0}, {60, 60}, {0, 60}};
        for (int i = 0; i < 4; i++) {
            corners[2 * i] = grid.mapX(local[i][0], local[i][1]);
            corners[2 * i + 1] = grid.mapY(local[i][0], local[i][1]);
        }
        Prism all = Prisms.of("all", 0, 0, corners);
        Plume plume = SoluteDraft.balance(
                        aquifer,
                        false,
                        List.of(all),
                        SoluteDraft.of("a", values).done())
                .get(0);
        Course.Place place = new Course(plume, aquifer.times(), grid).at(0);
        assertThat(place.x()).isCloseTo(cx, within(1e-4));
        assertThat(place.y()).isCloseTo(cy, within(1e-4));
        assertThat(place.elevation()).isCloseTo(5, within(1e-9));
        assertThat(place.along()).isCloseTo(5, within(1e-3));
        assertThat(place.across()).isCloseTo(2, within(1e-3));
        assertThat(place.upright()).isCloseTo(0, within(1e-6));
        assertThat(place.direction()).isCloseTo(30, within(1e-3));
        assertThat(place.mass()).isCloseTo(2 * Math.PI * 5 * 2 * 10 * 0.25, within(1e-3));
    }

    /** One cell of 100 m³ of water, 0.1 m/d × 100 m² flowing out: mass and outflow fall as C does. */
    @Test
    void followsMassAndOutflow() {
        double[] fall = {8, 7, 7.5, 6, 6.2, 5, 5.1};
        double[][][] values = new double[7][1][1];
        for (int instant = 0; instant < 7; instant++) {
            values[instant][0][0] = fall[instant];
        }
        Aquifer aquifer = SmallPlumes.uniform(1, 1, 1, 10, new double[] {0.1, 0, 0}, 0, 1, 2, 3, 4, 5, 6);
        Plume plume = SoluteDraft.balance(
                        aquifer,
                        false,
                        List.of(SmallPlumes.box("cell", 0, 0, 0, 0, 10, 10)),
                        SoluteDraft.of("a", new ArrayValues(1, values)).done())
                .get(0);
        Course course = new Course(plume, aquifer.times(), aquifer.grid());
        assertThat(course.outflow(0)).isCloseTo(0.1 * 100 * 7.5, within(1e-12));
        Trend mass = course.ofMass();
        assertThat(mass.kind()).isEqualTo(Trend.Kind.INDEPENDENT);
        assertThat(mass.test().orElseThrow().s()).isEqualTo(-15);
        assertThat(mass.slope().slope()).isNegative();
        assertThat(course.ofOutflow()).isPresent();
        Plume still = SoluteDraft.balance(
                        SmallPlumes.uniform(1, 1, 1, 10, new double[] {0, 0, 0}, 0, 1),
                        false,
                        List.of(SmallPlumes.box("cell", 0, 0, 0, 0, 10, 10)),
                        SoluteDraft.of("a", GriddedValues.constant(0)).done())
                .get(0);
        Course none = new Course(still, aquifer.times(), aquifer.grid());
        assertThat(none.at(0).x()).isNaN();
        assertThat(none.at(0).along()).isNaN();
    }
}
