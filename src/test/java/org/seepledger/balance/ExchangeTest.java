package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.fault.DataFault;
import org.seepledger.ledger.ExchangeFlow;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Ring;
import org.seepledger.prism.VerticalRange;
import org.seepledger.progress.Progress;

/**
 * What two prisms give to each other is inside their union: what they give to the outside is what the union does. Without
 * wells, whose share of a piece is spread evenly along it before in and out are told apart. Far from the origin the map
 * coordinates of a vertex on a shared side are rounded to 2e-9 of a cell, so the side itself moves by that much, where the
 * flow per width may be hundreds of times its mean.
 */
class ExchangeTest {

    @Property(tries = 200)
    void acrossASideWithDifferentVertices(@ForAll long seed) {
        TransientCase world = world(seed);
        double[][] split = split(world, seed % 3 == 0);
        VerticalRange range = range(world);
        Prism left = prism("left", range, world, split[0]);
        Prism right = prism("right", range, world, split[1]);
        Prism whole = prism("whole", range, world, split[2]);
        assertThatUnionIsKept(world, left, right, whole);
    }

    @Property(tries = 200)
    void acrossALidBetweenTwoThatStandOnEachOther(@ForAll long seed) {
        TransientCase world = world(seed);
        Prism shape = world.base.prism("shape");
        Optional<GriddedValues> between = Optional.of(surface(world));
        Prism upper = new Prism("upper", shape.rings(), new VerticalRange.Elevations(Optional.empty(), between));
        Prism lower = new Prism("lower", shape.rings(), new VerticalRange.Elevations(between, Optional.empty()));
        VerticalRange all = new VerticalRange.Elevations(Optional.empty(), Optional.empty());
        assertThatUnionIsKept(world, upper, lower, new Prism("whole", shape.rings(), all));
    }

    @Property(tries = 100)
    void aroundAnIslandThatAnotherFills(@ForAll long seed) {
        TransientCase world = world(seed);
        double[] box = box(world, 0.1, 0.9);
        double[] hole = box(world, 0.3, 0.6);
        double[] island = {hole[0], hole[1], hole[6], hole[7], hole[4], hole[5], hole[2], hole[3]};
        VerticalRange range = range(world);
        List<Ring> rings = List.of(
                Prisms.ring(1, 0, mapped(world.base.grid, box)), Prisms.ring(1, 1, mapped(world.base.grid, island)));
        Prism around = new Prism("around", rings, range);
        Prism inside = prism("inside", range, world, hole);
        Prism whole = prism("whole", range, world, box);
        assertThatUnionIsKept(world, around, inside, whole);
    }

    private static TransientCase world(long seed) {
        try {
            return new TransientCase(seed, 1);
        } catch (DataFault wellInInactiveCell) {
            Assume.that(false);
            throw wellInInactiveCell;
        }
    }

    private void assertThatUnionIsKept(TransientCase world, Prism one, Prism other, Prism whole) {
        Balance parts;
        Balance union;
        try {
            parts = WaterBalance.of(world.aquifer, List.of(one, other), WellRule.POINT, 1, Progress.NONE);
            union = WaterBalance.of(world.aquifer, List.of(whole), WellRule.POINT, 1, Progress.NONE);
        } catch (DataFault unlucky) {
            Assume.that(false);
            return;
        }
        for (int interval = 0; interval < world.aquifer.times().intervals(); interval++) {
            for (boolean out : new boolean[] {true, false}) {
                double given = 0;
                for (Prism part : List.of(one, other)) {
                    given += out
                            ? rate(parts, part.name(), ExchangeFlow.OUTSIDE, interval)
                            : rate(parts, ExchangeFlow.OUTSIDE, part.name(), interval);
                }
                double faces = faces(union, interval, out);
                double scale = 1
                        + faces
                        + faces(union, interval, !out)
                        + rate(parts, one.name(), other.name(), interval)
                        + rate(parts, other.name(), one.name(), interval);
                assertThat(given).isCloseTo(faces, Offset.offset(1e-6 * scale));
            }
        }
    }

    private static double rate(Balance balance, String giver, String receiver, int interval) {
        return balance.exchange().stream()
                .filter(flow -> flow.giver().equals(giver) && flow.receiver().equals(receiver))
                .mapToDouble(flow -> flow.rates()[interval])
                .sum();
    }

    private static double faces(Balance balance, int interval, boolean out) {
        return balance.exchange().stream()
                .filter(flow -> (out ? flow.receiver() : flow.giver()).equals(ExchangeFlow.OUTSIDE))
                .mapToDouble(flow -> flow.rates()[interval])
                .sum();
    }

    private static VerticalRange range(TransientCase world) {
        if (world.random.nextBoolean()) {
            int first = world.random.nextInt(world.base.layers);
            return new VerticalRange.Layers(first, first + world.random.nextInt(world.base.layers - first));
        }
        return new VerticalRange.Elevations(Optional.of(surface(world)), Optional.empty());
    }

    private static GriddedValues surface(TransientCase world) {
        return GriddedValues.constant(-8 * world.random.nextDouble());
    }

    private static Prism prism(String name, VerticalRange range, TransientCase world, double... local) {
        return new Prism(name, List.of(Prisms.ring(1, 0, mapped(world.base.grid, local))), range);
    }

    /** A box cut by a line of three vertices: left, right (with one vertex more or less on the line), and whole. */
    private static double[][] split(TransientCase world, boolean onLine) {
        double[] box = box(world, 0.1, 0.9);
        double x0 = box[0];
        double y0 = box[1];
        double x1 = box[4];
        double y1 = box[5];
        double low = x0 + (x1 - x0) * (0.2 + 0.6 * world.random.nextDouble());
        double high = onLine ? low : x0 + (x1 - x0) * (0.2 + 0.6 * world.random.nextDouble());
        double t = world.random.nextDouble();
        double middleX = low + t * (high - low);
        double middleY = y0 + t * (y1 - y0);
        return new double[][] {
            {x0, y0, low, y0, high, y1, x0, y1},
            {low, y0, x1, y0, x1, y1, high, y1, middleX, middleY},
            {x0, y0, x1, y0, x1, y1, x0, y1}
        };
    }

    private static double[] box(TransientCase world, double from, double to) {
        Axis x = world.base.grid.x();
        Axis y = world.base.grid.y();
        double width = x.edge(x.count());
        double height = y.edge(y.count());
        return new double[] {
            from * width, from * height, to * width, from * height, to * width, to * height, from * width, to * height
        };
    }

    private static double[] mapped(Grid grid, double... local) {
        double[] map = new double[local.length];
        for (int i = 0; i < map.length; i += 2) {
            map[i] = grid.mapX(local[i], local[i + 1]);
            map[i + 1] = grid.mapY(local[i], local[i + 1]);
        }
        return map;
    }
}
