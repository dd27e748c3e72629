package org.seepledger.review.mapping;

import java.util.Optional;
import org.seepledger.review.sheet.Amount;

/**
 * A column of a table and what it means.
 *
 * @param header its heading; of two header lines, both
 * @param role what it holds
 * @param term of figures: the term that the heading names; empty if none
 * @param period the period that it names; empty if none
 * @param area the area that it names; empty if none
 * @param sense which way it says that figures count
 * @param amount whether it says rates or volumes
 * @param unit the unit that it names; empty if none
 */
public record Column(
        String header,
        Role role,
        String term,
        String period,
        String area,
        Optional<Sense> sense,
        Optional<Amount> amount,
        String unit) {

    static Column of(String header, Role role) {
        return new Column(header, role, "", "", "", Optional.empty(), Optional.empty(), "");
    }

    /**
     * {@return the same column in another role}
     *
     * @param other the role
     */
    public Column as(Role other) {
        return new Column(header, other, term, period, area, sense, amount, unit);
    }
}
