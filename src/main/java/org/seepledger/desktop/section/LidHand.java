package org.seepledger.desktop.section;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.OptionalInt;
import org.seepledger.desktop.session.Drafting;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Body;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.sketch.Lid;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Reach;
import org.seepledger.sketch.Shape;

/**
 * Moves top and bottom of the selected prism: dragged, nudged or typed. The lid that is lit up is the one in hand.
 *
 * <p>Dragged, a lid is held by the surfaces of layers from 8 pixels on and let go at 12; free, it takes round elevations
 * less than a pixel apart. One drag is one step.
 */
final class LidHand {

    /** Where along a body the handles are, so that they keep clear of the flow in its middle. */
    static final double HANDLE = 0.25;

    private static final double DRAG = 3;

    private final Session session;
    private final SectionModel model;
    private final Drafting drafting;
    private Optional<Grip> grip = Optional.empty();
    private OptionalInt held = OptionalInt.empty();

    /** A lid that is pressed: by how much the pointer is below it, and where it was pressed. */
    private record Grip(Lid lid, double below, double x, double y) {}

    LidHand(SectionModel model, Drafting drafting) {
        this.session = model.session();
        this.model = model;
        this.drafting = drafting;
    }

    private int layers() {
        return session.set().get().map(set -> set.aquifer().layers().size()).orElse(1);
    }

    private Optional<Body> body() {
        return model.section().get().flatMap(Section::body);
    }

    private Optional<LidHits> hits() {
        return model.section().get().flatMap(section -> model.frame().get().map(frame -> new LidHits(section, frame)));
    }

    /** The lid of the selected prism at a place, if one is near. */
    Optional<Lid> at(double x, double y) {
        return hits().flatMap(hits -> hits.lidAt(x, y));
    }

    /** Takes hold of a lid, or chooses the prism there; false if there is no lid. */
    boolean press(double x, double y) {
        Optional<Lid> lid = at(x, y);
        if (lid.isPresent()) {
            grip = Optional.of(new Grip(lid.get(), hits().orElseThrow().below(lid.get(), x, y), x, y));
            session.lit().set(lid.get().item());
            return true;
        }
        hits().flatMap(hits -> hits.bodyAt(x, y)).ifPresent(body -> {
            session.selected().set(body.name());
            session.lit().set("");
        });
        return false;
    }

    /** Whether a lid is pressed or dragged. */
    boolean isHolding() {
        return grip.isPresent();
    }

    /** The lid that is being dragged. */
    Optional<Lid> moving() {
        return grip.filter(pressed -> drafting.isGesturing()).map(Grip::lid);
    }

    /** Whether what is dragged is held by a layer's surface. */
    boolean isHeld() {
        return held.isPresent();
    }

    void drag(double x, double y, boolean free) {
        Optional<SectionFrame> frame = model.frame().get();
        Optional<Shape> shape = drafting.selected();
        if (grip.isEmpty() || frame.isEmpty() || shape.isEmpty()) {
            return;
        }
        Grip pressed = grip.get();
        if (!drafting.isGesturing()) {
            if (Math.hypot(x - pressed.x, y - pressed.y) <= DRAG) {
                return;
            }
            drafting.beginGesture("step.lid." + pressed.lid.item());
        }
        Limit to = limit(pressed.lid, shape.get().reach(), frame.get(), x, y - pressed.below, free);
        String name = shape.get().name();
        drafting.preview(drawing ->
                drawing.edit(name, edited -> edited.reaching(pressed.lid.moved(edited.reach(), to, layers()))));
    }

    private Limit limit(Lid lid, Reach reach, SectionFrame frame, double x, double y, boolean free) {
        Optional<Profile.Column> column = model.section()
                .get()
                .flatMap(section -> section.profile().at(frame.along(x)))
                .map(Profile.Stretch::column);
        LidSnapping snapping = new LidSnapping(lid, reach, layers(), frame);
        held = free
                ? OptionalInt.empty()
                : column.map(found -> snapping.at(found, y, held)).orElse(held);
        if (held.isPresent()) {
            return new Limit.Layer(held.getAsInt());
        }
        double step = step(frame);
        double elevation = rounded(frame.elevation(y), step);
        Limit other = (lid == Lid.TOP ? Lid.BOTTOM : Lid.TOP).in(reach, layers());
        if (other instanceof Limit.Elevation fixed) {
            elevation = lid == Lid.TOP
                    ? Math.max(elevation, rounded(fixed.height() + step, step))
                    : Math.min(elevation, rounded(fixed.height() - step, step));
        }
        return new Limit.Elevation(elevation);
    }

