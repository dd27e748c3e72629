package org.seepledger.review.check;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.review.mapping.Figure;

/** The checks that need nothing but the table. */
final class Arithmetic {

    private Arithmetic() {}

    /**
     * What is wrong with a table in itself.
     *
     * @param figures its figures
     * @param tolerance share of throughput below which a difference is slight
     */
    static List<Finding> of(List<Figure> figures, double tolerance) {
        Rounding rounding = Rounding.of(figures);
        List<Table> tables = Table.of(figures);
        List<Finding> findings = new ArrayList<>();
        tables.forEach(table -> findings.addAll(Sums.of(table, rounding, tolerance)));
        findings.addAll(Parts.of(figures, rounding, tolerance));
        findings.addAll(Durations.of(figures, rounding, tolerance));
        findings.addAll(Carries.of(tables, rounding));
        findings.addAll(Closures.of(tables, figures, rounding));
        return findings;
    }
}
