package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.map.Aim;
import org.seepledger.desktop.map.Camera;
import org.seepledger.desktop.map.Hand;
import org.seepledger.desktop.map.Touch;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Mark;
import org.seepledger.sketch.Hit;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Shape;

/** Works on the map with the tool in hand. */
public final class DraftHand implements Hand {

    private final DraftModel model;
    private final Pick pick = new Pick();
    private final Snapper snapper = new Snapper();
    private final SelectHand select;
    private final StrokeHand stroke;
    private final SpanHand span;
    private final LineHand line;
    private Optional<Touch> last = Optional.empty();

    /**
     * Makes the hand.
     *
     * @param model the drawing
     */
    public DraftHand(DraftModel model) {
        this.model = model;
        this.select = new SelectHand(model, pick, snapper);
        this.stroke = new StrokeHand(model, snapper);
        this.span = new SpanHand(model, snapper);
        this.line = new LineHand(model, snapper);
        model.tool().addListener((tool, before, after) -> {
            stroke.cancel();
            span.cancel();
        });
        model.session().set().addListener((set, before, after) -> pick.nothing());
    }

    private Tool tool() {
        return model.tool().get();
    }

    private boolean isSpan() {
        return tool() == Tool.RECTANGLE || tool() == Tool.CIRCLE;
    }

    private boolean isStroke() {
        return tool() == Tool.POLYGON
                || tool() == Tool.ISLAND
                || tool() == Tool.SPLIT
                || tool() == Tool.SECTION
                || tool() == Tool.TRANSECT;
    }

    @Override
    public boolean press(Touch touch) {
        begin(touch);
        if (tool() == Tool.SELECT) {
            line.letGo();
            return !select.isOnVertex(touch) && line.press(touch) || select.press(touch);
        }
        if (tool() == Tool.MERGE) {
            merge(touch);
        } else if (isSpan()) {
            span.press(touch);
        } else {
            stroke.press(touch);
        }
        return true;
    }

    private void begin(Touch touch) {
        model.forgetRefusal();
        last = Optional.of(touch);
    }

    private void merge(Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        Optional<String> other = Hit.at(model.drawing(), pointer, Nearness.ofPixel(touch.pixel()), Optional.empty())
                .map(Hit::shape);
        Optional<String> one = model.selected().map(Shape::name);
        if (other.isEmpty() || other.equals(one)) {
            model.refuse(Words.of("merge.other"));
            return;
        }
        if (model.step("step.merge", drawing -> drawing.merge(one.orElseThrow(), other.get(), model.near()))) {
            model.choose(Tool.SELECT);
        }
    }

    @Override
    public void drag(Touch touch) {
        last = Optional.of(touch);
        if (line.isHeld()) {
            line.drag(touch);
        } else if (tool() == Tool.SELECT) {
            select.drag(touch);
        } else if (isSpan()) {
            span.drag(touch);
        } else {
            stroke.hover(touch);
        }
    }

    @Override
    public void release(Touch touch) {
        if (line.isHeld()) {
            line.release();
        } else if (tool() == Tool.SELECT) {
            select.release();
        } else if (isSpan()) {
            span.release(touch);
        }
    }

    @Override
    public void hover(Touch touch) {
        if (tool() == Tool.SELECT) {
            select.hover(touch);
            line.hover(touch);
        } else if (isSpan()) {
            span.hover(touch);
        } else if (isStroke()) {
            stroke.hover(touch);
        }
    }

    @Override
    public void doubleClick(Touch touch) {
        begin(touch);
        if (tool() == Tool.SELECT) {
            select.doubleClick(touch);
        } else if (isStroke()) {
            stroke.finish();
        }
    }

    @Override
    public Aim aim() {
        return switch (tool()) {
            case SELECT -> line.isOver() ? Aim.MOVE : select.aim();
            case MERGE -> Aim.CHOOSE;
            default -> Aim.DRAW;
        };
    }

