package org.seepledger.desktop.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.task.Lane;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.picture.Contours;
import org.seepledger.picture.Drape;
import org.seepledger.picture.RoundValues;
import org.seepledger.picture.ValueScale;
import org.seepledger.progress.Progress;

/** Lines of equal value of what lies over the map, at round values. */
final class ContourModel {

    private static final int MOST_LEVELS = 12;
    private static final int MOST_CELLS = 500;

    private final ValuesModel values;
    private final Overlays overlays;
    private final Lane drawing;
    private final ReadOnlyObjectWrapper<List<Contour>> lines = new ReadOnlyObjectWrapper<>(List.of());

    /**
     * The lines of one value.
     *
     * @param label the value as it is written
     * @param lines map x and y in turn
     */
    record Contour(String label, List<double[]> lines) {}

    ContourModel(ValuesModel values, Overlays overlays, Tasks tasks) {
        this.values = values;
        this.overlays = overlays;
        this.drawing = tasks.latest("task.contours");
        values.view().addListener((view, before, after) -> refresh());
        values.scale().addListener((scale, before, after) -> refresh());
        overlays.contours().addListener((wanted, before, after) -> refresh());
    }

    private void refresh() {
        drawing.cancel();
        Optional<LayerView> view = values.view().get();
        Optional<ValueScale> scale = values.scale().get();
        if (view.isEmpty() || scale.isEmpty() || !overlays.contours().get()) {
            lines.set(List.of());
            return;
        }
        Pyramid pyramid = view.get().pyramid();
        RoundValues levels = scale.get().ticks(MOST_LEVELS);
        drawing.run(progress -> draw(pyramid, levels, progress), lines::set, fault -> lines.set(List.of()));
    }

    private static List<Contour> draw(Pyramid pyramid, RoundValues levels, Progress progress) {
        if (pyramid.isFlat()) {
            return List.of();
        }
        Grid grid = pyramid.lattice().grid();
        Drape drape = Drape.of(grid, grid.window(), MOST_CELLS, pyramid::cells);
        List<Contour> drawn = new ArrayList<>();
        for (int level = 0; level < levels.count(); level++) {
            progress.step();
            drawn.add(new Contour(
                    levels.label(level), Contours.at(drape, levels.values().get(level))));
        }
        return drawn;
    }

    ReadOnlyObjectProperty<List<Contour>> lines() {
        return lines.getReadOnlyProperty();
    }
}
