package org.seepledger.intake;

/**
 * What values seem to be.
 *
 * @param role the role
 * @param confidence how sure that is
 * @param reason why, as a sentence
 */
public record Guess(Role role, Confidence confidence, String reason) {

    /** How sure a guess is. */
    public enum Confidence {
        /** A person said so. */
        SAID,
        /** Name and values agree. */
        HIGH,
        /** Something speaks for it, and nothing against. */
        FAIR,
        /** Little speaks for it, or something against. */
        LOW
    }
}
