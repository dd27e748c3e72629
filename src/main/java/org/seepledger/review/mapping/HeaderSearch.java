package org.seepledger.review.mapping;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.review.sheet.Numerals;
import org.seepledger.review.sheet.Sheet;
import org.seepledger.review.sheet.UnitWords;

/** Finds the header of a table: the line whose words are most like headings, with the line of groups above it. */
final class HeaderSearch {

    private static final int LINES_LOOKED_AT = 80;
    private static final double NUMBER = -2;

    private final Sheet sheet;
    private final Numerals numerals;
    private final TermWords terms;
    private final PeriodWords periods;
    private final Catalogue catalogue;

    HeaderSearch(Sheet sheet, Numerals numerals, TermWords terms, PeriodWords periods, Catalogue catalogue) {
        this.sheet = sheet;
        this.numerals = numerals;
        this.terms = terms;
        this.periods = periods;
        this.catalogue = catalogue;
    }

    /**
     * A header.
     *
     * @param row its last line
     * @param texts the heading of each column
     */
    record Header(int row, List<String> texts) {}

    /** The header; empty where no line is like one. */
    Optional<Header> find() {
        int best = -1;
        double most = 0.4;
        int lookedAt = 0;
        for (int row = 0; row < sheet.rows().size() - 1 && lookedAt < LINES_LOOKED_AT; row++) {
            lookedAt += sheet.isBlank(row) ? 0 : 1;
            double score = score(row);
            if (score > most && hasFiguresBelow(row)) {
                best = row;
                most = score;
            }
        }
        return best < 0 ? Optional.empty() : Optional.of(at(best));
    }

    Header at(int row) {
        List<String> texts = new ArrayList<>();
        List<String> above = above(row);
        boolean units = isUnitLine(row + 1);
        for (int column = 0; column < sheet.columns(); column++) {
            String own = sheet.cell(row, column);
            String unit = units ? sheet.cell(row + 1, column) : "";
            String text = (above.get(column) + " " + own).strip();
            texts.add(unit.isEmpty() ? text : text + " (" + unit.replaceAll("[\\[\\]()]", "") + ")");
        }
        return new Header(units ? row + 1 : row, texts);
    }

    /** The headings of groups of columns in the line above, each as far as the next one. */
    private List<String> above(int row) {
        List<String> above = new ArrayList<>();
        boolean groups =
                row > 0 && !sheet.isBlank(row - 1) && sheet.loneText(row - 1).isEmpty() && figures(row - 1) == 0;
        String last = "";
        for (int column = 0; column < sheet.columns(); column++) {
            String text = groups ? sheet.cell(row - 1, column) : "";
            last = text.isEmpty() && !sheet.cell(row, column).isEmpty() ? last : text;
            above.add(last);
        }
        return above;
    }

    private boolean isUnitLine(int row) {
        if (row >= sheet.rows().size() || sheet.isBlank(row)) {
            return false;
        }
        return sheet.rows().get(row).stream()
                .filter(cell -> !cell.isBlank())
                .allMatch(cell -> UnitWords.isUnit(cell.strip().replaceAll("^[\\[(]|[\\])]$", "")));
    }

    private double score(int row) {
        double score = 0;
        int texts = 0;
        boolean years = yearsInOrder(row);
        for (String cell : sheet.rows().get(row)) {
            String text = cell.strip();
            if (!text.isEmpty()) {
                texts++;
                score += isYear(text) && !years ? NUMBER : score(text);
            }
        }
        return texts < 2 ? 0 : score;
    }

    private static boolean isYear(String text) {
        return text.matches("\\d{4}");
    }

    /** Whether numbers that could be years increase, as headings do and figures seldom. */
    private boolean yearsInOrder(int row) {
        int before = 0;
        for (String cell : sheet.rows().get(row)) {
            if (isYear(cell.strip())) {
                int year = Integer.parseInt(cell.strip());
                if (year < before) {
                    return false;
                }
                before = year;
            }
        }
        return true;
    }

    private double score(String text) {
        if (periods.isPeriod(text)) {
            return 2;
        }
        if (numerals.read(text).isPresent()) {
            return NUMBER;
        }
        if (ColumnWords.role(text).isPresent()) {
            return 3;
        }
        boolean known = terms.of(text, "").kind() != Kind.UNTIED
                || catalogue.prisms().stream().anyMatch(text::equalsIgnoreCase);
        return known ? 2 : 0.25;
    }

    /** Numbers in a row that are not years. */
    private long figures(int row) {
        return sheet.rows().get(row).stream()
                .filter(cell -> !periods.isPeriod(cell))
                .filter(cell -> numerals.read(cell).isPresent())
                .count();
    }

    private boolean hasFiguresBelow(int row) {
        int last = Math.min(sheet.rows().size(), row + 12);
        for (int below = row + 1; below < last; below++) {
            if (figures(below) > 0) {
                return true;
            }
        }
        return false;
    }
}
