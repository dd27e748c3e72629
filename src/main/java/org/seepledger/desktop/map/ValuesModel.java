package org.seepledger.desktop.map;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.seepledger.desktop.session.Draped;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.GridLayer;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.ValueScale;
import org.seepledger.progress.Cancelled;
import org.seepledger.progress.Progress;

/** Which values of which layer lie over the map, and in which colours. */
public final class ValuesModel {

    private static final int MOST_TEXELS_KEPT = 24_000_000;

    private final Session session;
    private final Lane reading;
    private final ObservableList<MapQuantity> quantities = FXCollections.observableArrayList();
    private final ObjectProperty<Optional<MapQuantity>> quantity = new SimpleObjectProperty<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Optional<LayerView>> view = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<Optional<ValueScale>> scale = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyObjectWrapper<PaneState> state =
            new ReadOnlyObjectWrapper<>(PaneState.empty(Words.of("map.empty")));
    private final Map<LayerView.Request, LayerView> kept = new LinkedHashMap<>();
    private final Map<LayerView.Request, ValueScale> scales = new HashMap<>();
    private Optional<Lattice> lattice = Optional.empty();

    ValuesModel(Session session, Tasks tasks) {
        this.session = session;
        this.reading = tasks.latest("task.map");
        session.set().addListener((set, before, after) -> begin(after));
        session.layer().addListener((layer, before, after) -> refresh());
        session.interval().addListener((interval, before, after) -> refresh());
        quantity.addListener((chosen, before, after) -> refresh());
        view.addListener((shown, before, after) -> tell());
        scale.addListener((colours, before, after) -> tell());
        session.demand().addListener((demand, before, after) -> meet(after));
        begin(session.set().get());
    }

    private void begin(Optional<OpenSet> set) {
        reading.cancel();
        kept.clear();
        scales.clear();
        view.set(Optional.empty());
        scale.set(Optional.empty());
        lattice = set.map(opened -> Lattice.of(opened.aquifer().grid()));
        quantity.set(Optional.empty());
        quantities.setAll(
                set.map(opened -> opened.workbench().views().quantities()).orElse(List.of()));
        quantity.set(quantities.stream().findFirst());
    }

    private void tell() {
        session.draped()
                .set(view.get()
                        .flatMap(shown -> scale.get()
                                .map(colours -> new Draped(shown.request().quantity(), colours))));
    }

    private void meet(Session.Demand demand) {
        if (demand == Session.Demand.SHOW_IMBALANCE) {
            session.demand().set(Session.Demand.NONE);
            quantities.stream()
                    .filter(each -> each.kind() == MapQuantity.Kind.IMBALANCE)
                    .findFirst()
                    .ifPresent(found -> quantity.set(Optional.of(found)));
        }
    }

    private void refresh() {
        if (quantity.get().isEmpty() || session.set().get().isEmpty()) {
            reading.cancel();
            state.set(PaneState.empty(Words.of("map.empty")));
            return;
        }
        OpenSet set = session.set().get().get();
        LayerView.Request request = LayerView.Request.of(
                quantity.get().get(), session.layer().get(), session.interval().get());
        if (kept.containsKey(request)) {
            reading.cancel();
            show(kept.get(request));
            return;
        }
        Lattice shown = lattice.orElseThrow();
        state.set(PaneState.working(Words.of("map.reading", request.quantity().label())));
        reading.run(
                progress -> read(set, shown, request, progress),
                this::show,
                fault -> state.set(PaneState.failed(
                        fault instanceof Cancelled ? Words.of("stopped.again") : FaultWords.of(fault))));
    }

    /** Reads again what was stopped or failed. */
    public void again() {
        if (state.get().phase() == PaneState.Phase.FAILED) {
            refresh();
        }
    }

