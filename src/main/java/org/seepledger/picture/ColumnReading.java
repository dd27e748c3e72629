package org.seepledger.picture;

import java.util.Arrays;
import java.util.Optional;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Window;

/** Reads what stands in columns of cells, a window at a time. */
final class ColumnReading {

    private final Aquifer aquifer;
    private final int begin;
    private final int end;
    private final Optional<Profile.LayerValues> values;
    private Optional<Read> last = Optional.empty();

    /** What was read of a window: by surface or layer, then by cell. */
    private record Read(Window window, double[][] surfaces, double[][] before, double[][] heads, double[][] values) {}

    ColumnReading(Aquifer aquifer, int begin, int end, Optional<Profile.LayerValues> values) {
        this.aquifer = aquifer;
        this.begin = begin;
        this.end = end;
        this.values = values;
    }

    /** What stands in one column of cells of a window, all of which is read at once. */
    Profile.Column of(Window window, int row, int column) {
        if (last.filter(read -> read.window().equals(window)).isEmpty()) {
            last = Optional.of(read(window));
        }
        Read read = last.orElseThrow();
        int cell = window.index(row, column);
        return new Profile.Column(
                row,
                column,
                pick(read.surfaces(), cell),
                pick(read.before(), cell),
                pick(read.heads(), cell),
                pick(read.values(), cell));
    }

    private static double[] pick(double[][] values, int cell) {
        return Arrays.stream(values).mapToDouble(each -> each[cell]).toArray();
    }

    private Read read(Window window) {
        int layers = aquifer.layers().size();
        double[][] surfaces = new double[layers + 1][];
        Arrays.setAll(surfaces, k -> read(aquifer.surface(k), Math.max(0, k - 1), 0, window));
        double[][] before = heads(begin, window);
        double[][] heads = aquifer.head().filter(GriddedValues::changes).isPresent() ? heads(end, window) : before;
        double[][] shown = new double[values.isPresent() ? layers : 0][];
        Arrays.setAll(shown, layer -> values.orElseThrow().of(layer, window));
        return new Read(window, surfaces, before, heads, shown);
    }

    private double[][] heads(int instant, Window window) {
        double[][] heads =
                new double[aquifer.head().isPresent() ? aquifer.layers().size() : 0][];
        Arrays.setAll(heads, layer -> {
            GriddedValues head = aquifer.head().orElseThrow();
            return read(head, layer, head.changes() ? instant : 0, window);
        });
        return heads;
    }

    private static double[] read(GriddedValues values, int layer, int step, Window window) {
        double[] target = new double[window.size()];
        values.read(layer, step, window, target, 0);
        return target;
    }
}
