package org.seepledger.desktop.review;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.seepledger.desktop.review.MappingRow.Choice;
import org.seepledger.desktop.words.Words;
import org.seepledger.job.ReviewAnswer;
import org.seepledger.review.mapping.Column;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Mapping;
import org.seepledger.review.mapping.Role;
import org.seepledger.review.mapping.Sense;
import org.seepledger.review.mapping.Submission;
import org.seepledger.review.mapping.Tie;
import org.seepledger.review.mapping.When;

/** Lays out how a submission was read: its terms, areas, periods and columns, then what holds for all of it. */
final class MappingRows {

    private static final List<String> GROUPS = List.of("side", "lid", "source", "storage");

    private final ReviewAnswer answer;
    private final int intervals;
    private final List<MappingRow> rows = new ArrayList<>();

    private MappingRows(ReviewAnswer answer, int intervals) {
        this.answer = answer;
        this.intervals = intervals;
    }

    /**
     * {@return the rows}
     *
     * @param answer the review
     * @param intervals how many intervals the record has; 0 without one
     */
    static List<MappingRow> of(ReviewAnswer answer, int intervals) {
        MappingRows all = new MappingRows(answer, intervals);
        all.terms();
        all.areas();
        all.periods();
        all.columns();
        all.whole();
        return all.rows;
    }

    private Stream<Figure> figures() {
        return answer.tables().stream().flatMap(table -> table.figures().stream());
    }

    private static String words(String key) {
        return Words.of("review.is." + key.replace(' ', '.'));
    }

    private void terms() {
        Map<String, Tie> terms = new LinkedHashMap<>();
        answer.tables().forEach(table -> table.mapping().terms().forEach(terms::putIfAbsent));
        Map<String, List<Figure>> byTerm =
                figures().collect(Collectors.groupingBy(Figure::term, LinkedHashMap::new, Collectors.toList()));
        byTerm.keySet().stream()
                .filter(term -> !terms.containsKey(term) && !terms.containsKey("total: " + term))
                .forEach(term -> terms.put(term, Tie.of(Kind.UNTIED)));
        terms.forEach((label, tie) -> {
            String term = label.startsWith("total: ") ? label.substring("total: ".length()) : label;
            rows.add(term(label, tie, byTerm.getOrDefault(term, List.of())));
        });
    }

    private MappingRow term(String label, Tie tie, List<Figure> figures) {
        boolean signed = tie.kind() == Kind.ITEM || tie.kind() == Kind.CHANGE;
        List<Sense> counted = figures.stream().map(Figure::sense).distinct().toList();
        return new MappingRow(
                "review.row.term",
                label,
                words(tie),
                ties(label, tie),
                Optional.empty(),
                signed ? counts(counted, tie.sense()) : "",
                signed
                        ? senses(counting -> said ->
                                Corrections.term(said, label, new Tie(tie.kind(), tie.items(), Optional.of(counting))))
                        : List.of(),
                figures.stream().map(Figure::unit).distinct().collect(Collectors.joining(", ")),
                Optional.empty());
    }

    /** What a heading or a column says goes before what is said of the term. */
    private static String counts(List<Sense> counted, Optional<Sense> said) {
        String words = counted.stream().map(MappingRows::sense).collect(Collectors.joining(", "));
        boolean overruled = !counted.isEmpty()
                && said.filter(sense -> !counted.contains(sense)).isPresent();
        return overruled ? Words.of("review.counts.headed", words) : words;
    }

    private static String words(Tie tie) {
        return tie.kind() == Kind.ITEM
                ? tie.items().stream().map(MappingRows::item).collect(Collectors.joining(" + "))
                : words(tie.kind().toString());
    }

    private static String item(String key) {
        return GROUPS.contains(key) ? Words.of("review.all." + key) : key.replace("/", ": ");
    }

    private static String sense(Sense sense) {
        return Words.of("review.counts." + sense);
    }

    private List<Choice> ties(String label, Tie now) {
        Stream<Tie> items = Stream.concat(
                        GROUPS.stream(), answer.catalogue().items().stream().map(item -> item.key()))
                .distinct()
                .map(key -> new Tie(Kind.ITEM, List.of(key), now.sense()));
        Stream<Tie> others = Stream.of(Kind.values())
                .filter(kind -> kind != Kind.ITEM && kind != Kind.UNTIED && kind != Kind.OUTSIDE)
                .map(Tie::of);
        Stream<Tie> none = Stream.of(Tie.of(Kind.UNTIED), Tie.of(Kind.OUTSIDE));
        return Stream.of(none, items, others)
                .flatMap(ties -> ties)
                .map(tie -> new Choice(words(tie), said -> Corrections.term(said, label, tie)))
                .toList();
    }

