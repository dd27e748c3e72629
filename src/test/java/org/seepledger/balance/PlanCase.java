package org.seepledger.balance;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.DarcyFlux;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.OuterFaces;
import org.seepledger.aquifer.Source;
import org.seepledger.ledger.Entry;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;

/**
 * A random flux at cell centres, recharge and a polygon, all edges and vertices multiples of 1/8, that can be moved,
 * turned and mirrored.
 *
 * @param rotation the grid's, a multiple of 90 degrees
 * @param x column edges
 * @param y row edges
 * @param flux along x, along y and up, by layer, row and column
 * @param recharge by row and column
 * @param outline a ring, counter-clockwise
 * @param items what each side counts under
 */
record PlanCase(
        double rotation,
        double[] x,
        double[] y,
        double[][][][] flux,
        double[][] recharge,
        List<double[]> outline,
        List<String> items) {

    private static final int LAYERS = 2;

    static PlanCase random(long seed, double rotation) {
        Random dice = new Random(seed);
        double[] x = edges(dice);
        double[] y = edges(dice);
        double[][][][] flux = new double[3][LAYERS][y.length - 1][x.length - 1];
        double[][] recharge = new double[y.length - 1][x.length - 1];
        for (int row = 0; row < recharge.length; row++) {
            for (int column = 0; column < recharge[0].length; column++) {
                recharge[row][column] = dice.nextDouble();
                for (int layer = 0; layer < LAYERS; layer++) {
                    for (int component = 0; component < 3; component++) {
                        flux[component][layer][row][column] = dice.nextGaussian();
                    }
                }
            }
        }
        List<double[]> outline = new ArrayList<>();
        int corners = 4 + dice.nextInt(5);
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (i + 0.3 * dice.nextDouble()) / corners;
            double share = 0.6 + 0.4 * dice.nextDouble();
            double localX = eighths(0.5 * last(x) * (1 + share * Math.cos(angle)));
            double localY = eighths(0.5 * last(y) * (1 + share * Math.sin(angle)));
            outline.add(rotation == 90 ? new double[] {-localY, localX} : new double[] {localX, localY});
        }
        List<String> items =
                IntStream.range(0, corners).mapToObj(i -> "side of " + i).toList();
        return new PlanCase(rotation, x, y, flux, recharge, outline, items);
    }

    private static double[] edges(Random dice) {
        double[] edges = new double[5 + dice.nextInt(6)];
        for (int i = 1; i < edges.length; i++) {
            edges[i] = edges[i - 1] + 2 + dice.nextInt(20) / 8.0;
        }
        return edges;
    }

    private static double eighths(double place) {
        return Math.rint(8 * place) / 8;
    }

    private static double last(double[] edges) {
        return edges[edges.length - 1];
    }

    PlanCase shifted(double dx, double dy) {
        return new PlanCase(rotation, plus(x, dx), plus(y, dy), flux, recharge, moved(0, dx, dy), items);
    }

    private static double[] plus(double[] edges, double shift) {
        return IntStream.range(0, edges.length)
                .mapToDouble(i -> edges[i] + shift)
                .toArray();
    }

    /** The outline turned by quarters about the origin, then moved. */
    private List<double[]> moved(int quarters, double dx, double dy) {
        return outline.stream()
                .map(v -> quarters == 0 ? new double[] {v[0] + dx, v[1] + dy} : new double[] {-v[1] + dx, v[0] + dy})
                .toList();
    }

    /** The same values in a grid that is turned with the polygon. */
    PlanCase inTurnedGrid() {
        return new PlanCase(90, x, y, flux, recharge, moved(1, 0, 0), items);
    }

    /** East and west exchanged. */
    PlanCase mirrored() {
        int columns = x.length - 1;
        PlanCase mirror = emptyLike(columns, y.length - 1, negative(x), y);
        for (int row = 0; row < y.length - 1; row++) {
            for (int column = 0; column < columns; column++) {
                mirror.recharge[row][columns - 1 - column] = recharge[row][column];
                for (int layer = 0; layer < LAYERS; layer++) {
                    mirror.flux[0][layer][row][columns - 1 - column] = -flux[0][layer][row][column];
                    mirror.flux[1][layer][row][columns - 1 - column] = flux[1][layer][row][column];
                    mirror.flux[2][layer][row][columns - 1 - column] = flux[2][layer][row][column];
                }
            }
        }
        List<double[]> vertices = new ArrayList<>();
        outline.forEach(v -> vertices.add(new double[] {-v[0], v[1]}));
        Collections.reverse(vertices);
        List<String> names = new ArrayList<>(items);
        Collections.reverse(names);
        Collections.rotate(names, -1);
        return new PlanCase(0, mirror.x, mirror.y, mirror.flux, mirror.recharge, vertices, names);
    }

    /** The field turned counter-clockwise in a grid that is not: east becomes north. */
    PlanCase quarterTurned() {
        int rows = x.length - 1;
        PlanCase turned = emptyLike(y.length - 1, rows, negative(y), x);
        for (int row = 0; row < y.length - 1; row++) {
            for (int column = 0; column < rows; column++) {
                int newRow = rows - 1 - column;
                turned.recharge[newRow][row] = recharge[row][column];
                for (int layer = 0; layer < LAYERS; layer++) {
                    turned.flux[0][layer][newRow][row] = -flux[1][layer][row][column];
                    turned.flux[1][layer][newRow][row] = flux[0][layer][row][column];
                    turned.flux[2][layer][newRow][row] = flux[2][layer][row][column];
                }
            }
        }
        return new PlanCase(0, turned.x, turned.y, turned.flux, turned.recharge, moved(1, 0, 0), items);
    }

    private static PlanCase emptyLike(int columns, int rows, double[] x, double[] y) {
        return new PlanCase(
                0, x, y, new double[3][LAYERS][rows][columns], new double[rows][columns], List.of(), List.of());
    }

    private static double[] negative(double[] edges) {
        return IntStream.range(0, edges.length)
                .mapToDouble(i -> -edges[edges.length - 1 - i])
                .toArray();
    }

    PlanCase renumbered(int by) {
        List<double[]> vertices = new ArrayList<>(outline);
        List<String> names = new ArrayList<>(items);
        Collections.rotate(vertices, by);
        Collections.rotate(names, by);
        return new PlanCase(rotation, x, y, flux, recharge, vertices, names);
    }

    PlanCase reversed() {
        double[][][][] back = new double[3][LAYERS][y.length - 1][x.length - 1];
        for (int component = 0; component < 3; component++) {
            for (int layer = 0; layer < LAYERS; layer++) {
                for (int row = 0; row < y.length - 1; row++) {
                    for (int column = 0; column < x.length - 1; column++) {
                        back[component][layer][row][column] = -flux[component][layer][row][column];
                    }
                }
            }
        }
        return new PlanCase(rotation, x, y, back, recharge, outline, items);
    }

    List<Entry> budget() {
        return reading().budget().entries();
    }

    BudgetReading reading() {
        Aquifer aquifer = AquiferDraft.on(new Grid(Axis.of(x), Axis.of(y), rotation, 1))
                .layers(12, 7, 0)
                .flow(new DarcyFlux(
                        values(flux[0]),
                        values(flux[1]),
                        Optional.of(values(flux[2])),
                        false,
                        new OuterFaces(true, true, true)))
                .source(new Source.Areal("recharge", values(new double[][][] {recharge})))
                .done();
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < outline.size(); i++) {
            sides.add(new Side("side " + (i + 1), items.get(i), outline.get(i)[0], outline.get(i)[1]));
        }
        return BudgetReading.of(
                aquifer, new Prism("a", List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, LAYERS - 1)));
    }

    private ArrayValues values(double[][][] layers) {
        double[][] flat = new double[layers.length][];
        for (int layer = 0; layer < layers.length; layer++) {
            flat[layer] = IntStream.range(0, (x.length - 1) * (y.length - 1))
                    .mapToDouble(layerValue(layers[layer]))
                    .toArray();
        }
        return ArrayValues.steady(x.length - 1, flat);
    }

    private IntToDoubleFunction layerValue(double[][] layer) {
        return i -> layer[i / (x.length - 1)][i % (x.length - 1)];
    }
}
