package org.seepledger.job;

import java.util.Arrays;
import java.util.List;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.PlacedWell;
import org.seepledger.aquifer.Saturation;
import org.seepledger.aquifer.Window;
import org.seepledger.balance.Imbalance;

/**
 * Values of the cells of a window in one layer and interval, row-major, row 0 northernmost; {@code NaN} where there is
 * none.
 *
 * @param aquifer the aquifer
 * @param interval the interval, from 0
 * @param layer the layer, from 0
 * @param window the window
 */
record CellReading(Aquifer aquifer, int interval, int layer, Window window) {

    /** A value of a cell. */
    @FunctionalInterface
    private interface OfCell {

        double at(int row, int column, int cell);
    }

    double[] of(MapQuantity quantity) {
        return switch (quantity.kind()) {
            case HEAD -> head();
            case FLUX -> fluxMagnitude();
            case THICKNESS -> thickness();
            case SATURATED_THICKNESS -> saturatedThickness();
            case SOURCE -> source(quantity.source());
            case IMBALANCE -> imbalance();
            case CONCENTRATION, MEAN_CONCENTRATION ->
                throw new IllegalArgumentException("concentrations are read by solute");
        };
    }

    private double[] head() {
        GriddedValues head = aquifer.head().orElseThrow();
        double[] values = read(head, head.changes() ? interval + 1 : 0);
        Arrays.setAll(values, cell -> Double.isInfinite(values[cell]) ? Double.NaN : values[cell]);
        return values;
    }

    private double[] thickness() {
        double[] top = read(aquifer.layers().get(layer).top().orElseGet(() -> aquifer.surface(layer)), 0);
        double[] bottom = read(aquifer.surface(layer + 1), 0);
        Arrays.setAll(top, cell -> top[cell] - bottom[cell]);
        return top;
    }

    private double[] read(GriddedValues values, int step) {
        double[] target = new double[window.size()];
        values.read(layer, step, window, target, 0);
        return target;
    }

    private double[] saturatedThickness() {
        CellGeometry geometry = aquifer.geometry(window);
        Saturation saturation = aquifer.saturation(interval, geometry);
        return each(geometry.block(), (row, column, cell) -> saturation.thickness(cell));
    }

    private double[] source(String category) {
        IntervalState state = state(List.of());
        Grid grid = aquifer.grid();
        return each(state.geometry().block(), (row, column, cell) -> {
            double rate = 0;
            for (CellTerm term : state.terms()) {
                rate += !term.storage() && term.item().equals(category) ? term.rates()[cell] : 0;
            }
            return state.flows().active()[cell] ? rate / grid.area(row, column) : Double.NaN;
        });
    }

    private double[] imbalance() {
        return Imbalance.gains(state(wells()), layer, window);
    }

    private double[] fluxMagnitude() {
        double[][] flux = flux();
        double[] magnitude = new double[window.size()];
        Arrays.setAll(
                magnitude,
                cell -> Math.sqrt(
                        flux[0][cell] * flux[0][cell] + flux[1][cell] * flux[1][cell] + flux[2][cell] * flux[2][cell]));
        return magnitude;
    }

    /** Specific discharge toward map east and north. */
    double[][] horizontalFlux() {
        double[][] flux = flux();
        boolean onMap = aquifer.flow() instanceof DarcyFlux given && given.mapComponents();
        double cosine = onMap ? 1 : aquifer.grid().cosine();
        double sine = onMap ? 0 : aquifer.grid().sine();
        double[] east = new double[window.size()];
        double[] north = new double[window.size()];
        for (int cell = 0; cell < east.length; cell++) {
            east[cell] = flux[0][cell] * cosine - flux[1][cell] * sine;
            north[cell] = flux[0][cell] * sine + flux[1][cell] * cosine;
        }
        return new double[][] {east, north};
    }

    /** Specific discharge at cell centres along three axes: as it was given, else from the flows through faces. */
    private double[][] flux() {
        return aquifer.flow() instanceof DarcyFlux given ? given(given) : fromFaces(state(List.of()));
    }

    private double[][] given(DarcyFlux flux) {
        double[] thickness = thickness();
        double[] upward = flux.z().map(z -> read(z, step(z))).orElseGet(() -> new double[window.size()]);
        Arrays.setAll(upward, cell -> thickness[cell] > 0 ? upward[cell] : Double.NaN);
        double[] alongX = read(flux.x(), step(flux.x()));
        double[] alongY = read(flux.y(), step(flux.y()));
        for (int cell = 0; cell < upward.length; cell++) {
            if (Double.isNaN(alongX[cell] + alongY[cell] + upward[cell])) {
                alongX[cell] = Double.NaN;
                alongY[cell] = Double.NaN;
            }
        }
        return new double[][] {alongX, alongY, upward};
    }

    private int step(GriddedValues values) {
        return values.changes() ? interval : 0;
    }

    /** In a Raviart–Thomas field a component at the centre is the mean of those at the two faces. */
    private double[][] fromFaces(IntervalState state) {
        FaceFlows flows = state.flows();
        Block block = flows.block();
        Grid grid = aquifer.grid();
        double[] alongX = each(block, (row, column, cell) -> {
            double both = flows.x()[block.xFace(layer, row, column)] + flows.x()[block.xFace(layer, row, column + 1)];
            return both / 2 / (grid.height(row) * wet(state, cell));
        });
        double[] alongY = each(block, (row, column, cell) -> {
            double both = flows.y()[block.yFace(layer, row, column)] + flows.y()[block.yFace(layer, row + 1, column)];
            return both / 2 / (grid.width(column) * wet(state, cell));
        });
        double[] upward = each(block, (row, column, cell) -> {
            double both = flows.z()[block.zFace(layer, row, column)] + flows.z()[block.zFace(layer + 1, row, column)];
            return wet(state, cell) > 0 ? both / 2 / grid.area(row, column) : Double.NaN;
        });
        return new double[][] {alongX, alongY, upward};
    }

    /** The thickness that water flows through; no value where none does. */
    private static double wet(IntervalState state, int cell) {
        double thickness = state.flows().active()[cell] ? state.saturation().thickness(cell) : 0;
        return thickness > 0 ? thickness : Double.NaN;
    }

    private IntervalState state(List<PlacedWell> wells) {
        return aquifer.state(interval, aquifer.geometry(window), wells);
    }

    private List<PlacedWell> wells() {
        return aquifer.placedWells().stream()
                .filter(well -> window.contains(well.row(), well.column()))
                .toList();
    }

    private double[] each(Block block, OfCell value) {
        double[] values = new double[window.size()];
        for (int row = window.row(); row < window.rowEnd(); row++) {
            for (int column = window.column(); column < window.columnEnd(); column++) {
                values[window.index(row, column)] = value.at(row, column, block.cell(layer, row, column));
            }
        }
        return values;
    }
}
