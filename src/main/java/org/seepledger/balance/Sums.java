package org.seepledger.balance;

/** A row of running sums, compensated for rounding (Neumaier 1974, ZAMM 54, 39–51, algorithm IV). */
final class Sums {

    private final double[] sums;
    private final double[] lost;

    Sums(int count) {
        sums = new double[count];
        lost = new double[count];
    }

    void add(int index, double value) {
        double sum = sums[index];
        double next = sum + value;
        lost[index] += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
        sums[index] = next;
    }

    void add(Sums other) {
        for (int i = 0; i < sums.length; i++) {
            add(i, other.sums[i]);
            lost[i] += other.lost[i];
        }
    }

    double get(int index) {
        return sums[index] + lost[index];
    }

    double[] toArray() {
        double[] values = new double[sums.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = get(i);
        }
        return values;
    }
}
