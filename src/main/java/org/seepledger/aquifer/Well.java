package org.seepledger.aquifer;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A point source with its schedule: all lines of one name, place, screen and category.
 *
 * @param name its name
 * @param category what it counts as in the budget
 * @param x map x
 * @param y map y
 * @param screen where in depth
 * @param schedule its rates, which add where they overlap
 */
public record Well(String name, String category, double x, double y, Screen screen, List<PointRate> schedule) {

    /** Copies the list. */
    public Well {
        schedule = List.copyOf(schedule);
    }

    /**
     * {@return the wells that lines of points files make, in order of first mention}
     *
     * @param lines the lines
     */
    public static List<Well> of(List<PointRate> lines) {
        Map<Well, List<PointRate>> grouped = new LinkedHashMap<>();
        for (PointRate line : lines) {
            Well key = new Well(line.name(), line.category(), line.x(), line.y(), line.screen(), List.of());
            grouped.computeIfAbsent(key, well -> new ArrayList<>()).add(line);
        }
        return grouped.entrySet().stream()
                .map(entry -> entry.getKey().withSchedule(entry.getValue()))
                .toList();
    }

    /** {@return a line of the schedule that begins before an earlier one ends, so that their rates add; empty if none does} */
    public Optional<PointRate> overlapping() {
        List<PointRate> inTime = schedule.stream()
                .sorted(Comparator.comparingDouble(PointRate::from))
                .toList();
        double end = Double.NEGATIVE_INFINITY;
        for (PointRate line : inTime) {
            if (line.from() < end) {
                return Optional.of(line);
            }
            end = Math.max(end, line.to());
        }
        return Optional.empty();
    }

    private Well withSchedule(List<PointRate> lines) {
        return new Well(name, category, x, y, screen, lines);
    }

    /**
     * {@return what the mean rate over an interval is made of: number × factor for each line of the schedule that lasts in
     * it}
     *
     * @param from the interval's begin, in time units
     * @param to its end
     */
    public List<Stored> stored(double from, double to) {
        List<Stored> parts = new ArrayList<>();
        for (PointRate line : schedule) {
            double overlap = Math.min(to, line.to()) - Math.max(from, line.from());
            if (overlap > 0) {
                parts.add(line.given().times(overlap / (to - from)));
            }
        }
        return parts;
    }

    /**
     * {@return the mean rate over an interval, length³/time, positive where it adds water}
     *
     * @param from the interval's begin, in time units
     * @param to its end
     */
    public double meanRate(double from, double to) {
        double volume = 0;
        boolean whole = true;
        for (PointRate line : schedule) {
            double overlap = Math.min(to, line.to()) - Math.max(from, line.from());
            whole &= overlap >= to - from;
            volume += overlap > 0 ? line.rate() * overlap : 0;
        }
        return whole ? schedule.stream().mapToDouble(PointRate::rate).sum() : volume / (to - from);
    }
}
