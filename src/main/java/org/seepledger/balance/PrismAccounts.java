package org.seepledger.balance;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Coverage;
import org.seepledger.prism.Pieces;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.VerticalRange;
import org.seepledger.prism.WellCut;

/** Books the flows of one prism, band by band. */
final class PrismAccounts {

    private final PrismCut cut;
    private final Chart chart;
    private final WellRule rule;
    private final Map<PlacedWell, WellCut> wells = new LinkedHashMap<>();

    PrismAccounts(Aquifer aquifer, PrismCut cut, List<PlacedWell> wells, WellRule rule) {
        this.cut = cut;
        this.chart = new Chart(aquifer, cut);
        this.rule = rule;
        wells.forEach(well -> this.wells.put(well, cut.meet(well)));
    }

    PrismCut cut() {
        return cut;
    }

    Chart chart() {
        return chart;
    }

    Map<PlacedWell, WellCut> wells() {
        return wells;
    }

    /** The elevations of the prism's lids over a window; empty where they are interfaces. */
    Optional<Elevations> elevations(Window window) {
        return cut.prism().range() instanceof VerticalRange.Elevations range
                ? Optional.of(new Elevations(range, window))
                : Optional.empty();
    }

    Tally emptyTally() {
        return new Tally(chart.accounts().size(), chart.layers());
    }

    /** How the prism's vertical range meets the cells of a band in one interval. */
    Slab slab(IntervalState state, Optional<Elevations> elevations) {
        return elevations
                .<Slab>map(between -> new ElevationSlab(between, state))
                .orElseGet(() -> new LayerSlab(chart, state));
    }

    /** Books what one band of rows holds of the prism in one interval. */
    void book(IntervalState state, Slab slab, Tally tally) {
        bookPieces(state, slab, tally);
        Window rows = state.geometry().inner();
        Coverage coverage = cut.coverage();
        int from = Math.max(rows.row(), coverage.window().row());
        int to = Math.min(rows.rowEnd(), coverage.window().rowEnd());
        for (int row = from; row < to; row++) {
            for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                double share = coverage.share(row, column);
                if (share != 0) {
                    bookLids(slab, row, column, share, tally);
                    if (slab.hasRisers()) {
                        bookRisers(state.flows(), slab, row, column, tally);
                    }
                    bookCells(state, slab, row, column, share, tally);
                }
            }
        }
        bookWells(state, slab, tally);
    }

    private void bookPieces(IntervalState state, Slab slab, Tally tally) {
        Pieces pieces = cut.pieces();
        Map<Integer, double[]> carried = carriedForWells(state.wells());
        int end = pieces.firstFrom(state.geometry().inner().rowEnd());
        for (int piece = pieces.firstFrom(state.geometry().inner().row()); piece < end; piece++) {
            int row = pieces.row(piece);
            int column = pieces.column(piece);
            double[] extra = carried.get(piece);
            for (int layer = chart.first(); layer <= chart.last(); layer++) {
                double part = slab.part(layer, row, column);
                double[] density = density(state.flows(), piece, layer, extra);
                int account = chart.side(cut.item(pieces.side(piece)), layer);
                tally.throughPiece(account, part * density[0], part * density[1]);
            }
        }
    }

    /** The outflow density at a piece's begin and end, if the whole height of its cell counts. */
    double[] density(FaceFlows flows, int piece, int layer, double[] carriedByLayer) {
        Pieces pieces = cut.pieces();
        Block block = flows.block();
        int row = pieces.row(piece);
        int column = pieces.column(piece);
        double west = flows.x()[block.xFace(layer, row, column)];
        double east = flows.x()[block.xFace(layer, row, column + 1)];
        double south = flows.y()[block.yFace(layer, row + 1, column)];
        double north = flows.y()[block.yFace(layer, row, column)];
        double carried = carriedByLayer == null ? 0 : carriedByLayer[layer - chart.first()];
        return new double[] {
            pieces.outflowAtStart(piece, west, east, south, north) + carried,
            pieces.outflowAtEnd(piece, west, east, south, north) + carried
        };
    }

    private void bookLids(Slab slab, int row, int column, double share, Tally tally) {
        if (!Double.isNaN(slab.top(row, column))) {
            tally.throughFace(chart.top(slab.topLayer(row, column)), share * slab.upwardAtTop(row, column));
            tally.throughFace(chart.bottom(slab.bottomLayer(row, column)), -share * slab.upwardAtBottom(row, column));
        }
    }

    private void bookRisers(FaceFlows flows, Slab slab, int row, int column, Tally tally) {
        Block block = flows.block();
        double toWest = cut.coverage().westFace(row, column);
        double toNorth = cut.coverage().northFace(row, column);
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            if (toWest != 0) {
                double flow = toWest * flows.x()[block.xFace(layer, row, column)];
                bookRiser(new Riser(layer, row, column - 1, row, column, flow), slab, tally);
            }
            if (toNorth != 0) {
                double flow = toNorth * flows.y()[block.yFace(layer, row, column)];
                bookRiser(new Riser(layer, row, column, row - 1, column, flow), slab, tally);
            }
        }
    }

    private void bookRiser(Riser riser, Slab slab, Tally tally) {
        double throughTop = riser.throughTop(slab);
        double throughBottom = riser.throughBottom(slab);
        if (throughTop != 0) {
            tally.throughFace(chart.top(riser.layer()), throughTop);
        }
        if (throughBottom != 0) {
            tally.throughFace(chart.bottom(riser.layer()), throughBottom);
        }
    }

    /** What pieces in wells' cells carry beside the cells' own fields, by piece and layer. */
    Map<Integer, double[]> carriedForWells(List<WellRate> rates) {
        Map<Integer, double[]> carried = new HashMap<>();
        if (rule == WellRule.SPREAD) {
            return carried;
        }
        for (WellRate rate : rates) {
            WellCut met = wells.get(rate.well());
            if (chart.holds(rate.layer())) {
                for (int i = 0; i < met.pieces().length; i++) {
                    carried.computeIfAbsent(met.pieces()[i], piece -> new double[chart.layers()])[
                                    rate.layer() - chart.first()] +=
                            met.carried()[i] * rate.rate();
                }
            }
        }
        return carried;
    }

    private void bookCells(IntervalState state, Slab slab, int row, int column, double share, Tally tally) {
        FaceFlows flows = state.flows();
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            int cell = flows.block().cell(layer, row, column);
            if (!flows.active()[cell]) {
                tally.inactive(
                        layer - chart.first(), share * state.geometry().grid().area(row, column));
                continue;
            }
            tally.fromVolume(share * slab.outflow(layer, row, column), flows.gross(layer, row, column));
            for (CellTerm term : state.terms()) {
                int account = term.storage() ? chart.storage(term.item(), layer) : chart.source(term.item(), layer);
                double counted = share * slab.counted(term.entry(), layer, row, column);
                tally.added(account, counted * term.rates()[cell]);
            }
        }
    }

    private void bookWells(IntervalState state, Slab slab, Tally tally) {
        for (WellRate rate : state.wells()) {
            WellCut met = wells.get(rate.well());
            if (!chart.holds(rate.layer())) {
                continue;
            }
            double counted = rule == WellRule.SPREAD ? met.share() : met.inside() ? 1 : 0;
            double part = slab.part(rate.layer(), rate.well().row(), rate.well().column());
            tally.added(chart.source(rate.well().well().category(), rate.layer()), counted * part * rate.rate());
            tally.fromVolume(
                    part * (counted - met.share()) * rate.rate(), met.pieces().length == 0 ? 0 : Math.abs(rate.rate()));
        }
    }
}
