package org.seepledger.plume;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Solute;
import org.seepledger.balance.Span;
import org.seepledger.ledger.Period;
import org.seepledger.prism.Pieces;
import org.seepledger.prism.Transect;

/**
 * What crosses a transect of one solute: water and mass by interval, piece and layer; NaN in intervals not asked for.
 *
 * @param transect the transect
 * @param solute the solute
 * @param pieces how the grid cuts it
 * @param layers the number of layers
 * @param areas area by interval and panel, length²; panel = piece × layers + layer
 * @param flows water by interval and panel, length³/time, positive forward
 * @param rates mass by interval, {@link NonDetects} and panel, kg/time, positive forward
 */
public record Crossing(
        Transect transect,
        Solute solute,
        Pieces pieces,
        int layers,
        double[][] areas,
        double[][] flows,
        double[][][] rates) {

    static Crossing empty(Transect transect, Solute solute, Pieces pieces, int layers, int intervals, Span span) {
        int panels = pieces.count() * layers;
        double[] none = new double[panels];
        Arrays.fill(none, Double.NaN);
        Crossing crossing = new Crossing(
                transect,
                solute,
                pieces,
                layers,
                new double[intervals][],
                new double[intervals][],
                new double[intervals][NonDetects.values().length][]);
        for (int interval = 0; interval < intervals; interval++) {
            boolean asked = interval >= span.from() && interval < span.to();
            crossing.areas[interval] = asked ? new double[panels] : none;
            crossing.flows[interval] = asked ? new double[panels] : none;
            Arrays.setAll(crossing.rates[interval], choice -> asked ? new double[panels] : none);
        }
        return crossing;
    }

    /**
     * {@return what crosses in a period, means over it}
     *
     * @param period the period
     * @param choice how non-detects count
     * @param segment a segment, from 0; -1 for all
     * @param layer a layer, from 0; -1 for all
     */
    public Panels panels(Period period, NonDetects choice, int segment, int layer) {
        int[] wanted = IntStream.range(0, pieces.count() * layers)
                .filter(panel -> segment < 0 || pieces.side(panel / layers) == segment)
                .filter(panel -> layer < 0 || panel % layers == layer)
                .toArray();
        double[] area = new double[wanted.length];
        double[] flow = new double[wanted.length];
        double[] rate = new double[wanted.length];
        for (Period.Part part : period.parts()) {
            double share = part.duration() / period.duration();
            for (int i = 0; i < wanted.length; i++) {
                area[i] += share * areas[part.interval()][wanted[i]];
                flow[i] += share * flows[part.interval()][wanted[i]];
                rate[i] += share * rates[part.interval()][choice.ordinal()][wanted[i]];
            }
        }
        return new Panels(area, flow, rate);
    }

    /**
     * A piece on the line's way.
     *
     * @param piece from 0
     * @param from how far along the line it begins, length
     * @param to how far along it ends
     */
    public record Stretch(int piece, double from, double to) {}

    /**
     * {@return the pieces in their order along the line}
     *
     * @param grid the grid
     */
    public List<Stretch> along(Grid grid) {
        double[] begins = new double[transect.segments()];
        for (int segment = 1; segment < begins.length; segment++) {
            double[] from = transect.vertices().get(segment - 1);
            double[] to = transect.vertices().get(segment);
            begins[segment] = begins[segment - 1] + Math.hypot(to[0] - from[0], to[1] - from[1]) * grid.planUnit();
        }
        return IntStream.range(0, pieces.count())
                .mapToObj(piece -> stretch(piece, begins[pieces.side(piece)], grid))
                .sorted(Comparator.comparingDouble(Stretch::from))
                .toList();
    }

    private Stretch stretch(int piece, double begin, Grid grid) {
        int row = pieces.row(piece);
        int column = pieces.column(piece);
        double[] start = transect.vertices().get(pieces.side(piece));
        double x = grid.x().edge(column) + pieces.middleAcross(piece) * grid.x().size(column);
        double y = grid.y().edge(grid.flipped(row))
                + pieces.middleUp(piece) * grid.y().size(grid.flipped(row));
        double away = Math.hypot(x - grid.localX(start[0], start[1]), y - grid.localY(start[0], start[1]));
        double length = Math.hypot(pieces.across(piece) * grid.width(column), pieces.up(piece) * grid.height(row));
        double middle = begin + away * grid.planUnit();
        return new Stretch(piece, middle - length / 2, middle + length / 2);
    }

    /**
     * {@return the mass that crosses a piece in a period, the mean over it, kg/time, positive forward}
     *
     * @param period the period
     * @param piece from 0
     * @param layer a layer, from 0; -1 for all
     */
    public double rate(Period period, int piece, int layer) {
        double rate = 0;
        for (Period.Part part : period.parts()) {
            double[] panels = rates[part.interval()][NonDetects.HALF.ordinal()];
            double share = part.duration() / period.duration();
            for (int k = Math.max(layer, 0); k < (layer < 0 ? layers : layer + 1); k++) {
                rate += share * panels[piece * layers + k];
            }
        }
        return rate;
    }
}
