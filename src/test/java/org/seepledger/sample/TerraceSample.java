package org.seepledger.sample;

import java.io.IOException;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;

/** Writes the sample aquifer of the river terrace. */
public final class TerraceSample {

    private TerraceSample() {}

    /**
     * Writes the files into a folder, over those that are there.
     *
     * @param args the folder
     * @throws IOException if it cannot be written
     */
    public static void main(String[] args) throws IOException {
        SampleFolder.named(args).write(files(Terrace.solved()));
    }

    /** {@return what each file holds, by name} */
    static Map<String, String> files(Terrace terrace) {
        TerraceTables tables = new TerraceTables(terrace);
        Map<String, String> files = new TreeMap<>();
        files.put("aquifer.json", aquifer(terrace.problem().grid()));
        files.put("prisms.geojson", TerracePrisms.geoJson());
        files.put("layers.csv", tables.layers());
        files.put("flux.csv", tables.flux());
        files.put("head.csv", tables.head());
        files.put("recharge.csv", tables.recharge());
        files.put("river.csv", tables.river());
        files.put("wells.csv", tables.wells());
        return files;
    }

    private static String aquifer(BlockGrid grid) {
        return """
                {
                  "name": "Invented river terrace",
                  "crs": null,
                  "vertical_datum": "local",
                  "length_unit": "m",
                  "time_unit": "d",
                  "start_date": "2023-01-01",
                  "grid": {
                    "x": {"edges": [%s]},
                    "y": {"edges": [%s]},
                    "rotation": %s
                  },
                  "layers": [
                    {"name": "Terrace gravel", "top": {"file": "layers.csv", "column": "ground"},
                     "bottom": {"file": "layers.csv", "column": "gravel_base"}, "water_table": true},
                    {"name": "Silt", "bottom": {"file": "layers.csv", "column": "silt_base"}},
                    {"name": "Lower sand", "bottom": {"file": "layers.csv", "column": "sand_base"}}
                  ],
                  "times": [0, 365],
                  "flow": {
                    "kind": "darcy_flux",
                    "x": {"file": "flux.csv", "column": "qx"},
                    "y": {"file": "flux.csv", "column": "qy"},
                    "z": {"file": "flux.csv", "column": "qz"},
                    "components": "grid",
                    "outer_faces": {"sides": "open", "top": "closed", "bottom": "closed"},
                    "origin": "simulated", "reference": "steady finite-difference solution of an invented mean year",
                    "uncertainty": {"percent": 15}
                  },
                  "head": {"file": "head.csv", "column": "head"},
                  "sources": [
                    {"category": "recharge", "kind": "areal", "rate": {"file": "recharge.csv", "column": "recharge"},
                     "origin": "estimated", "reference": "invented soil-water balance", "uncertainty": {"percent": 20}},
                    {"category": "public supply", "kind": "points", "file": "wells.csv",
                     "origin": "measured", "reference": "invented meter readings", "uncertainty": {"percent": 2}},
                    {"category": "river exchange", "kind": "cells", "rate": {"file": "river.csv", "column": "exchange"},
                     "origin": "simulated", "reference": "leakage through the river bed in the same solution",
                     "uncertainty": {"percent": 25}}
                  ]
                }
                """.formatted(
                        edges(Terrace.FRAME.x(), grid.columnEdges()),
                        edges(Terrace.FRAME.y(), grid.rowEdges()),
                        Digits.decimals(Terrace.FRAME.degrees(), 0));
    }

    private static String edges(double corner, double[] fromCorner) {
        return DoubleStream.of(fromCorner)
                .mapToObj(edge -> Digits.decimals(corner + edge, 0))
                .collect(Collectors.joining(", "));
    }
}
