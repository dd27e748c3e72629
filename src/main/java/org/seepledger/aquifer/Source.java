package org.seepledger.aquifer;

import java.util.List;

/** What adds water to cells or takes it, apart from flow between them. */
public sealed interface Source {

    /**
     * {@return the user's own word for it, which becomes the item in the budget}
     */
    String category();

    /**
     * A rate over plan area.
     *
     * @param category the category
     * @param rate length/time by interval, positive where it adds water
     */
    record Areal(String category, GriddedValues rate) implements Source {}

    /**
     * A rate per cell.
     *
     * @param category the category
     * @param rate length³/time by interval, positive where it adds water
     */
    record Cells(String category, GriddedValues rate) implements Source {}

    /**
     * Rates at points.
     *
     * @param category the category of the source
     * @param wells the wells, each with a category of its own
     */
    record Points(String category, List<Well> wells) implements Source {

        /** Copies the list. */
        public Points {
            wells = List.copyOf(wells);
        }
    }
}
