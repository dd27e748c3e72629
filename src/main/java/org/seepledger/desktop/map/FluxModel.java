package org.seepledger.desktop.map;

import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.job.FluxField;

/** The flux that arrows show: fewer as one goes farther away, each the mean of its square of cells. */
final class FluxModel {

    /** How far arrows are apart at least, in logical pixels. */
    private static final double APART = 46;

    private final Session session;
    private final MapModel map;
    private final Lane reading;
    private final ReadOnlyObjectWrapper<Optional<FluxField>> field = new ReadOnlyObjectWrapper<>(Optional.empty());
    private Optional<Request> asked = Optional.empty();

    /** Which flux was asked for. */
    private record Request(OpenSet set, int layer, int interval, int stride) {}

    FluxModel(Session session, MapModel map, Tasks tasks) {
        this.session = session;
        this.map = map;
        this.reading = tasks.latest("task.flux");
        map.camera().addListener((camera, before, after) -> refresh());
        map.overlays().arrows().addListener((wanted, before, after) -> refresh());
        session.layer().addListener((layer, before, after) -> refresh());
        session.interval().addListener((interval, before, after) -> refresh());
        session.set().addListener((set, before, after) -> {
            field.set(Optional.empty());
            refresh();
        });
    }

    private void refresh() {
        Optional<Request> wanted = session.set()
                .get()
                .filter(set ->
                        map.overlays().arrows().get() && map.camera().get().width() > 0)
                .map(set -> new Request(
                        set, session.layer().get(), session.interval().get(), stride(set)));
        if (wanted.equals(asked)) {
            return;
        }
        asked = wanted;
        reading.cancel();
        wanted.ifPresent(this::read);
    }

    private void read(Request request) {
        reading.run(
                progress -> {
                    EntryGuard.enter();
                    Grid grid = request.set().aquifer().grid();
                    return request.set()
                            .workbench()
                            .flux(request.layer(), request.interval(), grid.window(), request.stride(), progress);
                },
                read -> field.set(Optional.of(read)),
                fault -> field.set(Optional.empty()));
    }

    /** The power of two that keeps arrows apart. */
    private int stride(OpenSet set) {
        Grid grid = set.aquifer().grid();
        double mean = Math.min(
                grid.x().edge(grid.columns()) / grid.columns(), grid.y().edge(grid.rows()) / grid.rows());
        double cell = mean * map.camera().get().scale();
        int stride = 1;
        while (stride * cell < APART && stride < Math.max(grid.columns(), grid.rows())) {
            stride *= 2;
        }
        return stride;
    }

    ReadOnlyObjectProperty<Optional<FluxField>> field() {
        return field.getReadOnlyProperty();
    }
}
