package org.seepledger.fault;

/** The program itself is wrong: an identity that must hold does not. No result may be given out. */
public final class ProgramFault extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /**
     * Describes the fault.
     *
     * @param message which identity failed, where and by how much, as one line
     */
    public ProgramFault(String message) {
        super(message);
    }
}
