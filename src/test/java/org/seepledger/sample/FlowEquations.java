package org.seepledger.sample;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.ConjugateGradient;
import org.apache.commons.math3.linear.JacobiPreconditioner;
import org.apache.commons.math3.linear.RealLinearOperator;
import org.apache.commons.math3.linear.RealVector;

/**
 * The flow equation on a grid of blocks, by finite differences with a head at each block's centre: what a cell gains
 * through its six faces, from its exchanges and from its supply is nothing.
 *
 * <p>The flow through a face is a conductance times the difference of the heads behind and ahead of it. The conductance
 * is that of the two half-blocks in series; at an outer face that has a head, of the one half-block. Saturated
 * thicknesses are given, so the equations are linear; they are symmetric and positive definite wherever some head is
 * given, and are solved by conjugate gradients (Hestenes and Stiefel 1952) with the diagonal as preconditioner.
 *
 * <p>A block without thickness hands on what flows across it, and nothing flows along it: where a layer pinches out the
 * blocks above and below are neighbours.
 */
final class FlowEquations {

    private static final int MAX_ITERATIONS = 20_000;
    private static final double RESIDUAL_REDUCTION = 1e-12;

    private final FlowProblem problem;
    private final BlockGrid grid;
    private final double[] conductance;
    private final int[] joining;

    /**
     * Sets up the equations.
     *
     * @param problem the ground and the water
     * @param saturated the water-filled thickness of each cell, m
     */
    FlowEquations(FlowProblem problem, double[] saturated) {
        this(problem, FaceThickness.own(saturated));
    }

    /**
     * Sets up the equations.
     *
     * @param problem the ground and the water
     * @param thickness the thickness of the water that flows through lateral faces
     */
    FlowEquations(FlowProblem problem, FaceThickness thickness) {
        this.problem = problem;
        this.grid = problem.grid();
        this.conductance = conductances(thickness);
        this.joining = IntStream.range(0, grid.faces())
                .filter(face -> isInner(face) && conductance[face] > 0)
                .toArray();
    }

    /**
     * {@return the heads, m}
     *
     * @param start heads to begin from; inactive cells keep theirs
     */
    double[] solve(double[] start) {
        return solve(start, RESIDUAL_REDUCTION);
    }

    /**
     * {@return heads, m, that come nearer to satisfying the equations}
     *
     * @param start heads to begin from; inactive cells keep theirs
     * @param reduction what is to be left of the imbalance, as a share of that at the start
     */
    double[] solve(double[] start, double reduction) {
        double[] diagonal = diagonal();
        RealVector correction = new ConjugateGradient(MAX_ITERATIONS, reduction, false)
                .solve(
                        operator(diagonal),
                        new JacobiPreconditioner(diagonal, true),
                        new ArrayRealVector(imbalance(start), false));
        double[] heads = start.clone();
        Arrays.setAll(heads, cell -> start[cell] + correction.getEntry(cell));
        return heads;
    }

    /**
     * {@return the flow through each face, m³/d, positive toward +x, +y and up}
     *
     * @param heads the heads, m
     */
    double[] faceFlows(double[] heads) {
        double[] flows = new double[grid.faces()];
        for (int face = 0; face < flows.length; face++) {
            if (conductance[face] > 0) {
                flows[face] = conductance[face]
                        * (head(grid.behind(face), face, heads) - head(grid.ahead(face), face, heads));
            }
        }
        return flows;
    }

    /**
     * {@return what each cell gains, m³/d: zero where the equation is satisfied, and in inactive cells}
     *
     * @param heads the heads, m
     */
    double[] imbalance(double[] heads) {
        double[] gain = new double[grid.cells()];
        double[] flows = faceFlows(heads);
        for (int cell = 0; cell < gain.length; cell++) {
            if (problem.isActive(cell)) {
                gain[cell] = problem.supply()[cell] + inflow(cell, flows);
            }
        }
        for (Exchange exchange : problem.exchanges()) {
            gain[exchange.cell()] += exchange.flow(heads[exchange.cell()]);
        }
        return gain;
    }

