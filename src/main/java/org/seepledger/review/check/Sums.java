package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.review.mapping.Sense;
import org.seepledger.unit.Figures;

/** Whether the rows of a table add to its totals, and totals, storage and residual go together. */
final class Sums {

    private final Table table;
    private final Rounding rounding;
    private final double tolerance;
    private final List<Finding> findings = new ArrayList<>();
    private final List<Figure> parts;
    private final double throughput;

    private Sums(Table table, Rounding rounding, double tolerance) {
        this.table = table;
        this.rounding = rounding;
        this.tolerance = tolerance;
        this.parts = table.parts();
        this.throughput =
                Math.max(sum(parts, Sums::gain).value(), sum(parts, Sums::loss).value());
    }

    /**
     * The findings of one table.
     *
     * @param tolerance share of throughput below which a difference is slight
     */
    static List<Finding> of(Table table, Rounding rounding, double tolerance) {
        Sums sums = new Sums(table, rounding, tolerance);
        sums.rows();
        if (sums.totalsAreGross()) {
            sums.findings.add(
                    Finding.of(
                            Severity.NOTE,
                            Code.NET,
                            table.area(),
                            table.when().label(),
                            Finding.SEVERAL,
                            "The totals are larger than what the rows come to, in and out by the same: the rows are net, the totals gross."));
        } else {
            sums.total(Kind.TOTAL_IN, Sums::gain);
            sums.total(Kind.TOTAL_OUT, Sums::loss);
        }
        sums.total(Kind.NET_TOTAL, Figure::net);
        sums.change();
        sums.residual();
        return sums.findings;
    }

    static double gain(Figure figure) {
        return figure.sense() == Sense.IN
                ? figure.value()
                : figure.sense() == Sense.OUT ? 0 : Math.max(0, figure.net());
    }

    static double loss(Figure figure) {
        return figure.sense() == Sense.OUT
                ? figure.value()
                : figure.sense() == Sense.IN ? 0 : Math.max(0, -figure.net());
    }

    private Sum sum(List<Figure> figures, ToDoubleFunction<Figure> counted) {
        return Sum.of(figures, rounding, counted);
    }

    /** In − out = net in each row that has all three. */
    private void rows() {
        for (Figure net : table.figures()) {
            if (net.tie().kind() != Kind.ITEM && net.tie().kind() != Kind.UNTIED || net.sense() != Sense.NET) {
                continue;
            }
            Optional<Figure> in = sibling(net, Sense.IN);
            Optional<Figure> out = sibling(net, Sense.OUT);
            if (in.isPresent() && out.isPresent()) {
                Sum made = sum(List.of(in.get(), out.get()), Figure::net);
                compare(
                        Code.SUM,
                        net,
                        List.of(made),
                        "in − out of \"" + net.term() + "\"",
                        List.of(in.get(), out.get()));
            }
        }
    }

    private Optional<Figure> sibling(Figure net, Sense sense) {
        List<Figure> found = table.figures().stream()
                .filter(figure ->
                        figure.term().equals(net.term()) && figure.layer().equals(net.layer()))
                .filter(figure -> figure.sense() == sense)
                .toList();
        return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
    }

    private void total(Kind kind, ToDoubleFunction<Figure> counted) {
        for (Figure total : table.of(kind)) {
            List<Sum> made = Sum.choices(withChange(kind)).stream()
                    .map(list -> sum(list, counted))
                    .toList();
            if (parts.size() > 1) {
                String whole =
                        kind == Kind.TOTAL_IN ? "what comes in" : kind == Kind.TOTAL_OUT ? "what goes out" : "all rows";
                compare(Code.SUM, total, made, "the rows of " + whole, parts);
            }
        }
    }

    /** Whether rows are net and totals are not: then both are larger than what the rows come to, by the same. */
    private boolean totalsAreGross() {
        List<Figure> in = table.of(Kind.TOTAL_IN);
        List<Figure> out = table.of(Kind.TOTAL_OUT);
        boolean net = parts.stream().anyMatch(figure -> figure.sense() == Sense.NET || figure.sense() == Sense.LOSS);
        if (!net || in.size() != 1 || out.size() != 1) {
            return false;
        }
        return Sum.choices(parts).stream().anyMatch(list -> {
            Sum gains = sum(in, Figure::value).minus(sum(list, Sums::gain));
            Sum losses = sum(out, figure -> Math.abs(figure.value())).minus(sum(list, Sums::loss));
            return gains.value() > gains.half() && gains.agrees(losses);
        });
    }

