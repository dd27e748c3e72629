package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.sheet.Amount;
import org.seepledger.unit.Figures;

/** Whether rate times duration is the volume, where a table gives both. */
final class Durations {

    private final Rounding rounding;
    private final double tolerance;
    private final List<Finding> findings = new ArrayList<>();
    private int slightly;

    private Durations(Rounding rounding, double tolerance) {
        this.rounding = rounding;
        this.tolerance = tolerance;
    }

    static List<Finding> of(List<Figure> figures, Rounding rounding, double tolerance) {
        Durations durations = new Durations(rounding, tolerance);
        List<Figure> volumes =
                figures.stream().filter(figure -> is(figure, Amount.VOLUME)).toList();
        java.util.Map<List<Object>, Figure> rates = new java.util.HashMap<>();
        figures.stream().filter(figure -> is(figure, Amount.RATE)).forEach(rate -> rates.putIfAbsent(key(rate), rate));
        for (Figure volume : volumes) {
            Optional.ofNullable(rates.get(key(volume))).ifPresent(rate -> durations.compare(rate, volume));
        }
        if (durations.slightly > 0) {
            durations.findings.add(
                    Finding.of(
                            Severity.NOTE,
                            Code.YEAR_LENGTH,
                            Finding.SEVERAL,
                            Finding.SEVERAL,
                            Finding.SEVERAL,
                            "Rates and volumes of " + durations.slightly
                                    + " figures go together only if their periods are a little longer or shorter than their dates say."));
        }
        return durations.findings;
    }

    private static boolean is(Figure figure, Amount amount) {
        return figure.amount().filter(amount::equals).isPresent()
                && figure.written().isPresent()
                && figure.tie().kind() != Kind.PERCENT
                && days(figure).isPresent()
                && !Double.isNaN(figure.value());
    }

    private static List<Object> key(Figure figure) {
        return List.of(figure.area(), figure.when(), figure.term(), figure.layer(), figure.sense());
    }

    private static Optional<Double> days(Figure figure) {
        return figure.when().days().map(days -> days.count());
    }

    private void compare(Figure rate, Figure volume) {
        double perRate = rate.written().get().inMetresAndDays() * days(rate).get();
        double perVolume = volume.written().get().inMetresAndDays();
        double made = rate.value() * perRate;
        double stated = volume.value() * perVolume;
        double rounded = rounding.half(rate) * perRate + rounding.half(volume) * perVolume + 1e-9 * Math.abs(made);
        double off = Math.abs(stated - made);
        double size = Math.max(Math.abs(stated), Math.abs(made));
        if (off <= rounded) {
            return;
        }
        if (off <= rounded + Math.max(tolerance, 0.035) * size) {
            slightly++;
            return;
        }
        String factor = KnownRatios.nearest(stated / made)
                .map(ratio -> " The ratio is that of " + ratio.words() + ".")
                .orElse("");
        findings.add(new Finding(
                Severity.FAULT,
                Code.RATE_VOLUME,
                volume.area(),
                volume.when().label(),
                volume.term(),
                volume.value(),
                made / perVolume,
                volume.unit(),
                "\"" + volume.term() + "\" is " + Figures.shown(rate.value()) + " " + rate.unit() + " and "
                        + Figures.shown(volume.value()) + " " + volume.unit() + " in "
                        + Figures.shown(days(rate).get())
                        + " days (" + rate.place() + ", " + volume.place() + ")." + factor));
    }
}