    @Override
    public List<Mark> marks(Camera camera) {
        DraftMarks marks = new DraftMarks(camera);
        marks.lines(model.drawing().lines(), model.session().transect().get(), line.vertex());
        model.selected().ifPresent(shape -> marks.shape(shape, pick));
        boolean closes = tool() == Tool.POLYGON || tool() == Tool.ISLAND;
        if (isStroke()) {
            marks.stroke(stroke.places(), stroke.pointer(), closes);
        }
        if (isSpan()) {
            marks.stroke(span.places(), Optional.empty(), true);
        }
        snapper.snap().ifPresent(marks::snap);
        last.ifPresent(touch -> marks.refusal(model.refusal().get(), new Place(touch.x(), touch.y())));
        return marks.list();
    }

    /** Ends what is being drawn. */
    public void finish() {
        if (isStroke()) {
            stroke.finish();
        }
    }

    /** Takes the last place back while one draws; else deletes the chosen vertex or the selected prism. */
    public void delete() {
        if (isStroke()) {
            stroke.back();
        } else if (tool() == Tool.SELECT && !line.delete()) {
            select.delete();
        }
    }

    /** Gives up what is going on: everything is again as it was, to the last bit. */
    public void cancel() {
        if (tool() == Tool.SELECT) {
            line.cancel();
            select.cancel();
        } else {
            model.choose(Tool.SELECT);
        }
    }

    /**
     * Goes to the next vertex of the selected prism, or the one before.
     *
     * @param by 1 or -1
     */
    public void cycle(int by) {
        select.cycle(by);
    }

    /**
     * Moves the chosen vertex.
     *
     * @param dx in plan units
     * @param dy in plan units
     * @return false if none is chosen
     */
    public boolean nudge(double dx, double dy) {
        return tool() == Tool.SELECT && (line.nudge(dx, dy) || select.nudge(dx, dy));
    }

    /**
     * Takes what was typed: coordinates of the next or the chosen vertex, or a circle's radius.
     *
     * @param text what was typed
     * @return whether it was taken; else the status line says why not
     */
    public boolean type(String text) {
        last = Optional.empty();
        try {
            return tool() == Tool.CIRCLE ? radius(text) : place(Place.typed(text));
        } catch (Refusal refusal) {
            model.refuse(refusal.getMessage());
            return false;
        }
    }

    private boolean radius(String text) {
        double radius;
        try {
            radius = Double.parseDouble(text.strip());
        } catch (NumberFormatException e) {
            throw new Refusal(Words.of("radius.number"));
        }
        if (!span.radius(radius)) {
            throw new Refusal(Words.of("radius.centre"));
        }
        return true;
    }

    private boolean place(Place place) {
        boolean ofTransect = tool() == Tool.TRANSECT || line.vertex().isPresent();
        if (ofTransect && !model.onGrid(place).equals(place)) {
            throw new Refusal(Words.of("transect.off"));
        }
        if (isStroke()) {
            stroke.add(place);
            return true;
        }
        if (line.put(place)) {
            return true;
        }
        Place from = select.vertexPlace().orElseThrow(() -> new Refusal(Words.of("type.vertex")));
        return model.step("step.vertex", drawing -> drawing.move(from, place));
    }

    /**
     * Puts the chosen sides under a boundary.
     *
     * @param name its name; empty to let them count under their own
     */
    public void nameBoundary(String name) {
        last = Optional.empty();
        if (pick.sides().isEmpty()) {
            model.refuse(Words.of("boundary.sides"));
            return;
        }
        Optional<String> boundary = Optional.of(name.strip()).filter(given -> !given.isEmpty());
        model.step("step.boundary", before -> {
            var drawing = before;
            for (Pick.SideAt side : pick.sides()) {
                drawing = drawing.edit(side.ring(), outline -> outline.under(List.of(side.side()), boundary));
            }
            return drawing;
        });
    }
}
