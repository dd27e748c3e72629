package org.seepledger.ledger;

/**
 * What a row of a budget is about.
 *
 * @param group its kind
 * @param item the side, lid, category or storage item
 * @param layer the layer, from 0
 * @param quantified whether its numbers can be given
 */
public record Account(Group group, String item, int layer, boolean quantified) {

    /** {@return what its item is called in a sentence} */
    public String name() {
        return switch (group) {
            case LID -> item + " lid";
            case DISPERSION -> "dispersion, " + item;
            default -> item;
        };
    }
}
