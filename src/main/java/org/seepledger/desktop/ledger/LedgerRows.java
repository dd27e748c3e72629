package org.seepledger.desktop.ledger;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.seepledger.desktop.words.Words;
import org.seepledger.ledger.Group;
import org.seepledger.ledger.Line;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.ledger.Totals;
import org.seepledger.picture.UnitShown;
import org.seepledger.report.Term;

/** Lays a budget out in rows. */
final class LedgerRows {

    private final PeriodBudget budget;
    private final List<String> layers;
    private final UnitShown unit;
    private final Order order;
    private final List<LedgerRow> rows = new ArrayList<>();

    /**
     * Prepares the rows.
     *
     * @param budget the budget
     * @param layers the names of the aquifer's layers
     * @param unit the unit to show
     * @param order the order of lines in a section
     */
    LedgerRows(PeriodBudget budget, List<String> layers, UnitShown unit, Order order) {
        this.budget = budget;
        this.layers = layers;
        this.unit = unit;
        this.order = order;
    }

    List<LedgerRow> arranged(Arrangement arrangement) {
        switch (arrangement) {
            case ITEMS ->
                sections(Term.of(budget).stream().map(LedgerRows::line).toList());
            case ITEMS_BY_LAYER -> sections(Line.each(budget.entries()));
            case LAYERS -> layers(Line.byLayer(budget.entries()));
        }
        totals();
        return rows;
    }

    private static Line line(Term term) {
        return new Line(term.group(), term.item(), Line.ALL_LAYERS, term.inflow(), term.outflow());
    }

    private void sections(List<Line> lines) {
        section(lines, "ledger.faces", List.of(Group.SIDE, Group.LID));
        section(lines, "ledger.sources", List.of(Group.SOURCE));
        section(lines, "ledger.storage", List.of(Group.STORAGE));
    }

    private void section(List<Line> lines, String words, List<Group> groups) {
        List<Line> own =
                lines.stream().filter(line -> groups.contains(line.group())).toList();
        if (!own.isEmpty()) {
            rows.add(LedgerRow.heading(groups.get(0), Line.ALL_LAYERS, Words.of(words)));
            sorted(own).forEach(line -> rows.add(row(line, label(line))));
        }
    }

    private void layers(List<Line> lines) {
        for (int layer : new TreeSet<>(lines.stream().map(Line::layer).toList())) {
            List<Line> own =
                    lines.stream().filter(line -> line.layer() == layer).toList();
            rows.add(LedgerRow.heading(Group.SIDE, layer, layers.get(layer)));
            sorted(own).forEach(line -> rows.add(row(line, Words.of("ledger.all." + line.group()))));
        }
    }

    private List<Line> sorted(List<Line> lines) {
        return order.comparator()
                .map(comparator -> lines.stream().sorted(comparator).toList())
                .orElse(lines);
    }

    private String label(Line line) {
        String name = line.group() == Group.LID ? Words.of("ledger.lid." + line.item()) : line.item();
        return line.layer() == Line.ALL_LAYERS ? name : Words.of("ledger.in.layer", name, layers.get(line.layer()));
    }

    private LedgerRow row(Line line, String label) {
        return new LedgerRow(
                LedgerRow.Kind.ENTRY,
                line.group(),
                line.item(),
                line.layer(),
                label,
                amount(line.inflow()),
                amount(line.outflow()),
                amount(line.net()));
    }

    private double amount(double volume) {
        return unit.of(volume, budget.period());
    }

    private void totals() {
        Totals totals = budget.totals();
        rows.add(LedgerRow.heading(Group.TOTAL, Line.ALL_LAYERS, Words.of("ledger.totals")));
        for (Total total : Total.rows(!Double.isNaN(totals.storageChange()))) {
            LedgerRow.Kind kind = total.isPercentage() ? LedgerRow.Kind.PERCENTAGE : LedgerRow.Kind.TOTAL;
            double value = total.isPercentage() ? totals.get(total) : amount(totals.get(total));
            rows.add(new LedgerRow(
                    kind,
                    Group.TOTAL,
                    total.toString(),
                    Line.ALL_LAYERS,
                    total.toString(),
                    Double.NaN,
                    Double.NaN,
                    value));
        }
    }
}
