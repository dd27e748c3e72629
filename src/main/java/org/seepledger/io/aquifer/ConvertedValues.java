package org.seepledger.io.aquifer;

import java.util.List;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Window;
import org.seepledger.io.table.StepKind;

/**
 * Stored values of a table, in the set's units.
 *
 * @param stored the values as they stand in the file
 * @param column the file and column that they stand in
 * @param key where {@code aquifer.json} binds them
 * @param conversion from stored values to the set's units
 */
record ConvertedValues(GriddedValues stored, Column column, String key, Conversion conversion)
        implements GriddedValues {

    /**
     * A column of a table.
     *
     * @param file the table as the set names it
     * @param name the column's name
     * @param steps what its steps are, if it has any
     * @param wholeGrid whether each line holds for the whole grid
     */
    record Column(String file, String name, StepKind steps, boolean wholeGrid) {}

    @Override
    public List<Stored> stored(int layer, int step, Window window) {
        double[] values = new double[window.size()];
        stored.read(layer, step, window, values, 0);
        StringBuilder place = new StringBuilder("column ").append(column.name);
        if (stored.layered()) {
            place.append(", layer ").append(layer + 1);
        }
        if (stored.changes()) {
            place.append(column.steps == StepKind.INSTANT ? ", instant " + step : ", interval " + (step + 1));
        }
        Stored part = new Stored(column.file, place.toString(), column.wholeGrid, values, 1);
        return conversion.parts(part, 1, 0, key);
    }

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        stored.read(layer, step, window, target, offset);
        conversion.apply(1, 0, target, offset, window.size());
    }

    @Override
    public boolean changes() {
        return stored.changes();
    }

    @Override
    public boolean layered() {
        return stored.layered();
    }
}
