package org.seepledger.job;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.Window;
import org.seepledger.io.table.StepKind;
import org.seepledger.unit.Figures;

/**
 * Doubts whether heads and layer surfaces are in one unit and refer to one datum: where the water table lies in a layer,
 * most heads are neither below the lowest bottom, nor above the uppermost top by more than all layers are thick.
 */
final class HeadDoubts {

    private final Aquifer aquifer;
    private final Side below = new Side();
    private final Side above = new Side();
    private long values;

    /** Which head is meant. */
    private record Place(int layer, int step, Window window, int cell) {}

    /** Heads on one side of the stack of layers. */
    private static final class Side {

        private long count;
        private double farthest;
        private double head;
        private Place place;

        void add(double distance, double value, Place at) {
            count++;
            if (distance > farthest) {
                farthest = distance;
                head = value;
                place = at;
            }
        }
    }

    private HeadDoubts(Aquifer aquifer) {
        this.aquifer = aquifer;
    }

    static List<String> of(Aquifer aquifer) {
        if (aquifer.head().isEmpty() || aquifer.layers().stream().noneMatch(Layer::waterTable)) {
            return List.of();
        }
        HeadDoubts doubts = new HeadDoubts(aquifer);
        Survey.windows(aquifer.grid()).forEach(doubts::look);
        return doubts.found();
    }

    private void look(Window window) {
        GriddedValues head = aquifer.head().orElseThrow();
        double[] top = read(aquifer.surface(0), 0, 0, window);
        int lowest = aquifer.layers().size() - 1;
        double[] bottom = read(aquifer.surface(lowest + 1), lowest, 0, window);
        int steps = head.changes() ? aquifer.times().intervals() + 1 : 1;
        int layers = head.layered() ? aquifer.layers().size() : 1;
        for (int step = 0; step < steps; step++) {
            for (int layer = 0; layer < layers; layer++) {
                double[] heads = read(head, layer, step, window);
                for (int i = 0; i < heads.length; i++) {
                    if (Double.isFinite(heads[i])) {
                        compare(heads[i], top[i], bottom[i], new Place(layer, step, window, i));
                    }
                }
            }
        }
    }

    private void compare(double head, double top, double bottom, Place place) {
        values++;
        if (head < bottom) {
            below.add(bottom - head, head, place);
        } else if (head > top + (top - bottom)) {
            above.add(head - top, head, place);
        }
    }

    private List<String> found() {
        List<String> doubts = new ArrayList<>();
        if (2 * below.count > values) {
            doubts.add(words(below, "below the lowest layer's bottom, most by "));
        }
        if (2 * above.count > values) {
            doubts.add(words(above, "above the uppermost layer's top by more than all layers are thick, most by "));
        }
        return doubts;
    }

    private String words(Side side, String where) {
        String unit = " " + aquifer.lengthUnit();
        return side.count + " of " + values + " values of \"head\" lie " + where + Figures.shown(side.farthest) + unit
                + ": " + Figures.shown(side.head) + unit + " at " + shown(side.place)
                + ". Check that heads and surfaces are in one unit and refer to one datum.";
    }

    private String shown(Place place) {
        GriddedValues head = aquifer.head().orElseThrow();
        return Survey.place(head, StepKind.INSTANT, place.layer, place.step, place.window, place.cell);
    }

    private static double[] read(GriddedValues values, int layer, int step, Window window) {
        double[] block = new double[window.size()];
        values.read(layer, step, window, block, 0);
        return block;
    }
}