    private static List<Choice> senses(Function<Sense, UnaryOperator<Mapping>> change) {
        return Stream.of(Sense.values())
                .map(sense -> new Choice(sense(sense), change.apply(sense)))
                .toList();
    }

    private void areas() {
        if (answer.recomputed()) {
            figures().map(Figure::area).distinct().forEach(label -> {
                Stream<Choice> prisms = answer.catalogue().prisms().stream()
                        .map(prism -> new Choice(prism, said -> Corrections.area(said, label, prism)));
                Choice none = new Choice(words("untied"), said -> Corrections.area(said, label, ""));
                String is = answer.areas().getOrDefault(label, none.words());
                rows.add(chosen(
                        "review.row.area",
                        label,
                        is,
                        Stream.concat(prisms, Stream.of(none)).toList()));
            });
        }
    }

    private static MappingRow chosen(String what, String label, String is, List<Choice> kinds) {
        return new MappingRow(what, label, is, kinds, Optional.empty(), "", List.of(), "", Optional.empty());
    }

    private void periods() {
        Map<String, When> periods = new LinkedHashMap<>();
        figures().map(Figure::when).forEach(when -> periods.putIfAbsent(when.label(), when));
        periods.forEach((label, when) -> {
            Function<String, UnaryOperator<Mapping>> change = ours -> said -> Corrections.period(said, label, ours);
            List<Choice> ours = Stream.concat(
                            Stream.of("record"),
                            IntStream.rangeClosed(1, intervals).mapToObj(i -> "interval " + i))
                    .map(name -> new Choice(name, change.apply(name)))
                    .toList();
            rows.add(new MappingRow(
                    "review.row.period",
                    label,
                    words(when),
                    ours,
                    Optional.of(change),
                    "",
                    List.of(),
                    "",
                    Optional.empty()));
        });
    }

    private String words(When when) {
        String dates = when.days()
                .map(days -> Words.of("review.days", days.from(), days.to().minusDays(1)))
                .orElse(when.name());
        boolean covered = !answer.recomputed() || answer.intervals().containsKey(when.label());
        return covered ? dates : Words.of("review.not.covered", dates);
    }

    private void columns() {
        for (Submission table : answer.tables()) {
            List<Column> columns = table.mapping().columns();
            for (int i = 0; i < columns.size(); i++) {
                if (!columns.get(i).header().isEmpty() || columns.get(i).role() != Role.IGNORED) {
                    rows.add(column(columns, i));
                }
            }
        }
    }

    private MappingRow column(List<Column> all, int index) {
        Column now = all.get(index);
        boolean figures = now.role() == Role.VALUE;
        List<Choice> roles = Stream.of(Role.values())
                .map(role -> new Choice(role(role), said -> Corrections.column(said, all, index, now.as(role))))
                .toList();
        return new MappingRow(
                "review.row.column",
                now.header(),
                role(now.role()),
                roles,
                Optional.empty(),
                figures ? now.sense().map(MappingRows::sense).orElse("") : "",
                figures
                        ? senses(sense ->
                                said -> Corrections.column(said, all, index, counting(now, Optional.of(sense))))
                        : List.of(),
                now.unit(),
                figures
                        ? Optional.of(unit -> said -> Corrections.column(said, all, index, in(now, unit)))
                        : Optional.empty());
    }

    private static String role(Role role) {
        return Words.of("review.role." + role.toString().replace(' ', '.'));
    }

    private static Column counting(Column column, Optional<Sense> sense) {
        return new Column(
                column.header(),
                column.role(),
                column.term(),
                column.period(),
                column.area(),
                sense,
                column.amount(),
                column.unit());
    }

    private static Column in(Column column, String unit) {
        return new Column(
                column.header(),
                column.role(),
                column.term(),
                column.period(),
                column.area(),
                column.sense(),
                column.amount(),
                unit);
    }

    private void whole() {
        Mapping first = answer.tables().get(0).mapping();
        List<Choice> decimals = Arrays.asList('.', ',').stream()
                .map(sign ->
                        new Choice(decimal(Optional.of(sign)), said -> Corrections.decimal(said, Optional.of(sign))))
                .toList();
        rows.add(new MappingRow(
                "review.row.table",
                Words.of("review.row.rest"),
                decimal(first.decimal()),
                decimals,
                Optional.empty(),
                "",
                List.of(),
                first.unit(),
                Optional.of(unit -> said -> Corrections.unit(said, unit))));
    }

    private static String decimal(Optional<Character> sign) {
        return Words.of(sign.map(mark -> mark == ',' ? "review.decimal.comma" : "review.decimal.point")
                .orElse("review.decimal.guessed"));
    }
}
