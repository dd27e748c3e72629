package org.seepledger.report;

import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.Layer;
import org.seepledger.balance.Balance;
import org.seepledger.balance.Whereabouts;
import org.seepledger.io.aquifer.AquiferFolder;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.ledger.Totals;
import org.seepledger.unit.Figures;
import org.seepledger.unit.Measure;

/** What {@code inspect} prints of a set: what it is, its values, how it balances in itself, and what looks wrong. */
public final class InspectionText {

    private final AquiferFolder folder;
    private final Aquifer aquifer;
    private final List<ValueRange> ranges;
    private final Balance balance;
    private final PeriodBudget record;
    private final String rateUnit;
    private final StringBuilder text = new StringBuilder();

    /**
     * Prepares the text.
     *
     * @param folder the set
     * @param ranges the range of each of its quantities
     * @param balance the balance of the whole grid
     * @param record its budget over the record
     */
    public InspectionText(AquiferFolder folder, List<ValueRange> ranges, Balance balance, PeriodBudget record) {
        this.folder = folder;
        this.aquifer = folder.aquifer();
        this.ranges = ranges;
        this.balance = balance;
        this.record = record;
        this.rateUnit =
                Measure.power(aquifer.lengthUnit(), 3).per(aquifer.timeUnit()).toString();
    }

    /**
     * {@return the text}
     *
     * @param warnings what looks wrong
     * @param notes lesser remarks
     */
    public String write(List<String> warnings, List<String> notes) {
        text.append("Aquifer \"").append(aquifer.name()).append("\"\n");
        writeFrame();
        writeLayers();
        writeRanges();
        PointsTable points = new PointsTable(aquifer);
        if (!points.isEmpty()) {
            points.appendTo(text, rateUnit);
        }
        writeBalance();
        writeList("Warnings", warnings, "none");
        if (!notes.isEmpty()) {
            writeList("Notes", notes, "");
        }
        text.append('\n').append(Disclaimer.text()).append('\n');
        return text.toString();
    }

    private void writeFrame() {
        Grid grid = aquifer.grid();
        TextTable facts = new TextTable();
        facts.fact(
                "plan",
                folder.crs().isLocal()
                        ? "local coordinates in " + aquifer.lengthUnit()
                        : folder.crs().code().orElse("a system given as WKT") + ", " + Figures.shown(grid.planUnit())
                                + " " + aquifer.lengthUnit() + " a plan unit");
        facts.fact(
                "heights",
                aquifer.lengthUnit()
                        + (folder.verticalDatum().isEmpty() ? "" : ", vertical datum " + folder.verticalDatum()));
        facts.fact(
                "grid",
                grid.columns() + " columns of " + sizes(grid.x()) + ", " + grid.rows() + " rows of " + sizes(grid.y())
                        + (grid.rotation() == 0 ? "" : ", turned " + Figures.shown(grid.rotation()) + " degrees"));
        facts.fact("times", times());
        facts.fact("flow", aquifer.flow().given());
        facts.fact(
                "heads",
                aquifer.head()
                        .map(head -> head.changes() ? "at each instant" : "one for all instants")
                        .orElse("none"));
        facts.fact(
                "storage",
                switch (aquifer.storageKnowledge()) {
                    case STEADY -> "none: nothing changes";
                    case KNOWN -> "known";
                    case UNKNOWN -> "not known";
                });
        facts.fact("sources", aquifer.categories().isEmpty() ? "none" : String.join(", ", aquifer.categories()));
        facts.appendTo(text, "  ");
    }

    private String times() {
        int intervals = aquifer.times().intervals();
        double first = aquifer.times().instant(0);
        double last = aquifer.times().instant(intervals);
        String span = intervals + (intervals == 1 ? " interval, " : " intervals, ") + Figures.shown(first) + " to "
                + Figures.shown(last) + " " + aquifer.timeUnit();
        return aquifer.times()
                .date(first)
                .map(date -> span + ", " + date.toLocalDate() + " to "
                        + aquifer.times().date(last).orElseThrow().toLocalDate())
                .orElse(span);
    }

    private static String sizes(Axis axis) {
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0;
        for (int i = 0; i < axis.count(); i++) {
            least = Math.min(least, axis.size(i));
            greatest = Math.max(greatest, axis.size(i));
        }
        return axis.isEven() ? Figures.shown(least) : Figures.shown(least) + " to " + Figures.shown(greatest);
    }

    private void writeLayers() {
        text.append("\nLayers, from the top\n");
        for (int i = 0; i < aquifer.layers().size(); i++) {
            Layer layer = aquifer.layers().get(i);
            text.append("  ").append(i + 1).append("  ").append(layer.name());
            text.append(layer.waterTable() ? " (water table)\n" : "\n");
        }
    }

    private void writeRanges() {
        text.append("\nValues, in the set's units\n");
        TextTable table = new TextTable().row("", "unit", "least", "greatest", "values", "without value");
        for (ValueRange range : ranges) {
            table.row(
                    range.name(),
                    range.unit(),
                    Figures.shown(range.least()),
                    Figures.shown(range.greatest()),
                    String.valueOf(range.values()),
                    String.valueOf(range.missing()));
        }
        table.appendTo(text, "  ");
    }

    private void writeBalance() {
        Totals totals = record.totals();
        double time = record.period().duration();
        Whereabouts where = balance.whereabouts().get(0);
        double throughput = totals.throughput() / time;
        text.append("\nHow the set balances in itself, mean over the record\n");
        TextTable facts = new TextTable();
        facts.fact("throughput", Figures.shown(throughput) + " " + rateUnit);
        facts.fact(
                "residual",
                Figures.shown(totals.residual() / time, throughput) + " " + rateUnit + ", "
                        + Figures.percent(totals.closureError()) + " of throughput");
        facts.fact(
                "cell imbalance",
                Figures.shown(where.magnitude()) + " " + rateUnit + " regardless of sign, "
                        + Figures.percent(100 * where.magnitude() / throughput) + " of throughput");
        facts.appendTo(text, "  ");
        if (Double.isNaN(totals.storageChange())) {
            text.append("  Change in storage is not known: cell imbalance includes it.\n");
        }
        if (!where.largest().isEmpty()) {
            text.append("  The cells furthest from balance:\n");
            HotSpots.append(text, aquifer.grid(), where.largest(), rateUnit, 1, throughput);
        }
    }

    private void writeList(String title, List<String> lines, String none) {
        text.append('\n').append(title).append('\n');
        if (lines.isEmpty()) {
            text.append("  ").append(none).append('\n');
        }
        lines.forEach(line -> text.append("  - ").append(line).append('\n'));
    }
}
