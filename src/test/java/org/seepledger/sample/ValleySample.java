package org.seepledger.sample;

import java.io.IOException;
import java.util.Map;
import java.util.TreeMap;

/** Writes the sample aquifer of the valley. */
public final class ValleySample {

    private ValleySample() {}

    /**
     * Writes the files into a folder, over those that are there.
     *
     * @param args the folder
     * @throws IOException if it cannot be written
     */
    public static void main(String[] args) throws IOException {
        SampleFolder folder = SampleFolder.named(args);
        Valley valley = Valley.solved();
        folder.write(texts(valley));
        for (Map.Entry<String, double[]> raster : ValleyRasters.of(valley).entrySet()) {
            ValleyRasters.write(folder.path().resolve(raster.getKey()), raster.getValue());
        }
    }

    /** {@return what each file that is no raster holds, by name} */
    static Map<String, String> texts(Valley valley) {
        Map<String, String> files = new TreeMap<>();
        files.put("aquifer.json", aquifer());
        files.put("prisms.geojson", ValleyPrisms.geoJson());
        files.put("river.csv", new ValleyTables(valley).river());
        files.put("wells.csv", ValleyTables.wells());
        return files;
    }

    private static String aquifer() {
        return """
                {
                  "name": "Invented valley",
                  "crs": "EPSG:32633",
                  "vertical_datum": "local",
                  "length_unit": "m",
                  "time_unit": "d",
                  "start_date": "%s",
                  "grid": {
                    "x": {"from": %s, "step": %s, "count": %d},
                    "y": {"from": %s, "step": %s, "count": %d}
                  },
                  "layers": [
                    {"name": "Gravel", "top": "loam_base.tif", "bottom": "gravel_base.tif", "water_table": true},
                    {"name": "Clay", "bottom": "clay_base.tif"},
                    {"name": "Old gravel", "bottom": "rock.tif"}
                  ],
                  "times": [%s],
                  "flow": {
                    "kind": "head_gradient",
                    "conductivity": "conductivity_l{layer}.tif",
                    "vertical_conductivity": [
                      {"file": "conductivity_l1.tif", "scale": %s},
                      {"file": "conductivity_l2.tif", "scale": %s},
                      {"file": "conductivity_l3.tif", "scale": %s}
                    ],
                    "heads": "end",
                    "origin": "simulated", "reference": "finite-difference solution of two invented years",
                    "uncertainty": {"percent": 15}
                  },
                  "head": "head_l{layer}_{instant}.tif",
                  "storage": {
                    "specific_yield": "specific_yield.tif",
                    "specific_storage": [%s, %s, %s],
                    "origin": "estimated", "reference": "invented pumping tests", "uncertainty": {"percent": 20}
                  },
                  "sources": [
                    {"category": "recharge", "kind": "areal", "rate": {"file": "recharge_{interval}.tif", "unit": "mm/yr"},
                     "origin": "estimated", "reference": "invented soil-water balance", "uncertainty": {"percent": 20}},
                    {"category": "public supply", "kind": "points", "file": "wells.csv",
                     "origin": "measured", "reference": "invented meter readings", "uncertainty": {"percent": 2}},
                    {"category": "river exchange", "kind": "cells", "rate": {"file": "river.csv", "column": "exchange"},
                     "origin": "simulated", "reference": "leakage through the river bed in the same solution",
                     "uncertainty": {"percent": 25}}
                  ]
                }
                """.formatted(
                        ValleySeasons.START,
                        plain(Valley.FRAME.x()),
                        plain(ValleyGround.CELL),
                        ValleyGround.COLUMNS,
                        plain(Valley.FRAME.y()),
                        plain(ValleyGround.CELL),
                        ValleyGround.ROWS,
                        ValleySeasons.instants(),
                        plain(ValleyGround.VERTICAL_SHARE[ValleyGround.GRAVEL]),
                        plain(ValleyGround.VERTICAL_SHARE[ValleyGround.CLAY]),
                        plain(ValleyGround.VERTICAL_SHARE[ValleyGround.OLD_GRAVEL]),
                        plain(ValleyGround.SPECIFIC_STORAGE[ValleyGround.GRAVEL]),
                        plain(ValleyGround.SPECIFIC_STORAGE[ValleyGround.CLAY]),
                        plain(ValleyGround.SPECIFIC_STORAGE[ValleyGround.OLD_GRAVEL]));
    }

    private static String plain(double number) {
        return Digits.significant(number, 6);
    }
}
