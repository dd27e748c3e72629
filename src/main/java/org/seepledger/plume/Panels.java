package org.seepledger.plume;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * Parts of a control plane, each with what crosses it: mass discharge is Σ q C A, which is not mean q × mean C × ΣA (ITRC
 * 2010, Use and measurement of mass flux and mass discharge).
 *
 * @param areas area of each, length²
 * @param flows water through each, length³/time, positive forward
 * @param rates mass through each, kg/time, positive forward
 */
public record Panels(double[] areas, double[] flows, double[] rates) {

    /** {@return the area of all} */
    public double area() {
        return Arrays.stream(areas).sum();
    }

    /** {@return the net flow of water} */
    public double flow() {
        return Arrays.stream(flows).sum();
    }

    /**
     * {@return one of them alone}
     *
     * @param panel which, from 0
     */
    public Panels only(int panel) {
        return new Panels(new double[] {areas[panel]}, new double[] {flows[panel]}, new double[] {rates[panel]});
    }

    /** {@return the net mass discharge} */
    public double discharge() {
        return Arrays.stream(rates).sum();
    }

    /**
     * {@return the flux-averaged concentration: mass that crosses over water that crosses, both ways without sign; NaN where
     * no water crosses}
     */
    public double fluxAveraged() {
        double water = Arrays.stream(flows).map(Math::abs).sum();
        return water > 0 ? Arrays.stream(rates).map(Math::abs).sum() / water : Double.NaN;
    }

    /**
     * {@return the least share of the area through which a share of the mass crosses, whichever way; NaN where none does}
     *
     * @param share of the mass, from 0 to 1
     */
    public double areaShareFor(double share) {
        double all = Arrays.stream(rates).map(Math::abs).sum();
        if (!(all > 0)) {
            return Double.NaN;
        }
        int[] densest = IntStream.range(0, rates.length)
                .filter(i -> areas[i] > 0)
                .boxed()
                .sorted(Comparator.comparingDouble((Integer i) -> -Math.abs(rates[i]) / areas[i]))
                .mapToInt(Integer::intValue)
                .toArray();
        double wanted = share * all;
        double crossed = 0;
        double area = 0;
        for (int i : densest) {
            double more = Math.abs(rates[i]);
            if (crossed + more >= wanted) {
                return (area + areas[i] * (wanted - crossed) / more) / area();
            }
            crossed += more;
            area += areas[i];
        }
        return 1;
    }
}
