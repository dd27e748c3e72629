package org.seepledger.review.mapping;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Gives a row that is the total of all periods the days from the first of them to the last. */
final class Wholes {

    private Wholes() {}

    static List<Figure> settled(List<Figure> figures) {
        List<Days> known = figures.stream()
                .map(Figure::when)
                .filter(when -> !when.whole())
                .map(When::days)
                .flatMap(Optional::stream)
                .toList();
        if (known.isEmpty()) {
            return figures;
        }
        LocalDate from =
                known.stream().map(Days::from).min(Comparator.naturalOrder()).orElseThrow();
        LocalDate to =
                known.stream().map(Days::to).max(Comparator.naturalOrder()).orElseThrow();
        return figures.stream()
                .map(figure -> settled(figure, new Days(from, to)))
                .toList();
    }

    private static Figure settled(Figure figure, Days days) {
        When when = figure.when();
        boolean open = when.whole() && when.days().isEmpty();
        return open
                ? figure.in(new When(when.label(), when.name(), Optional.of(days), when.from(), when.to(), true))
                : figure;
    }
}
