package org.seepledger.desktop.map;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import org.seepledger.job.MapQuantity;
import org.seepledger.picture.ValueScale;

/** The colours that values themselves suggest. */
final class NaturalScale {

    /** A few cells round wells would otherwise take all the colours of flux and imbalance. */
    private static final double SHARE = 0.99;

    private NaturalScale() {}

    static ValueScale of(MapQuantity quantity, double[] values) {
        double[] sorted =
                DoubleStream.of(values).filter(Double::isFinite).sorted().toArray();
        return switch (quantity.kind()) {
            case IMBALANCE -> ValueScale.aboutZero(sorted);
            case FLUX -> ValueScale.over(Arrays.copyOf(sorted, (int) Math.ceil(SHARE * sorted.length)));
            case SOURCE -> sorted.length > 0 && sorted[0] < 0 ? ValueScale.aboutZero(sorted) : ValueScale.over(sorted);
            case CONCENTRATION, MEAN_CONCENTRATION -> ValueScale.ofConcentrations(sorted);
            case HEAD, THICKNESS, SATURATED_THICKNESS -> ValueScale.over(sorted);
        };
    }
}
