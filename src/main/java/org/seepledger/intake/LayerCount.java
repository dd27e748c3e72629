package org.seepledger.intake;

import java.util.List;

/** How many layers items speak of. */
final class LayerCount {

    private LayerCount() {}

    /** {@return the number of layers; 0 if nothing tells} */
    static int of(List<Item> items) {
        int most = 0;
        int surfaces = 0;
        for (Item item : items) {
            for (Use use : item.uses()) {
                if (use.role() != Role.NONE && use.role() != Role.PRISMS) {
                    int spoken = use.layer() > 0 ? use.layer() : spoken(item);
                    most = Math.max(most, use.role().isSurface() && spoken == 0 ? 0 : spoken);
                    surfaces += use.role().isSurface() && spoken == 0 ? 1 : 0;
                }
            }
        }
        return Math.max(most, surfaces > 1 ? surfaces - 1 : 0);
    }

    private static int spoken(Item item) {
        if (item instanceof Item.Rasters rasters) {
            int named = LayerNumbers.of(rasters).stream()
                    .mapToInt(Integer::intValue)
                    .max()
                    .orElse(0);
            return rasters.bands() == Means.LAYER ? Math.max(named, rasters.bandCount()) : named;
        }
        if (item instanceof Item.Table table && table.places().contains(Place.LAYER)) {
            return LayerNumbers.of(table).stream()
                    .mapToInt(Integer::intValue)
                    .max()
                    .orElse(0);
        }
        return 0;
    }
}
