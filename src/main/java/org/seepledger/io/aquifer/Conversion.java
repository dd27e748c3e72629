package org.seepledger.io.aquifer;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Stored;

/**
 * From values as stored to values in the set's units: (stored × scale + offset) × factor. A stored value that means
 * {@code dry} becomes negative infinity.
 *
 * @param scale the binding's scale
 * @param offset the binding's offset, in the binding's unit
 * @param factor how many of the set's units the binding's unit is
 * @param dry the stored value that means head at the cell's bottom
 */
record Conversion(double scale, double offset, double factor, OptionalDouble dry) {

    /** Numbers that are in the set's units as they stand. */
    static final Conversion NONE = new Conversion(1, 0, 1, OptionalDouble.empty());

    double of(double stored) {
        if (dry.isPresent() && (stored == dry.getAsDouble() || stored == (float) dry.getAsDouble())) {
            return Double.NEGATIVE_INFINITY;
        }
        return (stored * scale + offset) * factor;
    }

    /**
     * What converted values are made of: the stored ones, and the offsets of the file and the binding where they are not
     * 0.
     */
    List<Stored> parts(Stored stored, double fileScale, double fileOffset, String key) {
        List<Stored> parts = new ArrayList<>();
        parts.add(stored.times(scale * fileScale * factor));
        if (fileOffset != 0) {
            parts.add(stored.beside(stored.file(), stored.place() + ", offset", fileOffset, scale * factor));
        }
        if (offset != 0) {
            parts.add(stored.beside(AquiferReader.FILE, KeyPlace.key(key, "offset"), offset, factor));
        }
        return parts;
    }

    /** Converts values in place, after the file's own scale and offset. */
    void apply(double fileScale, double fileOffset, double[] values, int from, int count) {
        Conversion whole = new Conversion(scale * fileScale, scale * fileOffset + offset, factor, dry);
        for (int i = from; i < from + count; i++) {
            values[i] = whole.of(values[i]);
        }
    }
}
