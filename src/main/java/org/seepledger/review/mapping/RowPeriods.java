package org.seepledger.review.mapping;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.seepledger.review.sheet.Numeral;
import org.seepledger.review.sheet.Numerals;
import org.seepledger.review.sheet.Sheet;

/** Tells the periods of a table's rows, from their labels and from columns of begin and end. */
final class RowPeriods {

    private final Sheet sheet;
    private final Mapping mapping;
    private final List<Column> columns;
    private final Numerals numerals;
    private final PeriodWords periods;

    RowPeriods(Sheet sheet, Mapping mapping, Numerals numerals, PeriodWords periods) {
        this.sheet = sheet;
        this.mapping = mapping;
        this.columns = mapping.columns();
        this.numerals = numerals;
        this.periods = periods;
    }

    /** The period of a row whose label is known. */
    When of(int row, String label) {
        String tied = mapping.periods().getOrDefault(label, label);
        Optional<Days> days = periods.of(tied);
        double from = Double.NaN;
        double to = Double.NaN;
        Optional<LocalDate> first = Optional.empty();
        Optional<LocalDate> last = Optional.empty();
        for (int column = 0; column < columns.size(); column++) {
            Role role = columns.get(column).role();
            String cell = sheet.cell(row, column);
            if (role == Role.FROM) {
                first = PeriodWords.day(cell).isPresent() ? PeriodWords.day(cell) : first;
                from = number(cell, from);
            } else if (role == Role.TO) {
                last = PeriodWords.day(cell).isPresent() ? PeriodWords.day(cell) : last;
                to = number(cell, to);
            }
        }
        if (first.isPresent() && last.isPresent()) {
            days = Days.between(first.get(), last.get());
        }
        String named = label.isEmpty() && days.isPresent()
                ? days.get().from() + " to " + days.get().to()
                : label;
        return new When(named, label.isEmpty() ? named : tied, days, from, to, MappingGuess.isWhole(label));
    }

    private double number(String cell, double before) {
        return PeriodWords.day(cell).isPresent()
                ? before
                : numerals.read(cell).map(Numeral::value).orElse(before);
    }
}
