package org.seepledger.plume;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.PrismWalk;
import org.seepledger.balance.Span;
import org.seepledger.progress.Progress;

/** One band of rows, worked through all intervals for all solutes. */
final class PlumeBand {

    private final SoluteBalance.Scope scope;
    private final Window window;
    private final List<Solute> solutes;
    private final List<PrismWalk> walks;
    private final List<List<SoluteChart>> charts;
    private final List<PlacedWell> wells;
    private final Givers givers;

    PlumeBand(
            SoluteBalance.Scope scope,
            Window window,
            List<Solute> solutes,
            List<PrismWalk> walks,
            List<List<SoluteChart>> charts,
            List<PlacedWell> wells) {
        this.scope = scope;
        this.window = window;
        this.solutes = solutes;
        this.walks = walks;
        this.charts = charts;
        this.wells = wells.stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.givers = new Givers(scope.aquifer());
    }

    PlumeSums work(Progress progress) {
        CellGeometry geometry = scope.known().geometry(window);
        Span span = scope.span();
        PlumeSums sums = new PlumeSums(walks, charts, span);
        List<PrismWalk.OverBand> overBand =
                walks.stream().map(walk -> walk.over(geometry)).toList();
        List<Matrix> matrices =
                solutes.stream().map(solute -> Matrix.of(solute, geometry)).toList();
        List<Reading> before = readings(span.from(), geometry);
        for (int interval = span.from(); interval < span.to(); interval++) {
            IntervalState state = scope.known().state(interval, geometry, wells);
            List<Reading> after = readings(interval + 1, geometry);
            List<SoluteState> states = states(interval, state, matrices, before, after);
            for (int solute = 0; solute < solutes.size(); solute++) {
                book(interval, state, overBand, solute, states.get(solute), sums);
            }
            before = after;
            progress.step();
        }
        return sums;
    }

    private List<Reading> readings(int instant, CellGeometry geometry) {
        return solutes.stream()
                .map(solute -> Reading.of(solute.name(), solute.concentration().orElseThrow(), instant, geometry))
                .toList();
    }

    private List<SoluteState> states(
            int interval, IntervalState state, List<Matrix> matrices, List<Reading> before, List<Reading> after) {
        List<SoluteState> alone = new ArrayList<>();
        for (int i = 0; i < solutes.size(); i++) {
            alone.add(new SoluteState(
                    matrices.get(i),
                    before.get(i),
                    after.get(i),
                    Reading.mean(before.get(i), after.get(i)),
                    solutes.get(i).boundary().map(values -> read(values, interval, state)),
                    carried(solutes.get(i), interval, state),
                    Optional.empty()));
        }
        return alone.stream().map(own -> withParent(own, alone)).toList();
    }

    private static SoluteState withParent(SoluteState own, List<SoluteState> all) {
        Optional<SoluteState> parent = own.matrix()
                .solute()
                .ancestry()
                .flatMap(ancestry -> all.stream()
                        .filter(other -> other.matrix().solute().name().equals(ancestry.parent()))
                        .findFirst());
        return new SoluteState(own.matrix(), own.start(), own.end(), own.mean(), own.boundary(), own.carried(), parent);
    }

    private static double[] read(GriddedValues values, int interval, IntervalState state) {
        Block block = state.geometry().block();
        return block.read(values, values.changes() ? interval : 0);
    }

    /** What each term and then each well adds: storage nothing, since it has rows of its own. */
    private List<Optional<double[]>> carried(Solute solute, int interval, IntervalState state) {
        Map<Integer, double[]> bySource = new HashMap<>();
        List<Optional<double[]>> carried = new ArrayList<>();
        for (int source : givers.of(state)) {
            GriddedValues given = solute.ofSources().get(source);
            carried.add(
                    given == null
                            ? Optional.empty()
                            : Optional.of(bySource.computeIfAbsent(source, key -> read(given, interval, state))));
        }
        return carried;
    }

    private void book(
            int interval,
            IntervalState state,
            List<PrismWalk.OverBand> overBand,
            int solute,
            SoluteState known,
            PlumeSums sums) {
        Optional<DispersiveFaces> spreading = scope.options().dispersion()
                ? known.matrix().solute().dispersion().map(given -> new DispersiveFaces(state, known.matrix(), given))
                : Optional.empty();
        double length = scope.aquifer().times().length(interval);
        IntervalState field = CarriedField.of(state, known);
        for (int prism = 0; prism < walks.size(); prism++) {
            SoluteTally tally = sums.tally(interval, prism, solute);
            SoluteChart chart = charts.get(prism).get(solute);
            SoluteBookings.Counting counting = new SoluteBookings.Counting(
                    walks.get(prism).firstLayer(),
                    interval == scope.span().from(),
                    scope.options().above().orElse(Double.POSITIVE_INFINITY));
            SoluteBookings bookings = new SoluteBookings(chart, state, known, tally, length, counting);
            overBand.get(prism).book(state, bookings);
            bookings.finish();
            overBand.get(prism).book(field, new AlongCells(field, tally.alongCells()));
        }
        spreading.ifPresent(faces -> bookSpreading(faces, interval, state, overBand, solute, known, sums));
    }

    private void bookSpreading(
            DispersiveFaces faces,
            int interval,
            IntervalState state,
            List<PrismWalk.OverBand> overBand,
            int solute,
            SoluteState known,
            PlumeSums sums) {
        String name = known.matrix().solute().name();
        for (NonDetects choice : NonDetects.values()) {
            IntervalState spreading = new IntervalState(
                    state.geometry(),
                    state.saturation(),
                    faces.of(known.mean().byChoice()[choice.ordinal()]),
                    List.of(),
                    List.of());
            for (int prism = 0; prism < walks.size(); prism++) {
                SoluteChart chart = charts.get(prism).get(solute);
                SoluteTally tally = sums.tally(interval, prism, solute);
                overBand.get(prism)
                        .book(
                                spreading,
                                new DispersedBookings(chart, tally.flows().get(choice.ordinal()), name));
            }
        }
    }
}
