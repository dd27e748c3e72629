package org.seepledger.review.mapping;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.seepledger.review.sheet.Amount;
import org.seepledger.review.sheet.Numeral;
import org.seepledger.review.sheet.Numerals;
import org.seepledger.review.sheet.Sheet;
import org.seepledger.review.sheet.UnitWords;
import org.seepledger.review.sheet.WrittenUnit;

/** Reads the figures of a table by its mapping. */
public final class Figures {

    private final Sheet sheet;
    private final Mapping mapping;
    private final Numerals numerals;
    private final PeriodWords periods;
    private final RowPeriods rowPeriods;
    private final Catalogue catalogue;
    private final List<Column> columns;
    private final List<Figure> figures = new ArrayList<>();
    private final List<String> unread = new ArrayList<>();
    private String area = "";
    private String period = "";
    private String unit = "";
    private String lastTerm = "";
    private Optional<Sense> section = Optional.empty();

    private Figures(Sheet sheet, Mapping mapping, Catalogue catalogue, int waterYearStart) {
        this.sheet = sheet;
        this.mapping = mapping;
        this.catalogue = catalogue;
        this.columns = mapping.columns();
        this.numerals = mapping.decimal().map(Numerals::with).orElseGet(() -> Numerals.of(sheet));
        this.periods = new PeriodWords(waterYearStart);
        this.rowPeriods = new RowPeriods(sheet, mapping, numerals, periods);
    }

    /**
     * {@return the figures of a table}
     *
     * @param sheet the table
     * @param mapping how it is read
     * @param catalogue what there is to tie to
     * @param waterYearStart the month in which a water year begins, 1 to 12
     */
    public static Submission of(Sheet sheet, Mapping mapping, Catalogue catalogue, int waterYearStart) {
        return new Figures(sheet, mapping, catalogue, waterYearStart).read();
    }

    /** How a term is called in a mapping: totals apart from items of the same name. */
    static String label(String term, String group) {
        return TermWords.plain(group).matches("totals?") ? "total: " + term : term;
    }

    private Submission read() {
        readTitle();
        readCorner(mapping.header());
        for (int row = mapping.header() + 1; row < sheet.rows().size(); row++) {
            if (sheet.isBlank(row)) {
                continue;
            }
            if (isHeader(sheet, mapping, row)) {
                readCorner(row);
            } else if (hasFigure(row)) {
                readRow(row);
            } else {
                readHeading(row);
            }
        }
        return new Submission(Signs.settled(Wholes.settled(figures)), mapping, unread);
    }

    /** A title may name the area and the period of the whole table. */
    private void readTitle() {
        area = sheet.name();
        for (int row = 0; row < mapping.header(); row++) {
            for (String cell : sheet.rows().get(row)) {
                prism(cell).ifPresent(found -> area = found);
                if (period.isEmpty()) {
                    for (String part : cell.split("[,;:()]| for | in ")) {
                        if (periods.of(part.strip()).isPresent()) {
                            period = part.strip();
                        }
                    }
                }
            }
        }
    }

    private Optional<String> prism(String text) {
        String words = text.toLowerCase(Locale.ROOT);
        return catalogue.prisms().stream()
                .filter(prism -> words.contains(prism.toLowerCase(Locale.ROOT)))
                .findFirst();
    }

    /** Whether a row repeats the headings of the figures; what stands over the names may then differ. */
    static boolean isHeader(Sheet sheet, Mapping mapping, int row) {
        boolean any = false;
        for (int column = 0; column < mapping.columns().size(); column++) {
            String header = sheet.cell(mapping.header(), column);
            boolean value = mapping.columns().get(column).role() == Role.VALUE;
            if (value && !sheet.cell(row, column).equals(header)) {
                return false;
            }
            any |= value && !header.isEmpty();
        }
        return any;
    }

    /** The heading over the names may be that of an area. */
    private void readCorner(int row) {
        int term = index(Role.TERM);
        String corner = term < 0 ? "" : sheet.cell(row, term);
        boolean named = row > mapping.header() && !corner.equals(sheet.cell(mapping.header(), term));
        prism(corner).or(() -> named ? Optional.of(corner) : Optional.empty()).ifPresent(found -> {
            area = found;
            section = Optional.empty();
        });
    }

    private boolean hasFigure(int row) {
        for (int column = 0; column < columns.size(); column++) {
            if (columns.get(column).role() == Role.VALUE
                    && numerals.read(sheet.cell(row, column)).isPresent()) {
                return true;
            }
        }
        return false;
    }

    /** A row of words: what it says holds for the rows below it. */
    private void readHeading(int row) {
        String text = String.join(" ", sheet.rows().get(row)).strip();
        UnitWords.in(text).filter(found -> !found.equals("%")).ifPresent(found -> unit = found);
        String words = TermWords.plain(text);
        Optional<String> named = prism(text);
        if (named.isPresent() || mapping.areas().containsKey(text)) {
            area = named.orElse(text);
            section = Optional.empty();
        } else if (periods.isPeriod(UnitWords.without(text))) {
            period = UnitWords.without(text);
        } else if (words.matches(".*\\b(in-?flows?|inputs?|gains|sources|in)\\b.*")
                && !words.matches(".*\\b(out|and)\\b.*")) {
            section = Optional.of(Sense.IN);
        } else if (words.matches(".*\\b(out-?flows?|outputs?|losses|sinks|out)\\b.*") && !words.contains(" and ")) {
            section = Optional.of(Sense.OUT);
        } else if (words.matches(".*\\b(stor|total|balance|summar|net|closure|residual).*")) {
            section = Optional.empty();
        } else if (sheet.loneText(row).isPresent()
                && index(Role.AREA) < 0
                && !text.startsWith("#")
                && text.length() < 60) {
            area = text;
            section = Optional.empty();
        } else {
            unread.add(sheet.place(row, 0) + ": \"" + shortened(text) + "\"");
        }
    }

