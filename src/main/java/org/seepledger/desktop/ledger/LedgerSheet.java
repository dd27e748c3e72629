package org.seepledger.desktop.ledger;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.budget.BudgetShown;
import org.seepledger.ledger.PeriodBudget;
import org.seepledger.picture.UnitShown;

/**
 * A budget as the ledger lays it out, of water or of a solute.
 *
 * @param shown the budget, and whose it is
 * @param unit the unit that amounts are shown in
 * @param unitName its name as users write it
 * @param ofSolute what only a solute has
 */
record LedgerSheet(BudgetShown shown, UnitShown unit, String unitName, Optional<OfSolute> ofSolute) {

    /**
     * What only a solute has.
     *
     * @param zero its budget with non-detects as 0
     * @param limit its budget with non-detects as their limit
     * @param held what is held at the period's end
     * @param massUnit the unit of what is held, as users write it
     * @param closure how the budget closes, in a sentence
     */
    record OfSolute(PeriodBudget zero, PeriodBudget limit, List<Held> held, String massUnit, String closure) {}

    /**
     * What is held in one phase and layer, in the unit of masses.
     *
     * @param phase {@code dissolved} or {@code sorbed}
     * @param layer the layer, from 0
     * @param zero with non-detects as 0
     * @param half with non-detects as half their limit
     * @param limit with non-detects as their limit
     */
    record Held(String phase, int layer, double zero, double half, double limit) {

        Held plus(Held other, String name, int ofLayer) {
            return new Held(name, ofLayer, zero + other.zero, half + other.half, limit + other.limit);
        }
    }
}
