package org.seepledger.plume;

import java.util.ArrayList;
import java.util.IntSummaryStatistics;
import java.util.List;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.KnownCells;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Bands;
import org.seepledger.balance.Span;
import org.seepledger.prism.Pieces;
import org.seepledger.prism.Transect;
import org.seepledger.progress.Progress;

/**
 * Works out what crosses drawn transects: the cells' own field, piece by piece, with the concentration of the cell that the
 * water leaves. A piece counts with its net; wells in a cell are spread over it.
 */
public final class TransectFlows {

    private final KnownCells known;
    private final Span span;
    private final Window window;
    private final List<Crossing> crossings = new ArrayList<>();

    private TransectFlows(
            Aquifer aquifer,
            Function<Window, KnownCells> known,
            Span span,
            List<Solute> solutes,
            List<Transect> transects) {
        this.span = span;
        for (Transect transect : transects) {
            Pieces pieces = transect.cut(aquifer.grid());
            for (Solute solute : solutes) {
                crossings.add(Crossing.empty(
                        transect,
                        solute,
                        pieces,
                        aquifer.layers().size(),
                        aquifer.times().intervals(),
                        span));
            }
        }
        this.window = joint();
        this.known = known.apply(window);
    }

    /**
     * {@return what crosses, by transect and for each by solute}
     *
     * @param aquifer the aquifer
     * @param solutes the solutes, each with a concentration
     * @param transects lines within the grid
     * @param progress told of each band and interval
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static List<Crossing> of(
            Aquifer aquifer, List<Solute> solutes, List<Transect> transects, Progress progress) {
        return of(aquifer, window -> aquifer, Span.all(aquifer.times()), solutes, transects, progress);
    }

    /**
     * {@return what crosses in some intervals, by transect and for each by solute; no numbers for other intervals}
     *
     * @param aquifer the aquifer
     * @param known what is known of its cells, by the transects' joint window
     * @param span the intervals
     * @param solutes at least one solute, each with a concentration
     * @param transects at least one line within the grid
     * @param progress told of each band and interval
     * @throws org.seepledger.fault.DataFault if the data are wrong
     * @throws org.seepledger.progress.Cancelled if the work was stopped
     */
    public static List<Crossing> of(
            Aquifer aquifer,
            Function<Window, KnownCells> known,
            Span span,
            List<Solute> solutes,
            List<Transect> transects,
            Progress progress) {
        TransectFlows flows = new TransectFlows(aquifer, known, span, solutes, transects);
        List<Window> bands = Bands.of(flows.window, aquifer.layers().size());
        progress.begin("crossing transects", (long) bands.size() * span.count());
        bands.forEach(band -> flows.work(band, progress));
        return flows.crossings;
    }

    /** The smallest window that holds the cells of all pieces. */
    private Window joint() {
        int[] rows = cells(Pieces::row);
        int[] columns = cells(Pieces::column);
        return new Window(rows[0], columns[0], rows[1] - rows[0] + 1, columns[1] - columns[0] + 1);
    }

    private interface OfPiece {
        int at(Pieces pieces, int piece);
    }

    private int[] cells(OfPiece place) {
        IntSummaryStatistics all = crossings.stream()
                .flatMapToInt(crossing ->
                        IntStream.range(0, crossing.pieces().count()).map(piece -> place.at(crossing.pieces(), piece)))
                .summaryStatistics();
        return new int[] {all.getMin(), all.getMax()};
    }

    private void work(Window rows, Progress progress) {
        List<Crossing> here = crossings.stream()
                .filter(crossing -> crossing.pieces().firstFrom(rows.row())
                        < crossing.pieces().firstFrom(rows.rowEnd()))
                .toList();
        CellGeometry geometry = here.isEmpty() ? null : known.geometry(rows);
        for (int interval = span.from(); interval < span.to(); interval++) {
            if (geometry != null) {
                IntervalState state = known.state(interval, geometry, List.of());
                int at = interval;
                here.forEach(crossing -> cross(crossing, at, state, rows));
            }
            progress.step();
        }
    }

    private static void cross(Crossing crossing, int interval, IntervalState state, Window rows) {
        CellGeometry geometry = state.geometry();
        String name = crossing.solute().name();
        Reading mean = Reading.mean(
                Reading.of(name, crossing.solute().concentration().orElseThrow(), interval, geometry),
                Reading.of(name, crossing.solute().concentration().orElseThrow(), interval + 1, geometry));
        int end = crossing.pieces().firstFrom(rows.rowEnd());
        for (int piece = crossing.pieces().firstFrom(rows.row()); piece < end; piece++) {
            for (int layer = 0; layer < crossing.layers(); layer++) {
                cross(crossing, interval, state, mean, piece, layer);
            }
        }
    }

    private static void cross(
            Crossing crossing, int interval, IntervalState state, Reading mean, int piece, int layer) {
        Pieces pieces = crossing.pieces();
        Block block = state.geometry().block();
        Grid grid = state.geometry().grid();
        int row = pieces.row(piece);
        int column = pieces.column(piece);
        int cell = block.cell(layer, row, column);
        if (!state.flows().active()[cell]) {
            return;
        }
        int panel = piece * crossing.layers() + layer;
        double length = Math.hypot(pieces.across(piece) * grid.width(column), pieces.up(piece) * grid.height(row));
        crossing.areas()[interval][panel] = length * state.saturation().thickness(cell);
        double flow = forward(pieces, state.flows(), piece, layer);
        crossing.flows()[interval][panel] = flow;
        int from = flow >= 0 ? cell : beyond(pieces, grid, block, piece, layer, cell);
        for (NonDetects choice : NonDetects.values()) {
            double rate = flow == 0 ? 0 : flow * mean.needed(choice.ordinal(), from);
            crossing.rates()[interval][choice.ordinal()][panel] = rate;
        }
    }

    private static double forward(Pieces pieces, FaceFlows flows, int piece, int layer) {
        Block block = flows.block();
        int row = pieces.row(piece);
        int column = pieces.column(piece);
        double west = flows.x()[block.xFace(layer, row, column)];
        double east = flows.x()[block.xFace(layer, row, column + 1)];
        double south = flows.y()[block.yFace(layer, row + 1, column)];
        double north = flows.y()[block.yFace(layer, row, column)];
        return 0.5
                * (pieces.outflowAtStart(piece, west, east, south, north)
                        + pieces.outflowAtEnd(piece, west, east, south, north));
    }

    /** The cell on the right of a piece on a grid line; its own where it runs through the cell or along the grid's edge. */
    private static int beyond(Pieces pieces, Grid grid, Block block, int piece, int layer, int own) {
        int row = pieces.rowBeyond(piece);
        int column = pieces.columnBeyond(piece);
        boolean onGrid = row >= 0 && column >= 0 && row < grid.rows() && column < grid.columns();
        return onGrid ? block.cell(layer, row, column) : own;
    }
}
