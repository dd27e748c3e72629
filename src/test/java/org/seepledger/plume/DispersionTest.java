package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.ledger.Group;

/** In uniform flow, with concentration linear in x, y and z, dispersion through each face is known: −D·∇C × area. */
class DispersionTest {

    private static final double[] SLOPE = {3e-4, -2e-4, 5e-4};
    private static final double DIFFUSION = 0.02;

    private MassReading reading(double[] q, double transverse, double vertical) {
        double[] edges = {0, 1, 2.5, 4, 5, 7, 8};
        Grid grid = new Grid(Axis.of(edges), Axis.even(0, 2, 5), 0, 1);
        Aquifer aquifer = SmallPlumes.uniform(grid, 5, q, 0, 1);
        FormulaValues linear = new FormulaValues(
                grid, 1, (step, layer, x, y) -> 0.1 + SLOPE[0] * x + SLOPE[1] * y + SLOPE[2] * (9 - 2 * layer));
        return MassReading.of(
                SoluteDraft.balance(
                                aquifer,
                                true,
                                List.of(SmallPlumes.box("a", 1, 3, 2.5, 2, 7, 8)),
                                SoluteDraft.of("salt", linear)
                                        .dispersion(6, transverse, vertical, DIFFUSION)
                                        .done())
                        .get(0),
                aquifer.times());
    }

    private static void compare(MassReading reading, double[] flux) {
        assertThat(reading.net(Group.DISPERSION, "side 2")).isCloseTo(-flux[0] * 36, within(1e-15));
        assertThat(reading.net(Group.DISPERSION, "side 4")).isCloseTo(flux[0] * 36, within(1e-15));
        assertThat(reading.net(Group.DISPERSION, "side 3")).isCloseTo(-flux[1] * 27, within(1e-15));
        assertThat(reading.net(Group.DISPERSION, "side 1")).isCloseTo(flux[1] * 27, within(1e-15));
        assertThat(reading.net(Group.DISPERSION, "top")).isCloseTo(-flux[2] * 27, within(1e-15));
        assertThat(reading.net(Group.DISPERSION, "bottom")).isCloseTo(flux[2] * 27, within(1e-15));
    }

    /**
     * With one transverse dispersivity, θD = αT |q| I + (αL − αT) q qᵀ ÷ |q| + θDm I (Scheidegger 1961, Journal of
     * Geophysical Research 66, 3273–3278).
     */
    @ParameterizedTest
    @CsvSource({"0.1, 0, 0", "0, -0.2, 0", "0, 0, 0.05", "0.1, 0.2, -0.05", "-0.3, 0.1, 0.2", "0, 0, 0"})
    void isTheTensorTimesTheSlope(double x, double y, double z) {
        double[] q = {x, y, z};
        double size = Math.sqrt(x * x + y * y + z * z);
        double along = q[0] * SLOPE[0] + q[1] * SLOPE[1] + q[2] * SLOPE[2];
        double[] flux = new double[3];
        for (int i = 0; i < 3; i++) {
            double mechanical = size == 0 ? 0 : (6 - 0.7) * q[i] * along / size;
            flux[i] = -(0.7 * size + 0.25 * DIFFUSION) * SLOPE[i] - mechanical;
        }
        compare(reading(q, 0.7, 0.7), flux);
    }

    /** In level flow along x the three dispersivities act on one gradient each. */
    @ParameterizedTest
    @CsvSource({"0.1", "-0.4"})
    void tellsTransverseFromVertical(double x) {
        double[] flux = {
            -(6 * Math.abs(x) + 0.25 * DIFFUSION) * SLOPE[0],
            -(0.9 * Math.abs(x) + 0.25 * DIFFUSION) * SLOPE[1],
            -(0.04 * Math.abs(x) + 0.25 * DIFFUSION) * SLOPE[2]
        };
        compare(reading(new double[] {x, 0, 0}, 0.9, 0.04), flux);
    }
}