    private double inflow(int cell, double[] flows) {
        return flows[grid.west(cell)]
                - flows[grid.east(cell)]
                + flows[grid.south(cell)]
                - flows[grid.north(cell)]
                + flows[grid.bottom(cell)]
                - flows[grid.top(cell)];
    }

    private double head(int cell, int face, double[] heads) {
        return cell == BlockGrid.OUTSIDE ? problem.outerHead()[face] : heads[cell];
    }

    /** Adds up the resistances of the half-blocks on both sides of each face; no conductance where nothing can flow. */
    private double[] conductances(FaceThickness thickness) {
        double[] resistance = new double[grid.faces()];
        for (int cell = 0; cell < grid.cells(); cell++) {
            double alongX = grid.width(cell) / (2 * problem.horizontal()[cell] * grid.height(cell));
            double alongY = grid.height(cell) / (2 * problem.horizontal()[cell] * grid.width(cell));
            double alongZ = grid.thickness(cell) / (2 * problem.vertical()[cell] * grid.area(cell));
            resistance[grid.west(cell)] += alongX / thickness.of(cell, grid.west(cell));
            resistance[grid.east(cell)] += alongX / thickness.of(cell, grid.east(cell));
            resistance[grid.south(cell)] += alongY / thickness.of(cell, grid.south(cell));
            resistance[grid.north(cell)] += alongY / thickness.of(cell, grid.north(cell));
            resistance[grid.bottom(cell)] += alongZ;
            resistance[grid.top(cell)] += alongZ;
        }
        double[] inverse = new double[grid.faces()];
        Arrays.setAll(inverse, face -> conducts(face, resistance[face]) ? 1 / resistance[face] : 0);
        return inverse;
    }

    private boolean conducts(int face, double resistance) {
        boolean closed = !isInner(face) && Double.isNaN(problem.outerHead()[face]);
        return !closed && !Double.isNaN(resistance);
    }

    private boolean isInner(int face) {
        return grid.behind(face) != BlockGrid.OUTSIDE && grid.ahead(face) != BlockGrid.OUTSIDE;
    }

    private double[] diagonal() {
        double[] diagonal = new double[grid.cells()];
        for (int cell = 0; cell < diagonal.length; cell++) {
            diagonal[cell] = conductance[grid.west(cell)]
                    + conductance[grid.east(cell)]
                    + conductance[grid.south(cell)]
                    + conductance[grid.north(cell)]
                    + conductance[grid.bottom(cell)]
                    + conductance[grid.top(cell)];
        }
        for (Exchange exchange : problem.exchanges()) {
            diagonal[exchange.cell()] += exchange.conductance();
        }
        // A cell that nothing reaches keeps its head: a row of the identity.
        Arrays.setAll(diagonal, cell -> diagonal[cell] == 0 ? 1 : diagonal[cell]);
        return diagonal;
    }

    private RealLinearOperator operator(double[] diagonal) {
        return new RealLinearOperator() {
            @Override
            public int getRowDimension() {
                return diagonal.length;
            }

            @Override
            public int getColumnDimension() {
                return diagonal.length;
            }

            @Override
            public RealVector operate(RealVector heads) {
                return new ArrayRealVector(lossesPerHead(diagonal, heads.toArray()), false);
            }
        };
    }

    /** What each cell loses when its head and its neighbours' rise by the given ones. */
    private double[] lossesPerHead(double[] diagonal, double[] heads) {
        double[] losses = new double[heads.length];
        for (int cell = 0; cell < losses.length; cell++) {
            losses[cell] = diagonal[cell] * heads[cell];
        }
        for (int face : joining) {
            int behind = grid.behind(face);
            int ahead = grid.ahead(face);
            losses[behind] -= conductance[face] * heads[ahead];
            losses[ahead] -= conductance[face] * heads[behind];
        }
        return losses;
    }
}
