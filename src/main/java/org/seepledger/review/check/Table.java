package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.When;

/**
 * What was submitted for an area and period, in one unit.
 *
 * @param area the area
 * @param when the period
 * @param unit the unit; empty if none is stated
 * @param figures the figures that were given
 */
record Table(String area, When when, String unit, List<Figure> figures) {

    /** The tables of a submission, in its order; figures that were not given are left out. */
    static List<Table> of(List<Figure> figures) {
        Map<List<Object>, List<Figure>> tables = new LinkedHashMap<>();
        for (Figure figure : figures) {
            boolean percent = figure.tie().kind() == Kind.PERCENT;
            if (!Double.isNaN(figure.value()) && !percent) {
                Object unit = figure.unit().isEmpty() ? figure.amount() : figure.unit();
                tables.computeIfAbsent(List.of(figure.area(), figure.when(), unit), key -> new ArrayList<>())
                        .add(figure);
            }
        }
        return tables.values().stream()
                .map(list -> new Table(
                        list.get(0).area(), list.get(0).when(), list.get(0).unit(), List.copyOf(list)))
                .toList();
    }

    List<Figure> of(Kind kind) {
        return figures.stream().filter(figure -> figure.tie().kind() == kind).toList();
    }

    /** What totals may be made of: each term in and out where both are given, else net. */
    List<Figure> parts() {
        Map<String, Boolean> gross = new LinkedHashMap<>();
        List<Figure> terms = figures.stream().filter(Table::isTerm).toList();
        for (Figure figure : terms) {
            boolean oneWay = figure.sense() == Sense.IN || figure.sense() == Sense.OUT;
            gross.merge(figure.term() + "/" + figure.layer(), oneWay, Boolean::logicalOr);
        }
        Predicate<Figure> counts = figure -> !gross.get(figure.term() + "/" + figure.layer())
                || figure.sense() == Sense.IN
                || figure.sense() == Sense.OUT;
        return terms.stream().filter(counts).toList();
    }

    private static boolean isTerm(Figure figure) {
        Kind kind = figure.tie().kind();
        return kind == Kind.ITEM || kind == Kind.UNTIED || kind == Kind.OUTSIDE;
    }
}
