package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.plume.Course;
import org.seepledger.plume.Plume;
import org.seepledger.statistics.Interval;
import org.seepledger.statistics.MannKendall;
import org.seepledger.statistics.Trend;
import org.seepledger.unit.Measure;

/** Writes {@code trend.csv}: plumes through time, and what their mass and outflow show of a trend. */
public final class TrendCsv {

    private static final String[] HEADER = {
        "prism", "solute", "quantity", "kind", "time", "date", "value", "low", "high", "unit", "words"
    };
    private static final String NO_END = "no upper end: the rate may be none";
    private static final String RATE_OF_MASS = "rate at which mass in the prism falls, by whatever way: outflow, decay,"
            + " dilution below detection; no rate of degradation, nor of concentration at a point";
    private static final String RATE_OF_OUTFLOW =
            "rate at which outflow through the prism's faces falls; no rate of degradation";

    private final Times times;
    private final MassUnits units;
    private final Measure length;
    private final ResultTable rows;

    private TrendCsv(Times times, MassUnits units, Measure length, ResultTable rows) {
        this.times = times;
        this.units = units;
        this.length = length;
        this.rows = rows;
    }

    /**
     * Writes the table.
     *
     * @param file the file, which must not exist
     * @param statement what stands before the rows
     * @param plumes by prism and solute
     * @param times the record's instants
     * @param grid the grid
     * @param units the units to give
     * @param length the set's length unit
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file, Statement statement, List<Plume> plumes, Times times, Grid grid, MassUnits units, Measure length)
            throws IOException {
        try (ResultTable rows = ResultTable.open(file, PlumeCsv.notes(statement), HEADER)) {
            TrendCsv table = new TrendCsv(times, units, length, rows);
            for (Plume plume : plumes) {
                table.write(plume, new Course(plume, times, grid));
            }
        }
    }

    private void write(Plume plume, Course course) throws IOException {
        for (int instant = 0; instant <= times.intervals(); instant++) {
            Course.Place place = course.at(instant);
            double time = times.instant(instant);
            value(
                    plume,
                    "mass",
                    time,
                    place.mass() * units.massFactor(),
                    units.mass().toString());
            value(plume, "centre x", time, place.x(), "");
            value(plume, "centre y", time, place.y(), "");
            value(plume, "centre elevation", time, place.elevation(), length.toString());
            value(plume, "spread along", time, place.along(), length.toString());
            value(plume, "spread across", time, place.across(), length.toString());
            value(plume, "spread upright", time, place.upright(), length.toString());
            value(plume, "direction", time, place.direction(), "degrees");
        }
        for (int interval = 0; interval < times.intervals(); interval++) {
            double rate = course.outflow(interval) * units.rateFactor();
            value(plume, "outflow", course.middle(interval), rate, units.rate().toString());
        }
        String perTime = "/" + times.unit();
        trend(plume, "mass", course.ofMass(), units.massFactor(), units.mass() + perTime, RATE_OF_MASS);
        Optional<Trend> outflow = course.ofOutflow();
        if (outflow.isPresent()) {
            String unit = units.rate() + perTime;
            trend(plume, "outflow", outflow.get(), units.rateFactor(), unit, RATE_OF_OUTFLOW);
        }
    }

    private void trend(Plume plume, String of, Trend trend, double factor, String slopeUnit, String ofRate)
            throws IOException {
        Optional<Interval> ends = trend.slope().interval();
        String words = switch (trend.kind()) {
            case INDEPENDENT -> "median of the slopes between all pairs";
            case SIMULATED -> "simulated: values are no independent samples, so that a slope is all that can be said";
            case CORRELATED -> "values follow each other, so that tests would be too sure: a slope alone";
        };
        row(plume, of, "slope", trend.slope().slope() * factor, ends, factor, slopeUnit, words);
        if (trend.correlation().isPresent()) {
            double r = trend.correlation().get().lagOne();
            row(
                    plume,
                    of,
                    "serial correlation",
                    r,
                    Optional.empty(),
                    1,
                    "",
                    "of what the slope leaves, one step apart");
        }
        if (trend.test().isPresent()) {
            MannKendall test = trend.test().get();
            row(plume, of, "rank statistic S", test.s(), Optional.empty(), 1, "", "variance " + test.variance());
            double probability = test.probability().orElse(Double.NaN);
            String how = Double.isNaN(probability)
                    ? "none below " + MannKendall.LEAST + " values"
                    : "of an S as far from 0 without a trend, both ways"
                            + (test.count() <= MannKendall.MOST_EXACT ? ", exact" : ", normal approximation");
            row(plume, of, "probability", probability, Optional.empty(), 1, "", how);
        }
        if (trend.rate().isPresent()) {
            String perTime = "1/" + times.unit();
            row(
                    plume,
                    of,
                    "first-order rate",
                    trend.rate().get().rate(),
                    trend.rate().get().interval(),
                    1,
                    perTime,
                    ofRate);
            double half = trend.rate().get().halfLife().orElse(Double.NaN);
            Optional<Interval> around = trend.rate().get().halfLifeInterval();
            boolean open =
                    around.filter(found -> Double.isInfinite(found.high())).isPresent();
            String said = Double.isNaN(half) ? "none: it does not fall" : open ? NO_END : "";
            row(plume, of, "half-life", half, around, 1, times.unit().toString(), said);
        }
    }

    private void value(Plume plume, String quantity, double time, double value, String unit) throws IOException {
        begin(plume, quantity, "value");
        rows.cells(CsvText.number(time), times.isoDate(time).orElse(""), CsvText.number(value), "", "", unit, "");
        rows.endRow();
    }

    private void row(
            Plume plume,
            String quantity,
            String kind,
            double value,
            Optional<Interval> ends,
            double factor,
            String unit,
            String words)
            throws IOException {
        begin(plume, quantity, kind);
        rows.cells("", "", CsvText.number(value));
        rows.cells(end(ends.map(Interval::low), factor), end(ends.map(Interval::high), factor), unit, words);
        rows.endRow();
    }

    private static String end(Optional<Double> end, double factor) {
        return end.filter(Double::isFinite)
                .map(value -> CsvText.number(value * factor))
                .orElse("");
    }

    private void begin(Plume plume, String quantity, String kind) throws IOException {
        rows.cells(CsvText.text(plume.prism()), CsvText.text(plume.solute().name()), quantity, kind);
    }
}
