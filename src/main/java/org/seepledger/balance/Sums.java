package org.seepledger.balance;

/** A row of running sums, compensated for rounding (Neumaier 1974, ZAMM 54, 39–51, algorithm IV). */
public final class Sums {

    private final double[] sums;
    private final double[] lost;

    /**
     * Makes sums of 0.
     *
     * @param count how many
     */
    public Sums(int count) {
        sums = new double[count];
        lost = new double[count];
    }

    /**
     * Adds to one of them.
     *
     * @param index which
     * @param value what to add
     */
    public void add(int index, double value) {
        double sum = sums[index];
        double next = sum + value;
        lost[index] += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
        sums[index] = next;
    }

    /**
     * Adds others one by one.
     *
     * @param other as many sums
     */
    public void add(Sums other) {
        for (int i = 0; i < sums.length; i++) {
            add(i, other.sums[i]);
            lost[i] += other.lost[i];
        }
    }

    /**
     * {@return one of them}
     *
     * @param index which
     */
    public double get(int index) {
        return sums[index] + lost[index];
    }

    /** {@return all of them} */
    public double[] toArray() {
        double[] values = new double[sums.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = get(i);
        }
        return values;
    }
}
