package org.seepledger.plume;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.Concentration;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.balance.OnesApart;
import org.seepledger.balance.PartWeights;
import org.seepledger.balance.PrismWalk;

/** Books ones in place of concentrations, in one band and interval, to learn their weights in a row. */
final class UnitConcentrations {

    private static final int NO_SOURCE = -2;

    private final SoluteTrace.Request request;
    private final Band band;
    private final IntervalState state;
    private final int interval;
    private final double length;
    private final Block block;
    private final List<Integer> givers;
    private final Optional<DispersiveFaces> spreading;

    /**
     * What stays the same from interval to interval.
     *
     * @param walk the prism's walk
     * @param over the walk over the band
     * @param chart the accounts
     * @param matrix what does not change of the solute
     * @param ofParent the same of its parent
     */
    record Band(PrismWalk walk, PrismWalk.OverBand over, SoluteChart chart, Matrix matrix, Optional<Matrix> ofParent) {}

    UnitConcentrations(
            SoluteTrace.Request request,
            Band band,
            IntervalState state,
            int interval,
            double length,
            List<Integer> givers) {
        this.request = request;
        this.band = band;
        this.state = state;
        this.interval = interval;
        this.length = length;
        this.givers = givers;
        this.block = state.geometry().block();
        this.spreading = request.options().dispersion()
                ? request.solute().dispersion().map(given -> new DispersiveFaces(state, band.matrix(), given))
                : Optional.empty();
    }

    /** Concentrations that are 0, to be lit: of the solute, of its parent, beyond the grid, and of a source. */
    private record Ones(
            double[] start, double[] end, double[] parentStart, double[] parentEnd, double[] beyond, double[] carried) {

        static Ones none(int cells) {
            return new Ones(
                    new double[cells],
                    new double[cells],
                    new double[cells],
                    new double[cells],
                    new double[cells],
                    new double[cells]);
        }
    }

    /** Adds the weights of all concentrations that the interval rests on. */
    void addTo(PartWeights weights, double share) {
        Concentration own = request.solute().concentration().orElseThrow();
        addInstant(weights, share, own, interval, Ones::start);
        addInstant(weights, share, own, interval + 1, Ones::end);
        request.parent().map(parent -> parent.concentration().orElseThrow()).ifPresent(parent -> {
            addInstant(weights, share, parent, interval, Ones::parentStart);
            addInstant(weights, share, parent, interval + 1, Ones::parentEnd);
        });
        request.solute().boundary().ifPresent(values -> addGiven(weights, share, values, Ones::beyond, NO_SOURCE));
        request.solute()
                .ofSources()
                .forEach((source, values) -> addGiven(weights, share, values, Ones::carried, source));
    }

    /** A non-detect counts half its limit: what it is marked with, or the detection limit. */
    private void addInstant(
            PartWeights weights, double share, Concentration given, int instant, Function<Ones, double[]> place) {
        double[] limits = given.at(instant, block).limits();
        double[] marks = block.read(given.marks(), given.marks().changes() ? instant : 0);
        double half = NonDetects.HALF.of(1);
        for (int layer = 0; layer < block.layers(); layer++) {
            double[] ofValues = weights(layer, place, NO_SOURCE, share);
            double[] ofLimits = new double[ofValues.length];
            for (int i = 0; i < ofValues.length; i++) {
                int cell = layer * ofValues.length + i;
                boolean below = !Double.isNaN(limits[cell]) && Double.isNaN(marks[cell]);
                ofLimits[i] = below ? half * ofValues[i] : 0;
                ofValues[i] *= below ? 0 : Double.isNaN(marks[cell]) ? 1 : half;
            }
            add(weights, given.values(), layer, instant, ofValues);
            int in = layer;
            given.limit().ifPresent(limit -> add(weights, limit, in, instant, ofLimits));
        }
    }

    private void addGiven(
            PartWeights weights, double share, GriddedValues given, Function<Ones, double[]> place, int source) {
        for (int layer = 0; layer < block.layers(); layer++) {
            add(weights, given, layer, interval, weights(layer, place, source, share));
        }
    }

    private void add(PartWeights weights, GriddedValues given, int layer, int step, double[] found) {
        if (Arrays.stream(found).anyMatch(weight -> weight != 0)) {
            weights.add(given.stored(layer, given.changes() ? step : 0, block.window()), found);
        }
    }

    private double[] weights(int layer, Function<Ones, double[]> place, int source, double share) {
        double[] found = OnesApart.weights(
                block.window(), state.geometry().inner(), lit -> booked(layer, place, source, lit)::get);
        return Arrays.stream(found).map(weight -> weight * share).toArray();
    }

    private NetByColumn booked(int layer, Function<Ones, double[]> place, int source, boolean[] lit) {
        Ones ones = Ones.none(block.size());
        double[] target = place.apply(ones);
        for (int i = 0; i < lit.length; i++) {
            target[layer * lit.length + i] = lit[i] ? 1 : 0;
        }
        NetByColumn sums = new NetByColumn(request.row(), block.window());
        NetByColumn unheard = new NetByColumn(request.row(), block.window());
        SoluteState known = known(ones, source);
        SoluteBookings bookings = new SoluteBookings(
                band.chart(),
                state,
                known,
                List.of(unheard, sums, unheard),
                SoluteTally.of(band.chart(), band.walk().layers()),
                length,
                new SoluteBookings.Counting(band.walk().firstLayer(), false, Double.POSITIVE_INFINITY));
        band.over().book(state, bookings);
        bookings.finish();
        spreading.ifPresent(faces -> bookSpreading(faces, known, sums));
        return sums;
    }

    private void bookSpreading(DispersiveFaces faces, SoluteState known, NetByColumn sums) {
        IntervalState spread = new IntervalState(
                state.geometry(),
                state.saturation(),
                faces.of(known.mean().byChoice()[NonDetects.HALF.ordinal()]),
                List.of(),
                List.of());
        band.over()
                .book(
                        spread,
                        new DispersedBookings(
                                band.chart(), sums, request.solute().name()));
    }

    private SoluteState known(Ones ones, int source) {
        Reading start = reading(ones.start());
        Reading end = reading(ones.end());
        return new SoluteState(
                band.matrix(),
                start,
                end,
                Reading.mean(start, end),
                request.solute().boundary().map(given -> beyond(given, ones.beyond())),
                givers.stream()
                        .map(giver -> giver == source ? Optional.of(ones.carried()) : Optional.<double[]>empty())
                        .toList(),
                band.ofParent().map(matrix -> ofParent(matrix, ones)));
    }

    private SoluteState ofParent(Matrix matrix, Ones ones) {
        Reading start = reading(ones.parentStart());
        Reading end = reading(ones.parentEnd());
        return new SoluteState(
                matrix, start, end, Reading.mean(start, end), Optional.empty(), List.of(), Optional.empty());
    }

    /** Where nothing is given beyond the grid, the cell's own concentration enters. */
    private double[] beyond(GriddedValues given, double[] ones) {
        double[] values = block.read(given, given.changes() ? interval : 0);
        Arrays.setAll(values, cell -> Double.isNaN(values[cell]) ? Double.NaN : ones[cell]);
        return values;
    }

    private Reading reading(double[] values) {
        double[][] byChoice = new double[NonDetects.values().length][];
        Arrays.fill(byChoice, values);
        double[] limits = new double[values.length];
        Arrays.fill(limits, Double.NaN);
        return new Reading(request.solute().name(), state.geometry(), byChoice, new boolean[values.length], limits);
    }
}