    /** A net total may take in the change in storage. */
    private List<Figure> withChange(Kind kind) {
        List<Figure> all = new ArrayList<>(parts);
        if (kind == Kind.NET_TOTAL
                && parts.stream().noneMatch(figure -> figure.tie().storage())) {
            all.addAll(table.of(Kind.CHANGE));
        }
        return all;
    }

    /** The change in storage is what the rows of storage come to. */
    private void change() {
        List<Figure> storage =
                parts.stream().filter(figure -> figure.tie().storage()).toList();
        for (Figure change : table.of(Kind.CHANGE)) {
            if (!storage.isEmpty()) {
                Sum taken = sum(storage, figure -> -figure.net());
                Sum given = sum(storage, Figure::net);
                compare(Code.SUM, change, List.of(taken, given), "the rows of storage", storage);
            }
        }
    }

    /** Residual = in − out − change, whatever of them storage is counted in. */
    private void residual() {
        for (Figure residual : table.of(Kind.RESIDUAL)) {
            List<Sum> made = new ArrayList<>();
            for (Sum flows : flows()) {
                made.add(flows);
                for (Figure change : table.of(Kind.CHANGE)) {
                    made.add(flows.minus(new Sum(change.value(), rounding.half(change))));
                    made.add(flows.minus(new Sum(-change.value(), rounding.half(change))));
                }
            }
            List<Sum> either = new ArrayList<>(made);
            made.forEach(sum -> either.add(new Sum(-sum.value(), sum.half())));
            if (!made.isEmpty()) {
                compare(Code.BALANCE, residual, either, "in − out − change in storage", List.of());
            }
        }
    }

    /** In − out, from totals where there are any, else from rows. */
    private List<Sum> flows() {
        List<Figure> in = table.of(Kind.TOTAL_IN);
        List<Figure> out = table.of(Kind.TOTAL_OUT);
        if (in.size() == 1 && out.size() == 1) {
            Sum gains = sum(in, Figure::value);
            Sum losses = sum(out, figure -> Math.abs(figure.value()));
            List<Figure> storage =
                    parts.stream().filter(figure -> figure.tie().storage()).toList();
            Sum flow = gains.minus(losses);
            Sum released = sum(storage, Figure::net);
            return List.of(flow, new Sum(flow.value() + released.value(), flow.half() + released.half()));
        }
        return parts.size() < 2
                ? List.of()
                : Sum.choices(parts).stream()
                        .map(list -> sum(list, Figure::net))
                        .toList();
    }

    /** A stated number against what it may be made of: right if one of them fits, else the nearest is told. */
    private void compare(Code code, Figure stated, List<Sum> made, String of, List<Figure> rows) {
        Sum value = new Sum(stated.value(), rounding.half(stated));
        Sum turned = new Sum(-stated.value(), rounding.half(stated));
        boolean outflow = stated.tie().kind() == Kind.TOTAL_OUT;
        double slack = 1e-9 * throughput;
        if (made.stream()
                .anyMatch(sum -> sum.agrees(value)
                        || Math.abs(sum.value() - stated.value()) <= slack
                        || outflow && sum.agrees(turned))) {
            return;
        }
        Sum nearest = made.stream()
                .min(Comparator.comparingDouble(sum -> Math.abs(sum.value() - stated.value())))
                .orElseThrow();
        double off = stated.value() - nearest.value();
        boolean slight = Math.abs(off) <= tolerance * throughput;
        String words =
                "\"" + stated.term() + "\" is " + Figures.shown(stated.value()) + " (" + stated.place() + "), but "
                        + of + " come to " + Figures.shown(nearest.value()) + ", " + Figures.shown(Math.abs(off)) + " "
                        + (off > 0 ? "less" : "more") + hint(off, rows) + ".";
        findings.add(new Finding(
                slight ? Severity.NOTE : Severity.FAULT,
                slight ? Code.SLIGHT : code,
                table.area(),
                table.when().label(),
                stated.term(),
                stated.value(),
                nearest.value(),
                table.unit(),
                words));
    }

    /** Which row alone would explain what a total is off by. */
    private String hint(double off, List<Figure> rows) {
        for (Figure row : rows) {
            double size = Math.abs(row.value());
            double near = 2 * rounding.half(row) + 1e-6 * size + 1e-3 * Math.abs(off);
            if (size > 0 && Math.abs(Math.abs(off) - 2 * size) <= near) {
                return "; it would add if \"" + row.term() + "\" counted the other way";
            }
            if (size > 0 && Math.abs(Math.abs(off) - size) <= near) {
                return "; that is \"" + row.term() + "\", which may be left out or counted twice";
            }
        }
        return "";
    }
}
