package org.seepledger.desktop.draw;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.map.Touch;
import org.seepledger.job.WellPlace;
import org.seepledger.sketch.Figure;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Snapping;

/** Draws from one place to another: a rectangle from corner to corner, a circle from its centre, which wells hold. */
final class SpanHand {

    private static final int VERTICES = 64;

    private final DraftModel model;
    private final Snapper snapper;
    private Optional<Place> begin = Optional.empty();
    private Optional<Place> end = Optional.empty();
    private Optional<Place> pressed = Optional.empty();

    SpanHand(DraftModel model, Snapper snapper) {
        this.model = model;
        this.snapper = snapper;
    }

    void hover(Touch touch) {
        Place held = snapper.held(Snapping.to(model.drawing(), model.grid()), touch);
        if (pressed.isEmpty() && begin.isEmpty()) {
            end = Optional.of(held);
        }
    }

    void press(Touch touch) {
        Place held = snapper.held(Snapping.to(model.drawing(), model.grid()), touch);
        Place start = model.tool().get() == Tool.CIRCLE ? well(touch).orElse(held) : held;
        pressed = Optional.of(new Place(touch.x(), touch.y()));
        begin = Optional.of(start);
        end = begin;
    }

    private Optional<Place> well(Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        return model.session().wells().get().stream()
                .map(SpanHand::place)
                .filter(place -> place.distance(pointer)
                        <= Nearness.ofPixel(touch.pixel()).capture())
                .min(Comparator.comparingDouble(place -> place.distance(pointer)));
    }

    private static Place place(WellPlace well) {
        return new Place(well.x(), well.y());
    }

    void drag(Touch touch) {
        end = Optional.of(snapper.held(Snapping.to(model.drawing(), model.grid()), touch));
    }

    /** A click leaves the centre of a circle, whose radius can then be typed. */
    void release(Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        boolean dragged = pressed.filter(from -> Nearness.ofPixel(touch.pixel()).isDrag(from, pointer))
                .isPresent();
        pressed = Optional.empty();
        if (!dragged) {
            end = begin;
            return;
        }
        if (Fresh.prism(model, model.tool().get() == Tool.CIRCLE ? "step.circle" : "step.rectangle", this::outline)) {
            cancel();
            model.choose(Tool.SELECT);
        }
    }

    private Outline outline() {
        Place from = begin.orElseThrow();
        Place to = end.orElseThrow();
        return model.tool().get() == Tool.CIRCLE
                ? Figure.circle(from, from.distance(to), VERTICES)
                : Figure.rectangle(
                        from, to, model.grid().map(grid -> grid.rotation()).orElse(0.0));
    }

    /** Draws the circle of a typed radius, in plan units, about the centre that was clicked. */
    boolean radius(double radius) {
        if (begin.isEmpty()) {
            return false;
        }
        Place centre = begin.get();
        if (Fresh.prism(model, "step.circle", () -> Figure.circle(centre, radius, VERTICES))) {
            cancel();
            model.choose(Tool.SELECT);
        }
        return true;
    }

    void cancel() {
        begin = Optional.empty();
        end = Optional.empty();
        pressed = Optional.empty();
        snapper.letGo();
    }

    /** The outline as it would become, and the centre or corner alone while it would be none. */
    List<Place> places() {
        if (begin.isEmpty()) {
            return List.of();
        }
        try {
            return outline().places();
        } catch (Refusal refusal) {
            return List.of(begin.get());
        }
    }
}
