package org.seepledger.review.mapping;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.seepledger.review.sheet.Numerals;
import org.seepledger.review.sheet.Sheet;
import org.seepledger.review.sheet.UnitWords;

/** Guesses what a table's columns, terms and areas are. */
public final class MappingGuess {

    private static final double MOST = 0.6;

    private final Sheet sheet;
    private final Optional<Mapping> corrections;
    private final Catalogue catalogue;
    private final Numerals numerals;
    private final PeriodWords periods;
    private final TermWords terms;
    private final ColumnGuess guess;

    private MappingGuess(
            Sheet sheet, Catalogue catalogue, Numerals numerals, int waterYearStart, Optional<Mapping> corrections) {
        this.corrections = corrections;
        this.sheet = sheet;
        this.catalogue = catalogue;
        this.numerals = numerals;
        this.periods = new PeriodWords(waterYearStart);
        this.terms = new TermWords(catalogue);
        this.guess = new ColumnGuess(sheet, catalogue, periods, terms);
    }

    /**
     * {@return how a table is probably meant; empty where no line of it is like a header}
     *
     * @param sheet the table
     * @param catalogue what there is to tie to
     * @param numerals reads its numbers
     * @param waterYearStart the month in which a water year begins, 1 to 12
     * @param corrections what a person said of it, which holds
     */
    public static Optional<Mapping> of(
            Sheet sheet, Catalogue catalogue, Numerals numerals, int waterYearStart, Optional<Mapping> corrections) {
        MappingGuess guess = new MappingGuess(sheet, catalogue, numerals, waterYearStart, corrections);
        return new HeaderSearch(sheet, numerals, guess.terms, guess.periods, catalogue)
                .find()
                .map(guess::mapping);
    }

    private Mapping mapping(HeaderSearch.Header header) {
        List<Column> columns = new ArrayList<>();
        for (int column = 0; column < header.texts().size(); column++) {
            columns.add(guess.of(header, column, numbers(column, header.row()) > 0));
        }
        settleLabels(columns, header.row());
        if (corrections.isPresent()) {
            columns = Mapping.corrected(columns, corrections.get().columns());
        }
        Mapping read = new Mapping(
                header.row(),
                Optional.of(numerals.decimal()),
                titleUnit(columns, header.row()),
                columns,
                Map.of(),
                areas(columns, header.row()),
                Map.of());
        Mapping guessed = new Mapping(
                read.header(), read.decimal(), read.unit(), columns, ties(read), read.areas(), read.periods());
        return corrections.map(guessed::under).orElse(guessed);
    }

    static boolean isWhole(String label) {
        return label.toLowerCase(Locale.ROOT)
                .matches(
                        "(grand )?(total|sum|all)( periods?| months| years)?|whole (record|period)|entire (record|period)|annual total|year total");
    }

    /** Finds the columns of terms, periods and areas where no heading names them, and whether terms stand across. */
    private void settleLabels(List<Column> columns, int header) {
        if (missing(columns, Role.PERIOD) && missing(columns, Role.FROM)) {
            claim(columns, header, Role.PERIOD, cell -> periods.isPeriod(cell) || isWhole(cell));
        }
        if (missing(columns, Role.UNIT) && missing(columns, Role.RATE_UNIT)) {
            claim(columns, header, Role.UNIT, UnitWords::isUnit);
        }
        boolean termsAcross =
                columns.stream().filter(column -> tied(column.term())).count() >= 2;
        if (missing(columns, Role.TERM) && !termsAcross) {
            claim(columns, header, Role.TERM, this::tied);
        }
        if (missing(columns, Role.TERM) && !termsAcross) {
            claim(columns, header, Role.TERM, cell -> true);
        }
        if (missing(columns, Role.AREA)) {
            claim(columns, header, Role.AREA, guess::isPrism);
        }
        boolean termsDown = !missing(columns, Role.TERM);
        for (int i = 0; i < columns.size(); i++) {
            Column column = columns.get(i);
            if (column.role() == Role.VALUE
                    && termsDown
                    && !column.term().isEmpty()
                    && column.period().isEmpty()) {
                columns.set(i, across(column));
            } else if (column.role() == Role.VALUE
                    && !termsDown
                    && column.term().isEmpty()) {
                String words = UnitWords.without(column.header());
                columns.set(
                        i,
                        new Column(
                                column.header(),
                                Role.VALUE,
                                words,
                                column.period(),
                                column.area(),
                                Optional.empty(),
                                column.amount(),
                                column.unit()));
            }
        }
    }

    /** Where terms stand down, a heading of figures that names no period is an area or a sense. */
    private Column across(Column column) {
        Optional<Sense> sense = column.sense().or(() -> ColumnWords.sense(column.term()));
        boolean said = sense.isPresent();
        return new Column(
                column.header(),
                column.role(),
                "",
                column.period(),
                said ? column.area() : column.term(),
                sense,
                column.amount(),
                column.unit());
    }

