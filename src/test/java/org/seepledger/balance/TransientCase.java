package org.seepledger.balance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.HeadGradient;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Times;
import org.seepledger.aquifer.Well;
import org.seepledger.aquifer.WellRate;
import org.seepledger.aquifer.Window;
import org.seepledger.prism.Prism;
import org.seepledger.prism.VerticalRange;
import org.seepledger.unit.Measure;

/**
 * A random aquifer with moving heads, storage, recharge and wells, and a source in each cell that makes it balance: any
 * prism in it must close to rounding.
 */
public final class TransientCase {

    private static final int INTERVALS = 3;

    public final RandomCase base;
    public final Random random;
    public final Aquifer aquifer;
    private final int mostWells;
    private final int columns;

    public TransientCase(long seed) {
        this(seed, 5);
    }

    public TransientCase(long seed, int mostWells) {
        this.mostWells = mostWells;
        base = new RandomCase(seed);
        random = base.random;
        columns = base.grid.columns();
        Aquifer unbalanced = unbalanced();
        List<Source> sources = new ArrayList<>(unbalanced.sources());
        sources.add(new Source.Cells("balancing", missing(unbalanced)));
        aquifer = with(unbalanced, sources);
    }

    private Aquifer unbalanced() {
        List<Layer> stack = new ArrayList<>();
        boolean free = true;
        for (Layer layer : base.stack(0.15)) {
            stack.add(new Layer(layer.name(), layer.top(), layer.bottom(), free));
            free = random.nextInt(3) == 0;
        }
        HeadGradient flow = new HeadGradient(
                quantity(0.01, 10, 0.08),
                Optional.of(quantity(0.01, 10, 0)),
                Optional.of(quantity(0.001, 1, 0)),
                random.nextBoolean());
        Storage storage = new Storage(
                Optional.of(quantity(0.05, 0.3, 0)), Optional.of(quantity(1e-5, 1e-3, 0)), Optional.empty(), List.of());
        List<Source> sources = new ArrayList<>();
        sources.add(new Source.Areal("recharge", quantity(0, 0.01, 0).perColumn()));
        sources.add(new Source.Points("pumping", wells()));
        Times times = new Times(new double[] {0, 1, 3, 3.5}, Measure.of("d"), Optional.empty());
        Measure metre = Measure.of("m");
        return new Aquifer(
                "transient",
                base.grid,
                stack,
                times,
                flow,
                Optional.of(heads()),
                storage,
                sources,
                metre,
                Measure.of("d"));
    }

    private Aquifer with(Aquifer other, List<Source> sources) {
        return new Aquifer(
                other.name(),
                other.grid(),
                other.layers(),
                other.times(),
                other.flow(),
                other.head(),
                other.storage(),
                sources,
                other.lengthUnit(),
                other.timeUnit());
    }

    /** Values by cell, evenly spread between two limits; a share of them missing. */
    private record Quantity(ArrayValues all) implements GriddedValues {

        GriddedValues perColumn() {
            return new ArrayValues(all.columns(), new double[][][] {{all.values()[0][0]}});
        }

        @Override
        public void read(int layer, int step, Window window, double[] target, int offset) {
            all.read(layer, step, window, target, offset);
        }

        @Override
        public List<Stored> stored(int layer, int step, Window window) {
            return all.stored(layer, step, window);
        }

        @Override
        public boolean changes() {
            return all.changes();
        }

        @Override
        public boolean layered() {
            return all.layered();
        }
    }

    private Quantity quantity(double low, double high, double missing) {
        double[][] layers = new double[base.layers][base.cells()];
        for (double[] layer : layers) {
            for (int i = 0; i < layer.length; i++) {
                layer[i] = random.nextDouble() < missing ? Double.NaN : low + (high - low) * random.nextDouble();
            }
        }
        return new Quantity(new ArrayValues(columns, new double[][][] {layers}));
    }

    /** Heads that drain, fill and confine cells; some dry; none in some columns of cells. */
    private ArrayValues heads() {
        double[][][] heads = new double[INTERVALS + 1][base.layers][base.cells()];
        for (double[][] instant : heads) {
            for (double[] layer : instant) {
                for (int i = 0; i < layer.length; i++) {
                    layer[i] = random.nextInt(20) == 0 ? Double.NEGATIVE_INFINITY : -30 * random.nextDouble() + 4;
                }
            }
        }
        for (int i = 0; i < base.cells(); i++) {
            if (random.nextInt(15) == 0) {
                for (double[][] instant : heads) {
                    for (double[] layer : instant) {
                        layer[i] = Double.NaN;
                    }
                }
            }
        }
        return new ArrayValues(columns, heads);
    }

    /** Wells with screens over all layers, and schedules that begin or end within intervals. */
    private List<Well> wells() {
        List<PointRate> lines = new ArrayList<>();
        for (int i = 0; i < random.nextInt(mostWells); i++) {
            double x = base.place(base.grid.x());
            double y = base.place(base.grid.y());
            lines.add(new PointRate(
                    "w" + i,
                    "pumping",
                    base.grid.mapX(x, y),
                    base.grid.mapY(x, y),
                    new Screen.Between(100, -100),
                    2 * random.nextDouble(),
                    2 + 2 * random.nextDouble(),
                    random.nextGaussian(),
                    "wells.csv, line " + (i + 2)));
        }
        return Well.of(lines);
    }

    /** What each cell lacks to balance, by interval. */
    private ArrayValues missing(Aquifer unbalanced) {
        double[][][] lacking = new double[INTERVALS][base.layers][base.cells()];
        CellGeometry geometry = unbalanced.geometry(base.grid.window());
        for (int interval = 0; interval < INTERVALS; interval++) {
            IntervalState state = unbalanced.state(interval, geometry, unbalanced.placedWells());
            Block block = state.flows().block();
            for (int layer = 0; layer < base.layers; layer++) {
                for (int i = 0; i < base.cells(); i++) {
                    int cell = block.cell(layer, i / columns, i % columns);
                    double gain = state.flows().gain(layer, i / columns, i % columns);
                    for (CellTerm term : state.terms()) {
                        gain += term.rates()[cell];
                    }
                    lacking[interval][layer][i] = -gain;
                }
            }
            for (WellRate rate : state.wells()) {
                int cell =
                        base.grid.window().index(rate.well().row(), rate.well().column());
                lacking[interval][rate.layer()][cell] -= rate.rate();
            }
        }
        return new ArrayValues(columns, lacking);
    }

    /** A random prism between random elevations or surfaces. */
    public Prism prism(String name) {
        Prism shape = base.prism(name);
        Optional<GriddedValues> top = random.nextInt(4) == 0 ? Optional.empty() : Optional.of(surface(2, 12));
        Optional<GriddedValues> bottom = random.nextInt(4) == 0 ? Optional.empty() : Optional.of(surface(-8, 12));
        return new Prism(name, shape.rings(), new VerticalRange.Elevations(top, bottom));
    }

    private GriddedValues surface(double high, double depth) {
        if (random.nextBoolean()) {
            return GriddedValues.constant(high - depth * random.nextDouble());
        }
        double[] elevations = new double[base.cells()];
        for (int i = 0; i < elevations.length; i++) {
            elevations[i] = high - depth * random.nextDouble();
        }
        return ArrayValues.steady(columns, elevations);
    }
}
