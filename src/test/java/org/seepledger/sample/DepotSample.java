package org.seepledger.sample;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Writes the sample aquifer of the depot. */
public final class DepotSample {

    /** Below this nothing is detected, mg/L. */
    private static final double LIMIT = 0.002;

    private static final int ALL_DIGITS = 17;

    private DepotSample() {}

    /**
     * Writes the files into a folder, over those that are there.
     *
     * @param args the folder
     * @throws IOException if it cannot be written
     */
    public static void main(String[] args) throws IOException {
        SampleFolder.named(args).write(files());
    }

    /** {@return what each file holds, by name} */
    static Map<String, String> files() {
        DepotFlow flow = new DepotFlow(Valley.solved());
        Map<String, String> files = new TreeMap<>();
        files.put("aquifer.json", aquifer());
        files.put("ground.csv", ground(flow));
        files.put("flow.csv", flow(flow));
        files.put("head.csv", heads(flow));
        files.put("spill.csv", spill());
        files.put("concentration.csv", concentrations(flow));
        files.put("prisms.geojson", prisms());
        files.put("transects.geojson", transects());
        return files;
    }

    private static String aquifer() {
        return """
                {
                  "name": "Invented depot",
                  "crs": null,
                  "vertical_datum": "local",
                  "length_unit": "m",
                  "time_unit": "d",
                  "start_date": "%s",
                  "grid": {"x": {"from": 0, "step": %s, "count": %d}, "y": {"from": 0, "step": %s, "count": %d}},
                  "layers": [{"name": "Gravel", "top": {"file": "ground.csv", "column": "top"},
                              "bottom": {"file": "ground.csv", "column": "bottom"}, "water_table": true}],
                  "times": [%s],
                  "flow": {"kind": "face_flow", "east": {"file": "flow.csv", "column": "east"},
                           "north": {"file": "flow.csv", "column": "north"}, "up": 0,
                           "west": {"file": "flow.csv", "column": "west"}, "south": {"file": "flow.csv", "column": "south"},
                           "down": {"file": "flow.csv", "column": "down"},
                           "origin": "simulated", "reference": "a window of the invented valley's gravel, on finer cells"},
                  "head": {"file": "head.csv", "column": "head"},
                  "storage": {"specific_yield": {"file": "ground.csv", "column": "specific_yield"}, "specific_storage": %s},
                  "sources": [
                    {"category": "recharge", "kind": "areal", "rate": {"file": "flow.csv", "column": "recharge"},
                     "concentration": {"solvent": {"file": "spill.csv", "column": "solvent"}}}
                  ],
                  "solutes": [
                    {"name": "solvent", "concentration": {"file": "concentration.csv", "column": "solvent"}, "unit": "mg/L",
                     "porosity": %s, "bulk_density": %s, "sorption": {"isotherm": "linear", "kd": %s, "unit": "L/kg"},
                     "half_life": %s, "boundary_concentration": 0,
                     "dispersion": {"longitudinal": %s, "transverse": %s, "vertical": %s}},
                    {"name": "breakdown product", "concentration": {"file": "concentration.csv", "column": "product"},
                     "unit": "mg/L", "porosity": %s, "bulk_density": %s,
                     "sorption": {"isotherm": "linear", "kd": %s, "unit": "L/kg"},
                     "half_life": %s, "parent": "solvent", "yield": %s, "boundary_concentration": 0,
                     "dispersion": {"longitudinal": %s, "transverse": %s, "vertical": %s}}
                  ]
                }
                """.formatted(
                        ValleySeasons.START,
                        plain(DepotFlow.CELL),
                        DepotFlow.COLUMNS,
                        plain(DepotFlow.CELL),
                        DepotFlow.ROWS,
                        ValleySeasons.instants(),
                        plain(ValleyGround.SPECIFIC_STORAGE[ValleyGround.GRAVEL]),
                        plain(DepotPlume.POROSITY),
                        plain(DepotPlume.BULK_DENSITY),
                        plain(DepotPlume.KD[0]),
                        plain(DepotPlume.HALF_LIFE[0]),
                        plain(DepotMonth.LONGITUDINAL),
                        plain(DepotMonth.TRANSVERSE),
                        plain(DepotMonth.VERTICAL),
                        plain(DepotPlume.POROSITY),
                        plain(DepotPlume.BULK_DENSITY),
                        plain(DepotPlume.KD[1]),
                        plain(DepotPlume.HALF_LIFE[1]),
                        plain(DepotPlume.YIELD),
                        plain(DepotMonth.LONGITUDINAL),
                        plain(DepotMonth.TRANSVERSE),
                        plain(DepotMonth.VERTICAL));
    }

    private static String ground(DepotFlow flow) {
        StringBuilder table = new StringBuilder(
                "# Invented depot: top and base of the gravel, and what of it drains\nrow,col,top,bottom,specific_yield\n");
        eachCell((row, column) -> line(
                table,
                row,
                column,
                plain(flow.top(column, row)),
                plain(flow.bottom(column, row)),
                plain(flow.specificYield(column, row))));
        return table.toString();
    }

