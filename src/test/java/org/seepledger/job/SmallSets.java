package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.Random;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.raster.GeoTiffWriter;

/** Small invented aquifer folders that between them give quantities in every way there is. */
final class SmallSets {

    private static final int ROWS = 9;
    private static final int COLUMNS = 11;

    private final Path folder;
    private final Random random = new Random(20230517);

    private SmallSets(Path folder) throws IOException {
        this.folder = Files.createDirectories(folder);
    }

    /** Heads with dry cells, storage and supplied storage, units, scales and offsets, a grid like a raster's. */
    static void heads(Path folder) throws IOException {
        SmallSets set = new SmallSets(folder);
        Grid grid = new Grid(Axis.even(1000.1, 50, COLUMNS), Axis.even(2000.3, 40, ROWS), 0, 1);
        set.raster(grid, "ground.tif", 100, 104);
        set.raster(grid, "clay base.tif", 60, 64);
        set.raster(grid, "surfaces/lid.tif", 70, 98);
        set.raster(grid, "ss.tif", 1e-5, 1e-4);
        set.raster(grid, "supplied_1.tif", -2, 2);
        set.raster(grid, "supplied_2.tif", -2, 2);
        set.table("k.csv", "row,col,k [ft/d]", 1, 0, 0.5, 5);
        set.heads();
        set.file("rain.csv", "interval;rain [mm/yr]\n1;310,5\n2;95,25\n");
        set.file("drain.csv", "# where ditches run\nrow,col,flow\n4,5,-3.5\n4,5,-1.25\n5,6,2.5\n1,11,-9\n");
        set.file("wells.csv", """
                name,x,y,screen_top,screen_bottom,from,to,volume [L],category
                far,1530,2020,95,80,0,30,-1000,
                near,1222.5,2190.25,95,70,5,20,-85000,irrigation
                deep,1290,2210,75,65,2021-01-02,2021-01-25,-40000,
                """);
        set.file("aquifer.json", """
                {"name": "Invented valley", "length_unit": "m", "time_unit": "d", "start_date": "2021-01-01",
                 "grid": {"like": "ground.tif"},
                 "layers": [{"top": "ground.tif", "bottom": 82.5}, {"bottom": {"file": "clay base.tif", "offset": -0.5}}],
                 "times": [0, 10, 40],
                 "flow": {"kind": "head_gradient", "heads": "mean",
                          "conductivity": [4, {"file": "k.csv", "column": "k"}], "vertical_conductivity": 0.05},
                 "head": {"file": "head.csv", "column": "h", "unit": "ft", "offset": 12.5, "dry": -999},
                 "storage": {"specific_yield": [{"value": 20, "scale": 0.01}, 0.05],
                             "specific_storage": {"file": "ss.tif", "unit": "1/m"},
                             "supplied": [{"item": "slow drainage", "rate": "supplied_{interval}.tif"}]},
                 "sources": [
                   {"category": "rain", "kind": "areal", "rate": {"file": "rain.csv", "scale": 0.5, "offset": 3}},
                   {"category": "ditches", "kind": "cells", "rate": {"file": "drain.csv", "column": "flow"}},
                   {"category": "pumping", "kind": "points", "file": "wells.csv"}]}
                """);
        set.file("prisms.geojson", prisms(1170, 2110, """
                "layers": [1, 2], "boundaries": {"river/bank": ["side 1-2"]}""", """
                "top": "surfaces/lid.tif", "bottom": 61.5"""));
    }

    /** Flux snapshots along the map's axes on a turned grid with open faces; prisms reach beyond it. */
    static void flux(Path folder) throws IOException {
        SmallSets set = new SmallSets(folder);
        Grid grid = new Grid(Axis.even(1000, 50, COLUMNS), Axis.even(2000, 40, ROWS), 30, 1);
        for (int instant = 0; instant <= 2; instant++) {
            for (int layer = 1; layer <= 2; layer++) {
                set.raster(grid, "qx_" + layer + "_" + instant + ".tif", -0.1, 0.2);
            }
            set.raster(grid, "qy_" + instant + ".tif", -0.1, 0.1);
        }
        set.table("qz.csv", "row,col,layer,qz [cm/d]", 2, 0, -0.5, 0.5);
        set.file("aquifer.json", """
                {"length_unit": "m", "time_unit": "d",
                 "grid": {"x": {"from": 1000, "step": 50, "count": 11}, "y": {"from": 2000, "step": 40, "count": 9},
                          "rotation": 30},
                 "layers": [{"top": 20, "bottom": 8, "water_table": false}, {"bottom": 0}],
                 "times": [0, 1, 3],
                 "flow": {"kind": "darcy_flux", "at": "instant", "components": "map",
                          "x": {"file": "qx_{layer}_{instant}.tif", "scale": 1.5, "offset": 0.01},
                          "y": "qy_{instant}.tif", "z": {"file": "qz.csv"},
                          "outer_faces": {"sides": "open", "top": "open", "bottom": "closed"}}}
                """);
        set.file("prisms.geojson", prisms(960, 2060, "\"layers\": [1, 1]", "\"layers\": [1, 2]"));
    }

