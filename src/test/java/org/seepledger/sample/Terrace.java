package org.seepledger.sample;

import java.util.Arrays;
import java.util.List;

/** The water of the terrace, and the steady flow that it makes: an invented mean year. */
final class Terrace {

    /** The grid on the map. */
    static final Frame FRAME = new Frame(2000, 1000, 28);

    static final List<Well> WELLS = List.of(
            new Well("Shallow 1", "public supply", 1180, 566, TerraceGround.GRAVEL, 3, -560),
            new Well("Shallow 2", "public supply", 1332, 618, TerraceGround.GRAVEL, 3, -640),
            new Well("Shallow 3", "public supply", 1494, 587, TerraceGround.GRAVEL, 3, -480),
            new Well("Deep 1", "public supply", 1391, 716, TerraceGround.SAND, 6, -380),
            new Well("Orchard", "irrigation", 1616, 768, TerraceGround.GRAVEL, 2, -140));

    private static final River RIVER = new River(
            new double[] {0, 303, 617, 953, 1247, 1502, 1749, 2053, 2347, 2680},
            new double[] {343, 381, 328, 302, 404, 421, 387, 309, 291, 333},
            18,
            0.25,
            97.58,
            0.00113);

    private static final boolean[] WATER_TABLE = {true, false, false};
    private static final double DAYS_A_YEAR = 365.25;

    private final FlowProblem problem;
    private final FlowSolution solution;
    private final List<River.Piece> river;
    private final int[] recharge;

    private Terrace(FlowProblem problem, FlowSolution solution, List<River.Piece> river, int[] recharge) {
        this.problem = problem;
        this.solution = solution;
        this.river = river;
        this.recharge = recharge;
    }

    /** {@return the terrace, with its flow solved} */
    static Terrace solved() {
        BlockGrid grid = TerraceGround.grid();
        int[] recharge = recharge(grid);
        List<River.Piece> river = RIVER.pieces(grid);
        CellField ground = TerraceGround::horizontal;
        CellField across = TerraceGround::vertical;
        CellField regional = (layer, x, y) -> regionalHead(x, y);
        double[] horizontal = ground.on(grid);
        FlowProblem problem = new FlowProblem(
                grid,
                horizontal,
                across.on(grid),
                outerHeads(grid),
                river.stream().map(River.Piece::exchange).toList(),
                supply(grid, horizontal, recharge));
        return new Terrace(problem, WaterTableFlow.solve(problem, WATER_TABLE, regional.on(grid)), river, recharge);
    }

    FlowProblem problem() {
        return problem;
    }

    FlowSolution solution() {
        return solution;
    }

    List<River.Piece> river() {
        return river;
    }

    /** {@return whether any cell of a column of cells is active} */
    boolean takesRecharge(int planCell) {
        return uppermostActive(problem.grid(), problem.horizontal(), planCell) != BlockGrid.OUTSIDE;
    }

    /** {@return recharge of each cell in plan, mm/yr} */
    int[] recharge() {
        return recharge.clone();
    }

    /** What the aquifer gains from a piece of river, m³/d. */
    double exchange(River.Piece piece) {
        return piece.exchange().flow(solution.heads()[piece.exchange().cell()]);
    }

    /** Heads that fall down the valley and rise away from the river: those at the grid's sides. */
    private static double regionalHead(double x, double y) {
        double distance = y - 340;
        return 97.2 - 0.00115 * x + 0.0012 * (Math.sqrt(distance * distance + 6400) - 80);
    }

    private static double[] outerHeads(BlockGrid grid) {
        double[] heads = new double[grid.faces()];
        Arrays.fill(heads, Double.NaN);
        for (int cell = 0; cell < grid.cells(); cell++) {
            double x = grid.centreX(cell);
            double y = grid.centreY(cell);
            double toEdgeX = grid.width(cell) / 2;
            double toEdgeY = grid.height(cell) / 2;
            setOuter(grid, heads, grid.west(cell), x - toEdgeX, y);
            setOuter(grid, heads, grid.east(cell), x + toEdgeX, y);
            setOuter(grid, heads, grid.south(cell), x, y - toEdgeY);
            setOuter(grid, heads, grid.north(cell), x, y + toEdgeY);
        }
        return heads;
    }

    private static void setOuter(BlockGrid grid, double[] heads, int face, double x, double y) {
        if (grid.behind(face) == BlockGrid.OUTSIDE || grid.ahead(face) == BlockGrid.OUTSIDE) {
            heads[face] = regionalHead(x, y);
        }
    }

    /** Less under the trees of the hillslope, most on the bare fields of the terrace; whole millimetres. */
    private static int[] recharge(BlockGrid grid) {
        int[] recharge = new int[grid.cellsInLayer()];
        for (int cell = 0; cell < recharge.length; cell++) {
            double x = grid.centreX(cell);
            double y = grid.centreY(cell);
            double trees = 1 / (1 + StrictMath.exp((1250 - y) / 90));
            double fields = StrictMath.sin(x / 380) * StrictMath.sin(y / 290);
            recharge[cell] = (int) Math.rint(235 - 95 * trees + 60 * fields);
        }
        return recharge;
    }

    private static double[] supply(BlockGrid grid, double[] horizontal, int[] recharge) {
        double[] supply = new double[grid.cells()];
        for (int planCell = 0; planCell < recharge.length; planCell++) {
            int cell = uppermostActive(grid, horizontal, planCell);
            if (cell != BlockGrid.OUTSIDE) {
                supply[cell] += recharge[planCell] / 1000.0 / DAYS_A_YEAR * grid.area(cell);
            }
        }
        for (Well well : WELLS) {
            supply[well.cell(grid)] += well.rate();
        }
        return supply;
    }

    private static int uppermostActive(BlockGrid grid, double[] horizontal, int planCell) {
        for (int cell = planCell; cell < grid.cells(); cell += grid.cellsInLayer()) {
            if (!Double.isNaN(horizontal[cell])) {
                return cell;
            }
        }
        return BlockGrid.OUTSIDE;
    }
}
