package org.seepledger.report.page;

import static j2html.TagCreator.span;
import static j2html.TagCreator.td;
import static j2html.TagCreator.text;
import static j2html.TagCreator.th;
import static j2html.TagCreator.tr;

import j2html.tags.DomContent;
import j2html.tags.specialized.ThTag;
import j2html.tags.specialized.TrTag;
import java.util.ArrayList;
import java.util.List;
import org.seepledger.ledger.Entry;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Total;
import org.seepledger.report.Term;

/** The rows of a budget table. Those that have a row in {@code budget.csv} or {@code plume.csv} say so in their data attributes. */
final class BudgetRows {

    private final BudgetFrame frame;
    private final PeriodBudget budget;

    BudgetRows(BudgetFrame frame, PeriodBudget budget) {
        this.frame = frame;
        this.budget = budget;
    }

    /**
     * An item: a row of its own in its only layer, or a sum and a row for each layer. Where nothing flows in any layer, the
     * sum alone says so.
     */
    List<TrTag> of(Term term) {
        List<TrTag> rows = new ArrayList<>();
        if (term.entries().size() == 1) {
            Entry only = term.entries().get(0);
            rows.add(of(
                    only,
                    Cells.row("")
                            .with(text(term.item() + " "), span(layer(only)).withClass("layer"))));
            return rows;
        }
        rows.add(amounts(Cells.row(term.item()), term.inflow(), term.outflow())
                .withClass("item")
                .withData("group", term.group().toString())
                .withData("item", term.item()));
        boolean idle = term.inflow() == 0 && term.outflow() == 0;
        for (Entry entry : idle ? List.<Entry>of() : term.entries()) {
            rows.add(of(entry, Cells.row(layer(entry))).withClass("layer"));
        }
        return rows;
    }

    private TrTag of(Entry entry, ThTag name) {
        return amounts(name, entry.inflow(), entry.outflow())
                .withData("group", entry.account().group().toString())
                .withData("item", entry.account().item())
                .withData("layer", String.valueOf(entry.account().layer() + 1));
    }

    private String layer(Entry entry) {
        return frame.layer(entry.account().layer());
    }

    /** The sum of some items; what cannot be given counts as 0 in it, as in totals. */
    TrTag sum(String name, List<Term> terms, String style) {
        List<Term> given = terms.stream().filter(Term::quantified).toList();
        double none = given.isEmpty() ? Double.NaN : 0;
        return amounts(
                        Cells.row(name),
                        none + given.stream().mapToDouble(Term::inflow).sum(),
                        none + given.stream().mapToDouble(Term::outflow).sum())
                .withClass(style);
    }

    private TrTag amounts(ThTag name, double inflow, double outflow) {
        double throughput = budget.totals().throughput();
        double share = throughput == 0 ? Double.NaN : 100 * (inflow - outflow) / throughput;
        return tr(name, amount(inflow), amount(outflow), amount(inflow - outflow), Cells.share(share));
    }

    private DomContent amount(double volume) {
        return Cells.number(frame.amount(volume, budget.period()));
    }

    /** A total, which stands under net. */
    TrTag of(Total total) {
        double value = budget.totals().get(total);
        return tr(
                        th(total.toString()).attr("scope", "row").attr("colspan", 3),
                        total.isPercentage() ? Cells.percent(value) : amount(value),
                        share(total, value))
                .withData("group", "total")
                .withData("item", total.toString())
                .withData("layer", "*");
    }

    private DomContent share(Total total, double value) {
        double throughput = budget.totals().throughput();
        return total.isPercentage() ? td() : Cells.share(throughput == 0 ? Double.NaN : 100 * value / throughput);
    }
}
