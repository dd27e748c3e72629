package org.seepledger.desktop.draw;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.desktop.session.Drafting;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.session.Transects;
import org.seepledger.desktop.words.Words;
import org.seepledger.sketch.ControlLine;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.History;
import org.seepledger.sketch.Limit;
import org.seepledger.sketch.Place;
import org.seepledger.sketch.Refusal;
import org.seepledger.sketch.Shape;

/** The drawing of prisms with all its steps; each change is told to the session. */
public final class DraftModel implements Drafting {

    private final Session session;
    private final ObjectProperty<Tool> tool = new SimpleObjectProperty<>(Tool.SELECT);
    private final ReadOnlyLongWrapper version = new ReadOnlyLongWrapper();
    private final ReadOnlyStringWrapper refusal = new ReadOnlyStringWrapper("");
    private final Solids solids = new Solids();
    private History history = new History(Drawing.EMPTY);
    private Drawing saved = Drawing.EMPTY;

    /**
     * Makes the model.
     *
     * @param session is told of each change
     */
    public DraftModel(Session session) {
        this.session = session;
        session.transectName().addListener((name, before, after) -> after.ifPresent(this::rename));
        session.demand().addListener((demand, before, after) -> {
            if (after == Session.Demand.DRAW_PRISM || after == Session.Demand.DRAW_SECTION) {
                session.demand().set(Session.Demand.NONE);
                choose(after == Session.Demand.DRAW_PRISM ? Tool.POLYGON : Tool.SECTION);
            } else if (after == Session.Demand.DRAW_TRANSECT) {
                session.demand().set(Session.Demand.NONE);
                choose(Tool.TRANSECT);
            }
        });
    }

    /**
     * Begins anew.
     *
     * @param kept the drawing as its file has it
     * @param current the drawing as it is now; another one where work was restored, which can be undone
     * @param known the surfaces that shapes name
     */
    public void begin(Drawing kept, Drawing current, Map<Limit.Surface, GriddedValues> known) {
        solids.begin(known);
        saved = kept;
        history = new History(kept);
        tool.set(Tool.SELECT);
        if (!current.equals(kept)) {
            history.step(Words.of("step.restore"), current);
        }
        current.shapes().stream()
                .findFirst()
                .ifPresent(shape -> session.selected().set(shape.name()));
        publish(true);
    }

    /** {@return what makes prisms of what is drawn} */
    Solids solids() {
        return solids;
    }

    private void publish(boolean settled) {
        List<Layer> layers =
                session.set().get().map(set -> set.aquifer().layers()).orElse(List.of());
        session.drawing()
                .set(new org.seepledger.desktop.session.Drawing(
                        session.drawing().get().revision() + 1, solids.of(history.current(), layers), settled));
        publishLines(settled);
        tellShapes();
        if (history.current().find(session.selected().get()).isEmpty()) {
            session.selected().set("");
        }
        version.set(version.get() + 1);
    }

    private void publishLines(boolean settled) {
        session.transects().set(new Transects(drawing().lines(), settled));
        if (selectedLine().isEmpty()) {
            session.transect()
                    .set(drawing().lines().stream()
                            .map(ControlLine::name)
                            .findFirst()
                            .orElse(""));
        }
    }

    private void rename(String name) {
        session.transectName().set(Optional.empty());
        selectedLine().filter(line -> !line.name().equals(name)).ifPresent(line -> {
            if (step("step.transect.name", drawing -> drawing.editLine(line.name(), given -> given.named(name)))) {
                session.transect().set(name);
            }
        });
    }

    /** {@return the transect that is chosen, if there is one} */
    Optional<ControlLine> selectedLine() {
        return drawing().line(session.transect().get());
    }

    private void tellShapes() {
        session.shapes().set(new DrawnShapes(history.settled(), !isUnsaved()));
    }

    @Override
    public boolean step(String name, UnaryOperator<Drawing> change) {
        return tried(() -> {
            history.step(Words.of(name), change.apply(history.current()));
            publish(true);
        });
    }

    @Override
    public void beginGesture(String name) {
        history.begin(Words.of(name));
    }

