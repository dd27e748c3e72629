package org.seepledger.balance;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Response;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;

/** Books ones in place of given values, in one band and interval, to learn the values' weights. */
final class UnitBookings {

    /** A value that drives flow acts on its own cell and its neighbours: every third may be booked at once. */
    private static final int APART = 3;

    private final PrismAccounts accounts;
    private final Optional<Elevations> elevations;
    private final Response response;
    private final Slopes slopes;
    private final Window inner;
    private final Window block;

    UnitBookings(PrismAccounts accounts, Optional<Elevations> elevations, Response response, Slopes slopes) {
        this.accounts = accounts;
        this.elevations = elevations;
        this.response = response;
        this.slopes = slopes;
        this.inner = response.state().geometry().inner();
        this.block = response.state().geometry().block().window();
    }

    /**
     * Adds the weights of gridded quantities.
     *
     * @param flow whether quantities that drive flow count, too
     * @param share how much of the interval's mean the row is
     * @param weights takes them
     */
    void addQuantities(boolean flow, double share, PartWeights weights) {
        int layers = response.state().geometry().block().layers();
        for (int input = 0; input < response.inputs().size(); input++) {
            Response.Input given = response.inputs().get(input);
            for (int layer = 0; layer < layers && (flow || !given.flow()); layer++) {
                double[] found = given.flow() ? acrossColumns(input, layer) : withinColumns(input, layer);
                if (Arrays.stream(found).anyMatch(weight -> weight != 0)) {
                    double[] shared =
                            Arrays.stream(found).map(weight -> weight * share).toArray();
                    weights.add(given.values().stored(layer, given.step(), block), shared);
                }
            }
        }
    }

    private double[] withinColumns(int input, int layer) {
        boolean[] lit = new boolean[block.size()];
        Arrays.fill(lit, true);
        ColumnSums sums = booked(response.unit(input, layer, lit));
        double[] found = new double[lit.length];
        for (int row = inner.row(); row < inner.rowEnd(); row++) {
            for (int column = inner.column(); column < inner.columnEnd(); column++) {
                found[block.index(row, column)] = sums.get(row, column);
            }
        }
        return found;
    }

    private double[] acrossColumns(int input, int layer) {
        double[] found = new double[block.size()];
        for (int firstRow = 0; firstRow < APART; firstRow++) {
            for (int firstColumn = 0; firstColumn < APART; firstColumn++) {
                boolean[] lit = lit(firstRow, firstColumn);
                ColumnSums sums = booked(response.unit(input, layer, lit));
                for (int row = inner.row(); row < inner.rowEnd(); row++) {
                    for (int column = inner.column(); column < inner.columnEnd(); column++) {
                        double sum = sums.get(row, column);
                        if (sum != 0) {
                            found[block.index(nearest(row, firstRow), nearest(column, firstColumn))] += sum;
                        }
                    }
                }
            }
        }
        return found;
    }

    private boolean[] lit(int firstRow, int firstColumn) {
        boolean[] lit = new boolean[block.size()];
        for (int row = block.row(); row < block.rowEnd(); row++) {
            for (int column = block.column(); column < block.columnEnd(); column++) {
                lit[block.index(row, column)] = row % APART == firstRow && column % APART == firstColumn;
            }
        }
        return lit;
    }

    /** The row or column with a one that is the given one or next to it. */
    private static int nearest(int index, int first) {
        return index + Math.floorMod(first - index + 1, APART) - 1;
    }

    /** Adds the weights of wells' rates; wells in one column of cells are booked one after the other. */
    void addWells(Aquifer aquifer, int interval, double share, PartWeights weights) {
        Map<Integer, Set<PlacedWell>> byColumn = new HashMap<>();
        for (WellRate rate : response.state().wells()) {
            int place = block.index(rate.well().row(), rate.well().column());
            byColumn.computeIfAbsent(place, column -> new LinkedHashSet<>()).add(rate.well());
        }
        while (!byColumn.isEmpty()) {
            Set<PlacedWell> lit = new LinkedHashSet<>();
            byColumn.values().removeIf(waiting -> {
                PlacedWell next = waiting.iterator().next();
                waiting.remove(next);
                lit.add(next);
                return waiting.isEmpty();
            });
            ColumnSums sums = booked(response.unit(lit));
            for (PlacedWell well : lit) {
                double[] weight = {share * sums.get(well.row(), well.column())};
                double from = aquifer.times().instant(interval);
                weights.add(well.well().stored(from, aquifer.times().instant(interval + 1)), weight);
            }
        }
    }

    private ColumnSums booked(IntervalState unit) {
        ColumnSums sums = new ColumnSums(slopes, block);
        accounts.book(unit, accounts.slab(unit, elevations), sums);
        return sums;
    }
}
