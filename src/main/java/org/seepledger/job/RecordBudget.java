package org.seepledger.job;

import java.util.List;
import org.seepledger.balance.Balance;
import org.seepledger.prism.Prism;

/**
 * The budgets of prisms over the whole record, and which geometry they belong to.
 *
 * @param prisms the prisms that were asked about, as they were drawn; ledgers and whereabouts stand in their order
 * @param balance the balance
 * @param warnings what may make a number wrong or missing
 * @param notes lesser remarks
 */
public record RecordBudget(List<Prism> prisms, Balance balance, List<String> warnings, List<String> notes) {

    /** Copies the lists. */
    public RecordBudget {
        prisms = List.copyOf(prisms);
        warnings = List.copyOf(warnings);
        notes = List.copyOf(notes);
    }
}
