package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.TreeSet;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.Grid;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.Group;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;

/**
 * Gross flow through each side against quadrature (Commons Math 3.6.1, Gauss–Legendre on many panels) of the normal flow
 * of the field of Raviart and Thomas (1977), looked up place by place.
 */
class GrossFlowTest {

    private static final int PANELS = 64;
    private static final GaussIntegratorFactory GAUSS = new GaussIntegratorFactory();

    @Property(tries = 60)
    void agreesWithQuadratureAlongEachSide(@ForAll long seed) {
        RandomCase random = new RandomCase(seed);
        Aquifer aquifer = random.aquifer(0, 0, 0);
        Prism prism = random.prism("a");
        FaceFlows flows = aquifer.state(0, aquifer.geometry(random.grid.window()), List.of())
                .flows();
        BudgetReading budget = BudgetReading.of(aquifer, prism);
        for (Ring ring : prism.rings()) {
            for (int i = 0; i < ring.sides().size(); i++) {
                Line line = new Line(random.grid, ring.sides().get(i), ring.after(i));
                for (Entry entry : budget.entries(ring.sides().get(i).name())) {
                    double[] expected = line.inAndOut(flows, entry.account().layer());
                    // The integrand has a kink where the flow turns, which the panel that holds it smears out.
                    double tolerance =
                            1e-5 * line.magnitude(flows, entry.account().layer()) + 1e-12;
                    assertThat(entry.account().group()).isEqualTo(Group.SIDE);
                    assertThat(entry.inflow()).isEqualTo(expected[0], within(tolerance));
                    assertThat(entry.outflow()).isEqualTo(expected[1], within(tolerance));
                }
            }
        }
    }

    /** A side in local coordinates; the cell that it is in is looked up a hair on its inner side. */
    private record Line(Grid grid, double x0, double y0, double x1, double y1) {

        Line(Grid grid, Side from, Side to) {
            this(
                    grid,
                    grid.snappedX(from.x(), from.y()),
                    grid.snappedY(from.x(), from.y()),
                    grid.snappedX(to.x(), to.y()),
                    grid.snappedY(to.x(), to.y()));
        }

        double[] inAndOut(FaceFlows flows, int layer) {
            TreeSet<Double> stops = new TreeSet<>(List.of(0.0, 1.0));
            addCrossings(stops, grid.x(), x0, x1);
            addCrossings(stops, grid.y(), y0, y1);
            double[] inAndOut = new double[2];
            double begin = 0;
            for (double end : stops.tailSet(0.0, false)) {
                for (int panel = 0; panel < PANELS; panel++) {
                    double from = begin + (end - begin) * panel / PANELS;
                    double to = begin + (end - begin) * (panel + 1) / PANELS;
                    GaussIntegrator gauss = GAUSS.legendre(8, from, to);
                    inAndOut[0] += gauss.integrate(t -> Math.max(0, -outward(flows, layer, t)));
                    inAndOut[1] += gauss.integrate(t -> Math.max(0, outward(flows, layer, t)));
                }
                begin = end;
            }
            return inAndOut;
        }

        private static void addCrossings(TreeSet<Double> stops, Axis axis, double from, double to) {
            for (int i = 0; i <= axis.count(); i++) {
                double t = (axis.edge(i) - from) / (to - from);
                if (t > 0 && t < 1) {
                    stops.add(t);
                }
            }
        }

        /** Flow outward per unit of the side's parameter: the normal, times its length, is (dy, -dx). */
        private double outward(FaceFlows flows, int layer, double t) {
            double x = x0 + t * (x1 - x0);
            double y = y0 + t * (y1 - y0);
            double hair = 1e-9;
            double length = Math.hypot(x1 - x0, y1 - y0);
            int column = grid.x().cellAt(x - hair * (y1 - y0) / length);
            int fromSouth = grid.y().cellAt(y + hair * (x1 - x0) / length);
            int row = grid.flipped(fromSouth);
            double across = (x - grid.x().edge(column)) / grid.x().size(column);
            double up = (y - grid.y().edge(fromSouth)) / grid.y().size(fromSouth);
            double west = flows.x()[flows.block().xFace(layer, row, column)];
            double east = flows.x()[flows.block().xFace(layer, row, column + 1)];
            double south = flows.y()[flows.block().yFace(layer, row + 1, column)];
            double north = flows.y()[flows.block().yFace(layer, row, column)];
            double u = (west + across * (east - west)) / grid.height(row);
            double v = (south + up * (north - south)) / grid.width(column);
            return u * (y1 - y0) - v * (x1 - x0);
        }

        double magnitude(FaceFlows flows, int layer) {
            double[] inAndOut = inAndOut(flows, layer);
            return inAndOut[0] + inAndOut[1];
        }
    }
}
