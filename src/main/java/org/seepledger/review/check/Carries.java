package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.unit.Figures;

/** Whether stocks carry over: end − start is the change, and the end of a period the start of the next. */
final class Carries {

    private Carries() {}

    static List<Finding> of(List<Table> tables, Rounding rounding) {
        List<Finding> findings = new ArrayList<>();
        Table before = null;
        for (Table table : tables) {
            Optional<Figure> opening = only(table, Kind.OPENING);
            Optional<Figure> closing = only(table, Kind.CLOSING);
            Optional<Figure> change = only(table, Kind.CHANGE);
            if (opening.isPresent() && closing.isPresent() && change.isPresent()) {
                Sum made = Sum.of(List.of(closing.get()), rounding, Figure::value)
                        .minus(Sum.of(List.of(opening.get()), rounding, Figure::value));
                check(findings, table, change.get(), made, rounding, "end less start");
            }
            if (before != null
                    && before.area().equals(table.area())
                    && before.unit().equals(table.unit())
                    && follows(before, table)) {
                Optional<Figure> last = only(before, Kind.CLOSING);
                if (opening.isPresent() && last.isPresent()) {
                    Sum made = Sum.of(List.of(last.get()), rounding, Figure::value);
                    check(
                            findings,
                            table,
                            opening.get(),
                            made,
                            rounding,
                            "the end of " + before.when().label());
                }
            }
            before = table;
        }
        return findings;
    }

    private static boolean follows(Table before, Table table) {
        return before.when().days().isPresent()
                && table.when().days().isPresent()
                && before.when()
                        .days()
                        .get()
                        .to()
                        .equals(table.when().days().get().from());
    }

    private static Optional<Figure> only(Table table, Kind kind) {
        List<Figure> found = table.of(kind);
        return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
    }

    private static void check(
            List<Finding> findings, Table table, Figure stated, Sum made, Rounding rounding, String words) {
        if (!made.agrees(new Sum(stated.value(), rounding.half(stated)))) {
            findings.add(new Finding(
                    Severity.FAULT,
                    Code.CARRY,
                    table.area(),
                    table.when().label(),
                    stated.term(),
                    stated.value(),
                    made.value(),
                    table.unit(),
                    "\"" + stated.term() + "\" is " + Figures.shown(stated.value()) + " (" + stated.place() + "), but "
                            + words + " is " + Figures.shown(made.value()) + "."));
        }
    }
}
