package org.seepledger.desktop.map;

import java.time.Duration;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Window;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.job.FluxField;
import org.seepledger.progress.Progress;

/**
 * The flux that arrows show: fewer as one goes farther away, each the mean of its square of cells. Only what is seen and as
 * much again around it is read, once the map rests; arrows keep their scale when one goes nearer or to another interval.
 */
final class FluxModel {

    /** How far arrows are apart at least, in logical pixels. */
    private static final double APART = 46;

    private static final Duration REST = Duration.ofMillis(120);

    /** How many squares the whole grid has along its longer side where arrows get their scale. */
    private static final int OVERVIEW = 64;

    private final Session session;
    private final MapModel map;
    private final Lane reading;
    private final ReadOnlyObjectWrapper<Optional<Flux>> flux = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final Map<Integer, Double> greatestOfLayer = new HashMap<>();
    private Optional<Request> asked = Optional.empty();

    /** Which flux was asked for. */
    private record Request(OpenSet set, int layer, int interval, int stride, Window window) {

        /** Whether this also answers another question, as it holds more. */
        boolean answers(Request other) {
            return set == other.set
                    && layer == other.layer
                    && interval == other.interval
                    && stride == other.stride
                    && window.contains(other.window);
        }

        Request around() {
            return new Request(
                    set, layer, interval, stride, Seen.around(set.aquifer().grid(), window, stride));
        }
    }

    FluxModel(Session session, MapModel map, Tasks tasks) {
        this.session = session;
        this.map = map;
        this.reading = tasks.latest("task.flux");
        map.camera().addListener((camera, before, after) -> refresh());
        map.overlays().arrows().addListener((wanted, before, after) -> refresh());
        session.layer().addListener((layer, before, after) -> refresh());
        session.interval().addListener((interval, before, after) -> refresh());
        session.set().addListener((set, before, after) -> {
            greatestOfLayer.clear();
            asked = Optional.empty();
            flux.set(Optional.empty());
            refresh();
        });
    }

    private void refresh() {
        Optional<Request> wanted = session.set()
                .get()
                .filter(set ->
                        map.overlays().arrows().get() && map.camera().get().width() > 0)
                .flatMap(this::request);
        if (wanted.isEmpty() || asked.isEmpty() || !asked.get().answers(wanted.get())) {
            reading.cancel();
            asked = wanted.map(Request::around);
            asked.ifPresent(this::read);
        }
    }

    private Optional<Request> request(OpenSet set) {
        Grid grid = set.aquifer().grid();
        int stride = stride(grid);
        return Seen.of(grid, map.camera().get(), stride)
                .map(window -> new Request(
                        set, session.layer().get(), session.interval().get(), stride, window));
    }

    private void read(Request request) {
        Optional<Double> greatest = Optional.ofNullable(greatestOfLayer.get(request.layer()));
        reading.runAfter(
                flux.get().isEmpty() ? Duration.ZERO : REST,
                progress -> {
                    EntryGuard.enter();
                    return new Flux(
                            field(request, request.window(), request.stride(), progress),
                            greatest.orElseGet(() -> overview(request, progress)));
                },
                read -> {
                    greatestOfLayer.put(request.layer(), read.greatest());
                    flux.set(Optional.of(read));
                },
                fault -> flux.set(Optional.empty()));
    }

    private static double overview(Request request, Progress progress) {
        Grid grid = request.set().aquifer().grid();
        int stride = Math.max(1, Math.max(grid.columns(), grid.rows()) / OVERVIEW);
        return Flux.greatest(field(request, grid.window(), stride, progress));
    }

    private static FluxField field(Request request, Window window, int stride, Progress progress) {
        return request.set().workbench().views().flux(request.layer(), request.interval(), window, stride, progress);
    }

    /** The power of two that keeps arrows apart. */
    private int stride(Grid grid) {
        double mean = Math.min(
                grid.x().edge(grid.columns()) / grid.columns(), grid.y().edge(grid.rows()) / grid.rows());
        double cell = mean * map.camera().get().scale();
        int stride = 1;
        while (stride * cell < APART && stride < Math.max(grid.columns(), grid.rows())) {
            stride *= 2;
        }
        return stride;
    }

    ReadOnlyObjectProperty<Optional<Flux>> flux() {
        return flux.getReadOnlyProperty();
    }
}
