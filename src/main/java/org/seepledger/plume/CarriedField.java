package org.seepledger.plume;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;

/**
 * What water carries of a solute through the faces of cells, as a field of its own: flow through a face is the water's times
 * the concentration upstream, and sources and storage carry what they carry. Walked as the water is, with mass flow
 * interpolated between a cell's faces, any prism closes as its cells do. The difference from what is booked, the cell's own
 * concentration all through it, is what sides and lids that cut cells leave unexplained.
 */
final class CarriedField {

    private static final int HALF = NonDetects.HALF.ordinal();

    private final IntervalState state;
    private final SoluteState solute;
    private final CellGeometry geometry;
    private final Block block;
    private final double[] concentrations;

    private CarriedField(IntervalState state, SoluteState solute) {
        this.state = state;
        this.solute = solute;
        this.geometry = state.geometry();
        this.block = geometry.block();
        this.concentrations = solute.mean().byChoice()[HALF];
    }

    /** The state of an interval with mass, kg/time, in place of water; non-detects count half their limit. */
    static IntervalState of(IntervalState state, SoluteState solute) {
        CarriedField field = new CarriedField(state, solute);
        return new IntervalState(state.geometry(), state.saturation(), field.flows(), field.terms(), field.wells());
    }

    private FaceFlows flows() {
        FaceFlows water = state.flows();
        double[] x = water.x().clone();
        double[] y = water.y().clone();
        double[] z = water.z().clone();
        Window window = block.window();
        for (int layer = 0; layer <= block.layers(); layer++) {
            for (int row = window.row(); row <= window.rowEnd(); row++) {
                for (int column = window.column(); column <= window.columnEnd(); column++) {
                    boolean inLayer = layer < block.layers();
                    if (inLayer && row < window.rowEnd()) {
                        carry(x, block.xFace(layer, row, column), at(layer, row, column - 1), at(layer, row, column));
                    }
                    if (inLayer && column < window.columnEnd()) {
                        carry(y, block.yFace(layer, row, column), at(layer, row, column), at(layer, row - 1, column));
                    }
                    if (window.contains(row, column)) {
                        int below = geometry.next(layer - 1, 1, row, column);
                        int above = geometry.next(layer, -1, row, column);
                        carry(z, block.zFace(layer, row, column), below, above);
                    }
                }
            }
        }
        return new FaceFlows(block, x, y, z, water.active(), Optional.empty());
    }

    /** Multiplies a flow by the concentration that it carries from one cell to the next; -1 stands for beyond the block. */
    private void carry(double[] flows, int face, int from, int to) {
        if (flows[face] != 0) {
            int upstream = flows[face] > 0 ? from : to;
            flows[face] *= upstream >= 0 ? concentrations[upstream] : entering(Math.max(from, to));
        }
    }

    /** What enters a cell through the grid's outer faces; nothing that counts through the rim of a block. */
    private double entering(int cell) {
        double given = solute.boundary().map(values -> values[cell]).orElse(Double.NaN);
        return Double.isNaN(given) ? concentrations[cell] : given;
    }

    private int at(int layer, int row, int column) {
        return block.window().contains(row, column) ? block.cell(layer, row, column) : -1;
    }

    private List<CellTerm> terms() {
        List<CellTerm> terms = new ArrayList<>();
        for (int giver = 0; giver < state.terms().size(); giver++) {
            CellTerm term = state.terms().get(giver);
            double[] masses = term.rates().clone();
            for (int cell = 0; cell < masses.length; cell++) {
                masses[cell] = carried(masses[cell], term.storage(), giver, cell);
            }
            terms.add(new CellTerm(term.storage(), term.item(), term.entry(), masses, 0, 0));
        }
        return terms;
    }

    private List<WellRate> wells() {
        List<WellRate> wells = new ArrayList<>();
        for (int i = 0; i < state.wells().size(); i++) {
            WellRate rate = state.wells().get(i);
            int cell = block.cell(rate.layer(), rate.well().row(), rate.well().column());
            double mass = carried(rate.rate(), false, state.terms().size() + i, cell);
            wells.add(new WellRate(rate.well(), rate.layer(), mass));
        }
        return wells;
    }

    private double carried(double rate, boolean storage, int giver, int cell) {
        if (rate == 0) {
            return 0;
        }
        double given = storage || rate < 0
                ? concentrations[cell]
                : solute.carried().get(giver).map(values -> values[cell]).orElse(0.0);
        return rate * (Double.isNaN(given) ? 0 : given);
    }
}
