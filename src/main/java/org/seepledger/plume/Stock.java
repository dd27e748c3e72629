package org.seepledger.plume;

import java.util.Arrays;
import org.seepledger.balance.Sums;

/**
 * What a prism holds of a solute at an instant, in one layer: the sums from which masses, means and moments follow.
 *
 * <p>Places are local plan coordinates in plan units and elevations in length units. In moments a cell's mass counts at its
 * centre, since a concentration is taken as the value there: spread within cells is not added.
 */
public final class Stock {

    private static final int CHOICES = NonDetects.values().length;
    private static final int DISSOLVED = 0;
    private static final int SORBED = CHOICES;
    private static final int WATER = 2 * CHOICES;
    private static final int ROCK = WATER + 1;
    private static final int UNDETECTED = WATER + 2;
    private static final int ROCK_ABOVE = WATER + 3;
    private static final int AREA_ABOVE = WATER + 4;
    private static final int FIRST = WATER + 5;
    private static final int SECOND = FIRST + 3;
    private static final int COUNT = SECOND + 6;

    private final Sums sums = new Sums(COUNT);
    private double maximum = Double.NaN;
    private long detects;
    private long nonDetects;
    private double leastLimit = Double.POSITIVE_INFINITY;
    private double greatestLimit = Double.NEGATIVE_INFINITY;

    /** {@return what is held at an instant that was not asked for: no numbers} */
    static Stock notGiven() {
        Stock stock = new Stock();
        for (int i = 0; i < COUNT; i++) {
            stock.sums.add(i, Double.NaN);
        }
        return stock;
    }

    /**
     * Counts a part of a cell.
     *
     * @param rock its saturated volume, length³
     * @param porosity the share of it that is pores
     * @param dissolved dissolved mass by {@link NonDetects}
     * @param sorbed sorbed mass
     * @param concentration mass/length³
     * @param centre local x and y, and elevation
     */
    void add(double rock, double porosity, double[] dissolved, double[] sorbed, double concentration, double[] centre) {
        for (int choice = 0; choice < CHOICES; choice++) {
            sums.add(DISSOLVED + choice, dissolved[choice]);
            sums.add(SORBED + choice, sorbed[choice]);
        }
        sums.add(WATER, rock * porosity);
        sums.add(ROCK, rock);
        maximum = Double.isNaN(maximum) ? concentration : Math.max(maximum, concentration);
        int half = NonDetects.HALF.ordinal();
        addMoments(dissolved[half] + sorbed[half], centre);
    }

    private void addMoments(double mass, double[] centre) {
        int next = SECOND;
        for (int i = 0; i < 3; i++) {
            sums.add(FIRST + i, mass * centre[i]);
            for (int j = i; j < 3; j++) {
                sums.add(next++, mass * centre[i] * centre[j]);
            }
        }
    }

    void addNonDetect(double mass, double limit) {
        nonDetects++;
        sums.add(UNDETECTED, mass);
        leastLimit = Math.min(leastLimit, limit);
        greatestLimit = Math.max(greatestLimit, limit);
    }

    void addDetect() {
        detects++;
    }

    void addAbove(double rock, double area) {
        sums.add(ROCK_ABOVE, rock);
        sums.add(AREA_ABOVE, area);
    }

    void add(Stock other) {
        sums.add(other.sums);
        maximum = Double.isNaN(maximum)
                ? other.maximum
                : Double.isNaN(other.maximum) ? maximum : Math.max(maximum, other.maximum);
        detects += other.detects;
        nonDetects += other.nonDetects;
        leastLimit = Math.min(leastLimit, other.leastLimit);
        greatestLimit = Math.max(greatestLimit, other.greatestLimit);
    }

    /**
     * {@return dissolved mass}
     *
     * @param choice how non-detects count
     */
    public double dissolved(NonDetects choice) {
        return sums.get(DISSOLVED + choice.ordinal());
    }

    /**
     * {@return sorbed mass}
     *
     * @param choice how non-detects count
     */
    public double sorbed(NonDetects choice) {
        return sums.get(SORBED + choice.ordinal());
    }

    /**
     * {@return dissolved and sorbed mass}
     *
     * @param choice how non-detects count
     */
    public double total(NonDetects choice) {
        return dissolved(choice) + sorbed(choice);
    }

    /** {@return the volume of water in all pores, length³} */
    public double water() {
        return sums.get(WATER);
    }

    /** {@return the volume of saturated rock, length³} */
    public double rock() {
        return sums.get(ROCK);
    }

    /** {@return dissolved mass over the volume of water, mass/length³; NaN where there is no water} */
    public double mean() {
        return water() > 0 ? dissolved(NonDetects.HALF) / water() : Double.NaN;
    }

    /** {@return the greatest concentration, mass/length³; NaN where there is none} */
    public double maximum() {
        return maximum;
    }

    /** {@return the volume of saturated rock with more than the concentration asked for, length³} */
    public double rockAbove() {
        return sums.get(ROCK_ABOVE);
    }

    /** {@return the plan area with more than the concentration asked for, length²} */
    public double areaAbove() {
        return sums.get(AREA_ABOVE);
    }

    /** {@return the share of mass that rests on non-detects, counted with half their limits; 0 where there is no mass} */
    public double undetectedShare() {
        double total = total(NonDetects.HALF);
        return total > 0 ? sums.get(UNDETECTED) / total : 0;
    }

    /** {@return the number of cells with a detected concentration} */
    public long detects() {
        return detects;
    }

    /** {@return the number of cells with a non-detect} */
    public long nonDetects() {
        return nonDetects;
    }

    /** {@return the least limit of a non-detect, mass/length³; infinite where there is none} */
    public double leastLimit() {
        return leastLimit;
    }

    /** {@return the greatest limit of a non-detect, mass/length³; negative infinite where there is none} */
    public double greatestLimit() {
        return greatestLimit;
    }

    /** {@return the centre of mass: local x and y in plan units, elevation in length units; NaN without mass} */
    public double[] centre() {
        double mass = total(NonDetects.HALF);
        double[] centre = new double[3];
        Arrays.setAll(centre, i -> mass > 0 ? sums.get(FIRST + i) / mass : Double.NaN);
        return centre;
    }

    /** {@return the second central moments xx, xy, xz, yy, yz, zz over mass, along the grid's axes; NaN without mass} */
    public double[] spread() {
        double mass = total(NonDetects.HALF);
        double[] centre = centre();
        double[] spread = new double[6];
        int next = 0;
        for (int i = 0; i < 3; i++) {
            for (int j = i; j < 3; j++) {
                spread[next] = sums.get(SECOND + next) / mass - centre[i] * centre[j];
                next++;
            }
        }
        return spread;
    }
}
