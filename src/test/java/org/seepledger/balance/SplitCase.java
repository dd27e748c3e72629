package org.seepledger.balance;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.Assume;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.Side;
import org.seepledger.prism.VerticalRange;

/**
 * A random polygon cut in two along two sides that meet at a place inside it. Outer sides count under {@code outer 1},
 * {@code outer 2} and so on in the whole and in its halves, the shared ones under {@code cut 1} and {@code cut 2}.
 */
public final class SplitCase {

    public final Prism whole;
    public final Prism first;
    public final Prism second;
    public final List<String> outer = new ArrayList<>();

    public SplitCase(RandomCase random) {
        Grid grid = random.grid;
        Random dice = random.random;
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        int corners = 4 + dice.nextInt(8);
        double[] centre = place(grid, dice, 0.5 * width, 0.5 * height);
        List<double[]> star = new ArrayList<>();
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (i + 0.3 * dice.nextDouble()) / corners;
            double share = 0.6 + 0.4 * dice.nextDouble();
            double x = 0.5 * width * (1 + share * Math.cos(angle));
            double y = 0.5 * height * (1 + share * Math.sin(angle));
            star.add(place(grid, dice, x, y));
            outer.add("outer " + (i + 1));
        }
        int turn = corners / 2;
        Assume.that(isSimple(star) && isSimple(joined(star.subList(0, turn + 1), centre)));
        Assume.that(isSimple(joined(joined(star.subList(turn, corners), star.get(0)), centre)));
        int last = dice.nextInt(random.layers);
        whole = prism("whole", last, star, outer);
        List<double[]> one = new ArrayList<>(star.subList(0, turn + 1));
        List<String> oneItems = new ArrayList<>(outer.subList(0, turn));
        one.add(centre);
        oneItems.addAll(List.of("cut 2", "cut 1"));
        first = prism("first", last, one, oneItems);
        List<double[]> other = new ArrayList<>(star.subList(turn, corners));
        List<String> otherItems = new ArrayList<>(outer.subList(turn, corners));
        other.add(star.get(0));
        other.add(centre);
        otherItems.addAll(List.of("cut 1", "cut 2"));
        second = prism("second", last, other, otherItems);
    }

    private static List<double[]> joined(List<double[]> vertices, double[] last) {
        List<double[]> all = new ArrayList<>(vertices);
        all.add(last);
        return all;
    }

    /** Whether a polygon does not cross itself, which prisms must not. */
    private static boolean isSimple(List<double[]> vertices) {
        Coordinate[] closed = joined(vertices, vertices.get(0)).stream()
                .map(vertex -> new Coordinate(vertex[0], vertex[1]))
                .toArray(Coordinate[]::new);
        return new GeometryFactory().createPolygon(closed).isValid();
    }

    /** A place in map coordinates, now and then moved to the nearest grid lines. */
    private static double[] place(Grid grid, Random dice, double x, double y) {
        double localX = dice.nextInt(3) == 0 ? nearest(grid.x(), x) : x;
        double localY = dice.nextInt(3) == 0 ? nearest(grid.y(), y) : y;
        return new double[] {grid.mapX(localX, localY), grid.mapY(localX, localY)};
    }

    private static double nearest(Axis axis, double place) {
        int cell = Math.min(axis.cellAt(place), axis.count() - 1);
        return place - axis.edge(cell) < 0.5 * axis.size(cell) ? axis.edge(cell) : axis.edge(cell + 1);
    }

    private static Prism prism(String name, int last, List<double[]> vertices, List<String> items) {
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < vertices.size(); i++) {
            sides.add(new Side("side " + (i + 1), items.get(i), vertices.get(i)[0], vertices.get(i)[1]));
        }
        return new Prism(name, List.of(new Ring(1, 0, sides)), new VerticalRange.Layers(0, last));
    }

    /** Two boxes of whole cells that share a side on a grid line along x or y. */
    public static List<Prism> boxes(RandomCase random, boolean alongX) {
        Grid grid = random.grid;
        Axis axis = alongX ? grid.y() : grid.x();
        double width = grid.x().edge(grid.columns());
        double height = grid.y().edge(grid.rows());
        double line = axis.edge(1 + random.random.nextInt(axis.count() - 1));
        double[] lower = alongX ? box(grid, 0, 0, width, line) : box(grid, 0, 0, line, height);
        double[] upper = alongX ? box(grid, 0, line, width, height) : box(grid, line, 0, width, height);
        return List.of(
                Prisms.of("lower", 0, random.layers - 1, lower), Prisms.of("upper", 0, random.layers - 1, upper));
    }

    private static double[] box(Grid grid, double west, double south, double east, double north) {
        return new double[] {
            grid.mapX(west, south), grid.mapY(west, south), grid.mapX(east, south), grid.mapY(east, south),
            grid.mapX(east, north), grid.mapY(east, north), grid.mapX(west, north), grid.mapY(west, north)
        };
    }
}
