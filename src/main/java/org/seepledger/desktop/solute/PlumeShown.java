package org.seepledger.desktop.solute;

import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.budget.BudgetShown;
import org.seepledger.job.IntervalPlume;
import org.seepledger.job.RecordPlume;
import org.seepledger.ledger.Period;
import org.seepledger.plume.Plume;
import org.seepledger.prism.Prism;

/**
 * What a prism holds of a solute, with the geometry that it belongs to.
 *
 * @param prism the prism as it was drawn then
 * @param area its plan area on the grid, length²
 * @param plume what it holds, and its budget
 * @param notes what was done to the prism
 */
public record PlumeShown(Prism prism, double area, Plume plume, List<String> notes) {

    /** Copies the list. */
    public PlumeShown {
        notes = List.copyOf(notes);
    }

    /**
     * {@return the budget in a period}
     *
     * @param period the period
     */
    public BudgetShown in(Period period) {
        return new BudgetShown(prism, area, plume.ledger().budget(period), notes);
    }

    static Optional<PlumeShown> of(IntervalPlume known, String solute) {
        return find(known.plumes(), solute)
                .map(plume -> new PlumeShown(known.prism(), known.area(), plume, known.notes()));
    }

    static Optional<PlumeShown> of(RecordPlume known, String prism, String solute) {
        int place = known.place(prism);
        if (place < 0) {
            return Optional.empty();
        }
        List<String> own = known.notes().stream()
                .filter(note -> note.startsWith("\"" + prism + "\""))
                .toList();
        return find(known.of(place), solute)
                .map(plume ->
                        new PlumeShown(known.prisms().get(place), known.areas().get(place), plume, own));
    }

    private static Optional<Plume> find(List<Plume> plumes, String solute) {
        return plumes.stream()
                .filter(plume -> plume.solute().name().equals(solute))
                .findFirst();
    }
}
