package org.seepledger.report;

import java.util.LinkedHashMap;
import java.util.Map;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.unit.Figures;

/** How many point sources of each category a set has, and what they give and take over its record. */
final class PointsTable {

    private final Map<String, Points> categories = new LinkedHashMap<>();

    PointsTable(Aquifer aquifer) {
        double from = aquifer.times().instant(0);
        double to = aquifer.times().instant(aquifer.times().intervals());
        for (Source source : aquifer.sources()) {
            if (source instanceof Source.Points points) {
                for (Well well : points.wells()) {
                    categories
                            .computeIfAbsent(well.category(), name -> new Points())
                            .add(well.meanRate(from, to));
                }
            }
        }
    }

    boolean isEmpty() {
        return categories.isEmpty();
    }

    void appendTo(StringBuilder text, String rateUnit) {
        text.append("\nPoint sources, mean rates over the record in ")
                .append(rateUnit)
                .append('\n');
        TextTable table = new TextTable().row("", "number", "idle", "least", "greatest", "all together");
        for (Map.Entry<String, Points> category : categories.entrySet()) {
            table.row(category.getValue().cells(category.getKey()));
        }
        table.appendTo(text, "  ");
    }

    private static final class Points {

        private int number;
        private int idle;
        private double least = Double.POSITIVE_INFINITY;
        private double greatest = Double.NEGATIVE_INFINITY;
        private double sum;

        void add(double rate) {
            number++;
            idle += rate == 0 ? 1 : 0;
            least = Math.min(least, rate);
            greatest = Math.max(greatest, rate);
            sum += rate;
        }

        String[] cells(String name) {
            return new String[] {
                name,
                String.valueOf(number),
                String.valueOf(idle),
                Figures.shown(least),
                Figures.shown(greatest),
                Figures.shown(sum)
            };
        }
    }
}
