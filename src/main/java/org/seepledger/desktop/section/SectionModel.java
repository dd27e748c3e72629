package org.seepledger.desktop.section;

import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.session.Drafting;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.PaneState;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.Words;
import org.seepledger.picture.Box;
import org.seepledger.picture.Profile;
import org.seepledger.picture.Section;
import org.seepledger.picture.SectionFrame;
import org.seepledger.picture.SectionLine;
import org.seepledger.picture.SectionPicture;
import org.seepledger.prism.Prism;

/** The section: which part of it is seen, and what is under the cursor. */
public final class SectionModel {

    private static final double STEP = 1.25;

    /** Nearer than this, rounding would show. */
    private static final double NEAREST = 1e-6;

    private static final double FARTHEST = 8;

    /** How much one turn of a wheel may do. */
    private static final double MOST_AT_ONCE = 10;

    private static final double LEAST_TIMES = 0.01;
    private static final double MOST_TIMES = 10_000;

    private final Session session;
    private final SectionFeed feed;
    private final ReadOnlyObjectWrapper<Optional<SectionFrame>> frame = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyStringWrapper readout = new ReadOnlyStringWrapper("");
    private final LidHand lids;
    private double width;
    private double height;
    private boolean fitted = true;

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks where work is done
     * @param drafting how prisms are changed
     */
    public SectionModel(Session session, Tasks tasks, Drafting drafting) {
        this.session = session;
        this.lids = new LidHand(this, drafting);
        session.sectionLine().addListener((line, before, after) -> fitted = true);
        session.section().addListener((section, before, after) -> reframe());
        session.along().addListener((along, before, after) -> point(after));
        this.feed = new SectionFeed(session, tasks);
    }

    /** {@return what the window looks at} */
    public Session session() {
        return session;
    }

    /** {@return which state the pane is in} */
    public ReadOnlyObjectProperty<PaneState> state() {
        return feed.state();
    }

    /** {@return what moves the selected prism's top and bottom} */
    LidHand lids() {
        return lids;
    }

    /** {@return the section, if there is one} */
    ReadOnlyObjectProperty<Optional<Section>> section() {
        return session.section();
    }

    /** {@return which part of the section is seen, and where it comes to} */
    public ReadOnlyObjectProperty<Optional<SectionFrame>> frame() {
        return frame.getReadOnlyProperty();
    }

    /** {@return what is under the cursor, in words} */
    ReadOnlyStringProperty readout() {
        return readout.getReadOnlyProperty();
    }

    /** {@return how far from the line wells are shown, in length units; empty for what suits the line} */
    ObjectProperty<OptionalDouble> within() {
        return feed.within();
    }

    /** Asks the map to begin the line. */
    void draw() {
        session.demand().set(Session.Demand.DRAW_SECTION);
    }

    /** Lays the line through the selected prism, along its longer side. */
    void alongPrism() {
        Optional<Grid> grid = session.set().get().map(OpenSet::aquifer).map(aquifer -> aquifer.grid());
        Optional<Prism> prism = session.selectedPrism();
        if (grid.isEmpty() || prism.isEmpty()) {
            session.status().set(Words.of("section.needs"));
            return;
        }
        session.sectionLine().set(Optional.of(SectionLine.through(prism.get(), grid.get())));
    }

    /** Takes the line away. */
    void clear() {
        session.sectionLine().set(Optional.empty());
    }

    /** Lets the line lead the other way. */
    void turn() {
        session.sectionLine().set(session.sectionLine().get().map(SectionLine::turned));
    }

    /** The picture has another size. */
    void resize(double newWidth, double newHeight) {
        width = newWidth;
        height = newHeight;
        reframe();
    }

    private void reframe() {
        frame.set(session.section()
                .get()
                .filter(section -> width > 1 && height > 1)
                .map(this::framed));
    }

    private SectionFrame framed(Section section) {
        Box box = SectionPicture.box(section, width, height);
        return frame.get()
                .filter(seen -> !fitted)
                .map(seen -> seen.box().equals(box) ? seen : seen.in(box))
                .orElseGet(() -> SectionFrame.fitting(section.profile(), box));
    }

    /** Shows all of the section. */
    void fit() {
        fitted = true;
        reframe();
    }

