package org.seepledger.desktop.draw;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.prism.Prism;
import org.seepledger.sketch.Drawing;
import org.seepledger.sketch.Limit;

/** Makes prisms of what is drawn, with the surfaces that tops and bottoms name. */
final class Solids {

    private Map<Limit.Surface, GriddedValues> surfaces = Map.of();

    /** Forgets all surfaces but these. */
    void begin(Map<Limit.Surface, GriddedValues> known) {
        surfaces = Map.copyOf(known);
    }

    /** Learns of more surfaces. */
    void know(Map<Limit.Surface, GriddedValues> more) {
        Map<Limit.Surface, GriddedValues> all = new HashMap<>(surfaces);
        all.putAll(more);
        surfaces = Map.copyOf(all);
    }

    boolean knows(Limit.Surface surface) {
        return surfaces.containsKey(surface);
    }

    /** The prisms of a drawing, in its order. */
    List<Prism> of(Drawing drawing, List<Layer> layers) {
        int count = Math.max(1, layers.size());
        return drawing.shapes().stream()
                .map(shape -> shape.prism(count, (limit, lid) -> surface(layers, limit, lid)))
                .toList();
    }

    private GriddedValues surface(List<Layer> layers, Limit limit, String lid) {
        return limit instanceof Limit.Layer layer ? layer.among(layers, lid) : surfaces.get(limit);
    }
}
