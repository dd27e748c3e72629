package org.seepledger.sample;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

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
        Map<String, String> files = new TreeMap<>();
        files.put("aquifer.json", aquifer());
        files.put("flow.csv", flow());
        files.put("leak.csv", leak());
        files.put("concentration.csv", concentrations());
        files.put("prisms.geojson", prisms());
        files.put("transects.geojson", transects());
        return files;
    }

    private static String aquifer() {
        String times = IntStream.rangeClosed(0, DepotPlume.INTERVALS)
                .mapToObj(instant -> Digits.decimals(instant * DepotPlume.INTERVAL, 3))
                .collect(Collectors.joining(", "));
        return """
                {
                  "name": "Invented depot",
                  "crs": null,
                  "vertical_datum": "local",
                  "length_unit": "m",
                  "time_unit": "d",
                  "start_date": "2021-01-01",
                  "grid": {"x": {"from": 0, "step": 10, "count": 24}, "y": {"from": 0, "step": 10, "count": 12}},
                  "layers": [{"name": "Sand", "top": 20, "bottom": 12, "water_table": false}],
                  "times": [%s],
                  "flow": {"kind": "face_flow", "east": {"file": "flow.csv", "column": "east"},
                           "north": {"file": "flow.csv", "column": "north"}, "west": {"file": "flow.csv", "column": "west"},
                           "origin": "simulated", "reference": "steady flow that balances in each cell"},
                  "head": 19,
                  "sources": [
                    {"category": "recharge", "kind": "areal", "rate": %s},
                    {"category": "leak", "kind": "cells", "rate": {"file": "leak.csv", "column": "leak"},
                     "concentration": {"solvent": {"file": "leak.csv", "column": "solvent"}}}
                  ],
                  "solutes": [
                    {"name": "solvent", "concentration": {"file": "concentration.csv", "column": "solvent"}, "unit": "mg/L",
                     "porosity": %s, "bulk_density": %s, "sorption": {"isotherm": "linear", "kd": %s, "unit": "L/kg"},
                     "half_life": %s, "boundary_concentration": 0,
                     "dispersion": {"longitudinal": %s, "transverse": %s}},
                    {"name": "breakdown product", "concentration": {"file": "concentration.csv", "column": "product"},
                     "unit": "mg/L", "porosity": %s, "bulk_density": %s,
                     "sorption": {"isotherm": "linear", "kd": %s, "unit": "L/kg"},
                     "half_life": %s, "parent": "solvent", "yield": %s, "boundary_concentration": 0,
                     "dispersion": {"longitudinal": %s, "transverse": %s}}
                  ]
                }
                """.formatted(
                        times,
                        plain(DepotFlow.RECHARGE),
                        plain(DepotPlume.POROSITY),
                        plain(DepotPlume.BULK_DENSITY),
                        plain(DepotPlume.KD[0]),
                        plain(DepotPlume.HALF_LIFE[0]),
                        plain(DepotPlume.LONGITUDINAL),
                        plain(DepotPlume.TRANSVERSE),
                        plain(DepotPlume.POROSITY),
                        plain(DepotPlume.BULK_DENSITY),
                        plain(DepotPlume.KD[1]),
                        plain(DepotPlume.HALF_LIFE[1]),
                        plain(DepotPlume.YIELD),
                        plain(DepotPlume.LONGITUDINAL),
                        plain(DepotPlume.TRANSVERSE));
    }

    private static String flow() {
        StringBuilder table =
                new StringBuilder("# Invented depot: flow through the cells' faces\nrow,col,east [m3/d],north,west\n");
        eachCell((row, column) -> {
            table.append(DepotFlow.ROWS - row).append(',').append(column + 1);
            table.append(',').append(Digits.significant(DepotFlow.east(column + 1, row), ALL_DIGITS));
            table.append(',').append(Digits.significant(DepotFlow.north(column, row + 1), ALL_DIGITS));
            table.append(',')
                    .append(Digits.significant(DepotFlow.east(column, row), ALL_DIGITS))
                    .append('\n');
        });
        return table.toString().replace("north,west", "north [m3/d],west [m3/d]");
    }

    private static String leak() {
        StringBuilder table = new StringBuilder(
                "# Invented depot: what a tank leaks, and what that carries\nrow,col,interval,leak [m3/d],solvent [mg/L]\n");
        for (int interval = 0; interval < DepotPlume.INTERVALS; interval++) {
            table.append(DepotFlow.ROWS - DepotFlow.LEAK_ROW).append(',').append(DepotFlow.LEAK_COLUMN + 1);
            table.append(',').append(interval + 1).append(',').append(plain(DepotFlow.LEAK));
            table.append(',').append(plain(DepotPlume.leaked(interval))).append('\n');
        }
        return table.toString();
    }

    private static String concentrations() {
        List<List<double[]>> solved = DepotPlume.solved();
        StringBuilder table = new StringBuilder(
                "# Invented depot: concentrations; a laboratory that detects 0.002 mg/L, <0.002 below\n"
                        + "row,col,instant,solvent [mg/L],product [mg/L]\n");
        for (int instant = 0; instant <= DepotPlume.INTERVALS; instant++) {
            int at = instant;
            eachCell((row, column) -> {
                int cell = row * DepotFlow.COLUMNS + column;
                table.append(DepotFlow.ROWS - row)
                        .append(',')
                        .append(column + 1)
                        .append(',')
                        .append(at);
                for (List<double[]> substance : solved) {
                    double value = substance.get(at)[cell];
                    table.append(',').append(value < LIMIT ? "<0.002" : Digits.significant(value, 6));
                }
                table.append('\n');
            });
        }
        return table.toString();
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
}
