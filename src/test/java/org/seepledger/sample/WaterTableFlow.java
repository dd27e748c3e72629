package org.seepledger.sample;

/**
 * Steady flow with a water table: the saturated thickness depends on the head, so the linear equations are solved
 * again with the thickness of the last heads until these stand still (Picard's method of successive substitution).
 */
final class WaterTableFlow {

    private static final int MAX_REPETITIONS = 100;
    private static final double HEAD_CHANGE = 1e-9;

    private WaterTableFlow() {}

    /**
     * {@return the solution; its flows are those of the last linear equations, and so close}
     *
     * @param problem the ground and the water
     * @param waterTable for each layer, whether the water table can lie in it
     * @param start heads to begin from, m
     * @throws IllegalStateException if the heads do not come to rest within a nanometre
     */
    static FlowSolution solve(FlowProblem problem, boolean[] waterTable, double[] start) {
        double[] heads = start;
        for (int repetition = 0; repetition < MAX_REPETITIONS; repetition++) {
            double[] saturated = problem.saturatedThickness(heads, waterTable);
            FlowEquations equations = new FlowEquations(problem, saturated);
            double[] next = equations.solve(heads);
            if (largestChange(heads, next) < HEAD_CHANGE) {
                return new FlowSolution(next, saturated, equations.faceFlows(next), equations.imbalance(next));
            }
            heads = next;
        }
        throw new IllegalStateException("the water table does not come to rest");
    }

    private static double largestChange(double[] before, double[] after) {
        double largest = 0;
        for (int cell = 0; cell < before.length; cell++) {
            largest = Math.max(largest, Math.abs(after[cell] - before[cell]));
        }
        return largest;
    }
}
