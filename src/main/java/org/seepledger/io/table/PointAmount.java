package org.seepledger.io.table;

import org.seepledger.aquifer.Stored;
import org.seepledger.io.table.SpanReader.Span;
import org.seepledger.unit.Measure;

/** Reads how much water a point adds, as a rate or as a volume over its span of time. */
final class PointAmount {

    private static final String REMEDY =
            "Give a rate, or a volume with from and to; negative takes water out. Leave the other cell empty.";

    private final TableReader table;
    private final OptionalNumber rate;
    private final OptionalNumber volume;

    PointAmount(TableReader table, Measure lengthUnit, Measure timeUnit, Measure rateUnit) {
        this.table = table;
        Header header = table.header();
        Measure cube = Measure.power(lengthUnit, 3);
        this.rate = OptionalNumber.of(header, "rate", rateUnit, cube.per(timeUnit));
        this.volume = OptionalNumber.of(header, "volume", cube, cube);
        if (rate.column().isEmpty() && volume.column().isEmpty()) {
            throw header.missing("rate", header.names());
        }
    }

    /**
     * {@return the rate of the current line, in cubic length units per time unit}
     *
     * @param span from when to when it lasts
     * @throws org.seepledger.fault.DataFault if there is none, or one too many, or a volume without both ends
     */
    double rate(Span span) {
        double given = rate.read(table);
        double total = volume.read(table);
        if (Double.isNaN(given) == Double.isNaN(total)) {
            String found = Double.isNaN(given) ? "no rate" : "a rate and a volume";
            throw table.fault(found, "a rate, or a volume in its place", REMEDY);
        }
        if (!Double.isNaN(given)) {
            return given;
        }
        double duration = span.to() - span.from();
        if (Double.isInfinite(duration)) {
            throw table.fault("a volume without its from or to", "both, since they give it a rate", REMEDY);
        }
        return table.finite(volume.column().orElseThrow(), total / duration);
    }

    /**
     * {@return the number in the current line that its rate follows from, and by what it is multiplied}
     *
     * @param span from when to when it lasts
     */
    Stored given(Span span) {
        boolean isRate = !Double.isNaN(rate.read(table));
        OptionalNumber amount = isRate ? rate : volume;
        int column = amount.column().orElseThrow();
        double factor = isRate ? amount.factor() : amount.factor() / (span.to() - span.from());
        String place = "line " + table.line() + ", column " + table.header().name(column);
        return Stored.number(table.shownName(), place, table.number(column), factor);
    }
}