    /** Flow through all six faces on an uneven grid, by interval. */
    static void faces(Path folder) throws IOException {
        SmallSets set = new SmallSets(folder);
        set.table("faces.csv", "row,col,layer,interval,east,north,up,west,south,down", 2, 2, -5, 5);
        set.file("aquifer.json", """
                {"length_unit": "m", "time_unit": "d",
                 "grid": {"x": {"edges": [1000, 1031, 1080, 1120, 1170, 1200, 1251, 1300, 1310, 1402, 1450, 1550]},
                          "y": {"edges": [2000, 2043, 2080, 2100, 2151, 2170, 2200, 2251, 2300, 2361]}},
                 "layers": [{"top": 20, "bottom": 8}, {"bottom": 0}],
                 "times": [0, 1, 3],
                 "flow": {"kind": "face_flow",
                          "east": {"file": "faces.csv", "column": "east", "unit": "L/s"},
                          "north": {"file": "faces.csv", "column": "north"}, "up": {"file": "faces.csv", "column": "up"},
                          "west": {"file": "faces.csv", "column": "west"},
                          "south": {"file": "faces.csv", "column": "south"},
                          "down": {"file": "faces.csv", "column": "down"}}}
                """);
        set.file("prisms.geojson", prisms(1170, 2110, "\"layers\": [1, 2]", "\"layers\": [2, 2]"));
    }

    /** Two prisms that share a side: a triangle and a quadrangle. */
    private static String prisms(double x, double y, String first, String second) {
        String collection = """
                {"type": "FeatureCollection", "features": [
                 {"type": "Feature", "properties": {"name": "a/b", %s},
                  "geometry": {"type": "Polygon", "coordinates": [%s]}},
                 {"type": "Feature", "properties": {"name": "c", %s},
                  "geometry": {"type": "Polygon", "coordinates": [%s]}}]}
                """;
        return collection.formatted(
                first,
                ring(x, y, x + 140, y + 30, x + 60, y + 170),
                second,
                ring(x + 140, y + 30, x + 210, y + 110, x + 150, y + 190, x + 60, y + 170));
    }

    private static String ring(double... coordinates) {
        double[] closed = Arrays.copyOf(coordinates, coordinates.length + 2);
        closed[coordinates.length] = coordinates[0];
        closed[coordinates.length + 1] = coordinates[1];
        StringBuilder ring = new StringBuilder("[");
        for (int i = 0; i < closed.length; i += 2) {
            ring.append(i == 0 ? "[" : ", [").append(closed[i]).append(", ").append(closed[i + 1]);
            ring.append(']');
        }
        return ring.append(']').toString();
    }

    private void file(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private void raster(Grid grid, String name, double low, double high) throws IOException {
        Files.createDirectories(folder.resolve(name).getParent());
        GeoTiffWriter.write(
                folder.resolve(name),
                grid,
                grid.window(),
                Optional.empty(),
                row -> random.doubles(COLUMNS)
                        .map(part -> low + (high - low) * part)
                        .toArray());
    }

    /** A line for each cell, and each layer and interval that the header tells apart, with random values. */
    private void table(String name, String header, int layers, int intervals, double low, double high)
            throws IOException {
        int places = 2 + (header.contains("layer") ? 1 : 0) + (header.contains("interval") ? 1 : 0);
        int values = header.split(",").length - places;
        StringBuilder text = new StringBuilder(header).append('\n');
        for (int cell = 0; cell < ROWS * COLUMNS; cell++) {
            for (int layer = 1; layer <= layers; layer++) {
                for (int interval = 1; interval <= Math.max(1, intervals); interval++) {
                    text.append(cell / COLUMNS + 1).append(',').append(cell % COLUMNS + 1);
                    text.append(header.contains("layer") ? "," + layer : "");
                    text.append(header.contains("interval") ? "," + interval : "");
                    random.doubles(values).forEach(part -> text.append(',').append(low + (high - low) * part));
                    text.append('\n');
                }
            }
        }
        file(name, text.toString());
    }

    /** Heads in feet less 12.5 at three instants; some cells dry. */
    private void heads() throws IOException {
        StringBuilder text = new StringBuilder("col,row,layer,instant,h,remark\n");
        for (int cell = 0; cell < ROWS * COLUMNS; cell++) {
            for (int layer = 1; layer <= 2; layer++) {
                for (int instant = 0; instant <= 2; instant++) {
                    boolean dry = layer == 1 && random.nextInt(8) == 0;
                    double metres = 84 + 14 * random.nextDouble();
                    text.append(cell % COLUMNS + 1).append(',').append(cell / COLUMNS + 1);
                    text.append(',').append(layer).append(',').append(instant);
                    text.append(',').append(dry ? -999 : metres / 0.3048 - 12.5);
                    text.append(cell == 7 ? ",\"a remark, with a comma\"\n" : ",\n");
                }
            }
        }
        file("head.csv", text.toString());
    }
}
