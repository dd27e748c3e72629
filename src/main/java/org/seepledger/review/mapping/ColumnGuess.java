package org.seepledger.review.mapping;

import java.util.List;
import java.util.Optional;
import org.seepledger.review.sheet.Sheet;
import org.seepledger.review.sheet.UnitWords;

/** Guesses from its heading what a column holds, and of figures which period, area or term they are of. */
final class ColumnGuess {

    private final Sheet sheet;
    private final Catalogue catalogue;
    private final PeriodWords periods;
    private final TermWords terms;

    ColumnGuess(Sheet sheet, Catalogue catalogue, PeriodWords periods, TermWords terms) {
        this.sheet = sheet;
        this.catalogue = catalogue;
        this.periods = periods;
        this.terms = terms;
    }

    /** What a column probably holds. */
    Column of(HeaderSearch.Header header, int index, boolean figures) {
        String text = header.texts().get(index);
        String own = sheet.cell(header.row(), index);
        String last = own.isEmpty() || UnitWords.isUnit(own) ? text : own;
        Optional<Role> role =
                ColumnWords.role(text).or(() -> last.equals(text) ? Optional.empty() : ColumnWords.role(last));
        if (role.isPresent() && role.get() != Role.VALUE) {
            return Column.of(text, role.get());
        }
        if (text.isEmpty() || !figures) {
            return Column.of(text, Role.IGNORED);
        }
        return values(text, last);
    }

    /** A column of figures, with all that its heading says of them. */
    private Column values(String text, String last) {
        String unit = UnitWords.in(text).orElse("");
        String period = "";
        String area = "";
        String term = "";
        String rest = text.equals(last)
                ? ""
                : text.substring(0, text.length() - last.length()).strip();
        for (String part : List.of(rest, last)) {
            String words = UnitWords.without(part);
            if (words.isEmpty()
                    || ColumnWords.role(part).filter(Role.VALUE::equals).isPresent()) {
                continue;
            }
            String named = periodBehind(words);
            period = named.isEmpty() ? period : named;
            String before = words.substring(0, words.length() - named.length()).strip();
            if (isPrism(before)) {
                area = before;
            } else if (!before.isEmpty()
                    && (named.isEmpty() || terms.of(before, "").kind() != Kind.UNTIED)) {
                term = before;
            }
        }
        Optional<Sense> sense =
                ColumnWords.role(last).filter(Role.VALUE::equals).flatMap(value -> ColumnWords.sense(last));
        return new Column(text, Role.VALUE, term, period, area, sense, ColumnWords.amount(text), unit);
    }

    /** The period that a heading is or ends with; empty if none. */
    private String periodBehind(String words) {
        String rest = words;
        while (!rest.isEmpty()) {
            if (periods.isPeriod(rest) || rest.equals(words) && MappingGuess.isWhole(rest)) {
                return rest;
            }
            int blank = rest.indexOf(' ');
            rest = blank < 0 ? "" : rest.substring(blank + 1);
        }
        return "";
    }

    boolean isPrism(String words) {
        return catalogue.prisms().stream().anyMatch(words::equalsIgnoreCase);
    }
}
