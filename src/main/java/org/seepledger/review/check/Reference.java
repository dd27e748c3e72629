package org.seepledger.review.check;

import java.util.Optional;
import org.seepledger.review.mapping.Catalogue;
import org.seepledger.review.mapping.When;

/** What a submission is held against. */
public interface Reference {

    /** {@return what there is to tie to} */
    Catalogue catalogue();

    /** {@return m³/d in one of the set's own unit of rates} */
    double rateUnit();

    /** {@return m³ in one of the set's own unit of volumes} */
    double volumeUnit();

    /**
     * {@return the budget of a prism in a period; empty where the period is not known or not covered}
     *
     * @param prism the prism
     * @param when the period
     */
    Optional<Recomputed> of(String prism, When when);
}
