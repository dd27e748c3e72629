package org.seepledger.desktop.port;

/** Where copied things go. */
public interface CopyBoard {

    /**
     * Puts a table there.
     *
     * @param tabSeparated as lines of tab-separated text
     * @param html the same as an HTML table
     */
    void table(String tabSeparated, String html);

    /**
     * Puts text there.
     *
     * @param text the text
     */
    void text(String text);
}
