package org.seepledger.job;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Window;
import org.seepledger.job.MapQuantity.Kind;
import org.seepledger.progress.Progress;
import org.seepledger.unit.Measure;

/** Reads quantities for a map, in bands of rows, and reduces them to means of squares. */
final class LayerReading {

    private static final int CELLS_AT_ONCE = 1 << 18;

    private final Aquifer aquifer;
    private final List<Solute> solutes;
    private final Progress progress;

    LayerReading(Aquifer aquifer, List<Solute> solutes, Progress progress) {
        this.aquifer = aquifer;
        this.solutes = solutes;
        this.progress = progress;
    }

    List<MapQuantity> quantities() {
        String length = aquifer.lengthUnit().toString();
        String flux = aquifer.lengthUnit().per(aquifer.timeUnit()).toString();
        String rate =
                Measure.power(aquifer.lengthUnit(), 3).per(aquifer.timeUnit()).toString();
        List<MapQuantity> all = new ArrayList<>();
        if (aquifer.head().isPresent()) {
            all.add(new MapQuantity(Kind.HEAD, "", length));
        }
        all.add(new MapQuantity(Kind.FLUX, "", flux));
        aquifer.sources().stream()
                .filter(source -> !(source instanceof Source.Points))
                .map(Source::category)
                .distinct()
                .forEach(category -> all.add(new MapQuantity(Kind.SOURCE, category, flux)));
        all.add(new MapQuantity(Kind.THICKNESS, "", length));
        all.add(new MapQuantity(Kind.SATURATED_THICKNESS, "", length));
        all.add(new MapQuantity(Kind.IMBALANCE, "", rate));
        for (Solute solute : solutes) {
            String unit = solute.concentration().orElseThrow().unit().toString();
            all.add(new MapQuantity(Kind.CONCENTRATION, solute.name(), unit));
            all.add(new MapQuantity(Kind.MEAN_CONCENTRATION, solute.name(), unit));
        }
        return all;
    }

    GridLayer layer(MapQuantity quantity, int layer, int interval, Window window, int stride) {
        double[][] read = reduced(2, window, stride, band -> cells(quantity, layer, interval, band));
        return new GridLayer(window, stride, read[0], read[1]);
    }

    /** Values of cells, row-major, row 0 northernmost, and the limits of those that are non-detects; NaN where there is none. */
    double[][] cells(MapQuantity quantity, int layer, int interval, Window window) {
        return quantity.isConcentration()
                ? new ConcentrationReading(solute(quantity.source()), aquifer.lengthUnit(), interval, layer, window)
                        .of(quantity.kind())
                : new double[][] {
                    new CellReading(aquifer, interval, layer, window).of(quantity), ConcentrationReading.none(window)
                };
    }

    private Solute solute(String name) {
        return solutes.stream()
                .filter(solute -> solute.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    FluxField flux(int layer, int interval, Window window, int stride) {
        double[][] read =
                reduced(2, window, stride, band -> new CellReading(aquifer, interval, layer, band).horizontalFlux());
        double[] none = ConcentrationReading.none(window);
        return new FluxField(
                new GridLayer(window, stride, read[0], none), new GridLayer(window, stride, read[1], none));
    }

    private double[][] reduced(int count, Window window, int stride, Function<Window, double[][]> reading) {
        int columns = GridLayer.squares(window.columns(), stride);
        int layers = aquifer.layers().size();
        int height = Math.max(1, CELLS_AT_ONCE / layers / window.columns() / stride) * stride;
        double[][] sums = new double[count][GridLayer.squares(window.rows(), stride) * columns];
        int[][] counts = new int[count][sums[0].length];
        progress.begin("reading the map", (window.rows() + height - 1) / height);
        for (int row = 0; row < window.rows(); row += height) {
            int rows = Math.min(height, window.rows() - row);
            Window band = new Window(window.row() + row, window.column(), rows, window.columns());
            double[][] values = reading.apply(band);
            for (int i = 0; i < count; i++) {
                add(values[i], band.columns(), stride, sums[i], counts[i], row / stride * columns);
            }
            progress.step();
        }
        for (int i = 0; i < count; i++) {
            int[] counted = counts[i];
            double[] summed = sums[i];
            Arrays.setAll(summed, square -> counted[square] == 0 ? Double.NaN : summed[square] / counted[square]);
        }
        return sums;
    }

    private static void add(double[] values, int columns, int stride, double[] sums, int[] counts, int first) {
        int across = GridLayer.squares(columns, stride);
        for (int i = 0; i < values.length; i++) {
            if (!Double.isNaN(values[i])) {
                int square = first + i / columns / stride * across + i % columns / stride;
                sums[square] += values[i];
                counts[square]++;
            }
        }
    }
}
