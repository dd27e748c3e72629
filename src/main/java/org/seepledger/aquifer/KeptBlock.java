package org.seepledger.aquifer;

import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;

/** A block of cells whose geometry and interval states are worked out once, when first asked for. */
final class KeptBlock implements KnownCells {

    /** Arrays of a geometry, by cell: top and bottom. */
    private static final int OF_GEOMETRY = 2;

    /** Arrays of a state, by cell: heads at both ends, flows along three axes, active or not. */
    private static final int OF_STATE = 6;

    private final Aquifer aquifer;
    private final Window window;
    private final Runnable grown;
    private final List<PlacedWell> wells;
    private final FutureTask<CellGeometry> geometry;
    private final Map<Integer, FutureTask<IntervalState>> states = new LinkedHashMap<>(16, 0.75f, true);

    KeptBlock(Aquifer aquifer, Window window, Runnable grown) {
        this.aquifer = aquifer;
        this.window = window;
        this.grown = grown;
        this.wells = aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
        this.geometry = new FutureTask<>(() -> aquifer.geometry(window));
    }

    boolean holds(Window wanted) {
        return window.contains(wanted);
    }

    /** The bytes for the geometry and one state. */
    long leastBytes() {
        return bytes(1);
    }

    synchronized long bytes() {
        return bytes(states.size());
    }

    private long bytes(int intervals) {
        int terms = aquifer.sources().size() + aquifer.storageItems().size();
        long cells = (long) aquifer.layers().size() * window.size();
        return Double.BYTES * cells * (OF_GEOMETRY + (long) intervals * (OF_STATE + terms));
    }

    /** Gives up the states used longest ago until the rest fits; tells how many bytes it takes. */
    synchronized long keepWithin(long room) {
        Iterator<FutureTask<IntervalState>> oldest = states.values().iterator();
        while (bytes() > room && states.size() > 1) {
            oldest.next();
            oldest.remove();
        }
        return bytes();
    }

    /** Where the wider block has bad data, the window alone may still be sound; if not, it says what is wrong. */
    @Override
    public CellGeometry geometry(Window wanted) {
        try {
            return result(geometry).within(wanted);
        } catch (RuntimeException e) {
            return aquifer.geometry(wanted);
        }
    }

    @Override
    public IntervalState state(int interval, CellGeometry wanted, List<PlacedWell> counted) {
        try {
            return narrowed(result(task(interval)), wanted);
        } catch (RuntimeException e) {
            return aquifer.state(interval, aquifer.geometry(wanted.inner()), counted);
        }
    }

    private FutureTask<IntervalState> task(int interval) {
        FutureTask<IntervalState> task;
        synchronized (this) {
            task = states.computeIfAbsent(
                    interval, missing -> new FutureTask<>(() -> aquifer.state(interval, result(geometry), wells)));
        }
        grown.run();
        return task;
    }

    private static IntervalState narrowed(IntervalState state, CellGeometry wanted) {
        List<WellRate> within = state.wells().stream()
                .filter(rate ->
                        wanted.inner().contains(rate.well().row(), rate.well().column()))
                .toList();
        return new IntervalState(wanted, state.saturation(), state.flows(), state.terms(), within);
    }

    /** Works it out, or waits for who is at it. */
    private static <T> T result(FutureTask<T> task) {
        task.run();
        try {
            return task.get();
        } catch (ExecutionException e) {
            throw e.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }
}
