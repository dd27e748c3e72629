package org.seepledger.intake;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A binding as {@code aquifer.json} has it: a number or a file.
 *
 * @param file the file's name, with placeholders for steps; empty for a number
 * @param layerFile the same with a placeholder for the layer; empty where the name cannot have one
 * @param band a band's number or what bands count; empty for the first
 * @param column the column of a table; empty for a raster
 * @param unit its unit; empty for the set's own
 * @param scale what values are multiplied by
 * @param value the number
 */
record Bound(
        String file, String layerFile, Optional<Object> band, String column, String unit, double scale, double value) {

    static Bound number(double value, String unit) {
        return new Bound("", "", Optional.empty(), "", unit, 1, value);
    }

    Bound scaled(double factor) {
        return file.isEmpty()
                ? new Bound(file, layerFile, band, column, unit, scale, value * factor)
                : new Bound(file, layerFile, band, column, unit, scale * factor, value);
    }

    Bound withFile(String other, Optional<Object> otherBand) {
        return new Bound(other, layerFile, otherBand, column, unit, scale, value);
    }

    /** {@return whether another layer's binding is this one but for the layer in the file's name} */
    boolean isLike(Bound other) {
        return !layerFile.isEmpty() && layerFile.equals(other.layerFile) && band.equals(other.band) && isLikeBut(other);
    }

    boolean isLikeBut(Bound other) {
        return column.equals(other.column)
                && unit.equals(other.unit)
                && scale == other.scale
                && Double.compare(value, other.value) == 0;
    }

    /** {@return it as a number, text or map} */
    Object json() {
        if (file.isEmpty()) {
            return unit.isEmpty() ? Numbers.json(value) : Map.of("value", Numbers.json(value), "unit", unit);
        }
        if (band.isEmpty() && column.isEmpty() && unit.isEmpty() && scale == 1) {
            return file;
        }
        Map<String, Object> json = new LinkedHashMap<>();
        json.put("file", file);
        band.ifPresent(which -> json.put("band", which));
        if (!column.isEmpty()) {
            json.put("column", column);
        }
        if (!unit.isEmpty()) {
            json.put("unit", unit);
        }
        if (scale != 1) {
            json.put("scale", Numbers.json(scale));
        }
        return json;
    }
}
