package org.seepledger.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;
import org.seepledger.fault.UsageFault;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The options that change what a row of a budget comes to. */
final class BudgetOptions {

    @ArgGroup
    private Dates dates = new Dates();

    /** Either regular periods or the user's own. */
    static final class Dates {

        @Option(
                names = "--every",
                paramLabel = "PERIOD",
                description =
                        "Strike a budget for each interval (default), month, year, water-year, or the whole record.")
        private String every = "interval";

        @Option(names = "--periods", paramLabel = "FILE", description = "Or for the periods of a CSV: name,from,to.")
        private Path periods;
    }

    @Option(
            names = "--water-year-start",
            paramLabel = "MONTH",
            description = "The month in which a water year begins, 1 to 12 (default: 10).")
    private int waterYearStart = 10;

    @Option(names = "--rate-unit", paramLabel = "UNIT", description = "Unit of rates, as L/s (default: the set's own).")
    private String rateUnit;

    @Option(
            names = "--wells",
            paramLabel = "RULE",
            description =
                    "How a well counts whose cell a prism cuts: point (default), in full if it is inside; spread, by"
                            + " the share of its cell inside.")
    private String wells = "point";

    @Option(
            names = "--clip",
            description = "Cut prisms at the grid's edge instead of refusing those that reach beyond it.")
    private boolean clip;

    @Mixin
    private WorkOptions work = new WorkOptions();

    Periods.Every every() {
        return Choices.choice("--every", dates.every, Periods.Every.class);
    }

    Optional<Path> periods() {
        return Optional.ofNullable(dates.periods);
    }

    int waterYearStart() {
        if (waterYearStart < 1 || waterYearStart > 12) {
            throw new UsageFault("--water-year-start is " + waterYearStart + "; give a month from 1 to 12.");
        }
        return waterYearStart;
    }

    Optional<Measure> rateUnit() {
        return rateUnit("m3/d");
    }

    /** The unit of rates, which must measure the same as another. */
    Optional<Measure> rateUnit(String like) {
        return Choices.measure("--rate-unit", rateUnit, like);
    }

    WellRule wells() {
        return Choices.choice("--wells", wells, WellRule.class);
    }

    boolean clip() {
        return clip;
    }

    int threads() {
        return work.threads();
    }

    /** Where progress is told, if it is. */
    Progress progress(Terminal terminal) {
        return work.progress(terminal);
    }
}
