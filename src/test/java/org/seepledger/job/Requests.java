package org.seepledger.job;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WellRule;

/** Requests for tests. */
public final class Requests {

    private Requests() {}

    /** The budget of prisms by interval, cut at the grid's edge. */
    public static BalanceRequest byInterval(Path set, Path prisms, Path out) {
        return new BalanceRequest(
                set,
                prisms,
                out,
                Periods.Every.INTERVAL,
                Optional.empty(),
                10,
                Optional.empty(),
                Optional.empty(),
                WellRule.POINT,
                true,
                2,
                false,
                ReportRequest.dated(LocalDate.of(2024, 5, 31)));
    }

    /** The solute budget of prisms and transects, cut at the grid's edge. */
    public static PlumeRequest plume(
            Path set, Path prisms, Path out, Periods.Every every, boolean dispersion, Optional<Path> transects) {
        return new PlumeRequest(
                set,
                prisms,
                out,
                every,
                Optional.empty(),
                10,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                WellRule.POINT,
                dispersion,
                Optional.empty(),
                transects,
                Optional.empty(),
                true,
                2,
                false,
                ReportRequest.dated(LocalDate.of(2024, 5, 31)));
    }
}
