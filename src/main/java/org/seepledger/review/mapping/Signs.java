package org.seepledger.review.mapping;

import java.util.List;

/** Finds out whether a table writes what goes out with a minus, and takes the minus away where it does. */
final class Signs {

    private Signs() {}

    /** Figures whose outflows are positive. */
    static List<Figure> settled(List<Figure> figures) {
        long negative = count(figures, -1);
        long positive = count(figures, 1);
        if (negative <= positive) {
            return figures;
        }
        return figures.stream()
                .map(figure -> counts(figure) ? figure.turned() : figure)
                .toList();
    }

    private static boolean counts(Figure figure) {
        return figure.sense() == Sense.OUT
                && (figure.tie().kind() == Kind.ITEM || figure.tie().kind() == Kind.UNTIED);
    }

    private static long count(List<Figure> figures, int sign) {
        return figures.stream()
                .filter(Signs::counts)
                .filter(figure -> Math.signum(figure.value()) == sign)
                .count();
    }
}
