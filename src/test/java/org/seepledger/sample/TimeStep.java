package org.seepledger.sample;

import java.util.ArrayList;
import java.util.List;

/**
 * Flow that changes with time, one step of it: the heads at the step's end drive all flows (fully implicit), and release
 * from storage is the difference of what is stored at its two ends.
 *
 * <p>Thicknesses are those of the last heads (Picard), release is linear about them (Newton); this is repeated until the
 * equations with the thicknesses and releases of the new heads themselves are satisfied.
 */
final class TimeStep {

    private static final int MAX_REPETITIONS = 200;

    /** What a cell may gain or lose unaccounted for, m³/d: near what the rounding of heads makes. */
    private static final double IMBALANCE = 1e-10;

    /** How exactly the equations are solved each time: not much better than what their thicknesses are worth. */
    private static final double REDUCTION = 1e-2;

    private final FlowProblem problem;
    private final StoredWater stored;
    private final double days;

    /**
     * Poses a step.
     *
     * @param problem the ground and the water during the step, without storage
     * @param stored what is stored
     * @param days how long the step lasts
     */
    TimeStep(FlowProblem problem, StoredWater stored, double days) {
        this.problem = problem;
        this.stored = stored;
        this.days = days;
    }

    /**
     * {@return the flow at the step's end}
     *
     * @param before heads at its begin, m
     * @throws IllegalStateException if no heads are found that satisfy the equations
     */
    FlowSolution from(double[] before) {
        double[] heads = before;
        for (int repetition = 0; repetition < MAX_REPETITIONS; repetition++) {
            double[] saturated = problem.saturatedThickness(heads, stored.waterTable());
            FlowEquations equations = new FlowEquations(
                    problem.with(exchanges(before, heads)),
                    FaceThickness.upstream(problem.grid(), stored.waterTable(), heads, saturated));
            double[] imbalance = equations.imbalance(heads);
            if (largest(imbalance) < IMBALANCE) {
                return new FlowSolution(heads, saturated, equations.faceFlows(heads), imbalance);
            }
            heads = equations.solve(heads, REDUCTION);
        }
        throw new IllegalStateException("the water table does not come to rest");
    }

    private List<Exchange> exchanges(double[] before, double[] heads) {
        List<Exchange> exchanges = new ArrayList<>(problem.exchanges());
        for (int cell = 0; cell < heads.length; cell++) {
            if (problem.isActive(cell) && problem.grid().thickness(cell) > 0) {
                exchanges.add(stored.release(cell, before[cell], heads[cell], days));
            }
        }
        return exchanges;
    }

    private static double largest(double[] imbalance) {
        double largest = 0;
        for (double gain : imbalance) {
            largest = Math.max(largest, Math.abs(gain));
        }
        return largest;
    }
}