    /** West and south faces have a number where they are the grid's own. */
    private static String flow(DepotFlow flow) {
        StringBuilder table = new StringBuilder("# Invented depot: flow through the cells' faces, and recharge\n"
                + "row,col,interval,east [m3/d],north [m3/d],west [m3/d],south [m3/d],down [m3/d],recharge [mm/yr]\n");
        for (int interval = 0; interval < DepotPlume.INTERVALS; interval++) {
            int at = interval;
            eachCell((row, column) -> line(
                    table,
                    row,
                    column,
                    String.valueOf(at + 1),
                    exact(flow.east(at, column + 1, row)),
                    exact(flow.north(at, column, row + 1)),
                    column == 0 ? exact(flow.east(at, column, row)) : "",
                    row == 0 ? exact(flow.north(at, column, row)) : "",
                    exact(flow.up(at, column, row)),
                    String.valueOf(flow.recharge(at, column, row))));
        }
        return table.toString();
    }

    private static String heads(DepotFlow flow) {
        StringBuilder table = new StringBuilder("# Invented depot: heads\nrow,col,instant,head\n");
        for (int instant = 0; instant <= DepotPlume.INTERVALS; instant++) {
            int at = instant;
            eachCell((row, column) -> line(table, row, column, String.valueOf(at), exact(flow.head(at, column, row))));
        }
        return table.toString();
    }

    private static String spill() {
        StringBuilder table = new StringBuilder(
                "# Invented depot: what recharge carries through spoiled ground\nrow,col,interval,solvent [mg/L]\n");
        for (int interval = 0; interval < DepotPlume.INTERVALS; interval++) {
            int at = interval;
            eachCell((row, column) -> {
                if (DepotPlume.isSpoiled(column, row)) {
                    line(table, row, column, String.valueOf(at + 1), plain(DepotPlume.seeping(at)));
                }
            });
        }
        return table.toString();
    }

    private static String concentrations(DepotFlow flow) {
        List<List<double[]>> solved = new DepotPlume(flow).solved();
        StringBuilder table = new StringBuilder(
                "# Invented depot: concentrations; a laboratory that detects 0.002 mg/L, <0.002 below\n"
                        + "row,col,instant,solvent [mg/L],product [mg/L]\n");
        for (int instant = 0; instant <= DepotPlume.INTERVALS; instant++) {
            int at = instant;
            eachCell((row, column) -> line(
                    table,
                    row,
                    column,
                    String.valueOf(at),
                    detected(solved.get(0).get(at)[row * DepotFlow.COLUMNS + column]),
                    detected(solved.get(1).get(at)[row * DepotFlow.COLUMNS + column])));
        }
        return table.toString();
    }

    private static String detected(double value) {
        return value < LIMIT ? "<0.002" : plain(value);
    }

    private static void line(StringBuilder table, int row, int column, String... cells) {
        table.append(DepotFlow.ROWS - row).append(',').append(column + 1);
        table.append(',').append(String.join(",", cells)).append('\n');
    }

    private interface Cell {
        void at(int row, int column);
    }

    private static void eachCell(Cell cell) {
        for (int row = DepotFlow.ROWS - 1; row >= 0; row--) {
            for (int column = 0; column < DepotFlow.COLUMNS; column++) {
                cell.at(row, column);
            }
        }
    }

    /** The yard along cell faces, the meadow across cells. */
    private static String prisms() {
        return DrawnPrism.geoJson(
                "",
                new Frame(0, 0, 0),
                new DrawnPrism(
                        "yard",
                        "\"layers\": [1, 1]",
                        "{\"street\": [\"side 4\"], \"meadow side\": [\"side 2\"]}",
                        List.<double[][]>of(new double[][] {{20, 20}, {120, 20}, {120, 110}, {20, 110}})),
                new DrawnPrism(
                        "meadow",
                        "\"layers\": [1, 1]",
                        "{\"yard side\": [\"side 4\"]}",
                        List.<double[][]>of(new double[][] {{120, 20}, {203, 27}, {226, 94}, {120, 110}})));
    }

    /** Northward lines, so that their right is east, downstream. */
    private static String transects() {
        return """
                {"type": "FeatureCollection", "features": [
                {"type": "Feature", "properties": {"name": "fence"},
                 "geometry": {"type": "LineString", "coordinates": [[92, 15], [96, 62], [91, 112]]}},
                {"type": "Feature", "properties": {"name": "brook"},
                 "geometry": {"type": "LineString", "coordinates": [[170, 8], [170, 112]]}}
                ]}
                """;
    }

    private static String plain(double number) {
        return Digits.significant(number, 6);
    }

    private static String exact(double number) {
        return Digits.significant(number, ALL_DIGITS);
    }
}
