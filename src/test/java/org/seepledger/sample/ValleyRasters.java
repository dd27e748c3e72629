package org.seepledger.sample;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.raster.GeoTiffWriter;

/** The rasters of the valley: heads in full precision, as nothing less balances. */
final class ValleyRasters {

    private static final double DEGREES = 0;

    private final Valley valley;
    private final BlockGrid grid;
    private final Map<String, double[]> values = new TreeMap<>();

    private ValleyRasters(Valley valley) {
        this.valley = valley;
        this.grid = valley.grid();
    }

    /** {@return the values of each file by name, row-major, row 0 in the north; NaN where there is none} */
    static Map<String, double[]> of(Valley valley) {
        ValleyRasters rasters = new ValleyRasters(valley);
        rasters.addGround();
        rasters.addRecharge();
        rasters.addHeads();
        return rasters.values;
    }

    /** Writes one of them. */
    static void write(Path file, double[] values) throws IOException {
        Grid grid = grid();
        GeoTiffWriter.write(
                file,
                grid,
                grid.window(),
                Optional.of("EPSG:32633"),
                row -> Arrays.copyOfRange(values, row * grid.columns(), (row + 1) * grid.columns()));
    }

    /** {@return the grid that they lie on} */
    static Grid grid() {
        return new Grid(
                Axis.even(Valley.FRAME.x(), ValleyGround.CELL, ValleyGround.COLUMNS),
                Axis.even(Valley.FRAME.y(), ValleyGround.CELL, ValleyGround.ROWS),
                DEGREES,
                1);
    }

    private void addGround() {
        values.put("loam_base.tif", grid.surface(0));
        values.put("gravel_base.tif", grid.surface(1));
        values.put("clay_base.tif", grid.surface(2));
        values.put("rock.tif", grid.surface(3));
        values.put("specific_yield.tif", layer(valley.stored().specificYield(), ValleyGround.GRAVEL));
        for (int layer = 0; layer < grid.layers(); layer++) {
            values.put("conductivity_l" + (layer + 1) + ".tif", layer(valley.horizontal(), layer));
        }
    }

    private void addRecharge() {
        for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
            double[] recharge = new double[grid.cellsInLayer()];
            for (int cell = 0; cell < recharge.length; cell++) {
                double rate = ValleySeasons.recharge(interval, grid.centreX(cell), grid.centreY(cell));
                recharge[cell] = valley.isActive(cell) ? rate : Double.NaN;
            }
            values.put("recharge_" + (interval + 1) + ".tif", recharge);
        }
    }

    private void addHeads() {
        for (int instant = 0; instant <= ValleySeasons.MONTHS; instant++) {
            for (int layer = 0; layer < grid.layers(); layer++) {
                values.put("head_l" + (layer + 1) + "_" + instant + ".tif", layer(valley.heads(instant), layer));
            }
        }
    }

    /** One layer of a quantity, where there is ground in which water flows. */
    private double[] layer(double[] perCell, int layer) {
        double[] plan = new double[grid.cellsInLayer()];
        for (int i = 0; i < plan.length; i++) {
            int cell = layer * plan.length + i;
            plan[i] = valley.isActive(cell) ? perCell[cell] : Double.NaN;
        }
        return plan;
    }
}
