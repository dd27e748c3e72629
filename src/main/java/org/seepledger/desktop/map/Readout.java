package org.seepledger.desktop.map;

import java.util.Locale;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Grid;
import org.seepledger.desktop.words.NumberForm;
import org.seepledger.desktop.words.Words;
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
                place, cell, view.map(shown -> value(shown, grid, x, y, form)).orElse(""));
    }

    private static String value(LayerView shown, Grid grid, double x, double y, NumberForm form) {
        Lattice lattice = shown.pyramid().lattice();
        int column = (int) (grid.localX(x, y) / lattice.stepX());
        int fromSouth = (int) (grid.localY(x, y) / lattice.stepY());
        int row = Math.max(0, Math.min(lattice.rows() - 1, lattice.rows() - 1 - fromSouth));
        float value = shown.pyramid().level(0).at(row, Math.min(column, lattice.columns() - 1));
        String label = shown.request().quantity().label();
        return Float.isNaN(value)
                ? Words.of("map.novalue", label)
                : Words.of(
                        "map.value",
                        label,
                        form.of(Figures.typeset(value)),
                        shown.request().quantity().unit());
    }

    /** To a tenth of a plan unit, thousands kept apart. */
    static String coordinate(double value) {
        return String.format(Locale.ROOT, "%,.1f", value).replace(',', '\u202f').replace('-', '−');
    }
}
