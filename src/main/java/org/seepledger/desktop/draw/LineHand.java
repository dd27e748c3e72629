package org.seepledger.desktop.draw;

import java.util.Optional;
import org.seepledger.desktop.map.Touch;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.LineHit;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Snapping;

/** Chooses transects and their vertices, and moves them; a drag of a segment puts a vertex into it. */
final class LineHand {

    private final DraftModel model;
    private final Snapper snapper;
    private Optional<LineHit> pressed = Optional.empty();
    private Optional<LineHit> under = Optional.empty();
    private Optional<LineHit> chosen = Optional.empty();
    private Place begin = new Place(0, 0);

    LineHand(DraftModel model, Snapper snapper) {
        this.model = model;
        this.snapper = snapper;
    }

    private Optional<LineHit> at(Touch touch) {
        return LineHit.at(model.drawing().lines(), new Place(touch.x(), touch.y()), Nearness.ofPixel(touch.pixel()));
    }

    void hover(Touch touch) {
        under = at(touch);
    }

    boolean isOver() {
        return under.isPresent();
    }

    boolean isHeld() {
        return pressed.isPresent();
    }

    boolean press(Touch touch) {
        pressed = at(touch);
        under = pressed;
        chosen = pressed;
        begin = new Place(touch.x(), touch.y());
        pressed.ifPresent(hit -> model.session().transect().set(hit.line()));
        return pressed.isPresent();
    }

    void drag(Touch touch) {
        LineHit hit = pressed.orElseThrow();
        if (!model.isGesturing()) {
            if (!Nearness.ofPixel(touch.pixel()).isDrag(begin, new Place(touch.x(), touch.y()))) {
                return;
            }
            model.beginGesture(hit.onVertex() ? "step.transect.vertex" : "step.transect.insert");
        }
        Place to = model.onGrid(snapper.held(Snapping.to(model.settled(), model.grid()), touch));
        model.preview(drawing -> drawing.editLine(
                hit.line(), line -> hit.onVertex() ? line.move(hit.index(), to) : line.insert(hit.index(), to)));
    }

    void release() {
        if (model.isGesturing()) {
            model.commitGesture();
        }
        if (pressed.isPresent() && !pressed.get().onVertex()) {
            chosen = Optional.empty();
        }
        pressed = Optional.empty();
        snapper.letGo();
    }

    void letGo() {
        chosen = Optional.empty();
    }

    void cancel() {
        if (model.isGesturing() && isHeld()) {
            model.cancelGesture();
        }
        pressed = Optional.empty();
        letGo();
    }

    /** Deletes the chosen vertex, or the transect when one of its segments is chosen; false if none is. */
    boolean delete() {
        Optional<LineHit> hit =
                chosen.filter(known -> model.drawing().line(known.line()).isPresent());
        hit.ifPresent(known -> {
            if (known.onVertex()) {
                model.step(
                        "step.transect.vertex.delete",
                        drawing -> drawing.editLine(known.line(), line -> line.delete(known.index())));
            } else {
                model.step("step.transect.delete", drawing -> drawing.withoutLine(known.line()));
            }
        });
        letGo();
        return hit.isPresent();
    }

    /** Moves the chosen vertex to a place; false if none is chosen. */
    boolean put(Place place) {
        Optional<LineHit> vertex = vertex();
        vertex.ifPresent(hit -> model.step(
                "step.transect.vertex",
                drawing -> drawing.editLine(hit.line(), line -> line.move(hit.index(), model.onGrid(place)))));
        return vertex.isPresent();
    }

    boolean nudge(double dx, double dy) {
        return vertex().map(hit -> model.drawing()
                        .line(hit.line())
                        .map(ControlLine::places)
                        .orElseThrow()
                        .get(hit.index()))
                .filter(place -> put(place.moved(dx, dy)))
                .isPresent();
    }

    /** The vertex that is chosen, if one is. */
    Optional<LineHit> vertex() {
        return chosen.filter(LineHit::onVertex)
                .filter(hit -> model.drawing()
                        .line(hit.line())
                        .filter(line -> hit.index() < line.places().size())
                        .isPresent());
    }
}
