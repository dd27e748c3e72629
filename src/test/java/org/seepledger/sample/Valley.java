package org.seepledger.sample;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** The water of the valley, and its flow through two years, month by month. */
final class Valley {

    /** The grid on the map. */
    static final Frame FRAME = new Frame(500_000, 5_200_000, 0);

    static final List<PumpedWell> WELLS = List.of(
            new PumpedWell(
                    "Field 1",
                    "public supply",
                    1167,
                    1433,
                    97,
                    82,
                    List.of(PumpedWell.Line.until("2022-07-01", -420), PumpedWell.Line.since("2022-07-01", -540))),
            new PumpedWell("Field 2", "public supply", 1392, 1678, 85.5, 80.5, List.of(PumpedWell.Line.always(-360))),
            new PumpedWell(
                    "Orchard",
                    "irrigation",
                    2213,
                    1622,
                    95.5,
                    92.5,
                    List.of(
                            PumpedWell.Line.between("2022-05-11", "2022-09-06", -520),
                            PumpedWell.Line.between("2023-06-01", "2023-09-16", -470))),
            new PumpedWell(
                    "Nursery",
                    "irrigation",
                    883,
                    592,
                    97,
                    94,
                    List.of(
                            PumpedWell.Line.between("2022-04-15", "2022-10-01", -230),
                            PumpedWell.Line.between("2023-05-20", "2023-10-01", -260))),
            new PumpedWell(
                    "Excavation",
                    "dewatering",
                    1644,
                    1431,
                    98,
                    94,
                    List.of(PumpedWell.Line.volume("2022-10-10", "2022-12-21", -36_000))));

    private static final River RIVER = new River(
            new double[] {0, 262, 541, 818, 1093, 1377, 1649, 1922, 2207, 2481, 2746, 3000},
            new double[] {1137, 1212, 1141, 1303, 1274, 1187, 1253, 1031, 969, 1066, 957, 1004},
            14,
            0.4,
            ValleyGround.riverLevel(0),
            0.00138);

    private static final boolean[] WATER_TABLE = {true, false, false};
    private static final double DAYS_A_YEAR = 365.25;

    private final BlockGrid grid = ValleyGround.grid();
    private final List<River.Piece> river = RIVER.pieces(grid);
    private final double[] horizontal = onGrid(ValleyGround::horizontal);
    private final double[] vertical = onGrid(ValleyGround::vertical);
    private final double[] closed = new double[grid.faces()];
    private final StoredWater stored =
            new StoredWater(grid, WATER_TABLE, onGrid(ValleyGround::specificYield), ValleyGround.SPECIFIC_STORAGE);
    private final double[] firstHeads;
    private final List<FlowSolution> solutions = new ArrayList<>();

    private Valley() {
        Arrays.fill(closed, Double.NaN);
        double[] heads = WaterTableFlow.solve(
                        problem(meanSupply(), 0), WATER_TABLE, onGrid((layer, x, y) -> ValleyGround.riverLevel(x)))
                .heads();
        // A year of weather first: a mean year's steady heads are no October's.
        for (int month = 0; month < ValleySeasons.MONTHS_A_YEAR; month++) {
            heads = month(month, heads).heads();
        }
        firstHeads = heads;
        for (int month = 0; month < ValleySeasons.MONTHS; month++) {
            solutions.add(month(month, heads(month)));
        }
    }

    /** {@return the valley, with its flow solved: once, as it takes some seconds} */
    static Valley solved() {
        return Solved.VALLEY;
    }

    private static final class Solved {
        static final Valley VALLEY = new Valley();
    }

    BlockGrid grid() {
        return grid;
    }

    List<River.Piece> river() {
        return river;
    }

    StoredWater stored() {
        return stored;
    }

    /** Hydraulic conductivity along the layers, m/d; NaN in rock. */
    double[] horizontal() {
        return horizontal.clone();
    }

    /** Heads at an instant, m; without meaning where {@link #isActive} is false. */
    double[] heads(int instant) {
        return instant == 0 ? firstHeads : solutions.get(instant - 1).heads();
    }

    /** The flow at the end of a month, which holds for the whole of it. */
    FlowSolution solution(int interval) {
        return solutions.get(interval);
    }

    /** Whether there is ground in which water flows. */
    boolean isActive(int cell) {
        return !Double.isNaN(horizontal[cell]) && grid.thickness(cell) > 0;
    }

    /** What the aquifer gains from a piece of river in a month, m³/d. */
    double exchange(River.Piece piece, int interval) {
        return risen(piece.exchange(), ValleySeasons.riverRise(interval))
                .flow(heads(interval + 1)[piece.exchange().cell()]);
    }

    private FlowSolution month(int interval, double[] before) {
        FlowProblem problem = problem(supply(interval), ValleySeasons.riverRise(interval));
        return new TimeStep(problem, stored, ValleySeasons.days(interval)).from(before);
    }

    private FlowProblem problem(double[] supply, double riverRise) {
        List<Exchange> exchanges =
                river.stream().map(piece -> risen(piece.exchange(), riverRise)).toList();
        return new FlowProblem(grid, horizontal, vertical, closed, exchanges, supply);
    }

    private static Exchange risen(Exchange exchange, double rise) {
        return new Exchange(exchange.cell(), exchange.conductance(), exchange.level() + rise);
    }

    private double[] supply(int interval) {
        double[] supply = recharge((x, y) -> ValleySeasons.recharge(interval, x, y));
        for (PumpedWell well : WELLS) {
            double[] shares = well.shares(grid, horizontal);
            for (int layer = 0; layer < shares.length; layer++) {
                supply[well.cell(grid, layer)] += well.rate(interval) * shares[layer];
            }
        }
        return supply;
    }

    private double[] meanSupply() {
        return recharge(ValleySeasons::yearlyRecharge);
    }

    /** Recharge by place, mm/yr. */
    private interface Rain {
        int at(double x, double y);
    }

    /** The gravel is uppermost wherever there is anything. */
    private double[] recharge(Rain rain) {
        double[] supply = new double[grid.cells()];
        for (int cell = 0; cell < grid.cellsInLayer(); cell++) {
            if (isActive(cell)) {
                double rate = rain.at(grid.centreX(cell), grid.centreY(cell));
                supply[cell] = rate / 1000 / DAYS_A_YEAR * grid.area(cell);
            }
        }
        return supply;
    }

    private double[] onGrid(CellField field) {
        return field.on(grid);
    }
}
