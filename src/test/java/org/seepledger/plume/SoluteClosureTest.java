package org.seepledger.plume;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.assertj.core.data.Offset;
import org.seepledger.aquifer.Aquifer;
import org.seepledger.aquifer.ArrayValues;
import org.seepledger.aquifer.Block;
import org.seepledger.aquifer.CellGeometry;
import org.seepledger.aquifer.CellTerm;
import org.seepledger.aquifer.FaceFlows;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.IntervalState;
import org.seepledger.aquifer.Solute;
import org.seepledger.aquifer.Sorption;
import org.seepledger.aquifer.Source;
import org.seepledger.aquifer.WellRate;
import org.seepledger.balance.Periods;
import org.seepledger.balance.SplitCase;
import org.seepledger.balance.TransientCase;
import org.seepledger.ledger.Period;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.prism.Prism;

/**
 * Random concentrations in random transient aquifers whose cells balance in water. What each cell lacks of the solute, worked
 * out here cell by cell in plain loops, is put into a source: then any prism of whole cells must close to rounding,
 * with sorption, decay of both phases and a daughter.
 */
class SoluteClosureTest {

    private static final double YIELD = 0.6;
    private static final double[] DECAY = {0.11, 0.04};
    private static final double POROSITY = 0.35;
    private static final double DENSITY = 1500;
    private static final double KF = 0.3;
    private static final double EXPONENT = 0.8;
    private static final double KD = 4e-4;

    private Aquifer aquifer;
    private int columns;
    private int cells;

    private double[][][] random(Random dice) {
        int intervals = aquifer.times().intervals();
        double[][][] values = new double[intervals + 1][aquifer.layers().size()][cells];
        for (double[][] instant : values) {
            for (double[] layer : instant) {
                for (int i = 0; i < layer.length; i++) {
                    layer[i] = 1e-3 * Math.exp(dice.nextGaussian());
                }
            }
        }
        return values;
    }

    private static double sorbed(boolean parent, double c) {
        return parent ? DENSITY * 1e-6 * KF * Math.pow(1000 * c, EXPONENT) : DENSITY * KD * c;
    }

    private static double inRock(boolean parent, double c) {
        return POROSITY * c + sorbed(parent, c);
    }

    private static double decays(boolean parent, double c) {
        return DECAY[0] * POROSITY * c + DECAY[1] * sorbed(parent, c);
    }

    /** What a source of one unit of water in each cell must carry for each cell to balance. */
    private double[][][] lacking(double[][][] c, boolean parent, double[][][] parents) {
        int intervals = aquifer.times().intervals();
        double[][][] lacking = new double[intervals][aquifer.layers().size()][cells];
        CellGeometry geometry = aquifer.geometry(aquifer.grid().window());
        for (int n = 0; n < intervals; n++) {
            IntervalState state = aquifer.state(n, geometry, aquifer.placedWells());
            Block block = state.flows().block();
            double time = aquifer.times().length(n);
            for (int k = 0; k < lacking[n].length; k++) {
                for (int i = 0; i < cells; i++) {
                    int row = i / columns;
                    int column = i % columns;
                    int cell = block.cell(k, row, column);
                    if (!state.flows().active()[cell]) {
                        continue;
                    }
                    double area = aquifer.grid().area(row, column);
                    double before = area * state.saturation().thicknessBefore(cell);
                    double after = area * state.saturation().thickness(cell);
                    double start = c[n][k][i];
                    double end = c[n + 1][k][i];
                    double mean = 0.5 * (start + end);
                    double need = (after * inRock(parent, end) - before * inRock(parent, start)) / time
                            + (before - after) * inRock(parent, mean) / time
                            + out(state, c, n, k, row, column, geometry);
                    for (CellTerm term : state.terms()) {
                        boolean carriesNothing = !term.storage() && term.rates()[cell] > 0;
                        need -= carriesNothing ? 0 : mean * term.rates()[cell];
                    }
                    for (WellRate well : state.wells()) {
                        boolean here = well.layer() == k
                                && well.well().row() == row
                                && well.well().column() == column;
                        need -= here && well.rate() < 0 ? mean * well.rate() : 0;
                    }
                    if (parent) {
                        need += 0.5 * (before * decays(true, start) + after * decays(true, end));
                    } else {
                        need -= YIELD
                                * 0.5
                                * (before * decays(true, parents[n][k][i])
                                        + after * decays(true, parents[n + 1][k][i]));
                    }
                    lacking[n][k][i] = need;
                }
            }
        }
        return lacking;
    }

    /** What leaves a cell through its six faces, each with the concentration of the cell that it leaves. */
    private double out(IntervalState state, double[][][] c, int n, int k, int row, int column, CellGeometry geometry) {
        FaceFlows flows = state.flows();
        Block block = flows.block();
        return carried(c, n, k, row, column, k, row, column + 1, flows.x()[block.xFace(k, row, column + 1)])
                + carried(c, n, k, row, column, k, row, column - 1, -flows.x()[block.xFace(k, row, column)])
                + carried(c, n, k, row, column, k, row - 1, column, flows.y()[block.yFace(k, row, column)])
                + carried(c, n, k, row, column, k, row + 1, column, -flows.y()[block.yFace(k, row + 1, column)])
                + carried(
                        c,
                        n,
                        k,
                        row,
                        column,
                        neighbour(geometry, k, -1, row, column),
                        row,
                        column,
                        flows.z()[block.zFace(k, row, column)])
                + carried(
                        c,
                        n,
                        k,
                        row,
                        column,
                        neighbour(geometry, k, 1, row, column),
                        row,
                        column,
                        -flows.z()[block.zFace(k + 1, row, column)]);
    }