    private int index(Role role) {
        return MappingGuess.index(columns, role);
    }

    private String text(int row, Role role) {
        int column = index(role);
        return column < 0 ? "" : sheet.cell(row, column);
    }

    private void readRow(int row) {
        area = kept(text(row, Role.AREA), area);
        period = kept(text(row, Role.PERIOD), period);
        String group = text(row, Role.GROUP);
        String term = text(row, Role.TERM);
        term = term.isEmpty() && index(Role.SENSE) >= 0 ? lastTerm : term;
        lastTerm = term;
        Optional<Sense> ofRow = Optional.ofNullable(TermWords.direction(TermWords.plain(text(row, Role.SENSE)), false))
                .or(() -> Optional.ofNullable(TermWords.direction(TermWords.plain(group), false)));
        for (int column = 0; column < columns.size(); column++) {
            Column meaning = columns.get(column);
            String cell = sheet.cell(row, column);
            if (meaning.role() != Role.VALUE || cell.isEmpty()) {
                continue;
            }
            Optional<Numeral> numeral = numerals.read(cell);
            if (numeral.isEmpty()) {
                unread.add(sheet.place(row, column) + ": \"" + shortened(cell) + "\" is no number");
                continue;
            }
            boolean down = meaning.term().isEmpty();
            Tie tie = mapping.terms().getOrDefault(down ? label(term, group) : meaning.term(), Tie.of(Kind.UNTIED));
            add(row, column, down ? term : meaning.term(), oneWay(tie, meaning), ofRow, numeral.get());
        }
    }

    /** A total in a column of what comes in, or goes out, is the total of that. */
    private static Tie oneWay(Tie tie, Column meaning) {
        boolean net = tie.kind() == Kind.NET_TOTAL;
        if (net && meaning.sense().filter(Sense.IN::equals).isPresent()) {
            return Tie.of(Kind.TOTAL_IN);
        }
        return net && meaning.sense().filter(Sense.OUT::equals).isPresent() ? Tie.of(Kind.TOTAL_OUT) : tie;
    }

    private static String kept(String text, String before) {
        return text.isEmpty() ? before : text;
    }

    private static String shortened(String text) {
        return text.length() > 60 ? text.substring(0, 60) + "…" : text;
    }

    private void add(int row, int column, String term, Tie tie, Optional<Sense> ofRow, Numeral numeral) {
        Column meaning = columns.get(column);
        if (tie.kind() == Kind.IGNORED) {
            return;
        }
        Optional<Amount> said = meaning.amount();
        String written = unit(row, meaning, numeral, said);
        Optional<WrittenUnit> understood = UnitWords.of(written);
        if (understood.isEmpty() && !written.isEmpty() && !written.equals("%")) {
            unread.add(sheet.place(row, column) + ": unit \"" + shortened(written) + "\" is not known");
        }
        if (written.equals("%") != (tie.kind() == Kind.PERCENT) && written.equals("%")) {
            return;
        }
        Optional<Amount> amount = understood
                .map(known -> known.perPeriod() ? Amount.VOLUME : known.amount())
                .or(() -> said);
        String where = meaning.area().isEmpty() ? area : meaning.area();
        When when = rowPeriods.of(row, meaning.period().isEmpty() ? period : meaning.period());
        figures.add(new Figure(
                where,
                when,
                term,
                text(row, Role.LAYER),
                tie,
                sense(meaning, ofRow, tie),
                numeral.value(),
                numeral.half(),
                written,
                understood,
                amount,
                sheet.place(row, column)));
    }

    private Sense sense(Column meaning, Optional<Sense> ofRow, Tie tie) {
        if (tie.kind() == Kind.CHANGE) {
            return tie.sense().orElse(Sense.LOSS);
        }
        if (tie.kind() != Kind.ITEM && tie.kind() != Kind.UNTIED && tie.kind() != Kind.OUTSIDE) {
            return Sense.NET;
        }
        return meaning.sense().or(() -> ofRow).or(() -> section).or(tie::sense).orElse(Sense.NET);
    }

    private String unit(int row, Column meaning, Numeral numeral, Optional<Amount> said) {
        if (!numeral.unit().isEmpty()) {
            return numeral.unit();
        }
        if (!meaning.unit().isEmpty()) {
            return meaning.unit();
        }
        String ofAmount = said.filter(Amount.VOLUME::equals).isPresent()
                ? text(row, Role.VOLUME_UNIT)
                : text(row, Role.RATE_UNIT);
        return kept(kept(ofAmount, text(row, Role.UNIT)), kept(unit, mapping.unit()));
    }
}
