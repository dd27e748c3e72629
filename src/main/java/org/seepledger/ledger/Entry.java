package org.seepledger.ledger;

/**
 * What went through one account in a period.
 *
 * @param account the account
 * @param inflow volume that came in, length³; NaN where it cannot be given
 * @param outflow volume that went out, length³; NaN where it cannot be given
 */
public record Entry(Account account, double inflow, double outflow) {

    /**
     * {@return inflow − outflow, length³}
     */
    public double net() {
        return inflow - outflow;
    }
}
