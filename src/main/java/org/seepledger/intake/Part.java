package org.seepledger.intake;

/**
 * A use and the item that it is made of.
 *
 * @param item the item
 * @param use the use
 */
record Part(Item item, Use use) {

    /** {@return what it is called in sentences} */
    String shown() {
        return use.part().isEmpty() ? item.id() : item.id() + " (" + use.part() + ")";
    }
}
