package org.seepledger.intake;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.seepledger.intake.Guess.Confidence;

/** Makes items of loose files, and guesses what they are. */
public final class Proposal {

    private Proposal() {}

    /**
     * {@return a plan that nobody has corrected yet}
     *
     * @param found the files
     */
    public static Plan of(LooseFiles found) {
        List<Item> items = new ArrayList<>();
        Map<String, List<LooseFile.Raster>> series = new LinkedHashMap<>();
        for (LooseFile file : found.files()) {
            if (file instanceof LooseFile.Raster raster) {
                String pattern = NamePattern.of(raster.shownName()).text() + shape(raster);
                series.computeIfAbsent(pattern, key -> new ArrayList<>()).add(raster);
            } else if (file instanceof LooseFile.Table table) {
                items.add(TableGuess.of(table));
            } else if (file instanceof LooseFile.Other other) {
                items.add(other(other));
            }
        }
        List<Item> all = new ArrayList<>();
        series.values().forEach(rasters -> all.addAll(items(rasters)));
        all.addAll(items);
        name(all);
        return new Plan(found.root(), SurfaceOrder.settled(FieldGuess.settled(all)), Wishes.NONE);
    }

    /** Rasters of several shapes may be called the same; findings must tell them apart. */
    private static void name(List<Item> items) {
        Set<String> taken = new HashSet<>();
        for (int i = 0; i < items.size(); i++) {
            if (!taken.add(items.get(i).id()) && items.get(i) instanceof Item.Rasters rasters) {
                LooseFile.Raster first = rasters.files().get(0);
                items.set(i, rasters.called(rasters.id() + " (" + first.rows() + " × " + first.columns() + ")"));
            }
        }
    }

    /** Surfaces that are numbered lie one below the other: each is a thing of its own, in the order of their heights. */
    private static List<Item> items(List<LooseFile.Raster> rasters) {
        Item together = RastersGuess.of(rasters);
        boolean surfaces = Vocabulary.saysSurfaces(together.id())
                && together.uses().stream().allMatch(use -> use.role().isSurface());
        if (!surfaces || rasters.size() == 1) {
            return List.of(together);
        }
        List<Item> apart = new ArrayList<>();
        rasters.forEach(raster -> apart.add(RastersGuess.of(List.of(raster))));
        return apart;
    }

    /** Rasters of another shape or number of bands are no part of a series, whatever their names. */
    private static String shape(LooseFile.Raster raster) {
        return " " + raster.rows() + " " + raster.columns() + " "
                + raster.bands().size();
    }

    private static Item other(LooseFile.Other other) {
        boolean lines = Vocabulary.words(other.shownName()).stream().anyMatch(word -> word.startsWith("transect"));
        boolean shapes = other.kind() == LooseFile.Kind.SHAPES && !lines;
        Guess guess = shapes
                ? new Guess(Role.PRISMS, Confidence.FAIR, "A GeoJSON may hold prisms.")
                : new Guess(Role.NONE, Confidence.HIGH, other.words());
        return new Item.Other(other, List.of(new Use(-1, "", guess.role(), "", "", 0, false, guess)));
    }
}
