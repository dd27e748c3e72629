package org.seepledger.intake;

/**
 * What is made of a raster, a band or a column.
 *
 * @param column the column of the table or band of the raster, from 0; −1 for the whole
 * @param part what it is called in its file; empty for the whole
 * @param role what it is
 * @param name of a source its category, of a concentration its solute; else empty
 * @param unit its unit; empty for the set's own
 * @param layer the layer, from 1; 0 where name, bands or lines tell it, or it holds for all
 * @param turned whether its values are counted with the other sign
 * @param guess how the role was found
 */
public record Use(
        int column, String part, Role role, String name, String unit, int layer, boolean turned, Guess guess) {

    /** {@return the same with another role, said by a person} */
    public Use withRole(Role said) {
        Guess sure = new Guess(said, Guess.Confidence.SAID, "You said so.");
        String named = said.isNamed() && name.isEmpty() ? Wording.name(said, part) : name;
        return new Use(column, part, said, named, unit, said.isSurface() ? layer : 0, turned, sure);
    }

    /** {@return the same with another name} */
    public Use withName(String said) {
        return new Use(column, part, role, said.strip(), unit, layer, turned, guess);
    }

    /** {@return the same in another unit} */
    public Use withUnit(String said) {
        Guess sure = new Guess(role, Guess.Confidence.SAID, "You said so.");
        return new Use(column, part, role, name, said.strip(), layer, turned, sure);
    }

    /** {@return the same in another layer} */
    public Use inLayer(int said) {
        return new Use(column, part, role, name, unit, said, turned, guess);
    }

    /** {@return the same with its sign turned or not} */
    public Use turned(boolean said) {
        return new Use(column, part, role, name, unit, layer, said, guess);
    }
}