    @Override
    public void preview(UnaryOperator<Drawing> change) {
        tried(() -> {
            history.preview(change.apply(history.settled()));
            publish(false);
        });
    }

    @Override
    public void commitGesture() {
        history.commit();
        publish(true);
    }

    @Override
    public void cancelGesture() {
        history.cancel();
        publish(true);
    }

    @Override
    public boolean isGesturing() {
        return history.isGesturing();
    }

    private boolean tried(Runnable edit) {
        try {
            edit.run();
            refusal.set("");
            return true;
        } catch (Refusal refused) {
            refuse(refused.getMessage());
            return false;
        }
    }

    /** Tells why something is refused, in the status line and beside what it is about. */
    void refuse(String why) {
        refusal.set(why);
        session.status().set(why);
    }

    /** {@return why the last step was refused; empty if it was taken} */
    ReadOnlyStringProperty refusal() {
        return refusal.getReadOnlyProperty();
    }

    /** Something new is begun. */
    void forgetRefusal() {
        refusal.set("");
    }

    /** Undoes a step. */
    public void undo() {
        history.undoable().ifPresent(name -> {
            history.undo();
            session.status().set(Words.of("undone", name));
            publish(true);
        });
    }

    /** Does a step again. */
    public void redo() {
        history.redoable().ifPresent(name -> {
            history.redo();
            session.status().set(Words.of("redone", name));
            publish(true);
        });
    }

    /** {@return the name of the step that can be undone} */
    public Optional<String> undoable() {
        return history.undoable();
    }

    /** {@return the name of the step that can be done again} */
    public Optional<String> redoable() {
        return history.redoable();
    }

    /**
     * Selects the next prism in their order, or the one before.
     *
     * @param by 1 or -1
     */
    public void selectNext(int by) {
        List<Shape> shapes = drawing().shapes();
        if (!shapes.isEmpty()) {
            int place = selected().map(shapes::indexOf).orElse(by > 0 ? -1 : 0);
            session.lit().set("");
            session.selected()
                    .set(shapes.get(Math.floorMod(place + by, shapes.size())).name());
        }
    }

    /** {@return the drawing as it is shown} */
    public Drawing drawing() {
        return history.current();
    }

    Drawing settled() {
        return history.settled();
    }

    @Override
    public Optional<Shape> selected() {
        return history.current().find(session.selected().get());
    }

    /**
     * Chooses a tool; one that needs a prism is refused without one.
     *
     * @param chosen the tool
     */
    public void choose(Tool chosen) {
        if (chosen == Tool.TRANSECT && !hasSolutes()) {
            return;
        }
        if (chosen.needsPrism() && selected().isEmpty()) {
            refuse(Words.of("tool.needs"));
            return;
        }
        refusal.set("");
        tool.set(chosen);
        session.status().set(chosen.hint());
    }

    /** {@return the tool in hand} */
    public ObjectProperty<Tool> tool() {
        return tool;
    }

    /** {@return grows with each change that is to be seen} */
    public ReadOnlyLongProperty version() {
        return version.getReadOnlyProperty();
    }

    /** {@return whether something is drawn that the file has not} */
    public boolean isUnsaved() {
        return !history.settled().equals(saved);
    }

    /**
     * A file has the drawing now.
     *
     * @param kept what it has
     */
    public void kept(Drawing kept) {
        saved = kept;
        tellShapes();
        version.set(version.get() + 1);
    }

    /** {@return what the window looks at} */
    public Session session() {
        return session;
    }

    Optional<Grid> grid() {
        return session.set().get().map(set -> set.aquifer().grid());
    }

    /** {@return whether the open set has solutes, so that transects mean something} */
    boolean hasSolutes() {
        return session.set().get().filter(set -> !set.solutes().isEmpty()).isPresent();
    }

    /** The nearest place that a transect can have. */
    Place onGrid(Place place) {
        return grid().map(grid -> ControlLine.within(grid, place)).orElse(place);
    }

    /** How near two places count as one when prisms are cut or joined: far below what can be seen. */
    double near() {
        return grid().map(grid -> 1e-7 * Math.min(grid.x().smallest(), grid.y().smallest()))
                .orElse(0.0);
    }
}
