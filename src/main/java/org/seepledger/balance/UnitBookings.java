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
        return OnesApart.weights(block, inner, lit -> booked(response.unit(input, layer, lit))::get);
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
