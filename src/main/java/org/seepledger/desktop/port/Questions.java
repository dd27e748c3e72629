package org.seepledger.desktop.port;

import java.util.List;
import java.util.Optional;

/** Asks a question that must be answered before anything else. */
public interface Questions {

    /**
     * {@return which answer was chosen, from 0; empty if the question was dismissed}
     *
     * @param title what it is about, in a few words
     * @param question the question, in sentences
     * @param answers the answers, the safest first
     */
    Optional<Integer> ask(String title, String question, List<String> answers);
}
