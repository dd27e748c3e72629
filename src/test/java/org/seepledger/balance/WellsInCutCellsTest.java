package org.seepledger.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.algorithm.RayCrossingCounter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Location;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.AquiferDraft;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.GivenFaceFlow;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.Well;
import org.seepledger.prism.Prism;
import org.seepledger.prism.Prisms;
import org.seepledger.prism.Shapes;
import org.seepledger.prism.Side;
import org.seepledger.progress.Progress;

/**
 * A row of three cells of 10 by 10, through which 60 flow in from the west to a well in the second and 20 on from it to
 * the east: the field balances in each cell, so that any polygon must close.
 */
class WellsInCutCellsTest {

    private static final Grid GRID = new Grid(Axis.even(0, 10, 3), Axis.even(0, 10, 1), 0, 1);
    private static final double RATE = -40;

    private static Aquifer aquifer(double x, double y) {
        GriddedValues none = GriddedValues.constant(0);
        PointRate pump = new PointRate("P", "pumping", x, y, new Screen.InLayer(0), 0, 1, RATE, "wells.csv, line 2");
        return AquiferDraft.on(GRID)
                .flow(new GivenFaceFlow(
                        ArrayValues.steady(3, new double[] {60, 20, 20}),
                        none,
                        Optional.empty(),
                        Optional.of(ArrayValues.steady(3, new double[] {60, 60, 20})),
                        Optional.empty(),
                        Optional.empty()))
                .source(new Source.Points("pumping", Well.of(List.of(pump))))
                .done();
    }

    @Property(tries = 200)
    void anyPolygonClosesByEitherRuleAndHoldsTheWellOrNot(@ForAll long seed) {
        Random dice = new Random(seed);
        double x = 10 + 10 * dice.nextDouble();
        double y = 10 * dice.nextDouble();
        double[] outline = triangle(dice, dice.nextBoolean() ? 30 : 3, x, y);
        Coordinate[] ring = new Coordinate[4];
        for (int i = 0; i < 4; i++) {
            ring[i] = new Coordinate(outline[2 * i % 6], outline[(2 * i + 1) % 6]);
        }
        boolean inside = RayCrossingCounter.locatePointInRing(new Coordinate(x, y), ring) == Location.INTERIOR;
        Prism prism = Prisms.of("a", 0, 0, outline);
        BudgetReading point = BudgetReading.of(aquifer(x, y), prism);
        assertThat(point.net("pumping")).isEqualTo(inside ? RATE : 0);
        assertThat(point.totals().residual()).isEqualTo(0, within(1e-10));
        BudgetReading spread =
                BudgetReading.of(aquifer(x, y), WellRule.SPREAD, prism).get(0);
        assertThat(spread.totals().residual()).isEqualTo(0, within(1e-10));
        assertThat(spread.out("pumping")).isBetween(0.0, -RATE);
    }

    /** A triangle on the grid, counter-clockwise, of which a side of 3 lies near the well. */
    private static double[] triangle(Random dice, double size, double x, double y) {
        double[] outline = new double[6];
        double doubled = 0;
        while (Math.abs(doubled) < 0.02) {
            for (int i = 0; i < 3; i++) {
                outline[2 * i] = Math.min(30, Math.max(0, x + size * (dice.nextDouble() - 0.5)));
                outline[2 * i + 1] = Math.min(10, Math.max(0, y + size * (dice.nextDouble() - 0.5)));
            }
            doubled = (outline[2] - outline[0]) * (outline[5] - outline[1])
                    - (outline[4] - outline[0]) * (outline[3] - outline[1]);
        }
        return doubled > 0 ? outline : Shapes.reversed(outline);
    }

    @Test
    void aPolygonWithinTheWellsCellTakesInItsWholeRate() {
        BudgetReading around = BudgetReading.of(aquifer(14, 5), Prisms.of("around", 0, 0, Shapes.box(13, 4, 15, 6)));
        assertThat(around.net("pumping")).isEqualTo(RATE);
        double through = around.totals().inflow() - around.totals().outflow() - RATE;
        assertThat(through).isEqualTo(-RATE, within(1e-12));
        BudgetReading beside = BudgetReading.of(aquifer(14, 5), Prisms.of("beside", 0, 0, Shapes.box(16, 4, 18, 6)));
        assertThat(beside.net("pumping")).isZero();
        assertThat(beside.totals().residual()).isEqualTo(0, within(1e-12));
    }

