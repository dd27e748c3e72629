package org.seepledger.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.seepledger.aquifer.Times;
import org.seepledger.io.table.CsvText;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Plume;
import org.seepledger.plume.Stock;
import org.seepledger.unit.Measure;

/** Writes {@code mass.csv}: what each prism holds of each solute at each instant, by layer and in all. */
public final class MassCsv {

    private static final String[] HEADER = {
        "prism",
        "solute",
        "instant",
        "time",
        "date",
        "layer",
        "dissolved",
        "sorbed",
        "total",
        "total_nd_zero",
        "total_nd_limit",
        "mass_unit",
        "share_on_nondetects",
        "detects",
        "nondetects",
        "mean",
        "maximum",
        "above",
        "concentration_unit",
        "water_volume",
        "rock_volume",
        "rock_volume_above",
        "volume_unit",
        "area_above",
        "area_unit"
    };

    private final Times times;
    private final MassUnits units;
    private final Measure length;
    private final OptionalDouble above;
    private final ResultTable rows;

    private MassCsv(Times times, MassUnits units, Measure length, OptionalDouble above, ResultTable rows) {
        this.times = times;
        this.units = units;
        this.length = length;
        this.above = above;
        this.rows = rows;
    }

    /**
     * Writes the table.
     *
     * @param file the file, which must not exist
     * @param statement what stands before the rows
     * @param plumes by prism and solute
     * @param times the record's instants
     * @param units the units to give; concentrations are in each solute's own
     * @param length the set's length unit
     * @param above the concentration above which volume and area were counted, kg/length³; empty for none
     * @throws IOException if it cannot be written
     */
    public static void write(
            Path file,
            Statement statement,
            List<Plume> plumes,
            Times times,
            MassUnits units,
            Measure length,
            OptionalDouble above)
            throws IOException {
        try (ResultTable rows = ResultTable.open(file, PlumeCsv.notes(statement), HEADER)) {
            MassCsv table = new MassCsv(times, units, length, above, rows);
            for (Plume plume : plumes) {
                for (int instant = 0; instant < plume.stocks().size(); instant++) {
                    for (int layer = 0; layer <= plume.layers(); layer++) {
                        table.write(plume, instant, layer);
                    }
                }
            }
        }
    }

    private void write(Plume plume, int instant, int layer) throws IOException {
        Stock stock = plume.stocks().get(instant).get(layer);
        double time = times.instant(instant);
        Measure unit = plume.solute().concentration().orElseThrow().unit();
        double factor = MassUnits.concentrationFactor(unit, length);
        rows.cells(CsvText.text(plume.prism()), CsvText.text(plume.solute().name()), String.valueOf(instant));
        rows.cells(CsvText.number(time), times.isoDate(time).orElse(""));
        rows.cells(layer == plume.layers() ? "*" : String.valueOf(plume.firstLayer() + layer + 1));
        rows.cells(mass(stock.dissolved(NonDetects.HALF)), mass(stock.sorbed(NonDetects.HALF)));
        rows.cells(mass(stock.total(NonDetects.HALF)));
        rows.cells(
                mass(stock.total(NonDetects.ZERO)),
                mass(stock.total(NonDetects.LIMIT)),
                units.mass().toString());
        rows.cells(CsvText.number(stock.undetectedShare()));
        rows.cells(String.valueOf(stock.detects()), String.valueOf(stock.nonDetects()));
        rows.cells(CsvText.number(stock.mean() * factor), CsvText.number(stock.maximum() * factor));
        rows.cells(CsvText.number(above.orElse(Double.NaN) * factor), unit.toString());
        rows.cells(volume(stock.water()), volume(stock.rock()));
        rows.cells(
                above.isPresent() ? volume(stock.rockAbove()) : "",
                units.volume().toString());
        rows.cells(
                above.isPresent() ? CsvText.number(stock.areaAbove()) : "",
                units.area().toString());
        rows.endRow();
    }

    private String mass(double mass) {
        return CsvText.number(mass * units.massFactor());
    }

    private String volume(double volume) {
        return CsvText.number(volume * units.volumeFactor());
    }
}
