package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Periods;
import org.seepledger.balance.WaterBalance;
import org.seepledger.balance.WellRule;
import org.seepledger.io.result.PrismBudget;
import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.picture.Picture;
import org.seepledger.progress.Progress;
import org.seepledger.report.PrismResult;
import org.seepledger.report.SvgWriter;
import org.seepledger.report.page.PrismPictures;
import org.seepledger.report.page.ReportPictures;

/** Draws the pictures of the guide, as reports on the sample aquifers have them, into {@code docs/images}. */
public final class GuidePictures {

    private static final Path SAMPLES = Path.of("sample-aquifers");

    private GuidePictures() {}

    /** What a sample's report shows. */
    private record Drawn(List<String> prisms, List<PrismPictures> pictures, Optional<Picture> exchange) {

        PrismPictures of(String prism) {
            return pictures.get(prisms.indexOf(prism));
        }
    }

    /**
     * Draws them.
     *
     * @param args the folder to write to; by default {@code docs/images}
     * @throws IOException if they cannot be written
     */
    public static void main(String[] args) throws IOException {
        Path folder = Files.createDirectories(Path.of(args.length > 0 ? args[0] : "docs/images"));
        Drawn valley = drawn("valley", Periods.Every.MONTH);
        PrismPictures field = valley.of("well field");
        write(folder, "map", field.map());
        write(folder, "blocks", field.blocks());
        write(folder, "series", field.series());
        write(folder, "storage", field.storage());
        write(folder, "section", valley.of("south terrace").section());
        write(folder, "exchange", valley.exchange());
        write(
                folder,
                "imbalance",
                drawn("terrace", Periods.Every.RECORD).of("well field").imbalance());
    }

    private static void write(Path folder, String name, Optional<Picture> picture) throws IOException {
        Files.writeString(folder.resolve(name + ".svg"), SvgWriter.file(picture.orElseThrow()));
    }

    private static Drawn drawn(String sample, Periods.Every every) {
        Path folder = SAMPLES.resolve(sample);
        try (Subject subject = Subject.open(folder, folder.resolve("prisms.geojson"), false)) {
            Balance balance = WaterBalance.of(subject.aquifer(), subject.prisms(), WellRule.POINT, 1, Progress.NONE);
            List<Period> periods = subject.periods(every, Optional.empty(), 10);
            List<PrismBudget> budgets = balance.ledgers().stream()
                    .map(ledger -> new PrismBudget(
                            ledger.prism(), periods.stream().map(ledger::budget).toList()))
                    .toList();
            ResultUnits units = subject.units(Optional.empty(), Optional.empty());
            ReportPictures pictures = new ReportPictures(subject.aquifer(), subject.prisms(), balance, units);
            return new Drawn(
                    budgets.stream().map(PrismBudget::prism).toList(),
                    IntStream.range(0, budgets.size())
                            .mapToObj(prism ->
                                    pictures.of(prism, PrismResult.of(subject.aquifer(), balance, budgets, prism)))
                            .toList(),
                    pictures.exchange(new Periods(subject.aquifer().times()).record()));
        }
    }
}
