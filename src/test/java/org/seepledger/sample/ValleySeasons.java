package org.seepledger.sample;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** Two years in the valley, month by month: the first as usual, the second with a dry winter and a wet May. */
final class ValleySeasons {

    static final LocalDate START = LocalDate.of(2021, 10, 1);
    static final int MONTHS = 24;
    static final int MONTHS_A_YEAR = 12;

    /** Recharge as a multiple of the mean year's. */
    private static final double[] RECHARGE = {
        0.7, 1.5, 2.3, 2.5, 2.2, 1.5, 0.8, 0.3, 0.1, 0, 0, 0.1, //
        0.5, 1.1, 1.4, 1.5, 1.3, 1.6, 1.2, 1.1, 0.2, 0, 0, 0.1
    };

    /** How far the river stands above its normal stage, m. */
    private static final double[] RIVER_RISE = {
        -0.15, 0, 0.2, 0.35, 0.45, 0.7, 0.55, 0.2, -0.05, -0.2, -0.3, -0.25, //
        -0.2, -0.1, 0.05, 0.1, 0.15, 0.4, 0.5, 0.6, 0.05, -0.2, -0.35, -0.3
    };

    private ValleySeasons() {}

    /** Days from the start to an instant, which is a month's first. */
    static int day(int instant) {
        return day(START.plusMonths(instant));
    }

    static int day(LocalDate date) {
        return Math.toIntExact(ChronoUnit.DAYS.between(START, date));
    }

    static int days(int interval) {
        return day(interval + 1) - day(interval);
    }

    static String instants() {
        return IntStream.rangeClosed(0, MONTHS)
                .mapToObj(instant -> String.valueOf(day(instant)))
                .collect(Collectors.joining(", "));
    }

    static double riverRise(int interval) {
        return RIVER_RISE[interval];
    }

    /** Recharge in a month, whole mm/yr. */
    static int recharge(int interval, double x, double y) {
        return (int) Math.rint(RECHARGE[interval] * yearlyRecharge(x, y));
    }

    /** In a mean year, mm: less under the woods along the southern side, most on the fields north of the river. */
    static int yearlyRecharge(double x, double y) {
        double woods = 1 / (1 + StrictMath.exp((y - 520) / 80));
        double fields = StrictMath.sin(x / 430 + 1) * StrictMath.sin(y / 310);
        return (int) Math.rint(215 - 90 * woods + 55 * fields);
    }
}
