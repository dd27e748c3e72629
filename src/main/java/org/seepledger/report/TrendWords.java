package org.seepledger.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Times;
import org.seepledger.io.result.MassUnits;
import org.seepledger.plume.Course;
import org.seepledger.statistics.FirstOrderRate;
import org.seepledger.statistics.Interval;
import org.seepledger.statistics.MannKendall;
import org.seepledger.statistics.Trend;

/** Where a plume goes, and what its mass and outflow show of a trend, in words. */
final class TrendWords {

    /** Limits that differ by less are one limit and its rounding. */
    private static final double ROUNDING = 1e-9;

    private final PlumeResult result;
    private final MassUnits units;
    private final Wording wording;
    private final Times times;

    TrendWords(PlumeResult result, MassUnits units, Wording wording) {
        this.result = result;
        this.units = units;
        this.wording = wording;
        this.times = result.aquifer().times();
    }

    /** The way of the centre of mass, and the spread about it; what a prism holds, not what lies beyond it. */
    List<String> path() {
        int[] located = IntStream.rangeClosed(0, result.end())
                .filter(result.course()::isLocated)
                .toArray();
        if (located.length < 2) {
            return List.of(
                    "At " + (located.length == 0 ? "no" : "only one") + " instant is there mass that hardly rests on"
                            + " non-detects, so that no way of a centre can be given.");
        }
        int begin = located[0];
        int end = located[located.length - 1];
        Course.Place first = result.course().at(begin);
        Course.Place last = result.course().at(end);
        double way = Math.hypot(last.x() - first.x(), last.y() - first.y())
                * result.aquifer().grid().planUnit();
        double time = times.instant(end) - times.instant(begin);
        return List.of(
                "From " + instant(begin) + " to " + instant(end) + " the centre of mass moves " + length(way)
                        + " in plan, " + length(way / time) + "/" + times.unit()
                        + " on average, and from elevation " + length(first.elevation()) + " to "
                        + length(last.elevation()) + ".",
                "The spread (one standard deviation) along the longer axis goes from " + length(first.along()) + " to "
                        + length(last.along()) + ", across from " + length(first.across()) + " to "
                        + length(last.across()) + ", upright from " + length(first.upright()) + " to "
                        + length(last.upright()) + ".",
                "Centre and spread are of what lies within the prism: mass that leaves it is no longer in them. Instants at"
                        + " which more than 15 % of the mass rests on non-detects are left out.");
    }

    private String instant(int instant) {
        double time = times.instant(instant);
        return times.isoDate(time)
                .orElseGet(() -> "time " + wording.quantity(time, times.unit().toString()));
    }

    /** What mass in place and outflow show. */
    List<String> trend() {
        List<String> sentences = new ArrayList<>();
        String perTime = " per " + times.unit();
        add(
                sentences,
                "Mass in place",
                "mass in place",
                result.course().ofMass(),
                units.massFactor(),
                wording.unit(units.mass()) + perTime);
        result.course()
                .ofOutflow()
                .ifPresent(trend -> add(
                        sentences,
                        "Outflow through faces",
                        "outflow through faces",
                        trend,
                        units.rateFactor(),
                        wording.unit(units.rate()) + perTime));
        if (result.plume().limitsRatio() > 1 + ROUNDING) {
            sentences.add("Detection limits differ; a trend may be the limits' alone.");
        }
        return sentences;
    }

    private void add(List<String> sentences, String begin, String what, Trend trend, double factor, String unit) {
        double slope = trend.slope().slope() * factor;
        String verb = slope < 0 ? " falls by " : slope > 0 ? " rises by " : " shows no slope: ";
        String ends = trend.slope()
                .interval()
                .map(found -> " (95 % interval of the slope " + wording.number(found.low() * factor) + " to "
                        + wording.number(found.high() * factor) + ")")
                .orElse("");
        sentences.add(begin + verb + wording.quantity(Math.abs(slope), unit)
                + ", the median of the slopes between all pairs of values" + ends + ". " + kind(trend));
        trend.test().ifPresent(test -> sentences.add(test(test)));
        trend.rate().ifPresent(rate -> sentences.add(rate(what, rate)));
    }

    private String kind(Trend trend) {
        return switch (trend.kind()) {
            case SIMULATED -> "The values are simulated, no independent samples: a slope is all that can be said.";
            case CORRELATED ->
                "Each value follows the one before it (correlation "
                        + wording.number(trend.correlation().orElseThrow().lagOne())
                        + "), so that tests would be too sure: a slope is all that can be said.";
            case INDEPENDENT -> "The values are taken as independent of each other.";
        };
    }

    private String test(MannKendall test) {
        String begin = "Rank test: S = " + wording.number(test.s()) + " of " + test.count() + " values; ";
        if (test.probability().isEmpty()) {
            return begin + "fewer than " + MannKendall.LEAST + " values show no trend with any confidence.";
        }
        String how = test.count() <= MannKendall.MOST_EXACT ? "exact" : "normal approximation";
        return begin + "without any trend an S as far from 0 or farther has a probability of "
                + wording.number(test.probability().getAsDouble()) + " (" + how + ").";
    }

    private String rate(String what, FirstOrderRate rate) {
        String perTime = "1/" + times.unit();
        String ends = rate.interval()
                .map(found -> " (95 % interval " + between(found) + ")")
                .orElse("");
        String half = rate.halfLife().isPresent()
                ? "half of it is gone in "
                        + wording.quantity(
                                rate.halfLife().getAsDouble(), times.unit().toString())
                        + rate.halfLifeInterval().map(this::halves).orElse("")
                : "it does not fall";
        return "First-order rate of " + what + ": " + wording.quantity(rate.rate(), perTime) + ends + "; " + half
                + ". That is how fast it falls by whatever way, outflow, decay, dilution below detection: no rate of"
                + " degradation, nor of concentration at a point.";
    }

    private String halves(Interval found) {
        return Double.isInfinite(found.high())
                ? " (95 % interval from " + wording.number(found.low())
                        + " without an upper end: it may not fall at all)"
                : " (95 % interval " + between(found) + ")";
    }

    private String between(Interval ends) {
        return wording.number(ends.low()) + " to " + wording.number(ends.high());
    }

    private String length(double value) {
        return wording.quantity(value, wording.unit(result.aquifer().lengthUnit()));
    }
}
