package org.seepledger.sample;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * A river that exchanges water with the cells under it through its bed. Each straight reach is cut at the cells' edges.
 *
 * @param x along-grid x of the bends, downstream, m; no bend and no cut lies at a cell's corner
 * @param y along-grid y of the bends, m
 * @param width of the bed, m
 * @param leakance of the bed, 1/d
 * @param stage at the first bend, m
 * @param fall of the stage per metre of river
 */
record River(double[] x, double[] y, double width, double leakance, double stage, double fall) {

    /**
     * A length of river in one cell.
     *
     * @param reach from 1 downstream
     * @param exchange its exchange with the cell
     */
    record Piece(int reach, Exchange exchange) {}

    /**
     * {@return the pieces, downstream}
     *
     * @param grid the grid
     */
    List<Piece> pieces(BlockGrid grid) {
        List<Piece> pieces = new ArrayList<>();
        double travelled = 0;
        for (int reach = 1; reach < x.length; reach++) {
            double length = length(reach);
            double[] cuts = cuts(reach, grid);
            for (int i = 1; i < cuts.length; i++) {
                double middle = (cuts[i - 1] + cuts[i]) / 2;
                double part = (cuts[i] - cuts[i - 1]) * length;
                double level = stage - fall * (travelled + middle * length);
                int cell = grid.cellAt(along(x, reach, middle), along(y, reach, middle));
                pieces.add(new Piece(reach, new Exchange(cell, leakance * width * part, level)));
            }
            travelled += length;
        }
        return pieces;
    }

    /** Where a reach begins, crosses edges of cells, and ends, as parts of its length. */
    private double[] cuts(int reach, BlockGrid grid) {
        DoubleStream columns = DoubleStream.of(grid.columnEdges()).map(edge -> part(x, reach, edge));
        DoubleStream rows = DoubleStream.of(grid.rowEdges()).map(edge -> part(y, reach, edge));
        DoubleStream inside = DoubleStream.concat(columns, rows).filter(part -> part > 0 && part < 1);
        return DoubleStream.concat(DoubleStream.of(0, 1), inside)
                .sorted()
                .distinct()
                .toArray();
    }

    private double length(int reach) {
        double dx = x[reach] - x[reach - 1];
        double dy = y[reach] - y[reach - 1];
        return Math.sqrt(dx * dx + dy * dy);
    }

    private static double along(double[] bends, int reach, double part) {
        return bends[reach - 1] + part * (bends[reach] - bends[reach - 1]);
    }

    private static double part(double[] bends, int reach, double edge) {
        return (edge - bends[reach - 1]) / (bends[reach] - bends[reach - 1]);
    }
}
