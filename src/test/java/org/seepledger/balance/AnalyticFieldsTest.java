package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FormulaValues;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;

/** Fields given by formulas at cell centres: errors fall with the square of the cell size. */
class AnalyticFieldsTest {

    private static final double A = 0.02;
    private static final double B = -0.05;
    private static final double C = 0.01;
    private static final OuterFaces OPEN = new OuterFaces(true, true, true);

    /**
     * q = (a x², b y², c x z) in a box with sides on grid lines and off them. A quadratic cancels in the net, so each face is
     * held against its own integral (first principles).
     */
    @Test
    void quadraticFluxThroughEachFaceOfABox() {
        double[][] errors = new double[6][3];
        for (int level = 0; level < 3; level++) {
            double[] found = quadratic(15 << level, 6 << level);
            for (int face = 0; face < 6; face++) {
                errors[face][level] = found[face];
            }
        }
        String[] faces = {"south", "east", "north", "west", "top", "bottom"};
        for (int face = 0; face < 6; face++) {
            assertThat(Refinement.order("quadratic flux, " + faces[face], errors[face]))
                    .isBetween(1.8, 2.2);
        }
    }

    private static double[] quadratic(int cells, int layers) {
        double west = 22 / 3.0;
        double south = 4;
        double east = 22;
        double north = 62 / 3.0;
        double high = 12;
        double low = 4;
        Grid grid = new Grid(Axis.even(0, 30.0 / cells, cells), Axis.even(0, 30.0 / cells, cells), 0, 1);
        double[] elevations = new double[layers + 1];
        for (int i = 0; i <= layers; i++) {
            elevations[i] = 24 - 24.0 * i / layers;
        }
        FormulaValues z = new FormulaValues(
                grid, 1, (step, layer, x, y) -> C * x * 0.5 * (elevations[layer] + elevations[layer + 1]));
        Aquifer aquifer = AquiferDraft.on(grid)
                .layers(elevations)
                .flow(new DarcyFlux(
                        FormulaValues.steady(grid, (x, y) -> A * x * x),
                        FormulaValues.steady(grid, (x, y) -> B * y * y),
                        Optional.of(z),
                        false,
                        OPEN))
                .done();
        int first = layers / 2;
        int last = layers * 5 / 6 - 1;
        Prism box = Prisms.of("box", first, last, Shapes.box(west, south, east, north));
        BudgetReading budget = BudgetReading.of(aquifer, box);
        double xArea = (north - south) * (high - low);
        double yArea = (east - west) * (high - low);
        double moment = 0.5 * (east * east - west * west) * (north - south);
        return new double[] {
            budget.net("side 1") - B * south * south * yArea,
            budget.net("side 2") + A * east * east * xArea,
            budget.net("side 3") + B * north * north * yArea,
            budget.net("side 4") - A * west * west * xArea,
            budget.net("top") + C * high * moment,
            budget.net("bottom") - C * low * moment
        };
    }

    /**
     * Steady flow in a rectangular section under a water table that is half a wave: after Tóth (1963, J. Geophys. Res. 68,
     * 4795–4812), with a single harmonic. h = a cos(πx/L) cosh(πz/L) / cosh(πD/L) is harmonic, with no flow through
     * the ends and the base; the recharge half takes in K a tanh(πD/L) for each unit of width, which passes through the
     * midsection and leaves through the other half.
     */
    @Test
    void basinScaleFlowPassesFromTheRechargeHalfToTheDischargeHalf() {
        double[] through = new double[3];
        for (int level = 0; level < 3; level++) {
            int cells = 20 << level;
            double length = 800;
            double depth = 300;
            double conductivity = 0.6;
            double amplitude = 5;
            double width = 40;
            Grid grid = new Grid(Axis.even(0, length / cells, cells), Axis.even(0, width, 1), 0, 1);
            Aquifer basin = basin(grid, cells / 2, length, depth, conductivity * amplitude);
            Prism recharge = Prisms.of("recharge", 0, cells / 2 - 1, Shapes.box(0, 0, length / 2, width));
            Prism whole = Prisms.of("whole", 0, cells / 2 - 1, Shapes.box(0, 0, length, width));
            BudgetReading half = BudgetReading.of(basin, recharge);
            BudgetReading all = BudgetReading.of(basin, whole);
            double exact = conductivity * amplitude * Math.tanh(Math.PI * depth / length) * width;
            assertThat(all.in("top")).isEqualTo(all.out("top"), within(1e-9 * exact));
            assertThat(all.totals().residual()).isEqualTo(0, within(1e-9 * exact));
            assertThat(half.in("top")).isEqualTo(exact, within(0.01 * exact));
            assertThat(half.out("top")).isZero();
            assertThat(half.net("bottom")).isEqualTo(0, within(1e-12 * exact));
            through[level] = half.out("side 2") - exact;
        }
        assertThat(Refinement.order("basin-scale flow through the midsection", through))
                .isBetween(1.8, 2.2);
    }

    private static Aquifer basin(Grid grid, int layers, double length, double depth, double flow) {
        double wave = Math.PI / length;
        double scale = flow * wave / Math.cosh(wave * depth);
        double step = depth / layers;
        double[] elevations = new double[layers + 1];
        for (int i = 0; i <= layers; i++) {
            elevations[i] = depth - i * step;
        }
        FormulaValues x = new FormulaValues(
                grid,
                1,
                (time, layer, east, north) ->
                        scale * Math.sin(wave * east) * Math.cosh(wave * (depth - (layer + 0.5) * step)));
        FormulaValues z = new FormulaValues(
                grid,
                1,
                (time, layer, east, north) ->
                        -scale * Math.cos(wave * east) * Math.sinh(wave * (depth - (layer + 0.5) * step)));
        return AquiferDraft.on(grid)
                .layers(elevations)
                .flow(new DarcyFlux(
                        x,
                        FormulaValues.steady(grid, (east, north) -> 0),
                        Optional.of(z),
                        false,
                        new OuterFaces(false, true, false)))
                .done();
    }
}
