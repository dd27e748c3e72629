package org.seepledger.aquifer;

import java.time.Duration;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Arrays;
import java.util.Optional;
import org.seepledger.unit.Measure;

/** The instants that bound the intervals, and what date the first stands for. */
public final class Times {

    private static final double SECONDS_A_DAY = 86_400;

    private final double[] instants;
    private final Measure unit;
    private final double daysPerUnit;
    private final Optional<LocalDateTime> start;

    /**
     * Makes the time axis.
     *
     * @param instants at least two strictly increasing instants, in time units
     * @param unit the time unit
     * @param start the date of time 0, if known
     * @throws IllegalArgumentException if the instants do not increase
     */
    public Times(double[] instants, Measure unit, Optional<LocalDateTime> start) {
        if (instants.length < 2) {
            throw new IllegalArgumentException("at least two instants are needed");
        }
        for (int i = 1; i < instants.length; i++) {
            if (!(instants[i] > instants[i - 1]) || !Double.isFinite(instants[i]) || !Double.isFinite(instants[0])) {
                throw new IllegalArgumentException(
                        "instants must increase; instant " + i + " is " + instants[i] + " after " + instants[i - 1]);
            }
        }
        this.instants = instants.clone();
        this.unit = unit;
        this.daysPerUnit = unit.in(Measure.of("d"));
        this.start = start;
    }

    /**
     * {@return the time unit}
     */
    public Measure unit() {
        return unit;
    }

    /**
     * {@return the number of intervals}
     */
    public int intervals() {
        return instants.length - 1;
    }

    /**
     * {@return an instant, in time units}
     *
     * @param index from 0 to {@link #intervals()}
     */
    public double instant(int index) {
        return instants[index];
    }

    /**
     * {@return how long an interval lasts, in time units}
     *
     * @param interval from 0
     */
    public double length(int interval) {
        return instants[interval + 1] - instants[interval];
    }

    /**
     * {@return the interval that holds a time; the first or last one outside the record}
     *
     * @param time in time units
     */
    public int intervalAt(double time) {
        int found = Arrays.binarySearch(instants, time);
        int interval = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(intervals() - 1, interval));
    }

    /**
     * {@return whether instants have dates}
     */
    public boolean hasDates() {
        return start.isPresent();
    }

    /**
     * {@return the date of a time, to the second}
     *
     * <p>The first instant has the start date, whatever its number.
     *
     * @param time in time units
     */
    public Optional<LocalDateTime> date(double time) {
        long seconds = Math.round((time - instants[0]) * daysPerUnit * SECONDS_A_DAY);
        return start.map(date -> date.plusSeconds(seconds));
    }

    /**
     * {@return the date of a time as ISO 8601 has it, without the hour where that is midnight}
     *
     * @param time in time units
     */
    public Optional<String> isoDate(double time) {
        return date(time).map(date -> {
            boolean midnight = date.equals(date.toLocalDate().atStartOfDay());
            return midnight ? date.toLocalDate().toString() : DateTimeFormatter.ISO_LOCAL_DATE_TIME.format(date);
        });
    }

    /**
     * {@return the time of a date, in time units}
     *
     * @param date the date
     * @throws IllegalStateException if instants have no dates
     */
    public double time(LocalDateTime date) {
        LocalDateTime first = start.orElseThrow(() -> new IllegalStateException("the set has no start_date"));
        return instants[0] + Duration.between(first, date).toSeconds() / SECONDS_A_DAY / daysPerUnit;
    }
}