    /** A power of ten not above the height of a pixel. */
    static double step(SectionFrame frame) {
        return Math.pow(10, Math.floor(Math.log10(frame.pixel())));
    }

    /** The multiple of a power of ten that is nearest to an elevation, as a person would write it. */
    static double rounded(double elevation, double step) {
        int decimals = (int) -Math.round(Math.log10(step));
        return BigDecimal.valueOf(elevation)
                .setScale(decimals, RoundingMode.HALF_EVEN)
                .doubleValue();
    }

    void release() {
        boolean gesture = moving().isPresent();
        letGo();
        if (gesture) {
            drafting.commitGesture();
        }
    }

    /** Everything is again as it was, to the last bit. */
    void cancel() {
        boolean gesture = moving().isPresent();
        letGo();
        if (gesture) {
            drafting.cancelGesture();
        }
    }

    private void letGo() {
        grip = Optional.empty();
        held = OptionalInt.empty();
    }

    /** The lid that is lit up, if it is one. */
    Optional<Lid> chosen() {
        return Lid.of(session.lit().get()).filter(lid -> drafting.selected().isPresent());
    }

    /** Chooses the top; if it is chosen already, the bottom, and so on in turn. */
    void chooseNext() {
        if (drafting.selected().isEmpty()) {
            session.status().set(Words.of("section.lid.needs"));
            return;
        }
        session.lit().set((chosen().equals(Optional.of(Lid.TOP)) ? Lid.BOTTOM : Lid.TOP).item());
    }

    /**
     * Moves the chosen lid a little.
     *
     * @param steps upwards, each less than a pixel high
     * @return false if none is chosen
     */
    boolean nudge(int steps) {
        Optional<SectionFrame> frame = model.frame().get();
        if (chosen().isEmpty() || frame.isEmpty() || body().isEmpty()) {
            return false;
        }
        Lid lid = chosen().get();
        double step = step(frame.get());
        Limit now = lid.in(drafting.selected().orElseThrow().reach(), layers());
        double height = now instanceof Limit.Elevation elevation
                ? elevation.height()
                : body().get()
                        .spot(frame.get(), HANDLE)
                        .map(spot -> LidHits.height(spot.slab(), lid))
                        .orElse(Double.NaN);
        if (Double.isNaN(height)) {
            return false;
        }
        move(lid, new Limit.Elevation(rounded(height + steps * step, step)));
        return true;
    }

    private boolean move(Lid lid, Limit to) {
        return drafting.selected()
                .map(shape -> drafting.step(
                        "step.lid." + lid.item(),
                        drawing -> drawing.edit(
                                shape.name(), edited -> edited.reaching(lid.moved(edited.reach(), to, layers())))))
                .orElse(false);
    }

    /**
     * Takes what was typed for a lid.
     *
     * @param text an elevation, or {@code layer 2}; nothing for the grid's own
     * @return whether it was taken; else the status line says why not
     */
    boolean type(Lid lid, String text) {
        Optional<Limit> typed =
                text.isBlank() ? Optional.of(new Limit.Layer(lid == Lid.TOP ? 0 : layers() - 1)) : Lid.typed(text);
        if (typed.isEmpty()) {
            session.status().set(Words.of("section.lid.form"));
        }
        return typed.isPresent() && move(lid, typed.get());
    }

    /** Where a lid of the selected prism lies, as it is typed; nothing without one. */
    String text(Lid lid) {
        return drafting.selected()
                .map(shape -> Lid.text(lid.in(shape.reach(), layers())))
                .orElse("");
    }
}
