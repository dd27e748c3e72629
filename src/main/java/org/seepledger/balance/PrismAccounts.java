package org.seepledger.balance;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
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
    void book(IntervalState state, Slab slab, Bookings bookings) {
        bookPieces(state, slab, bookings);
        int[] termAccounts = state.terms().stream()
                .mapToInt(term -> term.storage()
                        ? chart.storage(term.item(), chart.first())
                        : chart.source(term.item(), chart.first()))
                .toArray();
        Window rows = state.geometry().inner();
        Coverage coverage = cut.coverage();
        int from = Math.max(rows.row(), coverage.window().row());
        int to = Math.min(rows.rowEnd(), coverage.window().rowEnd());
        for (int row = from; row < to; row++) {
            for (int column = coverage.firstColumn(row); column < coverage.columnEnd(row); column++) {
                double share = coverage.share(row, column);
                if (share != 0) {
                    bookings.at(row, column);
                    bookLids(slab, row, column, share, bookings);
                    if (slab.hasRisers()) {
                        bookRisers(state.flows(), slab, row, column, bookings);
                    }
                    bookCells(state, slab, termAccounts, row, column, share, bookings);
                }
            }
        }
        bookWells(state, slab, bookings);
    }

    private void bookPieces(IntervalState state, Slab slab, Bookings bookings) {
        Pieces pieces = cut.pieces();
        Map<Integer, double[]> carried = carriedForWells(state.wells());
        int end = pieces.firstFrom(state.geometry().inner().rowEnd());
        for (int piece = pieces.firstFrom(state.geometry().inner().row()); piece < end; piece++) {
            int row = pieces.row(piece);
            int column = pieces.column(piece);
            double[] extra = carried.get(piece);
            bookings.at(row, column);
            for (int layer = chart.first(); layer <= chart.last(); layer++) {
                double part = slab.part(layer, row, column);
                bookings.between(
                        state.flows().block().cell(layer, row, column), beyond(piece, layer, state.geometry()));
                double[] density = density(state.flows(), piece, layer, extra);
                int account = chart.side(cut.item(pieces.side(piece)), layer);
                bookings.throughPiece(account, part * density[0], part * density[1]);
            }
        }
    }

    /** The cell that a piece on a cell's face has on its other side; the piece's own where it runs through the cell. */
    private int beyond(int piece, int layer, CellGeometry geometry) {
        int row = cut.pieces().rowBeyond(piece);
        int column = cut.pieces().columnBeyond(piece);
        boolean onGrid = row >= 0
                && column >= 0
                && row < geometry.grid().rows()
                && column < geometry.grid().columns();
        return onGrid ? geometry.block().cell(layer, row, column) : -1;
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

    private void bookLids(Slab slab, int row, int column, double share, Bookings bookings) {
        if (!Double.isNaN(slab.top(row, column))) {
            bookings.between(slab.cellBelowTop(row, column), slab.cellAboveTop(row, column));
            bookings.throughFace(chart.top(slab.topLayer(row, column)), share * slab.upwardAtTop(row, column));
        }
        if (!Double.isNaN(slab.bottom(row, column))) {
            bookings.between(slab.cellAboveBottom(row, column), slab.cellBelowBottom(row, column));
            bookings.throughFace(
                    chart.bottom(slab.bottomLayer(row, column)), -share * slab.upwardAtBottom(row, column));
        }
    }

    private void bookRisers(FaceFlows flows, Slab slab, int row, int column, Bookings bookings) {
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            Riser.around(flows, cut.coverage(), layer, row, column, riser -> {
                int upstream = riser.upstream(flows.block());
                bookings.between(upstream, upstream);
                bookRiser(riser, slab, bookings);
            });
        }
    }

    private void bookRiser(Riser riser, Slab slab, Bookings bookings) {
        bookings.throughFace(chart.top(riser.layer()), riser.throughTop(slab));
        bookings.throughFace(chart.bottom(riser.layer()), riser.throughBottom(slab));
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

    private void bookCells(
            IntervalState state, Slab slab, int[] termAccounts, int row, int column, double share, Bookings bookings) {
        FaceFlows flows = state.flows();
        for (int layer = chart.first(); layer <= chart.last(); layer++) {
            int cell = flows.block().cell(layer, row, column);
            if (!flows.active()[cell]) {
                bookings.inactive(
                        layer - chart.first(), share * state.geometry().grid().area(row, column));
                continue;
            }
            bookings.fromVolume(share * slab.outflow(layer, row, column), slab.gross(layer, row, column));
            bookings.holds(layer, cell, share, slab.floor(row, column), slab.ceiling(row, column));
            for (int i = 0; i < termAccounts.length; i++) {
                CellTerm term = state.terms().get(i);
                double counted = share * slab.counted(term.entry(), layer, row, column);
                bookings.from(cell, i);
                bookings.added(termAccounts[i] + layer - chart.first(), counted * term.rates()[cell]);
            }
        }
    }

    private void bookWells(IntervalState state, Slab slab, Bookings bookings) {
        for (int i = 0; i < state.wells().size(); i++) {
            WellRate rate = state.wells().get(i);
            WellCut met = wells.get(rate.well());
            if (!chart.holds(rate.layer())) {
                continue;
            }
            int cell = state.flows()
                    .block()
                    .cell(rate.layer(), rate.well().row(), rate.well().column());
            bookings.from(cell, state.terms().size() + i);
            bookings.at(rate.well().row(), rate.well().column());
            double counted = rule == WellRule.SPREAD ? met.share() : met.inside() ? 1 : 0;
            double part = slab.part(rate.layer(), rate.well().row(), rate.well().column());
            bookings.added(chart.source(rate.well().well().category(), rate.layer()), counted * part * rate.rate());
            bookings.fromVolume(
                    part * (counted - met.share()) * rate.rate(), met.pieces().length == 0 ? 0 : Math.abs(rate.rate()));
        }
    }
}
