package org.seepledger.job;

import java.util.Arrays;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;
import org.seepledger.progress.Progress;

/** Gives the values of one layer in one interval, cell by cell, as maps show them: in single precision, for the eye. */
public final class LayerMap {

    private static final int CELLS_IN_A_BAND = 1 << 18;

    private final Aquifer aquifer;
    private final int layer;
    private final int interval;
    private final Grid grid;

    /**
     * Looks at a layer.
     *
     * @param aquifer the aquifer
     * @param layer the layer, from 0
     * @param interval the interval, from 0
     */
    public LayerMap(Aquifer aquifer, int layer, int interval) {
        this.aquifer = aquifer;
        this.layer = layer;
        this.interval = interval;
        this.grid = aquifer.grid();
    }

    /** Reads some rows. */
    private interface Rows {
        void read(Window band, float[] target);
    }

    /**
     * {@return a value per cell, row-major, row 0 northernmost; NaN where there is none}
     *
     * @param shown what of the layer
     * @param progress told of each band of rows
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    public float[] values(Shown shown, Progress progress) {
        float[] values = new float[grid.rows() * grid.columns()];
        Rows rows = switch (shown) {
            case HEAD -> this::heads;
            case RECHARGE -> this::recharge;
            case THICKNESS -> (band, target) -> thickness(band, target);
            case SATURATED_THICKNESS -> (band, target) ->
                    each(state(band, List.of()), band, target, (state, cell, row, column) -> state.saturation()
                            .thickness(cell));
            case FLUX -> (band, target) -> each(state(band, List.of()), band, target, this::flux);
            case IMBALANCE -> this::imbalance;
        };
        inBands(progress, band -> rows.read(band, values));
        return values;
    }

    /**
     * {@return specific discharge along the grid's x and y axis in the middle of each cell, length/time; NaN where there
     * is none}
     *
     * @param progress told of each band of rows
     * @throws org.seepledger.fault.DataFault if the data are wrong
     */
    public float[][] discharge(Progress progress) {
        float[][] values = new float[2][grid.rows() * grid.columns()];
        inBands(progress, band -> {
            IntervalState state = state(band, List.of());
            each(state, band, values[0], this::alongX);
            each(state, band, values[1], this::alongY);
        });
        return values;
    }

    private void inBands(Progress progress, java.util.function.Consumer<Window> work) {
        int rows = Math.max(
                1, CELLS_IN_A_BAND / grid.columns() / aquifer.layers().size());
        progress.begin("reading values", (grid.rows() + rows - 1) / rows);
        for (int row = 0; row < grid.rows(); row += rows) {
            work.accept(new Window(row, 0, Math.min(rows, grid.rows() - row), grid.columns()));
            progress.step();
        }
    }

    private void heads(Window band, float[] target) {
        double[] heads = new double[band.size()];
        Arrays.fill(heads, Double.NaN);
        aquifer.head()
                .ifPresent(values -> values.read(layer, values.changes() ? interval + 1 : 0, band, heads, 0));
        put(heads, band, target);
    }

    private void recharge(Window band, float[] target) {
        double[] sum = new double[band.size()];
        double[] part = new double[band.size()];
        for (Source source : aquifer.sources()) {
            if (source instanceof Source.Areal areal) {
                GriddedValues rate = areal.rate();
                rate.read(rate.layered() ? layer : 0, interval, band, part, 0);
                for (int i = 0; i < sum.length; i++) {
                    sum[i] += Double.isNaN(part[i]) ? 0 : part[i];
                }
            }
        }
        put(sum, band, target);
        CellGeometry geometry = aquifer.geometry(band);
        blank(geometry, band, target);
    }

    private void thickness(Window band, float[] target) {
        CellGeometry geometry = aquifer.geometry(band);
        double[] values = new double[band.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = geometry.thickness(cell(geometry.block(), band, i));
        }
        put(values, band, target);
        blank(geometry, band, target);
    }

    /** Takes the value from cells that the layer does not reach. */
    private void blank(CellGeometry geometry, Window band, float[] target) {
        for (int i = 0; i < band.size(); i++) {
            if (!geometry.isPresent(cell(geometry.block(), band, i))) {
                target[band.row() * grid.columns() + i] = Float.NaN;
            }
        }
    }

    private int cell(Block block, Window band, int i) {
        return block.cell(layer, band.row() + i / band.columns(), i % band.columns());
    }

    private void imbalance(Window band, float[] target) {
        List<PlacedWell> wells = aquifer.placedWells().stream()
                .filter(well -> band.contains(well.row(), well.column()))
                .toList();
        IntervalState state = state(band, wells);
        each(state, band, target, this::gain);
        for (WellRate well : state.wells()) {
            if (well.layer() == layer) {
                target[well.well().row() * grid.columns() + well.well().column()] += (float) well.rate();
            }
        }
    }

    private double gain(IntervalState state, int cell, int row, int column) {
        double gain = state.flows().gain(layer, row, column);
        for (CellTerm term : state.terms()) {
            gain += term.rates()[cell];
        }
        return gain;
    }

    private IntervalState state(Window band, List<PlacedWell> wells) {
        return aquifer.state(interval, aquifer.geometry(band), wells);
    }

    /** A value of one cell. */
    private interface CellValue {
        double of(IntervalState state, int cell, int row, int column);
    }

    private void each(IntervalState state, Window band, float[] target, CellValue value) {
        Block block = state.geometry().block();
        for (int i = 0; i < band.size(); i++) {
            int row = band.row() + i / band.columns();
            int column = i % band.columns();
            int cell = block.cell(layer, row, column);
            boolean active = state.flows().active()[cell];
            target[row * grid.columns() + column] = active ? (float) value.of(state, cell, row, column) : Float.NaN;
        }
    }

    private double flux(IntervalState state, int cell, int row, int column) {
        Block block = state.geometry().block();
        double up = (state.flows().z()[block.zFace(layer, row, column)]
                        + state.flows().z()[block.zFace(layer + 1, row, column)])
                / 2
                / grid.area(row, column);
        double x = alongX(state, cell, row, column);
        return Math.sqrt(x * x + Math.pow(alongY(state, cell, row, column), 2) + up * up);
    }

    private double alongX(IntervalState state, int cell, int row, int column) {
        Block block = state.geometry().block();
        double[] x = state.flows().x();
        double flow = (x[block.xFace(layer, row, column)] + x[block.xFace(layer, row, column + 1)]) / 2;
        return perArea(flow, grid.height(row) * state.saturation().thickness(cell));
    }

    private double alongY(IntervalState state, int cell, int row, int column) {
        Block block = state.geometry().block();
        double[] y = state.flows().y();
        double flow = (y[block.yFace(layer, row, column)] + y[block.yFace(layer, row + 1, column)]) / 2;
        return perArea(flow, grid.width(column) * state.saturation().thickness(cell));
    }

    /** A dry cell has no flow and no area. */
    private static double perArea(double flow, double area) {
        return area > 0 ? flow / area : 0;
    }

    private void put(double[] values, Window band, float[] target) {
        int offset = band.row() * grid.columns();
        for (int i = 0; i < values.length; i++) {
            target[offset + i] = Double.isFinite(values[i]) ? (float) values[i] : Float.NaN;
        }
    }
}
