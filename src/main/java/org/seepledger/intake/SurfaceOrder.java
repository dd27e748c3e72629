package org.seepledger.intake;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.seepledger.intake.Guess.Confidence;
import org.seepledger.io.table.TableLook;

/** Puts surfaces whose names tell no layer in order by their mean height: the uppermost is the top of layer 1. */
final class SurfaceOrder {

    private SurfaceOrder() {}

    private record Surface(int item, int use, Role role, double height) {}

    static List<Item> settled(List<Item> items) {
        List<Surface> open = new ArrayList<>();
        boolean topNamed = false;
        for (int i = 0; i < items.size(); i++) {
            Item item = items.get(i);
            for (int u = 0; u < item.uses().size(); u++) {
                Use use = item.uses().get(u);
                boolean told = use.role().isSurface() && isTold(item);
                topNamed |= told && use.role() == Role.TOP;
                if (use.role().isSurface() && !told) {
                    open.add(new Surface(i, u, use.role(), height(item, use)));
                }
            }
        }
        open.sort(Comparator.comparingDouble(Surface::height).reversed());
        return ordered(items, open, topNamed);
    }

    private static List<Item> ordered(List<Item> items, List<Surface> open, boolean topNamed) {
        List<Item> settled = new ArrayList<>(items);
        boolean apart = open.size() == 1 && open.get(0).role() == Role.BOTTOM;
        int next = topNamed || apart ? 1 : 0;
        for (Surface surface : open) {
            Role role = next == 0 ? Role.TOP : Role.BOTTOM;
            Item item = settled.get(surface.item());
            Use use = item.uses().get(surface.use());
            String reason = use.guess().reason()
                    + (next == 0
                            ? " It is the uppermost surface."
                            : " It lies " + next + " below the uppermost surface.");
            Guess guess = new Guess(role, Confidence.FAIR, reason);
            Use placed =
                    new Use(use.column(), use.part(), role, "", use.unit(), Math.max(1, next), use.turned(), guess);
            settled.set(surface.item(), item.with(surface.use(), placed));
            next++;
        }
        return settled;
    }

    private static boolean isTold(Item item) {
        return item instanceof Item.Rasters rasters
                        && (rasters.fields().contains(Means.LAYER) || rasters.bands() == Means.LAYER)
                || item instanceof Item.Table table && table.places().contains(Place.LAYER);
    }

    private static double height(Item item, Use use) {
        if (item instanceof Item.Rasters rasters) {
            return rasters.files().get(0).bands().get(Math.max(0, use.column())).mean();
        }
        if (item instanceof Item.Table table) {
            TableLook.Column column = table.file().look().columns().get(use.column());
            return (column.least() + column.greatest()) / 2;
        }
        return Double.NaN;
    }
}
