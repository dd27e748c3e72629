package org.seepledger.desktop.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.seepledger.desktop.ledger.LedgerSheet.Held;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.ledger.Totals;
import org.seepledger.report.Term;
import org.seepledger.report.Wording;
import org.seepledger.unit.Measure;

/** Lays a budget out in rows. */
final class LedgerRows {

    private static final Set<String> LIDS = Set.of("top", "bottom");

    private final LedgerSheet sheet;
    private final PeriodBudget budget;
    private final List<String> layers;
    private final Order order;
    private final List<LedgerRow> rows = new ArrayList<>();

    /** A line, and its net with non-detects as 0 and as their limit. */
    private record Bracketed(Line line, double zero, double limit) {}

    /**
     * Prepares the rows.
     *
     * @param sheet the budget
     * @param layers the names of the aquifer's layers
     * @param order the order of lines in a section
     */
    LedgerRows(LedgerSheet sheet, List<String> layers, Order order) {
        this.sheet = sheet;
        this.budget = sheet.shown().budget();
        this.layers = layers;
        this.order = order;
    }

    List<LedgerRow> arranged(Arrangement arrangement) {
        sheet.ofSolute().ifPresent(solute -> held(solute, arrangement));
        switch (arrangement) {
            case ITEMS ->
                sections(bracketed(
                        each -> Term.of(each).stream().map(LedgerRows::line).toList()));
            case ITEMS_BY_LAYER -> sections(bracketed(each -> Line.each(each.entries())));
            case LAYERS -> layers(bracketed(each -> Line.byLayer(each.entries())));
        }
        totals();
        return rows;
    }

    private static Line line(Term term) {
        return new Line(term.group(), term.item(), Line.ALL_LAYERS, term.inflow(), term.outflow());
    }

    /** However non-detects count, the accounts are the same, and so are the lines. */
    private List<Bracketed> bracketed(Function<PeriodBudget, List<Line>> laidOut) {
        List<Line> shown = laidOut.apply(budget);
        Optional<List<Line>> zero = sheet.ofSolute().map(solute -> laidOut.apply(solute.zero()));
        Optional<List<Line>> limit = sheet.ofSolute().map(solute -> laidOut.apply(solute.limit()));
        return IntStream.range(0, shown.size())
                .mapToObj(i -> new Bracketed(
                        shown.get(i),
                        zero.map(lines -> lines.get(i).net()).orElse(Double.NaN),
                        limit.map(lines -> lines.get(i).net()).orElse(Double.NaN)))
                .toList();
    }

    private void held(LedgerSheet.OfSolute solute, Arrangement arrangement) {
        rows.add(LedgerRow.heading(
                Group.STORAGE,
                Line.ALL_LAYERS,
                Words.of("ledger.held", Wording.raised(Measure.of(solute.massUnit())))));
        for (String phase : List.of("dissolved", "sorbed")) {
            List<Held> own = solute.held().stream()
                    .filter(held -> held.phase().equals(phase))
                    .toList();
            (arrangement == Arrangement.ITEMS_BY_LAYER ? own : List.of(sum(own, phase)))
                    .forEach(held -> rows.add(row(held)));
        }
        rows.add(row(sum(solute.held(), Words.of("ledger.held.together"))));
    }

    private static Held sum(List<Held> all, String name) {
        return all.stream()
                .reduce((one, other) -> one.plus(other, name, Line.ALL_LAYERS))
                .map(held -> new Held(name, Line.ALL_LAYERS, held.zero(), held.half(), held.limit()))
                .orElseThrow();
    }

    private LedgerRow row(Held held) {
        return LedgerRow.one(
                        LedgerRow.Kind.HELD,
                        Group.STORAGE,
                        held.phase(),
                        held.layer(),
                        inLayer(held.phase(), held.layer()),
                        held.half())
                .bracketed(held.zero(), held.limit());
    }

    private void sections(List<Bracketed> lines) {
        section(
                lines,
                sheet.ofSolute().isPresent() ? "ledger.advection" : "ledger.faces",
                List.of(Group.SIDE, Group.LID));
        section(lines, "ledger.dispersion", List.of(Group.DISPERSION));
        section(lines, "ledger.sources", List.of(Group.SOURCE));
        section(lines, "ledger.decay", List.of(Group.DECAY, Group.PRODUCTION));
        section(lines, "ledger.storage", List.of(Group.STORAGE));
    }

    private void section(List<Bracketed> lines, String words, List<Group> groups) {
        List<Bracketed> own = lines.stream()
                .filter(each -> groups.contains(each.line().group()))
                .toList();
        if (!own.isEmpty()) {
            rows.add(LedgerRow.heading(groups.get(0), Line.ALL_LAYERS, Words.of(words)));
            sorted(own).forEach(each -> rows.add(row(each, label(each.line()))));
        }
    }

    private void layers(List<Bracketed> lines) {
        for (int layer :
                new TreeSet<>(lines.stream().map(each -> each.line().layer()).toList())) {
            List<Bracketed> own =
                    lines.stream().filter(each -> each.line().layer() == layer).toList();
            rows.add(LedgerRow.heading(Group.SIDE, layer, layers.get(layer)));
            sorted(own)
                    .forEach(each -> rows.add(
                            row(each, Words.of("ledger.all." + each.line().group()))));
        }
    }

    private List<Bracketed> sorted(List<Bracketed> lines) {
        return order.comparator()
                .map(comparator -> lines.stream()
                        .sorted((one, other) -> comparator.compare(one.line(), other.line()))
                        .toList())
                .orElse(lines);
    }

    private String label(Line line) {
        boolean lid = line.group() == Group.LID || line.group() == Group.DISPERSION && LIDS.contains(line.item());
        return inLayer(lid ? Words.of("ledger.lid." + line.item()) : line.item(), line.layer());
    }

    private String inLayer(String name, int layer) {
        return layer == Line.ALL_LAYERS ? name : Words.of("ledger.in.layer", name, layers.get(layer));
    }

    private LedgerRow row(Bracketed each, String label) {
        Line line = each.line();
        return new LedgerRow(
                LedgerRow.Kind.ENTRY,
                line.group(),
                line.item(),
                line.layer(),
                label,
                amount(line.inflow()),
                amount(line.outflow()),
                amount(line.net()),
                amount(each.zero()),
                amount(each.limit()));
    }

    private double amount(double amount) {
        return sheet.unit().of(amount, budget.period());
    }

    private void totals() {
        Totals totals = budget.totals();
        rows.add(LedgerRow.heading(Group.TOTAL, Line.ALL_LAYERS, Words.of("ledger.totals")));
        for (Total total : Total.rows(!Double.isNaN(totals.storageChange()))) {
            String item = total.toString();
            if (total.isPercentage()) {
                rows.add(LedgerRow.one(
                        LedgerRow.Kind.PERCENTAGE, Group.TOTAL, item, Line.ALL_LAYERS, item, totals.get(total)));
            } else {
                rows.add(LedgerRow.one(
                                LedgerRow.Kind.TOTAL,
                                Group.TOTAL,
                                item,
                                Line.ALL_LAYERS,
                                item,
                                amount(totals.get(total)))
                        .bracketed(
                                bracket(solute -> solute.zero().totals().get(total)),
                                bracket(solute -> solute.limit().totals().get(total))));
            }
        }
    }

    private double bracket(Function<LedgerSheet.OfSolute, Double> total) {
        return sheet.ofSolute().map(total).map(this::amount).orElse(Double.NaN);
    }
}
