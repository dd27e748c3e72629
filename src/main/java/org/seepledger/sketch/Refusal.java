package org.seepledger.sketch;

/** What cannot be done to a drawing, as a sentence for the status line; the drawing stays as it was. */
public final class Refusal extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /**
     * Refuses an edit.
     *
     * @param sentence why, and where it helps what to do
     */
    public Refusal(String sentence) {
        super(sentence);
    }
}
