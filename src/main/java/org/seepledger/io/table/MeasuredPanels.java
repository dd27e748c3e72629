package org.seepledger.io.table;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.Consumer;
import org.seepledger.fault.DataFault;
import org.seepledger.plume.NonDetects;
import org.seepledger.plume.Panels;
import org.seepledger.unit.Measure;

/**
 * The panels of one measured transect and solute: {@code transect,solute,panel,q,c,area}.
 *
 * @param transect its name
 * @param solute the solute; empty if the table names none
 * @param names the panels' names
 * @param panels what crosses them by {@link NonDetects}: length², length³/time and kg/time of the set
 * @param concentration the unit that concentrations were given in
 */
public record MeasuredPanels(
        String transect, String solute, List<String> names, List<Panels> panels, Measure concentration) {

    private static final long MOST_LINES = 100_000;
    private static final Set<String> KNOWN = Set.of("transect", "solute", "panel", "q", "c", "area");

    private record Key(String transect, String solute) {}

    private record Line(String panel, double q, double c, boolean below, double area) {}

    /**
     * {@return the transects of a table, in order of first mention}
     *
     * @param file the file
     * @param shownName the file as the user named it
     * @param length the set's length unit
     * @param time the set's time unit
     * @param warnings receives a sentence for what is doubtful
     * @throws DataFault if the file cannot be read, a column or its unit is missing, or a number cannot be
     */
    public static List<MeasuredPanels> read(
            Path file, String shownName, Measure length, Measure time, Consumer<String> warnings) {
        try (TableReader table = TableReader.open(file, shownName, MOST_LINES)) {
            Header header = table.header();
            header.warnOfUnused(KNOWN, warnings);
            int c = header.required("c");
            Measure unit = header.unit(c)
                    .orElseThrow(
                            () -> header.fault(c, "no unit", "the unit of concentrations", "Write it as c [mg/L]."));
            Measure massPerLength3 = Measure.of("kg").per(Measure.power(length, 3));
            double[] factors = {
                header.factor(header.required("q"), length.per(time), length.per(time)),
                header.factor(c, unit, massPerLength3),
                header.factor(header.required("area"), Measure.power(length, 2), Measure.power(length, 2))
            };
            Map<Key, List<Line>> lines = new LinkedHashMap<>();
            OptionalInt solute = header.known("solute");
            while (table.next()) {
                String name = solute.isPresent() ? table.text(solute.getAsInt()) : "";
                lines.computeIfAbsent(new Key(table.name(header.required("transect")), name), key -> new ArrayList<>())
                        .add(line(table, factors));
            }
            return lines.entrySet().stream()
                    .map(entry -> of(entry.getKey(), entry.getValue(), unit))
                    .toList();
        }
    }

    private static Line line(TableReader table, double[] factors) {
        Header header = table.header();
        OptionalInt panel = header.known("panel");
        int c = header.required("c");
        int area = header.required("area");
        double concentration = table.number(c, Below.AS_LIMIT);
        double size = table.required(area, "Give the panel's area.");
        if (!(concentration >= 0)) {
            throw table.fault(c, Shown.cell(table.text(c)), "0 or more, or <limit", "Correct the concentration.");
        }
        if (!(size > 0)) {
            throw table.fault(area, Shown.cell(table.text(area)), "more than 0", "Correct the panel's area.");
        }
        return new Line(
                panel.isPresent() ? table.text(panel.getAsInt()) : "line " + table.line(),
                table.required(header.required("q"), "Give the specific discharge.") * factors[0],
                concentration * factors[1],
                table.text(c).startsWith("<"),
                size * factors[2]);
    }

    private static MeasuredPanels of(Key key, List<Line> lines, Measure unit) {
        double[] areas = lines.stream().mapToDouble(Line::area).toArray();
        double[] flows = lines.stream().mapToDouble(line -> line.q * line.area).toArray();
        List<Panels> panels = new ArrayList<>();
        for (NonDetects choice : NonDetects.values()) {
            double[] rates = lines.stream()
                    .mapToDouble(line -> line.q * line.area * (line.below ? choice.of(line.c) : line.c))
                    .toArray();
            panels.add(new Panels(areas, flows, rates));
        }
        return new MeasuredPanels(
                key.transect, key.solute, lines.stream().map(Line::panel).toList(), panels, unit);
    }
}
