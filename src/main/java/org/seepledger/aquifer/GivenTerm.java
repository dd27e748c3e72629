package org.seepledger.aquifer;

import java.util.function.Function;

/**
 * A term of the cells' balance as a linear function of the quantity that it was given by; all else is as it stands.
 *
 * @param values the quantity
 * @param of the term that follows from such a quantity
 */
record GivenTerm(GriddedValues values, Function<GriddedValues, CellTerm> of) {

    /** The term as it was given. */
    CellTerm term() {
        return of.apply(values);
    }

    /** What each cell's rate would be if the quantity were 1 wherever it has a value. */
    CellTerm perUnit() {
        return of.apply(new Ones(values));
    }

    private record Ones(GriddedValues like) implements GriddedValues {

        @Override
        public void read(int layer, int step, Window window, double[] target, int offset) {
            like.read(layer, step, window, target, offset);
            for (int i = offset; i < offset + window.size(); i++) {
                target[i] = Double.isNaN(target[i]) ? Double.NaN : 1;
            }
        }

        @Override
        public boolean changes() {
            return like.changes();
        }

        @Override
        public boolean layered() {
            return like.layered();
        }
    }
}
