package org.seepledger.aquifer;

/** Values of a formula at cell centres, for tests. */
public record FormulaValues(Grid grid, int steps, Formula formula) implements GriddedValues {

    /** A value at a map place. */
    public interface Formula {
        double at(int step, int layer, double x, double y);
    }

    /** A value that depends on the place alone. */
    public interface PlanFormula {
        double at(double x, double y);
    }

    public static FormulaValues steady(Grid grid, PlanFormula formula) {
        return new FormulaValues(grid, 1, (step, layer, x, y) -> formula.at(x, y));
    }

    @Override
    public void read(int layer, int step, Window window, double[] target, int offset) {
        for (int row = window.row(); row < window.rowEnd(); row++) {
            int fromSouth = grid.flipped(row);
            double y = 0.5 * (grid.y().edge(fromSouth) + grid.y().edge(fromSouth + 1));
            for (int column = window.column(); column < window.columnEnd(); column++) {
                double x = 0.5 * (grid.x().edge(column) + grid.x().edge(column + 1));
                target[offset + window.index(row, column)] = formula.at(step, layer, grid.mapX(x, y), grid.mapY(x, y));
            }
        }
    }

    @Override
    public boolean changes() {
        return steps > 1;
    }

    @Override
    public boolean layered() {
        return true;
    }
}
