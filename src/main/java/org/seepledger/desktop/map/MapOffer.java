package org.seepledger.desktop.map;

import java.util.List;
import java.util.Optional;
import javafx.beans.value.ObservableValue;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapAsked;
import org.seepledger.job.ShownPicture;
import org.seepledger.unit.Measure;

/** Offers the map as it is shown, for handing over. */
final class MapOffer {

    private final Session session;
    private final MapModel model;
    private final String name = Words.of("map.picture");

    MapOffer(Session session, MapModel model) {
        this.session = session;
        this.model = model;
    }

    /** Begins to offer. */
    void begin() {
        List<ObservableValue<?>> shown = List.of(
                model.camera(),
                model.values().view(),
                model.values().scale(),
                model.overlays().contours(),
                model.overlays().wells(),
                session.drawing(),
                session.selected(),
                session.solute(),
                session.faceFlows());
        shown.forEach(value -> value.addListener((changed, before, after) -> offer()));
        offer();
    }

    private void offer() {
        Optional<OpenSet> set = session.set().get();
        Optional<MapAsked> asked = set.flatMap(this::asked);
        if (asked.isPresent()) {
            session.pictures()
                    .put(
                            name,
                            new ShownPicture(
                                    name,
                                    progress -> set.get().workbench().views().map(asked.get(), progress)));
        } else {
            session.pictures().remove(name);
        }
    }

    private Optional<MapAsked> asked(OpenSet set) {
        return model.values()
                .view()
                .get()
                .flatMap(view -> model.values()
                        .scale()
                        .get()
                        .map(scale -> new MapAsked(
                                view.request().quantity(),
                                view.request().layer(),
                                session.interval().get(),
                                scale,
                                model.overlays().contours().get(),
                                model.overlays().wells().get(),
                                part(),
                                session.drawing().get().prisms(),
                                session.solute().get().isEmpty()
                                        ? session.selected().get()
                                        : "",
                                unit(),
                                title(set, view.request()))));
    }

    private MapAsked.Part part() {
        Camera camera = model.camera().get();
        return new MapAsked.Part(
                camera.mapX(0), camera.mapY(camera.height()), camera.mapX(camera.width()), camera.mapY(0));
    }

    private Optional<Measure> unit() {
        return Optional.of(session.faceFlows().get().unit())
                .filter(unit -> !unit.isEmpty())
                .map(Measure::of);
    }

    private String title(OpenSet set, LayerView.Request shown) {
        return Words.of(
                "map.picture.title",
                shown.quantity().label(),
                set.aquifer().layers().get(shown.layer()).name(),
                ShowingBar.interval(
                        set.aquifer().times(),
                        session.interval().get(),
                        session.numbers().get()));
    }
}