    private void look(SectionFrame next) {
        SectionFrame seen = frame.get().orElseThrow();
        double length = session.section().get().orElseThrow().profile().length();
        double across = next.to() - next.from();
        double up = next.highest() - next.lowest();
        boolean tooFar = across > FARTHEST * length && across > seen.to() - seen.from();
        boolean tooNear = across < NEAREST * length && across < seen.to() - seen.from()
                || up < NEAREST * Math.max(1, Math.abs(next.highest())) && up < seen.highest() - seen.lowest();
        if (!tooFar && !tooNear) {
            fitted = false;
            frame.set(Optional.of(next));
        }
    }

    /**
     * Goes nearer or farther; what lies under the cursor stays there.
     *
     * @param x the cursor's place
     * @param y the cursor's place
     * @param across how much larger distances become
     * @param up how much larger heights become
     */
    void zoom(double x, double y, double across, double up) {
        frame.get().ifPresent(seen -> look(seen.zoomed(x, y, atOnce(across), atOnce(up))));
    }

    private static double atOnce(double factor) {
        return Math.max(1 / MOST_AT_ONCE, Math.min(MOST_AT_ONCE, factor));
    }

    /** Goes nearer or farther about the middle, by steps. */
    void step(int across, int up) {
        frame.get()
                .ifPresent(seen ->
                        zoom(seen.box().middleX(), seen.box().middleY(), Math.pow(STEP, across), Math.pow(STEP, up)));
    }

    /** Moves what is seen by pixels to the right and down. */
    void drag(double x, double y) {
        frame.get().ifPresent(seen -> look(seen.dragged(x, y)));
    }

    /**
     * Takes a typed exaggeration.
     *
     * @param text how many times heights are exaggerated; nothing to show all of the section again
     * @return whether it was taken; else the status line says why not
     */
    boolean exaggerate(String text) {
        if (text.isBlank()) {
            fit();
            return true;
        }
        double times = number(text);
        if (!(times >= LEAST_TIMES && times <= MOST_TIMES)) {
            session.status().set(Words.of("section.times.refused"));
            return false;
        }
        frame.get().ifPresent(seen -> look(seen.exaggerated(times)));
        return true;
    }

    /**
     * Takes a typed distance from the line within which wells are shown.
     *
     * @param text in length units; nothing for what suits the line
     * @return whether it was taken; else the status line says why not
     */
    boolean showWellsWithin(String text) {
        double distance = text.isBlank() ? 0 : number(text);
        if (!(distance >= 0) || !Double.isFinite(distance)) {
            session.status().set(Words.of("section.within.refused"));
            return false;
        }
        within().set(text.isBlank() ? OptionalDouble.empty() : OptionalDouble.of(distance));
        return true;
    }

    /** {@return a typed number; NaN for what is none} */
    static double number(String text) {
        try {
            return Double.parseDouble(text.strip().replace('−', '-').replace(',', '.'));
        } catch (NumberFormatException e) {
            return Double.NaN;
        }
    }

    /** The cursor is somewhere in the picture. */
    void point(double x, double y) {
        Optional<SectionFrame> seen = frame.get().filter(shown -> holds(shown.box(), x, y));
        Optional<Section> section = session.section().get();
        if (seen.isEmpty() || section.isEmpty()) {
            leave();
            return;
        }
        Profile profile = section.get().profile();
        double along = seen.get().along(x);
        boolean onLine = along >= 0 && along <= profile.length();
        session.along().set(onLine ? OptionalDouble.of(along / profile.planUnit()) : OptionalDouble.empty());
        readout.set(Readout.of(
                section.get(), session.draped().get(), along, seen.get().elevation(y)));
    }

    /** The map points to a place on the line. */
    private void point(OptionalDouble along) {
        String text = "";
        if (along.isPresent() && session.section().get().isPresent()) {
            Section section = session.section().get().get();
            text = Readout.of(section, along.getAsDouble() * section.profile().planUnit());
        }
        readout.set(text);
    }

    private static boolean holds(Box box, double x, double y) {
        return x >= box.x() && x <= box.right() && y >= box.y() && y <= box.bottom();
    }

    /** The cursor has left. */
    void leave() {
        session.along().set(OptionalDouble.empty());
        readout.set("");
    }
}
