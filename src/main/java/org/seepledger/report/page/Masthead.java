package org.seepledger.report.page;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;

/**
 * Whose report it is.
 *
 * @param title its title
 * @param author who answers for it
 * @param reference the client's reference or the author's own
 * @param letterhead lines at the head of the first page; empty for none
 * @param date the date that it carries
 */
public record Masthead(
        String title, Optional<String> author, Optional<String> reference, List<String> letterhead, LocalDate date) {

    /** Copies the list. */
    public Masthead {
        letterhead = List.copyOf(letterhead);
    }
}
