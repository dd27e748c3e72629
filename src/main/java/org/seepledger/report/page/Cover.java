package org.seepledger.report.page;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Period;
import org.seepledger.report.Wording;

/**
 * What every report has, whatever its budget is of.
 *
 * @param masthead whose report it is
 * @param version the program's version
 * @param aquifer the aquifer
 * @param crs its coordinate system; empty for local coordinates
 * @param statement inputs, origins and warnings
 * @param notes lesser remarks
 * @param options the run's options as they took effect
 */
public record Cover(
        Masthead masthead,
        String version,
        Aquifer aquifer,
        Optional<String> crs,
        Statement statement,
        List<String> notes,
        Map<String, String> options) {

    /** Copies the list. */
    public Cover {
        notes = List.copyOf(notes);
    }

    /** A stretch of time as dates, where there are any, else as times. */
    String span(Period period, Wording wording) {
        return time(period.from(), wording) + " to " + time(period.to(), wording);
    }

    String time(double time, Wording wording) {
        return aquifer.times().isoDate(time).orElseGet(() -> wording.number(time) + " " + aquifer.timeUnit());
    }
}
