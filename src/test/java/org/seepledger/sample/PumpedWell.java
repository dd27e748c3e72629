package org.seepledger.sample;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * A well with a schedule, and a screen that may reach through several layers.
 *
 * @param name its name
 * @param category what its water is for
 * @param x along-grid x, m; on no cell's edge
 * @param y along-grid y, m
 * @param screenTop elevation, m
 * @param screenBottom elevation, m
 * @param schedule its lines
 */
record PumpedWell(
        String name, String category, double x, double y, double screenTop, double screenBottom, List<Line> schedule) {

    /**
     * A line of a schedule.
     *
     * @param from the first day; empty: always before
     * @param to the day on which it no longer holds; empty: always after
     * @param amount m³/d, or in all m³; negative where it takes water out
     * @param isVolume whether the amount is a volume
     */
    record Line(Optional<LocalDate> from, Optional<LocalDate> to, double amount, boolean isVolume) {

        static Line always(double rate) {
            return new Line(Optional.empty(), Optional.empty(), rate, false);
        }

        static Line until(String to, double rate) {
            return new Line(Optional.empty(), Optional.of(LocalDate.parse(to)), rate, false);
        }

        static Line since(String from, double rate) {
            return new Line(Optional.of(LocalDate.parse(from)), Optional.empty(), rate, false);
        }

        static Line between(String from, String to, double rate) {
            return new Line(Optional.of(LocalDate.parse(from)), Optional.of(LocalDate.parse(to)), rate, false);
        }

        static Line volume(String from, String to, double volume) {
            return new Line(Optional.of(LocalDate.parse(from)), Optional.of(LocalDate.parse(to)), volume, true);
        }

        /** What it comes to between two days, m³. */
        private double volume(int begin, int end) {
            int first = from.map(ValleySeasons::day).orElse(begin);
            int last = to.map(ValleySeasons::day).orElse(end);
            int overlap = Math.max(0, Math.min(end, last) - Math.max(begin, first));
            return overlap * (isVolume ? amount / (last - first) : amount);
        }
    }

    /** Its mean rate in a month, m³/d. */
    double rate(int interval) {
        int begin = ValleySeasons.day(interval);
        int end = ValleySeasons.day(interval + 1);
        return schedule.stream().mapToDouble(line -> line.volume(begin, end)).sum() / (end - begin);
    }

    /**
     * {@return which part of the well's water each layer gives: by conductivity times length of screen}
     *
     * @param grid the grid
     * @param horizontal hydraulic conductivity of each cell; NaN where nothing flows
     */
    double[] shares(BlockGrid grid, double[] horizontal) {
        double[] shares = new double[grid.layers()];
        double whole = 0;
        for (int layer = 0; layer < shares.length; layer++) {
            int cell = cell(grid, layer);
            double top = Math.min(screenTop, grid.topElevation(cell));
            double length = top - Math.max(screenBottom, grid.bottomElevation(cell));
            shares[layer] = length > 0 && !Double.isNaN(horizontal[cell]) ? length * horizontal[cell] : 0;
            whole += shares[layer];
        }
        for (int layer = 0; layer < shares.length; layer++) {
            shares[layer] /= whole;
        }
        return shares;
    }

    int cell(BlockGrid grid, int layer) {
        return layer * grid.cellsInLayer() + grid.cellAt(x, y);
    }
}
