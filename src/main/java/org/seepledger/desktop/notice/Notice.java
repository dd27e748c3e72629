package org.seepledger.desktop.notice;

import java.util.Optional;

/**
 * Something to know.
 *
 * @param kind what it is about
 * @param words what there is to know, in a sentence
 * @param offer what can be done about it, if anything
 */
public record Notice(Kind kind, String words, Optional<Offer> offer) {

    /** What a notice is about. */
    public enum Kind {
        /** Something has been done as asked. */
        DONE,
        /** Something that readers of results must know. It stays until it has been read. */
        WARNING,
        /** Something could not be done as asked. */
        REFUSED
    }

    /**
     * What can be done about a notice.
     *
     * @param words what it does
     * @param run does it
     */
    public record Offer(String words, Runnable run) {}
}
