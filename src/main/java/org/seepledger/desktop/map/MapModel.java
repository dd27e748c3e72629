package org.seepledger.desktop.map;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Session;
import org.seepledger.desktop.task.EntryGuard;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.words.FaultWords;
import org.seepledger.desktop.words.Words;
import org.seepledger.report.CellPlace;

/** What the map shows: which part of it, which values, and where the cursor is. */
public final class MapModel {

    private static final double MARGIN = 36;

    /** How many pixels a cell has at least after the map went to it. */
    private static final double CELL_SEEN = 24;

    private static final double FARTHEST = 0.25;
    private static final double NEAREST_CELL = 600;
    private static final double STEP = 1.25;

    /** How near the cursor is to a well under it, in logical pixels. */
    private static final double WELL = 8;

    private final Session session;
    private final Overlays overlays = new Overlays();
    private final ObjectProperty<Camera> camera = new SimpleObjectProperty<>(new Camera(0, 0, 0, 0, 1));
    private final ReadOnlyObjectWrapper<Optional<Readout>> readout = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final Lane lookingForWells;
    private final ReadOnlyStringWrapper well = new ReadOnlyStringWrapper("");
    private final ValuesModel values;
    private final FluxModel flux;
    private final ContourModel contours;
    private boolean framed;

    /**
     * Makes the model.
     *
     * @param session what the window looks at
     * @param tasks reads values
     */
    public MapModel(Session session, Tasks tasks) {
        this.session = session;
        this.values = new ValuesModel(session, tasks);
        this.contours = new ContourModel(values, overlays, tasks);
        this.flux = new FluxModel(session, this, tasks);
        this.lookingForWells = tasks.latest("task.wells");
        session.set().addListener((set, before, after) -> {
            framed = false;
            frame();
            findWells();
        });
        session.interval().addListener((interval, before, after) -> findWells());
        session.target().addListener((target, before, after) -> after.ifPresent(this::goTo));
        new MapOffer(session, this).begin();
    }

    /** Puts a cell into the middle, near enough to be seen among its neighbours. */
    private void goTo(CellPlace place) {
        Camera seen = camera.get();
        double nearer = grid().map(grid ->
                        CELL_SEEN / Math.min(grid.x().smallest(), grid.y().smallest()))
                .orElse(seen.scale());
        double scale = limits().within(Math.max(seen.scale(), nearer));
        camera.set(new Camera(seen.width(), seen.height(), place.x(), place.y(), scale));
        session.target().set(Optional.empty());
    }

    private void findWells() {
        int interval = session.interval().get();
        lookingForWells.cancel();
        session.set()
                .get()
                .ifPresentOrElse(
                        set -> lookingForWells.run(
                                progress -> {
                                    EntryGuard.enter();
                                    return set.workbench().views().wells(interval);
                                },
                                session.wells()::set,
                                fault -> session.notices().refuse(FaultWords.of(fault))),
                        () -> session.wells().set(List.of()));
    }

    /**
     * The view has another size.
     *
     * @param width in logical pixels
     * @param height in logical pixels
     */
    public void resize(double width, double height) {
        camera.set(camera.get().resized(width, height));
        frame();
    }

    /** Shows all once a set and a size are there. */
    private void frame() {
        if (!framed && camera.get().width() > 1 && session.set().get().isPresent()) {
            framed = true;
            showAll();
        }
    }

    private Optional<Grid> grid() {
        return session.set().get().map(OpenSet::aquifer).map(aquifer -> aquifer.grid());
    }

    private Camera.Limits limits() {
        return grid().map(grid -> {
                    Extent all = Extent.of(grid);
                    double size = Math.min(grid.x().smallest(), grid.y().smallest());
                    double whole = Math.min(
                            camera.get().width() / all.width(), camera.get().height() / all.height());
                    return new Camera.Limits(FARTHEST * whole, Math.max(whole, NEAREST_CELL / size));
                })
                .orElse(new Camera.Limits(1e-12, 1e12));
    }

    /** Shows the whole grid. */
    public void showAll() {
        grid().ifPresent(grid -> camera.set(camera.get().showing(Extent.of(grid), MARGIN, limits())));
    }

    /** Shows the selected prism. */
    public void showPrism() {
        session.selectedPrism()
                .ifPresent(prism -> camera.set(camera.get().showing(Extent.of(prism), 2 * MARGIN, limits())));
    }

    /**
     * Goes nearer or farther; what lies under the cursor stays there.
     *
     * @param x the cursor's place
     * @param y the cursor's place
     * @param factor how much larger things become
     */
    public void zoom(double x, double y, double factor) {
        camera.set(camera.get().zoomedAbout(x, y, factor, limits()));
    }

    /**
     * Goes nearer or farther about the middle.
     *
     * @param steps nearer if positive
     */
    public void step(int steps) {
        zoom(camera.get().width() / 2, camera.get().height() / 2, Math.pow(STEP, steps));
    }

    /**
     * Moves the map.
     *
     * @param x by how many pixels to the right
     * @param y by how many pixels down
     */
    public void drag(double x, double y) {
        camera.set(camera.get().dragged(x, y));
    }

    /**
     * The cursor is somewhere.
     *
     * @param x its place
     * @param y its place
     */
    public void point(double x, double y) {
        Camera seen = camera.get();
        well.set(wellAt(x, y));
        session.along().set(SectionTrace.along(session.sectionLine().get(), seen, x, y));
        readout.set(session.set()
                .get()
                .map(set -> Readout.at(
                        set.aquifer(),
                        seen.mapX(x),
                        seen.mapY(y),
                        session.layer().get(),
                        values.view().get(),
                        session.numbers().get())));
    }

    private String wellAt(double x, double y) {
        Camera seen = camera.get();
        return session.wells().get().stream()
                .filter(well -> Math.hypot(seen.x(well.x()) - x, seen.y(well.y()) - y) <= WELL)
                .min(Comparator.comparingDouble(well -> Math.hypot(seen.x(well.x()) - x, seen.y(well.y()) - y)))
                .map(well -> Words.of("map.well", well.name(), well.category()))
                .orElse("");
    }

    /** {@return the well under the cursor, its name in full; empty where there is none} */
    public ReadOnlyStringProperty well() {
        return well.getReadOnlyProperty();
    }

    /** The cursor has left. */
    public void leave() {
        well.set("");
        readout.set(Optional.empty());
        session.along().set(OptionalDouble.empty());
    }

    /** {@return what the window looks at} */
    public Session session() {
        return session;
    }

    /** {@return what is drawn over the values} */
    public Overlays overlays() {
        return overlays;
    }

    /** {@return the values laid over the map} */
    public ValuesModel values() {
        return values;
    }

    /** {@return which part of the map is seen} */
    public ObjectProperty<Camera> camera() {
        return camera;
    }

    FluxModel flux() {
        return flux;
    }

    ContourModel contours() {
        return contours;
    }

    /** {@return where the cursor is, if it is on the map} */
    public ReadOnlyObjectProperty<Optional<Readout>> readout() {
        return readout.getReadOnlyProperty();
    }
}
