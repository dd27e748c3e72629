package org.seepledger.ledger;

import java.util.Arrays;
import java.util.List;

/** What is totalled of a prism and period, in the order of rows; {@link Totals} says what each is. */
public enum Total {
    /** All inflow but release from storage. */
    INFLOW("inflow"),
    /** All outflow but uptake into storage. */
    OUTFLOW("outflow"),
    /** Uptake − release. */
    STORAGE_CHANGE("storage change"),
    /** Inflow − outflow − storage change. */
    RESIDUAL("residual"),
    /** Inflow − outflow: given only where change in storage is not known. */
    UNEXPLAINED("unexplained, storage included"),
    /** Residual in percent of throughput. */
    CLOSURE_ERROR("closure error"),
    /** Residual in percent of net throughput. */
    NET_CLOSURE_ERROR("net closure error");

    private final String item;

    Total(String item) {
        this.item = item;
    }

    /**
     * {@return the totals that a budget has rows of}
     *
     * @param storageKnown whether change in storage can be given
     */
    public static List<Total> rows(boolean storageKnown) {
        return Arrays.stream(values())
                .filter(total -> total != UNEXPLAINED || !storageKnown)
                .toList();
    }

    /**
     * {@return whether it is a ratio in percent, rather than a volume}
     */
    public boolean isPercentage() {
        return this == CLOSURE_ERROR || this == NET_CLOSURE_ERROR;
    }

    /** {@return the word for it in files} */
    @Override
    public String toString() {
        return item;
    }
}