    private int neighbour(CellGeometry geometry, int k, int direction, int row, int column) {
        int next = k + direction;
        while (next >= 0
                && next < aquifer.layers().size()
                && geometry.isPinchedOut(geometry.block().cell(next, row, column))) {
            next += direction;
        }
        return next;
    }

    private double carried(
            double[][][] c, int n, int k, int row, int column, int toK, int toRow, int toColumn, double out) {
        boolean leaves = out >= 0;
        int i = (leaves ? row : toRow) * columns + (leaves ? column : toColumn);
        int layer = leaves ? k : toK;
        return out == 0 ? 0 : out * 0.5 * (c[n][layer][i] + c[n + 1][layer][i]);
    }

    @Property(tries = 60)
    void closesToRoundingWhereCellsDo(@ForAll long seed) {
        TransientCase random = Luck.orPassOver(() -> new TransientCase(seed));
        List<Prism> boxes = SplitCase.boxes(random.base, random.random.nextBoolean());
        for (Plume plume : plumes(random, boxes)) {
            periods().forEach(period -> {
                PeriodBudget budget = plume.ledger().budget(period);
                assertThat(budget.totals().residual())
                        .as("%s in %s, %s", plume.solute().name(), plume.prism(), period.name())
                        .isCloseTo(0, rounding(budget));
            });
        }
    }

    /** Where sides cut cells that balance, the cutting accounts for all of the residual. */
    @Property(tries = 60)
    void cuttingCellsIsAllThatIsUnexplained(@ForAll long seed) {
        TransientCase random = Luck.orPassOver(() -> new TransientCase(seed));
        SplitCase split = Luck.orPassOver(() -> new SplitCase(random.base));
        double largest = 0;
        for (Plume plume : plumes(random, List.of(split.whole, split.first, split.second))) {
            for (Period period : periods()) {
                PeriodBudget budget = plume.ledger().budget(period);
                double cutting = Arrays.stream(plume.cutting(period)).sum();
                assertThat(budget.totals().residual())
                        .as("%s in %s, %s", plume.solute().name(), plume.prism(), period.name())
                        .isCloseTo(cutting, rounding(budget));
                largest = Math.max(largest, Math.abs(cutting));
            }
        }
        assertThat(largest).isPositive();
    }

    private List<Period> periods() {
        return new Periods(aquifer.times()).every(Periods.Every.INTERVAL, 10);
    }

    private static Offset<Double> rounding(PeriodBudget budget) {
        return Offset.offset(1e-11 * (1e-3 + budget.totals().throughput()));
    }

    /** Budgets of two solutes for which each cell balances. */
    private List<Plume> plumes(TransientCase random, List<Prism> prisms) {
        columns = random.base.grid.columns();
        cells = random.base.cells();
        Aquifer given = random.aquifer;
        double[][] ones = new double[given.layers().size()][cells];
        double[][] minus = new double[given.layers().size()][cells];
        for (int k = 0; k < ones.length; k++) {
            Arrays.fill(ones[k], 1);
            Arrays.fill(minus[k], -1);
        }
        List<Source> sources = new ArrayList<>(given.sources());
        sources.add(new Source.Cells("injection", ArrayValues.steady(columns, ones)));
        sources.add(new Source.Cells("extraction", ArrayValues.steady(columns, minus)));
        aquifer = new Aquifer(
                given.name(),
                given.grid(),
                given.layers(),
                given.times(),
                given.flow(),
                given.head(),
                given.storage(),
                sources,
                given.lengthUnit(),
                given.timeUnit());
        double[][][] parents = random(random.random);
        double[][][] daughters = random(random.random);
        int injection = sources.size() - 2;
        Solute parent = SoluteDraft.of("parent", new ArrayValues(columns, parents))
                .porosity(GriddedValues.constant(POROSITY))
                .sorption(new Sorption.Freundlich(
                        GriddedValues.constant(DENSITY),
                        GriddedValues.constant(KF),
                        GriddedValues.constant(EXPONENT),
                        1000))
                .decay(GriddedValues.constant(DECAY[0]), GriddedValues.constant(DECAY[1]))
                .source(injection, new ArrayValues(columns, lacking(parents, true, parents)))
                .done();
        Solute daughter = SoluteDraft.of("daughter", new ArrayValues(columns, daughters))
                .porosity(GriddedValues.constant(POROSITY))
                .sorption(new Sorption.Linear(GriddedValues.constant(DENSITY), GriddedValues.constant(KD)))
                .parent("parent", YIELD)
                .source(injection, new ArrayValues(columns, lacking(daughters, false, parents)))
                .done();
        return SoluteDraft.balance(aquifer, false, prisms, parent, daughter);
    }
}