    private static LayerView read(OpenSet set, Lattice lattice, LayerView.Request request, Progress progress) {
        EntryGuard.enter();
        GridLayer layer = set.workbench()
                .views()
                .layer(
                        request.quantity(),
                        request.layer(),
                        request.interval(),
                        lattice.grid().window(),
                        1,
                        progress);
        ValueScale natural = NaturalScale.of(request.quantity(), layer.values());
        Optional<Pyramid> limits =
                layer.hasNonDetects() ? Optional.of(Pyramid.of(lattice, layer.limits())) : Optional.empty();
        return new LayerView(request, Pyramid.of(lattice, layer.values()), natural, limits);
    }

    private void show(LayerView read) {
        keep(read);
        scale.set(Optional.of(scales.computeIfAbsent(alike(read.request()), request -> read.natural())));
        view.set(Optional.of(read));
        state.set(PaneState.READY);
    }

    /** The oldest go first; the one that is shown always stays. */
    private void keep(LayerView read) {
        kept.remove(read.request());
        kept.put(read.request(), read);
        int most = Math.max(
                1,
                MOST_TEXELS_KEPT
                        / (read.pyramid().lattice().rows()
                                * read.pyramid().lattice().columns()));
        while (kept.size() > most) {
            kept.remove(kept.keySet().iterator().next());
        }
    }

    /** Colours stay from interval to interval, so that change is seen. */
    private static LayerView.Request alike(LayerView.Request request) {
        return new LayerView.Request(request.quantity(), request.layer(), 0);
    }

    /** Takes the range of the values that are shown. */
    public void fitRange() {
        view.get().ifPresent(shown -> colour(shown, natural(shown, isLogarithmic())));
    }

    /**
     * Takes another range.
     *
     * @param from the value at the ramp's beginning
     * @param to the value at its end
     * @return whether it was taken: it is refused, with the reason in the status line, unless it increases
     */
    public boolean range(double from, double to) {
        if (!(to > from) || Double.isInfinite(to - from)) {
            session.status().set(Words.of("map.range.refused"));
            return false;
        }
        boolean logarithmic = isLogarithmic();
        if (logarithmic && !(from > 0)) {
            session.status().set(Words.of("map.range.log"));
            return false;
        }
        view.get()
                .ifPresent(shown -> colour(shown, new ValueScale(shown.natural().ramp(), from, to, logarithmic)));
        return true;
    }

    /** {@return whether the scale is logarithmic} */
    boolean isLogarithmic() {
        return scale.get().filter(ValueScale::logarithmic).isPresent();
    }

    /** {@return whether the scale may be logarithmic: of concentrations} */
    boolean mayBeLogarithmic() {
        return view.get()
                .filter(shown -> shown.request().quantity().isConcentration())
                .isPresent();
    }

    /** Takes a logarithmic scale, or a linear one again, as the values suggest. */
    void logarithmic(boolean wanted) {
        view.get()
                .filter(shown -> mayBeLogarithmic() && wanted != isLogarithmic())
                .ifPresent(shown -> colour(shown, natural(shown, wanted)));
    }

    private static ValueScale natural(LayerView shown, boolean logarithmic) {
        return logarithmic
                ? shown.natural().logarithmicOver(shown.pyramid().level(0).doubles())
                : shown.natural();
    }

    private void colour(LayerView shown, ValueScale taken) {
        scales.put(alike(shown.request()), taken);
        scale.set(Optional.of(taken));
    }

    /** {@return how numbers are written} */
    ReadOnlyObjectProperty<NumberForm> numbers() {
        return session.numbers();
    }

    /** {@return what can be shown} */
    public ObservableList<MapQuantity> quantities() {
        return quantities;
    }

    /** {@return what is to be shown} */
    public ObjectProperty<Optional<MapQuantity>> quantity() {
        return quantity;
    }

    ReadOnlyObjectProperty<Optional<LayerView>> view() {
        return view.getReadOnlyProperty();
    }

    /** {@return which colour a value has} */
    public ReadOnlyObjectProperty<Optional<ValueScale>> scale() {
        return scale.getReadOnlyProperty();
    }

    /** {@return how the reading goes} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return state.getReadOnlyProperty();
    }
}
