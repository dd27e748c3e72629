package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.map.Aim;
import org.seepledger.desktop.map.Touch;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Hit;
import org.seepledger.sketch.Nearness;
import org.seepledger.sketch.Outline;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.RingAt;
import org.seepledger.sketch.Shape;
import org.seepledger.sketch.Snapping;

/**
 * Chooses prisms, sides and vertices, and moves them. A drag begins after three pixels; a drag of a side puts a vertex
 * into it; vertices that prisms share move together unless Shift is down.
 */
final class SelectHand {

    private final DraftModel model;
    private final Pick pick;
    private final Snapper snapper;
    private Optional<Hit> pressed = Optional.empty();
    private Optional<Hit> under = Optional.empty();
    private Place begin = new Place(0, 0);
    private Snapping targets;

    SelectHand(DraftModel model, Pick pick, Snapper snapper) {
        this.model = model;
        this.pick = pick;
        this.snapper = snapper;
    }

    /** Vertices and sides of the selected prism come first, since neighbours share them; others show no vertices. */
    private Optional<Hit> at(Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        Nearness near = Nearness.ofPixel(touch.pixel());
        Optional<String> preferred = model.selected().map(Shape::name);
        return model.selected()
                .map(shape -> new Drawing(List.of(shape)))
                .flatMap(own -> Hit.at(own, pointer, near, preferred))
                .filter(hit -> !(hit instanceof Hit.Body))
                .or(() ->
                        Hit.at(model.drawing(), pointer, near, preferred).filter(hit -> !(hit instanceof Hit.Vertex)));
    }

    /** Whether a vertex of the selected prism is there, which comes before transects that cross it. */
    boolean isOnVertex(Touch touch) {
        return at(touch).filter(Hit.Vertex.class::isInstance).isPresent();
    }

    Aim aim() {
        if (under.isEmpty()) {
            return Aim.PAN;
        }
        boolean chosen = model.session().selected().get().equals(under.get().shape());
        return under.get() instanceof Hit.Vertex || under.get() instanceof Hit.Body && chosen ? Aim.MOVE : Aim.CHOOSE;
    }

    void hover(Touch touch) {
        under = at(touch);
    }

    /** A body is chosen by a press and moved by the next one, so that nobody moves a prism who means to drag the map. */
    boolean press(Touch touch) {
        pressed = at(touch);
        under = pressed;
        begin = new Place(touch.x(), touch.y());
        if (pressed.isEmpty()) {
            pick.nothing();
            return false;
        }
        Hit hit = pressed.get();
        boolean before = model.session().selected().get().equals(hit.shape());
        model.session().selected().set(hit.shape());
        if (hit instanceof Hit.Vertex vertex) {
            pick.vertex(vertex);
        } else if (hit instanceof Hit.Side side) {
            pick.side(new Pick.SideAt(side.ring(), side.side()), touch.more() && before);
            light(side);
        } else {
            pick.nothing();
            model.session().lit().set("");
            if (!before) {
                pressed = Optional.empty();
                return false;
            }
        }
        return true;
    }

    private void light(Hit.Side side) {
        Sides.item(model.drawing().shape(side.shape()), side.ring(), side.side())
                .ifPresent(model.session().lit()::set);
    }

    void drag(Touch touch) {
        Place pointer = new Place(touch.x(), touch.y());
        if (pressed.isEmpty()) {
            return;
        }
        if (!model.isGesturing()) {
            if (!Nearness.ofPixel(touch.pixel()).isDrag(begin, pointer)) {
                return;
            }
            beginMoving(pressed.get());
        }
        move(pressed.get(), touch, pointer);
    }

    private void beginMoving(Hit hit) {
        Drawing settled = model.settled();
        if (hit instanceof Hit.Vertex vertex) {
            model.beginGesture("step.vertex");
            targets = Snapping.toOthersThan(settled, vertex.ring(), vertex.vertex(), model.grid());
        } else if (hit instanceof Hit.Side side) {
            model.beginGesture("step.insert");
            targets = Snapping.to(settled, model.grid());
        } else {
            model.beginGesture("step.move");
        }
    }

    private void move(Hit hit, Touch touch, Place pointer) {
        if (hit instanceof Hit.Vertex vertex) {
            Place to = snapper.held(targets, touch);
            Place from = model.settled().outline(vertex.ring()).place(vertex.vertex());
            model.preview(drawing -> touch.more()
                    ? drawing.edit(vertex.ring(), outline -> outline.move(vertex.vertex(), to))
                    : drawing.move(from, to));
        } else if (hit instanceof Hit.Side side) {
            Place to = snapper.held(targets, touch);
            pick.vertex(new Hit.Vertex(side.ring(), side.side() + 1));
            model.preview(drawing -> drawing.edit(side.ring(), outline -> outline.insert(side.side(), to)));
        } else {
            double dx = pointer.x() - begin.x();
            double dy = pointer.y() - begin.y();
            model.preview(drawing -> drawing.edit(hit.shape(), shape -> shape.moved(dx, dy)));
        }
    }

    void release() {
        pressed = Optional.empty();
        snapper.letGo();
        if (model.isGesturing()) {
            model.commitGesture();
        }
    }

    /** A double-click on a side puts a vertex there. */
    void doubleClick(Touch touch) {
        at(touch).filter(Hit.Side.class::isInstance).map(Hit.Side.class::cast).ifPresent(side -> {
            if (model.step(
                    "step.insert",
                    drawing -> drawing.edit(side.ring(), outline -> outline.insert(side.side(), side.place())))) {
                pick.vertex(new Hit.Vertex(side.ring(), side.side() + 1));
            }
        });
    }

    void cancel() {
        pressed = Optional.empty();
        snapper.letGo();
        if (model.isGesturing()) {
            model.cancelGesture();
        }
        pick.nothing();
        model.session().lit().set("");
    }

    /** Deletes the chosen vertex, else the selected prism. */
    void delete() {
        Optional<Hit.Vertex> vertex = pick.vertex();
        if (vertex.isPresent()) {
            RingAt ring = vertex.get().ring();
            if (model.step(
                    "step.delete.vertex",
                    drawing -> drawing.edit(
                            ring, outline -> outline.delete(vertex.get().vertex())))) {
                pick.nothing();
            }
        } else {
            model.selected().ifPresent(shape -> model.step("step.delete", drawing -> drawing.without(shape.name())));
        }
    }

    /** Goes to the next vertex of the selected prism, or the one before. */
    void cycle(int by) {
        model.selected().ifPresent(shape -> {
            RingAt ring = pick.vertex().map(Hit.Vertex::ring).orElse(RingAt.outer(shape.name()));
            Outline outline = model.drawing().outline(ring);
            int next = pick.vertex().map(vertex -> vertex.vertex() + by).orElse(0);
            pick.vertex(new Hit.Vertex(ring, Math.floorMod(next, outline.size())));
        });
    }

    /** Moves the chosen vertex a little; false if none is chosen. */
    boolean nudge(double dx, double dy) {
        Optional<Place> from = vertexPlace();
        from.ifPresent(place -> model.step("step.nudge", drawing -> drawing.move(place, place.moved(dx, dy))));
        return from.isPresent();
    }

    Optional<Place> vertexPlace() {
        return pick.vertex()
                .filter(vertex -> model.drawing().find(vertex.shape()).isPresent())
                .map(vertex -> model.drawing().outline(vertex.ring()).place(vertex.vertex()));
    }
}
