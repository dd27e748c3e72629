package org.seepledger.report;

import java.util.List;
import java.util.Locale;
import org.seepledger.aquifer.Grid;
import org.seepledger.balance.HotSpot;
import org.seepledger.unit.Figures;

/** Cells that do not balance, as a table with their places on the map. */
final class HotSpots {

    private HotSpots() {}

    static void append(
            StringBuilder text, Grid grid, List<HotSpot> spots, String unit, double factor, double throughput) {
        TextTable table = new TextTable().row("layer", "row", "column", "x", "y", unit, "of throughput");
        for (HotSpot spot : spots) {
            CellPlace place = CellPlace.of(grid, spot);
            table.row(
                    String.valueOf(spot.layer() + 1),
                    String.valueOf(spot.row() + 1),
                    String.valueOf(spot.column() + 1),
                    String.format(Locale.ROOT, "%.1f", place.x()),
                    String.format(Locale.ROOT, "%.1f", place.y()),
                    Figures.shown(spot.imbalance() * factor),
                    Figures.percent(100 * spot.imbalance() / throughput));
        }
        table.appendTo(text, "    ");
    }
}
