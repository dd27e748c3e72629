package org.seepledger.sample;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

/** Against the decomposition of Apache Commons Math 3.6.1. */
class BandSolverTest {

    @Test
    void solvesAsADenseDecompositionDoes() {
        Random random = new Random(20211001);
        int size = 40;
        int reach = 6;
        double[][] band = new double[size][2 * reach + 1];
        Array2DRowRealMatrix dense = new Array2DRowRealMatrix(size, size);
        double[] right = random.doubles(size).toArray();
        for (int row = 0; row < size; row++) {
            for (int column = Math.max(0, row - reach); column <= Math.min(size - 1, row + reach); column++) {
                double entry = row == column ? 2 * reach : random.nextDouble() - 0.5;
                band[row][column - row + reach] = entry;
                dense.setEntry(row, column, entry);
            }
        }
        double[] expected = new LUDecomposition(dense)
                .getSolver()
                .solve(new ArrayRealVector(right))
                .toArray();
        assertThat(new BandSolver(band).solve(right)).containsExactly(expected, within(1e-14));
    }
}
