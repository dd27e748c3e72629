package org.seepledger.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
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
        series.values().forEach(rasters -> all.add(RastersGuess.of(rasters)));
        all.addAll(items);
        return new Plan(found.root(), SurfaceOrder.settled(FieldGuess.settled(all)), Wishes.NONE);
    }

    /** Rasters of another shape or number of bands are no part of a series, whatever their names. */
    private static String shape(LooseFile.Raster raster) {
        return " " + raster.rows() + " " + raster.columns() + " "
                + raster.bands().size();
    }

    private static Item other(LooseFile.Other other) {
        boolean shapes = other.kind() == LooseFile.Kind.SHAPES;
        Guess guess = shapes
                ? new Guess(Role.PRISMS, Confidence.FAIR, "A GeoJSON may hold prisms.")
                : new Guess(Role.NONE, Confidence.HIGH, other.words());
        return new Item.Other(other, List.of(new Use(-1, "", guess.role(), "", "", 0, false, guess)));
    }
}
