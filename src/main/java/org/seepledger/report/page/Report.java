package org.seepledger.report.page;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.picture.Picture;
import org.seepledger.report.PrismResult;
import org.seepledger.report.StatedOrigins;
import org.seepledger.report.Wording;

/**
 * All that a report is made of.
 *
 * @param masthead whose report it is
 * @param version the program's version
 * @param aquifer the aquifer
 * @param crs its coordinate system; empty for local coordinates
 * @param results what the run came to for each prism, at least one
 * @param exchange what prisms give to each other and to the outside
 * @param units the units of rates and volumes
 * @param amounts whether tables give rates or volumes
 * @param tables which budgets get a table of all their rows
 * @param statement inputs, origins and warnings
 * @param notes lesser remarks
 * @param options the run's options as they took effect
 * @param pictures the pictures of each prism, in the order of results
 * @param exchangePicture what prisms give to each other, as a picture
 */
public record Report(
        Masthead masthead,
        String version,
        Aquifer aquifer,
        Optional<String> crs,
        List<PrismResult> results,
        List<ExchangeFlow> exchange,
        ResultUnits units,
        Amounts amounts,
        TableChoice tables,
        Statement statement,
        List<String> notes,
        Map<String, String> options,
        List<PrismPictures> pictures,
        Optional<Picture> exchangePicture) {

    /** Copies the lists. */
    public Report {
        results = List.copyOf(results);
        exchange = List.copyOf(exchange);
        notes = List.copyOf(notes);
        pictures = List.copyOf(pictures);
        if (pictures.size() != results.size()) {
            throw new IllegalArgumentException("pictures of " + pictures.size() + " prisms for " + results.size());
        }
    }

    /** The whole record. */
    Period record() {
        return results.get(0).record().period();
    }

    Wording wording() {
        return Wording.typeset(units);
    }

    StatedOrigins origins() {
        return StatedOrigins.of(aquifer, statement.origins());
    }

    /** A volume as the tables give it. */
    double amount(double volume, Period period) {
        return amounts.of(volume, period, units);
    }

    /** What the tables give, and its unit. */
    String amountsAndUnit() {
        return (amounts == Amounts.RATE ? "mean rates in " : "volumes in ")
                + wording().unit(amounts.unit(units));
    }

    /** A stretch of time as dates, where there are any, else as times. */
    String span(Period period) {
        return time(period.from()) + " to " + time(period.to());
    }

    private String time(double time) {
        return aquifer.times().isoDate(time).orElseGet(() -> wording().number(time) + " " + aquifer.timeUnit());
    }
}
