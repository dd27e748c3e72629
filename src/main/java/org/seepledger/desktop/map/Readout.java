package org.seepledger.desktop.map;

import java.util.Locale;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.MapQuantity;
import org.seepledger.unit.Figures;

/**
 * What is under the cursor, as it is read.
 *
 * @param place map coordinates
 * @param cell row and column, from 1; or that it is off the grid
 * @param value what is shown there, with its unit
 */
public record Readout(String place, String cell, String value) {

    static Readout at(Aquifer aquifer, double x, double y, int layer, Optional<LayerView> view, NumberForm form) {
        Grid grid = aquifer.grid();
        int column = grid.x().cellAt(grid.localX(x, y));
        int fromSouth = grid.y().cellAt(grid.localY(x, y));
        boolean on = column >= 0 && column < grid.columns() && fromSouth >= 0 && fromSouth < grid.rows();
        String place = form.of("x " + coordinate(x) + "   y " + coordinate(y));
        if (!on) {
            return new Readout(place, Words.of("map.off"), "");
        }
        String cell = Words.of("map.cell", grid.flipped(fromSouth) + 1, column + 1, layer + 1);
        return new Readout(
                place, cell, view.map(shown -> value(shown, x, y, form)).orElse(""));
    }

    private static String value(LayerView shown, double x, double y, NumberForm form) {
        MapQuantity quantity = shown.request().quantity();
        float value = shown.pyramid().at(x, y);
        float limit = shown.limits().map(limits -> limits.at(x, y)).orElse(Float.NaN);
        if (Float.isNaN(value)) {
            return Float.isNaN(limit)
                    ? Words.of("map.novalue", quantity.label())
                    : Words.of("map.nondetect", quantity.label(), form.of(Figures.typeset(limit)), quantity.unit());
        }
        String text = Words.of("map.value", quantity.label(), form.of(Figures.typeset(value)), quantity.unit());
        return Float.isNaN(limit) ? text : Words.of("map.halfdetect", text);
    }

    /** To a tenth of a plan unit, thousands kept apart. */
    static String coordinate(double value) {
        return String.format(Locale.ROOT, "%,.1f", value).replace(',', '\u202f').replace('-', '−');
    }
}
