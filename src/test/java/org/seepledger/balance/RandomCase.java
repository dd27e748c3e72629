package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Flow;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Layer;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Storage;
import org.seepledger.aquifer.Times;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.unit.Measure;

/** A random heterogeneous aquifer and prisms in it, from a seed. */
public final class RandomCase {

    public final Random random;
    public final Grid grid;
    public final int layers;

    public RandomCase(long seed) {
        random = new Random(seed);
        layers = 1 + random.nextInt(4);
        double rotation = random.nextInt(3) == 0 ? random.nextDouble() * 360 : 90 * random.nextInt(2);
        grid = new Grid(axis(3 + random.nextInt(9)), axis(3 + random.nextInt(9)), rotation, 1);
    }

    private Axis axis(int count) {
        double shift = random.nextBoolean() ? 0 : 8_388_608;
        if (random.nextBoolean()) {
            return Axis.even(shift, 0.5 + random.nextInt(8), count);
        }
        double[] edges = new double[count + 1];
        edges[0] = shift;
        for (int i = 1; i <= count; i++) {
            edges[i] = edges[i - 1] + 0.25 + random.nextInt(40) / 8.0;
        }
        return Axis.of(edges);
    }

    public int cells() {
        return grid.rows() * grid.columns();
    }

    /** Random values in every layer; a share of them missing. */
    public double[][] values(double missing) {
        double[][] values = new double[layers][cells()];
        for (double[] layer : values) {
            for (int i = 0; i < layer.length; i++) {
                layer[i] = random.nextDouble() < missing ? Double.NaN : Math.exp(3 * random.nextGaussian()) * sign();
            }
        }
        return values;
    }

    private int sign() {
        return random.nextBoolean() ? 1 : -1;
    }

    ArrayValues quantity(double missing) {
        return new ArrayValues(grid.columns(), new double[][][] {values(missing)});
    }

    public Aquifer aquifer(double missing, double pinched, int wells) {
        Flow flow = new GivenFaceFlow(
                quantity(missing),
                quantity(missing),
                Optional.of(quantity(missing)),
                Optional.of(quantity(0)),
                Optional.of(quantity(0)),
                Optional.of(quantity(0)));
        List<Source> sources = new ArrayList<>();
        sources.add(new Source.Areal("recharge", GriddedValues.constant(0.25)));
        sources.add(new Source.Cells("exchange", quantity(0.5)));
        sources.add(new Source.Points("pumping", wells(wells)));
        return aquifer(flow, stack(pinched), sources);
    }

    Aquifer aquifer(Flow flow, List<Layer> stack, List<Source> sources) {
        return new Aquifer(
                "random",
                grid,
                stack,
                new Times(new double[] {0, 1}, Measure.of("d"), Optional.empty()),
                flow,
                Optional.empty(),
                Storage.NONE,
                sources,
                Measure.of("m"),
                Measure.of("d"));
    }

    List<Layer> stack(double pinched) {
        List<Layer> stack = new ArrayList<>();
        double[] top = new double[cells()];
        for (int layer = 0; layer < layers; layer++) {
            double[] bottom = new double[cells()];
            for (int i = 0; i < bottom.length; i++) {
                bottom[i] = top[i] - (random.nextDouble() < pinched ? 0 : 1 + random.nextInt(16));
            }
            ArrayValues surface = ArrayValues.steady(grid.columns(), bottom);
            Optional<GriddedValues> own =
                    layer == 0 ? Optional.of(ArrayValues.steady(grid.columns(), top)) : Optional.empty();
            stack.add(new Layer("layer " + layer, own, surface, false));
            top = bottom;
        }
        return stack;
    }

    private List<Well> wells(int count) {
        List<PointRate> lines = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double x = place(grid.x());
            double y = place(grid.y());
            lines.add(new PointRate(
                    "w" + i,
                    "pumping",
                    grid.mapX(x, y),
                    grid.mapY(x, y),
                    new Screen.Between(0, -1000),
                    Double.NEGATIVE_INFINITY,
                    Double.POSITIVE_INFINITY,
                    100 * random.nextGaussian(),
                    "wells.csv, line " + (i + 2)));
        }
        return Well.of(lines);
    }

    /** A place along an axis, often on a line, never outside. */
    double place(Axis axis) {
        if (random.nextInt(4) == 0) {
            return axis.edge(random.nextInt(axis.count() + 1));
        }
        return random.nextDouble() * axis.edge(axis.count());
    }

    /** A star-shaped prism with, at random, an island and a second part; vertices often on grid lines and corners. */
    public Prism prism(String name) {
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        int first = random.nextInt(layers);
        int last = first + random.nextInt(layers - first);
        List<Ring> rings = new ArrayList<>();
        boolean two = random.nextBoolean();
        double middle = two ? 0.3 * width : 0.5 * width;
        double radius = two ? 0.28 : 0.5;
        rings.add(star(1, 0, middle, height / 2, radius * width, height / 2, false));
        if (random.nextBoolean()) {
            rings.add(star(1, 1, middle, height / 2, 0.1 * radius * width, 0.05 * height, true));
        }
        if (two) {
            rings.add(star(2, 0, 0.8 * width, height / 2, 0.18 * width, 0.45 * height, false));
        }
        Prism prism = Prisms.of(name, first, last, rings);
        return isValid(prism) ? prism : prism(name);
    }

    /** Vertices put on grid lines may make sides cross, or an island reach out. */
    private static boolean isValid(Prism prism) {
        return prism.parts().stream().map(RandomCase::polygon).allMatch(Polygon::isValid);
    }

    private static Polygon polygon(List<Ring> part) {
        GeometryFactory factory = new GeometryFactory();
        LinearRing[] lines = part.stream()
                .map(ring -> factory.createLinearRing(closed(ring.sides())))
                .toArray(LinearRing[]::new);
        return factory.createPolygon(lines[0], Arrays.copyOfRange(lines, 1, lines.length));
    }

    private static Coordinate[] closed(List<Side> sides) {
        return Stream.concat(sides.stream(), Stream.of(sides.get(0)))
                .map(side -> new Coordinate(side.x(), side.y()))
                .toArray(Coordinate[]::new);
    }

    private Ring star(int part, int island, double cx, double cy, double rx, double ry, boolean clockwise) {
        int corners = 3 + random.nextInt(9);
        double[] coordinates = new double[2 * corners];
        for (int i = 0; i < corners; i++) {
            int step = clockwise ? corners - 1 - i : i;
            double angle = 2 * Math.PI * (step + 0.4 * random.nextDouble()) / corners;
            double share = 0.5 + 0.5 * random.nextDouble();
            double x = onLine(grid.x(), cx + share * rx * Math.cos(angle), 0.02 * rx);
            double y = onLine(grid.y(), cy + share * ry * Math.sin(angle), 0.02 * ry);
            coordinates[2 * i] = grid.mapX(x, y);
            coordinates[2 * i + 1] = grid.mapY(x, y);
        }
        return Prisms.ring(part, island, coordinates);
    }

    private double onLine(Axis axis, double place, double reach) {
        double clamped = Math.max(0, Math.min(axis.edge(axis.count()), place));
        for (int i = 0; i <= axis.count(); i++) {
            if (Math.abs(axis.edge(i) - clamped) < reach && random.nextBoolean()) {
                return axis.edge(i);
            }
        }
        return clamped;
    }
}
