package org.seepledger.report.page;

import org.seepledger.io.result.ResultUnits;
import org.seepledger.ledger.Period;
import org.seepledger.unit.Measure;

/** What the tables of a report give. */
public enum Amounts {
    /** Mean rates. */
    RATE,
    /** Volumes. */
    VOLUME;

    /** A volume as a table gives it, by the same steps as {@code budget.csv}, so that the two agree to the last bit. */
    double of(double volume, Period period, ResultUnits units) {
        return this == RATE ? volume / period.duration() * units.rateFactor() : volume * units.volumeFactor();
    }

    Measure unit(ResultUnits units) {
        return this == RATE ? units.rate() : units.volume();
    }
}
