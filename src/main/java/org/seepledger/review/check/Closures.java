package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.seepledger.review.mapping.Figure;
import org.seepledger.review.mapping.Kind;
import org.seepledger.unit.Figures;

/** What the closure of a table tells: exactly nothing, always of the same sign, or a percentage that does not follow. */
final class Closures {

    private static final int PERIODS_NEEDED = 4;
    private static final double LARGE = 0.05;

    private final Rounding rounding;
    private final List<Finding> findings = new ArrayList<>();

    private Closures(Rounding rounding) {
        this.rounding = rounding;
    }

    /** A table's residual, as it is stated or as it follows from the rows. */
    private record Residual(Table table, double value, double half, double throughput, boolean stated) {}

    static List<Finding> of(List<Table> tables, List<Figure> figures, Rounding rounding) {
        Closures closures = new Closures(rounding);
        Map<List<String>, List<Residual>> byArea = new LinkedHashMap<>();
        for (Table table : tables) {
            Residual residual = closures.residual(table);
            if (residual.throughput() > 0 && table.parts().size() > 2) {
                byArea.computeIfAbsent(List.of(table.area(), table.unit()), key -> new ArrayList<>())
                        .add(residual);
            }
            closures.percent(table, residual, figures);
        }
        byArea.values().forEach(closures::notes);
        return closures.findings;
    }

    private Residual residual(Table table) {
        List<Figure> parts = new ArrayList<>(table.parts());
        boolean stored = parts.stream().anyMatch(figure -> figure.tie().storage());
        if (!stored) {
            parts.addAll(table.of(Kind.CHANGE));
        }
        Sum made = Sum.of(parts, rounding, Figure::net);
        double throughput = Math.max(
                Sum.of(parts, rounding, Sums::gain).value(),
                Sum.of(parts, rounding, Sums::loss).value());
        List<Figure> stated = table.of(Kind.RESIDUAL);
        if (stated.size() == 1) {
            return new Residual(table, stated.get(0).value(), rounding.half(stated.get(0)), throughput, true);
        }
        return new Residual(table, made.value(), made.half(), throughput, false);
    }

    private void notes(List<Residual> residuals) {
        Residual first = residuals.get(0);
        Table table = first.table();
        String period = residuals.size() == 1 ? table.when().label() : Finding.SEVERAL;
        if (residuals.stream().allMatch(Closures::isNothing)) {
            findings.add(Finding.of(
                    Severity.NOTE,
                    Code.EXACT_CLOSURE,
                    table.area(),
                    period,
                    "residual",
                    "The budget closes exactly"
                            + (residuals.size() == 1 ? "" : " in each of " + residuals.size() + " periods")
                            + ": one of its terms may be what the others leave over."));
            return;
        }
        double sign = Math.signum(first.value());
        boolean oneSided = residuals.size() >= PERIODS_NEEDED
                && residuals.stream()
                        .allMatch(residual -> Math.signum(residual.value()) == sign
                                && Math.abs(residual.value()) > significant(residual));
        if (oneSided) {
            findings.add(Finding.of(
                    Severity.NOTE,
                    Code.ONE_SIDED,
                    table.area(),
                    Finding.SEVERAL,
                    "residual",
                    "The residual is " + (sign > 0 ? "positive" : "negative") + " in each of " + residuals.size()
                            + " periods: a term may always be too large or too small."));
        }
        residuals.stream()
                .filter(residual -> !residual.stated()
                        && Math.abs(residual.value()) > LARGE * residual.throughput() + residual.half())
                .findFirst()
                .ifPresent(residual -> findings.add(new Finding(
                        Severity.NOTE,
                        Code.NOT_CLOSED,
                        table.area(),
                        residual.table().when().label(),
                        "residual",
                        residual.value(),
                        Double.NaN,
                        table.unit(),
                        "The rows leave " + Figures.shown(residual.value()) + " of a throughput of "
                                + Figures.shown(residual.throughput()) + ", which the table does not speak of.")));
    }

    private static double significant(Residual residual) {
        return residual.half() + 1e-9 * residual.throughput();
    }

    private static boolean isNothing(Residual residual) {
        return Math.abs(residual.value()) <= 1e-9 * residual.throughput();
    }

    /** The stated percentage against each that is in use: of in, of out, of their mean, of the larger. */
    private void percent(Table table, Residual residual, List<Figure> figures) {
        for (Figure percent : figures) {
            boolean here = percent.tie().kind() == Kind.PERCENT
                    && percent.area().equals(table.area())
                    && percent.when().equals(table.when());
            if (!here || Double.isNaN(percent.value()) || residual.throughput() == 0) {
                continue;
            }
            double in = total(
                    table,
                    Kind.TOTAL_IN,
                    Sum.of(table.parts(), rounding, Sums::gain).value());
            double out = total(
                    table,
                    Kind.TOTAL_OUT,
                    Sum.of(table.parts(), rounding, Sums::loss).value());
            double[] wholes = {in, out, (in + out) / 2, in + out, residual.throughput()};
            boolean follows = DoubleStream.of(wholes).anyMatch(whole -> fits(percent, residual, whole));
            if (!follows) {
                double made = 100 * residual.value() / residual.throughput();
                findings.add(new Finding(
                        Severity.DOUBT,
                        Code.PERCENT,
                        table.area(),
                        table.when().label(),
                        percent.term(),
                        percent.value(),
                        made,
                        "%",
                        "A closure error of " + Figures.shown(percent.value()) + " % is stated (" + percent.place()
                                + "); the table itself comes to " + Figures.percent(made) + " of throughput."));
            }
        }
    }

    private static double total(Table table, Kind kind, double made) {
        List<Figure> stated = table.of(kind);
        return stated.size() == 1 ? Math.abs(stated.get(0).value()) : made;
    }

    private boolean fits(Figure percent, Residual residual, double whole) {
        double made = 100 * residual.value() / whole;
        double allowed = percent.half() + 100 * residual.half() / whole + 0.02 * Math.abs(made) + 1e-9;
        return Math.abs(Math.abs(percent.value()) - Math.abs(made)) <= allowed;
    }
}
