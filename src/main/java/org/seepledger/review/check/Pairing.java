package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.seepledger.review.check.Selection.Way;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.When;
import org.seepledger.review.sheet.Amount;

/** Puts what was submitted beside what was recomputed, term by term. */
final class Pairing {

    private final List<Figure> figures;
    private final Map<String, String> areas;
    private final Reference reference;
    private final Rounding rounding;
    private final double tolerance;
    private final Map<List<Object>, Selection> selections = new HashMap<>();
    private final Amount assumed;

    private Pairing(
            List<Figure> figures, Map<String, String> areas, Reference reference, Rounding rounding, double tolerance) {
        this.tolerance = tolerance;
        this.figures = figures.stream()
                .filter(figure -> !Double.isNaN(figure.value()) && tied(figure) && areas.containsKey(figure.area()))
                .toList();
        this.areas = areas;
        this.reference = reference;
        this.rounding = rounding;
        this.assumed = assumed();
    }

    private static boolean tied(Figure figure) {
        return figure.tie().kind() == Kind.ITEM || figure.tie().kind() == Kind.CHANGE;
    }

    /** A key of figures that are one term's. */
    private record Term(String prism, Selection selection, Sense sense, Amount amount) {}

    /**
     * The series of a submission.
     *
     * @param figures its figures
     * @param areas which prisms its areas are
     * @param reference what it is held against
     * @param rounding how far it was rounded
     * @param tolerance share of throughput within which figures agree
     */
    static List<Series> of(
            List<Figure> figures, Map<String, String> areas, Reference reference, Rounding rounding, double tolerance) {
        Pairing pairing = new Pairing(figures, areas, reference, rounding, tolerance);
        Map<Term, Map<When, List<Figure>>> terms = new LinkedHashMap<>();
        for (Figure figure : pairing.figures) {
            Term term = new Term(
                    areas.get(figure.area()), pairing.selection(figure), figure.sense(), pairing.amount(figure));
            terms.computeIfAbsent(term, any -> new LinkedHashMap<>())
                    .computeIfAbsent(figure.when(), any -> new ArrayList<>())
                    .add(figure);
        }
        List<Series> series = new ArrayList<>();
        terms.forEach(
                (term, periods) -> pairing.series(term, periods, terms.keySet()).ifPresent(series::add));
        return series;
    }

    private Selection selection(Figure figure) {
        return selections.computeIfAbsent(
                List.of(figure.area(), figure.tie(), figure.layer()), any -> newSelection(figure));
    }

    /** Items that are tied by name are not in what a group stands for. */
    private Selection newSelection(Figure figure) {
        Set<String> items = new TreeSet<>(items(figure));
        Set<String> named = new TreeSet<>();
        for (Figure other : figures) {
            List<String> others = items(other);
            boolean single = others.size() == 1 && others.get(0).contains("/");
            if (single && other.area().equals(figure.area()) && !items.contains(others.get(0))) {
                named.addAll(others);
            } else if (single && items.size() > 1 && other.area().equals(figure.area())) {
                items.removeAll(others);
            }
        }
        int layer = figure.layer().matches("\\d{1,3}") ? Integer.parseInt(figure.layer()) - 1 : -1;
        named.removeIf(item -> !items.contains(item.replaceFirst("/.*", "")));
        return new Selection(items, named, layer);
    }

    private static List<String> items(Figure figure) {
        return figure.tie().kind() == Kind.CHANGE
                ? List.of("storage")
                : figure.tie().items();
    }

    private Optional<Series> series(Term term, Map<When, List<Figure>> periods, Set<Term> all) {
        List<Point> points = new ArrayList<>();
        Set<String> labels = new LinkedHashSet<>();
        periods.forEach((when, list) -> reference
                .of(term.prism(), when)
                .filter(source -> term.selection().any(source.budget()))
                .ifPresent(source -> {
                    points.add(point(list, source, term));
                    list.forEach(figure -> labels.add(figure.term()));
                }));
        if (points.isEmpty()) {
            return Optional.empty();
        }
        Sense other = term.sense() == Sense.IN ? Sense.OUT : Sense.IN;
        boolean both = all.contains(new Term(term.prism(), term.selection(), other, term.amount()));
        Series gross = new Series(
                term.prism(),
                List.copyOf(labels),
                term.selection(),
                term.sense(),
                term.amount(),
                both,
                tolerance,
                Way.GROSS,
                points);
        return Optional.of(gross.settled());
    }

    private Point point(List<Figure> list, Recomputed source, Term term) {
        double submitted = 0;
        double half = 0;
        double unit = 1;
        for (Figure figure : list) {
            unit = unit(figure, source);
            submitted += figure.value() * unit;
            half += rounding.half(figure) * unit;
        }
        double value = term.selection().of(source.budget(), Way.GROSS, term.sense()) * source.cubicMetres();
        return new Point(List.copyOf(list), submitted, half, unit, source, source.budget(), value);
    }

    private Amount amount(Figure figure) {
        return figure.amount().filter(any -> any != Amount.OTHER).orElse(assumed);
    }

    /** m³ in the period for one of a figure's unit. */
    private double unit(Figure figure, Recomputed source) {
        Amount amount = amount(figure);
        double plain = figure.written()
                .filter(written -> written.amount() != Amount.OTHER)
                .map(written -> written.inMetresAndDays())
                .orElse(amount == Amount.RATE ? reference.rateUnit() : reference.volumeUnit());
        return switch (amount) {
            case RATE -> plain * source.days();
            case DEPTH -> plain * source.area();
            case DEPTH_RATE -> plain * source.area() * source.days();
            default -> plain;
        };
    }

    /** Rates or volumes, where nothing says which: what comes nearer to what was recomputed. */
    private Amount assumed() {
        double rates = 0;
        double volumes = 0;
        for (Figure figure : figures) {
            Optional<Recomputed> source = reference.of(areas.get(figure.area()), figure.when());
            if (figure.amount().isEmpty() && figure.value() != 0 && source.isPresent()) {
                double made = selection(figure).of(source.get().budget(), Way.GROSS, figure.sense())
                        * source.get().cubicMetres();
                if (made != 0) {
                    double ratio = figure.value() / made;
                    rates += Math.min(
                            5,
                            Math.abs(Math.log(Math.abs(
                                    ratio * reference.rateUnit() * source.get().days()))));
                    volumes += Math.min(5, Math.abs(Math.log(Math.abs(ratio * reference.volumeUnit()))));
                }
            }
        }
        return rates <= volumes ? Amount.RATE : Amount.VOLUME;
    }
}
