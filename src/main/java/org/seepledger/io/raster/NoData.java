package org.seepledger.io.raster;

import java.util.Locale;

/**
 * Which stored values mean that there is none.
 *
 * <p>The declared value is compared in the samples' own type, as its text may have more digits than they. One as large as no
 * measured quantity is (10³⁰ and more: the ends of the types' ranges are common) may also have been written with as few as
 * six digits, and is compared with that precision.
 */
final class NoData {

    private static final double HUGE = 1e30;
    private static final double SIX_DIGITS = 1e-5;

    private final boolean declared;
    private final double value;
    private final boolean approximate;
    private final double tolerance;

    private NoData(boolean declared, double value, boolean approximate) {
        this.declared = declared;
        this.value = value;
        this.approximate = approximate;
        this.tolerance = Math.abs(value) * SIX_DIGITS;
    }

    /**
     * Reads the declared value.
     *
     * @throws org.seepledger.fault.DataFault if it is not a number
     */
    static NoData of(TiffDirectory directory, SampleType sample) {
        String text = directory.text(Tag.GDAL_NODATA).strip();
        if (text.isEmpty()) {
            return new NoData(false, Double.NaN, false);
        }
        double exact = parsed(directory.file(), text);
        double value = sample == SampleType.FLOAT32 ? (float) exact : exact;
        boolean huge = sample.isReal() && Math.abs(exact) >= HUGE && Double.isFinite(exact);
        return new NoData(true, huge ? exact : value, huge);
    }

    private static double parsed(TiffFile file, String text) {
        String plain = text.toLowerCase(Locale.ROOT);
        if (plain.contains("nan") || plain.contains("#ind") || plain.contains("#qnan")) {
            return Double.NaN;
        }
        if (plain.matches("[+-]?(inf|infinity|1\\.#inf)")) {
            return plain.startsWith("-") ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        }
        try {
            return Double.parseDouble(plain);
        } catch (NumberFormatException e) {
            throw file.fault(
                    Tag.GDAL_NODATA.toString(),
                    "the nodata value \"" + text + "\"",
                    "a number or nan",
                    "Declare it anew, for instance with gdal_translate -a_nodata -9999.");
        }
    }

    /** {@return whether a stored value means that there is none} */
    boolean is(double stored) {
        if (Double.isNaN(stored)) {
            return true;
        }
        return approximate ? Math.abs(stored - value) <= tolerance : declared && stored == value;
    }

    /** {@return what the blocks hold that a sparse file leaves out} */
    double leftOut() {
        return declared ? value : 0;
    }
}
