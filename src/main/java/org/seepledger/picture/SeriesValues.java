package org.seepledger.picture;

import java.util.List;
import java.util.stream.DoubleStream;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;

/**
 * What a series of budgets has of each period, in the unit shown.
 *
 * @param gains what comes in, storage apart
 * @param losses what goes out, storage apart
 * @param storage change in storage, positive where storage takes; NaN where it is not known
 * @param residual what is not explained: with storage where that is not known
 */
record SeriesValues(double[] gains, double[] losses, double[] storage, double[] residual) {

    /** A residual below this share of throughput is rounding, whatever it is. */
    private static final double ROUNDING = 1e-9;

    static SeriesValues of(List<PeriodBudget> budgets, UnitShown unit) {
        int count = budgets.size();
        SeriesValues values =
                new SeriesValues(new double[count], new double[count], new double[count], new double[count]);
        for (int i = 0; i < count; i++) {
            Totals totals = budgets.get(i).totals();
            values.gains[i] = unit.of(totals.inflow(), budgets.get(i).period());
            values.losses[i] = unit.of(totals.outflow(), budgets.get(i).period());
            values.storage[i] = unit.of(totals.storageChange(), budgets.get(i).period());
            values.residual[i] = Double.isNaN(totals.storageChange())
                    ? values.gains[i] - values.losses[i]
                    : unit.of(totals.residual(), budgets.get(i).period());
        }
        return values;
    }

    int count() {
        return gains.length;
    }

    /** {@return whether change in storage is known in any period} */
    boolean storageKnown() {
        return DoubleStream.of(storage).anyMatch(value -> !Double.isNaN(value));
    }

    /** {@return gains and what storage gives, of one period} */
    double up(int period) {
        return gains[period] + Math.max(0, -orNothing(storage[period]));
    }

    /** {@return losses and what storage takes, of one period} */
    double down(int period) {
        return losses[period] + Math.max(0, orNothing(storage[period]));
    }

    static double orNothing(double value) {
        return Double.isFinite(value) ? value : 0;
    }

    /** {@return the largest residual, without sign} */
    double largestResidual() {
        return largest(residual);
    }

    /** {@return whether no residual is more than rounding} */
    boolean closes() {
        double throughput = Math.max(largest(gains), largest(losses));
        return largestResidual() <= ROUNDING * throughput;
    }

    private static double largest(double[] values) {
        return DoubleStream.of(values)
                .filter(Double::isFinite)
                .map(Math::abs)
                .max()
                .orElse(0);
    }
}
