package org.seepledger.plume;

import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Times;
import org.seepledger.ledger.Group;
import org.seepledger.statistics.Trend;

/**
 * A plume through time: the centre and the spread of what a prism holds (moments as in Freyberg 1986, Water Resources
 * Research 22, 2031–2046), mass, and what leaves through the prism's faces.
 */
public final class Course {

    /** The confidence of intervals. */
    public static final double CONFIDENCE = 0.95;

    private final Plume plume;
    private final Times times;
    private final Grid grid;

    /**
     * A plume at an instant.
     *
     * @param mass dissolved and sorbed, kg
     * @param x map x of the centre of mass, in plan units; NaN without mass
     * @param y map y of it
     * @param elevation of it, in length units
     * @param along standard deviation along the longer principal axis in plan, in length units
     * @param across standard deviation along the shorter one
     * @param upright standard deviation of elevation
     * @param direction of the longer axis, degrees counter-clockwise from map x, from 0 to 180
     */
    public record Place(
            double mass,
            double x,
            double y,
            double elevation,
            double along,
            double across,
            double upright,
            double direction) {}

    /**
     * Follows a plume.
     *
     * @param plume what a prism holds and its budget
     * @param times the record's instants
     * @param grid the grid
     */
    public Course(Plume plume, Times times, Grid grid) {
        this.plume = plume;
        this.times = times;
        this.grid = grid;
    }

    /**
     * {@return the plume at an instant}
     *
     * @param instant from 0
     */
    public Place at(int instant) {
        Stock stock = plume.whole(instant);
        double[] centre = stock.centre();
        double[] spread = stock.spread();
        double half = 0.5 * (spread[0] + spread[3]);
        double apart = Math.hypot(0.5 * (spread[0] - spread[3]), spread[1]);
        double turned = 0.5 * Math.toDegrees(Math.atan2(2 * spread[1], spread[0] - spread[3])) + grid.rotation();
        return new Place(
                stock.total(NonDetects.HALF),
                grid.mapX(centre[0], centre[1]),
                grid.mapY(centre[0], centre[1]),
                centre[2],
                deviation(half + apart) * grid.planUnit(),
                deviation(half - apart) * grid.planUnit(),
                deviation(spread[5]),
                ((turned % 180) + 180) % 180);
    }

    /** Rounding may leave less than nothing of a variance. */
    private static double deviation(double variance) {
        return Double.isNaN(variance) ? variance : Math.sqrt(Math.max(0, variance));
    }

    /**
     * {@return whether the centre at an instant is a plume's: mass is there, and hardly any of it rests on non-detects, which
     * stand for themselves wherever nothing was found}
     *
     * @param instant from 0
     */
    public boolean isLocated(int instant) {
        Stock stock = plume.whole(instant);
        return stock.total(NonDetects.HALF) > 0 && stock.undetectedShare() <= NonDetects.TOO_MUCH;
    }

    /**
     * {@return gross outflow through sides and lids in an interval, advective and dispersive, kg/time}
     *
     * @param interval from 0
     */
    public double outflow(int interval) {
        double[] rates = plume.ledger().outflow(interval);
        double sum = 0;
        for (int account = 0; account < rates.length; account++) {
            Group group = plume.ledger().accounts().get(account).group();
            boolean face = group == Group.SIDE || group == Group.LID || group == Group.DISPERSION;
            sum += face ? rates[account] : 0;
        }
        return sum;
    }

    /**
     * {@return the trend of mass in place}
     */
    public Trend ofMass() {
        int count = plume.stocks().size();
        return trend(
                IntStream.range(0, count).mapToDouble(times::instant).toArray(),
                IntStream.range(0, count)
                        .mapToDouble(instant -> plume.whole(instant).total(NonDetects.HALF))
                        .toArray());
    }

    /**
     * {@return the trend of what leaves through faces; empty for a single interval}
     */
    public Optional<Trend> ofOutflow() {
        int count = times.intervals();
        return count < 2
                ? Optional.empty()
                : Optional.of(trend(
                        IntStream.range(0, count).mapToDouble(this::middle).toArray(),
                        IntStream.range(0, count).mapToDouble(this::outflow).toArray()));
    }

    /**
     * {@return the middle of an interval, in time units}
     *
     * @param interval from 0
     */
    public double middle(int interval) {
        return 0.5 * (times.instant(interval) + times.instant(interval + 1));
    }

    private Trend trend(double[] at, double[] values) {
        return Trend.of(at, values, plume.solute().concentration().orElseThrow().simulated(), CONFIDENCE);
    }
}
