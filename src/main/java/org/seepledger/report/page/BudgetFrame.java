package org.seepledger.report.page;

import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.report.Wording;

/**
 * What tables of budgets show, of water or of a solute.
 *
 * @param cover what the report is about
 * @param units the units of rates and volumes, or of mass rates and masses
 * @param amounts whether tables give rates or volumes
 * @param whole what amounts are called: volumes, or masses
 */
record BudgetFrame(Cover cover, ResultUnits units, Amounts amounts, String whole) {

    Wording wording() {
        return Wording.typeset(units);
    }

    /** An amount as the tables give it. */
    double amount(double volume, Period period) {
        return amounts.of(volume, period, units);
    }

    /** What the tables give, and its unit. */
    String amountsAndUnit() {
        return (amounts == Amounts.RATE ? "mean rates in " : whole + " in ")
                + wording().unit(amounts.unit(units));
    }

    String span(Period period) {
        return cover.span(period, wording());
    }

    String layer(int layer) {
        return cover.aquifer().layers().get(layer).name();
    }
}
