package org.seepledger.job;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * What a handing over came to.
 *
 * @param out the folder
 * @param files the names of its files
 * @param balance what the water budget came to, if it was wanted
 * @param plume what the solute budget came to, if it was wanted
 */
public record HandoverOutcome(
        Path out, List<String> files, Optional<BalanceOutcome> balance, Optional<PlumeOutcome> plume) {

    /** Copies the list. */
    public HandoverOutcome {
        files = List.copyOf(files);
    }

    /** {@return the report of the water budget, else of the solutes, if there is one} */
    public Optional<Path> report() {
        return balance.map(done -> HandoverRequest.BUDGET)
                .or(() -> plume.map(done -> HandoverRequest.SOLUTES))
                .map(folder -> out.resolve(folder).resolve("report.html"));
    }
}
