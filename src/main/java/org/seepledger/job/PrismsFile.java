package org.seepledger.job;

import java.util.List;
import org.seepledger.prism.Prism;

/**
 * What a file of prisms holds.
 *
 * @param prisms the prisms, in its order
 * @param notes what a user should know of it
 */
public record PrismsFile(List<Prism> prisms, List<String> notes) {

    /** Copies the lists. */
    public PrismsFile {
        prisms = List.copyOf(prisms);
        notes = List.copyOf(notes);
    }
}