    @Test
    void spreadCountsTheShareOfTheWellsCell() {
        Prism prism = Prisms.of("a", 0, 0, Shapes.box(16, 4, 18, 6));
        BudgetReading spread =
                BudgetReading.of(aquifer(14, 5), WellRule.SPREAD, prism).get(0);
        assertThat(spread.net("pumping")).isEqualTo(0.04 * RATE, within(1e-12));
        // Uniform divergence: what flows along x falls from 60 to 20 over the cell, of which the prism is a fifth high.
        assertThat(spread.in("side 4")).isEqualTo(0.2 * 36, within(1e-12));
        assertThat(spread.out("side 2")).isEqualTo(0.2 * 28, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource({
        "15, 5",
        "15, 2",
        "15, 10",
        "15, 0",
        "10, 5",
        "10, 0",
        "10, 10",
        "20, 5",
        "20, 10",
        "13.3, 3.3",
        "16, 7.0000000001",
    })
    void aWellOnASharedSideOrCornerCountsInExactlyOneOfTwoNeighbours(double x, double y) {
        for (double[] line : new double[][] {{x, 0, x, 10}, {x - 3, 0, x + 3, 10}, {x + 3, 0, x - 3, 10}}) {
            double south = x + (line[0] - x) * y / 5;
            double north = x + (line[2] - x) * (10 - y) / 5;
            Prism west = Prisms.of("west", 0, 0, 0, 0, south, 0, x, y, north, 10, 0, 10);
            Prism east = Prisms.of("east", 0, 0, 30, 10, north, 10, x, y, south, 0, 30, 0);
            assertCountsOnce(x, y, without(west), without(east));
        }
    }

    /** Without the vertices that repeat where the well is on the grid's edge. */
    private static Prism without(Prism prism) {
        List<org.seepledger.prism.Side> sides = prism.rings().get(0).sides();
        double[] outline = new double[2 * sides.size()];
        int kept = 0;
        for (int i = 0; i < sides.size(); i++) {
            Side next = prism.rings().get(0).after(i);
            if (sides.get(i).x() != next.x() || sides.get(i).y() != next.y()) {
                outline[kept++] = sides.get(i).x();
                outline[kept++] = sides.get(i).y();
            }
        }
        return Prisms.of(prism.name(), 0, 0, Arrays.copyOf(outline, kept));
    }

    private static void assertCountsOnce(double x, double y, Prism west, Prism east) {
        List<BudgetReading> both = BudgetReading.of(aquifer(x, y), WellRule.POINT, west, east);
        double one = both.get(0).net("pumping");
        double other = both.get(1).net("pumping");
        assertThat(Math.min(one, other)).isEqualTo(RATE);
        assertThat(Math.max(one, other)).isZero();
        double residual = both.get(0).totals().residual() + both.get(1).totals().residual();
        assertThat(residual).isEqualTo(aquiferResidual(x, y), within(1e-9));
    }

    /** What the whole grid lacks: the field balances with the well in the second cell. */
    private static double aquiferResidual(double x, double y) {
        return BudgetReading.of(aquifer(x, y), Prisms.of("all", 0, 0, Shapes.box(0, 0, 30, 10)))
                .totals()
                .residual();
    }

    @Test
    void wellsInCutCellsAreNoted() {
        Prism cutting = Prisms.of("cutting", 0, 0, Shapes.box(0, 0, 15, 10));
        Prism missing = Prisms.of("missing", 0, 0, Shapes.box(15, 0, 30, 10));
        Prism whole = Prisms.of("whole", 0, 0, Shapes.box(0, 0, 30, 10));
        Balance balance =
                WaterBalance.of(aquifer(12, 5), List.of(cutting, missing, whole), WellRule.POINT, 1, Progress.NONE);
        assertThat(balance.notes().cutWells())
                .containsExactly(
                        new RunNotes.CutWell("cutting", "P", true, true, false),
                        new RunNotes.CutWell("missing", "P", false, true, false));
    }

    @Test
    void aWellInAnotherLayerOrFarAwayDoesNotCount() {
        Aquifer aquifer = aquifer(25, 5);
        assertThat(BudgetReading.of(aquifer, Prisms.of("a", 0, 0, Shapes.box(0, 0, 10, 10)))
                        .net("pumping"))
                .isZero();
        PointRate deep = new PointRate("D", "pumping", 5, 5, new Screen.InLayer(1), 0, 1, RATE, "wells.csv, line 2");
        Aquifer layered = AquiferDraft.on(GRID)
                .layers(20, 10, 0)
                .source(new Source.Points("pumping", Well.of(List.of(deep))))
                .done();
        double[] box = Shapes.box(1, 1, 6, 6);
        assertThat(BudgetReading.of(layered, Prisms.of("upper", 0, 0, box)).net("pumping"))
                .isZero();
        BudgetReading both = BudgetReading.of(layered, Prisms.of("both", 0, 1, box));
        assertThat(both.entry("pumping", 1).outflow()).isEqualTo(-RATE);
        assertThat(both.entry("side 1", 0).net()).isZero();
        assertThat(both.entry("side 1", 1).net()).isNotZero();
    }
}
