package org.seepledger.picture;

import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.seepledger.aquifer.Times;

/** Round times along an axis: ISO dates at the beginning of years, months, days or hours; else time units. */
final class TimeTicks {

    private static final int MOST = 40;
    private static final List<Step> STEPS = steps();

    private TimeTicks() {}

    /**
     * A tick.
     *
     * @param time in time units
     * @param label its label
     */
    record Tick(double time, String label) {}

    /** A number of calendar units, and how their beginnings are written. */
    private record Step(ChronoUnit unit, int count, DateTimeFormatter format) {

        static Step of(ChronoUnit unit, int count, String pattern) {
            return new Step(unit, count, DateTimeFormatter.ofPattern(pattern, Locale.ROOT));
        }

        /** {@return the last beginning of such a step that is not after a date} */
        LocalDateTime before(LocalDateTime date) {
            LocalDateTime day = date.truncatedTo(ChronoUnit.DAYS);
            return switch (unit) {
                case HOURS -> day.plusHours((long) date.getHour() / count * count);
                case DAYS -> day.minusDays(Math.floorMod(day.toLocalDate().toEpochDay(), count));
                case MONTHS -> day.withDayOfMonth(1).minusMonths((date.getMonthValue() - 1) % count);
                default -> day.withDayOfYear(1).minusYears(Math.floorMod(date.getYear(), count));
            };
        }
    }

    private static List<Step> steps() {
        List<Step> steps = new ArrayList<>();
        for (int hours : new int[] {1, 3, 6, 12}) {
            steps.add(Step.of(ChronoUnit.HOURS, hours, "uuuu-MM-dd HH:mm"));
        }
        for (int days : new int[] {1, 2, 5, 10}) {
            steps.add(Step.of(ChronoUnit.DAYS, days, "uuuu-MM-dd"));
        }
        for (int months : new int[] {1, 3, 6}) {
            steps.add(Step.of(ChronoUnit.MONTHS, months, "uuuu-MM"));
        }
        for (int years : new int[] {1, 2, 5, 10, 20, 50, 100, 200, 500, 1000}) {
            steps.add(Step.of(ChronoUnit.YEARS, years, "uuuu"));
        }
        return steps;
    }

    /**
     * {@return as many ticks as have room}
     *
     * @param times the record's instants
     * @param from where the axis begins, in time units
     * @param to where it ends
     * @param length of the axis, in logical pixels
     * @param size of the labels
     */
    static List<Tick> along(Times times, double from, double to, double length, double size) {
        if (times.hasDates()) {
            for (Step step : STEPS) {
                List<Tick> ticks = dates(step, times, from, to);
                double room = ticks.stream()
                        .mapToDouble(tick -> 1.25 * Lettering.width(tick.label(), size))
                        .sum();
                if (ticks.size() < MOST && room <= length && !ticks.isEmpty()) {
                    return ticks;
                }
            }
        }
        return units(times, from, to, length, size);
    }

    private static List<Tick> dates(Step step, Times times, double from, double to) {
        List<Tick> ticks = new ArrayList<>();
        LocalDateTime first = step.before(times.date(from).orElseThrow());
        for (int i = 0; ticks.size() < MOST; i++) {
            LocalDateTime date = first.plus((long) i * step.count(), step.unit());
            double time = times.time(date);
            if (time > to + 1e-9 * Math.abs(to)) {
                break;
            }
            if (time >= from - 1e-9 * Math.abs(from)) {
                ticks.add(new Tick(time, step.format().format(date)));
            }
        }
        return ticks;
    }

    private static List<Tick> units(Times times, double from, double to, double length, double size) {
        double widest = 0;
        Ticks round = Ticks.within(from, to, 2);
        for (int most = 2; most <= 12; most++) {
            Ticks finer = Ticks.within(from, to, most);
            widest = 0;
            for (int i = 0; i < finer.count(); i++) {
                widest = Math.max(widest, Lettering.width(label(finer, i, times), size));
            }
            round = finer.count() * 1.25 * widest <= length ? finer : round;
        }
        List<Tick> ticks = new ArrayList<>();
        for (int i = 0; i < round.count(); i++) {
            ticks.add(new Tick(round.values().get(i), label(round, i, times)));
        }
        return ticks;
    }

    private static String label(Ticks ticks, int index, Times times) {
        return ticks.label(index) + "\u202f" + times.unit();
    }
}
