package org.seepledger.fault;

/** The request is wrong: an option that cannot be, or an output folder that cannot be used. */
public final class UsageFault extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /**
     * Describes the fault.
     *
     * @param message what is wrong and what to do, as one line
     */
    public UsageFault(String message) {
        super(message);
    }
}
