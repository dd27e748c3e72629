package org.seepledger.progress;

/** Where long work reports how far it is, and learns that it is to stop. Called from any thread. */
public interface Progress {

    /** Reports to nobody and is never cancelled. */
    Progress NONE = new Progress() {
        @Override
        public void begin(String what, long steps) {}

        @Override
        public void step() {}
    };

    /**
     * A stretch of work begins.
     *
     * @param what what is being done, in the user's words
     * @param steps how many steps it has
     * @throws Cancelled if the work is to stop
     */
    void begin(String what, long steps);

    /**
     * One step is done.
     *
     * @throws Cancelled if the work is to stop
     */
    void step();
}