    private static boolean missing(List<Column> columns, Role role) {
        return columns.stream().noneMatch(column -> column.role() == role);
    }

    private boolean tied(String label) {
        return !label.isBlank() && terms.of(label, "").kind() != Kind.UNTIED;
    }

    /** Gives a role to the first column that has none by its heading and whose cells mostly fit. */
    private void claim(List<Column> columns, int header, Role role, Predicate<String> fits) {
        for (int i = 0; i < columns.size(); i++) {
            Column column = columns.get(i);
            boolean free = column.role() == Role.IGNORED
                            && ColumnWords.role(column.header()).isEmpty()
                    || role == Role.PERIOD
                            && column.role() == Role.VALUE
                            && column.period().isEmpty();
            List<String> texts = texts(i, header, role == Role.PERIOD);
            long fitting = texts.stream().filter(fits).count();
            if (free && !texts.isEmpty() && fitting >= MOST * texts.size()) {
                columns.set(i, Column.of(column.header(), role));
                return;
            }
        }
    }

    /** What stands in a column below the header and is no number. */
    private List<String> texts(int column, int header, boolean years) {
        return IntStream.range(header + 1, sheet.rows().size())
                .mapToObj(row -> sheet.cell(row, column))
                .filter(cell -> !cell.isEmpty() && (years || numerals.read(cell).isEmpty()))
                .toList();
    }

    private long numbers(int column, int header) {
        return IntStream.range(header + 1, sheet.rows().size())
                .filter(row -> numerals.read(sheet.cell(row, column)).isPresent())
                .count();
    }

    /** The unit that a heading of names, or a line above the header, gives all figures. */
    private String titleUnit(List<Column> columns, int header) {
        Stream<String> headings = columns.stream()
                .filter(column -> column.role() != Role.VALUE && column.role() != Role.IGNORED)
                .map(Column::header);
        Stream<String> above = IntStream.range(0, header)
                .mapToObj(row -> header - 1 - row)
                .flatMap(row -> sheet.rows().get(row).stream());
        return Stream.concat(headings, above)
                .map(UnitWords::in)
                .flatMap(Optional::stream)
                .filter(unit -> !unit.equals("%"))
                .findFirst()
                .orElse("");
    }

    private Map<String, Tie> ties(Mapping read) {
        List<Column> columns = read.columns();
        Map<String, Tie> ties = new LinkedHashMap<>();
        int group = index(columns, Role.GROUP);
        int term = index(columns, Role.TERM);
        if (term < 0) {
            columns.stream()
                    .filter(column -> column.role() == Role.VALUE)
                    .forEach(column -> ties.putIfAbsent(column.term(), terms.of(column.term(), "")));
        } else {
            for (int row = read.header() + 1; row < sheet.rows().size(); row++) {
                String label = sheet.cell(row, term);
                boolean figures = hasFigure(columns, row) && !Figures.isHeader(sheet, read, row);
                if (!label.isEmpty() && figures) {
                    String kind = group < 0 ? "" : sheet.cell(row, group);
                    ties.putIfAbsent(Figures.label(label, kind), terms.of(label, kind));
                }
            }
        }
        return ties;
    }

    private boolean hasFigure(List<Column> columns, int row) {
        return IntStream.range(0, columns.size())
                .filter(column -> columns.get(column).role() == Role.VALUE)
                .anyMatch(column -> numerals.read(sheet.cell(row, column)).isPresent());
    }

    static int index(List<Column> columns, Role role) {
        return IntStream.range(0, columns.size())
                .filter(i -> columns.get(i).role() == role)
                .findFirst()
                .orElse(-1);
    }

    private Map<String, String> areas(List<Column> columns, int header) {
        Set<String> labels = new LinkedHashSet<>();
        int area = index(columns, Role.AREA);
        if (area >= 0) {
            labels.addAll(texts(area, header, true));
        }
        columns.forEach(column -> labels.add(column.area()));
        labels.remove("");
        Map<String, String> ties = new LinkedHashMap<>();
        labels.forEach(label -> prism(label).ifPresent(prism -> ties.put(label, prism)));
        return ties;
    }

    /** The prism that a label is or holds. */
    Optional<String> prism(String label) {
        String words = label.toLowerCase(Locale.ROOT).replaceAll("^'", "");
        return catalogue.prisms().stream()
                .filter(prism -> prism.equalsIgnoreCase(words))
                .findFirst()
                .or(() -> catalogue.prisms().stream()
                        .filter(prism -> words.contains(prism.toLowerCase(Locale.ROOT)))
                        .findFirst());
    }
}
