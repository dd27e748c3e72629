package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.review.mapping.Days;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.sheet.Amount;

/** Whether shorter periods make up the longer ones: volumes add, rates have the mean over time. */
final class Parts {

    private static final double DAY = 1e-6;

    private final Rounding rounding;
    private final double tolerance;

    private Parts(Rounding rounding, double tolerance) {
        this.rounding = rounding;
        this.tolerance = tolerance;
    }

    /** How far a figure is from what its parts make. */
    private record Off(Figure whole, double made, double half) {

        double off() {
            return whole.value() - made;
        }
    }

    static List<Finding> of(List<Figure> figures, Rounding rounding, double tolerance) {
        Parts parts = new Parts(rounding, tolerance);
        Map<List<Object>, List<Figure>> series = new LinkedHashMap<>();
        for (Figure figure : figures) {
            Kind kind = figure.tie().kind();
            boolean adds = kind != Kind.PERCENT && kind != Kind.OPENING && kind != Kind.CLOSING;
            if (adds && !Double.isNaN(figure.value())) {
                List<Object> key = List.of(
                        figure.area(), figure.term(), figure.layer(), figure.sense(), figure.unit(), figure.amount());
                series.computeIfAbsent(key, any -> new ArrayList<>()).add(figure);
            }
        }
        List<Off> offs = series.values().stream()
                .flatMap(list -> parts.offs(list).stream())
                .toList();
        return offs.stream()
                .filter(off -> !parts.cancels(off, offs))
                .map(parts::finding)
                .toList();
    }

    private List<Off> offs(List<Figure> series) {
        List<Off> offs = new ArrayList<>();
        for (Figure whole : series) {
            tiles(whole, series).flatMap(tiles -> off(whole, tiles)).ifPresent(offs::add);
        }
        return offs;
    }

    /** The periods that make up a longer one without gap; the longest ones that do. */
    private static Optional<List<Figure>> tiles(Figure whole, List<Figure> series) {
        List<Figure> inside = series.stream()
                .filter(part -> part.when().days().isPresent() && !part.when().whole())
                .filter(part -> !part.when().equals(whole.when()))
                .toList();
        if (whole.when().whole() && whole.when().days().isEmpty()) {
            return inside.size() > 1 && inside.size() == series.size() - 1 ? Optional.of(inside) : Optional.empty();
        }
        if (whole.when().days().isEmpty()) {
            return Optional.empty();
        }
        Days days = whole.when().days().get();
        List<Figure> tiles = new ArrayList<>();
        java.time.LocalDate at = days.from();
        while (at.isBefore(days.to())) {
            java.time.LocalDate begin = at;
            Optional<Figure> next = inside.stream()
                    .filter(part -> part.when().days().get().from().equals(begin))
                    .filter(part -> !part.when().days().get().to().isAfter(days.to()))
                    .filter(part -> part.when().days().get().count() < days.count() - DAY)
                    .max(Comparator.comparingDouble(
                            part -> part.when().days().get().count()));
            if (next.isEmpty()) {
                return Optional.empty();
            }
            tiles.add(next.get());
            at = next.get().when().days().get().to();
        }
        return Optional.of(tiles);
    }

    private Optional<Off> off(Figure whole, List<Figure> tiles) {
        double sum = 0;
        double weighted = 0;
        double days = 0;
        double half = rounding.half(whole);
        for (Figure tile : tiles) {
            double length = tile.when().days().get().count();
            sum += tile.value();
            weighted += tile.value() * length;
            days += length;
            half += rounding.half(tile);
        }
        boolean rate = whole.amount()
                .filter(amount -> amount == Amount.RATE || amount == Amount.DEPTH_RATE)
                .isPresent();
        boolean known = whole.amount().isPresent();
        double mean = weighted / days;
        List<Double> made = rate
                ? List.of(mean, sum / tiles.size())
                : known ? List.of(sum) : List.of(sum, mean, sum / tiles.size());
        double rounded = rate ? 2 * rounding.half(whole) + half / tiles.size() : half;
        double allowed = rounded + 1e-9 * Math.abs(whole.value());
        boolean fits = made.stream().anyMatch(value -> Math.abs(whole.value() - value) <= allowed);
        return fits ? Optional.empty() : Optional.of(new Off(whole, made.get(0), allowed));
    }

    /** A term that flows now in, now out may be netted over the longer period: then in and out are off by the same. */
    private boolean cancels(Off off, List<Off> offs) {
        Figure whole = off.whole();
        return offs.stream()
                .filter(other -> other != off
                        && other.whole().area().equals(whole.area())
                        && other.whole().when().equals(whole.when())
                        && other.whole().unit().equals(whole.unit()))
                .filter(other -> partner(whole, other.whole()))
                .anyMatch(other -> Math.abs(other.off() - off.off()) <= off.half() + other.half());
    }

    private static boolean partner(Figure one, Figure other) {
        boolean totals = one.tie().kind() == Kind.TOTAL_IN && other.tie().kind() == Kind.TOTAL_OUT
                || one.tie().kind() == Kind.TOTAL_OUT && other.tie().kind() == Kind.TOTAL_IN;
        boolean opposite = one.sense() == Sense.IN && other.sense() == Sense.OUT
                || one.sense() == Sense.OUT && other.sense() == Sense.IN;
        return totals
                || opposite
                        && (one.term().equals(other.term())
                                || one.tie().items().equals(other.tie().items()));
    }

    private Finding finding(Off off) {
        Figure whole = off.whole();
        boolean slight = Math.abs(off.off()) <= tolerance * Math.max(Math.abs(off.made()), Math.abs(whole.value()));
        return new Finding(
                slight ? Severity.NOTE : Severity.FAULT,
                slight ? Code.SLIGHT : Code.PARTS,
                whole.area(),
                whole.when().label(),
                whole.term(),
                whole.value(),
                off.made(),
                whole.unit(),
                "\"" + whole.term() + "\" of " + whole.when().label() + " (" + whole.place()
                        + ") is not what the shorter periods in the table make.");
    }
}
