package org.seepledger.intake;

import java.util.List;
import java.util.function.Consumer;

/** Works marks of active cells into the rasters that decide which cells are active. */
final class Masking {

    private final Binder binder;
    private final Shelf shelf;
    private final Consumer<Finding> findings;

    Masking(Binder binder, Shelf shelf, Consumer<Finding> findings) {
        this.binder = binder;
        this.shelf = shelf;
        this.findings = findings;
    }

    /**
     * Masks rasters.
     *
     * @param masks the marks
     * @param parts what decides
     */
    void mask(List<Part> masks, List<Part> parts) {
        for (Part mask : masks) {
            boolean possible = mask.item() instanceof Item.Rasters
                    && !parts.isEmpty()
                    && parts.stream()
                            .allMatch(part -> part.item() instanceof Item.Rasters rasters && isOnePerFile(rasters));
            if (!possible) {
                findings.accept(Finding.fault(
                        mask.item(),
                        mask.shown() + " cannot be worked in: the marks must be a raster, and"
                                + " the conductivity or flow rasters with a file for each layer. Leave values out there instead, or"
                                + " leave this file out."));
            } else {
                parts.forEach(
                        part -> mask((Item.Rasters) mask.item(), mask.use(), (Item.Rasters) part.item(), part.use()));
            }
        }
    }

    private static boolean isOnePerFile(Item.Rasters rasters) {
        return rasters.bands() == Means.NOTHING
                && rasters.bandCount() == 1
                && !rasters.fields().contains(Means.TIME);
    }

    private void mask(Item.Rasters mask, Use use, Item.Rasters masked, Use maskedUse) {
        List<Integer> layers = LayerNumbers.of(mask);
        for (int layer = 1; layer <= binder.layers(); layer++) {
            int own = layer;
            boolean told = mask.fields().contains(Means.LAYER);
            for (int file = 0; file < mask.files().size(); file++) {
                boolean holds = told ? layers.get(file) == layer : use.layer() == 0 || use.layer() == layer;
                boolean inBands = mask.bands() == Means.LAYER && use.column() < 0;
                int band = use.column() >= 0 ? use.column() : inBands ? Math.min(own, mask.bandCount()) - 1 : 0;
                LooseFile.Raster marks = mask.files().get(file);
                boolean hasLayer = maskedUse.layer() == 0 || maskedUse.layer() == layer;
                if (holds && hasLayer) {
                    shelf.rasters(masked, maskedUse, layer)
                            .ifPresent(found -> shelf.mask(mask, found.name(), marks, band));
                }
            }
        }
    }
}
