package org.seepledger.io.aquifer;

import java.util.OptionalDouble;

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

    double of(double stored) {
        if (dry.isPresent() && (stored == dry.getAsDouble() || stored == (float) dry.getAsDouble())) {
            return Double.NEGATIVE_INFINITY;
        }
        return (stored * scale + offset) * factor;
    }

    /** Converts values in place, after the file's own scale and offset. */
    void apply(double fileScale, double fileOffset, double[] values, int from, int count) {
        Conversion whole = new Conversion(scale * fileScale, scale * fileOffset + offset, factor, dry);
        for (int i = from; i < from + count; i++) {
            values[i] = whole.of(values[i]);
        }
    }
}
