package org.seepledger.report.page;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.ledger.Period;
import org.seepledger.picture.Picture;
import org.seepledger.report.PrismResult;
import org.seepledger.report.StatedOrigins;
import org.seepledger.report.Wording;

/**
 * All that a report on water is made of.
 *
 * @param cover what every report has
 * @param results what the run came to for each prism, at least one
 * @param exchange what prisms give to each other and to the outside
 * @param units the units of rates and volumes
 * @param amounts whether tables give rates or volumes
 * @param tables which budgets get a table of all their rows
 * @param pictures the pictures of each prism, in the order of results
 * @param exchangePicture what prisms give to each other, as a picture
 */
public record Report(
        Cover cover,
        List<PrismResult> results,
        List<ExchangeFlow> exchange,
        ResultUnits units,
        Amounts amounts,
        TableChoice tables,
        List<PrismPictures> pictures,
        Optional<Picture> exchangePicture) {

    /** Copies the lists. */
    public Report {
        results = List.copyOf(results);
        exchange = List.copyOf(exchange);
        pictures = List.copyOf(pictures);
        if (pictures.size() != results.size()) {
            throw new IllegalArgumentException("pictures of " + pictures.size() + " prisms for " + results.size());
        }
    }

    Aquifer aquifer() {
        return cover.aquifer();
    }

    /** The whole record. */
    Period record() {
        return results.get(0).record().period();
    }

    /** A line of a table of totals for each prism. */
    List<TotalsTable.Line> lines() {
        return IntStream.range(0, results.size())
                .mapToObj(prism -> new TotalsTable.Line(
                        new About(results.get(prism).prism(), Optional.empty(), PrismSection.id(prism)),
                        results.get(prism).budget()))
                .toList();
    }

    BudgetFrame frame() {
        return new BudgetFrame(cover, units, amounts, "volumes");
    }

    Wording wording() {
        return frame().wording();
    }

    StatedOrigins origins() {
        return StatedOrigins.of(aquifer(), cover.statement().origins());
    }
}
