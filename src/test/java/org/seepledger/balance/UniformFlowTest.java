package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Shapes;

/**
 * Uniform flow. What flows out through a plane side is q · A, with A the outward area vector: for a side of length (dx,
 * dy) run counter-clockwise, (dy, −dx) times the thickness (first principles).
 */
class UniformFlowTest {

    private static final double EAST = 0.37;
    private static final double NORTH = -0.21;
    private static final double THICKNESS = 10;

    private static Aquifer aquifer(Grid grid, double east, double north) {
        return AquiferDraft.on(grid)
                .flow(new DarcyFlux(
                        GriddedValues.constant(east),
                        GriddedValues.constant(north),
                        Optional.empty(),
                        true,
                        new OuterFaces(true, false, false)))
                .done();
    }

    private static void assertSides(BudgetReading budget, String prefix, double[] outline, double east, double north) {
        for (int i = 0; i < outline.length / 2; i++) {
            int next = (i + 1) % (outline.length / 2);
            double dx = outline[2 * next] - outline[2 * i];
            double dy = outline[2 * next + 1] - outline[2 * i + 1];
            double out = THICKNESS * (east * dy - north * dx);
            String item = prefix + "side " + (i + 1);
            assertThat(budget.net(item)).isEqualTo(-out, within(1e-11));
            assertThat(budget.in(item)).isEqualTo(Math.max(0, -out), within(1e-11));
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 90, 25, -118.4})
    void eachSideOfATurnedRectangleAndOfItsIslandTakesFluxTimesAreaVector(double rotation) {
        Grid grid = new Grid(Axis.even(1000, 1.7, 60), Axis.of(2000, 2020, 2033, 2041, 2050, 2100), rotation, 1);
        double x = grid.mapX(50, 45);
        double y = grid.mapY(50, 45);
        double[] rectangle = Shapes.turned(Shapes.box(x - 24, y - 15, x + 24, y + 15), 33, x, y);
        double[] island = Shapes.reversed(Shapes.turned(Shapes.box(x - 5, y - 5, x + 5, y + 5), 70, x, y));
        List<Ring> rings = List.of(Prisms.ring(1, 0, rectangle), Prisms.ring(1, 1, island));
        BudgetReading budget = BudgetReading.of(aquifer(grid, EAST, NORTH), Prisms.of("a", 0, 0, rings));
        assertSides(budget, "", rectangle, EAST, NORTH);
        assertSides(budget, "island 1 ", island, EAST, NORTH);
        assertThat(budget.totals().residual()).isEqualTo(0, within(1e-11));
        assertThat(budget.totals().inflow()).isGreaterThan(50);
    }

    /** q = −K ∇h with the principal axes of K at 40 degrees to the map and a grid turned against both. */
    @Test
    void anisotropyTurnedAgainstTheGridGivesTheTensorsOwnFlow() {
        double along = 12;
        double across = 3;
        double angle = Math.toRadians(40);
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        double xx = along * c * c + across * s * s;
        double yy = along * s * s + across * c * c;
        double xy = (along - across) * s * c;
        double gradientX = 0.01;
        double gradientY = -0.004;
        double east = -(xx * gradientX + xy * gradientY);
        double north = -(xy * gradientX + yy * gradientY);
        Grid grid = new Grid(Axis.even(0, 5, 20), Axis.even(0, 4, 25), 25, 1);
        double x = grid.mapX(50, 50);
        double y = grid.mapY(50, 50);
        double[] box = Shapes.turned(Shapes.box(x - 20, y - 10, x + 20, y + 10), 40, x, y);
        BudgetReading budget = BudgetReading.of(aquifer(grid, east, north), Prisms.of("a", 0, 0, box));
        assertSides(budget, "", box, east, north);
        // Sides along the principal axes: Darcy's law in one dimension, with the gradient's share along each axis.
        double gradientAlong = gradientX * c + gradientY * s;
        double gradientAcross = -gradientX * s + gradientY * c;
        assertThat(budget.net("side 4")).isEqualTo(-along * gradientAlong * 20 * THICKNESS, within(1e-11));
        assertThat(budget.net("side 1")).isEqualTo(-across * gradientAcross * 40 * THICKNESS, within(1e-11));
    }

    @Test
    void componentsOfAnUnturnedMapAreNotTurnedUnlessAsked() {
        Grid grid = new Grid(Axis.even(0, 1, 8), Axis.even(0, 1, 8), 90, 1);
        Aquifer aquifer = AquiferDraft.on(grid)
                .flow(new DarcyFlux(
                        GriddedValues.constant(1),
                        GriddedValues.constant(0),
                        Optional.empty(),
                        false,
                        new OuterFaces(true, false, false)))
                .done();
        // The grid's x points north.
        Prism prism = Prisms.of("a", 0, 0, Shapes.box(-6, 2, -2, 5));
        BudgetReading budget = BudgetReading.of(aquifer, prism);
        assertThat(budget.in("side 1")).isEqualTo(40, within(1e-12));
        assertThat(budget.out("side 3")).isEqualTo(40, within(1e-12));
        assertThat(budget.in("side 4")).isEqualTo(0, within(1e-12));
    }
}
