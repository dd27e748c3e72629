package org.seepledger.aquifer;

import java.util.List;
import java.util.Optional;

/**
 * Which cells are active in an interval as far as heads and surfaces tell, and how thick their water is.
 *
 * <p>A cell is inactive where a surface, or the head at either end of the interval, has no value, or where it has no
 * thickness. The saturated thickness is that at the interval's end in a water-table layer with heads, else the whole.
 */
final class Saturation {

    private final boolean[] active;
    private final double[] thickness;

    private Saturation(boolean[] active, double[] thickness) {
        this.active = active;
        this.thickness = thickness;
    }

    static Saturation of(CellGeometry geometry, List<Layer> layers, Optional<GriddedValues> head, int interval) {
        int size = geometry.block().size();
        boolean[] active = new boolean[size];
        double[] thickness = new double[size];
        for (int i = 0; i < size; i++) {
            active[i] = geometry.isPresent(i);
            thickness[i] = geometry.thickness(i);
        }
        head.ifPresent(values -> wet(geometry, layers, values, interval, active, thickness));
        return new Saturation(active, thickness);
    }

    private static void wet(
            CellGeometry geometry,
            List<Layer> layers,
            GriddedValues head,
            int interval,
            boolean[] active,
            double[] thickness) {
        Block block = geometry.block();
        double[] start = block.read(head, head.changes() ? interval : 0);
        double[] end = head.changes() ? block.read(head, interval + 1) : start;
        int inLayer = block.window().size();
        for (int i = 0; i < active.length; i++) {
            active[i] &= !Double.isNaN(start[i]) && !Double.isNaN(end[i]);
            if (layers.get(i / inLayer).waterTable()) {
                double level = Math.min(Math.max(end[i], geometry.bottom(i)), geometry.top(i));
                thickness[i] = level - geometry.bottom(i);
            }
        }
    }

    boolean[] active() {
        return active;
    }

    double thickness(int cell) {
        return thickness[cell];
    }
}
