package org.seepledger.progress;

/** The user asked the work to stop; what it had begun is undone on the way out. */
public final class Cancelled extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /** The work stops here. */
    public Cancelled() {
        super("stopped on request");
    }
}
