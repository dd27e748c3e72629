package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.map.Touch;
import org.seepledger.picture.SectionLine;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Shape;
import org.seepledger.sketch.Snapping;
import org.seepledger.sketch.Stroke;

/** Draws place by place: a new prism, an island, the line that cuts a prism, that of a section, or a transect. */
final class StrokeHand {

    private final DraftModel model;
    private final Snapper snapper;
    private Stroke stroke = Stroke.EMPTY;
    private Optional<Place> pointer = Optional.empty();

    StrokeHand(DraftModel model, Snapper snapper) {
        this.model = model;
        this.snapper = snapper;
    }

    void hover(Touch touch) {
        Place held = snapper.held(Snapping.to(model.drawing(), model.grid()), touch);
        pointer = Optional.of(isTransect() ? model.onGrid(held) : held);
    }

    void press(Touch touch) {
        hover(touch);
        Place place = pointer.orElseThrow();
        boolean closes = model.tool().get() == Tool.POLYGON || model.tool().get() == Tool.ISLAND;
        boolean onFirst = closes
                && stroke.places().size() > 2
                && stroke.places().get(0).distance(new Place(touch.x(), touch.y()))
                        <= Nearness.ofPixel(touch.pixel()).vertex();
        if (onFirst) {
            finish();
        } else {
            add(place);
        }
    }

    void add(Place place) {
        stroke = stroke.to(place);
    }

    void back() {
        stroke = stroke.back();
    }

    void cancel() {
        stroke = Stroke.EMPTY;
        pointer = Optional.empty();
        snapper.letGo();
    }

    /** What is refused stays as it is drawn, to be mended. */
    void finish() {
        boolean done = switch (model.tool().get()) {
            case ISLAND ->
                model.selected()
                        .map(shape -> model.step("step.island", drawing -> island(drawing, shape)))
                        .orElse(false);
            case SPLIT ->
                model.selected()
                        .map(shape -> model.step(
                                "step.split", drawing -> drawing.split(shape.name(), stroke.places(), model.near())))
                        .orElse(false);
            case TRANSECT -> Fresh.transect(model, stroke.places());
            case SECTION -> section();
            default -> draw();
        };
        if (done) {
            cancel();
            model.choose(Tool.SELECT);
        }
    }

    private boolean isTransect() {
        return model.tool().get() == Tool.TRANSECT;
    }

    private Drawing island(Drawing drawing, Shape shape) {
        return drawing.edit(shape.name(), before -> before.with(stroke.closed()));
    }

    private boolean draw() {
        return Fresh.prism(model, "step.polygon", stroke::closed);
    }

    private boolean section() {
        try {
            SectionLine line = new SectionLine(stroke.places());
            model.session().sectionLine().set(Optional.of(line));
            return true;
        } catch (Refusal refusal) {
            model.refuse(refusal.getMessage());
            return false;
        }
    }

    List<Place> places() {
        return stroke.places();
    }

    Optional<Place> pointer() {
        return pointer;
    }
}
